/** The checks, under the assumption of Bernoulli's equation that each guards. */
import type { CheckGroup, CheckRow } from '../../present/model.ts';
import { standingWords } from '../../words/verdicts.ts';
import { Clause } from '../Clause.tsx';
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
              <VerdictMark verdict={group.verdict} words={standingWords[group.verdict]} />
              <p>{group.meaning}</p>
            </header>
            <ul>
              {group.rows.map((row) => (
                <Check key={row.key} row={row} />
              ))}
            </ul>
            {group.open.map((text) => (
              <p key={text} className={styles.open}>
                {text}
              </p>
            ))}
          </section>
        ))}
      </div>
      <p className={styles.legend}>
        °{'\u00a0'}seen second-hand or from memory: check against your copy. †{'\u00a0'}practice, not a standard.
      </p>
    </Panel>
  );
}

function Check({ row }: { readonly row: CheckRow }) {
  return (
    <li className={styles.row} data-verdict={row.verdict} data-check={row.id}>
      <VerdictMark verdict={row.verdict} words={row.verdictWord} />
      <p className={styles.text}>{row.text}</p>
      <p className={styles.held}>
        <span>{row.limit}</span>
        <Clause cited={row.cited} />
      </p>
    </li>
  );
}
