/** A table of quantities from a spreadsheet: one column each, units in the header, in the cells, or as the form has them. */
import { readTyped } from '../../../core/quantity/typed.ts';
import { type Measure, type Unit, unitOf } from '../../../core/quantity/units.ts';
import { type Rows, rowsOf } from './paste.ts';

export interface Column {
  readonly name: string;
  readonly measures: readonly Measure[];
}

/** One row of texts for the file, by column. */
export type Row = Readonly<Record<string, string>>;

export interface PastedTable {
  readonly rows: readonly Row[];
  /** The units the header named, by column. */
  readonly units: Readonly<Record<string, Unit>>;
  /** Lines below the header that hold no figures, as they were written. */
  readonly unread: readonly string[];
}

const hasFigure = (row: Rows[number]): boolean => /^[+\-\u2212]?[\d.,]*\d/.test(row.find((cell) => cell !== '') ?? '');

/** @param usual the unit of a column where the text says none */
export function pastedTable(
  text: string,
  columns: readonly Column[],
  usual: Readonly<Record<string, Unit>>,
): PastedTable {
  const rows = rowsOf(text);
  const first = Math.max(0, rows.findIndex(hasFigure));
  const heads = rows.slice(0, first).map((cells) => cells.map((cell) => unitIn(cell, columns)));
  const places = placesOf(heads.find((units) => units.some((unit) => unit !== undefined)) ?? [], columns);
  const below = rows.slice(first);
  return {
    rows: below.filter(hasFigure).map((row) => rowOf(row, columns, places, usual)),
    units: Object.fromEntries(
      columns.flatMap(({ name }) => (places[name]?.unit === undefined ? [] : [[name, places[name].unit]])),
    ),
    unread: below.filter((row) => !hasFigure(row)).map((row) => row.join(' ')),
  };
}

/** A unit in brackets, behind a solidus, or alone in the cell. */
export function unitIn(head: string, columns: readonly Column[]): Unit | undefined {
  const [, bracketed] = /[([]([^)\]]+)[)\]]\s*$/.exec(head) ?? [];
  const [, behind] = /^[^/]*?\s*\/\s*(.+)$/.exec(head) ?? [];
  const [, last] = /\s(\S+)$/.exec(head) ?? [];
  const measures = columns.flatMap((column) => column.measures);
  const whole = /\[([^\]]+)\]\s*$/.exec(head)?.[1];
  for (const spelling of [whole, bracketed, behind, last, head]) {
    const unit = spelling === undefined ? undefined : unitOf(spelling, measures);
    if (unit !== undefined) return unit;
  }
  return undefined;
}

interface Place {
  readonly at: number;
  readonly unit: Unit | undefined;
}

/** Where each column stands: as the units of the header say if they say it of all, else in the order of the form. */
function placesOf(units: readonly (Unit | undefined)[], columns: readonly Column[]): Readonly<Record<string, Place>> {
  const found = columns.map(({ measures }) => units.findIndex((unit) => unit && measures.includes(unit.measure)));
  const told = found.every((at) => at >= 0);
  return Object.fromEntries(
    columns.map(({ name, measures }, order) => {
      const at = told ? (found[order] ?? order) : order;
      const unit = units[at];
      return [name, { at, unit: unit && measures.includes(unit.measure) ? unit : undefined }];
    }),
  );
}

/** A cell that cannot be read stays as it was written: its problem is shown where it stands. */
function rowOf(
  row: Rows[number],
  columns: readonly Column[],
  places: Readonly<Record<string, Place>>,
  usual: Readonly<Record<string, Unit>>,
): Row {
  return Object.fromEntries(
    columns.flatMap(({ name, measures }, order) => {
      const cell = row[places[name]?.at ?? order] ?? '';
      const unit = places[name]?.unit ?? usual[name];
      if (cell === '') return [];
      const read = readTyped(cell, measures, '', unit && { unit });
      return [[name, read.ok ? read.value.file : cell]];
    }),
  );
}
