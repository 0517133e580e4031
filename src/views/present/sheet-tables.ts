/** The tables of a sheet: fluid, pipe, element, the flows, and what makes their uncertainty. */
import type { DutyName, Project } from '../../core/document/project.ts';
import type { Solved } from '../../core/result/record.ts';
import * as words from '../words/sheet.ts';
import type { Context } from './context.ts';
import type { DutyColumn, DutyRow, PresentedSizing } from './model.ts';
import { type KeyOf, type SheetRow, sheetRow } from './sources.ts';

export interface DutyTable {
  readonly columns: readonly {
    readonly id: DutyColumn;
    readonly label: string;
    readonly symbol: string;
    readonly unit: string; // '' where the rows have none or different ones
    readonly key: string;
  }[];
  readonly rows: readonly { readonly name: DutyName; readonly label: string; readonly cells: readonly string[] }[];
}

export interface TermTable {
  readonly flows: readonly string[];
  readonly rows: readonly { readonly label: string; readonly cells: readonly string[] }[];
}

const columns = Object.keys(words.dutyHeads) as DutyColumn[];
const standardAtmosphere = 101_325; // Pa; the default of the file format

/** The fluid and its state; a gauge pressure is followed by the absolute one and the atmosphere it stands on. */
export function fluidRows(
  at: Context,
  { site, base }: Project,
  result: Solved,
  { fluid, state }: PresentedSizing,
  keyOf: KeyOf,
): readonly SheetRow[] {
  const rows = state.map((row) => sheetRow(row, keyOf));
  const [pressure, ...others] = rows;
  const atmosphere = at.given(site?.atmosphere, ['absolute pressure'], standardAtmosphere, 'pressure').text;
  const absolute = at.value(result.state.pressure_Pa, 'pressure').text;
  const name = fluid.phase === fluid.name.toLowerCase() ? fluid.name : `${fluid.name}, ${fluid.phase}`;
  const pressures = pressure === undefined ? [] : [pressure];
  const below: readonly SheetRow[] = pressure?.text.endsWith('(g)')
    ? [{ id: 'absolute', label: words.absolutePressure, text: absolute, key: '', note: words.atAtmosphere(atmosphere) }]
    : [];
  const stated = (text: unknown, measure: 'absolute pressure' | 'temperature', si: number): string =>
    at.given(text, [measure], si, measure === 'temperature' ? 'temperature' : 'pressure').text;
  const atBase = words.atBase(
    stated(base?.pressure, 'absolute pressure', standardAtmosphere),
    stated(base?.temperature, 'temperature', 288.15),
  );
  return [
    { id: 'fluid', label: words.fluidRow, text: name, key: '' },
    ...pressures,
    ...below,
    ...others.map((row) => (row.id === 'baseDensity' ? { ...row, note: atBase } : row)),
  ];
}

export const pipeSheetRows = ({ pipe }: PresentedSizing, keyOf: KeyOf): readonly SheetRow[] =>
  pipe.map((row) => sheetRow(row, keyOf));

export function elementRows(at: Context, result: Solved, { metal }: PresentedSizing, keyOf: KeyOf): readonly SheetRow[] {
  const span = at.given(at.meter.differential, ['pressure difference'], result.span_Pa, 'differential');
  return [
    ...metal.map((row) => sheetRow(row, keyOf)),
    { id: 'span', label: words.spanRow, text: span.text, key: '' },
  ];
}

/** The flows with one unit a column; the sources are those of the working at maximum flow. */
export function dutyTable({ duty, working }: PresentedSizing, keyOf: KeyOf): DutyTable {
  const lines = working.find(({ id }) => id === 'maximum')?.rows ?? [];
  const heads = columns.map((id) => {
    const line = lines.find((row) => row.id === words.dutyWorking[id]);
    return { id, ...words.dutyHeads[id], unit: unitOf(duty, id), key: keyOf(line?.cited) };
  });
  const cell = (row: DutyRow, { id, unit }: (typeof heads)[number]): string =>
    id === 'uncertainty' ? `±${row.cells[id].text}` : unit === '' ? row.cells[id].text : row.cells[id].number;
  return {
    columns: heads.map((head) => (head.id === 'uncertainty' ? { ...head, unit: '95 %' } : head)),
    rows: duty.map((row) => ({ name: row.name, label: row.label, cells: heads.map((head) => cell(row, head)) })),
  };
}

/** The one unit of a column; '' where its rows have none or are written in different ones. */
function unitOf(rows: readonly DutyRow[], column: DutyColumn): string {
  const [first, ...more] = new Set(rows.map((row) => row.cells[column].unit));
  return first === undefined || more.length > 0 ? '' : first;
}

/** Terms in the order of the first flow; a term that is nothing at a flow has a dash. */
export function termTable({ duty }: PresentedSizing): TermTable {
  const labels = [...new Set(duty.flatMap(({ terms }) => terms.map(({ label }) => label)))];
  const cells = (label: string): readonly string[] =>
    duty.map(({ terms }) => terms.find((term) => term.label === label)?.value.text ?? '–');
  const whole = { label: words.total, cells: duty.map((row) => row.cells.uncertainty.text) };
  return {
    flows: duty.map(({ name }) => words.flowAt(name)),
    rows: [...labels.map((label) => ({ label, cells: cells(label) })), whole],
  };
}
