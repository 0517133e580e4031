/**
 * The careful way through a row: quotes, other spellings of figures and stamps, and the reason when a row cannot be
 * read. It reads every row that the quick way (plain.ts) reads, to the same bits.
 */
import { PRESSURE_MISSING, TEMPERATURE_MISSING, type Trouble } from './chunk.ts';
import { textOf } from './encoding.ts';
import { readFigure } from './figure.ts';
import type { FigureColumn } from './mapping.ts';
import { keepRow, keepTrouble, PRESSURE, type Reader, SIGNAL, TEMPERATURE, TIME } from './reader.ts';
import { fieldBytes, NUL, type Split, splitRow } from './split.ts';
import { readClock, readTime, type Stamp, type Time } from './time.ts';

/** Rows of one trouble that are kept to be shown, and the bytes of each. */
const MOST_SAMPLES = 5;
const SAMPLE_BYTES = 200;

/** Takes the row at the start of the window apart and accounts for it; undefined when its end has not come yet. */
export function oddRow(reader: Reader, final: boolean): Split | undefined {
  const { window, start, end, mapping } = reader;
  const split = splitRow(window, start, end, mapping.layout.delimiter, final);
  if (split.state === 'partial') return undefined;
  if (reader.skip > 0) return split;
  const trouble = split.state === 'whole' ? troubleIn(reader, split) : split.state;
  if (trouble !== undefined) keepSample(reader, trouble, split.end);
  if (split.spans) reader.spanning += 1;
  return split;
}

function keepSample(reader: Reader, trouble: Trouble, end: number): void {
  keepTrouble(reader, trouble);
  const { samples, window, start, row, mapping } = reader;
  if (samples.filter((sample) => sample.trouble === trouble).length >= MOST_SAMPLES) return;
  const bytes = window.slice(start, Math.min(end, start + SAMPLE_BYTES));
  samples.push({ trouble, row, text: textOf(bytes, mapping.layout.spelling.encoding) });
}

/** Reads a whole row into the chunk, or says why it cannot be read. */
function troubleIn(reader: Reader, split: Split): Trouble | undefined {
  const { window, start, mapping } = reader;
  const bytes = window.subarray(start, split.end);
  if (bytes.includes(NUL)) return 'nul-byte';
  if (isHeader(bytes, mapping.layout.header)) return 'header-again';
  const fields = countOf(split, mapping.layout.fields);
  if (fields < mapping.layout.fields) return 'fields-too-few';
  if (fields > mapping.layout.fields) return 'fields-too-many';
  const stamp = timeOf(reader, split);
  if (typeof stamp === 'string') return `time-${stamp}`;
  reader.figures[TIME] = stamp.seconds;
  reader.zoned = stamp.zoned;
  const signal = figureOf(reader, split, mapping.signal, SIGNAL);
  if (signal !== undefined) return signal === 'absent' ? 'signal-empty' : `signal-${signal}`;
  const pressure = mapping.pressure && figureOf(reader, split, mapping.pressure, PRESSURE);
  if (pressure !== undefined && pressure !== 'absent') return `pressure-${pressure}`;
  const temperature = mapping.temperature && figureOf(reader, split, mapping.temperature, TEMPERATURE);
  if (temperature !== undefined && temperature !== 'absent') return `temperature-${temperature}`;
  const missing = (pressure ? PRESSURE_MISSING : 0) | (temperature ? TEMPERATURE_MISSING : 0);
  return keepRow(reader, missing) ? undefined : 'time-skipped';
}

/** Fields of a row. One more than there should be is none when it is empty: the row ends with a delimiter. */
function countOf({ edges }: Split, wanted: number): number {
  const count = edges.length / 2;
  const isTail = count === wanted + 1 && edges.at(-1) === edges.at(-2);
  return isTail ? wanted : count;
}

function isHeader(bytes: Uint8Array, header: Uint8Array): boolean {
  if (header.length === 0) return false;
  const mark = bytes.length === header.length + 3 && bytes[0] === 0xef ? 3 : 0; // of a log joined to another
  return bytes.length === header.length + mark && header.every((byte, at) => byte === bytes[at + mark]);
}

function fieldText({ window, mapping }: Reader, { edges }: Split, column: number): string {
  const [from, to] = [edges[2 * column], edges[2 * column + 1]];
  if (from === undefined || to === undefined) throw new Error(`log: expected a field ${column}, got a shorter row`);
  return textOf(fieldBytes(window, from, to), mapping.layout.spelling.encoding);
}

function timeOf(reader: Reader, split: Split): Time {
  const { at, clockAt, format, figures } = reader.mapping.time;
  const date = readTime(fieldText(reader, split, at), format, figures);
  if (clockAt === undefined || typeof date === 'string') return date;
  return readClock(fieldText(reader, split, clockAt), date satisfies Stamp);
}

/** Puts a figure in SI among those of the row; undefined when it stands there, else why not. */
function figureOf(
  reader: Reader,
  split: Split,
  column: FigureColumn,
  role: number,
): 'absent' | 'unreadable' | 'out-of-range' | undefined {
  reader.figures[role] = 0;
  const figure = readFigure(fieldText(reader, split, column.at), column.figures);
  if (typeof figure === 'string') return figure;
  const si = (figure + column.before) * column.factor + column.after;
  if (!Number.isFinite(si)) return 'out-of-range';
  reader.figures[role] = si;
  return undefined;
}
