/**
 * Density of moist air by the formula of metrology, and its parts.
 * Standard: CIPM-2007 (Metrologia 45 (2008) 149), Eq. 1 to 3 and Appendix A.1: 600 hPa to 1100 hPa, 15 degC to 27 degC.
 * Symbols: those of the paper; SI, t in degC, mole fraction of carbon dioxide 0.0004.
 */
import { celsius } from '../../quantity/constants.ts';
import type { AbsolutePressure, Density, Temperature } from '../../quantity/kinds.ts';
import type { StatedUncertainty } from '../contract.ts';
import { dryMolarMass, enhancement, R, saturation, virial, waterMolarMass } from './cipm.table.ts';

/** Where the formula is recommended. Pa and K. */
export const range = { pressure: { min: 60e3, max: 110e3 }, temperature: { min: 288.15, max: 300.15 } } as const;

/** Expanded relative uncertainty of the formula: twice 22e-6, without that of the readings. */
export const stated: StatedUncertainty = {
  share: 44e-6,
  source: { clause: 'CIPM-2007, Metrologia 45 (2008) 149, uncertainty of the formula', seen: 'second-hand' },
};

/** True inside the recommended range. */
export const holds = (p: number, T: number): boolean =>
  p >= range.pressure.min && p <= range.pressure.max && T >= range.temperature.min && T <= range.temperature.max;

/** Saturation pressure of water vapour over liquid water, Pa. CIPM-2007, Eq. A1.1. */
export function saturationPressure(T: Temperature): AbsolutePressure {
  const { A, B, C, D } = saturation;
  return Math.exp(A * T ** 2 + B * T + C + D / T) as AbsolutePressure; // Eq. A1.1
}

/** Enhancement factor: what the air adds to the vapour that stands over water. CIPM-2007, Eq. A1.2. */
export const enhancementFactor = (p: AbsolutePressure, T: Temperature): number =>
  enhancement.alpha + enhancement.beta * p + enhancement.gamma * celsius(T) ** 2; // Eq. A1.2

/** Compressibility factor at a mole fraction of water vapour. CIPM-2007, Eq. A1.4. */
export function compressibility(p: AbsolutePressure, T: Temperature, xv: number): number {
  const { a0, a1, a2, b0, b1, c0, c1, d, e } = virial;
  const t = celsius(T);
  const second = a0 + a1 * t + a2 * t ** 2 + (b0 + b1 * t) * xv + (c0 + c1 * t) * xv ** 2;
  return 1 - (p / T) * second + (p / T) ** 2 * (d + e * xv ** 2); // Eq. A1.4
}

/** Molar mass of dry air with a mole fraction of carbon dioxide, kg/mol. CIPM-2007, Eq. 2. */
export const molarMassOfDryAir = (xCO2: number = dryMolarMass.reference): number =>
  dryMolarMass.atReference + dryMolarMass.perFraction * (xCO2 - dryMolarMass.reference); // Eq. 2

/** Density of moist air, kg/m3. CIPM-2007, Eq. 1. */
export function density(p: AbsolutePressure, T: Temperature, xv: number, xCO2?: number): Density {
  const [Ma, Mv] = [molarMassOfDryAir(xCO2), waterMolarMass];
  const Z = compressibility(p, T, xv);
  return (((p * Ma) / (Z * R * T)) * (1 - xv * (1 - Mv / Ma))) as Density; // Eq. 1
}
