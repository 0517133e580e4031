/**
 * Heads along the pipe at one flow, in metres of the upstream fluid above the pressure behind the meter. Up to the
 * downstream tapping the total head is kept; what the jet then loses is the permanent loss. That is the model behind
 * the standard's own loss formula, ISO 5167-2:2003, Eq (7).
 */
import type { Acceleration } from '../quantity/kinds.ts';
import { type Meter, type Operation, velocityOf } from '../solve/equation.ts';
import type { HeadPoint } from './record.ts';

/** Straight pipe shown before the upstream tapping, in pipe bores. */
const INLET = 3;

/** The heads from before the upstream tapping to where the pressure has recovered, in the direction of the flow. */
export function headsOf(meter: Meter, operation: Operation, gravity: Acceleration): HeadPoint[] {
  const { primary, geometry, state } = meter;
  const head = (pressure: number) => pressure / (state.density * gravity); // p/(rho g)
  const velocity = velocityOf(operation.massFlow, state.density, geometry.pipe) ** 2 / (2 * gravity); // V2/2g
  const loss = head(operation.differential * primary.lossShare(geometry, operation.coefficient, operation.reynolds));
  const throat = loss - head(operation.differential);
  const tappings = primary.tappings(geometry);
  const point = (station: string, position: number, pressure: number, total: number): HeadPoint => ({
    station,
    position_D: position,
    total_m: total,
    pressure_m: pressure,
    computed: true,
  });
  const upstream = -tappings.upstream / geometry.pipe;
  const downstream = tappings.downstream / geometry.pipe;
  const level = { upstream: loss, throat };
  const sections = (primary.sections?.(geometry) ?? []).map((section) =>
    point(section.station, section.position / geometry.pipe, level[section.level], loss + velocity),
  );
  const face: HeadPoint = { ...point('face', 0, loss, loss + velocity), computed: false };
  const points = [
    point('inlet', upstream - INLET, loss, loss + velocity),
    point('tapping-upstream', upstream, loss, loss + velocity),
    ...(sections.length === 0 && tappings.upstream > 0 ? [face] : sections),
    point('tapping-downstream', downstream, throat, loss + velocity),
    point('recovered', primary.recovery, 0, velocity),
  ];
  return points.sort((one, other) => one.position_D - other.position_D);
}
