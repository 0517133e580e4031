/**
 * Rows with their figures -> rows with their flow, and the rest of their account. By the surface of the fluid as far as
 * it reaches; where it is asked for, or where there is none, each row through the whole calculation.
 */
import { isInside } from '../numeric/bounds.ts';
import { as } from '../quantity/brand.ts';
import type { PathRecord } from '../result/log-record.ts';
import type { Standing } from '../run/standing.ts';
import { ACCOUNT, FIRST_REFUSED } from './account.ts';
import type { Batch } from './batch.ts';
import { type Covering, covers, widen } from './covering.ts';
import { exactRow, type FlowLimits, limitsOf } from './exact.ts';
import { PATH } from './kernel.ts';

export interface Flows {
  readonly stands: Standing;
  /** A differential below it is no flow, Pa. */
  readonly cutOff: number;
  readonly limits: FlowLimits;
  /** The same as plain numbers. */
  readonly clear: { readonly leastReynolds: number; readonly mostReynolds: number; readonly leastRatio: number };
  readonly covering: Covering;
  /** Why rows of the batch could not be solved, by row number; few are kept. */
  readonly problems: Map<number, string>;
  /** Of the rows of a batch: how each was solved, and its Reynolds number. */
  path: Uint8Array;
  reynolds: Float64Array;
  surfaceRows: number;
  exactRows: number;
}

const MOST_PROBLEMS = 5;

export function openFlows(stands: Standing, cutOff: number, covering: Covering): Flows {
  const limits = limitsOf(stands);
  return {
    stands,
    cutOff,
    limits,
    clear: {
      leastReynolds: limits.reynolds.min ?? 0,
      mostReynolds: limits.reynolds.max ?? Number.POSITIVE_INFINITY,
      leastRatio: limits.ratio.min ?? 0,
    },
    covering,
    problems: new Map(),
    path: new Uint8Array(0),
    reynolds: new Float64Array(0),
    surfaceRows: 0,
    exactRows: 0,
  };
}

/** Fills in the flow and the density of the rows of a batch from one on. */
export function flowRows(flows: Flows, batch: Batch, from: number): void {
  const { covering, cutOff } = flows;
  const { account, differential, pressure, temperature } = batch;
  if (flows.path.length < account.length) {
    flows.path = new Uint8Array(account.length);
    flows.reynolds = new Float64Array(account.length);
  }
  let start = from; // of the run of rows before the one at hand that the surface covers
  for (let at = from; at < batch.size; at += 1) {
    const dp = differential[at] as number;
    const flowing = (account[at] as number) < FIRST_REFUSED && dp > 0 && dp >= cutOff;
    const [p, T] = [pressure[at] as number, temperature[at] as number];
    if (flowing && covers(covering, p, T)) continue;
    bySurface(flows, batch, start, at);
    start = at + 1;
    if (!flowing) continue;
    if (covering.left > 0) widen(covering, p, T);
    if (covers(covering, p, T)) start = at;
    else exactly(flows, batch, at);
  }
  bySurface(flows, batch, start, batch.size);
}

/** A run of rows that the surface covers. */
function bySurface(flows: Flows, batch: Batch, from: number, to: number): void {
  if (from >= to) return;
  const { covering, path, reynolds } = flows;
  if (covering.kernel === undefined) throw new Error('flows: expected a surface under covered rows, got none');
  const filled = { massFlow: batch.flow, density: batch.density, path, reynolds };
  covering.kernel.convert(batch, filled, from, to);
  for (let at = from; at < to; at += 1) {
    if (path[at] === PATH.refused || path[at] === PATH.whole) {
      exactly(flows, batch, at); // it knows the cautions of the state, and the problem
      continue;
    }
    flows.surfaceRows += 1;
    if (covering.kernel.outside || !isWithin(flows, batch, at)) remarkOutside(batch, at);
  }
}

/** Whether the flow of a row is inside the limits of the standard; most rows are well inside, and say so quickly. */
function isWithin({ limits, clear, stands, reynolds }: Flows, { differential, pressure }: Batch, at: number): boolean {
  const [Re, share] = [reynolds[at] as number, 1 - (differential[at] as number) / (pressure[at] as number)];
  if (Re > clear.leastReynolds && Re < clear.mostReynolds && share > clear.leastRatio) return true;
  const expands = stands.solution.meter.state.expands;
  return isInside(Re, limits.reynolds) && (!expands || isInside(share, limits.ratio));
}

/** A row through the whole calculation. */
function exactly(flows: Flows, batch: Batch, at: number): void {
  const { stands, limits, problems, covering } = flows;
  const { differential, pressure, temperature, account } = batch;
  const moment = {
    ...(covering.fixed.pressure ? {} : { pressure: as<'absolute pressure'>(pressure[at] as number) }),
    ...(covering.fixed.temperature ? {} : { temperature: as<'temperature'>(temperature[at] as number) }),
  };
  const row = exactRow(stands, limits, differential[at] as number, moment);
  flows.exactRows += 1;
  if ('problem' in row) {
    account[at] = ACCOUNT.notSolved;
    batch.flow[at] = 0;
    if (problems.size < MOST_PROBLEMS) problems.set(batch.row[at] as number, row.problem);
    return;
  }
  batch.flow[at] = row.flow;
  batch.density[at] = row.density;
  if (!row.inside) remarkOutside(batch, at);
}

/** The remark, where no earlier one of the list stands. */
function remarkOutside({ account }: Batch, at: number): void {
  const kind = account[at] as number;
  if (kind === ACCOUNT.converted || kind > ACCOUNT.outsideLimits) account[at] = ACCOUNT.outsideLimits;
}

export function pathOf({ surfaceRows, exactRows, covering: { bounds, why } }: Flows): PathRecord {
  return {
    kind: surfaceRows > 0 ? 'surface' : 'exact',
    ...(why === undefined ? {} : { why }),
    surfaceRows,
    exactRows,
    ...(bounds === undefined || surfaceRows === 0 ? {} : { bounds }),
  };
}
