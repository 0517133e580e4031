/** Where the figures of a gas come from, and their working. */
import type { Density, DynamicViscosity } from '../../quantity/kinds.ts';
import type { Source } from '../../quantity/source.ts';
import type { Given, Working } from '../../quantity/working.ts';
import type { FigureRange, FluidState } from '../contract.ts';
import type { ViscosityBasis } from '../gas-viscosity/viscosity.ts';
import type { State } from '../model.ts';
import {
  baseGasLine,
  exponentLine,
  factorLine,
  gasConstant,
  type Molar,
  molar,
  p1,
  rho1,
  sound,
  T1,
} from '../working.ts';
import type { GasEquation } from './equation.ts';

/** The figures of a state that have a source and a working. */
export type GasFigures = Pick<FluidState, 'pressure' | 'temperature' | 'density'> &
  Required<Pick<FluidState, 'molarMass' | 'isentropicExponent' | 'compressibility' | 'speedOfSound'>> & {
    readonly viscosity: DynamicViscosity;
  };

/** Density at the base state, and the compressibility factor it was found with: 1 where something would condense. */
export interface BaseGas {
  readonly density: Density;
  readonly compressibility: number;
  readonly ideal: boolean;
}

const realGas: Source = { clause: 'Z = p M / (ρ R T) with the density of the equation of state', seen: 'derived' };
const exponent: Source = {
  clause: 'κ = w² ρ / p with density and speed of sound of the equation of state',
  seen: 'derived',
};
const idealBase: Source = {
  clause: 'ideal gas at the base state (Z_b = 1): the mixture would condense there',
  seen: 'practice',
};

const baseSource = ({ clause, seen }: Source, { ideal }: BaseGas): Source =>
  ideal ? idealBase : { clause: `${clause} at the base state`, seen };

/** The formulation of each figure that the state has. */
export function gasSources({ source }: GasEquation, viscosity: Source, found: BaseGas): FluidState['sources'] {
  return { density: source, viscosity, isentropicExponent: exponent, baseDensity: baseSource(source, found) };
}

/** The ranges that the equation gives to all that follows from it, and the correlation to the viscosity. */
export function gasRanges(
  equation: FigureRange,
  { temperatures: [min, max] }: Pick<ViscosityBasis, 'temperatures'>,
): NonNullable<FluidState['ranges']> {
  return {
    density: equation,
    viscosity: { temperature: { min, max } },
    isentropicExponent: equation,
    compressibility: equation,
  };
}

/** The working of each figure; `R` is the gas constant of the equation, J/(mol.K). */
export function gasWorking(
  { source }: GasEquation,
  R: number,
  figures: GasFigures,
  basis: ViscosityBasis,
  found: BaseGas,
  base: State,
): readonly Working[] {
  const at = {
    p: p1(figures.pressure),
    T: T1(figures.temperature),
    M: molar(figures.molarMass),
    R: gasConstant(R),
  };
  const rho = rho1(figures.density);
  const w = sound(figures.speedOfSound);
  const atBase = baseGasLine(at.M, at.R, found.compressibility, base, found.density, baseSource(source, found));
  return [
    equationDensity(at, figures.density, source),
    {
      id: 'viscosity',
      symbol: 'μ_1',
      given: [rho, at.T],
      value: figures.viscosity,
      unit: 'Pa.s',
      source: basis.source,
      remark: `viscosity-by-${basis.method}`,
    },
    equationSound([rho, at.T], figures.speedOfSound, source),
    exponentLine(w, rho, at.p, figures.isentropicExponent, exponent),
    factorLine(at, rho, figures.compressibility, realGas),
    found.ideal ? { ...atBase, remark: 'gas-base-ideal' } : atBase,
  ];
}

/** Density by an equation of state, too long for a formula. */
export const equationDensity = ({ p, T, M }: Molar, value: number, source: Source): Working => ({
  id: 'density',
  symbol: 'ρ_1',
  given: [p, T, M],
  value,
  unit: 'kg/m3',
  source,
  remark: 'equation-density',
});

/** Speed of sound by an equation of state, too long for a formula. */
export const equationSound = (given: readonly Given[], value: number, source: Source): Working => ({
  id: 'speedOfSound',
  symbol: 'w',
  given,
  value,
  unit: 'm/s',
  source,
  remark: 'equation-speed-of-sound',
});
