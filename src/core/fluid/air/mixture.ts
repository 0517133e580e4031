/**
 * Moist air as a mixture: its composition, and its density by whichever formulation holds at the state.
 * Standard: CIPM-2007, Table 1 (composition of dry air); ISO 20765-2:2015 (GERG-2008). Symbols: theirs; SI.
 */
import type { AbsolutePressure, Density, MolarMass, Temperature } from '../../quantity/kinds.ts';
import { mixtureOf, R } from '../gerg/mixture.ts';
import { componentNames } from '../helmholtz/components.ts';
import { gasDensity } from '../helmholtz/density.ts';
import { isothermOf } from '../helmholtz/isotherm.ts';
import { waterMolarMass } from './cipm.table.ts';
import * as cipm from './cipm.ts';

/**
 * Dry air, mole fractions. CIPM-2007, Table 1 (from memory: check your copy), without its last 2e-5 of noble gases.
 */
const dryAir: Readonly<Record<string, number>> = {
  nitrogen: 0.780848, // Table 1
  oxygen: 0.20939, // Table 1
  argon: 0.009332, // Table 1
  'carbon-dioxide': 0.0004, // Table 1
};
const total = Object.values(dryAir).reduce((sum, x) => sum + x, 0);

/** Mole fractions of air with the fraction xv of water vapour, in the order of GERG-2008. */
export const airFractions = (xv: number): readonly number[] =>
  componentNames.map((name) => (name === 'water' ? xv : ((1 - xv) * (dryAir[name] ?? 0)) / total));

/** Density of air with the factor and molar mass that it follows from. */
export interface AirDensity {
  readonly by: 'cipm' | 'gerg';
  readonly density: Density;
  readonly compressibility: number;
  readonly molarMass: MolarMass;
}

/** Density of air with the fraction xv of water vapour; undefined where air is no gas at p and T. */
export function airDensity(p: AbsolutePressure, T: Temperature, xv: number): AirDensity | undefined {
  if (cipm.holds(p, T)) {
    const Ma = cipm.molarMassOfDryAir();
    const molarMass = (Ma * (1 - xv * (1 - waterMolarMass / Ma))) as MolarMass; // CIPM-2007, Eq. 1
    return { by: 'cipm', density: cipm.density(p, T, xv), compressibility: cipm.compressibility(p, T, xv), molarMass };
  }
  const mixture = mixtureOf(airFractions(xv));
  const rho = gasDensity(isothermOf(mixture, T), p);
  if (rho === undefined) return undefined;
  return {
    by: 'gerg',
    density: (rho * mixture.molarMass) as Density,
    compressibility: p / (rho * R * T), // Z = p/(ρ R T)
    molarMass: mixture.molarMass as MolarMass,
  };
}

/** Mass fraction of water in air with the mole fraction xv. */
export const massFraction = (xv: number, molarMass: MolarMass): number => (xv * waterMolarMass) / molarMass;
