/** Permanent pressure loss as a share of the differential. */
import type { Source } from '../../quantity/source.ts';
import type { Working } from '../../quantity/working.ts';
import { along } from './bracket.ts';
import { venturiLoss } from './loss.table.ts';

/**
 * Orifice plates and nozzles: (r - C beta^2)/(r + C beta^2) with r = sqrt(1 - beta^4 (1 - C^2)).
 * 0 < beta < 1, C > 0. Source: ISO 5167-2:2003, 5.4.1, Eq (7).
 */
export const jetLossShare = (ratio: number, coefficient: number): number => {
  const b2 = ratio * ratio;
  const r = Math.sqrt(1 - b2 * b2 * (1 - coefficient * coefficient)); // Eq (7)
  return (r - coefficient * b2) / (r + coefficient * b2); // Eq (7)
};

/**
 * Venturi tubes and Venturi nozzles with a divergent of at most 15 degrees: the curves of ISO 5167-4:2003, Annex C,
 * over beta for bores of 65 mm and 500 mm, linear in beta and D between them and held outside; raised at low Reynolds
 * numbers, 1.75 times at Re_D <= 1e5 down to 1 at 6e5, linear in ln Re_D between the two. Pipe bore in m.
 */
export const venturiLossShare = (ratio: number, pipe: number, reynolds: number): number => {
  const { ratios, small, large, low, high, smallBore, largeBore, raise } = venturiLoss;
  const size = clamp((pipe - smallBore) / (largeBore - smallBore), 0, 1);
  const share = (1 - size) * along(ratios, small, ratio) + size * along(ratios, large, ratio);
  const fall = clamp(Math.log(reynolds / low) / Math.log(high / low), 0, 1);
  return share * (raise + fall * (1 - raise));
};

/** The working of `jetLossShare`; differential and loss in Pa. */
export const jetLossWorking = (ratio: number, coefficient: number, differential: number, source: Source): Working => ({
  id: 'loss',
  symbol: 'Δϖ',
  // ISO 5167-2, Eq (7)
  formula: 'Δp * (sqrt(1 - β^4 * (1 - C^2)) - C * β^2) / (sqrt(1 - β^4 * (1 - C^2)) + C * β^2)',
  given: [
    { symbol: 'Δp', value: differential, unit: 'Pa', words: 'differential' },
    { symbol: 'β', value: ratio, unit: '', words: 'diameter-ratio' },
    { symbol: 'C', value: coefficient, unit: '', words: 'discharge-coefficient' },
  ],
  value: differential * jetLossShare(ratio, coefficient),
  unit: 'Pa',
  source,
});

/** The working of `venturiLossShare`; the share itself is read from a curve. */
export const venturiLossWorking = (share: number, differential: number): Working => ({
  id: 'loss',
  symbol: 'Δϖ',
  formula: 'ξ * Δp',
  given: [
    { symbol: 'ξ', value: share, unit: '', words: 'loss-share' },
    { symbol: 'Δp', value: differential, unit: 'Pa', words: 'differential' },
  ],
  value: share * differential,
  unit: 'Pa',
  source: venturiLoss.source,
  remark: 'venturi-loss-curve',
});

const clamp = (value: number, low: number, high: number): number => Math.min(Math.max(value, low), high);
