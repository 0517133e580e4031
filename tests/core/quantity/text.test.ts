import { describe, expect, test } from 'vitest';
import type { Measure } from '../../../src/core/quantity/measure.ts';
import { readQuantity } from '../../../src/core/quantity/text.ts';

const PRESSURES: readonly Measure[] = ['absolute pressure', 'gauge pressure'];
const FLOWS: readonly Measure[] = ['mass flow', 'volume flow', 'base volume flow'];

const problem = (text: string, measures: readonly Measure[]) => {
  const read = readQuantity(text, measures, 'place');
  if (read.ok) throw new Error(`read as ${read.value.number} ${read.value.unit.symbol}`);
  expect(read.problems).toHaveLength(1);
  expect(read.problems[0].field).toBe('place');
  return read.problems[0];
};

describe('file text that is read', () => {
  test.each([
    ['102.26 mm', ['length'], '102.26', 'mm', 0.10226],
    ['102.26mm', ['length'], '102.26', 'mm', 0.10226],
    ['  102.26 \t mm  ', ['length'], '102.26', 'mm', 0.10226],
    ['1e-5 m', ['length'], '1e-5', 'm', 1e-5],
    ['1E-5 m', ['length'], '1E-5', 'm', 1e-5],
    ['-3.2 degC', ['temperature'], '-3.2', 'degC', 269.95],
    ['-3.2 °C', ['temperature'], '-3.2', 'degC', 269.95],
    ['+4 mm', ['length'], '+4', 'mm', 0.004],
    ['.5 in', ['length'], '.5', 'in', 0.0127],
    ['5. in', ['length'], '5.', 'in', 0.127],
    ['30 D', ['length', 'bores'], '30', 'D', 30],
    ['7 bar(g)', PRESSURES, '7', 'bar(g)', 700_000],
    ['101.325 kPa(a)', PRESSURES, '101.325', 'kPa(a)', 101_325],
    ['250 mbar', ['pressure difference'], '250', 'mbar', 25_000],
    ['60 t/h', FLOWS, '60', 't/h', 60_000 / 3600],
    ['60 m3/h', FLOWS, '60', 'm3/h', 60 / 3600],
    ['60 base m3/h', FLOWS, '60', 'base m3/h', 60 / 3600],
    ['0.1 % of span', ['share of reading', 'share of span'], '0.1', '% of span', 0.001],
    ['9.80665 m/s2', ['acceleration'], '9.80665', 'm/s2', 9.80665],
    ['1e-999 degC', ['temperature'], '1e-999', 'degC', 273.15],
  ] as const)('%s', (text, measures, number, symbol, si) => {
    const read = readQuantity(text, measures, 'place');
    if (!read.ok) throw new Error(JSON.stringify(read.problems));
    expect(read.value.number).toBe(number);
    expect(read.value.unit.symbol).toBe(symbol);
    expect(read.value.measure).toBe(read.value.unit.measure);
    expect(read.value.si).toBe(si);
  });

  test('the same words are a difference for one field and a temperature for another', () => {
    const read = (measure: Measure) => readQuantity('10 degC', [measure], 'place');
    expect(read('temperature')).toMatchObject({ ok: true, value: { si: 283.15 } });
    expect(read('temperature difference')).toMatchObject({ ok: true, value: { si: 10 } });
  });

  test('minus zero is zero', () => {
    const read = readQuantity('-0.0 mm', ['length'], 'place');
    expect(read.ok && Object.is(read.value.si, 0)).toBe(true);
  });
});

describe('file text that is refused', () => {
  const refused: readonly (readonly [string, string])[] = [
    ['', 'number-empty'],
    ['   ', 'number-empty'],
    ['mm', 'number-empty'],
    ['12.5', 'unit-missing'],
    ['1e999', 'number-too-large'], // no unit would mend it
    ['12,5 mm', 'number-grouping'],
    ['1 234 mm', 'number-grouping'],
    ['1\u00a0234 mm', 'number-grouping'],
    ['1,234.5 mm', 'number-grouping'],
    ['1,2,3 mm', 'number-grouping'],
    ['1.2.3 mm', 'number-unreadable'],
    ["1'234 mm", 'number-unreadable'],
    ['. mm', 'number-unreadable'],
    [', mm', 'number-unreadable'],
    ['-mm', 'number-unreadable'],
    ['\u22123 mm', 'number-unreadable'],
    ['--3 mm', 'number-unreadable'],
    ['NaN mm', 'number-unreadable'],
    ['Infinity mm', 'number-unreadable'],
    ['-Infinity mm', 'number-unreadable'],
    ['１２ mm', 'number-unreadable'],
    ['٣ mm', 'number-unreadable'],
    ['constructor', 'number-unreadable'],
    ['__proto__', 'number-unreadable'],
    ['null', 'number-unreadable'],
    ['9'.repeat(101), 'number-unreadable'],
    [`1 ${'m'.repeat(1_000_000)}`, 'number-unreadable'],
    [' '.repeat(1_000_000), 'number-empty'],
    ['1'.repeat(1_000_000), 'number-unreadable'],
    ['1e999 mm', 'number-too-large'],
    ['-1e999 mm', 'number-too-large'],
    ['1e99999999999999999999 mm', 'number-too-large'],
    ['1e-999 mm', 'number-too-small'],
    ['1e-99999999999999999999 mm', 'number-too-small'],
    ['0x10 mm', 'unit-unknown'],
    ['1_000 mm', 'unit-unknown'],
    ['1e mm', 'unit-unknown'],
    ['3 constructor', 'unit-unknown'],
    ['3 __proto__', 'unit-unknown'],
    ['3 mm mm', 'unit-unknown'],
    ['3 mm 4', 'unit-unknown'],
    ['3 feet', 'unit-unknown'],
    ['3 MM', 'unit-unknown'],
    ["3'", 'unit-unknown'],
    ['3 kg/h', 'unit-wrong-measure'],
  ];

  test.each(refused.map(([text, code]) => ({ text, code, shown: text.slice(0, 30) })))(
    '$shown: $code',
    ({ text, code }) => {
      expect(problem(text, ['length']).code).toBe(code);
    },
  );

  test('a text of many digits and spaces is refused at once', () => {
    expect(problem(`${'1 '.repeat(49)}x`, ['length']).code).toBe('number-grouping');
    expect(problem(`1${' '.repeat(5_000_000)}x`, ['length']).code).toBe('number-unreadable');
  });

  test('what is quoted is short', () => {
    expect(problem('x'.repeat(1_000_000), ['length']).detail).toEqual({ written: `${'x'.repeat(40)}…` });
  });

  test('a bare pressure is never guessed to be absolute or gauge', () => {
    expect(problem('7 bar', PRESSURES)).toMatchObject({
      code: 'pressure-reference-missing',
      detail: { unit: 'bar', choices: 'bar(a), bar(g)' },
    });
    expect(problem('101325 Pa', ['absolute pressure']).detail).toEqual({ unit: 'Pa', choices: 'Pa(a)' });
  });

  test('a reference is refused where a difference is asked', () => {
    const detail = { unit: 'mbar(g)', choices: 'mbar' };
    expect(problem('250 mbar(g)', ['pressure difference'])).toMatchObject({
      code: 'pressure-reference-unwanted',
      detail,
    });
    expect(problem('250 psia', ['pressure difference']).detail).toEqual({ unit: 'psia', choices: 'psi' });
  });

  test('gauge where only absolute makes sense, and the other confusable pairs', () => {
    const pairs: [string, Measure, string][] = [
      ['7 bar(g)', 'absolute pressure', 'gauge pressure'],
      ['7 bar(a)', 'gauge pressure', 'absolute pressure'],
      ['7 m3/h', 'base volume flow', 'volume flow'],
      ['7 base m3/h', 'volume flow', 'base volume flow'],
      ['7 kg/h', 'volume flow', 'mass flow'],
      ['7 cSt', 'dynamic viscosity', 'kinematic viscosity'],
      ['7 cP', 'kinematic viscosity', 'dynamic viscosity'],
      ['7 K', 'length', 'temperature, temperature difference'],
      ['7 % of span', 'share of reading', 'share of span'],
      ['7 inH2O@60degF', 'gauge pressure', 'pressure difference'],
    ];
    for (const [text, expected, actual] of pairs) {
      const found = problem(text, [expected]);
      expect(found.code).toBe('unit-wrong-measure');
      expect(found.detail).toEqual({ unit: text.slice(2), actual, expected });
    }
  });

  test.each([
    ['60 T/h', FLOWS, 't/h'],
    ['60 Kg/h', FLOWS, 'kg/h'],
    ['60 Nm3/h', FLOWS, 'base m3/h'],
    ['60 Sm3/h', FLOWS, 'base m3/h'],
    ['60 scfm', FLOWS, 'base ft3/min'],
    ['7 Bar(g)', PRESSURES, 'bar(g)'],
    ['3 feet', ['length'], 'ft'],
    ['7 kg/m', ['density'], 'kg/m3'],
    ['7 inch', ['length'], 'in'],
  ] as const)('%s is answered with the nearest spelling', (text, measures, first) => {
    const found = problem(text, measures);
    expect(found.code).toBe('unit-unknown');
    const nearest = String(found.detail.nearest).split(', ');
    expect(nearest[0]).toBe(first);
    expect(nearest.length).toBeLessThanOrEqual(3);
  });
});

describe('spellings of the trade', () => {
  test.each([
    ['60 gpm', 'volume flow', '60 gal/min'],
    ['60 tph', 'mass flow', '60 t/h'],
    ['60 t / h', 'mass flow', '60 t/h'],
    ['60 m3/hr', 'volume flow', '60 m3/h'],
    ['60 cfm', 'volume flow', '60 ft3/min'],
    ['7 bar a', 'absolute pressure', '7 bar(a)'],
    ['7 bar g', 'gauge pressure', '7 bar(g)'],
    ['85 C', 'temperature', '85 degC'],
    ['185 F', 'temperature', '185 degF'],
    ['100 mmWC', 'pressure difference', '100 mmH2O'],
    ['10 inWC', 'pressure difference', '10 inH2O'],
  ] as const)('%s', (text, measure, plain) => {
    const [one, other] = [readQuantity(text, [measure], 'field'), readQuantity(plain, [measure], 'field')];
    expect(one.ok && one.value.unit.symbol).toBe(plain.split(' ')[1]);
    expect(one.ok && one.value.si).toBe(other.ok && other.value.si);
  });
});
