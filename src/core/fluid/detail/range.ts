/**
 * Where the DETAIL equation of AGA 8 holds and how well: gas of pipeline quality near ambient temperature.
 * Standard: AGA Report No. 8, Part 1:2017 (DETAIL); ISO 20765-1:2005, pipeline quality, from memory. SI.
 */
import { isInside } from '../../numeric/bounds.ts';
import type { Source } from '../../quantity/source.ts';
import type { Caution, FigureRange, StatedUncertainty } from '../contract.ts';
import { componentNames } from '../helmholtz/components.ts';
import { limits } from './limits.table.ts';

/** The DETAIL equation, a choice for gas of pipeline quality. */
export const DETAIL: Source = { clause: 'AGA Report No. 8, Part 1 (DETAIL), ISO 12213-2', seen: 'second-hand' };
const range: Source = { clause: 'ISO 20765-1:2005, gas of pipeline quality', seen: 'memory' };

const temperature = { min: 263, max: 338 } as const; // K
const pressure = { max: 12e6 } as const; // Pa

/** Where the equation is known to hold, for gas of pipeline quality. */
export const detailRange: FigureRange = { temperature, pressure };

/** Everything in which a gas leaves the range of pipeline quality. */
export function detailCautions(x: readonly number[], p: number, T: number): readonly Caution[] {
  const common = { verdict: 'caution', source: range } as const;
  const shares = limits.flatMap(([names, limit]): Caution[] => {
    const share = names.reduce((sum, name) => sum + (x[componentNames.indexOf(name)] ?? 0), 0);
    if (isInside(share, limit)) return [];
    const { min, max } = limit;
    const percent = min === undefined ? { max: (max ?? 1) * 100 } : { min: min * 100 };
    const detail = { components: names.join(', ') };
    return [{ ...common, id: 'detail-composition', value: share * 100, unit: '%', limit: percent, detail }];
  });
  return [
    ...(isInside(T, temperature)
      ? []
      : [{ ...common, id: 'fluid-range-temperature', value: T, unit: 'K', limit: temperature }]),
    ...(isInside(p, pressure)
      ? []
      : [{ ...common, id: 'fluid-range-pressure', value: p, unit: 'Pa', limit: pressure }]),
    ...shares,
  ];
}

/** Expanded relative uncertainty of density and of the speed of sound: 0.1 % of pipeline quality, else not known here. */
export function detailUncertainty(x: readonly number[], p: number, T: number): StatedUncertainty | undefined {
  if (detailCautions(x, p, T).length > 0) return undefined;
  return { share: 0.001, source: { clause: `${range.clause}, uncertainty`, seen: 'memory' } };
}
