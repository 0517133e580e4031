/** Rows with one stamp: the last one that can be converted counts, those before it are repeats. */
import { ACCOUNT, FIRST_REFUSED, FIRST_UNTIMED } from './account.ts';
import type { Batch } from './batch.ts';

/** Rows of one stamp that wait for a later one at most: a clock that stands still must not fill the memory. */
const MOST_WAITING = 1000;

export interface Repeats {
  stamp: number;
  /** Place in the batch of the row that counts so far; none where it is -1. */
  good: number;
  /** Whether the row that counts is settled: later ones of its stamp are repeats of it. */
  settled: boolean;
  /** Rows of the batch that were looked at. */
  seen: number;
}

export const openRepeats = (): Repeats => ({ stamp: Number.NaN, good: -1, settled: false, seen: 0 });

/** Looks at the new rows of a batch; answers how many of its rows are settled. */
export function settleRepeats(repeats: Repeats, { time, account, size }: Batch): number {
  for (let at = repeats.seen; at < size; at += 1) {
    if (repeats.good >= 0 && at - repeats.good > MOST_WAITING) {
      repeats.good = -1;
      repeats.settled = true;
    }
    const kind = account[at] as number;
    if (kind >= FIRST_UNTIMED) continue;
    if (time[at] !== repeats.stamp) {
      repeats.stamp = time[at] as number;
      repeats.good = -1;
      repeats.settled = false;
    }
    if (kind >= FIRST_REFUSED) continue;
    if (repeats.settled) account[at] = ACCOUNT.duplicate;
    else {
      if (repeats.good >= 0) account[repeats.good] = ACCOUNT.duplicate;
      repeats.good = at;
    }
  }
  repeats.seen = size;
  return repeats.good >= 0 ? repeats.good : size;
}

/** After the first rows of the batch were dropped. */
export function moveRepeats(repeats: Repeats, dropped: number): void {
  repeats.seen -= dropped;
  if (repeats.good >= 0) repeats.good -= dropped;
}
