import fc from 'fast-check';
import { expect, it } from 'vitest';
import { evaluate } from '../../../src/views/present/evaluate.ts';
import { type Expression, parseFormula } from '../../../src/views/present/formula.ts';
import { substitute } from '../../../src/views/present/substitute.ts';
import { formulaText } from './sheet-text.ts';

interface Sum {
  readonly text: string;
  readonly value: number;
}

/** Formulas written with all their parentheses, beside the value that plain arithmetic gives them. */
const { sum } = fc.letrec<{ sum: Sum; leaf: Sum }>((tie) => ({
  leaf: fc.oneof(
    fc.integer({ min: 1, max: 999 }).map((value) => ({ text: String(value), value })),
    fc.integer({ min: 1, max: 99 }).map((value) => ({ text: `${value}e-2`, value: Number(`${value}e-2`) })),
    fc
      .constantFrom(...Object.entries({ a: 2.5, β: 0.6, q_m: 16.7, Re_D: 1e5, "l'_2": -3 }))
      .map(([text, value]) => ({ text, value })),
  ),
  sum: fc.oneof(
    { depthSize: 'small', withCrossShrink: true },
    tie('leaf'),
    fc.tuple(tie('sum'), tie('sum')).map(([a, b]) => ({ text: `(${a.text}) + (${b.text})`, value: a.value + b.value })),
    fc.tuple(tie('sum'), tie('sum')).map(([a, b]) => ({ text: `(${a.text})-(${b.text})`, value: a.value - b.value })),
    fc.tuple(tie('sum'), tie('sum')).map(([a, b]) => ({ text: `(${a.text}) * (${b.text})`, value: a.value * b.value })),
    fc.tuple(tie('sum'), tie('leaf')).map(([a, b]) => ({ text: `(${a.text}) / ${b.text}`, value: a.value / b.value })),
    tie('sum').map((a) => ({ text: `-(${a.text})`, value: -a.value })),
    tie('sum').map((a) => ({ text: `(${a.text})^2`, value: a.value ** 2 })),
    tie('sum').map((a) => ({ text: `sqrt(abs(${a.text}))`, value: Math.sqrt(Math.abs(a.value)) })),
    fc
      .tuple(tie('sum'), tie('sum'))
      .map(([a, b]) => ({ text: `max(${a.text}; ${b.text})`, value: Math.max(a.value, b.value) })),
  ),
}));

const values = { a: 2.5, β: 0.6, q_m: 16.7, Re_D: 1e5, "l'_2": -3 };

it('a formula has the value of its arithmetic', () => {
  fc.assert(
    fc.property(sum, ({ text, value }) => {
      expect(evaluate(parseFormula(text), values)).toEqual(value);
    }),
    { numRuns: 500 },
  );
});

/** Two numbers and a name joined by operators without parentheses, against the language's own precedence. */
it('without parentheses, products bind before sums and from the left', () => {
  const operator = fc.constantFrom('+', '-', '*', '/');
  const number = fc.integer({ min: 1, max: 50 });
  fc.assert(
    fc.property(number, operator, number, operator, number, (a, first, b, second, c) => {
      const apply = (left: number, mark: string, right: number): number =>
        ({ '+': left + right, '-': left - right, '*': left * right, '/': left / right })[mark] ?? Number.NaN;
      const later = '*/'.includes(second) && '+-'.includes(first);
      const expected = later ? apply(a, first, apply(b, second, c)) : apply(apply(a, first, b), second, c);
      expect(evaluate(parseFormula(`${a} ${first} ${b} ${second} ${c}`), {})).toBe(expected);
    }),
  );
});

/** Names below a node. */
const names = (e: Expression): number => (JSON.stringify(e).match(/"type":"name"/g) ?? []).length;

it('putting numbers in leaves no name and keeps the value', () => {
  const printed = Object.fromEntries(Object.entries(values).map(([name, value]) => [name, String(value)]));
  fc.assert(
    fc.property(sum, ({ text, value }) => {
      const put = substitute(parseFormula(text), printed);
      expect(names(put)).toBe(0);
      // Printed and read again: parentheses stand where they must.
      const again = formulaText(put)
        .replaceAll('·', '*')
        .replaceAll('−', '-')
        .replace(/(\d+) × 10⁻²/g, '$1e-2')
        .replaceAll('10⁻²', '1e-2');
      expect(evaluate(parseFormula(again), {})).toEqual(value);
    }),
    { numRuns: 300 },
  );
});

it('any text is read or refused with a reason, never read by half', () => {
  fc.assert(
    fc.property(fc.string({ unit: fc.constantFrom(...'aβ1e2.+-*/^();_ sqrt') }), (text) => {
      try {
        parseFormula(text);
      } catch (cause) {
        expect(String(cause)).toMatch(/expected .+, got .+/);
      }
    }),
    { numRuns: 500 },
  );
});
