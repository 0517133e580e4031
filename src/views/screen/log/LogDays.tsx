/** The days of a log, one row each. */
import type { DayRow } from '../../present/log-model.ts';
import { logRows, resultWords as words } from '../../words/logs.ts';
import { CopyTable } from '../panel/CopyTable.tsx';
import { type Cell, words as text } from '../panel/clipboard.ts';
import styles from './Log.module.css';

const cellsOf = (days: readonly DayRow[]): readonly (readonly Cell[])[] => [
  [
    words.day,
    words.mass,
    logRows.baseVolume,
    words.mean,
    words.least,
    words.most,
    words.flowing,
    words.flagged,
    words.gap,
  ].map(text),
  ...days.map(({ date, mass, baseVolume, mean, least, most, flowing, flagged, gap }) =>
    [date, ...[mass, baseVolume, mean, least, most, flowing, flagged, gap].map((value) => value?.plain ?? '')].map(
      text,
    ),
  ),
];

export function LogDays({ days }: { readonly days: readonly DayRow[] }) {
  const hasBase = days.some(({ baseVolume }) => baseVolume !== undefined);
  const heads = [
    words.mass,
    ...(hasBase ? [logRows.baseVolume] : []),
    ...[words.mean, words.least, words.most, words.flowing, words.flagged, words.gap],
  ];
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a table wider than the page is scrolled by the keyboard too
    <section className={styles.scroll} aria-label={words.days} tabIndex={0}>
      <table className={styles.table}>
        <caption>
          {words.days} <CopyTable cells={cellsOf(days)} />
        </caption>
        <thead>
          <tr>
            <th scope="col">{words.day}</th>
            {heads.map((head) => (
              <th key={head} scope="col">
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {days.map(({ key, date, mass, baseVolume, mean, least, most, flowing, flagged, gap }) => (
            <tr key={key}>
              <th scope="row">{date}</th>
              <td>{mass.text}</td>
              {hasBase && <td>{baseVolume?.text}</td>}
              <td>{mean?.text}</td>
              <td>{least?.text}</td>
              <td>{most?.text}</td>
              <td>{flowing.text}</td>
              <td>{flagged.text}</td>
              <td>{gap.text}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}
