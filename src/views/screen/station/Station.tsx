/** One station of the pipe: its number, its name, and the inputs that physically belong there. */
import type { ReactNode } from 'react';
import styles from './Station.module.css';

interface Props {
  readonly number: 1 | 2 | 3 | 4;
  readonly title: string;
  readonly children: ReactNode;
}

export function Station({ number, title, children }: Props) {
  const id = `station-${number}`;
  return (
    <section className={styles.station} aria-labelledby={id} data-station={number}>
      <h2 className={styles.title} id={id}>
        <span className={styles.number} aria-hidden="true">
          {number}
        </span>
        {title}
      </h2>
      <div className={styles.fields}>{children}</div>
    </section>
  );
}
