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
import { hotGeometry } from '../solve/metal.ts';
import { type Approximant, approximantOf, coefficientAt } from './approximant.ts';
import { type Expansion, expansibilityAt, expansionOf } from './expansion.ts';
import { lookUp } from './patch.ts';
import { FLOW, figureAt, type Growth, growthOf, RATIO, REYNOLDS, spanAt, spansOf } from './spans.ts';
import { type Box, type Cells, type NoSurface, patchAt, type StateAt, surfaceOf } from './surface.ts';

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
  readonly why?: NoSurface | 'downstream-temperature';
  /** Cautions that some state of the box carries, and whether all of it is outside its formulation; rows that went whole say it themselves. */
  readonly cautions: readonly string[];
  readonly outside: boolean;
}

/** What explicit rows are made of. */
interface Parts {
  readonly stands: Standing;
  readonly fallback: { readonly pressure: number; readonly temperature: number };
  readonly surface: Cells;
  readonly growth: Growth;
  readonly approximant: Approximant;
  /** Absent where the ratio moves or no short polynomial holds: then the element's own formula is taken. */
  readonly expansion?: Expansion;
  /** Density, viscosity and exponent of the row at hand. */
  readonly figures: Float64Array;
}

/** The kernel of a meter for rows in a box; outside the box a row goes through the whole calculation. */
export function kernelOf(stands: Standing, box: Box): Kernel {
  const { state } = stands.solution.meter;
  const fallback = { pressure: state.pressure as number, temperature: state.temperature as number };
  const problemOf = (rows: Rows, row: number) => problemAt(stands, rows, row);
  const wholly = (why: NonNullable<Kernel['why']>): Kernel => ({
    convert: (rows, flows, from, to) => {
      for (let row = from; row < to; row += 1) whole(stands, rows, flows, row);
    },
    problemOf,
    why,
    cautions: [],
    outside: false,
  });
  if (stands.upstream.downstream === true) return wholly('downstream-temperature');
  const surface = surfaceOf(stateOn(stands), box, seamsOf(stands.written.fluid ?? {}, stands.site.atmosphere));
  if (surface.kind === 'exact') return wholly(surface.why);
  const parts = partsOf(stands, surface, fallback);
  const bounds = boundsOf(parts);
  const { cautions, outside } = surface;
  return {
    convert: (rows, flows, from, to) => convert(parts, rows, flows, from, to),
    problemOf,
    bounds,
    cautions,
    outside,
  };
}

const stateOn =
  (stands: Standing): StateAt =>
  (p, T) => {
    const meter = meterAt(stands, { pressure: as<'absolute pressure'>(p), temperature: as<'temperature'>(T) });
    return meter.ok ? { ok: true, value: meter.value.state } : meter;
  };

function partsOf(stands: Standing, surface: Cells, fallback: Parts['fallback']): Parts {
  const { primary, input } = stands;
  const geometry = (T: number) => geometryAt(stands, T);
  const spans = spansOf(input, surface.box.temperature);
  const growth = growthOf(spans, geometry);
  const approximant = approximantOf(primary, spans, geometry);
  const ratio = geometry(surface.box.temperature[0]).ratio;
  const expansion = surface.expands && growth.rigid ? expansionOf(primary, ratio, surface.exponents) : undefined;
  const common = { stands, fallback, surface, growth, approximant, figures: new Float64Array(3) };
  return expansion === undefined ? common : { ...common, expansion };
}

/** The metal at a temperature; a bore as wide as its pipe was refused when the meter was solved, and stays narrower. */
function geometryAt({ solution, input }: Standing, T: number): Geometry {
  const found = hotGeometry(solution.boreAsMeasured, input, as<'temperature'>(T));
  if (found.ok) return found.value;
  throw new Error(`kernel: expected a bore below the pipe at ${T} K, got ${JSON.stringify(found.problems)}`);
}

/** |dε/ε| is at most this share of |dκ/κ| up to a quarter of p1: ε falls to no less than 0.7 there. */
const EXPONENT_SHARE = 0.43;

function boundsOf({ surface, approximant, expansion }: Parts): KernelBounds {
  const { density, viscosity, isentropicExponent } = surface.bounds;
  const coefficient = approximant.bound + approximant.steepness * (viscosity + density / 2);
  const epsilon = (expansion?.bound ?? 0) + (surface.expands ? EXPONENT_SHARE * isentropicExponent : 0);
  const rounding = 1e-13;
  const massFlow = density / 2 + coefficient + epsilon + rounding; // q_m = C ε E (π/4) d² sqrt(2 Δp ρ)
  return { density, viscosity, isentropicExponent, coefficient, epsilon, massFlow };
}

/** The rows one by one, in one function: nothing is allocated for a row that is explicit. */
function convert(parts: Parts, rows: Rows, flows: RowFlows, from: number, to: number): void {
  const { surface, growth, approximant, figures, stands, fallback } = parts;
  const { differential, pressure, temperature } = rows;
  const { expands } = surface;
  const [[leastP, mostP], [leastT, mostT]] = [surface.box.pressure, surface.box.temperature];
  for (let row = from; row < to; row += 1) {
    const dp = differential[row] as number;
    const p = pressure === undefined ? fallback.pressure : (pressure[row] as number);
    const T = temperature === undefined ? fallback.temperature : (temperature[row] as number);
    const x = dp / p;
    if (!(dp > 0 && x <= MOST_SHARE && p >= leastP && p <= mostP && T >= leastT && T <= mostT)) {
      whole(stands, rows, flows, row);
      continue;
    }
    lookUp(patchAt(surface, p, T), p, T, figures);
    const density = expands ? ((figures[0] as number) * p) / T : (figures[0] as number);
    const span = spanAt(growth, T);
    const t = (T - (growth.middle[span] as number)) * (growth.perHalf[span] as number);
    const epsilon = expands ? epsilonOf(parts, span, t, x, figures[2] as number) : 1;
    const ideal = epsilon * figureAt(growth, span, FLOW, t) * Math.sqrt(dp * density); // q_m/C
    const a1 = (ideal * figureAt(growth, span, REYNOLDS, t)) / (figures[1] as number); // Annex A, A1 = Re_D/C
    const explicit = coefficientAt(approximant, span, a1, t);
    const C = explicit === 0 ? searched(stands, a1, T) : explicit;
    put(flows, row, explicit === 0 ? PATH.coefficient : PATH.explicit, C * ideal, density, C, epsilon, a1 * C);
  }
}

/** Up to a quarter of p1 every differential makes a flow; beyond it the whole calculation says. */
const MOST_SHARE = 0.25;

function epsilonOf(parts: Parts, span: number, t: number, x: number, kappa: number): number {
  const { expansion, growth, stands } = parts;
  if (expansion !== undefined) return expansibilityAt(expansion, x, kappa);
  return stands.primary.expansibility(figureAt(growth, span, RATIO, t), kappa)(x);
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
