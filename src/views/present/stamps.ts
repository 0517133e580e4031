/** Moments as the clock of a log shows them, and lengths of time. */
import type { Value } from './model.ts';
import { spelled } from './numbers.ts';

const NO_BREAK = '\u00a0';
const [MINUTE, HOUR] = [60, 3600]; // s
const OFFSET = /^(?:UTC|GMT)?([+\-\u2212])(\d{1,2})(?::?(\d{2}))?$/;

/** Prints s since 1970-01-01 UTC in a zone: '2026-03-14 06:30:00'. */
export function stampsIn(zone: string): (seconds: number) => string {
  const shown = clockOf(zone);
  return (seconds) => shown(seconds).replace(' ', NO_BREAK);
}

/** UTC and fixed offsets by arithmetic, places by the clock of the platform. */
function clockOf(zone: string): (seconds: number) => string {
  const [, sign, hours, minutes = '0'] = OFFSET.exec(zone.trim()) ?? [];
  const ahead = hours === undefined ? 0 : (sign === '+' ? 1 : -1) * (Number(hours) * HOUR + Number(minutes) * MINUTE);
  if (!zone.includes('/')) return (seconds) => isoText(seconds + ahead);
  const figure = '2-digit';
  const date = { year: 'numeric', month: figure, day: figure, hour: figure, minute: figure, second: figure } as const;
  const clock = new Intl.DateTimeFormat('sv-SE', { timeZone: zone, hourCycle: 'h23', ...date }); // writes ISO 8601
  return (seconds) => clock.format(seconds * 1000);
}

const isoText = (seconds: number): string =>
  new Date(Math.floor(seconds) * 1000).toISOString().slice(0, 19).replace('T', ' ');

/** A length of time in s, min or h, whichever keeps the figure small. */
export function duration(seconds: number): Value {
  const [size, unit] =
    seconds < 2 * MINUTE
      ? ([1, 's'] as const)
      : seconds < 2 * HOUR
        ? ([MINUTE, 'min'] as const)
        : ([HOUR, 'h'] as const);
  const rounding = { significant: 4, trim: true } as const;
  const number = spelled(seconds / size, rounding, true);
  const plain = `${spelled(seconds / size, rounding, false)} ${unit}`;
  return { number, unit, text: `${number}${NO_BREAK}${unit}`, plain, si: seconds };
}
