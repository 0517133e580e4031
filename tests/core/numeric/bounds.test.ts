import { expect, test } from 'vitest';
import { isInside } from '../../../src/core/numeric/bounds.ts';

test('a figure on its bound is inside, one beyond rounding is not', () => {
  expect(isInside(0.1 + 0.2, { max: 0.3 })).toBe(true); // 0.30000000000000004
  expect(isInside(-0.1 - 0.2, { min: -0.3 })).toBe(true);
  expect(isInside(0.3 * (1 + 2e-12), { max: 0.3 })).toBe(false);
  expect(isInside(0.3 * (1 - 2e-12), { min: 0.3 })).toBe(false);
  expect(isInside(-1e-300, { min: 0 })).toBe(false);
});

test('a bound that is absent bounds nothing', () => {
  expect(isInside(1e300, { min: 1 })).toBe(true);
  expect(isInside(-1e300, { max: 1 })).toBe(true);
  expect(isInside(0, {})).toBe(true);
});

test('what is no number is never inside', () => {
  expect(isInside(Number.NaN, {})).toBe(false);
  expect(isInside(Number.NaN, { min: 0, max: 1 })).toBe(false);
});
