/** Readings from a spreadsheet: what stands in a pasted text, and to which points it goes. */
import type { ReadingCell } from '../../../state/readings.ts';
import { type Rows, rowsOf } from '../fluid/paste.ts';

/** Points of each line of the plan. */
export type Counts = readonly number[];

export interface Taken {
  readonly cells: readonly ReadingCell[];
  /** Texts that have no point. */
  readonly left: number;
}

const hasDigit = (text: string): boolean => /\d/.test(text);

/** The rows that hold figures, without a first column of words. */
export function figuresIn(text: string): Rows {
  const rows = rowsOf(text).filter((row) => row.some(hasDigit));
  const named = rows.length > 0 && rows.every(([first = '']) => !hasDigit(first));
  return named ? rows.map((row) => row.slice(1)) : rows;
}

/** The texts one after the other where the paste is a single column or row; undefined for a block. */
export function sequenceOf(rows: Rows): readonly string[] | undefined {
  const first = rows[0] ?? [];
  if (rows.length === 1) return first;
  return rows.every((row) => row.slice(1).every((cell) => cell === '')) ? rows.map(([cell = '']) => cell) : undefined;
}

/** Takes texts in the order of measuring, from one point on. */
export function inOrder(texts: readonly string[], counts: Counts, from: { line: number; point: number }): Taken {
  const places = counts.flatMap((count, line) => Array.from({ length: count }, (_, point) => ({ line, point })));
  const start = places.findIndex(({ line, point }) => line === from.line && point === from.point);
  const cells = texts.flatMap((text, at) => {
    const place = places[start + at];
    return place === undefined || start < 0 ? [] : [{ ...place, text }];
  });
  return { cells, left: texts.length - cells.length };
}

/** Takes a block, each of its rows or each of its columns a line. Undefined where it has more than the plan. */
export function inLines(rows: Rows, counts: Counts, way: 'rows' | 'columns'): readonly ReadingCell[] | undefined {
  const width = Math.max(0, ...rows.map((row) => row.length));
  const lines =
    way === 'rows' ? rows : Array.from({ length: width }, (_, column) => rows.map((row) => row[column] ?? ''));
  const fits = lines.length <= counts.length && lines.every((line, at) => line.length <= (counts[at] ?? 0));
  return fits ? lines.flatMap((line, at) => line.map((text, point) => ({ line: at, point, text }))) : undefined;
}
