/**
 * Bore from flow and differential: ISO 5167-1:2003, Annex A, unknown d. With X = beta2/sqrt(1 - beta4), solves
 * C eps X = A2; C eps X rises with beta over the searched range, so that there is one bore or none.
 */
import type { Geometry, Primary } from '../element/contract.ts';
import type { FluidState } from '../fluid/contract.ts';
import { root } from '../numeric/root.ts';
import type { Length, MassFlow, PressureDifference } from '../quantity/kinds.ts';
import { fail, type Outcome, ok } from '../quantity/outcome.ts';
import { expansibilityOf, geometryOf, heldDischarge, type Operation, reynoldsOf, withHeld } from './equation.ts';
import { impossible } from './possible.ts';

export interface Bore {
  readonly geometry: Geometry; // at the line temperature
  readonly operation: Operation;
}

/** X of the diameter ratio, and the ratio of X: ISO 5167-1:2003, Annex A. */
const invariantOf = (ratio: number): number => ratio ** 2 / Math.sqrt(1 - ratio ** 4); // Annex A
const ratioOf = (x: number): number => (x ** 2 / (1 + x ** 2)) ** 0.25; // Annex A

/** d of a pipe of bore D. */
const boreOf = (ratio: number, pipe: Length): Length => (ratio * pipe) as Length; // d = beta D

const FIRST_EPSILON = 0.97; // Annex A, first guess for a gas

/**
 * The bore at the line temperature that makes `differential` (Pa) at `massFlow` (kg/s) in a pipe of bore `pipe` (m).
 * Problems: bore-too-large and bore-too-small, with the end of the searched range and the differential it would make;
 * those of possible.ts; bore-unsettled, with the last bracket.
 */
export function boreFrom(
  massFlow: MassFlow,
  differential: PressureDifference,
  pipe: Length,
  primary: Primary,
  state: FluidState,
): Outcome<Bore> {
  const refused = impossible(differential, state, 'differential');
  if (refused !== undefined) return refused;
  const x = differential / state.pressure;
  const reynolds = reynoldsOf(massFlow, state.viscosity, pipe);
  const a2 = massFlow / ((Math.PI / 4) * pipe ** 2 * Math.sqrt(2 * differential * state.density)); // Annex A, A2
  const factors = (ratio: number) => {
    const geometry = geometryOf(pipe, boreOf(ratio, pipe));
    const held = heldDischarge(primary, geometry);
    return { geometry, held, coefficient: held.at(reynolds), epsilon: expansibilityOf(primary, ratio, state)(x) };
  };
  const { min, max } = primary.ratioRange;
  const [lower, upper] = [invariantOf(min), invariantOf(max)];
  const slope = primary.guess * (state.expands ? FIRST_EPSILON : 1);
  const found = root({
    f: (invariant) => {
      const { coefficient, epsilon } = factors(ratioOf(invariant));
      return coefficient * epsilon * invariant - a2;
    },
    lower,
    upper,
    start: Math.min(Math.max(a2 / slope, lower), upper),
    slope,
  });
  if (!found.found) {
    const code = { above: 'bore-too-large', below: 'bore-too-small', unsettled: 'bore-unsettled' }[found.side];
    return fail(code, 'differential', {
      ratio: found.side === 'above' ? max : min,
      lower: ratioOf(found.lower),
      upper: ratioOf(found.upper),
      density: state.density,
      phase: state.phase,
    });
  }
  const { geometry, held, coefficient, epsilon } = factors(ratioOf(found.x));
  const { evaluations } = found;
  const operation = withHeld(held, { massFlow, differential, coefficient, epsilon, reynolds, evaluations });
  return ok({ geometry, operation });
}
