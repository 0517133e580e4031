/** The checks, under the assumption of Bernoulli's equation that each guards. */
import type { CheckGroup, CheckRow } from '../../present/model.ts';
import { verdictWords } from '../../words/verdicts.ts';
import { VerdictMark } from '../VerdictMark.tsx';
import styles from './Checks.module.css';
import { Panel } from './Panel.tsx';

export function Checks({ groups, stale }: { readonly groups: readonly CheckGroup[]; readonly stale: boolean }) {
  return (
    <Panel id="checks" title="Checks" stale={stale}>
      <div className={styles.groups}>
        {groups.map((group) => (
          <section key={group.assumption} className={styles.group} aria-label={group.title}>
            <header>
              <h3>{group.title}</h3>
              <VerdictMark verdict={group.verdict} words={verdictWords[group.verdict]} />
              <p>{group.meaning}</p>
            </header>
            <ul>
              {group.rows.map((row) => (
                <Check key={row.key} row={row} />
              ))}
            </ul>
          </section>
        ))}
      </div>
      <p className={styles.legend}>
        ° seen second-hand or from memory: check against your copy. † practice, not a standard.
      </p>
    </Panel>
  );
}

function Check({ row }: { readonly row: CheckRow }) {
  return (
    <li className={styles.row} data-verdict={row.verdict} data-check={row.id}>
      <VerdictMark verdict={row.verdict} words={row.verdictWord} />
      <span className={styles.text}>
        {row.text} <span className={styles.limit}>{row.limit}</span>
      </span>
      <span className={styles.clause}>
        {row.cited.clause}
        {row.cited.mark}
      </span>
    </li>
  );
}
