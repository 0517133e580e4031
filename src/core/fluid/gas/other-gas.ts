/**
 * Gases that GERG-2008 does not hold, each alone, by the cubic equation of Peng and Robinson, its error shown.
 * Standard: none; Peng and Robinson, Ind. Eng. Chem. Fundam. 15 (1976) 59. Symbols: p, T, ρ, κ, w; SI.
 */
import { molarGasConstant } from '../../quantity/constants.ts';
import type { AbsolutePressure, Density, MolarMass, Temperature } from '../../quantity/kinds.ts';
import { fail, type Outcome, ok } from '../../quantity/outcome.ts';
import type { Source } from '../../quantity/source.ts';
import type { Caution, FluidState, StatedUncertainty } from '../contract.ts';
import { type PureGas, pureGas } from '../cubic/pure.ts';
import { schemeViscosity, type ViscousGas } from '../gas-viscosity/scheme.ts';
import { schemeUncertainty, viscosityCautions } from '../gas-viscosity/viscosity.ts';
import { type Conditions, plainName, type State } from '../model.ts';
import { type OtherGas, otherGases } from './other-gas.table.ts';
import { cubic, otherSources, otherWorking } from './other-working.ts';
import { type BaseGas, type GasFigures, gasRanges } from './working.ts';

const R = molarGasConstant.exact;

/** Every spelling of the gases, under its plain name, and the key it stands for. */
export const otherGasNames: ReadonlyMap<string, string> = new Map(
  otherGases.flatMap(({ name, spellings }) => [name, ...spellings].map((form) => [plainName(form), name] as const)),
);

/** Beyond this share of the critical density the equation is a rough guide, beyond the other it is not evaluated. */
const densest = { known: 0.5, evaluated: 1 } as const;

/**
 * Expanded relative uncertainty of the density: base + slope ρ/ρ_c, and more for the alcohols, whose molecules cling to
 * each other. Found here against the reference equations of state of 15 of the gases.
 */
const spread = { base: 0.005, slope: 0.16, alcohol: 0.03 } as const;
const spreadSource: Source = {
  clause: 'Peng and Robinson 1976 against the reference equations of state',
  seen: 'derived',
};
/** The same of the viscosity, largest in a dense vapour near saturation. Found against 9 of the gases. */
const viscousSpread = 0.15;
const alcohols = ['methanol', 'ethanol'];

/**
 * State of a gas by its name, a key of otherGasNames.
 * Problems: gas-out-of-range, gas-density-none, gas-beyond-equation.
 */
export function otherGasState(name: string, conditions: Conditions): Outcome<FluidState> {
  const gas = otherGases.find((candidate) => candidate.name === name);
  if (gas === undefined) throw new Error(`expected a gas of the table, got ${name}`);
  const { pressure: p, temperature: T, paths } = conditions;
  const detail = { pressure: p, temperature: T, phase: 'gas' };
  const outside = outsideBy(gas, p, T);
  if (outside !== undefined) return outOfRange(gas, conditions, outside);
  const found = cubicGas(gas, p, T);
  if (found === undefined) return fail('gas-density-none', paths.pressure, detail);
  const figures = figuresOf(gas, found, p, T);
  if (crowding(gas, figures) > densest.evaluated) return fail('gas-beyond-equation', paths.pressure, detail);
  return ok({ ...stateFrom(gas, figures, conditions), jouleThomson: found.jouleThomson });
}

/** Highest pressure of any state, Pa (practice): no reduced density of a gas in range stands above it. */
const highestPressure = 100e6;

function outsideBy(
  { caloric: [lowest, highest] }: OtherGas,
  p: number,
  T: number,
): 'pressure' | 'temperature' | undefined {
  if (!(T >= lowest && T <= highest)) return 'temperature';
  return p > 0 && p <= highestPressure ? undefined : 'pressure';
}

function outOfRange(
  { caloric }: OtherGas,
  { pressure, temperature, paths }: Conditions,
  by: 'pressure' | 'temperature',
) {
  const [lowestTemperature, highestTemperature] = caloric;
  const detail = { pressure, temperature, lowestTemperature, highestTemperature, highestPressure };
  return fail('gas-out-of-range', paths[by], detail);
}

const molarMass = ({ M }: OtherGas): MolarMass => (M / 1e3) as MolarMass;

/** Density over the critical density. */
const crowding = (gas: OtherGas, { density }: Pick<FluidState, 'density'>): number =>
  (density / molarMass(gas)) * gas.Vc * 1e-6;

/** Undefined where the gas would be a liquid. */
function cubicGas(gas: OtherGas, p: AbsolutePressure, T: Temperature): PureGas | undefined {
  const heatCapacity = R * gas.a.reduceRight((sum, next) => sum * T + next, 0); // c_p°/R = Σ a_i T^i
  return pureGas({ Tc: gas.Tc, pc: gas.pc * 1e6, omega: gas.omega }, heatCapacity, p, T);
}

function figuresOf(gas: OtherGas, found: PureGas, p: AbsolutePressure, T: Temperature): GasFigures {
  const M = molarMass(gas);
  const density = (M / found.molarVolume) as Density;
  const { compressibility, isentropicExponent } = found;
  return {
    pressure: p,
    temperature: T,
    density,
    viscosity: schemeViscosity([{ x: 1, gas: viscous(gas) }], T, 1 / found.molarVolume),
    isentropicExponent,
    compressibility,
    molarMass: M,
    speedOfSound: Math.sqrt((isentropicExponent * p) / density), // w² = κ p / ρ
  };
}

const viscous = ({ M, C, viscous: [lowest, highest], Tc, pc, Vc }: OtherGas): ViscousGas => ({
  M,
  C,
  lowest,
  highest,
  Tc,
  pc,
  Vc,
});

function stateFrom(gas: OtherGas, figures: GasFigures, { base }: Conditions): FluidState {
  const atBase = baseGas(gas, base);
  const cautions = cautionsOf(gas, figures);
  const density = uncertaintyOf(gas, figures);
  return {
    ...figures,
    phase: 'gas',
    expands: true,
    baseDensity: atBase.density,
    ...(cautions.length === 0 ? {} : { cautions }),
    uncertainties: { density, speedOfSound: density, viscosity: { ...schemeUncertainty, share: viscousSpread } },
    ranges: rangesOf(gas),
    sources: otherSources(atBase),
    working: otherWorking(figures, atBase, base),
  };
}

function rangesOf({ caloric: [min, max], viscous: temperatures }: OtherGas): NonNullable<FluidState['ranges']> {
  const equation = { temperature: { min, max } };
  return { ...gasRanges(equation, { temperatures }), baseDensity: equation };
}

function uncertaintyOf(gas: OtherGas, figures: GasFigures): StatedUncertainty {
  const more = alcohols.includes(gas.name) ? spread.alcohol : 0;
  return { share: spread.base + more + spread.slope * crowding(gas, figures), source: spreadSource };
}

function cautionsOf(gas: OtherGas, figures: GasFigures): readonly Caution[] {
  const value = crowding(gas, figures);
  const { source } = schemeUncertainty;
  const basis = { temperatures: gas.viscous, source };
  const limit = { max: densest.known };
  return [
    ...(value <= densest.known
      ? []
      : [{ id: 'fluid-range-density', verdict: 'outside', value, unit: '1', limit, source: cubic } as const]),
    ...viscosityCautions(basis, figures.temperature),
  ];
}

/** ρ_b = p_b M / (Z_b R T_b), with Z_b = 1 where the gas would be a liquid at the base state. */
function baseGas(gas: OtherGas, { pressure: p, temperature: T }: State): BaseGas {
  const ideal = ((p * molarMass(gas)) / (R * T)) as Density;
  const found = outsideBy(gas, p, T) === undefined ? cubicGas(gas, p, T) : undefined;
  if (found === undefined) return { density: ideal, compressibility: 1, ideal: true };
  const density = (molarMass(gas) / found.molarVolume) as Density;
  return { density, compressibility: found.compressibility, ideal: false };
}
