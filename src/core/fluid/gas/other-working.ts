/** Where the figures of a gas by the cubic equation come from, and their working. */
import { molarGasConstant } from '../../quantity/constants.ts';
import type { Source } from '../../quantity/source.ts';
import type { Given, Working } from '../../quantity/working.ts';
import type { FluidState } from '../contract.ts';
import { schemeUncertainty } from '../gas-viscosity/viscosity.ts';
import type { State } from '../model.ts';
import type { BaseGas, GasFigures } from './working.ts';

/** The figures of a state that have a source and a working. */
export type OtherFigures = GasFigures;

export const cubic: Source = { clause: 'Peng and Robinson, Ind. Eng. Chem. Fundam. 15 (1976) 59', seen: 'memory' };
const cubicExponent: Source = {
  clause: `${cubic.clause}, with c_p° of Poling, Prausnitz and O'Connell, 5th edition`,
  seen: 'second-hand',
};
const soundSpeed: Source = { clause: 'w² = κ p / ρ', seen: 'derived' };
const idealBase: Source = {
  clause: 'ideal gas at the base state (Z_b = 1): the gas would be a liquid there',
  seen: 'practice',
};

/** The formulation of each figure that the state has. */
export function otherSources({ ideal }: BaseGas): FluidState['sources'] {
  const { source: viscosity } = schemeUncertainty;
  return { density: cubic, viscosity, isentropicExponent: cubicExponent, baseDensity: ideal ? idealBase : cubic };
}

const named = (symbol: string, value: number, unit: string, words: string): Given => ({ symbol, value, unit, words });
const gasConstant = named('R', molarGasConstant.exact, 'J/(mol.K)', 'molar-gas-constant');

/** The working of each figure. */
export function otherWorking(figures: OtherFigures, atBase: BaseGas, base: State): readonly Working[] {
  const p = named('p_1', figures.pressure, 'Pa(a)', 'pressure-upstream');
  const T = named('T_1', figures.temperature, 'K', 'temperature-upstream');
  const M = named('M', figures.molarMass, 'kg/mol', 'molar-mass');
  const rho = named('ρ_1', figures.density, 'kg/m3', 'density');
  return [...byCubic(figures, p, T, M, rho), viscosityWorking(figures, T, rho), baseWorking(atBase, base, M)];
}

/** Density and isentropic exponent from the equation, the speed of sound that they mean. */
function byCubic(figures: OtherFigures, p: Given, T: Given, M: Given, rho: Given): readonly Working[] {
  const { density, isentropicExponent, compressibility, speedOfSound } = figures;
  const Z = named('Z', compressibility, '', 'compressibility');
  const read = { given: [p, T], unit: '' };
  return [
    {
      id: 'compressibility',
      symbol: 'Z',
      value: compressibility,
      source: cubic,
      remark: 'cubic-compressibility',
      ...read,
    },
    {
      id: 'density',
      symbol: 'ρ_1',
      formula: 'p_1 * M / (Z * R * T_1)',
      given: [p, M, Z, gasConstant, T],
      value: density,
      unit: 'kg/m3',
      source: cubic,
    },
    {
      id: 'isentropicExponent',
      symbol: 'κ',
      value: isentropicExponent,
      source: cubicExponent,
      remark: 'cubic-exponent',
      ...read,
    },
    {
      id: 'speedOfSound',
      symbol: 'w',
      formula: 'sqrt(κ * p_1 / ρ_1)',
      given: [named('κ', isentropicExponent, '', 'isentropic-exponent'), p, rho],
      value: speedOfSound,
      unit: 'm/s',
      source: soundSpeed,
    },
  ];
}

function viscosityWorking({ viscosity: value }: OtherFigures, T: Given, rho: Given): Working {
  const { source } = schemeUncertainty;
  const remark = 'viscosity-by-scheme';
  return { id: 'viscosity', symbol: 'μ_1', given: [rho, T], value, unit: 'Pa.s', source, remark };
}

function baseWorking({ density, compressibility, ideal }: BaseGas, base: State, M: Given): Working {
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
    source: ideal ? idealBase : cubic,
    ...(ideal ? { remark: 'gas-base-ideal' } : {}),
  };
}
