import { describe, expect, it } from 'vitest';
import {
  expansionKnown,
  grow,
  growthWorking,
  materialOf,
  meanExpansion,
} from '../../../src/core/element/shared/growth.ts';
import { materials } from '../../../src/core/element/shared/materials.table.ts';
import type { Length, Temperature } from '../../../src/core/quantity/kinds.ts';

const celsius = (t: number): Temperature => (t + 273.15) as Temperature;
const length = (l: number): Length => l as Length;
function material(key: string) {
  const found = materialOf(key);
  if (found === undefined) throw new Error(`expected the material ${key}`);
  return found;
}

describe('the mean expansion', () => {
  it('is the figure of the table at its temperatures, linear between and held outside', () => {
    const steel = material('stainless-304'); // EN 10088-1
    expect(meanExpansion(steel, celsius(200))).toBeCloseTo(16.5e-6, 15);
    expect(meanExpansion(steel, celsius(250))).toBeCloseTo(16.75e-6, 15);
    expect(meanExpansion(steel, celsius(40))).toBe(16e-6);
    expect(meanExpansion(steel, celsius(600))).toBeCloseTo(18e-6, 15);
    expect(expansionKnown(steel, celsius(40))).toBe(true);
    expect(expansionKnown(steel, celsius(600))).toBe(false);
    expect(expansionKnown(steel, celsius(-20))).toBe(false);
  });

  it('has rising temperatures and plausible figures in every row', () => {
    expect(materials).toHaveLength(24);
    expect(new Set(materials.map((one) => one.key)).size).toBe(24);
    for (const { key, celsius: at, expansion } of materials) {
      expect(at, key).toHaveLength(expansion.length);
      expect(
        [...at].sort((a, b) => a - b),
        key,
      ).toEqual(at);
      for (const figure of expansion) expect(figure, key).toBeGreaterThan(5);
    }
  });

  it('knows no material by the name of a property of every object', () => {
    expect(materialOf('constructor')).toBeUndefined();
  });
});

describe('growth', () => {
  it('agrees with figures worked by hand', () => {
    // 102.26 (1 + 12.06e-6 x 73.33) and 100 (1 + 16.75e-6 x 230)
    expect(grow(length(0.10226), material('carbon-steel'), celsius(20), celsius(93.33))).toBeCloseTo(0.1023504346, 10);
    expect(grow(length(0.1), material('stainless-304'), celsius(20), celsius(250))).toBeCloseTo(0.10038525, 12);
  });

  it('passes through 20 degC when the length was measured at another temperature', () => {
    const steel = material('stainless-316');
    const cold = grow(length(0.05), steel, celsius(5), celsius(20));
    expect(cold).toBeCloseTo(0.05 / (1 - 15 * 16e-6), 15);
    expect(grow(length(0.05), steel, celsius(5), celsius(300))).toBeCloseTo(
      grow(cold, steel, celsius(20), celsius(300)),
      15,
    );
  });

  it('is undone by the way back, and nothing at the same temperature', () => {
    const steel = material('duplex');
    const there = grow(length(0.2), steel, celsius(15), celsius(180));
    expect(grow(there, steel, celsius(180), celsius(15))).toBeCloseTo(0.2, 15);
    expect(grow(length(0.2), steel, celsius(180), celsius(180))).toBe(0.2);
  });

  it('says in its working when the table does not reach the line temperature', () => {
    const given = { symbol: 'd', words: 'element-bore', length: length(0.05), measuredAt: celsius(20) };
    const steel = material('stainless-410');
    expect(growthWorking({ ...given, material: steel, line: celsius(380) })).not.toHaveProperty('remark');
    expect(growthWorking({ ...given, material: steel, line: celsius(500) })).toMatchObject({
      remark: 'expansion-held',
    });
  });
});
