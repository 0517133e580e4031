/** The account of every row: how many, how long, how much, and where the first of them stand. */
import type { AccountRow } from '../../present/log-model.ts';
import { resultWords as words } from '../../words/logs.ts';
import { CopyTable } from '../panel/CopyTable.tsx';
import { type Cell, number, words as text } from '../panel/clipboard.ts';
import styles from './Log.module.css';

const cellsOf = (reasons: readonly AccountRow[]): readonly (readonly Cell[])[] => [
  [words.reason, '', words.rows, words.share, words.time, words.mass, words.first].map(text),
  ...reasons.map(({ label, fate, rows, share, time, mass, first }) => [
    text(label),
    text(fate),
    number(rows.plain),
    text(share.plain),
    text(time?.plain ?? ''),
    text(mass?.plain ?? ''),
    text(first.join('; ')),
  ]),
];

export function LogReasons({ reasons }: { readonly reasons: readonly AccountRow[] }) {
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a table wider than the page is scrolled by the keyboard too
    <section className={styles.scroll} aria-label={words.reasons} tabIndex={0}>
      <table className={styles.table}>
        <caption>
          {words.reasons} <CopyTable cells={cellsOf(reasons)} />
        </caption>
        <thead>
          <tr>
            <th scope="col">{words.reason}</th>
            <th scope="col">{words.rows}</th>
            <th scope="col">{words.share}</th>
            <th scope="col">{words.time}</th>
            <th scope="col">{words.mass}</th>
            <th scope="col" className={styles.firsts}>
              {words.first}
            </th>
          </tr>
        </thead>
        <tbody>
          {reasons.map((reason) => (
            <Reason key={reason.code} reason={reason} />
          ))}
        </tbody>
      </table>
    </section>
  );
}

function Reason({
  reason: { code, label, meaning, fate, rows, share, time, mass, first },
}: {
  readonly reason: AccountRow;
}) {
  return (
    <tr>
      <th scope="row">
        {label}
        <small>{code === 'converted' ? meaning : `${fate}. ${meaning}`}</small>
      </th>
      <td>{rows.text}</td>
      <td>{share.text}</td>
      <td>{time?.text}</td>
      <td>{mass?.text}</td>
      <td className={styles.firsts}>
        {first.map((row) => (
          <span key={row}>{row}</span>
        ))}
      </td>
    </tr>
  );
}
