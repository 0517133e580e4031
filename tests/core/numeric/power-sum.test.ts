import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { collapse, powerSum, type Term } from '../../../src/core/numeric/power-sum.ts';

const term = fc.tuple(
  fc.integer({ min: 0, max: 32 }),
  fc.integer({ min: -41, max: 58 }),
  fc.double({ min: -9, max: 9, noNaN: true }),
);
const terms = fc.array(term, { minLength: 1, maxLength: 12 }) as fc.Arbitrary<Term[]>;
const base = fc.double({ min: 0.5, max: 2, noNaN: true });

/** The same sum term by term with the library power, and the sum of its magnitudes as the yardstick of rounding. */
function plain(rows: readonly Term[], of: (i: number, j: number, n: number) => number) {
  const parts = rows.map(([i, j, n]) => of(i, j, n));
  return { sum: parts.reduce((a, b) => a + b, 0), size: parts.reduce((a, b) => a + Math.abs(b), 1e-250) };
}

describe('a sum of powers', () => {
  it('equals the sum and the derivatives formed term by term', () => {
    fc.assert(
      fc.property(terms, base, base, (rows, x, y) => {
        const { value, x: dx, xx, y: dy, yy, xy } = powerSum(rows).expand(x, y);
        const power = (i: number, j: number) => x ** i * y ** j;
        const expected = [
          [value, plain(rows, (i, j, n) => n * power(i, j))],
          [dx, plain(rows, (i, j, n) => n * i * power(i - 1, j))],
          [xx, plain(rows, (i, j, n) => n * i * (i - 1) * power(i - 2, j))],
          [dy, plain(rows, (i, j, n) => n * j * power(i, j - 1))],
          [yy, plain(rows, (i, j, n) => n * j * (j - 1) * power(i, j - 2))],
          [xy, plain(rows, (i, j, n) => n * i * j * power(i - 1, j - 1))],
        ] as const;
        for (const [got, { sum, size }] of expected) expect(Math.abs(got - sum)).toBeLessThanOrEqual(1e-13 * size);
      }),
    );
  });

  it('gives the slope alone as it gives it among all derivatives', () => {
    fc.assert(
      fc.property(terms, base, base, (rows, x, y) => {
        const { size } = plain(rows, (i, j, n) => n * i * x ** (i - 1) * y ** j);
        const sum = powerSum(rows);
        expect(Math.abs(sum.slope(x, y) - sum.expand(x, y).x)).toBeLessThanOrEqual(1e-14 * size);
      }),
    );
  });

  it('is the polynomial in x that is left once y is settled', () => {
    fc.assert(
      fc.property(terms, base, base, (rows, x, y) => {
        const { size } = plain(rows, (i, j, n) => n * x ** i * y ** j);
        const polynomial = collapse(rows)(y).reduce((sum, coefficient) => sum * x + coefficient, 0);
        expect(Math.abs(polynomial - powerSum(rows).expand(x, y).value)).toBeLessThanOrEqual(1e-13 * size);
      }),
    );
  });
});
