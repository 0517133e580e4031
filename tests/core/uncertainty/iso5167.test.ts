import { describe, expect, test } from 'vitest';
import { bored, solved, steam, water } from '../sample.ts';

/** A gas meter with a published budget: 500 mm pipe, 300 mm bore, 50 kPa, 48.7 kg/m3, C 0.6, 100.0 kg/s. */
const published = {
  fluid: { kind: 'stated', density: '48.7 kg/m3', viscosity: '0.011 mPa.s', isentropicExponent: 1.3 },
  upstream: { pressure: '65 bar(a)', temperature: '20 degC' },
  pipe: { bore: '500 mm' },
  element: {
    kind: 'orifice-plate',
    tappings: 'flange',
    bore: '300 mm',
    calibration: [{ reynolds: 1e6, coefficient: 0.6 }],
  },
  differential: '50 kPa',
  find: 'flow',
  uncertainty: { pipe: '0.02312 %', bore: '0.003854 %', differential: '0.2 % of reading', density: '0.3 %' },
} as const;

describe('against a published orifice budget (course notes on testing and measurement, k = 2)', () => {
  const point = solved(published).points.maximum;
  const share = (name: string) =>
    point?.uncertainty.terms.find((term) => term.name === name)?.percentOfFlow ?? Number.NaN;

  test('the flow, printed 100.0 kg/s', () => expect(Math.abs((point?.massFlow_kg_s ?? 0) - 100)).toBeLessThan(0.1));

  /** Contributions are printed for k = 1 in kg/s at 100 kg/s: twice that is percent of flow at 95 %. */
  test.each([
    ['pipe', 0.0035, 0.0001],
    ['bore', 0.0044, 0.0001],
    ['differential', 0.05, 0.0005],
    ['density', 0.075, 0.0005],
  ])('%s contributes %s kg/s', (name, contribution, tolerance) => {
    expect(Math.abs(share(name) / 2 - contribution)).toBeLessThanOrEqual(tolerance);
  });
});

test('the terms of ISO 5167-1:2003, 8.2.2.1, Eq (3), worked by hand at beta 0.6', () => {
  // U_C 0.5, U_eps 0, U_D 0.4, U_d 0.07, U_dp 0.3, U_rho 0.2 make 0.57 %
  const meter = {
    ...published,
    fluid: { kind: 'stated', density: '998 kg/m3', viscosity: '1 mPa.s' },
    element: { kind: 'orifice-plate', tappings: 'corner', bore: '300 mm' },
    uncertainty: { pipe: '0.4 %', bore: '0.07 %', differential: '0.3 % of reading', density: '0.2 %' },
  };
  const b4 = 0.6 ** 4;
  const hand = Math.hypot(0.5, ((2 * b4) / (1 - b4)) * 0.4, (2 / (1 - b4)) * 0.07, 0.15, 0.1);
  expect(hand).toBeCloseTo(0.57, 2);
  expect(solved(meter).points.maximum?.uncertainty.expanded_percent).toBeCloseTo(hand, 12);
});

describe('what is not stated', () => {
  test('pipe and bore take the allowance of the standard, the others are left out, and the working says so', () => {
    const { points } = solved(water);
    const terms = Object.fromEntries(
      points.maximum?.uncertainty.terms.map(({ name, percentOfFlow }) => [name, percentOfFlow]) ?? [],
    );
    const b4 = bored(water).diameterRatio ** 4;
    expect(terms.pipe).toBeCloseTo(((2 * b4) / (1 - b4)) * 0.4, 12);
    expect(terms.bore).toBeCloseTo((2 / (1 - b4)) * 0.1, 12);
    expect([terms.differential, terms.density, terms.epsilon]).toEqual([0, 0, 0]);
    expect(points.maximum?.working.find(({ id }) => id === 'uncertainty')?.remark).toBe(
      'uncertainty-allowance-and-gaps',
    );
  });
});

test('the small pipe adds its part to C: 0.9 (0.75 - beta)(2.8 - D/25.4), ISO 5167-2:2003, 5.3.3.1', () => {
  const parts = (bore: string, pipe: string) =>
    Object.fromEntries(
      solved({
        ...water,
        pipe: { bore: pipe },
        element: { ...water.element, bore, material: undefined },
      }).points.maximum?.uncertainty.parts.map(({ name, percentOfC }) => [name, percentOfC]) ?? [],
    );
  expect(parts('25.4 mm', '50.8 mm')).toEqual({ base: 0.5, 'small-pipe': expect.closeTo(0.9 * 0.25 * 0.8, 12) });
  expect(parts('50 mm', '100 mm')).toEqual({ base: 0.5 });
});

test('steam has a term of the expansibility: 2 dp/p1, ISO 5167-3:2003, 5.1.7.2', () => {
  const { points, state } = solved(steam);
  const epsilon = points.maximum?.uncertainty.terms.find(({ name }) => name === 'epsilon')?.percentOfFlow;
  expect(epsilon).toBeCloseTo((2 * 50000) / state.pressure_Pa, 12);
});

describe('what the figure leaves out', () => {
  const open = (meter: object) => solved(meter).points.minimum?.uncertainty.open;
  const stated = { differential: '0.1 % of span', density: '0.2 %' };
  test('is named: unstated terms, flows outside the Reynolds numbers, straight pipe too short', () => {
    expect(open(water)).toEqual(['differential', 'density']);
    expect(open({ ...water, uncertainty: stated })).toEqual([]);
    expect(open({ ...water, uncertainty: stated, duty: { minimum: '0.3 t/h' } })).toEqual(['reynolds-pipe']);
    const short = { fitting: 'single-bend', before: '3 D', after: '8 D' };
    expect(open({ ...water, uncertainty: stated, installation: short })).toEqual(['straight-length']);
  });
});
