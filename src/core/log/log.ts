/**
 * The conversion of a log: bytes in pieces of any length go in, the rows of the output go out as bytes, and in the end
 * stands the record of what it came to. What it answers does not depend on where the pieces are cut, and its memory does
 * not grow with the log.
 */
import type { LogResult } from '../result/log-record.ts';
import { FIRST_REFUSED } from './account.ts';
import { type Batch, drop, openBatch } from './batch.ts';
import type { Sink } from './bytes.ts';
import type { Chunk } from './chunk.ts';
import { openCovering } from './covering.ts';
import { daysOfZone } from './days.ts';
import { addPoint, type Decimation, openDecimation } from './decimate.ts';
import { type Faults, openFaults, screen } from './faults.ts';
import { type Flows, flowRows, openFlows } from './flows.ts';
import { closeOut, type Digits, type Out, openOut, writeRows } from './out.ts';
import type { LogPlan } from './plan.ts';
import { moveRepeats, openRepeats, type Repeats, settleRepeats } from './repeats.ts';
import { resultOf } from './result.ts';
import { CHUNK_ROWS, openRows } from './rows.ts';
import { openShown, type Shown, showRows } from './shown.ts';
import { longestBridged } from './spacing.ts';
import { closeTotals, openTotals, type Totals, takeRows } from './totals.ts';

export interface Log {
  /** Rows read so far. */
  readonly rows: number;
  push(bytes: Uint8Array): void;
  finish(): LogResult;
}

/** How the conversion is done, beside what it converts. */
export interface Manner {
  readonly digits?: Digits;
  /** Rows that are worked on at once; the answer does not depend on it. */
  readonly chunkRows?: number;
  /** Called before a surface of the fluid is built: nothing is heard of the conversion for a while then. */
  readonly announce?: () => void;
}

/** What the stages of a conversion hold. */
interface Stages {
  readonly plan: LogPlan;
  readonly batch: Batch;
  readonly faults: Faults;
  readonly flows: Flows;
  readonly repeats: Repeats;
  readonly shown: Shown;
  readonly chart: Decimation;
  readonly out?: Out;
  /** Opened when the longest interval that is bridged is known. */
  totals?: Totals;
  /** Time of the newest point of the chart. */
  charted: number;
  rows: number;
}

const DIGITS = 7; // as many as the bound of the surface leaves right

/** Opens a conversion; its output goes to `sink`, whose bytes are used again after the call; without one it is not written. */
export function openLog(
  plan: LogPlan,
  sink?: Sink,
  { digits = DIGITS, chunkRows = CHUNK_ROWS, announce }: Manner = {},
): Log {
  const { mapping } = plan;
  const fixed = { pressure: mapping.pressure === undefined, temperature: mapping.temperature === undefined };
  const stages: Stages = {
    plan,
    batch: openBatch(2 * chunkRows),
    faults: openFaults(plan.faults),
    flows: openFlows(plan.stands, plan.faults.cutOff, openCovering(plan.stands, fixed, plan.exact, announce)),
    repeats: openRepeats(),
    shown: openShown(),
    chart: openDecimation(),
    ...(sink === undefined ? {} : { out: openOut(sink, digits) }),
    charted: 0,
    rows: 0,
  };
  const rows = openRows(plan.mapping, (chunk) => take(stages, chunk), chunkRows);
  return {
    get rows() {
      return stages.rows;
    },
    push: (bytes) => rows.push(bytes),
    finish: () => {
      const end = rows.finish();
      return resultOf({ ...stages, totals: close(stages), end });
    },
  };
}

/** One chunk: 1 faults, 2 flows, 3 rows of one stamp, 4 everything that is settled. */
function take(stages: Stages, chunk: Chunk): void {
  const { batch, faults, flows, repeats } = stages;
  const before = batch.size;
  screen(faults, chunk, batch);
  flowRows(flows, batch, before);
  const settled = settleRepeats(repeats, batch);
  stages.rows += chunk.size;
  const totals = totalsOf(stages, false);
  if (totals !== undefined) settle(stages, totals, settled);
}

/** The totals, opened as soon as it is known which intervals are bridged. */
function totalsOf(stages: Stages, complete: boolean): Totals | undefined {
  const { plan, batch } = stages;
  if (stages.totals !== undefined) return stages.totals;
  const held = plan.mapping.interpretation === 'held';
  const maxGap = plan.mapping.maxGap ?? (held ? Number.POSITIVE_INFINITY : longestBridged(batch, complete));
  if (maxGap === undefined) return undefined;
  stages.totals = openTotals({ held, maxGap, dayOf: daysOfZone(plan.mapping.zone, plan.dayStart) });
  return stages.totals;
}

/** Counts, shows, draws and writes the first rows of the batch, and lets go of them. */
function settle(stages: Stages, totals: Totals, settled: number): void {
  const { batch, flows, repeats, shown, out } = stages;
  takeRows(totals, batch, settled);
  showRows(shown, batch, settled, flows.problems);
  draw(stages, totals.rule.maxGap, settled);
  if (out !== undefined) writeRows(out, batch, settled);
  drop(batch, settled);
  moveRepeats(repeats, settled);
}

function draw(stages: Stages, maxGap: number, settled: number): void {
  const { batch, chart } = stages;
  for (let at = 0; at < settled; at += 1) {
    if ((batch.account[at] as number) >= FIRST_REFUSED) continue;
    const time = batch.time[at] as number;
    addPoint(chart, time, batch.flow[at] as number, time - stages.charted > maxGap);
    stages.charted = time;
  }
}

function close(stages: Stages): Totals {
  const totals = totalsOf(stages, true);
  if (totals === undefined) throw new Error('log: expected totals at the end, got none');
  settle(stages, totals, stages.batch.size);
  closeTotals(totals);
  if (stages.out !== undefined) closeOut(stages.out);
  return totals;
}
