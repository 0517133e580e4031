/** The working of the principal figures: state and metal, then the maximum flow. Runs over as many pages as it needs. */
import { withMarks } from '../present/cited.ts';
import type { WorkingGroup, WorkingRow } from '../present/model.ts';
import type { SizingSheet } from '../present/sheet.ts';
import { checkHeads, checksAre, sheetWords } from '../words/sheet.ts';
import { Formula } from './Formula.tsx';
import { Page } from './Page.tsx';
import type { Place } from './paper.ts';
import styles from './working.module.css';

export function WorkingSheet({
  sheet: { head, meter },
  place,
}: {
  readonly sheet: Pick<SizingSheet, 'head'> & {
    readonly meter: Pick<SizingSheet['meter'], 'working'> & { readonly verdict: { readonly words: string } };
  };
  readonly place: Place;
}) {
  const groups = meter.working.filter(({ id }) => id === 'meter' || id === 'maximum');
  return (
    <Page head={head} type={sheetWords.workingSheet} verdict={checksAre(meter.verdict.words)} place={place}>
      <table className={styles.working}>
        <thead>
          <tr>
            <th scope="col">{sheetWords.workingHead(head.tag)}</th>
            <th scope="col">{checkHeads.source}</th>
          </tr>
        </thead>
        {groups.map((group) => (
          <Group key={group.id} group={group} />
        ))}
      </table>
    </Page>
  );
}

const Group = ({ group: { title, rows } }: { readonly group: WorkingGroup }) => (
  <>
    <tbody className={styles.group}>
      <tr>
        <th colSpan={2} scope="colgroup">
          {title}
        </th>
      </tr>
    </tbody>
    {rows.map((row) => (
      <Line key={row.id} row={row} />
    ))}
  </>
);

function Line({ row }: { readonly row: WorkingRow }) {
  const { title, symbol, formula, substituted, value, cited, remark } = row;
  return (
    <tbody className={styles.line}>
      <tr>
        <th scope="row">{title}</th>
        <td>{withMarks(cited.clause, [cited.mark])}</td>
      </tr>
      <tr>
        <td colSpan={2}>
          {formula && <Formula symbol={symbol} equals={formula} />}
          {substituted && <Formula symbol={symbol} equals={substituted} />}
          <p className={styles.result}>
            <Formula symbol={symbol} /> = <b>{value.text}</b> {remark}
          </p>
        </td>
      </tr>
    </tbody>
  );
}
