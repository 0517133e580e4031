import { describe, expect, it } from 'vitest';
import { averagingPitot } from '../../../src/core/element/averaging-pitot.ts';
import { calibrated, calibrationRange } from '../../../src/core/element/shared/calibration.ts';
import { geometry, lossShareOf, primary } from './primaries.ts';

const rows = [
  { reynolds: 1e5, coefficient: 0.99 },
  { reynolds: 1e6, coefficient: 1.0 },
  { reynolds: 4e6, coefficient: 0.998 },
];
const at = geometry(0.1, 0.5);

describe('a calibrated primary', () => {
  const C = calibrated(primary('venturi-tube.machined'), [...rows].reverse()).discharge(at);

  it('gives the points as measured and is linear in ln Re_D between them', () => {
    for (const { reynolds, coefficient } of rows) expect(C(reynolds)).toBe(coefficient);
    expect(C(Math.sqrt(1e5 * 1e6))).toBeCloseTo(0.995, 14);
    expect(C(2e6)).toBeCloseTo(0.999, 14);
  });

  it('holds the end values outside and covers its own range', () => {
    expect([C(1e3), C(1e8)]).toEqual([0.99, 0.998]);
    expect(calibrationRange(rows)).toEqual({ min: 1e5, max: 4e6 });
  });

  it('is a constant with one row', () => {
    const one = calibrated(primary('orifice-plate.flange'), [{ reynolds: 2e5, coefficient: 0.61 }]);
    expect([1e3, 2e5, 1e8].map(one.discharge(at))).toEqual([0.61, 0.61, 0.61]);
    expect(one.working.coefficient(at, 1e6)).toMatchObject({ value: 0.61, remark: 'calibration-constant' });
  });

  it('leaves all but the coefficient as the standard has it', () => {
    const plain = primary('isa-1932-nozzle');
    const meter = calibrated(plain, rows);
    expect(meter.limits(at, 1e5)).toEqual(plain.limits(at, 1e5));
    expect(meter.name).toBe(plain.name);
    expect(lossShareOf(meter, at, 0.98, 1e5)).toBe(lossShareOf(plain, at, 0.98, 1e5));
  });

  it('of an averaging pitot replaces K, under its symbol', () => {
    const bar = calibrated(averagingPitot.primary({}), rows);
    expect(bar.discharge(at)(1e5)).toBe(0.99);
    const { symbol, formula } = bar.working.coefficient(at, 2e5);
    expect([symbol, formula]).toEqual(['K', 'K_1 + (K_2 - K_1) * ln(Re_D / Re_1) / ln(Re_2 / Re_1)']);
  });

  it('throws a defect for rows that input must have refused', () => {
    const bad = [
      [],
      [{ reynolds: 0, coefficient: 1 }],
      [{ reynolds: 1e5, coefficient: Number.NaN }],
      [rows[0], rows[0]],
    ];
    for (const list of bad as (typeof rows)[])
      expect(() => calibrated(primary('venturi-nozzle'), list)).toThrow(/expected rows/);
  });
});
