/** Laws of quantity text on random values; fast-check prints seed and value when one fails. */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { spell } from '../../../src/core/quantity/digits.ts';
import type { Measure, Unit } from '../../../src/core/quantity/measure.ts';
import type { Outcome } from '../../../src/core/quantity/outcome.ts';
import { readQuantity } from '../../../src/core/quantity/text.ts';
import { readTyped } from '../../../src/core/quantity/typed.ts';
import { UNIT_ROWS } from '../../../src/core/quantity/units.table.ts';
import { convert, fromSI, toSI, unitsFor } from '../../../src/core/quantity/units.ts';

const RUNS = { numRuns: 1000, seed: 20220615 };
const MEASURES = Object.keys(UNIT_ROWS) as Measure[];

const unit = fc.constantFrom(...MEASURES.flatMap((measure) => unitsFor(measure)));
const pair = fc.constantFrom(...MEASURES).chain((measure) => {
  const one = fc.constantFrom(...unitsFor(measure));
  return fc.tuple(one, one);
});

/** Sign, whole digits without a leading zero, decimals: typed by people, so up to nine digits on each side. */
const written = fc.record({
  negative: fc.boolean(),
  whole: fc.nat({ max: 999_999_999 }).map(String),
  decimals: fc.stringMatching(/^\d{0,9}$/),
});
type Written = { negative: boolean; whole: string; decimals: string };

const threes = (digits: string, space: string): string => digits.replace(/(?<=\d)(?=(\d{3})+$)/g, space);
const decimalsInThrees = (digits: string, space: string): string => digits.replace(/(\d{3})(?=\d)/g, `$1${space}`);

function plain({ negative, whole, decimals }: Written, mark = '.'): string {
  return (negative ? '-' : '') + whole + (decimals === '' ? '' : mark + decimals);
}

/** The same number as five people write it. */
function spellings(number: Written): string[] {
  const { negative, whole, decimals } = number;
  const minus = negative ? '\u2212' : '';
  const tail = (mark: string, digits = decimals) => (decimals === '' ? '' : mark + digits);
  const grouped = threes(whole, '.');
  // Two different marks are needed for a mark to group: otherwise a single mark is the decimal mark.
  const german = decimals === '' && grouped.split('.').length === 2 ? whole : grouped;
  return [
    plain(number),
    plain(number, ','),
    minus + german + tail(','),
    `${minus}${threes(whole, ' ')}${tail(',')}`,
    `${minus}${threes(whole, '\u202f')}${tail('.', decimalsInThrees(decimals, '\u202f'))}`,
  ];
}

function value<Value>(outcome: Outcome<Value>): Value {
  if (!outcome.ok) throw new Error(JSON.stringify(outcome.problems));
  return outcome.value;
}

const readBack = (text: string, { measure }: Unit) => value(readTyped(text, [measure], 'place'));

describe('laws of quantity text', () => {
  test('five spellings of a number are one value', () => {
    fc.assert(
      fc.property(written, unit, (number, of) => {
        const file = value(readQuantity(`${plain(number)} ${of.symbol}`, [of.measure], 'place'));
        for (const spelling of spellings(number)) {
          for (const text of [`${spelling} ${of.symbol}`, `${spelling}${of.print}`]) {
            expect(readBack(text, of).echo.si).toBe(file.si);
          }
        }
      }),
      RUNS,
    );
  });

  test('what was typed is the file text for good: leaving the field and coming back changes nothing', () => {
    fc.assert(
      fc.property(written, unit, (number, of) => {
        for (const spelling of spellings(number)) {
          const first = readBack(`${spelling} ${of.symbol}`, of);
          expect(value(readQuantity(first.file, [of.measure], 'place'))).toEqual(first.echo);
          expect(readBack(first.file, of)).toEqual(first);
          const { number: digits, unit: same } = first.echo;
          expect(value(readTyped(digits, [of.measure], 'place', { unit: same }))).toEqual(first);
          expect(value(readTyped(same.symbol, [of.measure], 'place', { number: digits, unit: same }))).toEqual(first);
        }
      }),
      RUNS,
    );
  });

  test('every text that a file may hold reads the same when it is typed', () => {
    const number = fc.stringMatching(/^[+-]?(\d{1,9}\.?\d{0,9}|\.\d{1,9})([eE][+-]?\d{1,2})?$/);
    fc.assert(
      fc.property(number, unit, (digits, of) => {
        const text = `${digits} ${of.symbol}`;
        expect(readBack(text, of).echo.si).toBe(value(readQuantity(text, [of.measure], 'place')).si);
      }),
      RUNS,
    );
  });

  test('no text makes a parser throw or answer with a number that is not finite', () => {
    const mark = fc.constantFrom(...'0123456789.,+-eE×⁵⁻ ()/%°m\u00a0\u202f\u2212\u2009', 'bar', 'bar(g)', ' 10', 'K');
    const noise = fc.oneof(
      fc.string({ maxLength: 30 }),
      fc.string({ unit: 'binary', maxLength: 30 }),
      fc.array(mark, { maxLength: 14 }).map((marks) => marks.join('')),
    );
    fc.assert(
      fc.property(noise, fc.subarray(MEASURES, { minLength: 1, maxLength: 3 }), (text, measures) => {
        const file = readQuantity(text, measures, 'place');
        const typed = readTyped(text, measures, 'place');
        if (file.ok) expect(Number.isFinite(file.value.si)).toBe(true);
        if (file.ok) expect(value(typed).echo.si).toBe(file.value.si);
        if (typed.ok) expect(Number.isFinite(typed.value.echo.si)).toBe(true);
      }),
      { ...RUNS, numRuns: 3000 },
    );
  });

  test('into another unit and back is the number, to the digits that are kept', () => {
    fc.assert(
      fc.property(written, pair, (number, [from, to]) => {
        const digits = plain(number);
        const away = convert(digits, from, to);
        const back = Number(convert(away, to, from));
        // Twelve digits are kept each way, of a number that an offset may have made larger.
        const magnitude = Math.abs(Number(away)) * (fromSI(1, from) / fromSI(1, to));
        const scale =
          (from.offset ?? to.offset) ? Math.abs(Number(digits)) + 1000 : Math.max(Math.abs(Number(digits)), magnitude);
        expect(Math.abs(back - Number(digits))).toBeLessThanOrEqual(1.1e-11 * scale);
      }),
      RUNS,
    );
  });

  test('an SI value shown in a unit and read again is the value', () => {
    const si = fc.double({ min: 1e-6, max: 1e8, noNaN: true });
    fc.assert(
      fc.property(si, unit, (number, of) => {
        const shown = String(fromSI(number, of));
        expect(Math.abs(toSI(shown, of) - number)).toBeLessThanOrEqual(4e-16 * (number + (of.offset ? 1000 : 0)));
      }),
      RUNS,
    );
  });

  test('a number that is spelled is read as the number that it spells', () => {
    const significant = fc.integer({ min: 1, max: 12 });
    const any = fc.double({ noNaN: true, noDefaultInfinity: true, min: -1e200, max: 1e200 });
    const mark = fc.constantFrom('.' as const, ',' as const);
    fc.assert(
      fc.property(any, significant, mark, (number, digits, comma) => {
        const ascii = spell(number, { significant: digits, typographic: false });
        const print = spell(number, { significant: digits, typographic: true, mark: comma });
        const half = 0.5 * 10 ** (exponent(number) + 1 - digits);
        expect(Math.abs(Number(ascii) - number)).toBeLessThanOrEqual(1.001 * half); // the check itself is in doubles
        const shown = ascii.replace(/e.*/, '').replace(/^-?[0.]*|\./g, '');
        if (number !== 0 && Math.abs(number) < 1) expect(shown).toHaveLength(digits);
        if (number !== 0 && Math.abs(number) > 1e-200)
          expect(readBack(`${print} m`, LENGTH).echo.si).toBe(Number(ascii));
      }),
      RUNS,
    );
  });
});

const LENGTH = unitsFor('length').find((row) => row.symbol === 'm') as Unit;
const exponent = (number: number): number => Number(number.toExponential().split('e')[1]);
