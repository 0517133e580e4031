/** The figures of a liquid, where they come from, and their working. */
import type { AbsolutePressure, Density, DynamicViscosity } from '../../quantity/kinds.ts';
import { type Given, named, type Working } from '../../quantity/working.ts';
import type { FluidState } from '../contract.ts';
import type { Conditions } from '../model.ts';
import { atBase, baseLine, byUser, p1, statedLine, T1 } from '../working.ts';
import type { Liquid, Property } from './contract.ts';

/** Every figure of a liquid. */
export interface LiquidFigures {
  readonly density: Density;
  /** Density at the reference pressure, kg/m3. */
  readonly reference: number;
  /** Bulk modulus and the pressure it counts from, Pa; absent where the density holds at the line pressure. */
  readonly modulus?: number;
  readonly from?: number;
  /** The correction for pressure that a formulation has of its own. */
  readonly factor?: number;
  readonly viscosity: DynamicViscosity;
  readonly viscosityStated: boolean;
  readonly vapourPressure?: AbsolutePressure;
  readonly vapourStated: boolean;
  readonly baseDensity?: Density;
  readonly baseStated: boolean;
}

/** The source of each figure that the state has. */
export function liquidSources(liquid: Liquid, figures: LiquidFigures): FluidState['sources'] {
  const { density, viscosity, vapourPressure } = liquid;
  const vapour = figures.vapourStated ? byUser : vapourPressure?.source;
  return {
    density: density.source,
    viscosity: figures.viscosityStated ? byUser : (viscosity?.source ?? byUser),
    ...(figures.vapourPressure === undefined || vapour === undefined ? {} : { vapourPressure: vapour }),
    ...(figures.baseDensity === undefined ? {} : { baseDensity: figures.baseStated ? byUser : density.source }),
  };
}

/** The uncertainties that the sources state; a stated figure has none here. */
export function liquidUncertainties({ density, viscosity }: Liquid, { viscosityStated }: LiquidFigures) {
  const of = (property: Property | undefined) =>
    property?.share === undefined ? undefined : { share: property.share, source: property.source };
  const [rho, mu] = [of(density), viscosityStated ? undefined : of(viscosity)];
  return {
    ...(rho === undefined ? {} : { density: rho }),
    ...(mu === undefined ? {} : { viscosity: mu }),
  };
}

/** The ranges of the sources; a stated figure has none, and no pressure bounds what follows from a bulk modulus. */
export function liquidRanges(
  { density, viscosity, vapourPressure, pressure }: Liquid,
  { viscosityStated, vapourStated, baseStated }: LiquidFigures,
): NonNullable<FluidState['ranges']> {
  const of = ({ min, max }: Property) => ({ temperature: { min, max } });
  const rho = { ...of(density), ...(pressure === undefined ? {} : { pressure: { max: pressure.max } }) };
  return {
    density: rho,
    ...(viscosityStated || viscosity === undefined ? {} : { viscosity: of(viscosity) }),
    ...(vapourStated || vapourPressure === undefined ? {} : { vapourPressure: of(vapourPressure) }),
    ...(baseStated ? {} : { baseDensity: rho }),
  };
}

/** The working of each figure. */
export function liquidWorking(liquid: Liquid, figures: LiquidFigures, at: Conditions): readonly Working[] {
  const T = T1(at.temperature);
  return [
    ...(liquid.working?.(at.temperature) ?? []),
    densityWorking(liquid, figures, at),
    viscosityWorking(liquid, figures, T),
    ...vapourWorking(liquid, figures, T),
    ...baseWorking(liquid, figures, at),
  ];
}

function densityWorking({ density, pressure }: Liquid, figures: LiquidFigures, at: Conditions): Working {
  const { modulus, from, factor, reference } = figures;
  const line = { id: 'density', symbol: 'ρ_1', value: figures.density, unit: 'kg/m3' } as const;
  const rho = named('ρ_s', reference, 'kg/m3', 'density-reference');
  if (modulus !== undefined && from !== undefined) {
    const p = p1(at.pressure);
    const given = [
      rho,
      p,
      named('p_s', from, 'Pa(a)', 'pressure-reference'),
      named('K', modulus, 'Pa', 'bulk-modulus'),
    ];
    return { ...line, formula: 'ρ_s * (1 + (p_1 - p_s) / K)', given, source: density.source, remark: density.remark };
  }
  if (factor !== undefined && pressure !== undefined) {
    const given = [rho, named(pressure.symbol, factor, '', pressure.words)];
    return { ...line, formula: `ρ_s * ${pressure.symbol}`, given, source: pressure.source, remark: density.remark };
  }
  const given = [T1(at.temperature)];
  return { ...line, given, source: density.source, remark: density.remark };
}

function viscosityWorking({ viscosity }: Liquid, figures: LiquidFigures, T: Given): Working {
  const line = statedLine('viscosity', 'μ_1', figures.viscosity, 'Pa.s');
  if (figures.viscosityStated || viscosity === undefined) return line;
  return { ...line, given: [T], source: viscosity.source, remark: viscosity.remark };
}

function vapourWorking({ vapourPressure }: Liquid, figures: LiquidFigures, T: Given): readonly Working[] {
  const { vapourPressure: value, vapourStated } = figures;
  if (value === undefined) return [];
  const line = statedLine('vapourPressure', 'p_v', value, 'Pa(a)');
  if (vapourStated || vapourPressure === undefined) return [line];
  return [{ ...line, given: [T], source: vapourPressure.source, remark: vapourPressure.remark }];
}

function baseWorking({ density }: Liquid, figures: LiquidFigures, { base }: Conditions): readonly Working[] {
  const { baseDensity: value, baseStated } = figures;
  if (value === undefined) return [];
  if (baseStated) return [statedLine('baseDensity', 'ρ_b', value, 'kg/m3')];
  return [{ ...baseLine(atBase(base), value, density.source), remark: 'liquid-at-base' }];
}
