/** The figures of a settled liquid at its state: density under pressure, viscosity, vapour pressure, base density. */
import { standardAtmosphere as atmospheric } from '../../quantity/constants.ts';
import type { AbsolutePressure, Density, DynamicViscosity } from '../../quantity/kinds.ts';
import { fail, type Outcome, ok } from '../../quantity/outcome.ts';
import type { Conditions, Parsed, State } from '../model.ts';
import { compressed, type Liquid, type Property } from './contract.ts';
import type { LiquidFigures } from './working.ts';

/** Practice: this far below its vapour pressure a liquid may still be said to be one, for the doubt in both figures. */
const leastOfVapourPressure = 0.9;
/** Practice: a larger change of the density than this is no linear compression. */
const furthestCompression = 0.1;

/** Every figure of a liquid. Problems: liquid-boils, and those of density and viscosity. */
export function figuresOf(liquid: Liquid, parsed: Parsed, conditions: Conditions): Outcome<LiquidFigures> {
  const { pressure: p, temperature: T, paths, base } = conditions;
  const reference = reach(liquid.density, T);
  if (reference === undefined) return outOfRange('liquid-density-out-of-range', liquid.density, conditions);
  const statedVapour = parsed.quantities.vapourPressure?.si;
  const vapourPressure = statedVapour ?? vapourAt(liquid, T);
  if (liquid.boils && vapourPressure !== undefined && p < leastOfVapourPressure * vapourPressure)
    return fail('liquid-boils', paths.pressure, { pressure: p, temperature: T, vapourPressure });
  const modulus = parsed.quantities.bulkModulus?.si ?? liquid.bulkModulus;
  const from = (liquid.boils ? vapourPressure : undefined) ?? atmospheric;
  const density = densityAt(liquid, reference, modulus, from, conditions);
  if (!density.ok) return density;
  const viscosity = viscosityAt(liquid, parsed, density.value.density, conditions);
  if (!viscosity.ok) return viscosity;
  const baseDensity = parsed.quantities.baseDensity?.si ?? baseDensityOf(liquid, modulus, base);
  return ok({
    ...density.value,
    reference,
    viscosity: viscosity.value,
    ...(vapourPressure === undefined ? {} : { vapourPressure: vapourPressure as AbsolutePressure }),
    ...(baseDensity === undefined ? {} : { baseDensity: baseDensity as Density }),
    viscosityStated: parsed.quantities.viscosity !== undefined,
    vapourStated: statedVapour !== undefined,
    baseStated: parsed.quantities.baseDensity !== undefined,
  });
}

/** A property where it can be had, beyond its range as far as allowed; undefined where it cannot or makes no sense. */
function reach({ at, min, max, below, above }: Property, T: number): number | undefined {
  if (!(T >= min - below && T <= max + above)) return undefined;
  const value = at(T);
  return value > 0 && Number.isFinite(value) ? value : undefined;
}

const vapourAt = ({ vapourPressure }: Liquid, T: number): number | undefined =>
  vapourPressure === undefined ? undefined : reach(vapourPressure, T);

function outOfRange(code: string, { min, max, below, above }: Property, { temperature, paths }: Conditions) {
  return fail(code, paths.temperature, { temperature, lowest: min - below, highest: max + above });
}

/** The density at the line pressure. Problem liquid-pressure-too-high. */
function densityAt(
  { pressure }: Liquid,
  reference: number,
  modulus: number | undefined,
  from: number,
  { pressure: p, temperature: T, paths }: Conditions,
): Outcome<Pick<LiquidFigures, 'density' | 'modulus' | 'from' | 'factor'>> {
  const tooHigh = (highest: number) => fail('liquid-pressure-too-high', paths.pressure, { pressure: p, highest });
  if (modulus !== undefined) {
    if (Math.abs(p - from) > furthestCompression * modulus) return tooHigh(from + furthestCompression * modulus);
    return ok({ density: compressed(reference, p, from, modulus) as Density, modulus, from });
  }
  if (pressure === undefined) return ok({ density: reference as Density });
  if (p > pressure.furthest) return tooHigh(pressure.furthest);
  const factor = pressure.at(p, T);
  return ok({ density: (reference * factor) as Density, factor });
}

/** The viscosity: stated, or by the formulation. Problems: liquid-viscosity-missing, liquid-viscosity-out-of-range. */
function viscosityAt(
  { viscosity }: Liquid,
  { quantities }: Parsed,
  density: Density,
  conditions: Conditions,
): Outcome<DynamicViscosity> {
  const stated = quantities.viscosity;
  if (stated !== undefined) {
    const mu = stated.measure === 'kinematic viscosity' ? stated.si * density : stated.si; // μ = ρ ν
    return ok(mu as DynamicViscosity);
  }
  if (viscosity === undefined) return fail('liquid-viscosity-missing', conditions.paths.own('viscosity'));
  const mu = reach(viscosity, conditions.temperature);
  if (mu === undefined) return outOfRange('liquid-viscosity-out-of-range', viscosity, conditions);
  return ok(mu as DynamicViscosity);
}

/** Density at the project's base state; a liquid that boils there is taken under its own vapour pressure. */
function baseDensityOf(
  liquid: Liquid,
  modulus: number | undefined,
  { pressure, temperature: T }: State,
): number | undefined {
  const reference = reach(liquid.density, T);
  if (reference === undefined) return undefined;
  if (modulus === undefined) return reference * (liquid.pressure?.at(pressure, T) ?? 1);
  const from = (liquid.boils ? vapourAt(liquid, T) : undefined) ?? atmospheric;
  const p = liquid.boils ? Math.max(pressure, from) : pressure;
  return Math.abs(p - from) > furthestCompression * modulus ? undefined : compressed(reference, p, from, modulus);
}
