/** Days and seconds of the Gregorian calendar of ISO 8601, in whole numbers. */

export const DAY = 86400; // s
export const HOUR = 3600; // s
const MONTHS = [31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31];
const NAMES = ['jan', 'feb', 'mar', 'apr', 'may', 'jun', 'jul', 'aug', 'sep', 'oct', 'nov', 'dec'];

const isLeap = (year: number): boolean => year % 4 === 0 && (year % 100 !== 0 || year % 400 === 0);

/** Whether there is such a date. */
export const isDate = (year: number, month: number, day: number): boolean =>
  month >= 1 && month <= 12 && day >= 1 && day <= (MONTHS[month - 1] ?? 0) + (month === 2 && isLeap(year) ? 1 : 0);

/** Days from 1970-01-01 to a date. Years count from March, so that a leap day ends its year. */
export function daysOf(year: number, month: number, day: number): number {
  const fromMarch = month <= 2 ? year - 1 : year;
  const era = Math.floor(fromMarch / 400);
  const yearOfEra = fromMarch - era * 400;
  const dayOfYear = Math.floor((153 * (month > 2 ? month - 3 : month + 9) + 2) / 5) + day - 1; // months of 30.6 days
  const dayOfEra = yearOfEra * 365 + Math.floor(yearOfEra / 4) - Math.floor(yearOfEra / 100) + dayOfYear;
  return era * 146097 + dayOfEra - 719468; // days in 400 years; from 0000-03-01 to 1970-01-01
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
