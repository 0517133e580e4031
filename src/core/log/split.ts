/**
 * One row of delimited text, taken apart with its quotes: the careful way, for rows that are not plain and for the
 * preview. A field that opens with a quote ends at the next single one, doubled quotes stand for one; behind it stands
 * a delimiter or a line end. A quote inside a field that does not open with one is a character like any other.
 */

/** Longest row that is read, bytes. A longer one is left at its next line end. */
export const LONGEST_ROW = 1 << 16;
/** Line ends that quoted text of one row may hold. A quote still open then was never meant to be closed. */
const MOST_LINES = 16;

export const LF = 10;
export const CR = 13;
export const QUOTE = 34;
export const NUL = 0;

export interface Split {
  /** `partial` rows go on behind the bytes at hand. */
  readonly state: 'whole' | 'partial' | 'quote-open' | 'line-too-long';
  /** Where the row ends: at its line end, or at the end of the bytes. */
  readonly end: number;
  /** Starts and ends of the fields, quotes included. */
  readonly edges: readonly number[];
  /** Whether line ends stand inside quotes. */
  readonly spans: boolean;
}

const isLineEnd = (byte: number | undefined): boolean => byte === LF || byte === CR;

/** Takes the row at a place apart. `final` when no bytes follow those up to `size`. */
export function splitRow(bytes: Uint8Array, at: number, size: number, delimiter: number, final: boolean): Split {
  const limit = Math.min(size, at + LONGEST_ROW);
  const edges: number[] = [];
  let place = at;
  let lines = 0;
  for (;;) {
    const start = place;
    if (bytes[place] === QUOTE && place < limit) {
      const closed = closingQuote(bytes, place + 1, limit);
      lines += closed.lines;
      if (closed.at < 0 && lines <= MOST_LINES && limit === size && !final) return { ...PARTIAL, end: size };
      if (closed.at < 0 || lines > MOST_LINES) return { state: 'quote-open', end: place, edges, spans: false };
      place = closed.at + 1;
      if (place < limit && bytes[place] !== delimiter && !isLineEnd(bytes[place]))
        return { state: 'quote-open', end: place, edges, spans: false };
    } else while (place < limit && bytes[place] !== delimiter && !isLineEnd(bytes[place])) place += 1;
    edges.push(start, place);
    if (place >= limit) return cutRow(edges, place, size, final, lines > 0);
    if (bytes[place] !== delimiter) return { state: 'whole', end: place, edges, spans: lines > 0 };
    place += 1;
  }
}

const PARTIAL = { state: 'partial', edges: [], spans: false } as const;

/** A row without a line end in what may be looked at. */
function cutRow(edges: number[], end: number, size: number, final: boolean, spans: boolean): Split {
  if (end < size) return { state: 'line-too-long', end, edges, spans };
  return final ? { state: 'whole', end, edges, spans } : { ...PARTIAL, end };
}

/** Place of the quote that closes a text, -1 when none does, and the line ends before it. */
function closingQuote(bytes: Uint8Array, from: number, limit: number): { readonly at: number; readonly lines: number } {
  let lines = 0;
  for (let at = from; at < limit; at += 1) {
    const byte = bytes[at];
    if (byte === QUOTE) {
      if (bytes[at + 1] !== QUOTE || at + 1 >= limit) return { at, lines };
      at += 1;
    } else if (byte === LF || (byte === CR && at + 1 < limit && bytes[at + 1] !== LF)) lines += 1;
  }
  return { at: -1, lines };
}

/** Bytes of a field without its quotes; doubled quotes joined. */
export function fieldBytes(bytes: Uint8Array, from: number, to: number): Uint8Array {
  if (bytes[from] !== QUOTE || to - from < 2) return bytes.subarray(from, to);
  const inner = bytes.subarray(from + 1, to - 1);
  if (!inner.includes(QUOTE)) return inner;
  return inner.filter((byte, at) => byte !== QUOTE || !isSecond(inner, at));
}

/** Whether a quote is the second of a doubled pair: the run of quotes before it is of odd length. */
function isSecond(bytes: Uint8Array, at: number): boolean {
  let run = 0;
  while (bytes[at - 1 - run] === QUOTE) run += 1;
  return run % 2 === 1;
}

/** Place behind the first line end from a place on; -1 when none stands before `size`. CR LF is one line end. */
export function afterLineEnd(bytes: Uint8Array, from: number, size: number): number {
  for (let at = from; at < size; at += 1) {
    if (!isLineEnd(bytes[at])) continue;
    return bytes[at] === CR && at + 1 < size && bytes[at + 1] === LF ? at + 2 : at + 1;
  }
  return -1;
}
