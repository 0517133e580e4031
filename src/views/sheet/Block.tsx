/** A part of a sheet under its title. */
import type { ReactNode } from 'react';
import styles from './content.module.css';

interface BlockProps {
  readonly title: string;
  readonly aside?: string;
  readonly children: ReactNode;
}

export const Block = ({ title, aside, children }: BlockProps) => (
  <section>
    <h3 className={styles.title}>
      {title}
      {aside && <small className={styles.aside}> {aside}</small>}
    </h3>
    {children}
  </section>
);
