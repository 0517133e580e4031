/**
 * Differential from flow: ISO 5167-1:2003, Annex A, unknown dp. C is known at once, since Re_D is; what remains is
 * dp eps2 = A3. In a gas dp eps2 rises to a maximum beyond the standard's range and falls again, so that only the
 * rising part up to a quarter of p1 (or what the user already spans) is searched.
 */
import { exponentOf } from '../element/shared/expansibility.ts';
import { type Root, root } from '../numeric/root.ts';
import { as } from '../quantity/brand.ts';
import type { MassFlow } from '../quantity/kinds.ts';
import { fail, type Outcome, ok } from '../quantity/outcome.ts';
import { type Meter, type Operation, reynoldsOf, withHeld } from './equation.ts';

/** p2/p1 >= 0.75: ISO 5167-2:2022, 5.3.2.2, and its sister clauses. */
export const MOST_EXPANSION = 0.25;
/** Below the smallest dp/p1 at which dp eps2 turns down: 0.42, nozzle formula at beta 0.7 and kappa 1.3. */
const STILL_RISING = 0.4;

/**
 * Differential in Pa for a mass flow in kg/s above zero; `field` names the flow in the problems, `spanned` is a
 * differential already in use that the search may go up to.
 * Problems: differential-too-large (a gas would need more than the searched share of p1); differential-exceeds-pressure.
 */
export function differentialFrom(
  massFlow: MassFlow,
  { geometry, state, held, expansibility, unitFlow }: Meter,
  field: string,
  spanned = 0,
): Outcome<Operation> {
  const reynolds = reynoldsOf(massFlow, state.viscosity, geometry.pipe);
  const coefficient = held.at(reynolds);
  const unit = coefficient * unitFlow; // q_m at 1 Pa without expansion
  const a3 = (massFlow / unit) ** 2 / state.pressure; // Annex A, A3 over p1: x eps2
  const answer = (x: number, epsilon: number, evaluations: number): Outcome<Operation> => {
    const differential = as<'pressure difference'>(x * state.pressure);
    return ok(withHeld(held, { massFlow, differential, coefficient, epsilon, reynolds, evaluations }));
  };
  if (!state.expands) {
    if (a3 >= 1)
      return fail('differential-exceeds-pressure', field, {
        differential: a3 * state.pressure,
        pressure: state.pressure,
      });
    return answer(a3, 1, 0);
  }
  const most = Math.min(Math.max(MOST_EXPANSION, spanned / state.pressure), STILL_RISING);
  const found = expansionFrom(a3, most, typicalFall(geometry.ratio) / exponentOf(state), expansibility);
  if (!found.found) return fail('differential-too-large', field, { pressure: state.pressure, percent: 100 * most });
  return answer(found.x, Math.sqrt(a3 / found.x), found.evaluations); // at the root x eps2 = A3: eps is known
}

/**
 * Solves x eps(x)2 = a for x. eps falls almost in a straight line from 1: with eps = 1 - k x the slope k hardly moves, so
 * that x and the root of the cubic x (1 - k(x) x)2 = a differ by a function that rises with slope 1 and is nearly straight.
 */
function expansionFrom(a: number, most: number, fall: number, epsilonAt: (x: number) => number): Root {
  const cubicAt = (x: number) => cubicRoot(a, (1 - epsilonAt(x)) / x);
  return root({
    f: (x) => x - cubicAt(x),
    lower: 0,
    upper: most,
    start: Math.min(cubicRoot(a, fall), most),
    slope: 1,
  });
}

/** eps falls by about this over kappa for each unit of x: a guess between orifice plates and nozzles of that ratio. */
const typicalFall = (ratio: number): number => 0.55 + (0.7 * ratio ** 4) / (1 - ratio ** 4);
const MOST_STEPS = 30;

/**
 * The smaller root z of z (1 - k z)2 = a, or the place of its maximum where a lies above it. The first terms of the
 * series of z, all positive, start below the root; from there Newton's steps only rise, until rounding stops them.
 */
function cubicRoot(a: number, k: number): number {
  const peak = 1 / (3 * k);
  if (!(a < (4 / 9) * peak)) return peak;
  const ka = k * a;
  let z = a * (1 + ka * (2 + 7 * ka));
  for (let count = 0; count < MOST_STEPS; count += 1) {
    const line = 1 - k * z;
    const step = (a - z * line * line) / (line * (line - 2 * k * z));
    z += step;
    if (!(step > 2 * Number.EPSILON * z)) break;
  }
  return z;
}
