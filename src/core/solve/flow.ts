/**
 * Flow from differential: ISO 5167-1:2003, Annex A, unknown q_m. With A1 = Re_D/C known, solves C = C(A1 C), whose left
 * side rises and whose right side hardly moves, so that one root exists and three evaluations find it.
 */
import { fixedPoint } from '../numeric/fixed-point.ts';
import { type Root, root } from '../numeric/root.ts';
import { as } from '../quantity/brand.ts';
import type { PressureDifference } from '../quantity/kinds.ts';
import { fail, type Outcome, ok } from '../quantity/outcome.ts';
import { type Held, type Meter, type Operation, reynoldsOf, withHeld } from './equation.ts';
import { impossible } from './possible.ts';

const LEAST_COEFFICIENT = 1e-3;
const MOST_COEFFICIENT = 1e3;

/**
 * Mass flow in kg/s for a differential in Pa above zero and below the upstream pressure.
 * Problems: those of possible.ts; flow-unsettled, with the last bracket of C.
 */
export function flowFrom(differential: PressureDifference, meter: Meter): Outcome<Operation> {
  const { primary, geometry, state, held } = meter;
  const refused = impossible(differential, state, 'differential');
  if (refused !== undefined) return refused;
  const epsilon = meter.expansibility(differential / state.pressure);
  const ideal = epsilon * meter.unitFlow * Math.sqrt(differential); // q_m/C
  const a1 = reynoldsOf(ideal, state.viscosity, geometry.pipe); // Annex A, A1 = Re_D/C
  const found = coefficientFrom(a1, held, primary.guess);
  if (!found.found) return fail('flow-unsettled', 'differential', { lower: found.lower, upper: found.upper });
  const { x: coefficient, evaluations } = found;
  const massFlow = as<'mass flow'>(coefficient * ideal);
  const reynolds = a1 * coefficient;
  return ok(withHeld(held, { massFlow, differential, coefficient, epsilon, reynolds, evaluations }));
}

/** The root of C = C(A1 C) for a1 = Re_D/C above zero; where C moves too much to settle at once, inside a bracket. */
export function coefficientFrom(a1: number, held: Held, guess: number): Root {
  const quick = fixedPoint((c) => held.at(a1 * c), guess);
  if (quick !== undefined) return { found: true, x: quick.x, evaluations: quick.evaluations };
  return root({
    f: (c) => c - held.at(a1 * c),
    lower: LEAST_COEFFICIENT,
    upper: MOST_COEFFICIENT,
    start: guess,
    slope: 1,
  });
}
