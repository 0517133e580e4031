/** What the vectors of logs ask of the core: totals of rows that are given one by one. */
import { openBatch } from '../../../src/core/log/batch.ts';
import { daysOfZone } from '../../../src/core/log/days.ts';
import { periodRecord } from '../../../src/core/log/summary.ts';
import { closeTotals, openTotals, substitutesOf, takeRows, wholeOf } from '../../../src/core/log/totals.ts';
import { zoneOf } from '../../../src/core/log/zone.ts';
import { number } from './element.ts';

type Given = Readonly<Record<string, number | string>>;

interface Row {
  readonly time: number;
  readonly flow: number;
  readonly differential: number;
}

const MOST_GAP = 300; // s

function totalsOf(rows: readonly Row[], held: boolean) {
  const zone = zoneOf('UTC');
  if (zone === undefined) throw new Error('expected UTC, got no zone');
  const totals = openTotals({ held, maxGap: MOST_GAP, dayOf: daysOfZone(zone) });
  const batch = openBatch(rows.length);
  for (const [at, { time, flow, differential }] of rows.entries()) {
    batch.time[at] = time;
    batch.flow[at] = flow;
    batch.differential[at] = differential;
    batch.density[at] = 1;
  }
  batch.size = rows.length;
  takeRows(totals, batch, rows.length);
  closeTotals(totals);
  return { record: periodRecord(wholeOf(totals), undefined), substitutes: substitutesOf(totals) };
}

/** A square wave that holds each of two differentials for a second; the flow is its root. */
function rooting(given: Given): Record<string, number> {
  const rows = Array.from({ length: 201 }, (_, time): Row => {
    const differential = number(given, time % 2 === 0 ? 'low' : 'high');
    return { time, flow: Math.sqrt(differential), differential };
  });
  return { error: (totalsOf(rows, true).record.rootingError_percent ?? Number.NaN) / 100 };
}

function gap(given: Given): Record<string, number> {
  const flows = [
    [0, 10],
    [60, 12],
    [1860, 20],
    [1890, 10],
  ] as const;
  const rows = flows.map(([time, flow]): Row => ({ time, flow, differential: flow ** 2 }));
  const { record, substitutes } = totalsOf(rows, number(given, 'held') === 1);
  return {
    total: record.total_kg,
    seconds: record.seconds,
    gap: record.gap_s,
    substitutedHeld: substitutes.held_kg,
    substitutedLine: substitutes.straightLine_kg,
  };
}

export const subjects: Readonly<Record<string, (given: Given) => Record<string, number>>> = {
  'log-rooting': rooting,
  'log-gap': gap,
};
