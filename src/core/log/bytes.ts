/**
 * Text as bytes: what is written goes straight into a buffer, which is handed on when it is full and then filled again.
 * Figures are spelled as everywhere else (core/quantity/digits.ts), only quicker.
 */
import { spell } from '../quantity/digits.ts';

/** Takes bytes that are full; they are overwritten after the call. */
export type Sink = (bytes: Uint8Array) => void;

export interface Bytes {
  readonly buffer: Uint8Array;
  readonly sink: Sink;
  size: number;
}

const CAPACITY = 1 << 18;
/** No row that is written here is longer. */
const LONGEST_ROW = 1024;
const [ZERO, POINT, MINUS, LINE] = [48, 46, 45, 10];

export const openBytes = (sink: Sink): Bytes => ({ buffer: new Uint8Array(CAPACITY), sink, size: 0 });

/** Hands on what is still in the buffer. */
export function flush(out: Bytes): void {
  if (out.size > 0) out.sink(out.buffer.subarray(0, out.size));
  out.size = 0;
}

/** One byte: a comma, a colon, a letter. */
export function writeByte(out: Bytes, byte: number): void {
  out.buffer[out.size++] = byte;
}

/** Ends a row and makes room for the next. */
export function endRow(out: Bytes): void {
  out.buffer[out.size++] = LINE;
  if (out.size > CAPACITY - LONGEST_ROW) flush(out);
}

/** Plain ASCII. */
export function writeWord(out: Bytes, word: string): void {
  for (let at = 0; at < word.length; at += 1) out.buffer[out.size++] = word.charCodeAt(at);
}

/** The last `width` digits of a whole number below 2^31, with zeros in front. */
export function writeDigits(out: Bytes, whole: number, width: number): void {
  const { buffer } = out;
  let rest = whole | 0;
  for (let at = out.size + width - 1; at >= out.size; at -= 1) {
    const tens = (rest / 10) | 0;
    buffer[at] = ZERO + rest - 10 * tens;
    rest = tens;
  }
  out.size += width;
}

/** A whole number from 0 to 2^53. */
export function writeCount(out: Bytes, count: number): void {
  if (count >= 1e9) {
    writeCount(out, Math.floor(count / 1e9));
    writeDigits(out, count % 1e9, 9);
    return;
  }
  let width = 1;
  for (let power = 10; power <= count; power *= 10) width += 1;
  writeDigits(out, count, width);
}

/** Every digit that the double needs to be read back as it is. */
export const writeExact = (out: Bytes, value: number): void => writeWord(out, String(value));

const POWERS = Float64Array.from({ length: 23 }, (_, power) => Number(`1e${power}`)); // those that a double holds exactly
const MOST_QUICK = 9; // digits: their whole number fits into 31 bits
const [PLAIN_FROM, PLAIN_TO] = [1e-3, 1e6]; // between them no power of ten is written, see digits.ts
/** A figure nearer than this to the middle between two spellings is left to the exact rule. */
const NEAR_MIDDLE = 1e-6;

/** A figure with a number of significant digits, exactly as `spell` has it. */
export function writeSignificant(out: Bytes, value: number, digits: number): void {
  if (!writeQuickly(out, value, digits)) writeWord(out, spell(value, { significant: digits, typographic: false }));
}

/** The same where whole numbers of 31 bits can do it; else nothing is written. */
function writeQuickly(out: Bytes, value: number, digits: number): boolean {
  const size = Math.abs(value);
  if (digits > MOST_QUICK || !(size >= PLAIN_FROM && size < PLAIN_TO)) return false;
  let power = size >= 1 ? 1 : 0; // of ten, just above the figure
  while (size >= (POWERS[power] as number) && power > 0) power += 1;
  while (power <= 0 && size * (POWERS[1 - power] as number) < 1) power -= 1;
  const decimals = digits - power;
  if (decimals < 0) return false;
  const scaled = size * (POWERS[decimals] as number);
  const whole = Math.floor(scaled + 0.5);
  if (Math.abs(scaled - Math.floor(scaled) - 0.5) < NEAR_MIDDLE || whole >= (POWERS[digits] as number)) return false;
  if (value < 0) writeByte(out, MINUS);
  writePlain(out, whole, digits, decimals);
  return true;
}

/** A whole number of so many digits, with its last `decimals` behind the point. */
function writePlain(out: Bytes, whole: number, digits: number, decimals: number): void {
  if (decimals >= digits) {
    writeByte(out, ZERO);
    writeByte(out, POINT);
    writeDigits(out, whole, decimals);
    return;
  }
  const unit = POWERS[decimals] as number;
  const front = Math.floor(whole / unit);
  writeDigits(out, front, digits - decimals);
  if (decimals === 0) return;
  writeByte(out, POINT);
  writeDigits(out, whole - front * unit, decimals);
}
