/** The working: each figure opens into its equation, the same line with the numbers put in, and the clause. */
import type { PresentedSizing, WorkingGroup } from '../../present/model.ts';
import { Panel } from './Panel.tsx';
import styles from './Working.module.css';
import { WorkingLine } from './WorkingLine.tsx';

interface Props {
  readonly sizing: Pick<PresentedSizing, 'working'>;
  readonly stale: boolean;
}

export function Working({ sizing, stale }: Props) {
  return (
    <Panel id="working" title="Working" stale={stale}>
      <p className={styles.lead}>
        Each line opens into its equation, the numbers put in, and the clause it comes from.
      </p>
      <div className={styles.groups}>
        {sizing.working.map((group) => (
          <Group key={group.id} group={group} open={group.id === 'meter' || group.id === 'maximum'} />
        ))}
      </div>
    </Panel>
  );
}

function Group({ group, open }: { readonly group: WorkingGroup; readonly open: boolean }) {
  return (
    <details className={styles.group} open={open}>
      <summary>
        <h3>{group.title}</h3>
      </summary>
      {group.rows.map((row) => (
        <WorkingLine key={row.id} group={group.id} row={row} />
      ))}
    </details>
  );
}
