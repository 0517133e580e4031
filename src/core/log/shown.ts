/** The first rows of each account, to be shown. */
import type { ShownRow } from '../result/log-record.ts';
import { accounts, FIRST_TROUBLE } from './account.ts';
import type { Batch } from './batch.ts';

const MOST_SHOWN = 5; // of each account

/** By account; that of clean rows stays empty. */
export type Shown = readonly ShownRow[][];

export const openShown = (): ShownRow[][] => accounts.map(() => []);

/** Takes the first rows of a batch. `problemOf` knows why a row could not be solved. */
export function showRows(
  shown: readonly ShownRow[][],
  { row, time, account }: Batch,
  settled: number,
  problems: ReadonlyMap<number, string>,
): void {
  for (let at = 0; at < settled; at += 1) {
    const kind = account[at] as number;
    if (kind === 0) continue;
    const rows = shown[kind] as ShownRow[];
    if (rows.length >= MOST_SHOWN) continue;
    const number = row[at] as number;
    const problem = problems.get(number);
    rows.push({
      row: number,
      ...(kind < FIRST_TROUBLE ? { time_s: time[at] as number } : {}),
      ...(problem === undefined ? {} : { problem }),
    });
  }
}
