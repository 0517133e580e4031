/**
 * The flow of a row of a log, millions of times: density, viscosity and exponent from the surface of the fluid, the metal
 * at the row's temperature, ε and C explicit. Each of them carries a bound that was measured when it was built, and where
 * one does not reach, the row is solved for it: C alone, or all of it as for a single reading.
 */
import type { Geometry } from '../element/contract.ts';
import { seamsOf } from '../fluid/state.ts';
import { as } from '../quantity/brand.ts';
import { flowAt, meterAt, type Standing } from '../run/standing.ts';
import { heldDischarge } from '../solve/equation.ts';
import { coefficientFrom } from '../solve/flow.ts';
import { hotSection } from '../solve/metal.ts';
import { approximantOf } from './approximant.ts';
import { BLOCK, type Block, coefficients, type Explicit, epsilons, ideals, openBlock, states } from './block.ts';
import { expansionOf } from './expansion.ts';
import { growthOf, spansOf } from './spans.ts';
import { type Box, type Cells, type NoSurface, type StateAt, surfaceOf, tiedSurfaceOf } from './surface.ts';

/** What was measured, a figure a row. Pa, Pa absolute, K; what is absent is as the meter has it. */
export interface Rows {
  readonly differential: Float64Array;
  readonly pressure?: Float64Array;
  readonly temperature?: Float64Array;
}

/** What flows, a figure a row; the arrays that are there are filled. SI. */
export interface RowFlows {
  readonly massFlow: Float64Array;
  /** How the row was solved, by PATH. */
  readonly path: Uint8Array;
  readonly density?: Float64Array;
  readonly coefficient?: Float64Array;
  readonly epsilon?: Float64Array;
  readonly reynolds?: Float64Array;
}

/** Explicit; C searched for; the whole calculation; refused, with 0 in every figure and its problem in `problems`. */
export const PATH = { explicit: 0, coefficient: 1, whole: 2, refused: 3 } as const;

/** Largest relative errors of an explicit row against the whole calculation. */
export interface KernelBounds {
  readonly density: number;
  readonly viscosity: number;
  readonly isentropicExponent: number;
  readonly coefficient: number;
  readonly epsilon: number;
  readonly massFlow: number;
}

export interface Kernel {
  /** Fills the flows of the rows from one to before another. Rows without a differential above zero are refused. */
  readonly convert: (rows: Rows, flows: RowFlows, from: number, to: number) => void;
  /** Code of the problem of a refused row, found by solving it once more; undefined where the differential is not above zero. */
  readonly problemOf: (rows: Rows, row: number) => string | undefined;
  /** Absent where every row goes through the whole calculation. */
  readonly bounds?: KernelBounds;
  readonly why?: NoSurface | 'downstream-temperature' | 'pressure-tied';
  /** Cautions that some state of the box carries, and whether all of it is outside its formulation; rows that went whole say it themselves. */
  readonly cautions: readonly string[];
  readonly outside: boolean;
}

/** The kernel of a meter for rows in a box; outside the box a row goes through the whole calculation. */
export function kernelOf(stands: Standing, box: Box): Kernel {
  const tied = isTied(stands, box);
  const own = (rows: Rows): Rows => (tied ? withoutTemperature(rows) : rows);
  const problemOf = (rows: Rows, row: number) => problemAt(stands, own(rows), row);
  const wholly = (why: NonNullable<Kernel['why']>): Kernel => ({
    convert: (rows, flows, from, to) => {
      const measured = own(rows);
      for (let row = from; row < to; row += 1) whole(stands, measured, flows, row);
    },
    problemOf,
    why,
    cautions: [],
    outside: false,
  });
  if (stands.upstream.downstream === true) return wholly('downstream-temperature');
  if (stands.upstream.pressure === undefined) return wholly('pressure-tied');
  const surface = tied
    ? tiedSurfaceOf(stateOn(stands), box.pressure)
    : surfaceOf(stateOn(stands), box, seamsOf(stands.written.fluid ?? {}, stands.site.atmosphere));
  if (surface.kind === 'exact') return wholly(surface.why);
  const explicit = explicitOf(stands, surface);
  const bounds = boundsOf(explicit);
  const { cautions, outside } = surface;
  return {
    convert: (rows, flows, from, to) => convert(stands, explicit, own(rows), flows, from, to),
    problemOf,
    bounds,
    cautions,
    outside,
  };
}

/** Whether the temperature is neither written nor logged, but follows from the pressure: saturated steam. */
const isTied = ({ upstream }: Standing, { temperature }: Box): boolean =>
  upstream.temperature === undefined && temperature[0] === temperature[1];

const withoutTemperature = ({ differential, pressure }: Rows): Rows => ({
  differential,
  ...(pressure === undefined ? {} : { pressure }),
});

const stateOn =
  (stands: Standing): StateAt =>
  (p, T) => {
    const pressure = as<'absolute pressure'>(p);
    const meter = meterAt(stands, T === undefined ? { pressure } : { pressure, temperature: as<'temperature'>(T) });
    return meter.ok ? { ok: true, value: meter.value.state } : meter;
  };

function explicitOf(stands: Standing, surface: Cells): Explicit {
  const { primary, input, solution } = stands;
  const geometry = (T: number) => geometryAt(stands, T);
  const spans = spansOf(input, surface.temperatures);
  const growth = growthOf(spans, geometry);
  const approximant = approximantOf(primary, spans, geometry);
  const ratio = geometry(surface.temperatures[0]).ratio;
  const expansion = surface.expands && growth.rigid ? expansionOf(primary, ratio, surface.exponents) : undefined;
  const { pressure, temperature } = solution.meter.state;
  const block = openBlock();
  block.pressure.fill(surface.box.pressure[0]);
  block.temperature.fill(surface.temperatures[0]);
  const still = [surface.box.pressure, surface.box.temperature].every(([lower, upper]) => lower === upper);
  if (still) states(surface, block, BLOCK);
  const common = { primary, surface, growth, approximant, pressure, temperature, still, block };
  return expansion === undefined ? common : { ...common, expansion };
}

/** The metal at a temperature; a bore as wide as its pipe was refused when the meter was solved, and stays narrower. */
function geometryAt({ primary, solution, input }: Standing, T: number): Geometry {
  const found = hotSection(primary, solution.boreAsMeasured, input, as<'temperature'>(T));
  if (found.ok) return found.value;
  throw new Error(`kernel: expected a bore below the pipe at ${T} K, got ${JSON.stringify(found.problems)}`);
}

/** |dε/ε| is at most this share of |dκ/κ| up to a quarter of p1: ε falls to no less than 0.7 there. */
const EXPONENT_SHARE = 0.43;

function boundsOf({ surface, approximant, expansion }: Explicit): KernelBounds {
  const { density, viscosity, isentropicExponent } = surface.bounds;
  const coefficient = approximant.bound + approximant.steepness * (viscosity + density / 2);
  const epsilon = (expansion?.bound ?? 0) + (surface.expands ? EXPONENT_SHARE * isentropicExponent : 0);
  const rounding = 1e-13;
  const massFlow = density / 2 + coefficient + epsilon + rounding; // q_m = C ε E (π/4) d² sqrt(2 Δp ρ)
  return { density, viscosity, isentropicExponent, coefficient, epsilon, massFlow };
}

/** Up to a quarter of p1 every differential makes a flow; beyond it the whole calculation says. */
const MOST_SHARE = 0.25;

/** The rows in blocks, and those that no block takes one by one. */
function convert(stands: Standing, explicit: Explicit, rows: Rows, flows: RowFlows, from: number, to: number): void {
  let row = from;
  while (row < to) {
    const count = taken(explicit, rows, row, Math.min(to, row + BLOCK));
    if (count === 0) whole(stands, rows, flows, row);
    else throughBlock(stands, explicit, flows, row, count);
    row += Math.max(count, 1);
  }
}

/** A temperature that follows from the pressure is not looked at. */
const ANY = [Number.NEGATIVE_INFINITY, Number.POSITIVE_INFINITY] as const;

/** Copies rows into the block as long as they lie in the box and make a flow; how many. */
function taken(explicit: Explicit, { differential, pressure, temperature }: Rows, from: number, to: number): number {
  const { block, surface } = explicit;
  const [leastP, mostP] = surface.box.pressure;
  const [leastT, mostT] = surface.tied ? ANY : surface.box.temperature;
  let count = 0;
  for (let row = from; row < to; row += 1) {
    const dp = differential[row] as number;
    const p = pressure === undefined ? explicit.pressure : (pressure[row] as number);
    const T = temperature === undefined ? explicit.temperature : (temperature[row] as number);
    if (!(dp > 0 && dp <= MOST_SHARE * p && p >= leastP && p <= mostP && T >= leastT && T <= mostT)) break;
    block.differential[count] = dp;
    block.pressure[count] = p;
    block.temperature[count] = T;
    count += 1;
  }
  return count;
}

function throughBlock(stands: Standing, explicit: Explicit, flows: RowFlows, from: number, count: number): void {
  const { block, surface } = explicit;
  if (!explicit.still) states(surface, block, count);
  if (surface.expands) epsilons(explicit, count);
  ideals(explicit, count);
  const open = coefficients(explicit, count);
  flows.path.fill(PATH.explicit, from, from + count);
  if (open) searchRows(stands, block, flows, from, count);
  hand(block, flows, from, count);
}

/** C of the rows that the approximant left open. */
function searchRows(stands: Standing, block: Block, flows: RowFlows, from: number, count: number): void {
  for (let at = 0; at < count; at += 1) {
    if (block.coefficient[at] !== 0) continue;
    block.coefficient[at] = searched(stands, block.invariant[at] as number, block.temperature[at] as number);
    flows.path[from + at] = PATH.coefficient;
  }
}

/** The figures of a block into the columns that are there. */
function hand(
  { coefficient, ideal, invariant, density, epsilon }: Block,
  flows: RowFlows,
  from: number,
  count: number,
): void {
  const { massFlow, reynolds } = flows;
  for (let at = 0; at < count; at += 1) massFlow[from + at] = (coefficient[at] as number) * (ideal[at] as number);
  if (reynolds !== undefined)
    for (let at = 0; at < count; at += 1) reynolds[from + at] = (coefficient[at] as number) * (invariant[at] as number);
  flows.density?.set(density.subarray(0, count), from);
  flows.coefficient?.set(coefficient.subarray(0, count), from);
  flows.epsilon?.set(epsilon.subarray(0, count), from);
}

/** C where the approximant does not reach. */
function searched(stands: Standing, a1: number, T: number): number {
  const { primary } = stands;
  const found = coefficientFrom(a1, heldDischarge(primary, geometryAt(stands, T)), primary.guess);
  if (found.found) return found.x;
  throw new Error(`kernel: expected C to settle at Re/C = ${a1}, got ${found.side}`);
}

/** The whole calculation of a row. */
function solvedAt(stands: Standing, { differential, pressure, temperature }: Rows, row: number) {
  const moment = {
    ...(pressure === undefined ? {} : { pressure: as<'absolute pressure'>(pressure[row] as number) }),
    ...(temperature === undefined ? {} : { temperature: as<'temperature'>(temperature[row] as number) }),
  };
  return flowAt(stands, moment, as<'pressure difference'>(differential[row] as number));
}

function whole(stands: Standing, rows: Rows, flows: RowFlows, row: number): void {
  const found = (rows.differential[row] as number) > 0 ? solvedAt(stands, rows, row) : undefined;
  if (found === undefined || !found.ok) {
    put(flows, row, PATH.refused, 0, 0, 0, 0, 0);
    return;
  }
  const { operation, meter } = found.value;
  const { massFlow, coefficient, epsilon, reynolds } = operation;
  put(flows, row, PATH.whole, massFlow, meter.state.density, coefficient, epsilon, reynolds);
}

function problemAt(stands: Standing, rows: Rows, row: number): string | undefined {
  if (!((rows.differential[row] as number) > 0)) return undefined;
  const found = solvedAt(stands, rows, row);
  return found.ok ? undefined : found.problems[0].code;
}

function put(
  flows: RowFlows,
  row: number,
  path: number,
  massFlow: number,
  density: number,
  coefficient: number,
  epsilon: number,
  reynolds: number,
): void {
  flows.massFlow[row] = massFlow;
  flows.path[row] = path;
  if (flows.density !== undefined) flows.density[row] = density;
  if (flows.coefficient !== undefined) flows.coefficient[row] = coefficient;
  if (flows.epsilon !== undefined) flows.epsilon[row] = epsilon;
  if (flows.reynolds !== undefined) flows.reynolds[row] = reynolds;
}
