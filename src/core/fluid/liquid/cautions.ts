/** Where the formulation of a liquid is continued beyond its range, or is known to be off. */
import { isInside } from '../../numeric/bounds.ts';
import type { Caution } from '../contract.ts';
import type { State } from '../model.ts';
import type { Liquid, Property } from './contract.ts';
import { thin } from './walther.ts';
import type { LiquidFigures } from './working.ts';

/** The cautions of a liquid at its state, in the order of density, viscosity, pressure and concentration. */
export function liquidCautions(liquid: Liquid, figures: LiquidFigures, at: State): readonly Caution[] {
  const viscosity = figures.viscosityStated ? undefined : liquid.viscosity;
  const { doubt } = liquid;
  return [
    ...beyondTemperature('liquid-density-range', liquid.density, at),
    ...beyondTemperature('liquid-viscosity-range', viscosity, at),
    ...thinOil(viscosity, figures),
    ...beyondPressure(liquid, figures, at),
    ...(doubt === undefined ? [] : [caution(doubt.id, doubt.value, '%', { max: doubt.max }, doubt.source)]),
  ];
}

const caution = (
  id: string,
  value: number,
  unit: string,
  limit: Caution['limit'],
  source: Caution['source'],
): Caution => ({ id, verdict: 'caution', value, unit, limit, source });

function beyondTemperature(id: string, property: Property | undefined, { temperature: T }: State): readonly Caution[] {
  if (property === undefined || isInside(T, property)) return [];
  const { min, max, source } = property;
  return [caution(id, T, 'K', { min, max }, source)];
}

/** The line of D341 in its simple form is for more than 2 mm2/s. */
function thinOil(viscosity: Property | undefined, figures: LiquidFigures): readonly Caution[] {
  const nu = figures.viscosity / figures.density; // ν = μ/ρ
  if (viscosity?.remark !== 'liquid-own-walther' || nu >= thin) return [];
  return [caution('viscosity-thin', 1e6 * nu, 'mm2/s', { min: 1e6 * thin }, viscosity.source)];
}

function beyondPressure({ pressure }: Liquid, { factor }: LiquidFigures, at: State): readonly Caution[] {
  if (pressure === undefined || factor === undefined || isInside(at.pressure, { max: pressure.max })) return [];
  return [caution('liquid-pressure-range', at.pressure, 'Pa', { max: pressure.max }, pressure.source)];
}
