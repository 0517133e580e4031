/**
 * The zone that the stamps of a log are written in: UTC, a fixed offset, or a place whose clocks are moved. The hour
 * that clocks leave out and the hour that they repeat are told apart, never shifted. Moves and offsets of places are
 * whole quarters of an hour, as everywhere since 1972.
 */
import { DAY, daysOf, HOUR } from './calendar.ts';

export interface Zone {
  /** As written: `UTC`, `+01:00`, `Europe/Oslo`. */
  readonly name: string;
  /** s ahead of UTC, of UTC and of a fixed offset. */
  readonly fixed?: number;
  readonly clock?: Intl.DateTimeFormat;
  /** The last quarter of an hour that was asked for, by UTC and by the local clock. */
  readonly last: { quarter: number; offset: number; localQuarter: number; local: Local };
}

/** What a local clock means: `first` and `second` are s ahead of UTC and differ only in a repeated hour. */
export interface Local {
  readonly kind: 'plain' | 'repeated' | 'skipped';
  readonly first: number;
  readonly second: number;
}

const QUARTER = 900; // s
const OFFSET = /^(?:UTC|GMT)?([+\-\u2212])(\d{1,2})(?::?(\d{2}))?$/;

/** The zone that a text names; undefined when it names none, or when the platform does not know the place. */
export function zoneOf(text: string): Zone | undefined {
  const name = text.trim();
  const last = () => ({
    quarter: Number.NaN,
    offset: 0,
    localQuarter: Number.NaN,
    local: { kind: 'plain', first: 0, second: 0 } as Local,
  });
  if (/^(UTC|GMT|Z)$/i.test(name)) return { name: 'UTC', fixed: 0, last: last() };
  const [, sign, hours, minutes = '0'] = OFFSET.exec(name) ?? [];
  if (hours !== undefined) {
    if (Number(hours) > 14 || Number(minutes) > 59) return undefined;
    return { name, fixed: (sign === '+' ? 1 : -1) * (Number(hours) * HOUR + Number(minutes) * 60), last: last() };
  }
  if (!/^[A-Za-z]+(\/[\w+-]+)+$/.test(name)) return undefined;
  const clock = clockOf(name);
  return clock && { name, clock, last: last() };
}

function clockOf(timeZone: string): Intl.DateTimeFormat | undefined {
  if (typeof Intl === 'undefined' || typeof Intl.DateTimeFormat !== 'function') return undefined;
  const figure = '2-digit';
  const fields = { year: 'numeric', month: figure, day: figure, hour: figure, minute: figure, second: figure } as const;
  try {
    return new Intl.DateTimeFormat('en-US', { timeZone, hourCycle: 'h23', calendar: 'gregory', ...fields });
  } catch {
    return undefined; // the platform does not know the place
  }
}

/** s ahead of UTC at a moment of UTC. */
export function offsetAt(zone: Zone, utc: number): number {
  if (zone.fixed !== undefined) return zone.fixed;
  const quarter = Math.floor(utc / QUARTER);
  if (quarter !== zone.last.quarter) {
    zone.last.quarter = quarter;
    zone.last.offset = shownBy(zone, quarter * QUARTER) - quarter * QUARTER;
  }
  return zone.last.offset;
}

/** What the clock of the place shows, as s since 1970-01-01T00:00:00 on that clock. */
function shownBy({ clock, name }: Zone, utc: number): number {
  if (clock === undefined) throw new Error(`zone ${name}: expected a clock or a fixed offset, got neither`);
  const parts = new Map(clock.formatToParts(utc * 1000).map(({ type, value }) => [type, Number(value)]));
  const part = (type: Intl.DateTimeFormatPartTypes): number => parts.get(type) ?? 0;
  const days = daysOf(part('year'), part('month'), part('day'));
  return days * DAY + part('hour') * HOUR + part('minute') * 60 + part('second');
}

/** What a local clock, in s since 1970-01-01T00:00:00 on that clock, can mean in the zone. */
export function localOf(zone: Zone, local: number): Local {
  const { last } = zone;
  const quarter = Math.floor(local / QUARTER);
  if (quarter !== last.localQuarter) {
    last.local = meaning(zone, quarter * QUARTER);
    last.localQuarter = quarter;
  }
  return last.local;
}

/** By the offsets of the day before and the day after: clocks are not moved twice in two days. */
function meaning(zone: Zone, local: number): Local {
  if (zone.fixed !== undefined) return { kind: 'plain', first: zone.fixed, second: zone.fixed };
  const before = offsetAt(zone, local - DAY);
  const after = offsetAt(zone, local + DAY);
  if (before === after) return { kind: 'plain', first: before, second: before };
  const isBefore = offsetAt(zone, local - before) === before;
  const isAfter = offsetAt(zone, local - after) === after;
  if (isBefore && isAfter) return { kind: 'repeated', first: before, second: after };
  if (!isBefore && !isAfter) return { kind: 'skipped', first: before, second: after };
  const offset = isBefore ? before : after;
  return { kind: 'plain', first: offset, second: offset };
}
