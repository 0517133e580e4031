/** Days and seconds of the calendar of ISO 8601, the Gregorian one in both directions, in whole numbers. */

export const DAY = 86400; // s
export const HOUR = 3600; // s
const ERA_YEARS = 400;
const ERA_DAYS = 146097; // days in 400 years
const TO_1970 = 719468; // from 0000-03-01 to 1970-01-01, days
const MONTHS = [31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31];
const NAMES = ['jan', 'feb', 'mar', 'apr', 'may', 'jun', 'jul', 'aug', 'sep', 'oct', 'nov', 'dec'];

const isLeap = (year: number): boolean => year % 4 === 0 && (year % 100 !== 0 || year % 400 === 0);

/** Whether there is such a date. */
export const isDate = (year: number, month: number, day: number): boolean =>
  month >= 1 && month <= 12 && day >= 1 && day <= (MONTHS[month - 1] ?? 0) + (month === 2 && isLeap(year) ? 1 : 0);

export interface Civil {
  readonly year: number;
  readonly month: number; // 1 to 12
  readonly day: number; // 1 to 31
}

/** Days from 1970-01-01 to a date. Years count from March, so that a leap day ends its year. */
export function daysOf(year: number, month: number, day: number): number {
  const fromMarch = month <= 2 ? year - 1 : year;
  const era = Math.floor(fromMarch / ERA_YEARS);
  const yearOfEra = fromMarch - era * ERA_YEARS;
  const dayOfYear = Math.floor((153 * (month > 2 ? month - 3 : month + 9) + 2) / 5) + day - 1; // months of 30.6 days
  const dayOfEra = yearOfEra * 365 + Math.floor(yearOfEra / 4) - Math.floor(yearOfEra / 100) + dayOfYear;
  return era * ERA_DAYS + dayOfEra - TO_1970;
}

/** The date of a day counted from 1970-01-01: the inverse. */
export function civilOf(days: number): Civil {
  const shifted = days + TO_1970;
  const era = Math.floor(shifted / ERA_DAYS);
  const dayOfEra = shifted - era * ERA_DAYS;
  const leaps = Math.floor(dayOfEra / 1460) - Math.floor(dayOfEra / 36524) + Math.floor(dayOfEra / 146096);
  const yearOfEra = Math.floor((dayOfEra - leaps) / 365);
  const dayOfYear = dayOfEra - (365 * yearOfEra + Math.floor(yearOfEra / 4) - Math.floor(yearOfEra / 100));
  const fromMarch = Math.floor((5 * dayOfYear + 2) / 153); // months of 30.6 days
  const month = fromMarch < 10 ? fromMarch + 3 : fromMarch - 9;
  return {
    year: yearOfEra + era * ERA_YEARS + (month <= 2 ? 1 : 0),
    month,
    day: dayOfYear - Math.floor((153 * fromMarch + 2) / 5) + 1,
  };
}

/** The date of a day counted from 1970-01-01, '2026-03-14'. */
export function dateText(days: number): string {
  const { year, month, day } = civilOf(days);
  const digits = (whole: number, width: number): string => String(whole).padStart(width, '0');
  return `${digits(year, 4)}-${digits(month, 2)}-${digits(day, 2)}`;
}

/** Number of an English month by its name or its first three letters; 0 when it is none. */
export function monthOf(name: string): number {
  const plain = name.toLowerCase();
  const full = ['january', 'february', 'march', 'april', 'may', 'june', 'july', 'august'].concat([
    'september',
    'october',
    'november',
    'december',
  ]);
  return Math.max(NAMES.indexOf(plain), full.indexOf(plain)) + 1;
}
