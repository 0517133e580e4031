/**
 * A time stamp as bytes: ISO 8601, `2026-03-14T06:00:00Z`, from seconds since 1970-01-01T00:00:00. UTC.
 */
import { type Bytes, writeByte, writeDigits } from './bytes.ts';
import { type Civil, civilOf, DAY } from './calendar.ts';

const MICRO = 1e6;
const [HYPHEN, T, COLON, POINT, Z] = [45, 84, 58, 46, 90];

/** What the last stamp began with: most stamps of a log stand in the same minute as the one before. */
export interface Calendar {
  days: number;
  civil: Civil;
  /** Whole minutes since 1970, and the bytes of a stamp up to its seconds; none where it is NaN. */
  minute: number;
  readonly upToSeconds: Uint8Array;
}

const UP_TO_SECONDS = 17; // bytes of '2026-03-14T06:00:'

export const openCalendar = (): Calendar => ({
  days: 0,
  civil: civilOf(0),
  minute: Number.NaN,
  upToSeconds: new Uint8Array(UP_TO_SECONDS),
});

/** Writes the years 0 to 9999; a fraction of a second with three or six digits, none where it is nil. */
export function writeStamp(out: Bytes, calendar: Calendar, time: number): void {
  const minute = Math.floor(time / 60);
  const second = time - 60 * minute;
  if (minute === calendar.minute && second === Math.floor(second)) {
    const { buffer, size } = out;
    for (let at = 0; at < UP_TO_SECONDS; at += 1) buffer[size + at] = calendar.upToSeconds[at] as number;
    out.size = size + UP_TO_SECONDS;
    writeDigits(out, second, 2);
    writeByte(out, Z);
    return;
  }
  const start = out.size;
  writeWhole(out, calendar, time);
  calendar.minute = second === Math.floor(second) ? minute : Number.NaN; // a fraction may have been rounded up
  calendar.upToSeconds.set(out.buffer.subarray(start, start + UP_TO_SECONDS));
}

function writeWhole(out: Bytes, calendar: Calendar, time: number): void {
  const days = Math.floor(time / DAY);
  if (days !== calendar.days) {
    calendar.days = days;
    calendar.civil = civilOf(days);
  }
  const micros = toMicros(time - days * DAY, Math.abs(time));
  const seconds = Math.floor(micros / MICRO);
  if (seconds >= DAY) {
    writeWhole(out, calendar, (days + 1) * DAY);
    return;
  }
  writeDate(out, calendar.civil);
  writeByte(out, T);
  writeClock(out, seconds);
  writeFraction(out, micros - seconds * MICRO);
  writeByte(out, Z);
}

/** Whole microseconds, whole milliseconds where a double of that size does not tell the two apart. */
function toMicros(second: number, size: number): number {
  const micros = Math.round(second * MICRO);
  const millis = 1000 * Math.round(micros / 1000);
  return Math.abs(micros - millis) <= size * Number.EPSILON * MICRO ? millis : micros;
}

function writeDate(out: Bytes, { year, month, day }: Civil): void {
  writeDigits(out, year, 4);
  writeByte(out, HYPHEN);
  writeDigits(out, month, 2);
  writeByte(out, HYPHEN);
  writeDigits(out, day, 2);
}

function writeClock(out: Bytes, seconds: number): void {
  const minutes = Math.floor(seconds / 60);
  const hours = Math.floor(minutes / 60);
  writeDigits(out, hours, 2);
  writeByte(out, COLON);
  writeDigits(out, minutes - 60 * hours, 2);
  writeByte(out, COLON);
  writeDigits(out, seconds - 60 * minutes, 2);
}

function writeFraction(out: Bytes, micros: number): void {
  if (micros === 0) return;
  writeByte(out, POINT);
  if (micros % 1000 === 0) writeDigits(out, micros / 1000, 3);
  else writeDigits(out, micros, 6);
}
