import { describe, expect, it } from 'vitest';
import { calibrated } from '../../../src/core/element/shared/calibration.ts';
import { growthWorking, materialOf } from '../../../src/core/element/shared/growth.ts';
import type { Length, Temperature } from '../../../src/core/quantity/kinds.ts';
import type { Working } from '../../../src/core/quantity/working.ts';
import { evaluate } from '../../../src/views/present/evaluate.ts';
import { parseFormula } from '../../../src/views/present/formula.ts';
import { geometry, lossShareOf, primaries } from './primaries.ts';

/** The formula, evaluated with what the working says was put in, gives the value it reports. */
function holds(working: Working, label: string): void {
  if (working.formula === undefined) {
    expect(working.given, label).toEqual([]);
    return;
  }
  const values = Object.fromEntries(working.given.map((one) => [one.symbol, one.value]));
  expect(Math.abs(evaluate(parseFormula(working.formula), values) / working.value - 1), label).toBeLessThan(1e-12);
}

const places = [0.06, 0.3].flatMap((pipe) => [0.3, 0.5, 0.72].map((ratio) => geometry(pipe, ratio)));

describe('the working', () => {
  it('of C is the C that is computed with, inside and outside the Reynolds range', () => {
    for (const one of primaries) {
      for (const at of places) {
        for (const reynolds of [5e3, 3e4, 1.7e5, 3e5, 1e6, 1e7]) {
          const working = one.working.coefficient(at, reynolds);
          holds(working, `${one.name}, ${reynolds}`);
          expect(working.value).toBe(one.discharge(at)(reynolds));
        }
      }
    }
  });

  it('of the expansibility is the factor that is computed with', () => {
    for (const one of primaries) {
      for (const kappa of [1, 1.3]) {
        for (const x of [0, 0.01, 0.2]) {
          const working = one.working.expansibility(0.55, kappa, x);
          holds(working, one.name);
          expect(working.value).toBe(one.expansibility(0.55, kappa)(x));
        }
      }
    }
  });

  it('of the loss is the share of the differential', () => {
    for (const one of primaries) {
      for (const at of places) {
        const working = one.working.loss?.(at, 0.7, 3e5, 25000);
        if (working === undefined) throw new Error(`expected a loss of ${one.name}, got none`);
        holds(working, one.name);
        expect(working.value).toBeCloseTo(25000 * lossShareOf(one, at, 0.7, 3e5), 8);
      }
    }
  });

  it('of thermal growth is the grown length, measured at 20 degC or elsewhere', () => {
    const material = materialOf('carbon-steel');
    if (material === undefined) throw new Error('expected carbon steel in the table');
    for (const measuredAt of [293.15, 283.15] as Temperature[]) {
      const given = { symbol: 'D', words: 'pipe-bore', length: 0.1 as Length, material, measuredAt };
      holds(growthWorking({ ...given, line: 473.15 as Temperature }), `measured at ${measuredAt}`);
    }
  });

  it('of a calibrated C is the interpolation, and says where a value is held', () => {
    const rows = [
      { reynolds: 2e5, coefficient: 0.993 },
      { reynolds: 1e5, coefficient: 0.991 },
    ];
    for (const one of primaries) {
      const meter = calibrated(one, rows);
      const at = geometry(0.1, 0.5);
      for (const [reynolds, remark] of [
        [5e4, 'calibration-held'],
        [1.4e5, 'calibration-interpolated'],
        [9e5, 'calibration-held'],
      ] as const) {
        const working = meter.working.coefficient(at, reynolds);
        holds(working, one.name);
        expect(working).toMatchObject({ remark, value: meter.discharge(at)(reynolds) });
      }
    }
  });
});

describe('what the Venturi tube cannot say in its formula', () => {
  const said = (variant: string, reynolds: number) =>
    primaries.find((one) => one.name === `venturi-tube.${variant}`)?.working.coefficient(geometry(0.2, 0.5), reynolds)
      .remark;

  it('stands in the remark', () => {
    expect(said('as-cast', 1e6)).toBeUndefined();
    expect(said('as-cast', 1.9e5)).toBe('venturi-annex-b');
    expect(said('as-cast', 1e4)).toBe('venturi-annex-b');
    expect(said('as-cast', 3e6)).toBe('venturi-held');
    expect(said('machined', 1e6)).toBe('venturi-machined-doubt');
    expect(said('machined', 1e5)).toBe('venturi-held');
  });
});
