/**
 * The time of a row as text, in the one format of its column. The answer is a moment, or the reading of a local clock
 * that its zone has still to place.
 */
import { DAY, daysOf, HOUR, isDate, monthOf } from './calendar.ts';
import { type FigureFormat, readFigure } from './figure.ts';

export const TIME_FORMATS = [
  'iso', // year first
  'day-first',
  'month-first',
  'month-name', // 29-Mar-2026
  'epoch-s', // s since 1970-01-01 UTC
  'epoch-ms',
  'serial-days', // days of a spreadsheet, 25569 is 1970-01-01
  'seconds', // of a plain clock, from anywhere
] as const;

export type TimeFormat = (typeof TIME_FORMATS)[number];

/** s since 1970-01-01T00:00:00; `zoned` when that is UTC or a plain clock, else it is a local clock. */
export interface Stamp {
  readonly seconds: number;
  readonly zoned: boolean;
}

export type Time = Stamp | 'empty' | 'unreadable' | 'impossible';

/** Days from the zero of a spreadsheet's serial days to 1970-01-01. */
export const SERIAL_1970 = 25569;

const CLOCK = String.raw`(\d{1,2}):(\d{2})(?::(\d{2})(?:[.,](\d{1,9}))?)?(?:\s?([AP])\.?M\.?)?`;
const ZONE = String.raw`\s?(Z|UTC|GMT|[+\-\u2212]\d{2}(?::?\d{2})?)?`;
const rest = String.raw`(?:(?:,?\s+|T)${CLOCK}${ZONE})?$`;
const DATES: Readonly<Record<string, RegExp>> = {
  iso: new RegExp(String.raw`^(\d{4})([-/.])(\d{1,2})\2(\d{1,2})${rest}`, 'i'),
  numbers: new RegExp(String.raw`^(\d{1,2})([-/.])(\d{1,2})\2(\d{4})${rest}`, 'i'),
  'month-name': new RegExp(String.raw`^(\d{1,2})([- ])([A-Za-z]{3,9})\.?\2(\d{4})${rest}`, 'i'),
};
const ONLY_CLOCK = new RegExp(`^${CLOCK}${ZONE}$`, 'i');
/** The form of ISO 8601 without hyphens and colons. */
const BASIC = /^(\d{4})(\d{2})(\d{2})T(\d{2})(\d{2})(\d{2})/i;

const isNumeric = (format: TimeFormat): boolean => !(format in DATES) && !format.endsWith('-first');

/** Reads a stamp, or the date of a row whose clock has a column of its own. */
export function readTime(text: string, format: TimeFormat, figures: FigureFormat): Time {
  const trimmed = text.replace(/[\u00a0\u2009\u202f]/g, ' ').trim();
  if (trimmed === '') return 'empty';
  if (isNumeric(format)) return numeric(trimmed, format, figures);
  const found = (DATES[format] ?? DATES.numbers)?.exec(trimmed.replace(BASIC, '$1-$2-$3T$4:$5:$6'));
  if (!found) return 'unreadable';
  const [, one = '', , two = '', three = '', ...clock] = found;
  const [year, month, day] = inOrder(format, one, two, three);
  if (month === 0 && format === 'month-name') return 'unreadable';
  return isDate(year, month, day) ? onDay(daysOf(year, month, day), clock) : 'impossible';
}

/** Year, month and day of the three parts of a date. */
function inOrder(format: TimeFormat, one: string, two: string, three: string): readonly [number, number, number] {
  if (format === 'iso') return [Number(one), Number(two), Number(three)];
  if (format === 'day-first') return [Number(three), Number(two), Number(one)];
  if (format === 'month-first') return [Number(three), Number(one), Number(two)];
  return [Number(three), monthOf(two), Number(one)];
}

/** A clock in a column of its own, added to the date of the row. */
export function readClock(text: string, date: Stamp): Time {
  const trimmed = text.trim();
  if (trimmed === '') return 'empty';
  const [whole, ...clock] = ONLY_CLOCK.exec(trimmed) ?? [];
  return whole === undefined ? 'unreadable' : onDay(Math.floor(date.seconds / DAY), clock);
}

function numeric(text: string, format: TimeFormat, figures: FigureFormat): Time {
  const value = readFigure(text, figures);
  if (value === 'absent') return 'empty';
  if (typeof value !== 'number') return value === 'unreadable' ? 'unreadable' : 'impossible';
  return stampOf(value, format);
}

/** The stamp of a figure. A serial day is kept to the millisecond: its printed digits hold no more. */
export function stampOf(value: number, format: TimeFormat): Stamp {
  if (format === 'epoch-ms') return { seconds: value / 1000, zoned: true };
  if (format !== 'serial-days') return { seconds: value, zoned: true };
  return { seconds: Math.round((value - SERIAL_1970) * DAY * 1000) / 1000, zoned: false };
}

/** The hour of a clock of twelve or twenty-four hours; undefined when there is none. */
function hourOf(written: string, half: string | undefined): number | undefined {
  const hour = Number(written);
  if (half === undefined) return hour <= 24 ? hour : undefined;
  if (hour < 1 || hour > 12) return undefined;
  return (hour % 12) + (half.toLowerCase() === 'p' ? 12 : 0);
}

function onDay(days: number, [hours, minutes = '0', seconds = '0', fraction = '', half, zone]: string[]): Time {
  if (hours === undefined) return { seconds: days * DAY, zoned: false };
  const hour = hourOf(hours, half);
  if (hour === undefined || Number(minutes) > 59 || Number(seconds) > 59) return 'impossible';
  const clock = hour * HOUR + Number(minutes) * 60 + Number(seconds);
  if (clock > DAY || (clock === DAY && Number(fraction) > 0)) return 'impossible';
  const local = days * DAY + clock + Number(fraction || '0') / 10 ** fraction.length;
  if (zone === undefined) return { seconds: local, zoned: false };
  const ahead = aheadOf(zone);
  return ahead === undefined ? 'impossible' : { seconds: local - ahead, zoned: true };
}

/** s ahead of UTC of `Z`, `+01:00`, `+0100`, `+01`. */
function aheadOf(zone: string): number | undefined {
  if (/^[a-z]/i.test(zone)) return 0;
  const digits = zone.slice(1).replace(':', '').padEnd(4, '0');
  const [hours, minutes] = [Number(digits.slice(0, 2)), Number(digits.slice(2))];
  if (hours > 14 || minutes > 59) return undefined;
  return (zone.startsWith('+') ? 1 : -1) * (hours * HOUR + minutes * 60);
}
