/**
 * A gas or gas mixture of known composition: density, speed of sound and isentropic exponent by one equation of state.
 * Standard: ISO 20765-2:2015 (GERG-2008), 21 components. Symbols: those of the standard; SI.
 */
import type { AbsolutePressure, Density, MolarMass, Temperature } from '../quantity/kinds.ts';
import { fail, type Outcome, ok } from '../quantity/outcome.ts';
import { type Basis, compositionOf } from './composition.ts';
import type { FluidState } from './contract.ts';
import { condenses, evaluated, gasCautions, gasUncertainty } from './gas-range.ts';
import { gasViscosity, viscosityBasis } from './gas-viscosity/viscosity.ts';
import { type BaseGas, type GasFigures, gasSources, gasWorking } from './gas-working.ts';
import { gasDensity, liquidDensity } from './gerg/density.ts';
import { type Isotherm, isothermOf } from './gerg/isotherm.ts';
import { type Mixture, mixtureOf, R } from './gerg/mixture.ts';
import { type GasProperties, propertiesAt } from './gerg/properties.ts';
import type { Conditions, FluidModel, Parsed, State } from './model.ts';

/** The side of a phase boundary that the user asks for; a gas where nothing is said. */
export type GasPhase = 'gas' | 'liquid';

/**
 * State of a gas of composition `x`, in the order of componentNames, sum 1.
 * Problems: gas-out-of-range, gas-density-none, gas-beyond-equation.
 */
export function gasState(x: readonly number[], conditions: Conditions, phase: GasPhase = 'gas'): Outcome<FluidState> {
  const { pressure: p, temperature: T } = conditions;
  const outside = outsideBy(p, T);
  if (outside !== undefined) return outOfRange(conditions, outside);
  const mixture = mixtureOf(x);
  const isotherm = isothermOf(mixture, T);
  const rho = phase === 'liquid' ? liquidDensity(isotherm, p) : gasDensity(isotherm, p);
  const detail = { pressure: p, temperature: T, phase };
  if (rho === undefined) return fail('gas-density-none', conditions.paths.pressure, detail);
  const properties = propertiesAt(isotherm, rho);
  if (!isReal(properties)) return fail('gas-beyond-equation', conditions.paths.temperature, detail);
  return ok(stateFrom(isotherm, rho, properties, conditions, phase));
}

const outsideBy = (p: number, T: number): 'pressure' | 'temperature' | undefined => {
  if (!(T >= evaluated.temperature.min && T <= evaluated.temperature.max)) return 'temperature';
  return p > 0 && p <= evaluated.pressure.max ? undefined : 'pressure';
};

function outOfRange({ pressure, temperature, paths }: Conditions, outside: 'temperature' | 'pressure') {
  return fail('gas-out-of-range', paths[outside], {
    pressure,
    temperature,
    lowestTemperature: evaluated.temperature.min,
    highestTemperature: evaluated.temperature.max,
    highestPressure: evaluated.pressure.max,
  });
}

/** Far outside its range the equation may answer with heat capacities that no substance has. */
const isReal = ({ isochoricHeatCapacity, speedOfSoundSquared, compressibility }: GasProperties): boolean =>
  isochoricHeatCapacity > 0 && speedOfSoundSquared > 0 && compressibility > 0 && Number.isFinite(speedOfSoundSquared);

function stateFrom(
  { mixture, T, RT }: Isotherm,
  rho: number,
  properties: GasProperties,
  { pressure: p, base }: Conditions,
  phase: GasPhase,
): FluidState {
  const { x } = mixture;
  const temperature = T as Temperature;
  const figures: GasFigures = {
    pressure: p,
    temperature,
    density: (rho * mixture.molarMass) as Density,
    viscosity: gasViscosity(x, temperature, rho),
    isentropicExponent: properties.isentropicExponent,
    compressibility: p / (rho * RT), // Z = p/(ρ R T)
    molarMass: mixture.molarMass as MolarMass,
    speedOfSound: Math.sqrt(properties.speedOfSoundSquared),
  };
  const atBase = baseOf(mixture, base);
  const basis = viscosityBasis(x, temperature, rho);
  const known = gasUncertainty(x, p, T);
  const cautions = gasCautions(x, p, T, phase === 'liquid');
  return {
    ...figures,
    phase,
    expands: phase === 'gas',
    baseDensity: atBase.density,
    ...(cautions.length === 0 ? {} : { cautions }),
    uncertainties: {
      ...(known === undefined ? {} : { density: known, speedOfSound: known }),
      viscosity: { share: basis.uncertainty, source: basis.source },
    },
    sources: gasSources(basis.source, atBase),
    working: gasWorking(figures, basis, atBase, base),
  };
}

/** ρ_b = p_b M / (Z_b R T_b), with Z_b = 1 where the gas would not be one gas at the base state. */
function baseOf(mixture: Mixture, { pressure: p, temperature: T }: State): BaseGas {
  const RT = R * T;
  const whole = outsideBy(p, T) === undefined && !condenses(mixture.x, p, T);
  const rho = whole ? gasDensity(isothermOf(mixture, T), p) : undefined;
  const molar = rho ?? p / RT;
  return {
    density: (molar * mixture.molarMass) as Density,
    compressibility: p / (molar * RT),
    ideal: rho === undefined,
  };
}

/**
 * Density alone, kg/m3, for long series of states of one mixture; undefined where the gas has none.
 */
export function gasDensityAt(mixture: Mixture, p: AbsolutePressure, T: Temperature): Density | undefined {
  if (outsideBy(p, T) !== undefined) return undefined;
  const rho = gasDensity(isothermOf(mixture, T), p);
  return rho === undefined ? undefined : ((rho * mixture.molarMass) as Density);
}

function parsedState(parsed: Parsed, conditions: Conditions): Outcome<FluidState> {
  const { fractions, flags, choices } = parsed;
  const basis = (choices.basis ?? 'mole') as Basis;
  const path = conditions.paths.own('composition');
  const x = compositionOf(fractions.composition ?? [], basis, flags.normalise === true, path);
  return x.ok ? gasState(x.value, conditions, choices.phase as GasPhase | undefined) : x;
}

export const gas: FluidModel = {
  kind: 'gas',
  fields: [
    { name: 'composition', type: 'fractions', required: true },
    { name: 'basis', type: 'choice', choices: ['mole', 'mass'], required: false },
    { name: 'normalise', type: 'flag' },
    { name: 'phase', type: 'choice', choices: ['gas', 'liquid'], required: false },
  ],
  state: parsedState,
};
