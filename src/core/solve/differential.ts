/**
 * Differential from flow: ISO 5167-1:2003, Annex A, unknown dp. C is known at once, since Re_D is; what remains is
 * dp eps2 = A3. In a gas dp eps2 rises to a maximum beyond the standard's range and falls again, so that only the
 * rising part up to a quarter of p1 (or what the user already spans) is searched.
 */
import { type Root, root } from '../numeric/root.ts';
import type { MassFlow, PressureDifference } from '../quantity/kinds.ts';
import { fail, type Outcome, ok } from '../quantity/outcome.ts';
import {
  expansibilityOf,
  heldAt,
  heldDischarge,
  idealFlow,
  type Meter,
  type Operation,
  reynoldsOf,
} from './equation.ts';

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
  { primary, geometry, state }: Meter,
  field: string,
  spanned = 0,
): Outcome<Operation> {
  const reynolds = reynoldsOf(massFlow, state.viscosity, geometry.pipe);
  const held = heldDischarge(primary, geometry);
  const coefficient = held.at(reynolds);
  const unit = coefficient * idealFlow(geometry, 1, state.density); // q_m at 1 Pa without expansion
  const a3 = (massFlow / unit) ** 2 / state.pressure; // Annex A, A3 over p1: x eps2
  const common = { massFlow, coefficient, reynolds, ...heldAt(held, reynolds) };
  if (!state.expands) {
    if (a3 >= 1)
      return fail('differential-exceeds-pressure', field, {
        differential: a3 * state.pressure,
        pressure: state.pressure,
      });
    return ok({ ...common, differential: (a3 * state.pressure) as PressureDifference, epsilon: 1, evaluations: 0 });
  }
  const most = Math.min(Math.max(MOST_EXPANSION, spanned / state.pressure), STILL_RISING);
  const epsilonAt = expansibilityOf(primary, geometry.ratio, state);
  const { found, evaluations } = expansionFrom(a3, most, epsilonAt);
  if (!found.found) return fail('differential-too-large', field, { pressure: state.pressure, share: most });
  const x = found.x;
  return ok({
    ...common,
    differential: (x * state.pressure) as PressureDifference,
    epsilon: coefficientOfExpansion(a3, x),
    evaluations,
  });
}

/** At the root x eps2 = A3 holds to the last bit, so eps needs no further evaluation. */
const coefficientOfExpansion = (a3: number, x: number): number => Math.sqrt(a3 / x);

/**
 * Solves x eps(x)2 = a for x. eps falls almost in a straight line from 1, eps = 1 - k x, so that one value at x = a
 * gives k and k a first guess: the series of the root of x (1 - k x)2 = a.
 */
function expansionFrom(
  a: number,
  most: number,
  epsilonAt: (x: number) => number,
): { found: Root; evaluations: number } {
  const probe = Math.min(a, most);
  const k = (1 - epsilonAt(probe)) / probe;
  const ka = k * probe;
  const guess = probe * (1 + ka * (2 + ka * (7 + ka * (30 + ka * 143)))); // Lagrange's inversion of x (1 - k x)2 = a
  const start = Math.min(guess, most);
  const line = 1 - k * start;
  const found = root({
    f: (x) => x * epsilonAt(x) ** 2 - a,
    lower: 0,
    upper: most,
    start,
    slope: line * (3 * line - 2), // of x (1 - k x)2
  });
  return { found, evaluations: found.evaluations + 1 };
}
