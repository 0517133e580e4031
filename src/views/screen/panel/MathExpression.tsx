/** A line of working as MathML, drawn by the browser and read aloud by it. It breaks between its terms. */
import { createElement, type ReactNode } from 'react';
import type { Expression } from '../../present/formula.ts';
import { type MathNode, mathLine } from '../../present/mathml.ts';
import styles from './MathExpression.module.css';

const drawn = ({ tag, text, form, children }: MathNode): ReactNode =>
  createElement(tag, form === undefined ? null : { form }, text, ...children.map(drawn));

const math = (node: MathNode, key: number): ReactNode =>
  createElement('math', { key, displaystyle: 'true' }, drawn(node));

interface Props {
  readonly symbol: Expression;
  readonly equals?: Expression | undefined;
}

export function MathExpression({ symbol, equals }: Props) {
  const line = mathLine(symbol, equals).map(math);
  if (equals === undefined) return <div className={styles.math}>{line}</div>;
  return (
    // A term too wide for the page scrolls, also by the keys.
    <div className={styles.math} {...{ tabIndex: 0, role: 'group', 'aria-label': 'Equation' }}>
      {line}
    </div>
  );
}
