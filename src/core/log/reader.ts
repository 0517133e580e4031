/** What the reader of a log holds between two pieces of it, and how a row is put into the chunk. */
import { type Chunk, emptyChunk, TIME_REPEATED, type Trouble, troubleOf } from './chunk.ts';
import { openTranscoder, type Transcoder } from './encoding.ts';
import type { Mapping } from './mapping.ts';
import { CR, LF, LONGEST_ROW, NUL, QUOTE } from './split.ts';
import { localOf } from './zone.ts';

/** Classes of bytes, for a scan that stops where something is to be done. */
export const PLAIN = 0;
export const DELIMITER = 1;
export const LINE_END = 2;
export const ODD = 3;

/** Roles of columns. */
export const NO_ROLE = 0;
export const TIME = 1;
export const CLOCK = 2;
export const SIGNAL = 3;
export const PRESSURE = 4;
export const TEMPERATURE = 5;

/** A row that could not be read, kept to be shown. */
export interface UnreadRow {
  readonly trouble: Trouble;
  readonly row: number;
  /** The beginning of the row. */
  readonly text: string;
}

export interface Reader {
  readonly mapping: Mapping;
  readonly take: (chunk: Chunk) => void;
  readonly chunk: Chunk;
  /** Bytes that are not read yet, from `start` to `end`. */
  readonly window: Uint8Array;
  start: number;
  end: number;
  /** Class of each byte. */
  readonly classes: Uint8Array;
  /** Role of each column up to the last that has one. */
  readonly roles: Uint8Array;
  readonly scales: Scales;
  /** Figures of the row at hand, by role; 0 holds the place of what has no role. */
  readonly figures: Float64Array;
  /** The date of the last plain stamp as it is written, and its midnight, s since 1970. */
  readonly date: { readonly text: Uint8Array; seconds: number };
  readonly transcoder?: Transcoder;
  /** Bytes of the mark still to drop. */
  mark: number;
  /** Rows still to pass over before the data. */
  skip: number;
  /** Whether the rest of a row that was given up is passed over. */
  passing: boolean;
  /** Whether the last byte was a CR whose LF may follow. */
  afterReturn: boolean;
  /** Whether the stamp of the row at hand is in UTC or of a plain clock. */
  zoned: boolean;
  row: number;
  /** Time of the last row that has one, for the hour that is repeated. */
  lastTime: number;
  blank: number;
  spanning: number;
  readonly samples: UnreadRow[];
}

/** Decimal mark, zero, step and shift of the columns of figures, by role. */
interface Scales {
  readonly mark: Uint8Array;
  readonly before: Float64Array;
  readonly factor: Float64Array;
  readonly after: Float64Array;
}

function scalesOf({ signal, pressure, temperature }: Mapping): Scales {
  const scales = {
    mark: new Uint8Array(6),
    before: new Float64Array(6),
    factor: new Float64Array(6),
    after: new Float64Array(6),
  };
  const columns = [
    [SIGNAL, signal],
    [PRESSURE, pressure],
    [TEMPERATURE, temperature],
  ] as const;
  for (const [role, column] of columns) {
    if (column === undefined) continue;
    scales.mark[role] = column.figures.decimal.charCodeAt(0);
    scales.before[role] = column.before;
    scales.factor[role] = column.factor;
    scales.after[role] = column.after;
  }
  return scales;
}

/** Rows that a window holds at least; its spare bytes are looked at, never taken. */
const WINDOW = LONGEST_ROW * 8;
const SPARE = 64;

function classesOf(delimiter: number): Uint8Array {
  const classes = new Uint8Array(256);
  classes[delimiter] = DELIMITER;
  for (const byte of [LF, CR]) classes[byte] = LINE_END;
  for (const byte of [QUOTE, NUL]) classes[byte] = ODD;
  return classes;
}

function rolesOf({ time, signal, pressure, temperature }: Mapping): Uint8Array {
  const places: readonly (readonly [number | undefined, number])[] = [
    [time.at, TIME],
    [time.clockAt, CLOCK],
    [signal.at, SIGNAL],
    [pressure?.at, PRESSURE],
    [temperature?.at, TEMPERATURE],
  ];
  const roles = new Uint8Array(Math.max(...places.map(([at]) => at ?? 0)) + 1);
  for (const [at, role] of places) if (at !== undefined) roles[at] = role;
  return roles;
}

/** A reader at the start of a log; chunks of at most `rows` rows go to `take`. */
export function openReader(mapping: Mapping, take: (chunk: Chunk) => void, rows: number): Reader {
  const { layout, pressure, temperature } = mapping;
  const { encoding, mark } = layout.spelling;
  const wide = encoding === 'utf-16le' || encoding === 'utf-16be';
  return {
    mapping,
    take,
    chunk: emptyChunk(rows, { pressure: pressure !== undefined, temperature: temperature !== undefined }),
    window: new Uint8Array(WINDOW + SPARE),
    start: 0,
    end: 0,
    classes: classesOf(layout.delimiter),
    roles: rolesOf(mapping),
    scales: scalesOf(mapping),
    figures: new Float64Array(6),
    date: { text: new Uint8Array(10), seconds: 0 },
    ...(wide ? { transcoder: openTranscoder(encoding) } : {}),
    mark,
    skip: layout.skip,
    passing: false,
    afterReturn: false,
    zoned: false,
    row: 0,
    lastTime: Number.NEGATIVE_INFINITY,
    blank: 0,
    spanning: 0,
    samples: [],
  };
}

/** Bytes that the window can still take. */
export const roomOf = ({ window, end }: Reader): number => window.length - SPARE - end;

/** Puts the row at hand into the chunk, with its time placed in the zone; false when the clocks leave its hour out. */
export function keepRow(reader: Reader, missing: number): boolean {
  const { chunk, figures } = reader;
  let time = figures[TIME] as number;
  let bits = missing;
  if (!reader.zoned) {
    const { kind, first, second } = localOf(reader.mapping.zone, time);
    if (kind === 'skipped') return false;
    const again = kind === 'repeated' && time - first < reader.lastTime;
    if (kind === 'repeated') bits |= TIME_REPEATED;
    time -= again ? second : first;
  }
  reader.lastTime = time;
  const at = chunk.size;
  chunk.time[at] = time;
  chunk.signal[at] = figures[SIGNAL] as number;
  if (chunk.pressure) chunk.pressure[at] = figures[PRESSURE] as number;
  if (chunk.temperature) chunk.temperature[at] = figures[TEMPERATURE] as number;
  chunk.trouble[at] = 0;
  chunk.missing[at] = bits;
  closeRow(reader);
  return true;
}

/** Puts a row that cannot be read into the chunk. */
export function keepTrouble(reader: Reader, trouble: Trouble): void {
  const { chunk } = reader;
  const at = chunk.size;
  chunk.time[at] = 0;
  chunk.signal[at] = 0;
  if (chunk.pressure) chunk.pressure[at] = 0;
  if (chunk.temperature) chunk.temperature[at] = 0;
  chunk.trouble[at] = troubleOf(trouble);
  chunk.missing[at] = 0;
  closeRow(reader);
}

function closeRow(reader: Reader): void {
  const { chunk } = reader;
  reader.row += 1;
  chunk.row[chunk.size] = reader.row;
  chunk.size += 1;
  if (chunk.size === chunk.row.length) handOver(reader);
}

/** Hands the rows of the chunk over, if there are any. */
export function handOver({ chunk, take }: Reader): void {
  if (chunk.size > 0) take(chunk);
  chunk.size = 0;
}
