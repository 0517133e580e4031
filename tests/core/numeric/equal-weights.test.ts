import { describe, expect, it, test } from 'vitest';
import { equalWeightNodes } from '../../../src/core/numeric/equal-weights.ts';

const real = [1, 2, 3, 4, 5, 6, 7, 9];

describe.each(real)('%s nodes', (n) => {
  const nodes = equalWeightNodes(n) ?? [];
  it('lie inside, in order, alike about the middle', () => {
    expect(nodes).toHaveLength(n);
    expect(nodes).toEqual([...nodes].sort((one, other) => one - other));
    nodes.forEach((node, at) => {
      expect(node).toBeGreaterThan(0);
      expect(node + (nodes.at(-1 - at) ?? 0)).toBeCloseTo(1, 14);
    });
  });
  it('give the mean of every power up to their number', () => {
    for (let power = 0; power <= n; power += 1) {
      const mean = nodes.reduce((sum, node) => sum + node ** power, 0) / n;
      expect(mean).toBeCloseTo(1 / (power + 1), 13);
    }
  });
});

test('Abramowitz and Stegun, Table 25.5, ten decimals on (-1, 1)', () => {
  const printed: Readonly<Record<number, readonly number[]>> = {
    2: [0.5773502692],
    3: [Math.SQRT1_2, 0], // printed 0.7071067812
    4: [0.7946544723, 0.1875924741],
    5: [0.832497487, 0.3745414096, 0],
    6: [0.8662468181, 0.4225186538, 0.2666354015],
    7: [0.8838617008, 0.5296567753, 0.3239118105, 0],
    9: [0.9115893077, 0.6010186554, 0.5287617831, 0.1679061842, 0],
  };
  for (const [n, offsets] of Object.entries(printed)) {
    const nodes = equalWeightNodes(Number(n)) ?? [];
    const upper = nodes.map((node) => 2 * node - 1).filter((offset) => offset > -1e-12);
    [...offsets].reverse().forEach((offset, at) => {
      expect(Math.abs((upper[at] ?? 9) - offset), `${n}`).toBeLessThan(1e-10);
    });
  }
});

test('8 and more than 9 have no real set; a count that is none is a defect', () => {
  for (const n of [8, 10, 11, 20]) expect(equalWeightNodes(n)).toBeUndefined();
  expect(() => equalWeightNodes(0)).toThrow('expected a count');
  expect(() => equalWeightNodes(2.5)).toThrow('expected a count');
});
