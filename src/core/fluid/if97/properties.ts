/**
 * What every region of IAPWS-IF97 answers with, and how it follows from the region's fundamental equation.
 * Standard: IAPWS R7-97(2012), Tables 3, 12, 31, 39 (relations). Symbols: those of the release; SI.
 */
import type { Density } from '../../quantity/kinds.ts';

/** Specific gas constant of water, J/(kg.K). IAPWS R7-97(2012), Eq. 1. */
export const R = 461.526;

/** What a region answers; SI. */
export interface WaterProperties {
  readonly density: Density;
  /** w2, m2/s2. Negative or infinite where the equation describes no stable state: the caller looks before the root. */
  readonly speedOfSoundSquared: number;
  readonly enthalpy: number; // J/kg
  readonly internalEnergy: number; // J/kg
  readonly entropy: number; // J/(kg.K)
  readonly isobaricHeatCapacity: number; // J/(kg.K)
  readonly jouleThomson: number; // (∂T/∂p)_h, K/Pa
}

/** A dimensionless Gibbs function γ(π, τ) and its derivatives at one point. */
export interface Gibbs {
  readonly g: number;
  readonly gp: number;
  readonly gpp: number;
  readonly gt: number;
  readonly gtt: number;
  readonly gpt: number;
}

/** A dimensionless Helmholtz function φ(δ, τ) and its derivatives at one point. */
export interface Helmholtz {
  readonly f: number;
  readonly fd: number;
  readonly fdd: number;
  readonly ft: number;
  readonly ftt: number;
  readonly fdt: number;
}

/** Properties from a Gibbs function. `pStar` in Pa, T in K. IAPWS R7-97(2012), Tables 3, 12 and 39. */
export function fromGibbs(
  { g, gp, gpp, gt, gtt, gpt }: Gibbs,
  pi: number,
  tau: number,
  pStar: number,
  T: number,
): WaterProperties {
  const q = gp - tau * gpt;
  return {
    density: (pStar / (R * T * gp)) as Density, // v = π γ_π R T / p
    speedOfSoundSquared: (R * T * gp * gp) / ((q * q) / (tau * tau * gtt) - gpp),
    enthalpy: R * T * tau * gt,
    internalEnergy: R * T * (tau * gt - pi * gp),
    entropy: R * (tau * gt - g),
    isobaricHeatCapacity: -R * tau * tau * gtt,
    jouleThomson: (T * gpt) / (pStar * tau * gtt), // (T (∂v/∂T)_p - v)/c_p
  };
}

/** Properties from a Helmholtz function. rho in kg/m3, T in K. IAPWS R7-97(2012), Table 31. */
export function fromHelmholtz(
  { f, fd, fdd, ft, ftt, fdt }: Helmholtz,
  rho: number,
  delta: number,
  tau: number,
  T: number,
): WaterProperties {
  const a = 2 * delta * fd + delta * delta * fdd;
  const q = delta * fd - delta * tau * fdt;
  const isobaricHeatCapacity = R * (-tau * tau * ftt + (q * q) / a);
  return {
    density: rho as Density,
    speedOfSoundSquared: R * T * (a - (q * q) / (tau * tau * ftt)),
    enthalpy: R * T * (tau * ft + delta * fd),
    internalEnergy: R * T * tau * ft,
    entropy: R * (tau * ft - f),
    isobaricHeatCapacity,
    jouleThomson: (q / a - 1) / (rho * isobaricHeatCapacity), // (T (∂p/∂T)/(ρ ∂p/∂ρ) - 1)/(ρ c_p)
  };
}
