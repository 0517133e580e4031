import { describe, expect, it } from 'vitest';
import { venturiLossShare } from '../../../src/core/element/shared/loss.ts';
import { geometry, lossShareOf, primaries, primary } from './primaries.ts';

describe('the permanent loss', () => {
  it('lies between nothing and the differential, for every element', () => {
    for (const one of primaries) {
      for (let ratio = one.ratioRange.min; ratio <= one.ratioRange.max; ratio += 0.05) {
        for (const reynolds of [1e4, 1e5, 1e6, 1e7]) {
          const at = geometry(0.1, ratio);
          const C = one.discharge(at)(Math.max(reynolds, one.reynoldsFloor(at)));
          const share = lossShareOf(one, at, C, reynolds);
          expect(share, `${one.name}, beta ${ratio}`).toBeGreaterThan(0);
          expect(share, `${one.name}, beta ${ratio}`).toBeLessThan(1);
        }
      }
    }
  });

  it('of an orifice plate is about 1 - beta^1.9 (ISO 5167-2:2003, 5.4.1)', () => {
    for (const ratio of [0.3, 0.4, 0.5, 0.6, 0.7]) {
      const at = geometry(0.1, ratio);
      const plate = primary('orifice-plate.corner');
      expect(lossShareOf(plate, at, 0.605, 1e6)).toBeCloseTo(1 - ratio ** 1.9, 1);
    }
  });

  it('of a Venturi tube follows the curves of Annex C at their bores and lies between 5 and 20 percent', () => {
    expect(venturiLossShare(0.5, 0.065, 1e6)).toBeCloseTo(0.143, 12);
    expect(venturiLossShare(0.75, 0.065, 1e6)).toBeCloseTo(0.088, 12);
    expect(venturiLossShare(0.5, 0.5, 1e6)).toBeCloseTo(0.075, 12);
    expect(venturiLossShare(0.525, 0.2825, 1e6)).toBeCloseTo((0.143 + 0.134 + 0.075 + 0.068) / 4, 12);
    expect(venturiLossShare(0.2, 0.03, 1e7)).toBeCloseTo(0.164, 12);
    expect(venturiLossShare(0.8, 0.9, 1e7)).toBeCloseTo(0.04, 12);
  });

  it('of a Venturi tube rises by 1.75 from Re_D = 6e5 down to 1e5', () => {
    expect(venturiLossShare(0.5, 0.5, 6e5)).toBeCloseTo(0.075, 12);
    expect(venturiLossShare(0.5, 0.5, 1e5)).toBeCloseTo(0.075 * 1.75, 12);
    expect(venturiLossShare(0.5, 0.5, 1e4)).toBeCloseTo(0.075 * 1.75, 12);
    expect(venturiLossShare(0.5, 0.5, Math.sqrt(6e10))).toBeCloseTo(0.075 * 1.375, 12);
  });
});
