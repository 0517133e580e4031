/** Compensated sums against whole numbers, which lose nothing. */
import { expect, test } from 'vitest';
import { add, addAll, sumOf, sums } from '../../../src/core/numeric/neumaier.ts';

test('terms that swallow each other in a plain sum are kept', () => {
  const all = sums(2);
  for (const term of [1, 1e100, 1, -1e100]) add(all, 1, term);
  expect(sumOf(all, 1)).toBe(2);
  expect(sumOf(all, 0)).toBe(0);
});

test('a million tenths are a hundred thousand, as no plain sum has it', () => {
  const all = sums(1);
  let plain = 0;
  for (let term = 0; term < 1e6; term += 1) {
    add(all, 0, 0.1);
    plain += 0.1;
  }
  expect(sumOf(all, 0)).toBe(1e5);
  expect(plain).not.toBe(1e5);
});

test('sums of parts add up to the sum of the whole', () => {
  const terms = Array.from({ length: 1000 }, (_, at) => Math.sin(at) * 10 ** (at % 17));
  const [whole, front, back] = [sums(1), sums(1), sums(1)];
  for (const [at, term] of terms.entries()) {
    add(whole, 0, term);
    add(at < 300 ? front : back, 0, term);
  }
  addAll(front, back);
  expect(sumOf(front, 0)).toBe(sumOf(whole, 0));
});
