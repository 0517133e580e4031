import { describe, expect, test } from 'vitest';
import { type Spelling, spell } from '../../../src/core/quantity/digits.ts';

const N = '\u202f';
const PRINT: Spelling = { typographic: true };
const ASCII: Spelling = { typographic: false };

describe('spell', () => {
  test.each([
    // Significant digits, half away from zero on the shortest decimal
    [0.59614, { ...ASCII, significant: 4 }, '0.5961'],
    [0.6, { ...ASCII, significant: 4 }, '0.6000'],
    [2.5, { ...ASCII, significant: 1 }, '3'],
    [-2.5, { ...ASCII, significant: 1 }, '-3'],
    [1.005, { ...ASCII, significant: 3 }, '1.01'],
    [9.9996, { ...ASCII, significant: 4 }, '10.00'],
    [123456, { ...ASCII, significant: 4 }, '123500'],
    [0, { ...ASCII, significant: 4 }, '0'],
    [-0, { ...ASCII, significant: 4 }, '0'],
    // Decimals
    [2.675, { ...ASCII, decimals: 2 }, '2.68'],
    [12, { ...ASCII, decimals: 3 }, '12.000'],
    [0.5, { ...ASCII, decimals: 0 }, '1'],
    [-0.0001, { ...ASCII, decimals: 2 }, '0.00'],
    [-0.0001, { ...PRINT, decimals: 2 }, '0.00'],
    [12_345_678.9, { ...ASCII, decimals: 1 }, '12345678.9'],
    // Powers of ten outside 0.001 to a million, by the rounded value
    [1e-3, { ...ASCII, significant: 3 }, '0.00100'],
    [9.99e-4, { ...ASCII, significant: 3 }, '9.99e-4'],
    [9.9999e-4, { ...ASCII, significant: 3 }, '0.00100'],
    [1e6, { ...ASCII, significant: 3 }, '1000000'],
    [999_999.7, { ...PRINT, significant: 6 }, `1${N}000${N}000`],
    [1.01e6, { ...ASCII, significant: 3 }, '1.01e6'],
    [625_000, { ...PRINT, significant: 3, plainTo: 1e5 }, `6.25${N}×${N}10⁵`],
    [-1.8e-3, { ...PRINT, significant: 2, plainFrom: 0.01 }, `\u22121.8${N}×${N}10⁻³`],
    [625_000, { ...ASCII, significant: 3, plainTo: 1e5 }, '6.25e5'],
    [1.5e-10, { ...PRINT, significant: 4 }, `1.500${N}×${N}10⁻¹⁰`],
    [1e23, PRINT, `1${N}×${N}10²³`],
    // Every digit
    [0.1 + 0.2, ASCII, '0.30000000000000004'],
    [5e-324, ASCII, '5e-324'],
    [Number.MAX_VALUE, ASCII, '1.7976931348623157e308'],
    // Groups from the decimal mark both ways, from five digits on
    [1234.5678, PRINT, '1234.5678'],
    [12_345.67891, PRINT, `12${N}345.678${N}91`],
    [123_456.7, PRINT, `123${N}456.7`],
    [0.123456, PRINT, `0.123${N}456`],
    [-12_345, PRINT, `\u221212${N}345`],
    [12_345.67891, { ...PRINT, grouping: false }, '12345.67891'],
    [12_345.67891, { ...ASCII, grouping: true }, '12345.67891'],
    [1.234567e7, PRINT, `1.234${N}567${N}×${N}10⁷`],
    // Decimal comma, on screen and paper only
    [12_345.67891, { ...PRINT, mark: ',' }, `12${N}345,678${N}91`],
    [6.25e7, { ...PRINT, mark: ',' }, `6,25${N}×${N}10⁷`],
    [0.5, { ...ASCII, mark: ',' }, '0.5'],
  ] as [number, Spelling, string][])('%d %j is %s', (value, spelling, text) => {
    expect(spell(value, spelling)).toBe(text);
  });

  test.each([Number.NaN, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY])('%d is a defect', (value) => {
    expect(() => spell(value, ASCII)).toThrow(`expected a finite number to spell, got ${value}`);
  });

  test('two rules at once are a defect', () => {
    expect(() => spell(1, { ...ASCII, significant: 3, decimals: 2 })).toThrow('got both');
  });
});
