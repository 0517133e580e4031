/**
 * Heads along the pipe at one flow, in metres of the upstream fluid above the pressure behind the meter. Up to the
 * downstream tapping the total head is kept; what the jet then loses is the permanent loss. That is the model behind
 * the standard's own loss formula, ISO 5167-2:2003, Eq (7). Along a bar across the pipe they are those that its ports
 * feel: the flow comes to rest in front of it, and behind it the pressure is lower by the differential.
 */
import type { Acceleration } from '../quantity/kinds.ts';
import { lossOf, type Meter, type Operation, velocityOf } from '../solve/equation.ts';
import type { HeadPoint } from './record.ts';

/** Straight pipe shown before the upstream tapping, in pipe bores. */
const INLET = 3;
/** Where the wake of a bar is drawn to end, in pipe bores: nothing says how far it goes. */
const WAKE = 3;

/** The heads from before the upstream tapping to where the pressure has recovered; none where the loss is not known. */
export function headsOf(meter: Meter, operation: Operation, gravity: Acceleration): HeadPoint[] {
  const { primary, geometry, state } = meter;
  const head = (pressure: number) => pressure / (state.density * gravity); // p/(rho g)
  const lost = lossOf(meter, operation);
  if (lost === undefined) return [];
  const velocity = velocityOf(operation.massFlow, state.density, geometry.pipe) ** 2 / (2 * gravity); // V2/2g
  const heads: Heads = { loss: head(lost), drop: head(operation.differential), velocity };
  const points = primary.insertion === undefined ? alongBore(meter, heads) : alongBar(meter, heads);
  return points.sort((one, other) => one.position_D - other.position_D);
}

interface Heads {
  readonly loss: number;
  readonly drop: number; // between the tappings
  readonly velocity: number;
}

const point = (station: string, position: number, pressure: number, total: number): HeadPoint => ({
  station,
  position_D: position,
  total_m: total,
  pressure_m: pressure,
  computed: true,
});

function alongBore({ primary, geometry }: Meter, { loss, drop, velocity }: Heads): HeadPoint[] {
  const throat = loss - drop;
  const tappings = primary.tappings(geometry);
  const upstream = -tappings.upstream / geometry.pipe;
  const downstream = tappings.downstream / geometry.pipe;
  const level = { upstream: loss, throat };
  const sections = (primary.sections?.(geometry) ?? []).map((section) =>
    point(section.station, section.position / geometry.pipe, level[section.level], loss + velocity),
  );
  const face: HeadPoint = { ...point('face', 0, loss, loss + velocity), computed: false };
  if (primary.recovery === undefined) throw new Error(`heads: expected a recovery of ${primary.name}, got none`);
  return [
    point('inlet', upstream - INLET, loss, loss + velocity),
    point('tapping-upstream', upstream, loss, loss + velocity),
    ...(sections.length === 0 && tappings.upstream > 0 ? [face] : sections),
    point('tapping-downstream', downstream, throat, loss + velocity),
    point('recovered', primary.recovery, 0, velocity),
  ];
}

function alongBar({ primary, geometry }: Meter, { loss, drop, velocity }: Heads): HeadPoint[] {
  const { upstream, downstream } = primary.tappings(geometry);
  const total = loss + velocity;
  const near: HeadPoint = { ...point('face', -0.5 - upstream / geometry.pipe, loss, total), computed: false };
  return [
    point('inlet', -INLET, loss, total),
    near,
    point('tapping-upstream', -upstream / geometry.pipe, total, total), // at rest: pressure and total head are one
    point('tapping-downstream', downstream / geometry.pipe, total - drop, total),
    { ...point('recovered', WAKE, 0, velocity), computed: false },
  ];
}
