/** One figure and, opened, how it came about. */
import { useState } from 'react';
import type { WorkingRow } from '../../present/model.ts';
import { Clause } from '../Clause.tsx';
import { MathExpression } from './MathExpression.tsx';
import styles from './Working.module.css';
import { workingId } from './working-place.ts';

interface Props {
  readonly group: string;
  readonly row: WorkingRow;
}

export function WorkingLine({ group, row }: Props) {
  const [open, setOpen] = useState(false);
  return (
    <details
      className={styles.line}
      id={workingId(group, row.id)}
      onToggle={(event) => setOpen(event.currentTarget.open)}
    >
      <summary>
        <span className={styles.name}>{row.title}</span>
        <span className={styles.value}>{row.value.text}</span>
      </summary>
      {open && <Opened row={row} />}
    </details>
  );
}

function Opened({ row }: { readonly row: WorkingRow }) {
  return (
    <div className={styles.opened}>
      {row.formula && <MathExpression symbol={row.symbol} equals={row.formula} />}
      {row.substituted && <MathExpression symbol={row.symbol} equals={row.substituted} />}
      <div className={styles.result}>
        <MathExpression symbol={row.symbol} />
        <b>= {row.value.text}</b>
      </div>
      {row.given.length > 0 && (
        <dl className={styles.given}>
          {row.given.map(({ id, symbol, label, value }) => (
            <div key={id}>
              <dt>
                {symbol && <GivenSymbol name={symbol} />} {label}
              </dt>
              <dd>{value.text}</dd>
            </div>
          ))}
        </dl>
      )}
      {row.remark && <p>{row.remark}</p>}
      <p className={styles.clause}>
        <Clause cited={row.cited} />
      </p>
    </div>
  );
}

/** A symbol of the formula notation: what follows the underscore stands below the line. */
function GivenSymbol({ name }: { readonly name: string }) {
  const [base, below] = name.split('_');
  return (
    <i>
      {base}
      {below && <sub>{below}</sub>}
    </i>
  );
}
