import { describe, expect, test } from 'vitest';
import { ASSUMPTIONS } from '../../../src/core/check/check.ts';
import { bored, solved, steam, verdict, water } from '../sample.ts';

const withElement = (own: object, from = water) => ({ ...from, element: { ...from.element, ...own } });

describe('limits of the standard', () => {
  test('Reynolds number of a flange-tapped plate: 170 beta2 D, ISO 5167-2:2022, 5.3.1', () => {
    const at = (minimum: string) =>
      solved({ ...water, duty: { minimum } }).checks.filter(({ id }) => id === 'reynolds-pipe');
    const [limit] = at('12 t/h');
    const { diameterRatio, pipe_m } = bored(water);
    expect(limit?.limit.min).toBeCloseTo(170 * diameterRatio ** 2 * pipe_m * 1000, 6);
    expect(at('1 t/h').map((finding) => finding.verdict)).toEqual(['inside']); // 10,300
    expect(at('0.5 t/h').map((finding) => [finding.verdict, finding.at])).toEqual([['outside', 'minimum']]);
  });

  test('far below, C is held at a tenth of the limit and the finding says so', () => {
    const [finding] = solved({ ...water, duty: { minimum: '20 kg/h' } }).checks.filter(
      ({ id }) => id === 'reynolds-pipe',
    );
    expect(finding?.verdict).toBe('outside');
    expect(finding?.detail?.heldAt).toBeCloseTo((finding?.limit.min ?? 0) / 10, 9);
  });

  test('diameter ratio, bore and pipe on both sides of their limits', () => {
    const ratio = (bore: string) =>
      verdict(
        withElement({ bore, material: undefined }, { ...water, duty: {}, pipe: { bore: '100 mm' } }),
        'diameter-ratio',
      );
    expect([ratio('75 mm'), ratio('75.1 mm'), ratio('10 mm'), ratio('9.9 mm')]).toEqual([
      'inside',
      'outside',
      'inside',
      'outside',
    ]);
    const pipe = (bore: string) =>
      verdict({ ...withElement({ bore: '20 mm', material: undefined }), duty: {}, pipe: { bore } }, 'pipe-bore');
    expect([pipe('50 mm'), pipe('49.9 mm')]).toEqual(['inside', 'outside']);
    const bore = (text: string) =>
      verdict(
        { ...withElement({ bore: text, material: undefined }), duty: {}, pipe: { bore: '60 mm' } },
        'element-bore',
      );
    expect([bore('12.5 mm'), bore('12.4 mm')]).toEqual(['inside', 'outside']);
  });

  test('p2/p1 matters to steam and not to water', () => {
    expect(verdict(water, 'pressure-ratio')).toBeUndefined();
    expect(verdict(steam, 'pressure-ratio')).toBe('inside');
    expect(verdict({ ...steam, differential: '11 bar' }, 'pressure-ratio')).toBe('outside'); // solved all the same
  });

  test('roughness only where it is given', () => {
    expect(verdict(water, 'pipe-roughness')).toBeUndefined();
    expect(verdict({ ...water, pipe: { ...water.pipe, roughness: '0.005 mm' } }, 'pipe-roughness')).toBe('inside');
    expect(verdict({ ...water, pipe: { ...water.pipe, roughness: '1 mm' } }, 'pipe-roughness')).toBe('outside');
  });
});

describe('straight pipe, ISO 5167-2:2003, Table 3', () => {
  const plate = { ...water, ...{ pipe: { bore: '100 mm' } } };
  const at = (installation: object) =>
    solved({ ...withElement({ bore: '60 mm', material: undefined }, plate), installation });
  const upstream = (before: string) =>
    at({ fitting: 'single-bend', before }).checks.find(({ id }) => id === 'straight-upstream');

  test('one bend at beta 0.6 asks for 42 D, or 13 D with 0.5 % more', () => {
    expect(upstream('42 D')?.verdict).toBe('inside');
    expect(upstream('41.9 D')?.verdict).toBe('caution');
    expect(upstream('13 D')?.verdict).toBe('caution');
    expect(upstream('12.9 D')?.verdict).toBe('outside');
    expect(upstream('4.2 m')).toMatchObject({
      verdict: 'inside',
      value: 42,
      limit: { min: 42 },
      detail: { reduced: 13 },
    });
  });

  test('the shorter length adds 0.5 % to C, arithmetically', () => {
    const percent = (before: string) =>
      at({ fitting: 'single-bend', before }).points.maximum?.uncertainty.terms.find(({ name }) => name === 'C')
        ?.percentOfFlow ?? 0;
    expect(percent('20 D') - percent('42 D')).toBeCloseTo(0.5, 12);
  });

  test('short on both sides is outside', () => {
    const verdicts = at({ fitting: 'single-bend', before: '20 D', after: '4 D' }).checks.filter(({ id }) =>
      id.startsWith('straight'),
    );
    expect(verdicts.map(({ verdict: one }) => one)).toEqual(['outside', 'outside']);
  });

  test('a fitting that the table does not know is refused, with the list', () => {
    expect(() => at({ fitting: 'hosepipe', before: '9 D' })).toThrow(/choice-unknown.*single-bend/);
  });
});

describe('steady', () => {
  const at = (fluctuation: string) =>
    solved({ ...water, installation: { fluctuation } }).checks.find(({ id }) => id === 'fluctuation');
  test('10 % of fluctuation is the limit and reads 0.125 % high, ISO/TR 3313', () => {
    expect(at('10 %')).toMatchObject({ verdict: 'inside', assumption: 'steady' });
    expect(at('10 %')?.detail?.high).toBeCloseTo(0.126, 3);
    expect(at('10.1 %')?.verdict).toBe('outside');
  });
  test('nothing is said where nothing is stated', () => expect(verdict(water, 'fluctuation')).toBeUndefined());
});

describe('one phase', () => {
  const hot = (temperature: string, differential: string) => ({
    ...water,
    upstream: { pressure: '1.5 bar(a)', temperature },
    differential,
  });

  test('a jet below the vapour pressure is outside, close to it a caution', () => {
    expect(verdict(hot('20 degC', '0.3 bar'), 'cavitation')).toBe('inside');
    expect(verdict(hot('20 degC', '0.3 bar'), 'cavitation-margin')).toBe('inside');
    expect(verdict(hot('20 degC', '1.2 bar'), 'cavitation-margin')).toBe('caution');
    expect(verdict(hot('105 degC', '0.6 bar'), 'cavitation')).toBe('outside'); // boils at 1.21 bar(a), IAPWS-IF97
    expect(verdict(hot('105 degC', '0.6 bar'), 'flashing')).toBe('outside');
    expect(verdict(hot('105 degC', '0.4 bar'), 'flashing')).toBe('inside');
  });

  test('little superheat or subcooling is a caution', () => {
    expect(verdict({ ...steam, upstream: { pressure: '10 bar(a)', temperature: '182 degC' } }, 'superheat')).toBe(
      'caution',
    ); // 179.9
    expect(verdict({ ...steam, upstream: { pressure: '10 bar(a)', temperature: '190 degC' } }, 'superheat')).toBe(
      'inside',
    );
    expect(verdict(hot('110 degC', '0.1 bar'), 'subcooling')).toBe('caution'); // boils at 111.4
  });
});

describe('the plate', () => {
  const plate = (own: object) => withElement({ plateThickness: '4 mm', edgeThickness: '1.5 mm', ...own });
  test('edge and thickness against ISO 5167-2, 5.1.5', () => {
    expect(verdict(plate({}), 'plate-thickness')).toBe('inside');
    expect(verdict(plate({ plateThickness: '6 mm' }), 'plate-thickness')).toBe('outside'); // 0.05 D
    expect(verdict(plate({ edgeThickness: '0.4 mm' }), 'plate-thickness-edge')).toBe('outside'); // 0.005 D
    expect(verdict(plate({ plateThickness: '1.5 mm', edgeThickness: '2 mm' }), 'plate-edge-order')).toBe('outside');
  });
  test('bending only with a material of known strength', () => {
    expect(verdict(plate({ material: 'ptfe' }), 'plate-bending')).toBeUndefined();
    expect(verdict(plate({}), 'plate-bending')).toBe('inside');
    expect(
      verdict(
        { ...plate({ plateThickness: '0.4 mm', edgeThickness: '0.4 mm' }), differential: '2 bar' },
        'plate-bending',
      ),
    ).toBe('outside');
  });
  test('a nozzle has no plate to bend', () => {
    expect(
      verdict(withElement({ plateThickness: '4 mm', material: 'stainless-316' }, steam), 'plate-bending'),
    ).toBeUndefined();
  });
});

describe('custom of the trade', () => {
  test('velocity, span and turndown are cautions, never outside', () => {
    expect(verdict(water, 'velocity')).toBe('inside');
    expect(verdict({ ...water, differential: '3 bar' }, 'velocity')).toBe('caution');
    expect(verdict({ ...water, differential: '20 mbar', duty: {} }, 'span')).toBe('caution');
    expect(verdict({ ...water, duty: { minimum: '12 t/h' } }, 'turndown')).toBe('caution');
    expect(verdict({ ...water, duty: { minimum: '12 t/h' }, differential: '120 mbar' }, 'turndown')).toBe('inside');
  });
});

describe('calibration', () => {
  const calibration = [
    { reynolds: 2e5, coefficient: 0.61 },
    { reynolds: 8e5, coefficient: 0.6 },
  ];
  test('replaces the coefficient between its points and warns outside', () => {
    const result = solved({ ...withElement({ calibration }), duty: { normal: '40 t/h', minimum: '12 t/h' } });
    const x = Math.log((result.points.normal?.reynoldsPipe ?? 0) / 2e5) / Math.log(4);
    expect(result.points.normal?.C).toBeCloseTo(0.61 - 0.01 * x, 12);
    expect(
      result.checks.filter(({ id }) => id === 'calibration-range').map(({ at, verdict: one }) => [at, one]),
    ).toEqual([['minimum', 'caution']]);
  });
});

test('findings come in the order of the assumptions', () => {
  const order = solved(water).checks.map(({ assumption }) => ASSUMPTIONS.indexOf(assumption));
  expect(order).toEqual([...order].sort((one, other) => one - other));
});

test('a meter well inside everything has no caution', () => {
  const good = withElement(
    { plateThickness: '4 mm', edgeThickness: '1.5 mm' },
    { ...water, duty: { normal: '40 t/h', minimum: '20 t/h' } },
  );
  const checks = solved({ ...good, installation: { fitting: 'single-bend', before: '45 D', after: '8 D' } }).checks;
  expect(checks.filter(({ verdict: one }) => one !== 'inside')).toEqual([]);
  expect(checks.length).toBeGreaterThan(10);
});

describe('what could not be checked', () => {
  const needs = (meter: object) => solved(meter).unchecked.map((open) => open.needs);
  test('is named with the field it would take', () => {
    expect(needs(water)).toEqual([
      'installation.fluctuation',
      'pipe.roughness',
      'installation.fitting',
      'installation.after',
      'element.plateThickness',
    ]);
    const fluid = { kind: 'stated', density: '1000 kg/m3', viscosity: '1 mPa.s' };
    expect(needs({ ...water, fluid })).toContain('fluid.vapourPressure');
    expect(
      needs({ ...water, installation: { fitting: 'single-bend', before: '45 D', after: '8 D', fluctuation: '2 %' } }),
    ).toEqual(['pipe.roughness', 'element.plateThickness']);
  });
});

test('the differential at the Reynolds limit is that of the flow that has it', () => {
  const { reynoldsLimits } = solved(water);
  const at = solved({ ...water, differential: `${reynoldsLimits.minDifferential_Pa} Pa`, duty: {} });
  expect((at.points.maximum?.reynoldsPipe ?? 0) / (reynoldsLimits.min ?? 1)).toBeCloseTo(1, 10);
});
