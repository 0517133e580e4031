import { describe, expect, it } from 'vitest';
import {
  chebyshevCoefficients,
  chebyshevPoints,
  chebyshevSum,
  chebyshevTable,
  chebyshevTableSum,
  powersOf,
} from '../../../src/core/numeric/chebyshev.ts';
import { generator } from '../../laws/random.ts';

describe('a polynomial through Chebyshev points', () => {
  it('is the polynomial itself where the function is one', () => {
    const f = (u: number) => 3 - 2 * u + 5 * u ** 3;
    const coefficients = chebyshevCoefficients(chebyshevPoints(6, -1, 1).map(f));
    expect(powersOf(coefficients).map((c) => Math.round(c * 1e12) / 1e12 + 0)).toEqual([3, -2, 0, 5, 0, 0]);
    for (const u of [-1, -0.3, 0, 0.7, 1]) expect(chebyshevSum(coefficients, u)).toBeCloseTo(f(u), 13);
  });

  it('has the coefficients of the exponential function, which are Bessel functions', () => {
    const coefficients = chebyshevCoefficients(chebyshevPoints(16, -1, 1).map(Math.exp));
    const known = [1.2660658777520082, 2 * 0.565159103992485, 2 * 0.1357476697670383]; // I_0(1), 2 I_1(1), 2 I_2(1): DLMF 10.32
    known.forEach((value, k) => {
      expect(coefficients[k]).toBeCloseTo(value, 13);
    });
  });

  it('stands through one point as a constant', () => {
    expect(chebyshevPoints(1, 3, 5)).toEqual([4]);
    expect(chebyshevSum(chebyshevCoefficients([7]), 0.4)).toBe(7);
  });

  it('follows a smooth function of two variables to rounding', () => {
    const f = (u: number, v: number) => Math.exp(u * v) / (3 + u - v);
    const [us, vs] = [chebyshevPoints(28, -1, 1), chebyshevPoints(28, -1, 1)];
    const table = chebyshevTable(us.map((u) => vs.map((v) => f(u, v))));
    const random = generator(5);
    for (let turn = 0; turn < 200; turn += 1) {
      const [u, v] = [2 * random() - 1, 2 * random() - 1];
      expect(Math.abs(chebyshevTableSum(table, u, v) / f(u, v) - 1)).toBeLessThan(1e-12);
    }
  });
});
