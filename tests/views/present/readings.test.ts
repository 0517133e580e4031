/** Readings as they are printed: sentences, units of the display, what the rows come to, cautions by service. */
import { describe, expect, it } from 'vitest';
import type { InstrumentText, MeterText, Project, ReadingText } from '../../../src/core/document/project.ts';
import { presentReadings } from '../../../src/views/present/readings.ts';
import { readingTable } from '../../../src/views/present/readings-sheet.ts';
import { readColumns, unitsOf } from '../../../src/views/screen/read/columns.ts';
import { asCsv } from '../../../src/views/screen/read/export.ts';
import { pastedRows } from '../../../src/views/screen/read/rows.ts';
import { transmitter, uTube, venturi } from '../../core/reading/sample.ts';
import { solved, steam } from '../../core/sample.ts';

const NBSP = /[\u00a0\u202f\u2009]/g;

function present(
  instrument: InstrumentText,
  readings: readonly ReadingText[],
  meter: MeterText = venturi,
  display: Project['display'] = 'SI',
) {
  const own: MeterText = { ...meter, instrument, readings: [...readings] };
  const project: Project = { format: 'headwright', version: 1, display, meters: [own] };
  const result = solved(own);
  return { readings: presentReadings(own, project, result), table: readingTable(own, project, result).readings };
}
const sentence = (
  instrument: InstrumentText,
  row: ReadingText,
  meter?: MeterText,
  display?: Project['display'],
): string =>
  (present(instrument, [row], meter, display).readings.rows[0]?.answer ?? [])
    .map(({ text }) => text)
    .join('')
    .replace(NBSP, ' ');

describe('the sentence of a row', () => {
  it('says what was read, what that is and what flows', () => {
    expect(sentence(uTube, { value: '152 mm' })).toMatch(
      /^152 mm of mercury under the process fluid is 186\.5 mbar: .* flows\.$/,
    );
    expect(sentence({ kind: 'differential' }, { value: '0 mbar' })).toMatch(/: nothing flows\.$/);
    expect(sentence({ ...transmitter, cutOff: '5 %' }, { value: '4.02 mA' })).toMatch(
      /below the cut-off: nothing flows\.$/,
    );
    expect(sentence(transmitter, { value: '22 mA' })).toBe('22 mA: the instrument reports a failure.');
  });
  it('of a row that cannot be solved says why, be it the row or its instrument', () => {
    const row = (instrument: InstrumentText, value: string) => present(instrument, [{ value }]).readings.rows[0];
    const { liquid: _, ...unfilled } = uTube;
    expect(row(unfilled, '152 mm')?.answer[0]?.text).toBe('The reading waits for its instrument.');
    expect(row(unfilled, '152 mm')?.under).toContain('gauge liquid is not given');
    expect(row(uTube, '15o')?.answer[0]?.text).toBe('This reading cannot be used.');
    expect(row(uTube, '15o')?.under).toContain("The unit 'o'");
  });
  it('names the cell that was used', () => {
    const stacked = { ...transmitter, lowRange: { upper: '25 mbar' } };
    expect(sentence(stacked, { value: '5.3 mA', lowRange: '17.2 mA' })).toMatch(/^17\.2 mA of the low range is /);
  });
  it('follows the display', () => {
    expect(sentence(uTube, { value: '6 in' }, venturi, 'US')).toMatch(/^6 in of mercury .* inH₂O.*: .*lb\/h flows\.$/);
  });
});

describe('what goes along', () => {
  it('cautions of the instrument and of the service', () => {
    const said = (instrument: InstrumentText, meter?: MeterText) =>
      present(instrument, [], meter).readings.cautions.join(' ');
    expect(said(uTube)).toContain('Mercury');
    expect(said(uTube)).toContain('meniscus');
    expect(said(transmitter)).toContain('Three-valve manifold');
    expect(said(transmitter)).not.toContain('Wet legs');
    expect(said(transmitter, steam)).toContain('Wet legs');
    expect(said({ kind: 'gauges' })).not.toContain('manifold');
    const oxygen: MeterText = {
      ...venturi,
      fluid: { kind: 'gas', composition: { oxygen: '99.5 %', argon: '0.5 %' } },
      upstream: { pressure: '8 bar(g)', temperature: '20 degC' },
    };
    expect(said({ kind: 'differential' }, oxygen)).toContain('Oxygen');
  });
  it('a sheet has what is written and no empty column', () => {
    const { table } = present(uTube, [{ value: '152 mm' }, { value: '149 mm', temperature: '17.5 degC' }]);
    expect(table?.heads.map(({ label }) => label).slice(0, 3)).toEqual(['Reading', 'Temperature', 'Differential']);
    expect(table?.rows).toHaveLength(2);
    expect(present(uTube, []).table).toBeUndefined();
  });
});

describe('the table', () => {
  const columns = readColumns('differential', '', false);
  const units = unitsOf([], columns, {}, 'SI');
  const pasted = (text: string, rows: readonly unknown[] = [], row = 0, column = 1) =>
    pastedRows(text, rows, { row, column }, columns, units);
  it('takes a block in the units of its header, else in those of its columns', () => {
    expect(pasted('dp (kPa)\tp\n18.65\t3,1\n').rows).toEqual([{ value: '18.65 kPa', pressure: '3.1 bar(g)' }]);
    expect(pasted('186.5\n182.8\n', [{ time: '09:10', note: 'kept' }]).rows).toEqual([
      { time: '09:10', note: 'kept', value: '186.5 mbar' },
      { value: '182.8 mbar' },
    ]);
  });
  it('keeps what cannot be read as it was written', () => {
    expect(pasted('186.5\nbroken\n').rows).toEqual([{ value: '186.5 mbar' }, { value: 'broken' }]);
  });
  it('guards words in a CSV file and leaves numbers alone', () => {
    const cell = (type: 'words' | 'number', text: string) => ({ type, text }) as const;
    const rows = [
      ['=1', '+1', '-1', '@a', 'a,b', 'a"b'].map((text) => cell('words', text)),
      [cell('number', '-1.5e3')],
    ];
    expect(asCsv(rows)).toBe(`'=1,'+1,'-1,'@a,"a,b","a""b"\r\n-1.5e3\r\n`);
  });
});
