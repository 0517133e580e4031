import { describe, expect, test } from 'vitest';
import type { Measure, Unit } from '../../../src/core/quantity/measure.ts';
import { readTyped } from '../../../src/core/quantity/typed.ts';
import { unitOf } from '../../../src/core/quantity/units.ts';

const PRESSURES: readonly Measure[] = ['absolute pressure', 'gauge pressure'];

function unit(symbol: string, measure: Measure): Unit {
  const found = unitOf(symbol, [measure]);
  if (!found) throw new Error(`no unit ${symbol} of ${measure}`);
  return found;
}

describe('typed text that is read', () => {
  test.each([
    ['12 inH2O', 'pressure difference', '12 inH2O', 2989.06692],
    ['12,5 kPa', 'pressure difference', '12.5 kPa', 12_500],
    ['12.5kPa', 'pressure difference', '12.5 kPa', 12_500],
    ['\u22123.2 °C', 'temperature', '-3.2 degC', 269.95],
    ['5bar(g)', 'gauge pressure', '5 bar(g)', 500_000],
    ['5 bar (g)', 'gauge pressure', '5 bar(g)', 500_000],
    ['5 psig', 'gauge pressure', '5 psi(g)', (5 * 0.45359237 * 9.80665) / 0.0254 ** 2],
    ['1 234,5 mm', 'length', '1234.5 mm', 1.2345],
    ['1\u00a0234,5 mm', 'length', '1234.5 mm', 1.2345],
    ['1\u202f234,5 mm', 'length', '1234.5 mm', 1.2345],
    ['1\u2009234,5 mm', 'length', '1234.5 mm', 1.2345],
    ['1.234,5 mm', 'length', '1234.5 mm', 1.2345],
    ['1,234.5 mm', 'length', '1234.5 mm', 1.2345],
    ['1,234,567.8 mm', 'length', '1234567.8 mm', 1234.5678],
    ['1 234 567,8 mm', 'length', '1234567.8 mm', 1234.5678],
    ['1,234,567 mm', 'length', '1234567 mm', 1234.567],
    ['1.234.567 mm', 'length', '1234567 mm', 1234.567],
    ['1,234 mm', 'length', '1.234 mm', 0.001234],
    ['1.234 mm', 'length', '1.234 mm', 0.001234],
    ['0.123 456 7 m', 'length', '0.1234567 m', 0.1234567],
    ['12\u202f345.678\u202f901 m', 'length', '12345.678901 m', 12_345.678901],
    ['10,00 mm', 'length', '10.00 mm', 0.01],
    ['9,99 mm', 'length', '9.99 mm', 0.00999],
    ['0.123456789 mm', 'length', '0.123456789 mm', 0.000123456789],
    ['1e-5 m', 'length', '1e-5 m', 1e-5],
    ['1,5E+3 m', 'length', '1.5e3 m', 1500],
    ['1.5e\u22123 m', 'length', '1.5e-3 m', 0.0015],
    ['6.25 × 10⁵ Pa', 'pressure difference', '6.25e5 Pa', 625_000],
    ['6,25\u202f×\u202f10⁻⁵ m', 'length', '6.25e-5 m', 6.25e-5],
    ['+4 mm', 'length', '4 mm', 0.004],
    ['.5 mm', 'length', '0.5 mm', 0.0005],
    [',5 mm', 'length', '0.5 mm', 0.0005],
    ['5, mm', 'length', '5 mm', 0.005],
    ['007 mm', 'length', '7 mm', 0.007],
    ['-0,00 mm', 'length', '0.00 mm', 0],
    ['45°', 'angle', '45 deg', Math.PI / 4],
    ['12 inH₂O (60 °F)', 'pressure difference', '12 inH2O@60degF', 2986.12866721764],
    ['0,4%', 'share', '0.4 %', 0.004],
  ] as const)('%s', (text, measure, file, si) => {
    const read = readTyped(text, [measure], 'place');
    if (!read.ok) throw new Error(JSON.stringify(read.problems));
    expect(read.value.file).toBe(file);
    expect(Math.abs(read.value.echo.si - si)).toBeLessThanOrEqual(5e-16 * Math.abs(si)); // si is computed in doubles
    expect(`${read.value.echo.number} ${read.value.echo.unit.symbol}`).toBe(file);
    expect(readTyped(file, [measure], 'place')).toEqual(read);
  });
});

describe('typed text that is refused', () => {
  const refused: readonly (readonly [string, string])[] = [
    ['', 'number-empty'],
    ['\u00a0', 'number-empty'],
    ['mm', 'number-empty'],
    ['1.2.3 mm', 'number-grouping'],
    ['1,2,3 mm', 'number-grouping'],
    ['1,23,456 mm', 'number-grouping'],
    ['1.2,345 mm', 'number-grouping'],
    ['1234.567,8 mm', 'number-grouping'],
    ['1,234.567,8 mm', 'number-grouping'],
    ['1.234,567,890 mm', 'number-grouping'],
    ['0.123.456 mm', 'number-grouping'],
    ['0 123 mm', 'number-grouping'],
    ['12 34 mm', 'number-grouping'],
    ['1 2345 mm', 'number-grouping'],
    ['1234 567 mm', 'number-grouping'],
    ['1  234 mm', 'number-grouping'],
    ['1 234.567,8 mm', 'number-grouping'],
    ['1.23 456 mm', 'number-grouping'],
    ['1.234 5678 mm', 'number-grouping'],
    ['29 00 mm', 'number-grouping'],
    ["1'234 mm", 'number-unreadable'],
    ['1’234 mm', 'number-unreadable'],
    ['1\t234 mm', 'number-unreadable'],
    ['1\n234 mm', 'number-unreadable'],
    ['.,. mm', 'number-unreadable'],
    ['- 3 mm', 'number-unreadable'],
    ['\u2212\u22123 mm', 'number-unreadable'],
    ['NaN mm', 'number-unreadable'],
    ['Infinity mm', 'number-unreadable'],
    ['１２ mm', 'number-unreadable'],
    ['constructor', 'number-unreadable'],
    [`${'1 '.repeat(500_000)}mm`, 'number-unreadable'],
    ['1e999 mm', 'number-too-large'],
    ['1 × 10⁹⁹⁹ mm', 'number-too-large'],
    ['1e-999 mm', 'number-too-small'],
    ['0x10 mm', 'unit-unknown'],
    ['1 × 10 mm', 'unit-unknown'],
    ['3 toString', 'unit-unknown'],
    ['12.5', 'unit-missing'],
    ['3 kg/h', 'unit-wrong-measure'],
  ];

  test.each(refused.map(([text, code]) => ({ text, code, shown: text.slice(0, 30) })))(
    '$shown: $code',
    ({ text, code }) => {
      const read = readTyped(text, ['length'], 'place');
      expect(read).toMatchObject({ ok: false, problems: [{ code, field: 'place' }] });
    },
  );
});

describe('what stood in the field before', () => {
  const barGauge = { number: '7', unit: unit('bar(g)', 'gauge pressure') };

  test.each([
    ['8', '8 bar(g)', 800_000],
    ['8,5', '8.5 bar(g)', 850_000],
    ['1 200', '1200 bar(g)', 120_000_000],
    ['kPa(g)', '700 kPa(g)', 700_000],
    ['psig', '101.526416411 psi(g)', 700_000],
    ['bar(g)', '7 bar(g)', 700_000],
    ['2 bar(a)', '2 bar(a)', 200_000],
  ])('%s after 7 bar(g)', (text, file, si) => {
    const read = readTyped(text, PRESSURES, 'place', barGauge);
    if (!read.ok) throw new Error(JSON.stringify(read.problems));
    expect(read.value.file).toBe(file);
    expect(Math.abs(read.value.echo.si - si)).toBeLessThanOrEqual(5e-12 * si); // twelve digits
  });

  test.each([
    ['7 bar', 'pressure-reference-missing'],
    ['bar', 'pressure-reference-missing'],
    ['bar(a)', 'unit-not-convertible'],
    ['mm', 'unit-wrong-measure'],
    ['psy', 'unit-unknown'],
    ['1.2.3', 'number-grouping'],
    ['', 'number-empty'],
  ])('%s after 7 bar(g): %s', (text, code) => {
    expect(readTyped(text, PRESSURES, 'place', barGauge)).toMatchObject({ ok: false, problems: [{ code }] });
  });

  test('a unit to start with serves a number alone, but there is nothing to convert', () => {
    const start = { unit: unit('mm', 'length') };
    expect(readTyped('8', ['length'], 'place', start)).toMatchObject({ ok: true, value: { file: '8 mm' } });
    expect(readTyped('in', ['length'], 'place', start)).toMatchObject({
      ok: false,
      problems: [{ code: 'number-empty', detail: { unit: 'in' } }],
    });
  });

  test('a previous unit of a measure that is not asked for is not taken', () => {
    const read = readTyped('8', ['length'], 'place', barGauge);
    expect(read).toMatchObject({ ok: false, problems: [{ code: 'unit-missing' }] });
  });

  test('a mass flow does not turn into a volume flow by its unit', () => {
    const previous = { number: '60', unit: unit('t/h', 'mass flow') };
    expect(readTyped('m3/h', ['mass flow', 'volume flow'], 'place', previous)).toMatchObject({
      ok: false,
      problems: [{ code: 'unit-not-convertible', detail: { from: 't/h', to: 'm3/h' } }],
    });
  });

  test('numbers as a file may write them convert too', () => {
    for (const [number, file] of [
      ['+.5', '5 mm'],
      ['5.', '50 mm'],
      ['1E1', '100 mm'],
    ] as const) {
      const previous = { number, unit: unit('cm', 'length') };
      expect(readTyped('mm', ['length'], 'place', previous)).toMatchObject({ ok: true, value: { file } });
    }
  });
});
