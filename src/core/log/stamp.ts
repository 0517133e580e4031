/**
 * A time stamp as bytes: ISO 8601, `2026-03-14T06:00:00Z`, from seconds since 1970-01-01T00:00:00. UTC. The calendar
 * is that of ISO 8601, the Gregorian one in both directions.
 */
import { type Bytes, writeByte, writeDigits } from './bytes.ts';
import { DAY } from './calendar.ts';

const MICRO = 1e6;
const [HYPHEN, T, COLON, POINT, Z] = [45, 84, 58, 46, 90];

export interface Civil {
  readonly year: number;
  readonly month: number; // 1 to 12
  readonly day: number; // 1 to 31
}

/** The date of a day counted from 1970-01-01. Eras of 400 years from 0000-03-01, so that a leap day ends its year. */
export function civilOf(days: number): Civil {
  const shifted = days + 719468; // 0000-03-01 to 1970-01-01, days
  const era = Math.floor(shifted / 146097); // days in 400 years
  const dayOfEra = shifted - era * 146097;
  const leaps = Math.floor(dayOfEra / 1460) - Math.floor(dayOfEra / 36524) + Math.floor(dayOfEra / 146096);
  const yearOfEra = Math.floor((dayOfEra - leaps) / 365);
  const dayOfYear = dayOfEra - (365 * yearOfEra + Math.floor(yearOfEra / 4) - Math.floor(yearOfEra / 100));
  const fromMarch = Math.floor((5 * dayOfYear + 2) / 153); // months of 30.6 days
  const month = fromMarch < 10 ? fromMarch + 3 : fromMarch - 9;
  return {
    year: yearOfEra + era * 400 + (month <= 2 ? 1 : 0),
    month,
    day: dayOfYear - Math.floor((153 * fromMarch + 2) / 5) + 1,
  };
}

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
