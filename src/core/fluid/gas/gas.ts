/**
 * A gas or gas mixture of known composition: density, speed of sound and isentropic exponent by one equation of state.
 * Standard: ISO 20765-2:2015 (GERG-2008), 21 components, or AGA Report No. 8, Part 1 (DETAIL). Symbols: theirs; SI.
 */
import type { Density, MolarMass, Temperature } from '../../quantity/kinds.ts';
import { fail, type Outcome, ok } from '../../quantity/outcome.ts';
import type { FluidState } from '../contract.ts';
import { splits } from '../cubic/stability.ts';
import { gasViscosity, viscosityBasis, viscosityCautions } from '../gas-viscosity/viscosity.ts';
import { componentNames } from '../helmholtz/components.ts';
import { gasDensity, liquidDensity } from '../helmholtz/density.ts';
import { type Isotherm, isothermOf } from '../helmholtz/isotherm.ts';
import type { Mixture } from '../helmholtz/mixture.ts';
import { type GasProperties, propertiesAt } from '../helmholtz/properties.ts';
import { type Conditions, type FluidModel, type Parsed, plainName, type State } from '../model.ts';
import { spellings } from './composition.table.ts';
import { type Basis, compositionOf, sumWorking } from './composition.ts';
import { type EquationName, equationNames, type GasEquation, gasEquations } from './equation.ts';
import { otherGasNames, otherGasState } from './other-gas.ts';
import { condenses, liquidCaution, outsideBy, phaseCautions, phaseSum, refusedOutside } from './range.ts';
import { type BaseGas, type GasFigures, gasRanges, gasSources, gasWorking } from './working.ts';

/** The phase of a mixture, found or asked for. */
export type GasPhase = 'gas' | 'liquid';

/** What the user settles beside composition and state; the equation is GERG-2008 where nothing is said. */
interface Asked {
  readonly phase?: GasPhase;
  readonly equation?: EquationName;
}

/**
 * State of a gas of composition `x`, in the order of componentNames, sum 1.
 * Problems: gas-out-of-range, gas-density-none, gas-beyond-equation.
 */
export function gasState(x: readonly number[], conditions: Conditions, how: Asked = {}): Outcome<FluidState> {
  const { pressure: p, temperature: T } = conditions;
  const { phase: asked, equation: name = 'gerg-2008' } = how;
  const equation = gasEquations[name];
  if (outsideBy(p, T) !== undefined) return refusedOutside(conditions);
  const mixture = equation.mixtureOf(x);
  const isotherm = isothermOf(mixture, T);
  const root = rootOf(isotherm, p, asked);
  const detail = { pressure: p, temperature: T, phase: asked ?? 'gas' };
  if (root === undefined) return fail('gas-density-none', conditions.paths.pressure, detail);
  const properties = propertiesAt(isotherm, root.rho);
  if (!isReal(properties)) return fail('gas-beyond-equation', conditions.paths.temperature, detail);
  return ok(stateFrom(equation, isotherm, root, properties, conditions));
}

/** A molar density, mol/m3, and whose it is. */
interface MolarRoot {
  readonly rho: number;
  readonly phase: GasPhase;
  /** True where a liquid was found and nobody had asked for one. */
  readonly unasked: boolean;
}

/** The root asked for; else that of the gas, and where there is none that of a liquid which does not split. */
function rootOf(isotherm: Isotherm, p: number, asked?: GasPhase): MolarRoot | undefined {
  const gasRoot = asked === 'liquid' ? undefined : gasDensity(isotherm, p);
  if (gasRoot !== undefined) return { rho: gasRoot, phase: 'gas', unasked: false };
  const rho = asked === 'gas' ? undefined : liquidDensity(isotherm, p);
  if (rho === undefined) return undefined;
  const unasked = asked === undefined;
  if (unasked && splits(phaseSum(isotherm.mixture.x, p, isotherm.T, 'liquid'))) return undefined;
  return { rho, phase: 'liquid', unasked };
}

/** Far outside its range the equation may answer with heat capacities that no substance has. */
const isReal = ({ isochoricHeatCapacity, speedOfSoundSquared, compressibility }: GasProperties): boolean =>
  isochoricHeatCapacity > 0 && speedOfSoundSquared > 0 && compressibility > 0 && Number.isFinite(speedOfSoundSquared);

function stateFrom(
  equation: GasEquation,
  { mixture, T, RT }: Isotherm,
  { rho, phase, unasked }: MolarRoot,
  properties: GasProperties,
  { pressure: p, base }: Conditions,
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
  const atBase = baseGas(mixture, base);
  const basis = viscosityBasis(x, temperature, rho);
  const doubts = [...(unasked ? [liquidCaution(p)] : []), ...phaseCautions(x, p, T, phase)];
  const cautions = [...doubts, ...equation.cautions(x, p, T), ...viscosityCautions(basis, temperature)];
  const range = equation.range(x, p, T);
  const known = doubts.length > 0 ? undefined : equation.uncertainty(x, p, T); // what is in doubt has no figure
  return {
    ...figures,
    jouleThomson: properties.jouleThomson,
    phase,
    expands: phase === 'gas',
    baseDensity: atBase.density,
    ...(cautions.length === 0 ? {} : { cautions }),
    uncertainties: {
      ...(known === undefined ? {} : { density: known, speedOfSound: known }),
      viscosity: { share: basis.uncertainty, source: basis.source },
    },
    ranges: {
      ...gasRanges(range, basis),
      ...(atBase.ideal ? {} : { baseDensity: range }),
    },
    sources: gasSources(equation, basis.source, atBase),
    working: gasWorking(equation, mixture.R, figures, basis, atBase, base).filter(({ id }) => isUsed(id, phase)),
  };
}

/** A liquid has no use for the exponent and the compressibility factor. */
const isUsed = (line: string, phase: GasPhase): boolean =>
  phase === 'gas' || (line !== 'isentropicExponent' && line !== 'compressibility');

/** ρ_b = p_b M / (Z_b R T_b), with Z_b = 1 where the gas would not be one gas at the base state. */
function baseGas(mixture: Mixture, { pressure: p, temperature: T }: State): BaseGas {
  const RT = mixture.R * T;
  const whole = outsideBy(p, T) === undefined && !condenses(mixture.x, p, T);
  const rho = whole ? gasDensity(isothermOf(mixture, T), p) : undefined;
  const molar = rho ?? p / RT;
  return {
    density: (molar * mixture.molarMass) as Density,
    compressibility: p / (molar * RT),
    ideal: rho === undefined,
  };
}

/** Pure gases by their names: those of the equation, and those beside it. */
const pureNames: ReadonlyMap<string, string> = new Map([
  ...otherGasNames,
  ...componentNames.flatMap((name) =>
    [name, ...(spellings[name] ?? [])].map((form) => [plainName(form), name] as const),
  ),
]);

/** Problems beside those of the composition and the state: field-missing, gas-named-twice. */
function parsedState({ fractions, flags, choices }: Parsed, conditions: Conditions): Outcome<FluidState> {
  const { own } = conditions.paths;
  const { composition } = fractions;
  const { name } = choices;
  const phase = choices.phase as GasPhase | undefined;
  const equation = choices.equation as EquationName | undefined;
  const asked: Asked = { ...(phase === undefined ? {} : { phase }), ...(equation === undefined ? {} : { equation }) };
  if (name !== undefined && composition !== undefined) return fail('gas-named-twice', own('name'), { written: name });
  if (name !== undefined) return pureState(name, conditions, asked);
  if (composition === undefined) return fail('field-missing', own('composition'));
  const basis = (choices.basis ?? 'mole') as Basis;
  const x = compositionOf(composition, basis, flags.normalise === true, own('composition'));
  const state = x.ok ? gasState(x.value, conditions, asked) : x;
  if (!state.ok) return state;
  return ok({ ...state.value, working: [...sumWorking(composition), ...state.value.working] });
}

function pureState(name: string, conditions: Conditions, asked: Asked): Outcome<FluidState> {
  const place = componentNames.indexOf(name);
  if (place >= 0)
    return gasState(
      componentNames.map((_, i) => (i === place ? 1 : 0)),
      conditions,
      asked,
    );
  const { pressure, temperature, paths } = conditions;
  if (asked.equation !== undefined) return fail('equation-unused', paths.own('equation'), { gas: name });
  if (asked.phase !== 'liquid') return otherGasState(name, conditions);
  return fail('gas-density-none', paths.own('phase'), { pressure, temperature, phase: asked.phase });
}

/** Gases by their composition or their name. */
export const gas: FluidModel = {
  kind: 'gas',
  fields: [
    { name: 'composition', type: 'fractions', required: false },
    { name: 'name', type: 'name', names: pureNames, required: false },
    { name: 'basis', type: 'choice', choices: ['mole', 'mass'], required: false },
    { name: 'normalise', type: 'flag' },
    { name: 'equation', type: 'choice', choices: equationNames, required: false },
    { name: 'phase', type: 'choice', choices: ['gas', 'liquid'], required: false },
  ],
  state: parsedState,
};
