/** A formula as nodes of MathML, for whoever draws them. MathML Core, W3C, gives the tags. */
import type { Expression } from './formula.ts';

export interface MathNode {
  readonly tag: 'mrow' | 'mi' | 'mn' | 'mo' | 'mfrac' | 'msqrt' | 'msub' | 'msup';
  /** What a token shows; absent where there are children. */
  readonly text?: string;
  /** An operator that stands first in its row and still belongs between two terms. */
  readonly form?: 'infix';
  readonly children: readonly MathNode[];
}

const token = (tag: MathNode['tag'], text: string): MathNode => ({ tag, text, children: [] });
const node = (tag: MathNode['tag'], ...children: readonly MathNode[]): MathNode => ({ tag, children });
const row = (...children: readonly MathNode[]): MathNode => node('mrow', ...children);
const name = (text: string): MathNode => token('mi', text);
const operator = (text: string): MathNode => token('mo', text);
const sign = (of: '+' | '-'): MathNode => operator(of === '+' ? '+' : '\u2212');

/**
 * A line of working in pieces between which it may be broken: the symbol with its equals sign, then term by term the sum
 * behind it, each with its own sign. The symbol alone where nothing stands behind it.
 */
export function mathLine(symbol: Expression, equals?: Expression): readonly [MathNode, ...MathNode[]] {
  if (equals === undefined) return [mathOf(symbol)];
  return [row(mathOf(symbol), operator('=')), ...terms(equals)];
}

function terms(e: Expression): readonly MathNode[] {
  if (e.type !== 'sum') return [mathOf(e)];
  return [...terms(e.left), row({ ...sign(e.sign), form: 'infix' }, mathOf(e.right))];
}

/** One expression as one node. */
export function mathOf(e: Expression): MathNode {
  switch (e.type) {
    case 'number':
      return token('mn', e.text);
    case 'name':
      return e.subscript === undefined ? name(e.base) : node('msub', name(e.base), name(e.subscript));
    case 'negative':
      return row(operator('\u2212'), mathOf(e.of));
    case 'sum':
      return row(mathOf(e.left), sign(e.sign), mathOf(e.right));
    case 'product':
      return product(e.left, e.right);
    case 'quotient':
      return node('mfrac', bare(e.left), bare(e.right));
    case 'power':
      return node('msup', mathOf(e.base), bare(e.exponent));
    case 'call':
      return call(e.name, e.arguments);
    case 'group':
      return row(operator('('), mathOf(e.of), operator(')'));
  }
}

/** Between figures a cross, otherwise nothing: 2 × 3, but 2β. */
function product(left: Expression, right: Expression): MathNode {
  const figures = right.type === 'number' || (right.type === 'power' && right.base.type === 'number');
  return row(mathOf(left), operator(figures ? '\u00d7' : '\u2062'), mathOf(right));
}

function call(called: string, list: readonly Expression[]): MathNode {
  const [only] = list;
  if (called === 'sqrt' && only) return node('msqrt', mathOf(only));
  if (called === 'abs' && only) return row(operator('|'), mathOf(only), operator('|'));
  const inner = list.flatMap((argument, at) => [...(at === 0 ? [] : [operator(';')]), mathOf(argument)]);
  return row(name(called), operator('\u2061'), operator('('), ...inner, operator(')'));
}

/** A fraction and an exponent hold their content together, so its outer parentheses are not drawn. */
const bare = (e: Expression): MathNode => row(mathOf(e.type === 'group' ? e.of : e));
