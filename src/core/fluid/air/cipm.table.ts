/**
 * Constants of the formula for the density of moist air. Source: Picard, Davis, Glaeser and Fujii, Metrologia 45 (2008)
 * 149 (CIPM-2007), Appendix A.1; seen in several open copies that agree. R and molar masses as used there.
 */
import { molarGasConstant } from '../../quantity/constants.ts';

export const R = molarGasConstant.codata2002; // J/(mol.K)
export const waterMolarMass = 18.01528e-3; // kg/mol
export const dryMolarMass = { atReference: 28.96546e-3, perFraction: 12.011e-3, reference: 4e-4 } as const; // kg/mol
/** Saturation pressure exp(A T2 + B T + C + D/T), Pa. */
export const saturation = { A: 1.2378847e-5, B: -1.9121316e-2, C: 33.93711047, D: -6.3431645e3 } as const;
/** Enhancement factor alpha + beta p + gamma t2. */
export const enhancement = { alpha: 1.00062, beta: 3.14e-8, gamma: 5.6e-7 } as const;
/** Compressibility factor. */
export const virial = {
  a0: 1.58123e-6, a1: -2.9331e-8, a2: 1.1043e-10,
  b0: 5.707e-6, b1: -2.051e-8,
  c0: 1.9898e-4, c1: -2.376e-6,
  d: 1.83e-11, e: -0.765e-8,
} as const;
