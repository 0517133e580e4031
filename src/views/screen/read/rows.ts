/** Edits of the list of readings as a whole: a pasted block, a column filled down. */
import { rowsOf } from '../fluid/paste.ts';
import { unitIn } from '../fluid/paste-table.ts';
import { fileCell } from '../fluid/rows.ts';
import { textAt } from '../text.ts';
import type { ReadColumn, Units } from './columns.ts';

export type Row = Readonly<Record<string, unknown>>;

/** The rows as they stand; what is no row is kept as an empty one's place. */
const rowAt = (rows: readonly unknown[], at: number): Row => {
  const row = rows[at];
  return typeof row === 'object' && row !== null && !Array.isArray(row) ? (row as Row) : {};
};

/** A pasted block and the rows it makes, from the cell it was pasted into on. */
export function pastedRows(
  text: string,
  rows: readonly unknown[],
  from: { readonly row: number; readonly column: number },
  columns: readonly ReadColumn[],
  units: Units,
): { readonly rows: readonly unknown[]; readonly taken: number } {
  const block = rowsOf(text);
  const headed = block.length > 1 && !(block[0] ?? []).some((cell) => /\d/.test(cell.replace(/\(.*\)|\[.*\]/, '')));
  const heads = headed ? (block[0] ?? []) : [];
  const body = headed ? block.slice(1) : block;
  const next: unknown[] = [...rows];
  while (next.length < from.row) next.push({});
  body.forEach((cells, down) => {
    const written = cells.map((cell, across): readonly [string, string] | undefined => {
      const column = columns[from.column + across];
      return column === undefined ? undefined : [column.name, fileText(cell, column, units, heads[across] ?? '')];
    });
    next[from.row + down] = withCells(rowAt(rows, from.row + down), written);
  });
  return { rows: next, taken: body.length };
}

/** The text of a cell for the file: in the unit its header names, else in that of the column. */
function fileText(cell: string, column: ReadColumn, units: Units, head: string): string {
  if (column.kind === undefined) return cell;
  const { measures } = column.kind;
  const unit = unitIn(head, [{ name: column.name, measures }]) ?? units[column.name];
  return unit === undefined ? cell : fileCell(cell, column, unit);
}

/** A row with cells written; an empty text takes the key away. */
function withCells(row: Row, cells: readonly (readonly [string, string] | undefined)[]): Row {
  const next: Record<string, unknown> = { ...row };
  for (const cell of cells) {
    if (cell === undefined) continue;
    const [name, text] = cell;
    if (text === '') delete next[name];
    else next[name] = text;
  }
  return next;
}

/** The text of the nearest row above that has one, in every row below that has none, from `row` on. */
export function filledDown(rows: readonly unknown[], name: string, row = 0): readonly unknown[] {
  let last = '';
  return rows.map((one, at) => {
    const own = textAt(one, name);
    if (own !== '' || at < row) {
      last = own === '' ? last : own;
      return one;
    }
    return last === '' ? one : withCells(rowAt(rows, at), [[name, last]]);
  });
}

/** One cell from the row above it. */
export function fromAbove(rows: readonly unknown[], name: string, row: number): string {
  return row > 0 ? textAt(rows[row - 1], name) : '';
}
