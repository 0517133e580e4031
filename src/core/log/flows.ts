/** Rows with their figures -> rows with their flow, and the rest of their account. */
import type { Standing } from '../run/standing.ts';
import { ACCOUNT, FIRST_REFUSED } from './account.ts';
import type { Batch } from './batch.ts';
import { exactRow, type FlowLimits, limitsOf } from './exact.ts';
import type { PathRecord } from './record.ts';

/** What counts as no flow: a differential below one in Pa, or a flow below one in kg/s. */
export interface CutOff {
  readonly differential: number;
  readonly massFlow: number;
}

export interface Flows {
  readonly stands: Standing;
  readonly cutOff: CutOff;
  readonly limits: FlowLimits;
  /** Why rows of the batch could not be solved, by row number; few are kept. */
  readonly problems: Map<number, string>;
  exactRows: number;
}

const MOST_PROBLEMS = 5;

export const openFlows = (stands: Standing, cutOff: CutOff, _exact: boolean): Flows => ({
  stands,
  cutOff,
  limits: limitsOf(stands),
  problems: new Map(),
  exactRows: 0,
});

/** Fills in the flow and the density of the rows of a batch from one on. */
export function flowRows(flows: Flows, batch: Batch, from: number): void {
  const { differential, account } = batch;
  const least = Math.max(flows.cutOff.differential, Number.MIN_VALUE);
  for (let at = from; at < batch.size; at += 1) {
    if ((account[at] as number) >= FIRST_REFUSED || !((differential[at] as number) >= least)) continue;
    exactly(flows, batch, at);
  }
}

function exactly(flows: Flows, batch: Batch, at: number): void {
  const { stands, limits, cutOff, problems } = flows;
  const { differential, pressure, temperature, account } = batch;
  const row = exactRow(stands, limits, differential[at] as number, pressure[at] as number, temperature[at] as number);
  flows.exactRows += 1;
  if ('problem' in row) {
    account[at] = ACCOUNT.notSolved;
    if (problems.size < MOST_PROBLEMS) problems.set(batch.row[at] as number, row.problem);
    return;
  }
  remark(batch, at, row.flow < cutOff.massFlow, row.inside);
  if (row.flow < cutOff.massFlow) return;
  batch.flow[at] = row.flow;
  batch.density[at] = row.density;
}

/** A remark on the flow, where no earlier one of the list stands. */
function remark({ account }: Batch, at: number, belowCutOff: boolean, inside: boolean): void {
  const kind = account[at] as number;
  const found = belowCutOff ? ACCOUNT.belowCutOff : inside ? ACCOUNT.converted : ACCOUNT.outsideLimits;
  if (found !== ACCOUNT.converted && (kind === ACCOUNT.converted || found < kind)) account[at] = found;
}

export const pathOf = ({ exactRows }: Flows): PathRecord => ({ kind: 'exact', surfaceRows: 0, exactRows });
