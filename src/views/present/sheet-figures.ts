/** The figures of a sheet: fluid, pipe and element as rows, and the table of the flows. */
import type { DutyName, Project } from '../../core/document/project.ts';
import type { Solved } from '../../core/result/record.ts';
import * as words from '../words/sheet.ts';
import { asPrinted } from './base.ts';
import type { Context } from './context.ts';
import type { DutyColumn, DutyRow, PresentedSizing, Value } from './model.ts';
import { type KeyOf, type SheetRow, sheetRow } from './sources.ts';

export interface DutyTable {
  readonly columns: readonly {
    readonly id: DutyColumn;
    readonly label: string;
    readonly symbol: string;
    readonly measure: string; // '/ mbar'; '' where the rows have no unit or different ones
    readonly key: string;
  }[];
  readonly rows: readonly { readonly name: DutyName; readonly label: string; readonly cells: readonly string[] }[];
}

/** Every column that the flows have figures for. */
const columnsOf = (rows: readonly DutyRow[]): readonly DutyColumn[] =>
  (Object.keys(words.dutyHeads) as DutyColumn[]).filter((id) => rows.some((row) => row.cells[id] !== undefined));

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
  const absolute = at.value(result.state.pressure_Pa, 'pressure').text;
  const name = fluid.phase === fluid.name.toLowerCase() ? fluid.name : `${fluid.name}, ${fluid.phase}`;
  const pressures = pressure === undefined ? [] : [pressure];
  const below: readonly SheetRow[] = pressure?.text.endsWith('(g)')
    ? [
        {
          id: 'absolute',
          label: words.absolutePressure,
          text: absolute,
          key: '',
          note: atmosphereNote(at, site, result),
        },
      ]
    : [];
  const stated = (text: unknown, measure: 'absolute pressure' | 'temperature', si: number): string =>
    at.given(text, [measure], si, measure === 'temperature' ? 'temperature' : 'pressure').text;
  const atBase = words.atBase(
    stated(base?.pressure, 'absolute pressure', result.site.basePressure_Pa),
    stated(base?.temperature, 'temperature', result.site.baseTemperature_K),
  );
  return [
    { id: 'fluid', label: words.fluidRow, text: name, key: '' },
    ...pressures,
    ...below,
    ...others.map((row) => (row.id === 'baseDensity' ? { ...row, note: atBase } : row)),
  ];
}

/** The atmosphere that a gauge pressure stands on, and where it comes from if nobody stated it. */
function atmosphereNote(at: Context, site: Project['site'], { site: found }: Solved): string {
  const pressure = at.given(site?.atmosphere, ['absolute pressure'], found.atmosphere_Pa, 'pressure').text;
  if (found.atmosphereFrom !== 'place') return words.atAtmosphere(pressure);
  return words.atStandardAtmosphere(pressure, asPrinted(site?.altitude ?? ''));
}

/** How a diameter was measured stands below the section. */
const withoutNote = ({ note, ...row }: SheetRow): SheetRow => row;

export const pipeSheetRows = ({ pipe }: PresentedSizing, keyOf: KeyOf): readonly SheetRow[] =>
  pipe.map((row) => withoutNote(sheetRow(row, keyOf)));

export const elementRows = ({ metal }: PresentedSizing, keyOf: KeyOf): readonly SheetRow[] =>
  metal.map((row) => withoutNote(sheetRow(row, keyOf)));

/** The differential that the instrument spans, in words. */
export const spanText = (at: Context, { span_Pa, find }: Solved): string =>
  words.spanOf(
    find === 'differential' // what is written then belongs to an earlier question
      ? at.value(span_Pa, 'differential').text
      : at.given(at.meter.differential, ['pressure difference'], span_Pa, 'differential').text,
  );

/** The flows with one unit a column; the sources are those of the working at maximum flow. */
export function dutyTable({ duty, working, coefficient }: PresentedSizing, keyOf: KeyOf): DutyTable {
  const lines = working.find(({ id }) => id === 'maximum')?.rows ?? [];
  const own = { label: coefficient.head, symbol: coefficient.symbol };
  const heads = columnsOf(duty).map((id) => {
    const line = lines.find((row) => row.id === words.dutyWorking[id]);
    return {
      id,
      ...words.dutyHeads[id],
      ...(id === 'coefficient' ? own : {}),
      unit: unitOf(duty, id),
      key: keyOf(line?.cited),
    };
  });
  const cell = (row: DutyRow, { id, unit }: (typeof heads)[number]): string =>
    cellText(row.cells[id], id === 'uncertainty' ? '±' : '', unit);
  return {
    columns: heads.map(({ unit, ...head }) => ({ ...head, measure: measureText(head.id, unit) })),
    rows: duty.map((row) => ({ name: row.name, label: row.label, cells: heads.map((head) => cell(row, head)) })),
  };
}

/** A figure, with its own unit where the column has none in common; a dash where there is none. */
function cellText(value: Value | undefined, sign: string, unit: string): string {
  if (value === undefined) return words.dash;
  return sign === '' && unit !== '' ? value.number : `${sign}${value.text}`;
}

const measureText = (id: DutyColumn, unit: string): string =>
  id === 'uncertainty' ? words.atCoverage : unit === '' ? '' : `/ ${unit}`;

/** The one unit of a column; '' where its rows have none or are written in different ones. */
function unitOf(rows: readonly DutyRow[], column: DutyColumn): string {
  const [first, ...more] = new Set(rows.flatMap((row) => row.cells[column]?.unit ?? []));
  return first === undefined || more.length > 0 ? '' : first;
}
