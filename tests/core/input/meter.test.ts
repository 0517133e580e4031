import { describe, expect, test } from 'vitest';
import { refusal, solved, water } from '../sample.ts';

const pressureOf = (meter: object, project = {}) => solved({ ...water, ...meter }, project).state.pressure_Pa;

describe('pressure', () => {
  test('gauge stands on the atmosphere of the site', () => {
    expect(pressureOf({})).toBe(801325);
    expect(pressureOf({}, { site: { atmosphere: '84.5 kPa(a)' } })).toBe(784500);
    expect(pressureOf({ upstream: { pressure: '7 bar(a)', temperature: '85 degC' } })).toBe(700000);
  });

  test('without (a) or (g) it is a problem, never a guess', () => {
    expect(refusal({ ...water, upstream: { pressure: '7 bar', temperature: '85 degC' } })).toEqual([
      'pressure-reference-missing at upstream.pressure',
    ]);
  });

  test('vacuum is a problem', () => {
    expect(refusal({ ...water, upstream: { pressure: '-1.02 bar(g)', temperature: '85 degC' } })).toEqual([
      'not-above-vacuum at upstream.pressure',
    ]);
  });
});

describe('what is to be found is not read', () => {
  test('a bore that cannot be read does not hinder finding the bore', () => {
    expect(refusal({ ...water, find: 'bore', element: { ...water.element, bore: 'nonsense' } })).toEqual([]);
  });
  test('nor a maximum flow when the flow is found, nor a differential when the differential is found', () => {
    expect(refusal({ ...water, find: 'flow', duty: { maximum: '1' } })).toEqual([]);
    expect(refusal({ ...water, find: 'differential', differential: '1' })).toEqual([]);
  });
  test('an unknown that is not named is a problem', () => {
    expect(refusal({ ...water, find: undefined })).toEqual(['field-missing at find']);
    expect(refusal({ ...water, find: 'diameter' })).toEqual(['choice-unknown at find']);
  });
});

test('every problem of a meter is told at once, with its path', () => {
  const meter = {
    find: 'bore',
    pipe: { bore: '-5 mm', material: 'unobtainium' },
    upstream: { pressure: '7 bar(a)', temperature: '85' },
    element: { kind: 'orifice-plate', tappings: 'side' },
    duty: { maximum: '60 furlongs' },
  };
  expect(refusal(meter).sort()).toEqual(
    [
      'choice-unknown at element.tappings',
      'choice-unknown at pipe.material',
      'field-missing at differential',
      'not-positive at pipe.bore',
      'unit-missing at upstream.temperature',
      'unit-unknown at duty.maximum',
    ].sort(),
  );
});

test('types are checked before texts are read', () => {
  expect(refusal({ ...water, pipe: 'DN 100' })).toEqual(['group-expected at pipe']);
  expect(refusal({ ...water, upstream: { pressure: 7, temperature: '85 degC' } })).toEqual([
    'text-expected at upstream.pressure',
  ]);
  expect(refusal({ ...water, element: { ...water.element, calibration: 'none' } })).toEqual([
    'list-expected at element.calibration',
  ]);
  expect(refusal([])).toEqual(['group-expected at ']); // a list is no group
});

describe('flows', () => {
  const found = (maximum: string) => solved({ ...water, find: 'differential', duty: { maximum } });
  test('mass, actual volume and base volume of one flow make one differential', () => {
    const mass = found('60 t/h');
    const density = mass.state.density_kg_m3;
    const base = mass.state.baseDensity_kg_m3 ?? Number.NaN;
    for (const text of [`${60000 / density} m3/h`, `${60000 / base} base m3/h`]) {
      expect(found(text).points.maximum?.differential_Pa).toBeCloseTo(mass.points.maximum?.differential_Pa ?? 0, 6);
    }
  });
  test('a fluid without a base volume refuses one', () => {
    const stated = { kind: 'stated', density: '900 kg/m3', viscosity: '1 cP' };
    expect(refusal({ ...water, fluid: stated, find: 'differential', duty: { maximum: '60 base m3/h' } })).toEqual([
      'base-density-missing at duty.maximum',
    ]);
  });
});

describe('calibration rows', () => {
  const rows = (calibration: object[]) => refusal({ ...water, element: { ...water.element, calibration } });
  test('rise in Reynolds number and are complete', () => {
    expect(
      rows([
        { reynolds: 1e5, coefficient: 0.6 },
        { reynolds: '2e5', coefficient: '0.61' },
      ]),
    ).toEqual([]);
    expect(
      rows([
        { reynolds: 2e5, coefficient: 0.6 },
        { reynolds: 1e5, coefficient: 0.6 },
      ]),
    ).toEqual(['calibration-order at element.calibration.1.reynolds']);
    expect(rows([{ reynolds: 2e5 }])).toEqual(['field-missing at element.calibration.0.coefficient']);
    expect(rows([{ reynolds: -1, coefficient: 0.6 }])).toEqual(['not-positive at element.calibration.0.reynolds']);
  });
});

describe('uncertainty of the differential', () => {
  const stated = (differential: string) => ({ ...water, uncertainty: { differential } });
  const share = (differential: string) =>
    solved(stated(differential)).points.minimum?.uncertainty.terms.find(({ name }) => name === 'differential')
      ?.percentOfFlow;
  test('of span grows as the differential falls, of reading does not, a pressure is itself', () => {
    const point = solved(water).points.minimum;
    const fraction = 25000 / (point?.differential_Pa ?? Number.NaN);
    expect(share('0.1 % of span')).toBeCloseTo(0.05 * fraction, 12);
    expect(share('0.1 % of reading')).toBeCloseTo(0.05, 12);
    expect(share('25 Pa')).toBeCloseTo(0.05 * fraction, 12);
  });
  test('a share must say of what', () =>
    expect(refusal(stated('0.1 %'))).toEqual(['share-basis-missing at uncertainty.differential']));
  test('a negative one is refused', () =>
    expect(refusal(stated('-0.1 % of span'))).toEqual(['negative at uncertainty.differential']));
});

test('the site is read for every meter', () => {
  expect(refusal(water, { site: { atmosphere: '1 bar' } })).toEqual(['pressure-reference-missing at site.atmosphere']);
  expect(refusal(water, { base: { temperature: '15' } })).toEqual(['unit-missing at base.temperature']);
});
