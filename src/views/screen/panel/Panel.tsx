/** A card with a heading. While the result is an earlier one it is dimmed, hatched and says so. */
import type { ReactNode } from 'react';
import styles from './Panel.module.css';

interface Props {
  readonly id: string;
  readonly title: string;
  readonly stale?: boolean;
  readonly aside?: ReactNode;
  readonly children: ReactNode;
}

export function Panel({ id, title, stale = false, aside, children }: Props) {
  return (
    <section className={styles.panel} aria-labelledby={`${id}-title`} id={id} data-stale={stale}>
      <header className={styles.head}>
        <h2 id={`${id}-title`}>{title}</h2>
        {stale && <span className={styles.stale}>last good result</span>}
        {aside}
      </header>
      {children}
    </section>
  );
}
