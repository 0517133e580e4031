/**
 * Rows -> totals by day. A converted row counts for half of the time to its neighbours (sampled values: the trapezoid
 * rule) or for the time until the next row (values reported by exception: they hold). Time between two converted rows
 * that is longer than the gap allowed is not bridged. Days share the time across midnight exactly.
 */
import { add, sumOf, sums } from '../numeric/neumaier.ts';
import { accounts, FIRST_REFUSED, FIRST_UNTIMED } from './account.ts';
import type { Batch } from './batch.ts';
import { emptySample, join, openPeriod, type Period, reach, type Sample, weigh } from './period.ts';

/** Where the day of a time begins and ends, s; the end is outside. */
export type DayOf = (time: number) => { readonly from: number; readonly to: number };

export interface Rule {
  readonly held: boolean;
  readonly maxGap: number; // s
  readonly dayOf: DayOf;
}

export interface Totals {
  readonly rule: Rule;
  readonly days: Period[];
  /** Rows without a place in time, by account. */
  readonly untimed: Float64Array;
  /** The newest converted row, whether there is one, and the seconds it counts for so far. */
  last: Sample;
  next: Sample; // the one that comes to be it
  started: boolean;
  weight: number;
  /** The first row after it that could not be converted: a value that holds holds no further. */
  brokenAt: number;
  /** The newest row with a place in time, and whether there is one. */
  stamp: number;
  stampAccount: number;
  stamped: boolean;
  firstStamp: number;
  gaps: number;
  gapSeconds: number;
  longestGap: number; // s
  longestGapFrom: number;
  /** What would have passed in the gaps, kg: with the flow before them held, with a straight line across. */
  readonly substitutes: Float64Array;
}

const [HELD, LINE] = [0, 1];
const UNBROKEN = Number.POSITIVE_INFINITY;
/** Days beyond are counted with the last: a log with stamps from many centuries must not fill the memory. */
const MOST_DAYS = 4000;

export const openTotals = (rule: Rule): Totals => ({
  rule,
  days: [],
  untimed: new Float64Array(accounts.length),
  last: emptySample(),
  next: emptySample(),
  started: false,
  weight: 0,
  brokenAt: UNBROKEN,
  stamp: 0,
  stampAccount: 0,
  stamped: false,
  firstStamp: 0,
  gaps: 0,
  gapSeconds: 0,
  longestGap: 0,
  longestGapFrom: 0,
  substitutes: sums(2),
});

/** Takes the first rows of a batch, which are settled. */
export function takeRows(totals: Totals, batch: Batch, settled: number): void {
  const { time, account } = batch;
  const { untimed } = totals;
  for (let at = 0; at < settled; at += 1) {
    const kind = account[at] as number;
    if (kind >= FIRST_UNTIMED) {
      untimed[kind] = (untimed[kind] as number) + 1;
      continue;
    }
    const when = time[at] as number;
    const day = dayAt(totals, when);
    day.rows[kind] = (day.rows[kind] as number) + 1;
    if (totals.stamped) lapse(totals, when, kind);
    else totals.firstStamp = when;
    totals.stamp = when;
    totals.stampAccount = kind;
    totals.stamped = true;
    if (kind < FIRST_REFUSED) takeSample(totals, batch, at, day);
    else if (totals.brokenAt === UNBROKEN && when > totals.last.time) totals.brokenAt = when;
  }
}

/** Counts the newest row in; nothing is known after it. */
export function closeTotals(totals: Totals): void {
  if (totals.started) weigh(dayAt(totals, totals.last.time), totals.last, totals.weight);
  totals.weight = 0;
}

/** The period of a time, where there is one or room for one; else the one before. */
function dayAt({ days, rule }: Totals, time: number): Period {
  let place = days.length;
  while (place > 0 && time < (days[place - 1] as Period).from) place -= 1;
  const before = days[place - 1];
  if (before !== undefined && time < before.to) return before;
  if (days.length >= MOST_DAYS) return before ?? (days[0] as Period);
  const { from, to } = rule.dayOf(time);
  const day = openPeriod(from, to, accounts.length);
  days.splice(place, 0, day);
  return day;
}

/** The time since the row before, shared out to the accounts of both. */
function lapse(totals: Totals, time: number, account: number): void {
  const { rule, stamp } = totals;
  const lapsed = time - stamp;
  if (lapsed > rule.maxGap) return;
  const first = rule.held ? lapsed : lapsed / 2;
  const day = dayAt(totals, time);
  if (stamp >= day.from) {
    share(totals, day, first, lapsed - first, account);
    return;
  }
  for (let from = stamp; from < time; ) {
    const to = Math.min(rule.dayOf(from).to, time);
    const before = Math.min(Math.max(stamp + first - from, 0), to - from);
    share(totals, dayAt(totals, from), before, to - from - before, account);
    from = to;
  }
}

function share({ stampAccount }: Totals, { seconds }: Period, before: number, after: number, account: number): void {
  seconds[stampAccount] = (seconds[stampAccount] as number) + before;
  seconds[account] = (seconds[account] as number) + after;
}

/** A converted row: the time since the one before is bridged or is a gap. */
function takeSample(totals: Totals, batch: Batch, at: number, day: Period): void {
  const { last, next, rule } = totals;
  fill(next, batch, at);
  reach(day, next);
  const lapsed = next.time - last.time;
  if (totals.started && last.time >= day.from && lapsed <= rule.maxGap && !(rule.held && totals.brokenAt < next.time)) {
    const first = rule.held ? lapsed : lapsed / 2;
    weigh(day, last, totals.weight + first);
    totals.weight = lapsed - first;
  } else {
    closeTotals(totals);
    if (totals.started) cross(totals);
    totals.started = true;
  }
  totals.last = next;
  totals.next = last;
  totals.brokenAt = UNBROKEN;
}

function fill(sample: Sample, batch: Batch, at: number): void {
  sample.time = batch.time[at] as number;
  sample.flow = batch.flow[at] as number;
  sample.density = batch.density[at] as number;
  sample.differential = batch.differential[at] as number;
  sample.pressure = batch.pressure[at] as number;
  sample.temperature = batch.temperature[at] as number;
  sample.account = batch.account[at] as number;
}

/** From the last sample to the next where midnight, a gap or the end of a value that holds lies between. */
function cross(totals: Totals): void {
  const { last, next, rule } = totals;
  const known = rule.held ? Math.min(next.time, totals.brokenAt) : next.time;
  const end = known - last.time <= rule.maxGap ? known : last.time;
  const whole = next.time - last.time;
  for (let from = last.time; from < end; ) {
    const to = Math.min(rule.dayOf(from).to, end);
    const [start, stop] = [(from - last.time) / whole, (to - last.time) / whole];
    const later = rule.held ? 0 : (whole * (stop ** 2 - start ** 2)) / 2; // the straight line, integrated
    weigh(dayAt(totals, from), last, to - from - later);
    weigh(dayAt(totals, from), next, later);
    from = to;
  }
  if (end < next.time) leaveGap(totals, end);
}

/** Time up to the next sample that is not bridged: its length, and what would have passed. */
function leaveGap(totals: Totals, from: number): void {
  const { last, next, rule } = totals;
  const length = next.time - from;
  const [first, final] = [dayAt(totals, from), dayAt(totals, next.time)];
  first.gaps += 1;
  first.gapSeconds += Math.min(rule.dayOf(from).to, next.time) - from;
  if (final !== first) final.gapSeconds += next.time - Math.max(rule.dayOf(next.time).from, from);
  add(totals.substitutes, HELD, last.flow * length);
  add(totals.substitutes, LINE, ((last.flow + next.flow) / 2) * length);
  totals.gaps += 1;
  totals.gapSeconds += length;
  if (length <= totals.longestGap) return;
  totals.longestGap = length;
  totals.longestGapFrom = from;
}

/** What would have passed in the gaps, kg: with the flow before each held, with a straight line across. */
export const substitutesOf = ({
  substitutes,
}: Totals): { readonly held_kg: number; readonly straightLine_kg: number } => ({
  held_kg: sumOf(substitutes, HELD),
  straightLine_kg: sumOf(substitutes, LINE),
});

/** All days and all rows without a place in time. */
export function wholeOf({ days, untimed, gaps, gapSeconds }: Totals): Period {
  const whole = openPeriod(Number.NEGATIVE_INFINITY, Number.POSITIVE_INFINITY, accounts.length);
  for (const day of days) join(whole, day);
  for (const [account, rows] of untimed.entries()) whole.rows[account] = (whole.rows[account] as number) + rows;
  whole.gaps = gaps;
  whole.gapSeconds = gapSeconds;
  return whole;
}
