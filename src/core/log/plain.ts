/**
 * The quick way through a row: plain digits and ISO-like stamps, no quotes, nothing missing but pressure and
 * temperature. It reads such a row to the same last bit as the careful way (odd.ts), and leaves every other row to it,
 * so that no reason is ever found here. Decimal figures of at most 15 digits are an exact integer over an exact power
 * of ten, and one division rounds once (Clinger 1990, the fast case).
 */
import { DAY, daysOf, HOUR, isDate } from './calendar.ts';
import { PRESSURE_MISSING, TEMPERATURE_MISSING } from './chunk.ts';
import { DELIMITER, keepRow, LINE_END, NO_ROLE, PLAIN, PRESSURE, type Reader, TIME } from './reader.ts';
import { LONGEST_ROW } from './split.ts';
import { stampOf, type TimeFormat } from './time.ts';

/** Digits that an exact integer surely holds, and powers of ten that are exact. */
const MOST_DIGITS = 15;
const TENS = Float64Array.from({ length: 23 }, (_, power) => Number(`1e${power}`));
const MOST_POWER = TENS.length - 1;

const ZERO = 48;
const MINUS = 45;
const PLUS = 43;
const COLON = 58;
const SPACE = 32;
const COMMA = 44;
const POINT = 46;
const SLASH = 47;
const LETTER_T = 84;
const LETTER_Z = 90;
const LETTER_E = 101;

/** Bytes of a date of two-digit parts. */
const DATE_BYTES = 10;

/** The row is not plain. */
const NOT_PLAIN = -1;

/** Reads the row at a place of the window, which holds its line end; the place of that line end, or -1. */
export function plainRow(reader: Reader, from: number): number {
  const { window, classes, roles } = reader;
  const { delimiter } = reader.mapping.layout;
  const last = roles.length - 1;
  let at = from;
  let missing = 0;
  for (let column = 0; ; column += 1) {
    const role = roles[column] as number;
    if (role === NO_ROLE) while (classes[window[at] as number] === PLAIN) at += 1;
    else if (role === TIME) at = plainTime(reader, at);
    else if (role >= PRESSURE && isEmpty(classes[window[at] as number] as number)) {
      missing |= role === PRESSURE ? PRESSURE_MISSING : TEMPERATURE_MISSING;
      reader.figures[role] = 0;
    } else at = plainFigure(reader, role, at);
    if (column === last) break;
    if (at < 0 || window[at] !== delimiter) return NOT_PLAIN;
    at += 1;
  }
  // A figure that goes on in another spelling is not read to its end here.
  const end = at < 0 || classes[window[at] as number] === PLAIN ? NOT_PLAIN : plainEnd(reader, at);
  if (end < 0 || end - from >= LONGEST_ROW) return NOT_PLAIN;
  return keepRow(reader, missing) ? end : NOT_PLAIN;
}

const isEmpty = (kind: number): boolean => kind === DELIMITER || kind === LINE_END;

/** The line end behind the last column of use, when the row has all its fields and no more. */
function plainEnd({ window, classes, roles, mapping }: Reader, from: number): number {
  let at = from;
  let fields = roles.length;
  let kind = classes[window[at] as number] as number;
  while (kind < LINE_END) {
    fields += kind; // DELIMITER is 1, PLAIN is 0
    at += 1;
    kind = classes[window[at] as number] as number;
  }
  return kind === LINE_END && fields === mapping.layout.fields ? at : NOT_PLAIN;
}

/** Reads a figure and puts it in SI; the place behind it, or -1. */
function plainFigure(reader: Reader, role: number, from: number): number {
  const { figures, window, scales } = reader;
  let first = from;
  while (window[first] === SPACE) first += 1;
  const at = plainNumber(window, first, scales.mark[role] as number, figures);
  const figure = (figures[0] as number) + (scales.before[role] as number);
  figures[role] = figure * (scales.factor[role] as number) + (scales.after[role] as number);
  return at;
}

/** Reads an unsigned or signed decimal figure into `into[0]`; the place behind it, or -1 when it is not plain. */
export function plainNumber(window: Uint8Array, from: number, mark: number, into: Float64Array): number {
  let at = from;
  let byte = window[at] as number;
  const negative = byte === MINUS;
  if (negative || byte === PLUS) byte = window[++at] as number;
  let mantissa = 0;
  const first = at;
  while (byte >= ZERO && byte <= ZERO + 9) {
    mantissa = mantissa * 10 + (byte - ZERO);
    byte = window[++at] as number;
  }
  let digits = at - first;
  let fraction = 0;
  if (byte === mark) {
    byte = window[++at] as number;
    const start = at;
    while (byte >= ZERO && byte <= ZERO + 9) {
      mantissa = mantissa * 10 + (byte - ZERO);
      byte = window[++at] as number;
    }
    fraction = at - start;
    digits += fraction;
  }
  if (digits === 0 || digits > MOST_DIGITS) return NOT_PLAIN;
  if ((byte | 32) === LETTER_E) return plainPower(window, at + 1, negative ? -mantissa : mantissa, fraction, into);
  const value = fraction === 0 ? mantissa : mantissa / (TENS[fraction] as number);
  into[0] = negative ? -value : value;
  return at;
}

/** The power of ten behind the mantissa, where the result is one exact multiplication or division. */
function plainPower(window: Uint8Array, from: number, mantissa: number, fraction: number, into: Float64Array): number {
  let at = from;
  let byte = window[at] as number;
  const negative = byte === MINUS;
  if (negative || byte === PLUS) byte = window[++at] as number;
  const first = at;
  let power = 0;
  while (byte >= ZERO && byte <= ZERO + 9 && at - first < 4) {
    power = power * 10 + (byte - ZERO);
    byte = window[++at] as number;
  }
  if (at === first) return NOT_PLAIN;
  const shift = (negative ? -power : power) - fraction;
  if (shift > MOST_POWER || shift < -MOST_POWER) return NOT_PLAIN;
  into[0] = shift < 0 ? mantissa / (TENS[-shift] as number) : mantissa * (TENS[shift] as number);
  return at;
}

/** The two digits at a place as a number; -1 when they are none. */
function pair(window: Uint8Array, at: number): number {
  const tens = (window[at] as number) - ZERO;
  const ones = (window[at + 1] as number) - ZERO;
  return tens >= 0 && tens <= 9 && ones >= 0 && ones <= 9 ? tens * 10 + ones : NOT_PLAIN;
}

/** Reads the time; the place behind it, or -1. */
function plainTime(reader: Reader, from: number): number {
  const { format, clockAt, figures } = reader.mapping.time;
  if (clockAt !== undefined || format === 'month-name') return NOT_PLAIN;
  if (format === 'iso' || format === 'day-first' || format === 'month-first') return plainStamp(reader, from, format);
  const at = plainNumber(reader.window, from, figures.decimal === '.' ? POINT : COMMA, reader.figures);
  const { seconds, zoned } = stampOf(reader.figures[0] as number, format);
  reader.figures[TIME] = seconds;
  reader.zoned = zoned;
  return at;
}

/** A stamp of two-digit parts: date, T or space, clock to the second, a fraction, `Z` or `+01:00`. */
function plainStamp(reader: Reader, from: number, format: TimeFormat): number {
  const { window, figures } = reader;
  if (!plainDate(reader, from, format)) return NOT_PLAIN;
  let at = from + 10;
  if (window[at] !== SPACE && window[at] !== LETTER_T) return NOT_PLAIN;
  const hour = pair(window, at + 1);
  const minute = pair(window, at + 4);
  const second = pair(window, at + 7);
  if (window[at + 3] !== COLON || window[at + 6] !== COLON) return NOT_PLAIN;
  if (hour < 0 || hour > 23 || minute < 0 || minute > 59 || second < 0 || second > 59) return NOT_PLAIN;
  at += 9;
  figures[TIME] = reader.date.seconds + (hour * HOUR + minute * 60 + second);
  if (window[at] === POINT) {
    at = plainFraction(window, at + 1, figures);
    if (at < 0) return NOT_PLAIN;
    figures[TIME] = (figures[TIME] as number) + (figures[0] as number);
  }
  return plainZone(reader, at);
}

/** Takes the zone of a stamp off its time, where it has one; the place behind it, or -1. */
function plainZone(reader: Reader, at: number): number {
  const { window, figures } = reader;
  const sign = window[at];
  reader.zoned = sign === LETTER_Z || sign === PLUS || sign === MINUS;
  if (sign === LETTER_Z) return at + 1;
  if (!reader.zoned) return at;
  const hours = pair(window, at + 1);
  const minutes = pair(window, at + 4);
  if (window[at + 3] !== COLON || hours < 0 || hours > 14 || minutes < 0 || minutes > 59) return NOT_PLAIN;
  const ahead = (sign === PLUS ? 1 : -1) * (hours * HOUR + minutes * 60);
  figures[TIME] = (figures[TIME] as number) - ahead;
  return at + 6;
}

/** Up to nine digits of a fraction into `into[0]`. */
function plainFraction(window: Uint8Array, from: number, into: Float64Array): number {
  let at = from;
  let digits = 0;
  for (let byte = window[at] as number; byte >= ZERO && byte <= ZERO + 9; byte = window[++at] as number)
    digits = digits * 10 + (byte - ZERO);
  const count = at - from;
  if (count === 0 || count > 9) return NOT_PLAIN;
  into[0] = digits / (TENS[count] as number);
  return at;
}

/** Whether the ten bytes at a place are the date of the row before, or are now put in its place. */
function plainDate(reader: Reader, from: number, format: TimeFormat): boolean {
  const { window, date } = reader;
  for (let at = 0; at < DATE_BYTES; at += 1)
    if (window[from + at] !== date.text[at]) return format === 'iso' ? isoDate(reader, from) : yearLast(reader, from);
  return true;
}

function isoDate(reader: Reader, from: number): boolean {
  const { window } = reader;
  const year = pair(window, from) * 100 + pair(window, from + 2);
  return keepDate(
    reader,
    from,
    window[from + 4],
    window[from + 7],
    year,
    pair(window, from + 5),
    pair(window, from + 8),
  );
}

function yearLast(reader: Reader, from: number): boolean {
  const { window } = reader;
  const dayFirst = reader.mapping.time.format === 'day-first';
  const year = pair(window, from + 6) * 100 + pair(window, from + 8);
  const month = pair(window, dayFirst ? from + 3 : from);
  const day = pair(window, dayFirst ? from : from + 3);
  return keepDate(reader, from, window[from + 2], window[from + 5], year, month, day);
}

function keepDate(
  { window, date }: Reader,
  from: number,
  mark: number | undefined,
  other: number | undefined,
  year: number,
  month: number,
  day: number,
): boolean {
  if (mark !== other || !(mark === MINUS || mark === SLASH || mark === POINT)) return false;
  const digits = [0, 1, 2, 3, 4, 5, 6, 7, 8, 9].filter((at) => isDigit(window[from + at])).length;
  if (digits !== 8 || !isDate(year, month, day)) return false;
  date.text.set(window.subarray(from, from + DATE_BYTES));
  date.seconds = daysOf(year, month, day) * DAY;
  return true;
}

const isDigit = (byte: number | undefined): boolean => byte !== undefined && byte >= ZERO && byte <= ZERO + 9;
