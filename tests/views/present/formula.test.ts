import { describe, expect, it } from 'vitest';
import { evaluate } from '../../../src/views/present/evaluate.ts';
import { parseFormula } from '../../../src/views/present/formula.ts';
import { substitute } from '../../../src/views/present/substitute.ts';

const value = (text: string, values: Record<string, number> = {}) => evaluate(parseFormula(text), values);

describe('order of operations', () => {
  // Expected by the usual rules of arithmetic, worked by hand.
  it.each([
    ['1 + 2*3', 7],
    ['8/4/2', 1],
    ['8/4*2', 4],
    ['7-4-2', 1],
    ['2^3^2', 512],
    ['-2^2', -4],
    ['2^-1', 0.5],
    ['2*-3', -6],
    ['-2*3 + 10', 4],
    ['(1+2)*3', 9],
    ['sqrt(16) + abs(-3)', 7],
    ['min(3; 1; 2) + max(4; 5)', 6],
    ['ln(exp(2))', 2],
    ['1e6/2.5e-1', 4e6],
    ['π/4', 0.7853981633974483],
  ])('%s', (text, expected) => expect(value(text)).toBeCloseTo(expected, 12));
});

it('reads names with Greek letters and subscripts', () => {
  expect(value('C*E*ε*π/4*d^2*sqrt(2*Δp*ρ_1)', { C: 0.6, E: 1.1, ε: 1, d: 0.05, Δp: 25000, ρ_1: 970 })).toBeCloseTo(
    0.6 * 1.1 * (Math.PI / 4) * 0.05 ** 2 * Math.sqrt(2 * 25000 * 970),
    12,
  );
  expect(parseFormula('Re_D')).toEqual({ type: 'name', base: 'Re', subscript: 'D' });
});

describe('a malformed formula is a defect that says expected and got', () => {
  it.each(['', '1 +', '(1', '1)', '2 3', 'foo(1)', 'min(1)', 'sqrt(1; 2)', 'a = b', '1,5', '* 2', '2 ^', 'a__b'])(
    '%j',
    (text) => expect(() => parseFormula(text)).toThrow(/expected .*, got /),
  );
  it('a name without a value', () => expect(() => value('a + 1')).toThrow(/expected .*, got a/));
});

it('prints powers of ten as such', () => {
  expect(parseFormula('1e6')).toEqual({ type: 'number', text: '10⁶', value: 1e6 });
  expect(parseFormula('2.5e-5')).toEqual({ type: 'number', text: '2.5 × 10⁻⁵', value: 2.5e-5 });
});

describe('numbers put in', () => {
  const put = (text: string, values: Record<string, string>) => substitute(parseFormula(text), values);
  it('stand in parentheses where a sign or a power of ten would be misread', () => {
    expect(put('a^2', { a: '−3' })).toMatchObject({ base: { type: 'group', of: { text: '−3' } } });
    expect(put('a^2', { a: '6.2 × 10⁵' })).toMatchObject({ base: { type: 'group' } });
    expect(put('2*a', { a: '−3' })).toMatchObject({ right: { type: 'group' } });
    expect(put('2*a', { a: '6.2 × 10⁵' })).toMatchObject({ right: { type: 'number', text: '6.2 × 10⁵' } });
    expect(put('a + 1', { a: '−3' })).toMatchObject({ left: { type: 'number' } });
  });
  it('leave π and plain numbers alone, and need a value for each name', () => {
    expect(put('π/4', {})).toEqual(parseFormula('π/4'));
    expect(() => put('a', {})).toThrow(/expected .*, got none/);
  });
});
