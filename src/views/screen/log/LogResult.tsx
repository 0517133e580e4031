/** What a log came to: the totals, the account of every row, the days, and the flow over time. */
import { lazy, Suspense } from 'react';
import { bytesText } from '../../present/bytes.ts';
import type { PresentedLog } from '../../present/log-model.ts';
import type { Row } from '../../present/model.ts';
import { resultWords, saveNote, logWords as words } from '../../words/logs.ts';
import { useCommands } from '../binding.tsx';
import buttons from '../button.module.css';
import { useLater } from '../meter.ts';
import { useWidth } from '../useWidth.ts';
import styles from './Log.module.css';
import { LogDays } from './LogDays.tsx';
import { LogReasons } from './LogReasons.tsx';

interface Props {
  readonly log: PresentedLog;
  readonly stale: boolean;
  readonly output: { readonly name: string; readonly bytes: number };
}

export function LogResult({ log, stale, output }: Props) {
  const commands = useCommands();
  return (
    <div className={styles.result} data-stale={stale}>
      <p className={styles.answer}>
        {log.answer.map(({ text, role }, at) =>
          // biome-ignore lint/suspicious/noArrayIndexKey: a piece of a sentence is known by its place
          role === 'found' ? <b key={at}>{text}</b> : <span key={at}>{text}</span>,
        )}
      </p>
      <p>{log.account}</p>
      <p className={styles.ways}>
        <button type="button" className={buttons.framed} onClick={() => commands.saveConverted()}>
          {words.save}
        </button>
        <span>{saveNote(output.name, bytesText(output.bytes))}</span>
        <a href="#/sheet/log">{words.print}</a>
      </p>
      <div className={styles.halves}>
        <Figures title={resultWords.totals} rows={log.totals} />
        <Figures title={resultWords.means} rows={log.means} />
      </div>
      <Chart log={log} />
      <LogReasons reasons={log.reasons} />
      <Extremes log={log} />
      <LogDays days={log.days} />
      <Configuration log={log} />
      {log.notes.map((note) => (
        <p key={note} className={styles.note}>
          {note}
        </p>
      ))}
    </div>
  );
}

function Figures({ title, rows }: { readonly title: string; readonly rows: readonly Row[] }) {
  return (
    <table className={styles.figuresTable}>
      <caption>{title}</caption>
      <tbody>
        {rows.map(({ id, label, value, note }) => (
          <tr key={id}>
            <th scope="row">
              {label}
              {note && <small>{note}</small>}
            </th>
            <td>{value.text}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

const HEIGHT = 250; // px
const LogChart = lazy(() => import('../../chart/LogChart.tsx').then((module) => ({ default: module.LogChart })));

function Chart({ log }: { readonly log: PresentedLog }) {
  const chart = useLater(log.chart);
  const [frame, width] = useWidth();
  if (chart.points.length < 2) return null;
  return (
    <div>
      <h3>{resultWords.chart}</h3>
      <div className={styles.chart} ref={frame}>
        <Suspense fallback={null}>{width > 0 && <LogChart chart={chart} width={width} height={HEIGHT} />}</Suspense>
      </div>
    </div>
  );
}

function Extremes({ log: { extremes } }: { readonly log: PresentedLog }) {
  if (extremes.length === 0) return null;
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a table wider than the page is scrolled by the keyboard too
    <section className={styles.scroll} aria-label={resultWords.extremes} tabIndex={0}>
      <table className={styles.table}>
        <caption>{resultWords.extremes}</caption>
        <thead>
          <tr>
            <th scope="col">{resultWords.quantity}</th>
            <th scope="col">{resultWords.least}</th>
            <th scope="col">{resultWords.at}</th>
            <th scope="col">{resultWords.most}</th>
            <th scope="col">{resultWords.at}</th>
          </tr>
        </thead>
        <tbody>
          {extremes.map(({ key, label, least, leastAt, most, mostAt }) => (
            <tr key={key}>
              <th scope="row">{label}</th>
              <td>{least.text}</td>
              <td>{leastAt}</td>
              <td>{most.text}</td>
              <td>{mostAt}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}

function Configuration({ log: { configuration, head } }: { readonly log: PresentedLog }) {
  return (
    <details className={styles.configuration}>
      <summary>{resultWords.configuration}</summary>
      <dl>
        {configuration.map(({ label, text }) => (
          <div key={`${label} ${text}`}>
            <dt>{label}</dt>
            <dd>{text}</dd>
          </div>
        ))}
      </dl>
      <p className={styles.note}>{head.status}</p>
    </details>
  );
}
