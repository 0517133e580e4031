import { describe, expect, it } from 'vitest';
import { nozzleExpansibility, orificeExpansibility } from '../../../src/core/element/shared/expansibility.ts';

/** Fall per x at x = 0, from the first-order terms of the three factors of ISO 5167-3, 5.1.6.3, worked by hand. */
const slope = (b: number, k: number): number => (3 / (4 * k)) * (1 + (4 / 3) * (b ** 4 / (1 - b ** 4)));

describe('expansibility of nozzles and Venturi tubes', () => {
  it('is 1 without a differential, and falls with the hand-worked slope', () => {
    for (const b of [0.2, 0.5, 0.75]) {
      for (const k of [1, 1.2, 1.4]) {
        const epsilon = nozzleExpansibility(b, k);
        expect(epsilon(0)).toBe(1);
        const x = 1e-7;
        expect((1 - epsilon(x)) / x).toBeCloseTo(slope(b, k), 5);
      }
    }
  });

  it('passes kappa = 1 smoothly and equals the logarithmic limit there', () => {
    const [b, x] = [0.6, 0.2];
    const tau = 1 - x;
    const limit = Math.sqrt(((tau ** 2 * Math.log(1 / tau)) / x) * ((1 - b ** 4) / (1 - b ** 4 * tau ** 2)));
    expect(nozzleExpansibility(b, 1)(x)).toBeCloseTo(limit, 14);
    for (const away of [1e-3, 1e-6, 1e-9, 1e-13]) {
      expect(Math.abs(nozzleExpansibility(b, 1 + away)(x) / limit - 1)).toBeLessThan(away);
      expect(Math.abs(nozzleExpansibility(b, 1 - away)(x) / limit - 1)).toBeLessThan(away);
    }
  });

  it('keeps its digits at x = 1e-5, where the plain form loses them: the second order is seen', () => {
    const [b, k] = [0.5, 1.3];
    const epsilon = nozzleExpansibility(b, k);
    const curvature = (x: number) => (1 - epsilon(x) - slope(b, k) * x) / (x * x);
    expect(curvature(1e-5)).toBeCloseTo(curvature(1e-3), 2);
  });
});

describe('expansibility of orifice plates', () => {
  it('is 1 without a differential, and falls by (0.351 + 0.256 b^4 + 0.93 b^8) x / kappa at first', () => {
    const epsilon = orificeExpansibility(0.5, 1.4);
    expect(epsilon(0)).toBe(1);
    expect((1 - epsilon(1e-8)) / 1e-8).toBeCloseTo((0.351 + 0.256 / 16 + 0.93 / 256) / 1.4, 6);
  });
});

describe('both forms', () => {
  it('refuse a differential that is no share of the upstream pressure', () => {
    for (const form of [nozzleExpansibility, orificeExpansibility]) {
      for (const x of [-0.01, 1, Number.NaN]) expect(() => form(0.5, 1.3)(x)).toThrow(/expected 0 <= dp\/p1 < 1, got/);
    }
  });
});
