/** Where the figures of a gas by the cubic equation come from, and their working. */
import { molarGasConstant } from '../../quantity/constants.ts';
import type { Source } from '../../quantity/source.ts';
import type { Given, Working } from '../../quantity/working.ts';
import type { FluidState } from '../contract.ts';
import { schemeUncertainty } from '../gas-viscosity/viscosity.ts';
import type { State } from '../model.ts';
import {
  baseGasLine,
  densityLine,
  factor,
  gasConstant,
  type Molar,
  molar,
  p1,
  rho1,
  soundLine,
  T1,
} from '../working.ts';
import type { BaseGas, GasFigures } from './working.ts';

/** The equation of these gases. */
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

const R = gasConstant(molarGasConstant.exact);

/** The working of each figure. */
export function otherWorking(figures: GasFigures, found: BaseGas, base: State): readonly Working[] {
  const at = { p: p1(figures.pressure), T: T1(figures.temperature), M: molar(figures.molarMass), R };
  const rho = rho1(figures.density);
  const source = found.ideal ? idealBase : cubic;
  const atBase = baseGasLine(at.M, R, found.compressibility, base, found.density, source);
  return [
    ...byCubic(figures, at, rho),
    viscosityWorking(figures, at.T, rho),
    found.ideal ? { ...atBase, remark: 'gas-base-ideal' } : atBase,
  ];
}

/** Density and isentropic exponent from the equation, the speed of sound that they mean. */
function byCubic(figures: GasFigures, at: Molar, rho: Given): readonly Working[] {
  const { density, isentropicExponent, compressibility, speedOfSound } = figures;
  const read = { given: [at.p, at.T], unit: '' };
  return [
    {
      id: 'compressibility',
      symbol: 'Z',
      value: compressibility,
      source: cubic,
      remark: 'cubic-compressibility',
      ...read,
    },
    densityLine(at, factor(compressibility), density, cubic),
    {
      id: 'isentropicExponent',
      symbol: 'κ',
      value: isentropicExponent,
      source: cubicExponent,
      remark: 'cubic-exponent',
      ...read,
    },
    soundLine(isentropicExponent, at.p, rho, speedOfSound, soundSpeed),
  ];
}

function viscosityWorking({ viscosity: value }: GasFigures, T: Given, rho: Given): Working {
  const { source } = schemeUncertainty;
  const remark = 'viscosity-by-scheme';
  return { id: 'viscosity', symbol: 'μ_1', given: [rho, T], value, unit: 'Pa.s', source, remark };
}
