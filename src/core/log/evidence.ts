/**
 * What the sample of a column says about its spelling, decided once for the whole column. Where the sample allows two
 * readings the answer is a question with both of them, never a guess.
 */
import { type FigureFormat, readFigure } from './figure.ts';
import { readClock, readTime, type TimeFormat } from './time.ts';

/** A cell of the sample; row 0 stands near the end of the log, at a row that is not counted. */
export interface Cell {
  readonly text: string;
  readonly row: number;
}

/** One way to read a sample: the value to settle on, and what the sample then is: a figure, or s since 1970. */
export interface Reading<Value> {
  readonly value: Value;
  readonly reads: number;
}

export type Decision<Value> =
  | { readonly kind: 'decided'; readonly value: Value; readonly evidence?: Cell }
  | { readonly kind: 'open'; readonly sample: Cell; readonly readings: readonly Reading<Value>[] };

/** What one column says of its decimal mark. */
export interface Marks {
  /** Cells that can only be read with a point, only with a comma, and with either. */
  readonly point: readonly Cell[];
  readonly comma: readonly Cell[];
  readonly either: readonly Cell[];
  /** Cells that are figures, and cells that are something. */
  readonly figures: number;
  readonly filled: number;
}

const POINT: FigureFormat = { decimal: '.', group: ',' };
const COMMA: FigureFormat = { decimal: ',', group: '.' };

/** Sorts the cells of a column by the marks they can be read with. */
export function marksOf(cells: readonly Cell[]): Marks {
  const point: Cell[] = [];
  const comma: Cell[] = [];
  const either: Cell[] = [];
  let figures = 0;
  let filled = 0;
  for (const cell of cells) {
    const [one, other] = [readFigure(cell.text, POINT), readFigure(cell.text, COMMA)];
    if (one === 'absent') continue;
    filled += 1;
    const [asPoint, asComma] = [typeof one === 'number', typeof other === 'number'];
    if (asPoint || asComma) figures += 1;
    if (asPoint && !asComma) point.push(cell);
    else if (asComma && !asPoint) comma.push(cell);
    else if (asPoint && one !== other) either.push(cell);
  }
  return { point, comma, either, figures, filled };
}

/** Whether most of what stands in a column are figures. */
export const areFigures = ({ figures, filled }: Marks): boolean => figures > 0 && 2 * figures >= filled;

const plain = (decimal: '.' | ','): FigureFormat => ({ decimal, group: '' });

/**
 * The decimal mark of a column: by its own cells, then by those of the other columns of the file, then by the delimiter,
 * which is no decimal mark. A column of whole numbers alone has a point and no groups.
 */
export function decideFigures(own: Marks, others: readonly Marks[], delimiter: string): Decision<FigureFormat> {
  const [point, comma] = [own.point[0], own.comma[0]];
  const sample = point && comma ? comma : own.either[0];
  if (point && !comma) return { kind: 'decided', value: POINT, evidence: point };
  if (comma && !point) return { kind: 'decided', value: COMMA, evidence: comma };
  if (sample === undefined) return { kind: 'decided', value: plain(others.some(isComma) ? ',' : '.') };
  if (!point && !comma) {
    const points = others.find(({ point: found }) => found.length > 0)?.point[0];
    const commas = others.find(({ comma: found }) => found.length > 0)?.comma[0];
    if (points && !commas) return { kind: 'decided', value: POINT, evidence: points };
    if (commas && !points) return { kind: 'decided', value: COMMA, evidence: commas };
    if (delimiter === ',' && !sample.text.includes(','))
      return { kind: 'decided', value: plain('.'), evidence: sample };
  }
  const readings = [POINT, COMMA].flatMap((value) => {
    const reads = readFigure(sample.text, value);
    return typeof reads === 'number' ? [{ value, reads }] : [];
  });
  return { kind: 'open', sample, readings };
}

const isComma = ({ point, comma }: Marks): boolean => comma.length > 0 && point.length === 0;

const DATES: readonly TimeFormat[] = ['iso', 'day-first', 'month-first', 'month-name'];

/** The format of a column of dates; undefined when most of its cells are none. */
export function decideTime(cells: readonly Cell[]): Decision<TimeFormat> | undefined {
  const filled = cells.filter(({ text }) => text.trim() !== '');
  const readable = (format: TimeFormat): readonly Cell[] =>
    filled.filter(({ text }) => readTime(text, format, POINT) !== 'unreadable');
  const shaped = DATES.map(readable).find((found) => found.length > 0 && 2 * found.length >= filled.length);
  const first = shaped?.[0];
  if (shaped === undefined || first === undefined) return undefined;
  const formats = DATES.filter((format) => readTime(first.text, format, POINT) !== 'unreadable');
  const [only] = formats;
  if (formats.length === 1 && only) return { kind: 'decided', value: only, evidence: first };
  return decideOrder(shaped);
}

/** Day first or month first: by cells that have only one of the two readings. */
function decideOrder(cells: readonly Cell[]): Decision<TimeFormat> {
  const isPossible = (format: TimeFormat, { text }: Cell): boolean => typeof readTime(text, format, POINT) === 'object';
  const dayFirst = cells.find((cell) => isPossible('day-first', cell) && !isPossible('month-first', cell));
  const monthFirst = cells.find((cell) => isPossible('month-first', cell) && !isPossible('day-first', cell));
  if (dayFirst && !monthFirst) return { kind: 'decided', value: 'day-first', evidence: dayFirst };
  if (monthFirst && !dayFirst) return { kind: 'decided', value: 'month-first', evidence: monthFirst };
  const differs = cells.find((cell) => timeReadings(cell, ['day-first', 'month-first']).length === 2);
  const sample = dayFirst ?? differs ?? (cells[0] as Cell);
  return { kind: 'open', sample, readings: timeReadings(sample, ['day-first', 'month-first']) };
}

function timeReadings(cell: Cell, formats: readonly TimeFormat[]): Reading<TimeFormat>[] {
  const found = formats.flatMap((value) => {
    const time = readTime(cell.text, value, POINT);
    return typeof time === 'object' ? [{ value, reads: time.seconds }] : [];
  });
  return found.length === 2 && found[0]?.reads === found[1]?.reads ? found.slice(0, 1) : found;
}

/** Whether a column holds clocks without dates. */
export function areClocks(cells: readonly Cell[]): boolean {
  const filled = cells.filter(({ text }) => text.trim() !== '');
  const clocks = filled.filter(({ text }) => typeof readClock(text, { seconds: 0, zoned: false }) === 'object');
  return clocks.length > 0 && 2 * clocks.length >= filled.length;
}

/** Seconds of 1973 to 2286, milliseconds of the same, days of a spreadsheet from 1954 to 2119. */
const EPOCH_S = [1e8, 1e10] as const;
const EPOCH_MS = [1e11, 1e13] as const;
const SERIAL = [20_000, 80_000] as const;

/**
 * What a column of figures means as time. Days of a spreadsheet have steps of less than a day; whole steps in their
 * range could be the seconds of a plain clock as well.
 */
export function decideNumericTime(cells: readonly Cell[], figures: FigureFormat): Decision<TimeFormat> | undefined {
  const read = cells.flatMap((cell) => {
    const value = readFigure(cell.text, figures);
    return typeof value === 'number' ? [{ cell, value }] : [];
  });
  const [first, second] = read;
  if (first === undefined || 2 * read.length < cells.length) return undefined;
  const isWithin = ([least, most]: readonly [number, number]): boolean =>
    read.every(({ value }) => value >= least && value < most);
  const evidence = first.cell;
  if (isWithin(EPOCH_S)) return { kind: 'decided', value: 'epoch-s', evidence };
  if (isWithin(EPOCH_MS)) return { kind: 'decided', value: 'epoch-ms', evidence };
  if (!isWithin(SERIAL)) return { kind: 'decided', value: 'seconds', evidence };
  if (second && read.some(({ value }) => value % 1 !== 0) && Math.abs(second.value - first.value) < 1)
    return { kind: 'decided', value: 'serial-days', evidence };
  return { kind: 'open', sample: evidence, readings: timeReadings(evidence, ['serial-days', 'seconds']) };
}
