/** Differentials that no flow makes. */
import { exponentOf } from '../element/shared/expansibility.ts';
import type { FluidState } from '../fluid/contract.ts';
import { fail, type Outcome } from '../quantity/outcome.ts';

/**
 * Share of the upstream pressure at which an isentropic flow reaches the speed of sound: 1 - (2/(kappa + 1))^(kappa/(kappa - 1)),
 * for kappa > 0. Beyond it more differential brings no more flow, and the equations of a meter say nothing.
 */
export const criticalShare = (kappa: number): number => {
  const n = kappa - 1;
  const power = Math.abs(n) < 1e-9 ? 0.5 : (kappa / n) * Math.log1p(n / 2); // limit at kappa = 1: ln tau = -1/2
  return -Math.expm1(-power); // tau = (2/(kappa + 1))^(kappa/(kappa - 1)), ideal gas
};

/** The share rises with kappa, and is a quarter at a half: (2/1.5)^(0.5/-0.5) = 0.75. Below it nothing need be computed. */
const LEAST_EXPONENT = 0.5;
const LEAST_SHARE = 0.25;

/**
 * The refusal of a differential in Pa that cannot be, or undefined.
 * Problems: differential-exceeds-pressure; differential-beyond-critical, for a fluid that expands.
 */
export function impossible(differential: number, state: FluidState, field: string): Outcome<never> | undefined {
  const { pressure } = state;
  if (differential >= pressure) return fail('differential-exceeds-pressure', field, { differential, pressure });
  if (!state.expands) return undefined;
  const kappa = exponentOf(state);
  if (kappa >= LEAST_EXPONENT && differential <= LEAST_SHARE * pressure) return undefined;
  const share = criticalShare(kappa);
  if (differential <= share * pressure) return undefined;
  return fail('differential-beyond-critical', field, { differential, pressure, percent: 100 * share });
}
