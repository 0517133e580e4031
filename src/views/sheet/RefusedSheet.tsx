/** The sheet of a meter that could not be solved: why, and from which inputs. */
import type { RefusedSheet as Sheet } from '../present/sheet.ts';
import { sheetWords } from '../words/sheet.ts';
import { Block } from './Block.tsx';
import styles from './content.module.css';
import { Notes } from './Notes.tsx';
import { Page } from './Page.tsx';
import tables from './table.module.css';

export function RefusedSheet({ sheet: { head, type, lead, problems, inputs, cautions } }: { readonly sheet: Sheet }) {
  return (
    <Page head={head} type={type} verdict={sheetWords.problems} place={{ sheet: 1, of: 1 }}>
      <Block title={sheetWords.problems}>
        <p className={styles.answer}>{lead}</p>
        <table className={`${tables.table} ${tables.reasons}`}>
          <tbody>
            {problems.map(({ field, sentence }) => (
              <tr key={`${field} ${sentence}`}>
                <th scope="row">{field}</th>
                <td>{sentence}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </Block>
      <Block title={sheetWords.inputs}>
        {inputs.length === 0 && <p>{sheetWords.nothing}</p>}
        <table className={`${tables.table} ${tables.reasons}`}>
          <tbody>
            {inputs.map(({ field, text }) => (
              <tr key={`${field} ${text}`}>
                <th scope="row">{field}</th>
                <td>{text}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </Block>
      <Notes lines={cautions} />
    </Page>
  );
}
