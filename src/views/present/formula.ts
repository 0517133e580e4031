/**
 * Formula notation of core/quantity/working.ts as a tree: read it, evaluate it, put numbers into it.
 *
 * A malformed formula is our own mistake, never the user's: it throws a defect that says expected and got.
 */
import { type Token, tokens } from './tokens.ts';

export type Expression =
  | { readonly type: 'number'; readonly text: string; readonly value?: number } // as to be printed; value as written
  | { readonly type: 'name'; readonly base: string; readonly subscript?: string }
  | { readonly type: 'negative'; readonly of: Expression }
  | { readonly type: 'sum'; readonly sign: '+' | '-'; readonly left: Expression; readonly right: Expression }
  | { readonly type: 'product'; readonly left: Expression; readonly right: Expression }
  | { readonly type: 'quotient'; readonly left: Expression; readonly right: Expression }
  | { readonly type: 'power'; readonly base: Expression; readonly exponent: Expression }
  | { readonly type: 'call'; readonly name: string; readonly arguments: readonly Expression[] }
  | { readonly type: 'group'; readonly of: Expression };

/** How many arguments a function takes: the least and the most. */
const functions: Readonly<Record<string, readonly [number, number]>> = {
  sqrt: [1, 1],
  exp: [1, 1],
  ln: [1, 1],
  abs: [1, 1],
  min: [2, 9],
  max: [2, 9],
};

const precedence: Readonly<Record<string, number>> = { '+': 1, '-': 1, '*': 2, '/': 2, '^': 4 };
const ofNegative = 3; // -x^2 is -(x^2); -x*y is (-x)*y

/** The formula while it is read: its tokens and how far the reading has come. */
interface Reading {
  readonly text: string;
  readonly list: readonly Token[];
  at: number;
}

/** Formula to tree. Products and fractions bind from the left, powers from the right. Throws a defect if malformed. */
export function parseFormula(text: string): Expression {
  const reading: Reading = { text, list: tokens(text), at: 0 };
  const whole = expression(reading, 0);
  return reading.at < reading.list.length ? wrong(reading, 'an operator or the end') : whole;
}

function wrong({ text, list, at }: Reading, expected: string): never {
  throw new Error(`expected ${expected} in formula '${text}', got ${list[at]?.text ?? 'its end'}`);
}

const next = ({ list, at }: Reading): string => list[at]?.text ?? '';

function take(reading: Reading, mark: string): void {
  if (next(reading) !== mark) wrong(reading, `'${mark}'`);
  reading.at += 1;
}

/** An operand and every operator after it that binds more strongly than `above`. */
function expression(reading: Reading, above: number): Expression {
  let left = operand(reading);
  for (;;) {
    const mark = next(reading);
    const strength = precedence[mark] ?? 0;
    if (strength <= above) return left;
    reading.at += 1;
    left = combined(mark, left, expression(reading, mark === '^' ? ofNegative : strength));
  }
}

function operand(reading: Reading): Expression {
  const token = reading.list[reading.at];
  if (token === undefined) return wrong(reading, 'a number, a name or a parenthesis');
  const { type, text } = token;
  if (type === 'mark' && text !== '-' && text !== '(') return wrong(reading, 'a number, a name or a parenthesis');
  reading.at += 1;
  if (type === 'number') return { type, text: printed(text), value: Number(text) };
  if (type === 'name') return next(reading) === '(' ? call(reading, text) : named(text);
  if (text === '-') return { type: 'negative', of: expression(reading, ofNegative) };
  const of = expression(reading, 0);
  take(reading, ')');
  return { type: 'group', of };
}

function call(reading: Reading, name: string): Expression {
  const [least, most] = functions[name] ?? wrong(reading, `a function out of ${Object.keys(functions).join(', ')}`);
  take(reading, '(');
  const found = [expression(reading, 0)];
  while (next(reading) === ';') {
    reading.at += 1;
    found.push(expression(reading, 0));
  }
  take(reading, ')');
  if (found.length < least || found.length > most) wrong(reading, `${least} to ${most} arguments of ${name}`);
  return { type: 'call', name, arguments: found };
}

function combined(mark: string, left: Expression, right: Expression): Expression {
  if (mark === '+' || mark === '-') return { type: 'sum', sign: mark, left, right };
  if (mark === '*') return { type: 'product', left, right };
  if (mark === '/') return { type: 'quotient', left, right };
  return { type: 'power', base: left, exponent: right };
}

function named(text: string): Expression {
  const [base = '', subscript] = text.split('_');
  return subscript === undefined ? { type: 'name', base } : { type: 'name', base, subscript };
}

/** The name of a node as `given` writes it. */
export const nameOf = (e: { readonly base: string; readonly subscript?: string }): string =>
  e.subscript === undefined ? e.base : `${e.base}_${e.subscript}`;

const superscripts: Readonly<Record<string, string>> = Object.fromEntries(
  [...'-0123456789'].map((digit, place) => [digit, [...'⁻⁰¹²³⁴⁵⁶⁷⁸⁹'][place] ?? '']),
);

/** A number of the notation as it is printed: 1e6 as 10⁶, 2.5e-5 as 2.5 × 10⁻⁵, others as written. */
function printed(text: string): string {
  const [mantissa = '', exponent] = text.toLowerCase().split('e');
  if (exponent === undefined) return text;
  const power = `10${[...exponent.replace('+', '')].map((digit) => superscripts[digit]).join('')}`;
  return mantissa === '1' ? power : `${mantissa} × ${power}`;
}
