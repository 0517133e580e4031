/** For the workshop and the pipework: dimensions with tolerances, straight lengths, and what is measured on receipt. */
import type { SizingSheet } from '../present/sheet.ts';
import type { Opening } from '../words/elements.ts';
import { checksAre, inspection, sheetWords, straightHeads } from '../words/sheet.ts';
import { Block } from './Block.tsx';
import styles from './content.module.css';
import { Figures } from './Figures.tsx';
import { Page } from './Page.tsx';
import type { Place } from './paper.ts';
import tables from './table.module.css';

export function DimensionsSheet({ sheet, place }: { readonly sheet: SizingSheet; readonly place: Place }) {
  const { head, meter, dimensions, straight, opening } = sheet;
  return (
    <Page head={head} type={sheetWords.dimensionsSheet} verdict={checksAre(meter.verdict.words)} place={place}>
      <p className={styles.answer}>{sheet.answer}</p>
      <div className={styles.halves}>
        {dimensions.length > 0 && <Figures title={sheetWords.dimensions} rows={dimensions} heads={[]} />}
        <Figures
          title={sheetWords.straight}
          rows={straight}
          heads={[straightHeads.fitting, straightHeads.full, straightHeads.reduced]}
        />
      </div>
      <Inspection opening={opening} />
    </Page>
  );
}

/** Blank boxes, five to a line where diameters are measured. */
function Inspection({ opening }: { readonly opening: Opening }) {
  return (
    <Block title={inspection.title}>
      <table className={`${tables.table} ${tables.blank}`}>
        <tbody>
          {[inspection.bore(opening), inspection.pipe].map((label) => (
            <tr key={label}>
              <th scope="row">{label}</th>
              <td />
              <td />
              <td />
              <td />
              <td />
            </tr>
          ))}
          {inspection.others(opening).map((label) => (
            <tr key={label}>
              <th scope="row">{label}</th>
              <td colSpan={5} />
            </tr>
          ))}
        </tbody>
      </table>
    </Block>
  );
}
