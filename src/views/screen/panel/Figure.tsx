/** One figure of the state: its value opens its working, its source stands below, and some can be overridden. */
import { type ReactNode, useEffect, useRef, useState } from 'react';
import type { Row } from '../../present/model.ts';
import { overrideWords as words } from '../../words/fluid-forms.ts';
import buttons from '../button.module.css';
import { Clause } from '../Clause.tsx';
import { OverrideField } from '../fluid/OverrideField.tsx';
import { type Override, overridePath } from '../fluid/overrides.ts';
import { useMeterText } from '../meter.ts';
import styles from './States.module.css';
import { openWorking } from './working-place.ts';

interface Props {
  readonly row: Row;
  readonly aside?: ReactNode;
  readonly children?: ReactNode;
}

export function Figure({ row: { label, value, working, cited, note, range, own = false }, aside, children }: Props) {
  return (
    <div>
      <dt>{label}</dt>
      <dd className={styles.value}>
        {working === undefined ? (
          value.text
        ) : (
          <button type="button" onClick={() => openWorking('meter', working)}>
            {value.text}
          </button>
        )}
      </dd>
      {(cited !== undefined || note !== undefined || aside !== undefined) && (
        <dd className={styles.source}>
          <span>
            {note && <span className={own ? styles.own : styles.note}>{note}</span>}
            {cited && <Clause cited={cited} />}
            {range && <span className={styles.range}>{range}</span>}
          </span>
          {aside}
        </dd>
      )}
      {children !== undefined && <dd className={styles.below}>{children}</dd>}
    </div>
  );
}

/** A figure that the user may put his own in place of. */
export function OverridableFigure({ row, name }: { readonly row: Row; readonly name: Override }) {
  const text = useMeterText(overridePath(name));
  const [wanted, want] = useState(false);
  const below = useRef<HTMLDivElement>(null);
  useEffect(() => {
    if (wanted) below.current?.querySelector('input')?.focus();
  }, [wanted]);
  if (text === '' && !wanted)
    return (
      <Figure
        row={row}
        aside={
          <button
            type="button"
            className={buttons.word}
            aria-label={words.orderOf(row.label)}
            onClick={() => want(true)}
          >
            {words.order}
          </button>
        }
      />
    );
  return (
    <Figure row={row}>
      <div ref={below}>
        <OverrideField name={name} label={row.label} cleared={() => want(false)} />
      </div>
    </Figure>
  );
}
