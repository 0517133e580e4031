/** A row of a log through the whole calculation: the state of its fluid, its metal, its flow, whether it is inside its limits. */
import { type Bounds, isInside } from '../numeric/bounds.ts';
import { as } from '../quantity/brand.ts';
import { flowAt, type Moment, type MomentFlow, type Standing } from '../run/standing.ts';

/** What the standard limits of one flow: Re_D, and p2/p1 of a fluid that expands. */
export interface FlowLimits {
  readonly reynolds: Bounds;
  readonly ratio: Bounds;
}

/** The limits of a meter at its own temperature; the growth of its metal hardly moves them. */
export function limitsOf({ primary, solution }: Standing): FlowLimits {
  const limits = primary.limits(solution.meter.geometry, 0);
  const bounds = (id: 'reynolds-pipe' | 'pressure-ratio'): Bounds => limits.find((limit) => limit.id === id) ?? {};
  return { reynolds: bounds('reynolds-pipe'), ratio: bounds('pressure-ratio') };
}

/** Flow and density of a row that could be solved. */
export interface Solved {
  readonly flow: number; // kg/s
  readonly density: number; // kg/m3
  /** False beyond a limit of the standard for one flow, or of the fluid's formulation. */
  readonly inside: boolean;
}

/** The flow that a differential above zero makes at a moment; else the code of the problem. */
export function exactRow(
  stands: Standing,
  limits: FlowLimits,
  differential: number,
  moment: Moment,
): Solved | { readonly problem: string } {
  const flow = flowAt(stands, moment, as<'pressure difference'>(differential));
  if (!flow.ok) return { problem: flow.problems[0].code };
  const { meter, operation } = flow.value;
  return { flow: operation.massFlow, density: meter.state.density, inside: withinLimits(flow.value, limits) };
}

function withinLimits({ meter: { state }, operation }: MomentFlow, { reynolds, ratio }: FlowLimits): boolean {
  if (state.cautions?.some(({ verdict }) => verdict === 'outside')) return false;
  const share = 1 - operation.differential / state.pressure;
  return isInside(operation.reynolds, reynolds) && (!state.expands || isInside(share, ratio));
}
