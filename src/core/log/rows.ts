/**
 * The reader of a log: bytes in pieces of any length go in, chunks of rows come out. What it answers does not depend on
 * where the pieces are cut. Its memory does not grow: a row that is longer than LONGEST_ROW is given up at its next
 * line end. Line ends are LF, CR LF and CR, also mixed.
 */
import type { Chunk } from './chunk.ts';
import { toUtf8 } from './encoding.ts';
import type { Mapping } from './mapping.ts';
import { oddRow } from './odd.ts';
import { plainRow } from './plain.ts';
import { handOver, LINE_END, openReader, type Reader, roomOf, type UnreadRow } from './reader.ts';
import { afterLineEnd, CR, LF, LONGEST_ROW } from './split.ts';

export type { UnreadRow } from './reader.ts';

/** What is known of a log when it has ended. */
export interface LogEnd {
  /** Rows handed over. */
  readonly rows: number;
  /** Lines of no characters; they are no rows. */
  readonly blank: number;
  /** Rows whose quoted text goes over several lines. */
  readonly spanning: number;
  /** Whether the log ends without a line end: its last row may have been cut. */
  readonly endsOpen: boolean;
  /** The first rows of each trouble. */
  readonly samples: readonly UnreadRow[];
}

export interface RowReader {
  /** Reads a piece of the log; the bytes may be used again afterwards. */
  push(bytes: Uint8Array): void;
  /** Reads what is left, hands over the last rows and tells the end. */
  finish(): LogEnd;
}

/** Rows in a chunk, where no other number is asked for. */
export const CHUNK_ROWS = 4096;

/** Opens a reader; the chunk that `take` gets is filled again after the call. */
export function openRows(mapping: Mapping, take: (chunk: Chunk) => void, chunkRows = CHUNK_ROWS): RowReader {
  const reader = openReader(mapping, take, chunkRows);
  return { push: (bytes) => push(reader, bytes), finish: () => finish(reader) };
}

function push(reader: Reader, bytes: Uint8Array): void {
  const { transcoder, mark } = reader;
  const dropped = Math.min(mark, bytes.length);
  reader.mark -= dropped;
  const rest = bytes.subarray(dropped);
  if (!transcoder) {
    pushPlain(reader, rest);
    return;
  }
  for (let at = 0; at < rest.length; at += LONGEST_ROW)
    pushPlain(reader, toUtf8(transcoder, rest.subarray(at, at + LONGEST_ROW)));
}

function pushPlain(reader: Reader, bytes: Uint8Array): void {
  let at = 0;
  while (at < bytes.length) {
    if (reader.passing) at = lineEndFrom(bytes, at);
    const taken = bytes.subarray(at, at + roomOf(reader));
    if (taken.length === 0 && at < bytes.length) throw new Error('log: expected room in the window, got none');
    reader.window.set(taken, reader.end);
    reader.end += taken.length;
    at += taken.length;
    const isLong = reader.end - reader.start > LONGEST_ROW;
    if (isLong || reader.passing || taken.includes(LF) || taken.includes(CR)) drain(reader, false);
  }
}

/** Place of the next line end, or the end of the bytes. */
function lineEndFrom(bytes: Uint8Array, from: number): number {
  const ends = [bytes.indexOf(LF, from), bytes.indexOf(CR, from)].filter((at) => at >= 0);
  return Math.min(...ends, bytes.length);
}

/** Reads all rows of the window that are whole, and moves what is left to its beginning. */
function drain(reader: Reader, final: boolean): void {
  const { window } = reader;
  const whole = final ? reader.end : behindLastLineEnd(reader);
  while (reader.start < reader.end) if (!step(reader, whole, final)) break;
  window.copyWithin(0, reader.start, reader.end);
  reader.end = Math.max(reader.end - reader.start, 0);
  reader.start = 0;
}

function behindLastLineEnd({ window, classes, start, end }: Reader): number {
  let at = end;
  while (at > start && classes[window[at - 1] as number] !== LINE_END) at -= 1;
  return at;
}

/** One row, one blank line, or the rest of a row that was given up; false when more bytes are needed. */
function step(reader: Reader, whole: number, final: boolean): boolean {
  const { window, classes, start, end } = reader;
  if (reader.afterReturn) {
    reader.afterReturn = false;
    if (window[start] === LF) {
      reader.start += 1;
      return true;
    }
  }
  if (reader.passing) return passOn(reader, start);
  if (classes[window[start] as number] === LINE_END) {
    reader.blank += 1;
    return passLineEnd(reader, start);
  }
  const plainEnd = start < whole && reader.skip === 0 ? plainRow(reader, start) : -1;
  if (plainEnd >= 0) return passLineEnd(reader, plainEnd);
  const split = oddRow(reader, final);
  if (split === undefined) return false;
  if (reader.skip > 0) reader.skip -= 1;
  if (split.state === 'whole') return split.end < end ? passLineEnd(reader, split.end) : stop(reader);
  return passOn(reader, split.state === 'quote-open' ? start : split.end);
}

function stop(reader: Reader): boolean {
  reader.start = reader.end;
  return false;
}

/** Goes behind the line end at a place. */
function passLineEnd(reader: Reader, at: number): boolean {
  const { window, end } = reader;
  if (window[at] !== CR) reader.start = at + 1;
  else if (at + 1 < end) reader.start = window[at + 1] === LF ? at + 2 : at + 1;
  else {
    reader.start = at + 1;
    reader.afterReturn = true;
  }
  return true;
}

/** Gives a row up: goes behind the next line end from a place on, or drops all until it comes. */
function passOn(reader: Reader, from: number): boolean {
  const { window, end } = reader;
  const next = afterLineEnd(window, from, end);
  reader.passing = next < 0;
  reader.start = next < 0 ? end : next;
  reader.afterReturn = next === end && window[end - 1] === CR;
  return next >= 0;
}

/** The last row may stand without its line end; one is put behind it, so that it is read like the others. */
function finish(reader: Reader): LogEnd {
  const last = reader.window[reader.end - 1];
  const endsOpen = reader.passing || (reader.end > 0 && last !== LF && last !== CR);
  reader.window[reader.end] = LF;
  drain(reader, true);
  handOver(reader);
  const { row, blank, spanning, samples } = reader;
  return { rows: row, blank, spanning, endsOpen, samples };
}
