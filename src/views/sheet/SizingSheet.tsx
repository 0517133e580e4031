/** First sheet of a meter: what was found, the section, process, metal, every flow, the curve and how the checks stand. */
import { FlowChart } from '../chart/FlowChart.tsx';
import { SectionDrawing } from '../drawing/section.tsx';
import type { SizingSheet as Sheet } from '../present/sheet.ts';
import { chartWords, checksAre, sheetWords, unitsNote } from '../words/sheet.ts';
import { Block } from './Block.tsx';
import styles from './content.module.css';
import { DutyTable } from './DutyTable.tsx';
import { Notes } from './Notes.tsx';
import { Page } from './Page.tsx';
import type { Place } from './paper.ts';
import { Rows } from './Rows.tsx';
import { Standing } from './Standing.tsx';

const CHART = { width: 360, height: 160 }; // px; 95 mm by 42 mm

export function SizingSheet({ sheet, place }: { readonly sheet: Sheet; readonly place: Place }) {
  const { head, meter } = sheet;
  const { caption, ...labels } = sheet.section;
  return (
    <Page head={head} type={sheetWords.documentType} verdict={checksAre(meter.verdict.words)} place={place}>
      <p className={styles.answer}>{sheet.answer}</p>
      <div className={styles.section}>
        <SectionDrawing shape={meter.shape} dimensions={sheet.drawn} caption={caption} labels={labels} />
      </div>
      <div className={styles.halves}>
        <Rows title={sheetWords.fluid} rows={sheet.fluid} />
        <div className={styles.stack}>
          <Rows title={sheetWords.element} rows={sheet.element} />
          <Rows title={sheetWords.pipe} rows={sheet.pipe} />
        </div>
      </div>
      <DutyTable table={sheet.duty} span={sheet.span} certainty={sheet.meter.certainty} />
      <div className={styles.curve}>
        <Block title={sheetWords.curve}>
          <FlowChart chart={meter.chart} labels={chartWords} {...CHART} print />
        </Block>
        <Standing blocks={sheet.checks} />
      </div>
      <Notes lines={[...meter.cautions, ...meter.notes, unitsNote]} />
    </Page>
  );
}
