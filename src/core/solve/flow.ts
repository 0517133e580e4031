/**
 * Flow from differential: ISO 5167-1:2003, Annex A, unknown q_m. With A1 = Re_D/C known, solves C = C(A1 C), whose left
 * side rises and whose right side hardly moves, so that one root exists and three evaluations find it.
 */
import { root } from '../numeric/root.ts';
import { as } from '../quantity/brand.ts';
import type { PressureDifference } from '../quantity/kinds.ts';
import { fail, type Outcome, ok } from '../quantity/outcome.ts';
import {
  expansibilityOf,
  heldDischarge,
  idealFlow,
  type Meter,
  type Operation,
  reynoldsOf,
  withHeld,
} from './equation.ts';
import { impossible } from './possible.ts';

const LEAST_COEFFICIENT = 1e-3;
const MOST_COEFFICIENT = 1e3;

/**
 * Mass flow in kg/s for a differential in Pa above zero and below the upstream pressure.
 * Problems: those of possible.ts; flow-unsettled, with the last bracket of C.
 */
export function flowFrom(differential: PressureDifference, { primary, geometry, state }: Meter): Outcome<Operation> {
  const refused = impossible(differential, state, 'differential');
  if (refused !== undefined) return refused;
  const epsilon = expansibilityOf(primary, geometry.ratio, state)(differential / state.pressure);
  const ideal = epsilon * idealFlow(geometry, differential, state.density); // q_m/C
  const a1 = reynoldsOf(ideal, state.viscosity, geometry.pipe); // Annex A, A1 = Re_D/C
  const held = heldDischarge(primary, geometry);
  const found = root({
    f: (c) => c - held.at(a1 * c),
    lower: LEAST_COEFFICIENT,
    upper: MOST_COEFFICIENT,
    start: primary.guess,
    slope: 1,
  });
  if (!found.found) return fail('flow-unsettled', 'differential', { lower: found.lower, upper: found.upper });
  const { x: coefficient, evaluations } = found;
  const massFlow = as<'mass flow'>(coefficient * ideal);
  const reynolds = a1 * coefficient;
  return ok(withHeld(held, { massFlow, differential, coefficient, epsilon, reynolds, evaluations }));
}
