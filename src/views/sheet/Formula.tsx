/** A line of working as MathML; a line of paper can break between two of its terms. */
import { createElement, Fragment, type ReactNode } from 'react';
import type { Expression } from '../present/formula.ts';
import { type MathNode, mathLine } from '../present/mathml.ts';
import styles from './working.module.css';

const drawn = ({ tag, text, form, children }: MathNode): ReactNode =>
  createElement(tag, form === undefined ? null : { form }, text, ...children.map(drawn));

const math = (node: MathNode): ReactNode =>
  createElement('math', { className: styles.math, displaystyle: 'true' }, drawn(node));

interface FormulaProps {
  readonly symbol: Expression;
  readonly equals?: Expression | undefined;
}

export function Formula({ symbol, equals }: FormulaProps) {
  const [first, ...terms] = mathLine(symbol, equals);
  if (equals === undefined) return math(first);
  return (
    <p className={styles.formula}>
      {math(first)}
      {terms.map((term, at) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: a term is known by its place in the sum
        <Fragment key={at}> {math(term)}</Fragment>
      ))}
    </p>
  );
}
