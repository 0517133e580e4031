/** The calibration of the probe: its coefficient at each velocity. It replaces the one coefficient. */

import { unitOf } from '../../../core/quantity/units.ts';
import { tableWords } from '../../words/fluid-forms.ts';
import { surveyPlace as words } from '../../words/surveys.ts';
import { useWorkbench } from '../binding.tsx';
import buttons from '../button.module.css';
import { quantityKind } from '../field/quantities.ts';
import { Cell } from '../fluid/Cell.tsx';
import styles from '../fluid/inputs.module.css';
import { Problems } from '../fluid/Problems.tsx';
import { columnUnit, fileCell, rowsIn, shownCell, type TableColumn } from '../fluid/rows.ts';
import { useWrite, useWriteAll, useWritten } from '../hand.tsx';
import { textAt } from '../text.ts';

const PATH = 'probe.calibration';
const velocity: TableColumn = { name: 'velocity', label: words.velocity, kind: quantityKind('velocity') };
const same = (text: string): string => text;

export function ProbeCalibration() {
  const rows = rowsIn(useWritten(PATH));
  const display = useWorkbench((state) => state.project.display ?? 'SI');
  const unit = columnUnit(rows, velocity) ?? unitOf(velocity.kind.unit[display], velocity.kind.measures);
  const settle = useWorkbench((state) => state.settle);
  const write = useWrite();
  const writeAll = useWriteAll();
  const cell = (at: number, name: string, label: string) => ({
    path: `${PATH}.${at}.${name}`,
    label: tableWords.row(label, at),
    text: textAt(rows[at], name),
    write: (text: string) => write(`${PATH}.${at}.${name}`, text),
    settle,
    paste: () => undefined,
  });
  return (
    <>
      <table className={styles.table}>
        <caption>{words.calibration}</caption>
        <thead>
          <tr>
            <th scope="col">
              {velocity.label} / {unit?.print}
            </th>
            <th scope="col">Coefficient</th>
            <td className={styles.narrow} />
          </tr>
        </thead>
        <tbody>
          {[...rows, undefined].map((_, at) => (
            // biome-ignore lint/suspicious/noArrayIndexKey: a row is its place in the list
            <tr key={at}>
              <td>
                <Cell
                  {...cell(at, 'velocity', velocity.label)}
                  shown={(text) => (unit ? shownCell(text, velocity, unit) : text)}
                  file={(typed) => (unit ? fileCell(typed, velocity, unit) : typed)}
                />
              </td>
              <td>
                <Cell {...cell(at, 'coefficient', 'Coefficient')} shown={same} file={same} />
              </td>
              <td className={styles.narrow}>
                {at < rows.length && (
                  <button
                    type="button"
                    className={buttons.remove}
                    aria-label={tableWords.remove(at)}
                    onClick={() => writeAll([[`${PATH}.${at}`, undefined]])}
                  >
                    ×
                  </button>
                )}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      <Problems below={PATH} />
    </>
  );
}
