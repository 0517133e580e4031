/** The days of a log: where each begins and ends, by the clock of the stated zone, and what it came to. */
import { DAY, dateText } from './calendar.ts';
import type { DayOf } from './totals.ts';
import { localOf, offsetAt, type Zone } from './zone.ts';

/** Days of a zone that begin so many seconds after midnight. Where the clocks move a day has 23 or 25 hours. */
export function daysOfZone(zone: Zone, start = 0): DayOf {
  const momentOf = (local: number): number => local - localOf(zone, local).first;
  return (time) => {
    const day = dayNumber(zone, start, time);
    return { from: momentOf(day * DAY + start), to: momentOf((day + 1) * DAY + start) };
  };
}

const dayNumber = (zone: Zone, start: number, time: number): number =>
  Math.floor((time + offsetAt(zone, time) - start) / DAY);

/** The date of the day of a moment, '2026-03-14': that on which it begins. */
export const dateOf = (zone: Zone, start: number, time: number): string => dateText(dayNumber(zone, start, time));
