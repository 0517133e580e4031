/** The state of the fluid and the sizes of pipe and metal, as they were found. */
import type { PresentedSizing, Row } from '../../present/model.ts';
import { Panel } from './Panel.tsx';
import styles from './States.module.css';
import { openWorking } from './working-place.ts';

export function States({ sizing, stale }: { readonly sizing: PresentedSizing; readonly stale: boolean }) {
  return (
    <Panel id="state" title="State and sizes" stale={stale}>
      <dl className={styles.rows}>
        {[...sizing.state, ...sizing.pipe, ...sizing.metal].map((row) => (
          <Figure key={row.id} row={row} />
        ))}
      </dl>
    </Panel>
  );
}

function Figure({ row }: { readonly row: Row }) {
  const { working } = row;
  return (
    <div>
      <dt>{row.label}</dt>
      <dd title={row.cited && `${row.cited.clause}${row.cited.mark}`}>
        {working === undefined ? (
          row.value.text
        ) : (
          <button type="button" onClick={() => openWorking('meter', working)}>
            {row.value.text}
          </button>
        )}
        {row.cited?.mark}
      </dd>
    </div>
  );
}
