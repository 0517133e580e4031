/** The root signal of a control system, scaled for the design state, brought to each row's state beside the exact flow. */
import type { PresentedReadings } from '../../present/readings-model.ts';
import { readWords as words } from '../../words/readings.ts';
import { Panel } from '../panel/Panel.tsx';
import styles from './Read.module.css';

export function Compensate({ readings }: { readonly readings: PresentedReadings }) {
  const rows = readings.rows.flatMap(({ index, time, compensation }) =>
    compensation === undefined ? [] : [{ index, time, ...compensation }],
  );
  if (rows.every(({ factor }) => factor.si === 1)) return null; // one density: nothing to correct
  return (
    <Panel id="compensate" title={words.compensate}>
      <p className={styles.hint}>{words.compensateLead}</p>
      <div className={styles.scroll}>
        <table className={styles.table}>
          <thead>
            <tr>
              <th scope="col">{words.row}</th>
              {[words.indicated, words.factor, words.corrected, words.exact, words.residual].map((head) => (
                <th key={head} scope="col" className={styles.figure}>
                  {head}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {rows.map(({ index, time, indicated, factor, corrected, exact, residual }) => (
              <tr key={index}>
                <th scope="row">{time === '' ? index + 1 : time}</th>
                {[indicated, factor, corrected, exact, residual].map((value, at) => (
                  // biome-ignore lint/suspicious/noArrayIndexKey: the columns are fixed
                  <td key={at} className={styles.figure}>
                    {value.text}
                  </td>
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </Panel>
  );
}
