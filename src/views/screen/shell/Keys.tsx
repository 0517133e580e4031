/** The list of keys. */

import styles from './Keys.module.css';
import { KEYS } from './keys.table.ts';

export function Keys() {
  return (
    <dl className={styles.keys}>
      {KEYS.map(({ keys, words }) => (
        <div key={keys}>
          <dt>
            {keys.split(' ').map((key) => (
              <kbd key={key}>{key}</kbd>
            ))}
          </dt>
          <dd>{words}</dd>
        </div>
      ))}
    </dl>
  );
}
