/**
 * Water and steam by the industrial formulation: liquid or vapour by its state, or held to one phase by the user.
 * Standard: IAPWS R7-97(2012) and IAPWS R12-08. Symbols: those of the releases; SI.
 */
import type { AbsolutePressure, Density, MolarMass, Temperature } from '../../quantity/kinds.ts';
import { fail, type Outcome, ok } from '../../quantity/outcome.ts';
import type { Source } from '../../quantity/source.ts';
import type { FluidState } from '../contract.ts';
import { densityAt, propertiesAt } from '../if97/evaluate.ts';
import {
  between1And3,
  boilingAt,
  bounds,
  highestPressureAt,
  outsideBy,
  type Place,
  placeOf,
  sideOf,
  supercritical,
  vapourPressureAt,
} from '../if97/place.ts';
import { R, type WaterProperties } from '../if97/properties.ts';
import type { Side } from '../if97/region3.ts';
import { criticalTemperature } from '../if97/saturation.ts';
import { highestTemperature as highestTemperatureOfViscosity, viscosity } from '../if97/viscosity.ts';
import type { Conditions, FluidModel, Parsed } from '../model.ts';
import { saturatedState } from './saturated.ts';
import { wetSteam } from './wet-steam.ts';
import { waterRanges, waterSources, waterUncertainties, waterWorking } from './working.ts';

const molarMass = 0.018015257 as MolarMass; // kg/mol; IAPWS R7-97(2012), section 2: R_m = 8.31451 J/(mol.K) by R

/** A state this near to the line counts as on it when the user names the phase, K (practice: a meter's tolerance). */
const onTheLine = 0.1;

/** A phase may be held this far beyond the line, K (practice): the equations go on smoothly there, far out they do not. */
const furthestBeyond = 20;

interface Settled {
  readonly place: Place;
  readonly forced: boolean;
}

/** Water or steam at the conditions. Problems: water-out-of-range, phase-impossible, phase-far-from-saturation. */
export function waterState(conditions: Conditions, phase?: Side): Outcome<FluidState> {
  const { pressure, temperature } = conditions;
  const outside = outsideBy(pressure, temperature);
  if (outside !== undefined) return outOfRange(conditions, outside);
  const settled =
    phase === undefined ? ok({ place: placeOf(pressure, temperature), forced: false }) : settle(conditions, phase);
  if (!settled.ok) return settled;
  const { place, forced } = settled.value;
  const properties = propertiesAt(pressure, temperature, place);
  if (properties === undefined) return impossible(conditions, place.side);
  return ok(stateFrom(conditions, place, forced, properties));
}

function outOfRange({ pressure, temperature, paths }: Conditions, outside: 'temperature' | 'pressure') {
  return fail('water-out-of-range', paths[outside], {
    pressure,
    temperature,
    lowestTemperature: bounds.lowestTemperature,
    highestTemperature: bounds.highestTemperature,
    lowestPressure: bounds.lowestPressure,
    highestPressure: highestPressureAt(temperature),
  });
}

function impossible({ pressure, temperature, paths }: Conditions, phase: Side) {
  return fail('phase-impossible', paths.own('phase'), { phase, pressure, temperature });
}

/** Holds the state to the phase that the user named. */
function settle(conditions: Conditions, phase: Side): Outcome<Settled> {
  const { pressure, temperature, paths } = conditions;
  const natural = placeOf(pressure, temperature);
  const boiling = boilingAt(pressure);
  const distance = boiling === undefined ? Number.POSITIVE_INFINITY : Math.abs(temperature - boiling);
  if (natural.side === phase) return ok({ place: natural, forced: distance <= onTheLine });
  if (boiling === undefined || temperature > criticalTemperature) return impossible(conditions, phase);
  if (distance > furthestBeyond) {
    const detail = { phase, pressure, temperature, saturationTemperature: boiling, furthest: furthestBeyond };
    return fail('phase-far-from-saturation', paths.own('phase'), detail);
  }
  return ok({ place: sideOf(pressure, temperature, phase), forced: true });
}

function stateFrom(conditions: Conditions, place: Place, forced: boolean, properties: WaterProperties): FluidState {
  const { pressure: p, temperature: T } = conditions;
  const { density, speedOfSoundSquared, jouleThomson } = properties;
  const vapourPressure = vapourPressureAt(T);
  const saturationTemperature = boilingAt(p);
  const base = place.side === 'liquid' ? baseWater(conditions) : undefined;
  const figures = {
    pressure: p,
    temperature: T,
    density,
    viscosity: viscosity(T, density),
    isentropicExponent: (speedOfSoundSquared * density) / p, // κ = w2 ρ / p
    compressibility: p / (density * R * T),
    speedOfSound: Math.sqrt(speedOfSoundSquared),
    ...(vapourPressure === undefined ? {} : { vapourPressure }),
    ...(saturationTemperature === undefined ? {} : { saturationTemperature }),
    ...(base === undefined ? {} : { baseDensity: base.density }),
  };
  const extrapolated = T > highestTemperatureOfViscosity;
  const heldBeyond = forced && place.side !== placeOf(p, T).side;
  return {
    ...figures,
    jouleThomson,
    molarMass,
    phase: supercritical(p, T) ? 'supercritical' : place.side,
    expands: place.side === 'vapour',
    ...(forced ? { phaseForced: true } : {}),
    uncertainties: waterUncertainties(place.region, place.side === 'vapour'),
    ranges: waterRanges(place.region),
    sources: waterSources(place.region, extrapolated, figures, base?.source),
    working: waterWorking(place.region, heldBeyond, extrapolated, place.side === 'liquid', figures, conditions.base),
  };
}

/** Density at the project's base state, where the formulation holds it and it is liquid there. */
function baseWater({ base }: Conditions): { readonly density: Density; readonly source: Source } | undefined {
  const { pressure, temperature } = base;
  if (outsideBy(pressure, temperature) !== undefined) return undefined;
  const place = placeOf(pressure, temperature);
  if (place.side !== 'liquid') return undefined;
  const density = densityAt(pressure, temperature, place);
  if (density === undefined) throw new Error(`expected a liquid density at ${pressure} Pa, ${temperature} K, got none`);
  return { density, source: { clause: `IAPWS R7-97(2012), region ${place.region}`, seen: 'second-hand' } };
}

/** Density alone at a state inside the formulation, kg/m3, for long series of states; undefined outside it. */
export function waterDensity(p: AbsolutePressure, T: Temperature): Density | undefined {
  return outsideBy(p, T) === undefined ? densityAt(p, T, placeOf(p, T)) : undefined;
}

/** Water, steam, or wet steam of a stated quality. Problems: those of waterState. */
function stateOfWater({ choices, numbers }: Parsed, conditions: Conditions): Outcome<FluidState> {
  const { quality } = numbers;
  if (quality === undefined) return waterState(conditions, choices.phase as Side | undefined);
  const vapour = waterState(conditions, 'vapour');
  if (!vapour.ok) return vapour;
  const { pressure, temperature } = conditions;
  const liquid = densityAt(pressure, temperature, sideOf(pressure, temperature, 'liquid'));
  return liquid === undefined ? impossible(conditions, 'liquid') : ok(wetSteam(vapour.value, liquid, quality));
}

/** Water and steam, by state, named phase or quality. */
export const water: FluidModel = {
  kind: 'water',
  fields: [
    { name: 'phase', type: 'choice', choices: ['liquid', 'vapour'], required: false },
    { name: 'quality', type: 'share', required: false },
  ],
  complete: saturatedState,
  state: stateOfWater,
  seams: () => ({ pressure: [], temperature: [between1And3, bounds.hot] }),
};
