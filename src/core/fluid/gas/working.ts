/** Where the figures of a gas come from, and their working. */
import type { Density, DynamicViscosity } from '../../quantity/kinds.ts';
import type { Source } from '../../quantity/source.ts';
import type { Given, Working } from '../../quantity/working.ts';
import type { FluidState } from '../contract.ts';
import type { ViscosityBasis } from '../gas-viscosity/viscosity.ts';
import type { State } from '../model.ts';
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
const realBase = ({ clause, seen }: Source): Source => ({ clause: `${clause} at the base state`, seen });
const idealBase: Source = {
  clause: 'ideal gas at the base state (Z_b = 1): the mixture would condense there',
  seen: 'practice',
};

/** The formulation of each figure that the state has. */
export function gasSources({ source }: GasEquation, viscosity: Source, { ideal }: BaseGas): FluidState['sources'] {
  const baseDensity = ideal ? idealBase : realBase(source);
  return { density: source, viscosity, isentropicExponent: exponent, baseDensity };
}

const named = (symbol: string, value: number, unit: string, words: string): Given => ({ symbol, value, unit, words });

/** The working of each figure; `R` is the gas constant of the equation, J/(mol.K). */
export function gasWorking(
  { source }: GasEquation,
  R: number,
  figures: GasFigures,
  basis: ViscosityBasis,
  atBase: BaseGas,
  base: State,
): readonly Working[] {
  const { density, viscosity, speedOfSound, molarMass } = figures;
  const gasConstant = named('R', R, 'J/(mol.K)', 'molar-gas-constant');
  const p = named('p_1', figures.pressure, 'Pa(a)', 'pressure-upstream');
  const T = named('T_1', figures.temperature, 'K', 'temperature-upstream');
  const M = named('M', molarMass, 'kg/mol', 'molar-mass');
  const rho = named('ρ_1', density, 'kg/m3', 'density');
  const remark = `viscosity-by-${basis.method}`;
  return [
    {
      id: 'density',
      symbol: 'ρ_1',
      given: [p, T, M],
      value: density,
      unit: 'kg/m3',
      source,
      remark: 'gerg-density',
    },
    { id: 'viscosity', symbol: 'μ_1', given: [rho, T], value: viscosity, unit: 'Pa.s', source: basis.source, remark },
    {
      id: 'speedOfSound',
      symbol: 'w',
      given: [rho, T],
      value: speedOfSound,
      unit: 'm/s',
      source,
      remark: 'gerg-speed-of-sound',
    },
    {
      id: 'isentropicExponent',
      symbol: 'κ',
      formula: 'w^2 * ρ_1 / p_1',
      given: [named('w', speedOfSound, 'm/s', 'speed-of-sound'), rho, p],
      value: figures.isentropicExponent,
      unit: '',
      source: exponent,
    },
    {
      id: 'compressibility',
      symbol: 'Z',
      formula: 'p_1 * M / (ρ_1 * R * T_1)',
      given: [p, M, rho, gasConstant, T],
      value: figures.compressibility,
      unit: '',
      source: realGas,
    },
    baseWorking(atBase, base, M, gasConstant, source),
  ];
}

function baseWorking(
  { density, compressibility, ideal }: BaseGas,
  base: State,
  M: Given,
  gasConstant: Given,
  equation: Source,
): Working {
  const given = [
    named('p_b', base.pressure, 'Pa(a)', 'pressure-base'),
    M,
    named('Z_b', compressibility, '', 'compressibility-base'),
    gasConstant,
    named('T_b', base.temperature, 'K', 'temperature-base'),
  ];
  return {
    id: 'baseDensity',
    symbol: 'ρ_b',
    formula: 'p_b * M / (Z_b * R * T_b)',
    given,
    value: density,
    unit: 'kg/m3',
    source: ideal ? idealBase : realBase(equation),
    ...(ideal ? { remark: 'gas-base-ideal' } : {}),
  };
}
