/** Inputs that are seldom touched, folded away under a name. */
import type { ReactNode } from 'react';
import styles from './Fold.module.css';

export function Fold({
  title,
  count,
  open = false,
  children,
}: {
  readonly title: string;
  readonly count?: string;
  /** Whether it stands open at first. */
  readonly open?: boolean;
  readonly children: ReactNode;
}) {
  return (
    <details className={styles.fold} open={open}>
      <summary>
        {title}
        {count && <span className={styles.count}>{count}</span>}
      </summary>
      <div className={styles.inner}>{children}</div>
    </details>
  );
}
