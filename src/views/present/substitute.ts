/** The formula with its numbers put in, each as it is printed. */
import { type Expression, nameOf } from './formula.ts';

/** Where a figure lands; a negative one or a power of ten stands in parentheses where it would else be misread. */
type Place = 'alone' | 'factor' | 'base';

/**
 * Names become printed figures; π stays. A negative figure is put in parentheses behind any operator, a figure with a
 * power of ten where it is raised to a power. A name without a value is a defect.
 */
export function substitute(e: Expression, values: Readonly<Record<string, string>>): Expression {
  return put(e, values, 'alone');
}

function put(e: Expression, values: Readonly<Record<string, string>>, place: Place): Expression {
  const to = (inner: Expression, where: Place): Expression => put(inner, values, where);
  switch (e.type) {
    case 'number':
      return e;
    case 'name':
      return figure(nameOf(e), e, values, place);
    case 'negative':
      return { type: 'negative', of: to(e.of, 'factor') };
    case 'sum':
      return { type: 'sum', sign: e.sign, left: to(e.left, 'alone'), right: to(e.right, 'factor') };
    case 'product':
      return { type: 'product', left: to(e.left, 'factor'), right: to(e.right, 'factor') };
    case 'quotient':
      return { type: 'quotient', left: to(e.left, 'factor'), right: to(e.right, 'factor') };
    case 'power':
      return { type: 'power', base: to(e.base, 'base'), exponent: to(e.exponent, 'alone') };
    case 'call':
      return { type: 'call', name: e.name, arguments: e.arguments.map((inner) => to(inner, 'alone')) };
    case 'group':
      return { type: 'group', of: to(e.of, 'alone') };
  }
}

function figure(name: string, e: Expression, values: Readonly<Record<string, string>>, place: Place): Expression {
  if (name === 'π') return e;
  const text = values[name];
  if (text === undefined) throw new Error(`expected a printed value for ${name}, got none`);
  const number: Expression = { type: 'number', text };
  const negative = text.startsWith('−') || text.startsWith('-');
  const apart = (place === 'factor' && negative) || (place === 'base' && (negative || text.includes('×')));
  return apart ? { type: 'group', of: number } : number;
}
