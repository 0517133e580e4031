/** Inputs that are seldom touched, folded away under a name. */
import type { ReactNode } from 'react';
import styles from './Fold.module.css';

export function Fold({
  title,
  count,
  children,
}: {
  readonly title: string;
  readonly count?: string;
  readonly children: ReactNode;
}) {
  return (
    <details className={styles.fold}>
      <summary>
        {title}
        {count && <span className={styles.count}>{count}</span>}
      </summary>
      <div className={styles.inner}>{children}</div>
    </details>
  );
}
