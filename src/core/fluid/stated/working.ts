/** The figures of a stated fluid, where they come from, and their working. */
import { molarGasConstant } from '../../quantity/constants.ts';
import type {
  AbsolutePressure,
  Density,
  DynamicViscosity,
  KinematicViscosity,
  MolarMass,
} from '../../quantity/kinds.ts';
import type { Source } from '../../quantity/source.ts';
import { named, type Working } from '../../quantity/working.ts';
import type { FluidState } from '../contract.ts';
import type { State } from '../model.ts';
import {
  atBase,
  baseLine,
  byUser,
  factorLine,
  gasConstant,
  molar,
  p1,
  rho1,
  soundLine,
  statedLine,
  T1,
} from '../working.ts';

/** Every figure of a stated fluid, those that were stated and those that follow. */
export interface StatedFigures {
  readonly density: Density;
  readonly viscosity: DynamicViscosity;
  /** Present where the viscosity was stated as a kinematic one. */
  readonly kinematicViscosity?: KinematicViscosity;
  readonly isentropicExponent?: number;
  readonly molarMass?: MolarMass;
  readonly compressibility?: number;
  readonly compressibilityStated: boolean;
  readonly speedOfSound?: number;
  readonly vapourPressure?: AbsolutePressure;
  readonly baseDensity?: Density;
  readonly baseDensityStated: boolean;
}

const idealAtBase: Source = {
  clause: 'ideal gas at the base state (Z_b = 1) from the stated molar mass',
  seen: 'derived',
};
const byDensity: Source = { clause: 'kinematic viscosity stated by the user, times density', seen: 'derived' };
const realGas: Source = { clause: 'Z = p M / (ρ R T) from the stated density and molar mass', seen: 'derived' };
const soundSpeed: Source = { clause: 'w² = κ p / ρ from the stated isentropic exponent and density', seen: 'derived' };

/** The source of each figure that the state has. */
export function statedSources(figures: StatedFigures): FluidState['sources'] {
  return {
    density: byUser,
    viscosity: figures.kinematicViscosity === undefined ? byUser : byDensity,
    ...(figures.isentropicExponent === undefined ? {} : { isentropicExponent: byUser }),
    ...(figures.vapourPressure === undefined ? {} : { vapourPressure: byUser }),
    ...(figures.baseDensity === undefined ? {} : { baseDensity: figures.baseDensityStated ? byUser : idealAtBase }),
  };
}

/** The working of each figure: a stated one has no formula, the others follow from those. */
export function statedWorking(figures: StatedFigures, at: State, base: State): readonly Working[] {
  const { density, isentropicExponent: kappa, vapourPressure: pv } = figures;
  const working = [
    statedLine('density', 'ρ_1', density, 'kg/m3'),
    viscosityWorking(figures),
    kappa === undefined ? undefined : statedLine('isentropicExponent', 'κ', kappa, ''),
    speedOfSoundWorking(figures, at),
    compressibilityWorking(figures, at),
    pv === undefined ? undefined : statedLine('vapourPressure', 'p_v', pv, 'Pa(a)'),
    baseDensityWorking(figures, base),
  ];
  return working.filter((entry) => entry !== undefined);
}

function viscosityWorking({ viscosity, kinematicViscosity: nu, density }: StatedFigures): Working {
  if (nu === undefined) return statedLine('viscosity', 'μ_1', viscosity, 'Pa.s');
  const given = [rho1(density), named('ν_1', nu, 'm2/s', 'kinematic-viscosity')];
  return {
    id: 'viscosity',
    symbol: 'μ_1',
    formula: 'ρ_1 * ν_1',
    given,
    value: viscosity,
    unit: 'Pa.s',
    source: byDensity,
  };
}

function speedOfSoundWorking(figures: StatedFigures, { pressure }: State): Working | undefined {
  const { speedOfSound, isentropicExponent: kappa, density } = figures;
  if (speedOfSound === undefined || kappa === undefined) return undefined;
  return soundLine(kappa, p1(pressure), rho1(density), speedOfSound, soundSpeed);
}

const R = gasConstant(molarGasConstant.exact);

function compressibilityWorking(figures: StatedFigures, { pressure, temperature }: State): Working | undefined {
  const { compressibility: value, molarMass: M, density } = figures;
  if (value === undefined) return undefined;
  if (figures.compressibilityStated || M === undefined) return statedLine('compressibility', 'Z', value, '');
  return factorLine({ p: p1(pressure), T: T1(temperature), M: molar(M), R }, rho1(density), value, realGas);
}

function baseDensityWorking(figures: StatedFigures, base: State): Working | undefined {
  const { baseDensity: value, molarMass: M } = figures;
  if (value === undefined) return undefined;
  if (figures.baseDensityStated || M === undefined) return statedLine('baseDensity', 'ρ_b', value, 'kg/m3');
  const [p, T] = atBase(base);
  return { ...baseLine([p, molar(M), R, T], value, idealAtBase), formula: 'p_b * M / (R * T_b)' };
}
