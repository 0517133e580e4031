import { describe, expect, test } from 'vitest';
import { bored, refusal, solved, steam, water } from '../sample.ts';

describe('refused, with the reason', () => {
  test('a bore as wide as its pipe', () => {
    expect(refusal({ ...water, element: { ...water.element, bore: '102.26 mm', material: 'carbon-steel' } })).toEqual([
      'bore-not-below-pipe at element.bore',
    ]);
  });
  test('a steam flow that needs more than a quarter of the pressure', () => {
    expect(refusal({ ...steam, find: 'differential', duty: { maximum: '250 t/h' } })).toEqual([
      'differential-too-large at duty.maximum',
    ]);
    expect(refusal({ ...steam, find: 'differential', duty: { maximum: '120 t/h', normal: '250 t/h' } })).toEqual([
      'differential-too-large at duty.normal',
    ]);
  });
  test('a liquid differential as large as the pressure', () => {
    expect(refusal({ ...water, find: 'differential', duty: { maximum: '600 t/h' } })).toEqual([
      'differential-exceeds-pressure at duty.maximum',
    ]);
    expect(refusal({ ...water, differential: '9 bar' })).toEqual(['differential-exceeds-pressure at differential']);
    expect(refusal({ ...water, find: 'bore', differential: '9 bar' })).toEqual([
      'differential-exceeds-pressure at differential',
    ]);
  });
  test('no bore is large or small enough', () => {
    expect(refusal({ ...water, find: 'bore', differential: '1 mbar', duty: { maximum: '90 t/h' } })).toEqual([
      'bore-too-large at differential',
    ]);
    expect(refusal({ ...water, find: 'bore', duty: { maximum: '1 kg/h' } })).toEqual([
      'bore-too-small at differential',
    ]);
  });
});

describe('a gas that would have to pass the speed of sound', () => {
  // (2/(k + 1))^(k/(k - 1)) is 0.5283 for k = 1.4: any text on gas dynamics
  const air = {
    ...steam,
    fluid: { kind: 'stated', density: '10 kg/m3', viscosity: '0.018 mPa.s', isentropicExponent: 1.4 },
    upstream: { pressure: '10 bar(a)', temperature: '20 degC' },
  };
  test('is refused just beyond the critical ratio, for flow and for bore', () => {
    expect(refusal({ ...air, duty: {}, differential: '4.71 bar' })).toEqual([]);
    expect(refusal({ ...air, duty: {}, differential: '4.72 bar' })).toEqual([
      'differential-beyond-critical at differential',
    ]);
    const sized = { ...air, find: 'bore', duty: { maximum: '8 t/h' }, differential: '5 bar' };
    expect(refusal(sized)).toEqual(['differential-beyond-critical at differential']);
  });
});

describe('what is given may lie outside the standard and is solved all the same', () => {
  test('a span beyond a quarter of the pressure carries the flows below it', () => {
    const result = solved({ ...steam, differential: '14 bar', duty: { normal: '207 t/h' } });
    expect(result.points.maximum?.differential_Pa).toBeCloseTo(14e5, 3);
    expect(result.points.normal?.differential_Pa).toBeGreaterThan(0.25 * result.state.pressure_Pa);
  });
  test('a diameter ratio of 0.9', () => {
    expect(solved({ ...water, element: { ...water.element, bore: '92 mm' } }).diameterRatio).toBeGreaterThan(0.89);
  });
});

describe('metal', () => {
  test('the found bore is told as measured and at the line temperature', () => {
    const result = bored({ ...water, find: 'bore' });
    const growth = result.bore_m / result.boreAsMeasured_m - 1;
    expect(growth).toBeCloseTo(16e-6 * 65, 9); // 316, EN 10088-1: 16.0e-6/K up to 100 degC
    const again = solved({ ...water, element: { ...water.element, bore: `${result.boreAsMeasured_m} m` } });
    expect(again.points.maximum?.massFlow_kg_s).toBeCloseTo(60000 / 3600, 9);
  });
  test('without a material nothing grows', () => {
    const result = solved({
      ...water,
      pipe: { bore: '102.26 mm' },
      element: { ...water.element, material: undefined },
    });
    expect([result.bore_m, result.pipe_m]).toEqual([result.boreAsMeasured_m, result.pipeAsMeasured_m]);
  });
  test('a bore measured hot is brought back through 20 degC', () => {
    const cold = bored({ ...water, element: { ...water.element, measuredAt: '20 degC' } });
    const hot = solved({ ...water, element: { ...water.element, bore: `${cold.bore_m} m`, measuredAt: '85 degC' } });
    expect(hot.bore_m).toBeCloseTo(cold.bore_m, 15);
  });
});

test('the duty points other than the found one are those of the element as it stands', () => {
  const sized = solved({ ...water, find: 'bore' });
  const stands = solved({
    ...water,
    find: 'differential',
    element: { ...water.element, bore: `${sized.boreAsMeasured_m} m` },
  });
  for (const name of ['maximum', 'normal', 'minimum'] as const) {
    expect(sized.points[name]?.differential_Pa).toBeCloseTo(stands.points[name]?.differential_Pa ?? 0, 6);
  }
});
