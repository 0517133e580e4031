/**
 * A fluid whose figures the user states. With an isentropic exponent it is a gas, without one a liquid.
 * Standard: none; symbols of ISO 5167-1, clause 4; SI.
 */
import { molarGasConstant } from '../../quantity/constants.ts';
import type {
  AbsolutePressure,
  Density,
  DynamicViscosity,
  KinematicViscosity,
  MolarMass,
} from '../../quantity/kinds.ts';
import { fail, type Outcome, ok } from '../../quantity/outcome.ts';
import type { FluidState } from '../contract.ts';
import type { Conditions, FluidModel, Parsed } from '../model.ts';
import { type StatedFigures, statedSources, statedWorking } from './working.ts';

/** What an isentropic exponent can be (practice): gases near their critical point leave 1 to 2 on either side. */
const exponentBounds = { min: 0.5, max: 10 } as const;
/** What a compressibility factor can be (practice). */
const compressibilityBounds = { min: 0.05, max: 5 } as const;

/** The state of a stated fluid. Problems: isentropic-exponent-implausible, compressibility-implausible, not-positive. */
function statedState(parsed: Parsed, conditions: Conditions): Outcome<FluidState> {
  const exponent = within(parsed, 'isentropicExponent', exponentBounds, 'isentropic-exponent-implausible', conditions);
  if (!exponent.ok) return exponent;
  const factor = within(parsed, 'compressibility', compressibilityBounds, 'compressibility-implausible', conditions);
  if (!factor.ok) return factor;
  const figures = figuresOf(parsed, conditions, exponent.value, factor.value);
  const { compressibilityStated, baseDensityStated, kinematicViscosity, ...shown } = figures;
  const gas = exponent.value !== undefined;
  return ok({
    pressure: conditions.pressure,
    temperature: conditions.temperature,
    ...shown,
    phase: gas ? 'gas' : 'liquid',
    expands: gas,
    sources: statedSources(figures),
    working: statedWorking(figures, conditions, conditions.base),
  });
}

function within(
  parsed: Parsed,
  name: string,
  { min, max }: { readonly min: number; readonly max: number },
  code: string,
  { paths }: Conditions,
): Outcome<number | undefined> {
  const value = parsed.numbers[name];
  if (value === undefined) return ok(undefined);
  if (!(value > 0)) return fail('not-positive', paths.own(name), { written: String(value) });
  return value >= min && value <= max ? ok(value) : fail(code, paths.own(name), { value, min, max });
}

function figuresOf(parsed: Parsed, conditions: Conditions, exponent?: number, factor?: number): StatedFigures {
  const { pressure: p, temperature: T, base } = conditions;
  const rho = parsed.quantities.density?.si as Density;
  const M = parsed.quantities.molarMass?.si as MolarMass | undefined;
  const pv = parsed.quantities.vapourPressure?.si as AbsolutePressure | undefined;
  const statedBase = parsed.quantities.baseDensity?.si as Density | undefined;
  const R = molarGasConstant.exact;
  const gas = exponent !== undefined;
  const Z = factor ?? (gas && M !== undefined ? (p * M) / (rho * R * T) : undefined); // Z = p M / (ρ R T)
  const followingBase = gas && M !== undefined ? (base.pressure * M) / (R * base.temperature) : undefined; // Z_b = 1
  const baseDensity = statedBase ?? (followingBase as Density | undefined);
  return {
    density: rho,
    ...viscosityOf(parsed, rho),
    ...(gas ? { isentropicExponent: exponent, speedOfSound: Math.sqrt((exponent * p) / rho) } : {}), // w2 = κ p / ρ
    ...(M === undefined ? {} : { molarMass: M }),
    ...(Z === undefined ? {} : { compressibility: Z }),
    ...(pv === undefined ? {} : { vapourPressure: pv }),
    ...(baseDensity === undefined ? {} : { baseDensity }),
    compressibilityStated: factor !== undefined,
    baseDensityStated: statedBase !== undefined,
  };
}

function viscosityOf(parsed: Parsed, rho: Density): Pick<StatedFigures, 'viscosity' | 'kinematicViscosity'> {
  const given = parsed.quantities.viscosity;
  if (given?.measure !== 'kinematic viscosity') return { viscosity: given?.si as DynamicViscosity };
  return { viscosity: (rho * given.si) as DynamicViscosity, kinematicViscosity: given.si as KinematicViscosity }; // μ = ρ ν
}

/** A fluid of the user's own figures. */
export const stated: FluidModel = {
  kind: 'stated',
  fields: [
    { name: 'density', type: 'quantity', measures: ['density'], required: true },
    { name: 'viscosity', type: 'quantity', measures: ['dynamic viscosity', 'kinematic viscosity'], required: true },
    { name: 'isentropicExponent', type: 'number', required: false },
    { name: 'molarMass', type: 'quantity', measures: ['molar mass'], required: false },
    { name: 'compressibility', type: 'number', required: false },
    { name: 'vapourPressure', type: 'quantity', measures: ['absolute pressure', 'gauge pressure'], required: false },
    { name: 'baseDensity', type: 'quantity', measures: ['density'], required: false },
  ],
  state: statedState,
};
