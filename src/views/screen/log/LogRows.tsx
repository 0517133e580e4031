/** The first rows of a log: each cell as it is written, and below it what it is read as. */
import type { PresentedLook } from '../../present/log-model.ts';
import { logParts, logWords as words } from '../../words/logs.ts';
import styles from './Log.module.css';

const partOf = (role: string | undefined): string =>
  role === undefined ? '' : ((logParts as Readonly<Record<string, string>>)[role] ?? role);

export function LogRows({ look: { columns, roles, rows } }: { readonly look: PresentedLook }) {
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a table wider than the page is scrolled by the keyboard too
    <section className={styles.scroll} aria-label={words.rows} tabIndex={0}>
      <table className={styles.rows}>
        <caption>
          {words.rows}. {words.rowsNote}
        </caption>
        <thead>
          <tr>
            <th scope="col">{words.row}</th>
            {columns.map(({ name, at }) => (
              <th key={at} scope="col" data-used={roles[at] !== undefined}>
                {name}
                <small>{partOf(roles[at])}</small>
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map(({ row, cells, trouble }) => (
            <tr key={row} data-troubled={trouble !== undefined}>
              <th scope="row">
                {row}
                {trouble && <small>{trouble}</small>}
              </th>
              {cells.map(({ text, read }, at) => (
                // biome-ignore lint/suspicious/noArrayIndexKey: a cell is known by its column
                <td key={at} data-used={roles[at] !== undefined}>
                  {text}
                  {read && <small>{read}</small>}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}
