/** The box of the unknown: the found figure, shaded, with what it was found from. */
import type { Value } from '../../present/model.ts';
import styles from './box.module.css';
import foundStyles from './FoundField.module.css';

interface Props {
  readonly label: string;
  readonly value: Value | undefined;
  readonly from?: string | undefined;
  readonly stale: boolean;
  readonly path: string;
  readonly aside?: React.ReactNode;
}

export function FoundField({ label, value, from, stale, path, aside }: Props) {
  const id = `found-${path}`;
  return (
    <div className={foundStyles.frame} data-stale={stale}>
      <div className={foundStyles.head}>
        <span className={foundStyles.label} id={id}>
          {label}
        </span>
        {aside}
      </div>
      <output className={styles.box} data-found="true" aria-labelledby={id}>
        <span className={styles.found}>{value?.number ?? '\u2013'}</span>
        {value && <span className={styles.foundUnit}>{value.unit}</span>}
      </output>
      {from && <p className={foundStyles.from}>{stale ? 'from an earlier input' : from}</p>}
    </div>
  );
}
