/** How each assumption stands, and the findings that are not inside, the worst first. */
import type { CheckBlock } from '../present/sheet-tables.ts';
import { checkCount, exceptionText, moreExceptions, sheetWords } from '../words/sheet.ts';
import { Block } from './Block.tsx';
import styles from './content.module.css';
import tables from './table.module.css';

/** More would push the title block off the paper; the second sheet has them all. */
const MOST = 2;

export function Standing({ blocks }: { readonly blocks: readonly CheckBlock[] }) {
  const rows = blocks.flatMap((block) => block.rows);
  const exceptions = [
    ...rows.filter(({ verdict }) => verdict === 'outside'),
    ...rows.filter(({ verdict }) => verdict === 'caution'),
  ];
  return (
    <Block title={sheetWords.verdicts}>
      <table className={tables.table}>
        <tbody>
          {blocks.map(({ assumption, title, verdict, standing, rows: own, open }) => (
            <tr key={assumption}>
              <th scope="row">{title}</th>
              <td>{checkCount(own.length, open.length)}</td>
              <td className={verdict === 'inside' || verdict === 'unchecked' ? undefined : tables.loud}>{standing}</td>
            </tr>
          ))}
        </tbody>
      </table>
      {exceptions.slice(0, MOST).map(({ key, text, limit, verdictWord }) => (
        <p key={key} className={styles.exception}>
          <b className={styles.loud}>{verdictWord}</b> {exceptionText(text, limit)}
        </p>
      ))}
      {exceptions.length > MOST && <p className={styles.exception}>{moreExceptions(exceptions.length - MOST)}</p>}
    </Block>
  );
}
