/** The value of a formula, for the tests that hold each working against the figure it explains. */
import { type Expression, nameOf } from './formula.ts';

const calls: Readonly<Record<string, (...values: number[]) => number>> = {
  sqrt: Math.sqrt,
  exp: Math.exp,
  ln: Math.log,
  abs: Math.abs,
  min: Math.min,
  max: Math.max,
};

/** The formula with `values` put in for its names, in their units. A name without a value is a defect. */
export function evaluate(e: Expression, values: Readonly<Record<string, number>>): number {
  const of = (inner: Expression): number => evaluate(inner, values);
  switch (e.type) {
    case 'number':
      return e.value ?? lost(`a figure of the notation`, e.text);
    case 'name':
      return valueFor(nameOf(e), values);
    case 'negative':
      return -of(e.of);
    case 'sum':
      return e.sign === '+' ? of(e.left) + of(e.right) : of(e.left) - of(e.right);
    case 'product':
      return of(e.left) * of(e.right);
    case 'quotient':
      return of(e.left) / of(e.right);
    case 'power':
      return of(e.base) ** of(e.exponent);
    case 'group':
      return of(e.of);
    case 'call':
      return (calls[e.name] ?? lost('a function of the notation', e.name))(...e.arguments.map(of));
  }
}

function valueFor(name: string, values: Readonly<Record<string, number>>): number {
  if (name === 'π') return Math.PI;
  return values[name] ?? lost(`a value for each name, of ${Object.keys(values).join(', ')}`, name);
}

function lost(expected: string, got: string): never {
  throw new Error(`expected ${expected}, got ${got}`);
}
