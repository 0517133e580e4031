/** Density of the gauge liquid at the moment of a reading. */
import { airDensity } from '../fluid/air/mixture.ts';
import type { Caution, FluidState } from '../fluid/contract.ts';
import { gaugeWaterDensity, mercuryDensity } from '../fluid/gauge-liquid.ts';
import type { Gauge } from '../input/instrument.ts';
import { isInside } from '../numeric/bounds.ts';
import { kelvin } from '../quantity/constants.ts';
import { fail, type Outcome, ok } from '../quantity/outcome.ts';
import type { Source } from '../quantity/source.ts';
import { named, type Working } from '../quantity/working.ts';

const MERCURY: Source = { clause: 'Beattie and others (1941); Cook, Phil. Trans. A 254 (1961) 125', seen: 'memory' };
const WATER: Source = { clause: 'Tanaka and others, Metrologia 38 (2001) 301', seen: 'memory' };
const AIR: Readonly<Record<'cipm' | 'gerg', Source>> = {
  cipm: { clause: 'CIPM-2007, dry air', seen: 'second-hand' },
  gerg: { clause: 'ISO 20765-2:2015 (GERG-2008), dry air', seen: 'second-hand' },
};
const STATED: Source = { clause: 'as stated by the user', seen: 'read' };
/** Where the formulas of the two liquids hold, K. */
const RANGE = {
  mercury: { min: kelvin(-20), max: kelvin(300) },
  water: { min: kelvin(0), max: kelvin(40) },
} as const;

export interface GaugeDensity {
  readonly density: number; // kg/m3
  readonly source: Source;
}

/**
 * Gauge liquid at its own temperature and the pressure of the line. Problem gauge-air-unknown: no formulation of air
 * holds there.
 */
export function gaugeDensity({ liquid, temperature }: Gauge, { pressure }: FluidState): Outcome<GaugeDensity> {
  if (liquid === 'mercury') return ok({ density: mercuryDensity(temperature, pressure), source: MERCURY });
  if (liquid === 'water') return ok({ density: gaugeWaterDensity(temperature, pressure), source: WATER });
  if (liquid !== 'air') return ok({ density: liquid, source: STATED });
  const air = airDensity(pressure, temperature, 0);
  if (air === undefined) return fail('gauge-air-unknown', 'instrument.liquid', { pressure, temperature });
  return ok({ density: air.density, source: AIR[air.by] });
}

export const liquidWorking = ({ temperature }: Gauge, { density, source }: GaugeDensity): Working => ({
  id: 'gaugeLiquid',
  symbol: 'ρ_g',
  given: source === STATED ? [] : [named('T_g', temperature, 'K', 'temperature-of-gauge-liquid')],
  value: density,
  unit: 'kg/m3',
  source,
});

/** A caution where the temperature leaves the range of the liquid's formula. */
export function liquidCautions({ liquid, temperature }: Gauge): readonly Caution[] {
  if (liquid !== 'mercury' && liquid !== 'water') return [];
  const limit = RANGE[liquid];
  if (isInside(temperature, limit)) return [];
  const source = liquid === 'mercury' ? MERCURY : WATER;
  return [{ id: 'gauge-liquid-range', verdict: 'outside', value: temperature, unit: 'K', limit, source }];
}
