/** Columns of liquid: which limb is high, what fills the legs, what a scale says, and when the liquids change places. */
import { describe, expect, test } from 'vitest';
import type { InstrumentText, MeterText } from '../../../src/core/document/project.ts';
import { flags, reading, refusalOf, uTube, venturi } from './sample.ts';

const dp = (instrument: InstrumentText, value: string): number => {
  const { differential_Pa } = reading(instrument, { value });
  if (differential_Pa === undefined) throw new Error('expected a differential');
  return differential_Pa;
};
const g = 9.80665; // m/s2
const stated = (density: number): InstrumentText => ({ kind: 'u-tube', liquid: { density: `${density} kg/m3` } });

describe('U-tube', () => {
  test('is the difference of the densities times gravity and height', () => {
    expect(dp(stated(13600), '152 mm')).toBeCloseTo((13600 - 1025) * g * 0.152, 8);
  });
  test('a reading below zero is reversed and makes no flow', () => {
    const row = reading(stated(13600), { value: '-12 mm' });
    expect(row).toMatchObject({ counted: false, standing: 'as-shown' });
    expect(row.massFlow_kg_s).toBeUndefined();
    expect(flags(row)).toEqual(['reading-reversed']);
  });
  test('at rest nothing flows, and that counts', () => {
    expect(reading(stated(13600), { value: '0 mm' })).toMatchObject({
      counted: true,
      massFlow_kg_s: 0,
      volumeFlow_m3_s: 0,
    });
  });
  test('the other limb high is the same with the sign turned', () => {
    expect(dp({ ...stated(13600), high: 'upstream' }, '-152 mm')).toBe(dp(stated(13600), '152 mm'));
    expect(flags(reading({ ...stated(13600), high: 'upstream' }, { value: '152 mm' }))).toEqual(['reading-reversed']);
  });
  test('zero and scale', () => {
    expect(dp({ ...stated(13600), zero: '2 mm' }, '154 mm')).toBeCloseTo(dp(stated(13600), '152 mm'), 9);
    const brass = { ...stated(13600), temperature: '30 degC', scaleMetal: 'brass', scaleTrueAt: '20 degC' };
    expect(dp(brass, '152 mm') / dp(stated(13600), '152 mm') - 1).toBeCloseTo(1.84e-4, 10);
  });
  test('a liquid that is lighter than the process is refused', () => {
    expect(refusalOf(stated(1000), { value: '152 mm' })).toEqual(['manometer-liquid-light at instrument.liquid']);
  });
  test('mercury outside its formula is a finding', () => {
    const filled: InstrumentText = { ...uTube, above: { density: '1025 kg/m3' }, temperature: '-30 degC' };
    expect(flags(reading(filled, { value: '152 mm' }))).toEqual(['gauge-liquid-range']);
  });
  test('half a division at each level, rectangular', () => {
    const row = reading({ ...stated(13600), division: '1 mm' }, { value: '152 mm' });
    const metres = (2 * Math.SQRT2 * 0.0005) / Math.sqrt(3);
    expect(row.uncertainty?.reading_Pa).toBeCloseTo((13600 - 1025) * g * metres, 9);
    const percent = (50 * metres) / 0.152; // half, of the flow
    expect(row.uncertainty?.readingPercentOfFlow).toBeCloseTo(percent, 9);
  });
});

describe('legs', () => {
  test('full of the process fluid, the tappings may lie anywhere', () => {
    const high = dp({ ...stated(13600), rise: '2 m', drop: '3 m' }, '152 mm');
    expect(high).toBeCloseTo(dp(stated(13600), '152 mm'), 8);
  });
  test('both full of something else: (rho_L - rho) g s', () => {
    const filled = { ...stated(13600), above: { density: '1200 kg/m3' }, rise: '0.5 m' };
    expect(dp(filled, '152 mm')).toBeCloseTo((13600 - 1200) * g * 0.152 + (1200 - 1025) * g * 0.5, 8);
  });
  test('filled unlike need their height', () => {
    const unlike = { ...stated(13600), above: { density: '1000 kg/m3' }, aboveDownstream: { density: '998 kg/m3' } };
    expect(refusalOf(unlike, { value: '152 mm' })).toEqual(['field-missing at instrument.drop']);
    const drop = 2;
    const [upstream, downstream] = [1000 * g * (drop + 0.076), 998 * g * (drop - 0.076)];
    expect(dp({ ...unlike, drop: `${drop} m` }, '152 mm')).toBeCloseTo(13600 * g * 0.152 + downstream - upstream, 8);
  });
  test('a cell sees the head of its legs', () => {
    const cell: InstrumentText = { kind: 'differential', above: { density: '1000 kg/m3' }, rise: '-0.3 m' };
    expect(dp(cell, '100 mbar')).toBeCloseTo(10000 + (1000 - 1025) * g * -0.3, 8);
    expect(dp({ kind: 'differential', rise: '4 m' }, '100 mbar')).toBe(10000);
    expect(dp({ kind: 'differential', zero: '1 mbar' }, '100 mbar')).toBe(9900);
  });
});

describe('legs of the process fluid at another temperature', () => {
  const id = 'legs-at-line-temperature';
  const cold: InstrumentText = { ...stated(13600), temperature: '40 degC' }; // the line has 17.5 degC
  const found = (instrument: InstrumentText, value: string, meter = venturi) =>
    reading(instrument, { value }, meter).checks.filter((check) => check.id === id);
  test('are a caution beside a column, from 20 K on', () => {
    expect(found(cold, '152 mm')).toMatchObject([
      { verdict: 'caution', assumption: 'range-and-span', value: 313.15, limit: { min: 270.65, max: 310.65 } },
    ]);
    expect(found({ ...cold, temperature: '37.4 degC' }, '152 mm')).toEqual([]);
    expect(found({ ...cold, temperature: '-3 degC' }, '152 mm')).toHaveLength(1);
  });
  test('are none where nothing is stated, where the filling is, and at rest', () => {
    const hot = { ...venturi, upstream: { pressure: '3.1 bar(g)', temperature: '60 degC' } };
    expect(found(stated(13600), '152 mm', hot)).toEqual([]);
    expect(found({ ...cold, above: { density: '1017 kg/m3' } }, '152 mm')).toEqual([]);
    expect(found(cold, '0 mm')).toEqual([]);
    expect(found({ ...cold, rise: '1 m' }, '0 mm')).toHaveLength(1);
  });
  test('are one for a cell or gauges only where their heights differ', () => {
    const cell: InstrumentText = { kind: 'differential', temperature: '40 degC' };
    expect(found({ ...cell, drop: '3 m' }, '100 mbar')).toEqual([]);
    expect(found({ ...cell, rise: '0.3 m' }, '100 mbar')).toHaveLength(1);
    const above: InstrumentText = { ...cell, above: 'process', aboveDownstream: 'water' };
    expect(found({ ...above, drop: '0 m', rise: '1 m' }, '100 mbar')).toEqual([]);
    expect(found({ ...above, drop: '1 m' }, '100 mbar')).toHaveLength(1);
    const gauges = (heightThroat: string): InstrumentText => ({
      kind: 'gauges',
      temperature: '40 degC',
      heightUpstream: '1 m',
      heightThroat,
    });
    const row = { upstream: '3.1 bar(g)', throat: '2.9 bar(g)' };
    expect(flags(reading(gauges('1 m'), row))).not.toContain(id);
    expect(flags(reading(gauges('0.5 m'), row))).toContain(id);
  });
  test('are none where a gas weighs too little beside the liquid', () => {
    const gas = (density: string): MeterText => ({
      ...venturi,
      fluid: { kind: 'stated', phase: 'gas', density, viscosity: '0.018 mPa.s', isentropicExponent: 1.4 },
    });
    expect(found(cold, '152 mm', gas('4.9 kg/m3'))).toEqual([]);
    expect(found(cold, '152 mm', gas('490 kg/m3'))).toHaveLength(1);
  });
});

describe('inverted U-tube', () => {
  test('under air at the pressure of the line', () => {
    const air = dp({ kind: 'inverted-u-tube' }, '300 mm');
    const light = 4.11325e5 / (287.05 * 293.15); // kg/m3, dry air as an ideal gas
    expect(air / ((1025 - light) * g * 0.3) - 1).toBeLessThan(1e-5);
    expect(air).toBeLessThan(1025 * g * 0.3);
  });
  test('under a light oil; one that is heavier is refused', () => {
    const oil = (density: number) => ({ kind: 'inverted-u-tube', liquid: { density: `${density} kg/m3` } });
    expect(dp(oil(800), '300 mm')).toBeCloseTo((1025 - 800) * g * 0.3, 9);
    expect(refusalOf(oil(1100), { value: '300 mm' })).toEqual(['manometer-liquid-heavy at instrument.liquid']);
  });
});

describe('well and inclined tube', () => {
  const bores = { tube: '6 mm', well: '60 mm' };
  const oil = { liquid: { density: '1800 kg/m3' } };
  test('a plain scale leaves out the fall of the well, a corrected one has it', () => {
    const plain = dp({ kind: 'well', scale: 'plain', ...oil, ...bores }, '500 mm');
    const corrected = dp({ kind: 'well', scale: 'corrected', ...oil }, '500 mm');
    expect(plain / corrected).toBeCloseTo(1.01, 12);
    expect(corrected).toBeCloseTo((1800 - 1025) * g * 0.5, 9);
  });
  test('laid over, the reading counts by its sine', () => {
    const laid = dp({ kind: 'inclined', angle: '30 deg', ...oil }, '500 mm');
    expect(laid).toBeCloseTo((1800 - 1025) * g * 0.25, 9);
    const withWell = dp({ kind: 'inclined', angle: '30 deg', ...oil, ...bores }, '500 mm');
    expect(withWell).toBeCloseTo((1800 - 1025) * g * 0.5 * (0.5 + 0.01), 9);
    expect(refusalOf({ kind: 'inclined', angle: '100 deg', ...oil }, { value: '5 mm' })).toEqual([
      'angle-out-of-range at instrument.angle',
    ]);
  });
  test('what the inclination is worth', () => {
    const tilted = { kind: 'inclined', angle: '10 deg', ...oil, uncertainty: { angle: '0.1 deg' } };
    const row = reading(tilted, { value: '500 mm' });
    const share = (row.uncertainty?.reading_Pa ?? 0) / (row.differential_Pa ?? 0);
    expect(share).toBeCloseTo((0.1 * Math.PI) / 180 / Math.tan((10 * Math.PI) / 180), 12);
  });
  test('bores exchanged, or a scale that is not said', () => {
    const turned = { kind: 'well', scale: 'plain', ...oil, tube: '60 mm', well: '6 mm' };
    expect(refusalOf(turned, { value: '5 mm' })).toEqual(['well-not-wider at instrument.well']);
    expect(refusalOf({ kind: 'well', ...oil, ...bores }, { value: '5 mm' })).toEqual([
      'field-missing at instrument.scale',
    ]);
  });
  test('a narrow tube is a finding', () => {
    const narrow = { kind: 'well', scale: 'plain', liquid: 'mercury', tube: '2 mm', well: '40 mm' };
    expect(flags(reading(narrow, { value: '100 mm' }))).toEqual(['capillary-level']);
  });
});

test('two gauges are brought to their tappings and then to one level', () => {
  const gauges: InstrumentText = { kind: 'gauges', rise: '0.8 m', heightUpstream: '1.2 m', heightThroat: '0.4 m' };
  const row = reading(gauges, { upstream: '3.1 bar(g)', throat: '2.9 bar(g)' });
  expect(row.differential_Pa).toBeCloseTo(20000 + 1025 * g * (1.2 - 0.4 - 0.8), 6);
  expect(row.pressure_Pa).toBeCloseTo(310000 + 101325, 6);
  expect(reading(gauges, { upstream: '3.1 bar(g)', throat: '2.9 bar(g)', pressure: '3 bar(g)' }).pressure_Pa).toBe(
    401325,
  );
  expect(refusalOf(gauges, { upstream: '3.1 bar(g)' })).toEqual(['field-missing at readings.0.throat']);
});
