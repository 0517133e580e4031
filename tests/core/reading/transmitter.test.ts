/** Signals: from milliampere, volt and per cent to a differential, and where a signal stops being a value. */
import { describe, expect, test } from 'vitest';
import type { InstrumentText } from '../../../src/core/document/project.ts';
import { flags, reading, readings, refusalOf, transmitter } from './sample.ts';

const at = (value: string, changes: InstrumentText = {}) => reading({ ...transmitter, ...changes }, { value });

describe('mapping', () => {
  test.each([
    ['12 mA', {}, 12500],
    ['3 V', { signal: '1-5 V' }, 12500],
    ['50 %', { signal: 'percent' }, 12500],
    ['12 mA', { output: 'square-root' }, 6250],
    ['12 mA', { lower: '-50 mbar', upper: '150 mbar' }, 5000],
    ['8 mA', { zero: '2 mbar' }, 6050],
  ] as const)('%s %j', (value, changes, pascal) => {
    expect(at(value, changes).differential_Pa).toBeCloseTo(pascal, 8);
  });
  test('a root signal is in proportion to the flow where C stands still', () => {
    const [half, full] = [at('12 mA', { output: 'square-root' }), at('20 mA', { output: 'square-root' })];
    expect((half.massFlow_kg_s ?? 0) / (full.massFlow_kg_s ?? 1)).toBeCloseTo(0.5, 12);
  });
  test('the wrong measure, a range that falls, a root that does not begin at zero', () => {
    expect(refusalOf(transmitter, { value: '12 V' })).toEqual(['unit-wrong-measure at readings.0.value']);
    expect(refusalOf({ ...transmitter, lower: '300 mbar' }, { value: '12 mA' })).toEqual([
      'range-not-rising at instrument.upper',
    ]);
    expect(refusalOf({ ...transmitter, output: 'square-root', lower: '-10 mbar' }, { value: '12 mA' })).toEqual([
      'root-from-zero at instrument.lower',
    ]);
  });
});

describe('limits', () => {
  test.each([
    ['3.6 mA', ['signal-failed'], 'failed'],
    ['21 mA', ['signal-failed'], 'failed'],
    ['20.6 mA', ['signal-saturated', 'reading-above-span'], 'at-least'],
    ['20.5 mA', ['reading-above-span'], 'as-shown'],
    ['3.7 mA', ['signal-uncertain', 'reading-reversed'], 'as-shown'],
    ['12 mA', [], 'as-shown'],
  ] as const)('%s', (value, ids, standing) => {
    const row = at(value);
    expect(flags(row)).toEqual(ids);
    expect(row.standing).toBe(standing);
    expect(row.counted).toBe(standing === 'as-shown' && !ids.some((id) => id === 'reading-reversed'));
  });
  test('a failed signal has no differential and no flow', () => {
    expect(at('22 mA')).not.toHaveProperty('differential_Pa');
    expect(at('22 mA')).not.toHaveProperty('massFlow_kg_s');
  });
  test('they can be moved, and must rise', () => {
    expect(flags(at('21.5 mA', { limits: { failHigh: '21.75 mA' } }))).toContain('signal-saturated');
    expect(refusalOf({ ...transmitter, limits: { low: '3 mA' } }, { value: '12 mA' })).toEqual([
      'limits-order at instrument.limits',
    ]);
  });
  test('volts and per cent in proportion', () => {
    expect(flags(at('0.9 V', { signal: '1-5 V' }))).toEqual(['signal-failed']);
    expect(flags(at('-1.5 %', { signal: 'percent' }))).toEqual(['signal-uncertain', 'reading-reversed']);
  });
});

describe('below zero', () => {
  const detailOf = (value: string, more: InstrumentText = {}) =>
    at(value, more).checks.find(({ id }) => id === 'reading-reversed')?.detail;
  test('less than 2 % of the span, a zero that has drifted may be the cause too', () => {
    expect(detailOf('3.9 mA')).toEqual({ near: 'zero' });
    expect(detailOf('3.9 mA', { cutOff: '1 %' })).toBeUndefined();
    expect(detailOf('3.67 mA')).toBeUndefined(); // -2.06 %
  });
});

describe('cut-off', () => {
  test('a share of the flow at the end of the range, or a differential', () => {
    const row = at('4.03 mA', { cutOff: '5 %' }); // 47 Pa of 62.5 Pa
    expect(row).toMatchObject({ standing: 'cut-off', counted: true, massFlow_kg_s: 0 });
    expect(flags(row)).toEqual(['below-cut-off']);
    expect(flags(at('4.05 mA', { cutOff: '5 %' }))).not.toContain('below-cut-off');
    expect(flags(at('4.05 mA', { cutOff: '1 mbar' }))).toEqual(['below-cut-off']);
  });
  test('noise below zero is no reversed flow, a strong one is', () => {
    expect(flags(at('3.98 mA', { cutOff: '5 %' }))).toEqual(['below-cut-off']);
    expect(flags(at('3.9 mA', { cutOff: '5 %' }))).toEqual(['reading-reversed']);
  });
});

describe('stacked ranges', () => {
  const stacked: InstrumentText = { ...transmitter, lowRange: { upper: '25 mbar' } };
  const cells = (rows: readonly (readonly [string, string])[]) =>
    readings(
      stacked,
      rows.map(([value, lowRange]) => ({ value, lowRange })),
    ).rows.map((row) => (row.status === 'solved' ? Math.round(row.differential_Pa ?? -1) : -1));
  test('the low range serves up to 90 %, and again below 85 %', () => {
    // 87 % of the low range is 2175 Pa there; the main cell says 2188 Pa
    expect(cells([['5.4 mA', '17.92 mA']])).toEqual([2175]);
    expect(
      cells([
        ['5.6 mA', '19.2 mA'],
        ['5.4 mA', '17.92 mA'],
      ]),
    ).toEqual([2500, 2188]);
    expect(
      cells([
        ['5.6 mA', '19.2 mA'],
        ['5.4 mA', '17.92 mA'],
        ['5.3 mA', '17.28 mA'],
      ]),
    ).toEqual([2500, 2188, 2075]);
  });
  test('a low range that failed leaves the main one', () => {
    expect(cells([['5.4 mA', '3.5 mA']])).toEqual([2188]);
  });
  test('cells that differ by more than they may', () => {
    const stated = { ...stacked, uncertainty: { accuracy: '0.1 % of span' } };
    expect(flags(reading(stated, { value: '5.33 mA', lowRange: '17.28 mA' }))).toEqual([]);
    expect(flags(reading(stated, { value: '5.5 mA', lowRange: '17.28 mA' }))).toEqual(['cells-apart']);
  });
});

describe('uncertainty', () => {
  test('terms add as squares; rectangular limits are widened to 95 %', () => {
    const terms = { accuracy: '0.1 % of span', legs: '20 Pa', staticPressure: '0.2 % of reading' };
    const pascals = [25, 20, 0.002 * 12500];
    const expanded = at('12 mA', { uncertainty: terms }).uncertainty?.reading_Pa;
    expect(expanded).toBeCloseTo(Math.hypot(...pascals), 9);
    const limits = at('12 mA', { uncertainty: { ...terms, as: 'rectangular' } }).uncertainty?.reading_Pa;
    expect((limits ?? 0) / (expanded ?? 1)).toBeCloseTo(2 / Math.sqrt(3), 12);
  });
  test('a root signal carries the error of its card in proportion to its place', () => {
    const card = at('8 mA', { output: 'square-root', uncertainty: { output: '0.1 % of span' } });
    expect(card.uncertainty?.reading_Pa).toBeCloseTo(2 * 25000 * 0.25 * 0.001, 9);
  });
  test('a share of the span needs a span', () => {
    const cell = { kind: 'differential', uncertainty: { accuracy: '0.1 % of span' } };
    expect(refusalOf(cell, { value: '1 mbar' })).toEqual(['instrument-has-no-span at instrument.uncertainty.accuracy']);
  });
});
