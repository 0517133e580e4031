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
import type { Given, Working } from '../../quantity/working.ts';
import type { FluidState } from '../contract.ts';
import type { State } from '../model.ts';

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

const byUser: Source = { clause: 'stated by the user', seen: 'practice' };
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
    byHand('density', 'ρ_1', density, 'kg/m3'),
    viscosityWorking(figures),
    kappa === undefined ? undefined : byHand('isentropicExponent', 'κ', kappa, ''),
    speedOfSoundWorking(figures, at),
    compressibilityWorking(figures, at),
    pv === undefined ? undefined : byHand('vapourPressure', 'p_v', pv, 'Pa(a)'),
    baseDensityWorking(figures, base),
  ];
  return working.filter((entry) => entry !== undefined);
}

function byHand(id: string, symbol: string, value: number, unit: string): Working {
  return { id, symbol, given: [], value, unit, source: byUser, remark: 'stated' };
}

const named = (symbol: string, value: number, unit: string, words: string): Given => ({ symbol, value, unit, words });
const densityAt1 = (density: number) => named('ρ_1', density, 'kg/m3', 'density');
const pressureAt1 = (pressure: number) => named('p_1', pressure, 'Pa(a)', 'pressure-upstream');
const molarMassOf = (M: number) => named('M', M, 'kg/mol', 'molar-mass');
const gasConstant = named('R', molarGasConstant.exact, 'J/(mol.K)', 'molar-gas-constant');

function viscosityWorking({ viscosity, kinematicViscosity: nu, density }: StatedFigures): Working {
  if (nu === undefined) return byHand('viscosity', 'μ_1', viscosity, 'Pa.s');
  const given = [densityAt1(density), named('ν_1', nu, 'm2/s', 'kinematic-viscosity')];
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
  const { speedOfSound: value, isentropicExponent: kappa, density } = figures;
  if (value === undefined || kappa === undefined) return undefined;
  const given = [named('κ', kappa, '', 'isentropic-exponent'), pressureAt1(pressure), densityAt1(density)];
  return {
    id: 'speedOfSound',
    symbol: 'w',
    formula: 'sqrt(κ * p_1 / ρ_1)',
    given,
    value,
    unit: 'm/s',
    source: soundSpeed,
  };
}

function compressibilityWorking(figures: StatedFigures, { pressure, temperature }: State): Working | undefined {
  const { compressibility: value, molarMass: M, density } = figures;
  if (value === undefined) return undefined;
  if (figures.compressibilityStated || M === undefined) return byHand('compressibility', 'Z', value, '');
  const T = named('T_1', temperature, 'K', 'temperature-upstream');
  const given = [pressureAt1(pressure), molarMassOf(M), densityAt1(density), gasConstant, T];
  const formula = 'p_1 * M / (ρ_1 * R * T_1)';
  return { id: 'compressibility', symbol: 'Z', formula, given, value, unit: '', source: realGas };
}

function baseDensityWorking(figures: StatedFigures, { pressure, temperature }: State): Working | undefined {
  const { baseDensity: value, molarMass: M } = figures;
  if (value === undefined) return undefined;
  if (figures.baseDensityStated || M === undefined) return byHand('baseDensity', 'ρ_b', value, 'kg/m3');
  const p = named('p_b', pressure, 'Pa(a)', 'pressure-base');
  const T = named('T_b', temperature, 'K', 'temperature-base');
  const given = [p, molarMassOf(M), gasConstant, T];
  return {
    id: 'baseDensity',
    symbol: 'ρ_b',
    formula: 'p_b * M / (R * T_b)',
    given,
    value,
    unit: 'kg/m3',
    source: idealAtBase,
  };
}
