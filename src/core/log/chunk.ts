/**
 * The rows of a log, column by column: what the reader hands over and its consumers walk through. A chunk is filled,
 * handed over, and filled again: who wants to keep a figure copies it.
 */

/** Why a row cannot be read, by the number in `trouble`; 0 is a row without trouble. */
export const TROUBLES = [
  'none',
  'fields-too-few',
  'fields-too-many',
  'quote-open', // a quote that no line end closes
  'line-too-long',
  'nul-byte',
  'header-again',
  'time-empty',
  'time-unreadable',
  'time-impossible', // 30 February, 25 h
  'time-skipped', // in the hour that the clocks leave out
  'signal-empty',
  'signal-unreadable',
  'signal-out-of-range', // beyond a double, at either end
  'pressure-unreadable',
  'pressure-out-of-range',
  'temperature-unreadable',
  'temperature-out-of-range',
] as const;

export type Trouble = (typeof TROUBLES)[number];

/** Number of a trouble in `Chunk.trouble`. */
export const troubleOf = (code: Trouble): number => TROUBLES.indexOf(code);

/** Bits of `Chunk.missing`. */
export const PRESSURE_MISSING = 1;
export const TEMPERATURE_MISSING = 2;
/** The stamp stands in the hour that the clocks repeat; its turn is told by the order of the rows. */
export const TIME_REPEATED = 4;

export interface Chunk {
  /** Rows filled; what stands behind them is of an earlier filling. */
  size: number;
  /** Number of the data row, 1 for the first after the header. Blank lines are no rows. */
  readonly row: Float64Array;
  /** s since 1970-01-01 UTC, or the seconds of a plain clock; NaN-free, 0 where `trouble` is not 0. */
  readonly time: Float64Array;
  /** Pa of a differential; mA, V or per cent of a signal; 0 where `trouble` is not 0. */
  readonly signal: Float64Array;
  /** Pa absolute; absent when no column holds it. 0 where the bit of `missing` is set. */
  readonly pressure?: Float64Array;
  /** K; absent when no column holds it. 0 where the bit of `missing` is set. */
  readonly temperature?: Float64Array;
  /** 0, or the number of the reason in TROUBLES why the row cannot be read. */
  readonly trouble: Uint8Array;
  /** Bits of what is absent in a row that can be read. */
  readonly missing: Uint8Array;
}

/** An empty chunk for that many rows. */
export function emptyChunk(
  rows: number,
  columns: { readonly pressure: boolean; readonly temperature: boolean },
): Chunk {
  return {
    size: 0,
    row: new Float64Array(rows),
    time: new Float64Array(rows),
    signal: new Float64Array(rows),
    ...(columns.pressure ? { pressure: new Float64Array(rows) } : {}),
    ...(columns.temperature ? { temperature: new Float64Array(rows) } : {}),
    trouble: new Uint8Array(rows),
    missing: new Uint8Array(rows),
  };
}
