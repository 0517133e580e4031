/** A formula as MathML, drawn by the browser and read aloud by it. */
import { createElement, type ReactNode } from 'react';
import type { Expression } from '../../present/formula.ts';
import styles from './MathExpression.module.css';

const element = (name: string, ...children: ReactNode[]): ReactNode => createElement(name, null, ...children);
const operator = (text: string): ReactNode => element('mo', text);
const row = (...children: ReactNode[]): ReactNode => element('mrow', ...children);

/** One letter stands upright or slanted by the renderer's own rule; a name of several letters is text of one piece. */
const identifier = (base: string): ReactNode => element('mi', base);

function call(name: string, list: readonly Expression[]): ReactNode {
  const [only] = list;
  if (name === 'sqrt' && only) return element('msqrt', of(only));
  if (name === 'abs' && only) return row(operator('|'), of(only), operator('|'));
  const inner = list.flatMap((argument, at) => [at === 0 ? undefined : operator(';'), of(argument)]);
  return row(element('mi', name), operator('\u2061'), operator('('), ...inner, operator(')'));
}

const isTerm = ({ type }: Expression): boolean => type === 'number' || type === 'name' || type === 'group';

function product(left: Expression, right: Expression): ReactNode {
  const figures = right.type === 'number' || (right.type === 'power' && right.base.type === 'number');
  return row(of(left), operator(figures ? '\u00d7' : '\u2062'), of(right));
}

function of(expression: Expression): ReactNode {
  switch (expression.type) {
    case 'number':
      return element('mn', expression.text);
    case 'name':
      return expression.subscript === undefined
        ? identifier(expression.base)
        : element('msub', identifier(expression.base), identifier(expression.subscript));
    case 'negative':
      return row(operator('\u2212'), of(expression.of));
    case 'sum':
      return row(of(expression.left), operator(expression.sign === '+' ? '+' : '\u2212'), of(expression.right));
    case 'product':
      return product(expression.left, expression.right);
    case 'quotient':
      return element('mfrac', bare(expression.left), bare(expression.right));
    case 'power':
      return element(
        'msup',
        isTerm(expression.base) ? of(expression.base) : row(of(expression.base)),
        bare(expression.exponent),
      );
    case 'call':
      return call(expression.name, expression.arguments);
    case 'group':
      return row(operator('('), of(expression.of), operator(')'));
  }
}

/** A fraction and an exponent hold their content together, so its outer parentheses are not drawn. */
const bare = (expression: Expression): ReactNode => row(of(expression.type === 'group' ? expression.of : expression));

/** The terms of a sum from left to right, so that a long line may break between them. */
function terms(expression: Expression): readonly ReactNode[] {
  if (expression.type !== 'sum') return [of(expression)];
  const sign = createElement('mo', { form: 'infix' }, expression.sign === '+' ? '+' : '\u2212');
  return [...terms(expression.left), row(sign, of(expression.right))];
}

const math = (key: string, content: ReactNode): ReactNode =>
  createElement('math', { key, displaystyle: 'true' }, content);

interface Props {
  readonly symbol: Expression;
  readonly equals?: Expression | undefined;
}

export function MathExpression({ symbol, equals }: Props) {
  const list = equals === undefined ? [] : terms(equals);
  const start = list.length === 0 ? of(symbol) : row(of(symbol), operator('='));
  return (
    // A line too wide for the page scrolls, also by the keys.
    <div
      className={styles.math}
      {...(list.length === 0 ? {} : { tabIndex: 0, role: 'group', 'aria-label': 'Equation' })}
    >
      {math('symbol', start)}
      {list.map((term, at) => math(String(at), term))}
    </div>
  );
}
