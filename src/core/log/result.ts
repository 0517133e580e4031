/** The stages of a conversion at its end -> its record. */
import type { AccountRecord, DayRecord, LogResult } from '../result/log-record.ts';
import { accounts, FIRST_REFUSED, FIRST_TROUBLE } from './account.ts';
import { TROUBLES } from './chunk.ts';
import { dateOf } from './days.ts';
import { chartPoints, type Decimation } from './decimate.ts';
import { type Flows, pathOf } from './flows.ts';
import type { Period } from './period.ts';
import type { LogPlan } from './plan.ts';
import type { LogEnd } from './rows.ts';
import type { Shown } from './shown.ts';
import { massOf, periodRecord } from './summary.ts';
import { substitutesOf, type Totals, wholeOf } from './totals.ts';

/** What is left of a conversion at its end. */
export interface Ended {
  readonly plan: LogPlan;
  readonly flows: Flows;
  readonly shown: Shown;
  readonly chart: Decimation;
  readonly totals: Totals;
  readonly end: LogEnd;
}

/** The record. Every row has one account: that their sum is the number of rows is asserted. */
export function resultOf(ended: Ended): LogResult {
  const { plan, flows, chart, totals, end } = ended;
  const { stands, mapping } = plan;
  const { baseDensity } = stands.solution.meter.state;
  const whole = wholeOf(totals);
  const { rows: _, ...figures } = periodRecord(whole, baseDensity);
  assertAccounts(whole, end.rows);
  return {
    tag: stands.tag,
    rows: end.rows,
    ...figures,
    ...(totals.stamped ? { from_s: totals.firstStamp, to_s: totals.stamp } : {}),
    accounts: accountRecords(ended, whole),
    days: totals.days.map(
      (day): DayRecord => ({
        date: dateOf(mapping.zone, plan.dayStart, day.from),
        from_s: day.from,
        to_s: day.to,
        ...periodRecord(day, baseDensity),
      }),
    ),
    chart: chartPoints(chart),
    ...(totals.gaps > 0 ? { longestGap: { seconds: totals.longestGap, from_s: totals.longestGapFrom } } : {}),
    substitutes: substitutesOf(totals),
    ...(Number.isFinite(totals.rule.maxGap) ? { maxGap_s: totals.rule.maxGap } : {}),
    maxGapStated: mapping.maxGap !== undefined,
    interpretation: mapping.interpretation,
    zone: mapping.zone.name,
    assumed: mapping.assumed,
    path: pathOf(flows),
    blankLines: end.blank,
    spanningRows: end.spanning,
    endsOpen: end.endsOpen,
  };
}

function assertAccounts({ rows }: Period, expected: number): void {
  const counted = rows.reduce((sum, count) => sum + count, 0);
  if (counted !== expected) throw new Error(`log: expected an account of each of ${expected} rows, got ${counted}`);
}

function accountRecords({ shown, end }: Ended, whole: Period): readonly AccountRecord[] {
  return accounts.flatMap(({ code, fate }, at) => {
    const rows = whole.rows[at] as number;
    if (rows === 0) return [];
    const texts = end.samples.filter(({ trouble }) => trouble === TROUBLES[at - FIRST_TROUBLE + 1]);
    const first = at < FIRST_TROUBLE ? (shown[at] ?? []) : texts.map(({ row, text }) => ({ row, text }));
    const mass = at > 0 && at < FIRST_REFUSED ? { mass_kg: massOf(whole, at) } : {};
    return [{ code, fate, rows, seconds: whole.seconds[at] as number, ...mass, first }];
  });
}
