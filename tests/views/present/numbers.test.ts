import { describe, expect, it } from 'vitest';
import { readQuantity } from '../../../src/core/quantity/text.ts';
import { asWritten, printer, show } from '../../../src/views/present/numbers.ts';
import { unitText } from '../../../src/views/present/unit-text.ts';
import { displayUnits, unit } from '../../../src/views/present/units.ts';
import { article } from '../../../src/views/words/answers.ts';
import { range } from '../../../src/views/words/findings.ts';

const SI = printer(displayUnits({}, 'SI'));
const US = printer(displayUnits({}, 'US'));
const spaced = (text: string): string => text.replace(/[\u00a0\u202f]/g, ' ');

describe('the rounding rule', () => {
  it.each([
    [0.0624849, 'bore', '62.48 mm', '2.4600 in'],
    [0.000050049, 'roughness', '50 µm', '2000 µin'],
    [25000, 'differential', '250.0 mbar', '100.4 inH₂O'],
    [801325, 'pressure', '8.013 bar(a)', '116.2 psi(a)'],
    [16.6666666, 'massFlow', '60.00 t/h', '132 300 lb/h'],
    [358.15, 'temperature', '85.0 °C', '185.0 °F'],
    [5, 'temperatureDifference', '5.0 K', '9.0 °F'],
    [622181, 'reynolds', '6.22 × 10⁵', '6.22 × 10⁵'],
    [7518.6, 'reynolds', '7520', '7520'],
    [0.6073999, 'coefficient', '0.6074', '0.6074'],
    [0.7049, 'uncertainty', '0.70 %', '0.70 %'],
    [3.9413, 'percent', '3.94 %', '3.94 %'],
    [41.5, 'bores', '41.5 D', '41.5 D'],
    [2.091, 'velocity', '2.09 m/s', '6.86 ft/s'],
  ] as const)('%d as %s', (si, role, inSI, inUS) => {
    expect(spaced(SI.value(si, role).text)).toBe(inSI);
    expect(spaced(US.value(si, role).text)).toBe(inUS);
    expect(SI.value(si, role).si).toBe(si);
  });
  it('a limit keeps no zeros that only say how it was rounded', () => {
    expect(spaced(SI.print.limit(0.75, 'ratio'))).toBe('0.75');
    expect(spaced(SI.print.limit(1, 'bore'))).toBe('1000 mm');
    expect(spaced(SI.print.limit(1e7, 'reynolds'))).toBe('1 × 10⁷');
    expect(spaced(SI.print.limit(0.0375, 'percent'))).toBe('0.0375 %');
  });
});

it('keeps what the user wrote, with the sign and unit of print and the ASCII of the clipboard', () => {
  const read = readQuantity('-3.20 degC', ['temperature'], '');
  if (!read.ok) throw new Error('expected a temperature, got a problem');
  expect(asWritten(read.value)).toEqual({
    number: '−3.20',
    unit: '°C',
    text: '−3.20\u00a0°C',
    plain: '-3.20 degC',
    si: 269.95,
  });
});

it('a plane angle carries its sign without a space', () => {
  expect(show(Math.PI / 4, unit('deg', 'angle'), { significant: 3 }).text).toBe('45.0°');
});

it('prints a unit of a formula whether or not the table knows it', () => {
  expect(['kg/m3', 'J/(kg.K)', 'Pa.s', 'Pa(a)', '1/K', ''].map(unitText)).toEqual([
    'kg/m³',
    'J/(kg·K)',
    'Pa·s',
    'Pa(a)',
    '1/K',
    '',
  ]);
});

it('a range has its unit once', () => {
  expect(range('1.2\u00a0mm', '3\u00a0mm')).toBe('1.2 to 3\u00a0mm');
  expect(range('1.2\u00a0mm', '3\u00a0m')).toBe('1.2\u00a0mm to 3\u00a0m');
  expect(range('0.1', '0.75')).toBe('0.1 to 0.75');
  expect(range('7\u00a0D', '7\u00a0D')).toBe('7\u00a0D');
});

it.each([
  ['8', 'An'],
  ['80.5', 'An'],
  ['11.2', 'An'],
  ['18', 'An'],
  ['110', 'A'],
  ['180.2', 'A'],
  ['1.8', 'A'],
  ['62.48', 'A'],
] as const)('%s takes %s', (number, word) => expect(article(number)).toBe(word));
