/** The summary of a converted log on one page: totals, the flow over time, the account of every row, days, and how it was made. */
import { LogChart } from '../chart/LogChart.tsx';
import type { AccountRow, DayRow, PresentedLog } from '../present/log-model.ts';
import type { Row } from '../present/model.ts';
import { logSheet, resultWords as words } from '../words/logs.ts';
import { unitsNote } from '../words/sheet.ts';
import { Block } from './Block.tsx';
import styles from './content.module.css';
import { Notes } from './Notes.tsx';
import { Page } from './Page.tsx';
import tables from './table.module.css';

const CHART = { width: 672, height: 150 }; // px; 178 mm by 40 mm
/** Days that find room on the page; the others are summed up in words. */
const MOST_DAYS = 10;

export function LogSheet({ log }: { readonly log: PresentedLog }) {
  const { head, answer, account, totals, means, chart, reasons, days, configuration, notes } = log;
  return (
    <Page head={head} type={logSheet.type} verdict={log.share} place={{ sheet: 1, of: 1 }}>
      <p className={styles.answer}>{answer.map(({ text }) => text).join('')}</p>
      <p>{account}</p>
      <div className={styles.halves}>
        <Lines title={words.totals} rows={totals} />
        <Lines title={words.means} rows={means} />
      </div>
      {chart.points.length > 1 && (
        <Block title={words.chart}>
          <LogChart chart={chart} {...CHART} print />
        </Block>
      )}
      <Reasons reasons={reasons} />
      <Days days={days.slice(0, MOST_DAYS)} />
      {days.length > MOST_DAYS && <p>{logSheet.more(`${days.length - MOST_DAYS}`)}</p>}
      <Block title={words.configuration}>
        <p className={styles.notes}>{configuration.map(({ label, text }) => `${label}: ${text}`).join(' · ')}</p>
      </Block>
      <Notes lines={[...notes, unitsNote]} />
    </Page>
  );
}

function Lines({ title, rows }: { readonly title: string; readonly rows: readonly Row[] }) {
  return (
    <Block title={title}>
      <table className={tables.table}>
        <tbody>
          {rows.map(({ id, label, value, note }) => (
            <tr key={id}>
              <th scope="row">
                {label}
                {note && <small> ({note})</small>}
              </th>
              <td className={tables.figure}>{value.text}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </Block>
  );
}

function Reasons({ reasons }: { readonly reasons: readonly AccountRow[] }) {
  return (
    <Block title={words.reasons}>
      <table className={tables.table}>
        <thead>
          <tr>
            {[words.reason, '', words.rows, words.share, words.time, words.mass].map((head, at) => (
              // biome-ignore lint/suspicious/noArrayIndexKey: a head is known by its column
              <th key={at} scope="col">
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {reasons.map(({ code, label, fate, rows, share, time, mass }) => (
            <tr key={code}>
              <th scope="row">{label}</th>
              <td>{fate}</td>
              <td className={tables.figure}>{rows.text}</td>
              <td className={tables.figure}>{share.text}</td>
              <td className={tables.figure}>{time?.text}</td>
              <td className={tables.figure}>{mass?.text}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </Block>
  );
}

function Days({ days }: { readonly days: readonly DayRow[] }) {
  const heads = [words.day, words.mass, words.mean, words.least, words.most, words.flowing, words.flagged, words.gap];
  return (
    <Block title={words.days}>
      <table className={tables.table}>
        <thead>
          <tr>
            {heads.map((head) => (
              <th key={head} scope="col">
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {days.map(({ key, date, mass, mean, least, most, flowing, flagged, gap }) => (
            <tr key={key}>
              <th scope="row">{date}</th>
              {[mass, mean, least, most, flowing, flagged, gap].map((value, at) => (
                // biome-ignore lint/suspicious/noArrayIndexKey: a cell is known by its column
                <td key={at} className={tables.figure}>
                  {value?.text}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </Block>
  );
}
