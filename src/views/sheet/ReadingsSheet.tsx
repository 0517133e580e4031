/** The readings of a meter: the instrument drawn and as written, one row for each reading, what they come to, cautions. */
import { Instrument } from '../drawing/instrument/Instrument.tsx';
import type { ReadingTable } from '../present/readings-sheet.ts';
import type { SizingSheet } from '../present/sheet.ts';
import { readWords as words } from '../words/readings.ts';
import { checksAre } from '../words/sheet.ts';
import { Block } from './Block.tsx';
import content from './content.module.css';
import { Notes } from './Notes.tsx';
import { Page } from './Page.tsx';
import type { Place } from './paper.ts';
import tables from './table.module.css';

export function ReadingsSheet({ sheet, place }: { readonly sheet: SizingSheet; readonly place: Place }) {
  const { head, meter, readings } = sheet;
  if (readings === undefined) return null;
  const { kind, drawn, answer, instrument, together, problems, notes } = readings;
  return (
    <Page head={head} type={words.table} verdict={checksAre(meter.verdict.words)} place={place}>
      <p className={content.answer}>{answer}</p>
      <div className={content.curve}>
        <Instrument kind={kind} {...drawn} onPaper />
        <Block title={words.instrument}>
          <table className={tables.table}>
            <tbody>
              {instrument.map(({ label, text }) => (
                <tr key={label}>
                  <th scope="row">{label}</th>
                  <td>{text}</td>
                </tr>
              ))}
            </tbody>
          </table>
        </Block>
      </div>
      <Block title={words.table}>
        <Rows readings={readings} />
        {[...together, ...problems].map((sentence) => (
          <p key={sentence} className={content.exception}>
            {sentence}
          </p>
        ))}
      </Block>
      <Notes lines={notes} />
    </Page>
  );
}

const Rows = ({ readings: { heads, rows } }: { readonly readings: ReadingTable }) => (
  <table className={tables.table}>
    <thead>
      <tr>
        {heads.map(({ label, unit }) => (
          <th key={label} scope="col">
            {label}
            <span className={tables.unit}>{unit}</span>
          </th>
        ))}
      </tr>
    </thead>
    <tbody>
      {rows.map((cells, row) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: a row is its place in the list
        <tr key={row}>
          {cells.map((cell, at) => (
            // biome-ignore lint/suspicious/noArrayIndexKey: the columns are fixed
            <td key={at}>{cell}</td>
          ))}
        </tr>
      ))}
    </tbody>
  </table>
);
