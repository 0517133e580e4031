/** The state of the fluid and the sizes of pipe and metal, as they were found: each with its source and its working. */
import type { PresentedSizing } from '../../present/model.ts';
import { isOverride } from '../fluid/overrides.ts';
import { Figure, OverridableFigure } from './Figure.tsx';
import { Panel } from './Panel.tsx';
import styles from './States.module.css';

interface Props {
  readonly sizing: Pick<PresentedSizing, 'state' | 'overridable' | 'pipe' | 'metal'>;
  readonly stale: boolean;
}

export function States({ sizing, stale }: Props) {
  return (
    <Panel id="state" title="State and sizes" stale={stale}>
      <dl className={styles.rows}>
        {sizing.state.map((row) =>
          sizing.overridable && isOverride(row.id) ? (
            <OverridableFigure key={row.id} row={row} name={row.id} />
          ) : (
            <Figure key={row.id} row={row} />
          ),
        )}
        {[...sizing.pipe, ...sizing.metal].map((row) => (
          <Figure key={row.id} row={row} />
        ))}
      </dl>
    </Panel>
  );
}
