/** A formula as MathML. A long sum is set term by term, so that a line of paper can break between two terms. */
import { createElement, Fragment, type ReactNode } from 'react';
import type { Expression } from '../present/formula.ts';
import styles from './working.module.css';

const element = (name: string, ...children: ReactNode[]): ReactNode => createElement(name, null, ...children);
const operator = (text: string): ReactNode => element('mo', text);
const row = (...children: ReactNode[]): ReactNode => element('mrow', ...children);
const name = (text: string): ReactNode => element('mi', text);

interface FormulaProps {
  readonly symbol: Expression;
  readonly equals?: Expression | undefined;
}

export function Formula({ symbol, equals }: FormulaProps) {
  if (equals === undefined) return math('only', drawn(symbol));
  const [first, ...more] = termsOf(equals);
  return (
    <p className={styles.formula}>
      {math('first', row(drawn(symbol), operator('='), first === undefined ? null : term(first, true)))}
      {more.map((one, at) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: a term is known by its place in the sum
        <Fragment key={at}> {math('next', term(one, false))}</Fragment>
      ))}
    </p>
  );
}

const math = (key: string, content: ReactNode): ReactNode =>
  createElement('math', { key, className: styles.math, displaystyle: 'true' }, content);

interface Term {
  readonly sign: '+' | '-';
  readonly of: Expression;
}

/** The terms of a sum, left to right; whatever is no sum is one term. */
function termsOf(expression: Expression): readonly Term[] {
  if (expression.type !== 'sum') return [{ sign: '+', of: expression }];
  return [...termsOf(expression.left), { sign: expression.sign, of: expression.right }];
}

const sign = (of: '+' | '-'): ReactNode => operator(of === '+' ? '+' : '\u2212');
const term = ({ sign: own, of }: Term, first: boolean): ReactNode => (first ? drawn(of) : row(sign(own), drawn(of)));

function call(called: string, list: readonly Expression[]): ReactNode {
  const [only] = list;
  if (called === 'sqrt' && only) return element('msqrt', drawn(only));
  if (called === 'abs' && only) return row(operator('|'), drawn(only), operator('|'));
  const inner = list.flatMap((argument, at) => [at === 0 ? undefined : operator(';'), drawn(argument)]);
  return row(name(called), operator('\u2061'), operator('('), ...inner, operator(')'));
}

/** Between figures a cross, otherwise nothing: 2 × 3, but 2β. */
function product(left: Expression, right: Expression): ReactNode {
  const figures = right.type === 'number' || (right.type === 'power' && right.base.type === 'number');
  return row(drawn(left), operator(figures ? '\u00d7' : '\u2062'), drawn(right));
}

function drawn(e: Expression): ReactNode {
  switch (e.type) {
    case 'number':
      return element('mn', e.text);
    case 'name':
      return e.subscript === undefined ? name(e.base) : element('msub', name(e.base), name(e.subscript));
    case 'negative':
      return row(operator('\u2212'), drawn(e.of));
    case 'sum':
      return row(drawn(e.left), sign(e.sign), drawn(e.right));
    case 'product':
      return product(e.left, e.right);
    case 'quotient':
      return element('mfrac', bare(e.left), bare(e.right));
    case 'power':
      return element(
        'msup',
        e.base.type === 'power' ? row(operator('('), drawn(e.base), operator(')')) : row(drawn(e.base)),
        bare(e.exponent),
      );
    case 'call':
      return call(e.name, e.arguments);
    case 'group':
      return row(operator('('), drawn(e.of), operator(')'));
  }
}

/** A fraction and an exponent hold their content together, so its outer parentheses are not drawn. */
const bare = (e: Expression): ReactNode => row(drawn(e.type === 'group' ? e.of : e));
