/** The sizes a search found: names, bore, and where the row comes from. */
import { useEffect, useRef } from 'react';
import type { PipeSize } from '../../../core/document/pipe-sizes.ts';
import { Mark } from '../Clause.tsx';
import styles from './PipeSizeList.module.css';

interface Props {
  readonly id: string;
  readonly sizes: readonly PipeSize[];
  readonly active: number | undefined;
  readonly pick: (size: PipeSize) => void;
}

export function PipeSizeList({ id, sizes, active, pick }: Props) {
  const list = useRef<HTMLDivElement>(null);
  useEffect(() => {
    if (active !== undefined) list.current?.children[active]?.scrollIntoView({ block: 'nearest' });
  }, [active]);
  return (
    <div className={styles.list} id={id} role="listbox" aria-label="Pipe sizes" ref={list}>
      {sizes.length === 0 && <p className={styles.none}>No such size in the table. Type the bore below.</p>}
      {sizes.map((size, at) => (
        <div
          key={size.name}
          id={`${id}-${at}`}
          role="option"
          aria-selected={at === active}
          className={styles.option}
          tabIndex={-1}
          // The box keeps the focus, so that its keys still work.
          onPointerDown={(event) => event.preventDefault()}
          onClick={() => pick(size)}
          onKeyDown={(event) => event.key === 'Enter' && pick(size)}
        >
          <b>DN {size.dn}</b>
          <span>NPS {size.nps}</span>
          <span>{size.schedule}</span>
          <span className={styles.bore}>{size.bore} mm</span>
          <span className={styles.source}>
            {size.source.clause}
            <Mark mark="°" />
          </span>
        </div>
      ))}
    </div>
  );
}
