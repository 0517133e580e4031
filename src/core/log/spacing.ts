/**
 * The usual interval of a log, from its first rows, where no longest interval is stated: what is ten times as long is a
 * gap. Values reported by exception come when they change, so that no interval of theirs is unusual.
 */
import { FIRST_UNTIMED } from './account.ts';
import type { Batch } from './batch.ts';

const ENOUGH = 100; // intervals
const UNUSUAL = 10; // times the usual interval
/** Rows that are looked at: stamps that stand still say nothing. */
const MOST_ROWS = 5000;

/** The longest interval that is bridged, s; undefined while too few rows are known, unless they are all there are. */
export function longestBridged({ time, account, size }: Batch, complete: boolean): number | undefined {
  const intervals: number[] = [];
  let before = Number.NaN;
  for (let at = 0; at < Math.min(size, MOST_ROWS) && intervals.length < ENOUGH; at += 1) {
    if ((account[at] as number) >= FIRST_UNTIMED) continue;
    const now = time[at] as number;
    if (now > before) intervals.push(now - before);
    before = now;
  }
  if (intervals.length < ENOUGH && size < MOST_ROWS && !complete) return undefined;
  const usual = intervals.toSorted((one, other) => one - other)[Math.floor(intervals.length / 2)];
  return usual === undefined ? Number.POSITIVE_INFINITY : UNUSUAL * usual;
}
