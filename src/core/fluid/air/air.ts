/**
 * Air, dry or moist: by the formula of metrology inside its range, as a mixture of gases elsewhere; its sound always as a
 * mixture. Standard: CIPM-2007 (Metrologia 45 (2008) 149); ISO 20765-2:2015 (GERG-2008). Symbols: theirs; SI.
 */
import type { Density, DynamicViscosity, Temperature } from '../../quantity/kinds.ts';
import { fail, type Outcome, ok } from '../../quantity/outcome.ts';
import type { Caution, FluidState, StatedUncertainty } from '../contract.ts';
import { gasCautions, gasUncertainty, gergRange, outsideBy, refusedOutside } from '../gas/range.ts';
import { gasRanges } from '../gas/working.ts';
import { gasViscosity, schemeOf, viscosityBasis, viscosityCautions } from '../gas-viscosity/viscosity.ts';
import { mixtureOf } from '../gerg/mixture.ts';
import { gasDensity } from '../helmholtz/density.ts';
import { isothermOf } from '../helmholtz/isotherm.ts';
import { type GasProperties, propertiesAt } from '../helmholtz/properties.ts';
import type { Conditions, FluidModel, Parsed, State } from '../model.ts';
import * as cipm from './cipm.ts';
import { type AirDensity, airDensity, airFractions, massFraction } from './mixture.ts';
import { type Moisture, moistureCautions, type Vapour, vapourIn } from './moisture.ts';
import { type AirFigures, airSources, airWorking, type BaseAir, type BaseBasis } from './working.ts';

/** State of air. Problems: gas-out-of-range, gas-density-none, gas-beyond-equation, and those of its moisture. */
export function airState(
  moisture: Moisture | undefined,
  conditions: Conditions,
  basis: BaseBasis = 'wet',
): Outcome<FluidState> {
  const { pressure: p, temperature: T, paths } = conditions;
  if (outsideBy(p, T) !== undefined) return refusedOutside(conditions);
  const vapour = moisture === undefined ? ok(undefined) : vapourIn(moisture, conditions);
  if (!vapour.ok) return vapour;
  const xv = vapour.value?.fraction ?? 0;
  const found = airDensity(p, T, xv);
  const sound = soundOf(xv, conditions);
  const detail = { pressure: p, temperature: T, phase: 'gas' };
  if (found === undefined || sound === undefined) return fail('gas-density-none', paths.pressure, detail);
  if (!(sound.isochoricHeatCapacity > 0 && sound.speedOfSoundSquared > 0))
    return fail('gas-beyond-equation', paths.temperature, detail);
  return ok(stateFrom(conditions, vapour.value, found, sound, basis));
}

/** Air as a mixture of gases at the state; undefined where that has no gas. */
function soundOf(xv: number, { pressure, temperature }: State): GasProperties | undefined {
  const isotherm = isothermOf(mixtureOf(airFractions(xv)), temperature);
  const rho = gasDensity(isotherm, pressure);
  return rho === undefined ? undefined : propertiesAt(isotherm, rho);
}

function stateFrom(
  conditions: Conditions,
  vapour: Vapour | undefined,
  found: AirDensity,
  sound: GasProperties,
  basis: BaseBasis,
): FluidState {
  const { pressure: p, temperature: T, base } = conditions;
  const xv = vapour?.fraction ?? 0;
  const { density, compressibility, molarMass } = found;
  const speedOfSound = Math.sqrt(sound.speedOfSoundSquared);
  const viscous = viscosityOf(xv, T, density / molarMass);
  const figures: AirFigures = {
    pressure: p,
    temperature: T,
    density,
    viscosity: viscous.value,
    isentropicExponent: (sound.speedOfSoundSquared * density) / p, // κ = w² ρ / p
    compressibility,
    molarMass,
    speedOfSound,
  };
  const atBase = baseAir(xv, base, basis);
  const cautions = cautionsOf(xv, vapour, conditions, density / molarMass);
  return {
    ...figures,
    jouleThomson: sound.jouleThomson,
    phase: 'gas',
    expands: true,
    ...(atBase === undefined ? {} : { baseDensity: atBase.density }),
    ...(cautions.length === 0 ? {} : { cautions }),
    uncertainties: uncertaintiesOf(found, xv, conditions, viscous.uncertainty),
    ranges: rangesOf(xv, conditions, found, density / molarMass, atBase),
    sources: airSources(found.by, viscous.uncertainty.source, atBase),
    working: airWorking(figures, found.by, vapour, viscous.uncertainty.source, atBase, base),
  };
}

/**
 * Dry air by its reference correlation, and what the vapour changes by the scheme of mixtures: their ratio, so that both
 * meet where the vapour goes to nothing.
 */
function viscosityOf(
  xv: number,
  T: Temperature,
  rho: number,
): { readonly value: DynamicViscosity; readonly uncertainty: StatedUncertainty } {
  const dry = airFractions(0);
  const { source, uncertainty: share } = viscosityBasis(dry, T, rho);
  const value = gasViscosity(dry, T, rho);
  if (xv === 0) return { value, uncertainty: { share, source } };
  const ratio = schemeOf(airFractions(xv), T, rho) / schemeOf(dry, T, rho);
  const clause = `${source.clause}; the vapour by Wilke, J. Chem. Phys. 18 (1950) 517`;
  return {
    value: (value * ratio) as DynamicViscosity,
    uncertainty: { share: Math.max(share, WITH_VAPOUR), source: { clause, seen: source.seen } },
  };
}

/** Expanded relative uncertainty of the viscosity with vapour: that of the scheme for light gases. */
const WITH_VAPOUR = 0.03;

function baseAir(xv: number, base: State, basis: BaseBasis): BaseAir | undefined {
  if (outsideBy(base.pressure, base.temperature) !== undefined) return undefined;
  const whole = airDensity(base.pressure, base.temperature, xv);
  const found = basis === 'wet' ? whole : airDensity(base.pressure, base.temperature, 0);
  if (whole === undefined || found === undefined) return undefined;
  const water = massFraction(xv, whole.molarMass);
  const density = basis === 'wet' ? found.density : found.density / (1 - water); // q_m (1 - w) is the dry air
  return { ...found, basis, water, density: density as Density };
}

function uncertaintiesOf(
  { by }: AirDensity,
  xv: number,
  { pressure, temperature }: State,
  viscosity: StatedUncertainty,
): NonNullable<FluidState['uncertainties']> {
  const mixture = gasUncertainty(airFractions(xv), pressure, temperature);
  const density = by === 'cipm' ? cipm.stated : mixture;
  return {
    ...(density === undefined ? {} : { density }),
    ...(mixture === undefined ? {} : { speedOfSound: mixture }),
    viscosity,
  };
}

/** The formula of metrology has a range of its own; sound and exponent are always those of the mixture. */
function rangesOf(
  xv: number,
  { pressure, temperature }: State,
  found: AirDensity,
  rho: number,
  atBase: BaseAir | undefined,
): NonNullable<FluidState['ranges']> {
  const x = airFractions(xv);
  const mixture = gergRange(x, pressure, temperature);
  const of = ({ by }: AirDensity) => (by === 'cipm' ? cipm.range : mixture);
  const density = of(found);
  return {
    ...gasRanges(mixture, viscosityBasis(x, temperature, rho)),
    density,
    compressibility: density,
    ...(atBase === undefined ? {} : { baseDensity: of(atBase) }),
  };
}

function cautionsOf(xv: number, vapour: Vapour | undefined, at: State, rho: number): readonly Caution[] {
  const { pressure: p, temperature: T } = at;
  return [
    ...gasCautions(airFractions(xv), p, T, 'gas').filter(({ id }) => id !== 'water-dew-point'), // settled by the moisture
    ...viscosityCautions(viscosityBasis(airFractions(xv), T, rho), T),
    ...(vapour === undefined ? [] : moistureCautions(vapour, at)),
  ];
}

/** What the fields say of the moisture, one of three. Problem: moisture-twice. */
function moistureOf({ numbers, quantities }: Parsed, { paths }: Conditions): Outcome<Moisture | undefined> {
  const { relativeHumidity: h } = numbers;
  const found: readonly Moisture[] = [
    ...(h === undefined ? [] : [{ by: 'relativeHumidity', h } as const]),
    ...(['dewPoint', 'wetBulb'] as const).flatMap((by) => {
      const temperature = quantities[by]?.si as Temperature | undefined;
      return temperature === undefined ? [] : [{ by, temperature } as Moisture];
    }),
  ];
  const [first, second] = found;
  if (first === undefined || second === undefined) return ok(first);
  return fail('moisture-twice', paths.own(second.by), { first: first.by, second: second.by });
}

/** Air, by whichever of three figures says how moist it is. */
export const air: FluidModel = {
  kind: 'air',
  fields: [
    { name: 'relativeHumidity', type: 'share', required: false },
    { name: 'dewPoint', type: 'quantity', measures: ['temperature'], required: false },
    { name: 'wetBulb', type: 'quantity', measures: ['temperature'], required: false },
    { name: 'baseBasis', type: 'choice', choices: ['wet', 'dry'], required: false },
  ],
  state: (parsed, conditions) => {
    const moisture = moistureOf(parsed, conditions);
    if (!moisture.ok) return moisture;
    return airState(moisture.value, conditions, parsed.choices.baseBasis as BaseBasis | undefined);
  },
  seams: () => ({ pressure: Object.values(cipm.range.pressure), temperature: Object.values(cipm.range.temperature) }),
};
