/** The standard atmosphere and normal gravity of a place. */
import { describe, expect, it } from 'vitest';
import { normalGravity, standardAtmosphere } from '../../../src/core/quantity/place.ts';

const air = (z: number) => {
  const found = standardAtmosphere(z, 'site.altitude');
  if (!found.ok) throw new Error(`expected an atmosphere at ${z} m, got ${found.problems[0].code}`);
  return found.value;
};

describe('the standard atmosphere', () => {
  it('begins at sea level and thins upwards without a step', () => {
    expect(air(0)).toMatchObject({ pressure: 101325, temperature: 288.15 });
    const pressures = Array.from({ length: 500 }, (_, index) => air(-4900 + 100 * index).pressure);
    pressures.slice(1).forEach((p, index) => {
      const before = pressures[index] ?? 0;
      expect(p).toBeLessThan(before);
      expect(p).toBeGreaterThan(before * 0.98);
    });
    for (const foot of [0, 11019.07, 20063.12, 32161.9])
      expect(air(foot + 0.005).pressure / air(foot - 0.005).pressure).toBeCloseTo(1, 5);
  });

  it('refuses what lies outside', () => {
    for (const z of [-6000, 60000, 1e12, -1e12, Number.NaN, Number.POSITIVE_INFINITY])
      expect(standardAtmosphere(z, 'site.altitude')).toMatchObject({
        ok: false,
        problems: [{ code: 'altitude-out-of-range', field: 'site.altitude' }],
      });
  });
});

describe('normal gravity', () => {
  it('grows from equator to pole and is alike north and south', () => {
    const degrees = Array.from({ length: 91 }, (_, latitude) => normalGravity((latitude * Math.PI) / 180));
    expect([...degrees].sort((one, other) => one - other)).toEqual(degrees);
    expect(normalGravity(-0.7)).toBe(normalGravity(0.7));
    expect((degrees[90] ?? 0) / (degrees[0] ?? 1) - 1).toBeCloseTo(0.0053, 4); // Clairaut: 0.53 %
  });

  it('falls by 3.086e-6 per second squared for each metre', () => {
    expect(normalGravity(0.785, 1000) - normalGravity(0.785)).toBeCloseTo(-3.086e-3, 5);
  });
});
