import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { root } from '../../../src/core/numeric/root.ts';

describe('a root inside the bracket', () => {
  test('is found to the last bits where the function is as straight as a meter equation', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.3, max: 1.2, noNaN: true }),
        fc.double({ min: -0.3, max: 0.3, noNaN: true }),
        (x, bend) => {
          const curve = (t: number) => t * (1 + bend * 0.1 * t);
          const found = root({ f: (t) => curve(t) - curve(x), lower: 0, upper: 2, start: 0.6, slope: 1 });
          expect(Math.abs((found.found ? found.x : Number.NaN) / x - 1)).toBeLessThan(2e-15);
        },
      ),
    );
  });

  test('is found of powers, far from straight as they are', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.05, max: 20, noNaN: true }), fc.integer({ min: 1, max: 7 }), (x, power) => {
        const found = root({ f: (t) => t ** power - x ** power, lower: 0, upper: 100, start: 1, slope: 1 });
        expect(Math.abs((found.found ? found.x : Number.NaN) / x - 1)).toBeLessThan(1e-9);
      }),
    );
  });

  test('far from the start a small step by the slope given there does not end the search', () => {
    const x = 0.05075155053481543; // the seventh power rises there by 1e-7 of the slope that is given
    const found = root({ f: (t) => t ** 7 - x ** 7, lower: 0, upper: 100, start: 1, slope: 1 });
    expect(Math.abs((found.found ? found.x : Number.NaN) / x - 1)).toBeLessThan(1e-11);
  });

  test('no point outside the bracket is ever evaluated', () => {
    const seen: number[] = [];
    const f = (x: number) => {
      seen.push(x);
      return Math.log(x); // not a number below zero
    };
    const found = root({ f, lower: 1e-9, upper: 1e9, start: 5e8, slope: 1e-9 });
    expect(found).toMatchObject({ found: true });
    expect(Math.min(...seen)).toBeGreaterThanOrEqual(1e-9);
    expect(Math.max(...seen)).toBeLessThanOrEqual(1e9);
  });

  test('a wrong slope costs evaluations, not the root', () => {
    const found = root({ f: (x) => Math.expm1(x - 3), lower: -50, upper: 50, start: 40, slope: 1e-6 });
    expect(found.found ? found.x : Number.NaN).toBeCloseTo(3, 12);
  });

  test('a jump through zero ends at the jump', () => {
    const found = root({ f: (x) => (x < 2 ? -1 : 1), lower: 0, upper: 5, start: 1, slope: 1 });
    expect(found.found ? found.x : found.lower).toBeCloseTo(2, 9);
  });

  test('an exact zero is taken at once', () => {
    expect(root({ f: (x) => x - 4, lower: 0, upper: 9, start: 4, slope: 1 })).toEqual({
      found: true,
      x: 4,
      evaluations: 1,
    });
  });
});

describe('no root inside the bracket', () => {
  test('it says on which side it lies', () => {
    const search = { lower: 0, upper: 1, start: 0.5, slope: 1 };
    expect(root({ ...search, f: (x) => x - 2 })).toMatchObject({ found: false, side: 'above', lower: 0, upper: 1 });
    expect(root({ ...search, f: (x) => x + 2 })).toMatchObject({ found: false, side: 'below', lower: 0, upper: 1 });
  });

  test('a start on the end of the bracket does not close it', () => {
    const search = { lower: 0, upper: 1, slope: 1 };
    expect(root({ ...search, start: 1, f: (x) => x - 2 })).toMatchObject({ found: false, side: 'above' });
    expect(root({ ...search, start: 0, f: (x) => x + 2 })).toMatchObject({ found: false, side: 'below' });
    expect(root({ ...search, start: 1, f: (x) => x - 0.3 })).toMatchObject({ found: true });
  });

  test('a root on an end of the bracket is a root', () => {
    expect(root({ f: (x) => x - 1, lower: 0, upper: 1, start: 0.2, slope: 0.1 })).toMatchObject({ found: true, x: 1 });
  });
});

test('a function without a number is a defect', () => {
  expect(() => root({ f: () => Number.NaN, lower: 0, upper: 1, start: 0.5, slope: 1 })).toThrow(/expected a number/);
});
