/**
 * Relative density of a gas: its density at the base state over that of dry air there.
 * Standard: ISO 6976:2016, 3.4 (real gases, both at the same base state). Symbols: d, ρ_b, ρ_air; SI.
 */
import type { Density } from '../../quantity/kinds.ts';
import type { Source } from '../../quantity/source.ts';
import type { Working } from '../../quantity/working.ts';
import type { State } from '../model.ts';
import { airDensity } from './mixture.ts';

const definition: Source = {
  clause: 'ISO 6976:2016, relative density; dry air by CIPM-2007 or GERG-2008',
  seen: 'memory',
};

/** Relative density, without a unit, as its working; undefined where air is no gas at the base state. */
export function relativeDensity(baseDensity: Density, base: State): Working | undefined {
  const air = airDensity(base.pressure, base.temperature, 0);
  if (air === undefined) return undefined;
  return {
    id: 'relativeDensity',
    symbol: 'd',
    formula: 'ρ_b / ρ_air',
    given: [
      { symbol: 'ρ_b', value: baseDensity, unit: 'kg/m3', words: 'base-density' },
      { symbol: 'ρ_air', value: air.density, unit: 'kg/m3', words: 'base-density-air' },
    ],
    value: baseDensity / air.density,
    unit: '',
    source: definition,
  };
}
