import { describe, expect, it } from 'vitest';
import { fixedPoint } from '../../../src/core/numeric/fixed-point.ts';
import { root } from '../../../src/core/numeric/root.ts';
import { generator } from '../../laws/random.ts';

describe('a point that a function maps to itself', () => {
  it('is found with the evaluations and the answer of the bracketed search', () => {
    const random = generator(3);
    for (let turn = 0; turn < 2000; turn += 1) {
      const [limit, rise, power] = [0.5 + random(), 0.03 * random(), 0.1 + random()];
      const g = (x: number) => limit + rise * x ** -power;
      const found = fixedPoint(g, 0.606);
      const proved = root({ f: (x) => x - g(x), lower: 1e-3, upper: 1e3, start: 0.606, slope: 1 });
      if (!proved.found) throw new Error(`turn ${turn}: expected a root, got none`);
      if (found === undefined) {
        expect(proved.evaluations).toBeGreaterThan(4);
        continue;
      }
      expect(Math.abs(found.x - g(found.x)) / found.x).toBeLessThan(1e-13);
      expect(found.evaluations).toBe(proved.evaluations);
      expect(Math.abs(found.x / proved.x - 1)).toBeLessThan(1e-15);
    }
  });

  it('needs two evaluations where the function is a constant', () => {
    expect(fixedPoint(() => 0.984, 1)).toEqual({ x: 0.984, evaluations: 2 });
  });

  it.each([
    ['moves as fast as its argument', (x: number) => 2 * x - 0.5],
    ['jumps', (x: number) => (x > 0.6 ? 0.5 : 0.9)],
  ])('is not claimed where the function %s', (_, g) => {
    expect(fixedPoint(g, 0.606)).toBeUndefined();
  });
});
