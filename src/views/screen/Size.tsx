/** Sizing one meter: the answer, the pipe with the form along it, and what follows from it. */
import type { KeyboardEvent } from 'react';
import { Along } from './Along.tsx';
import { Answer } from './Answer.tsx';
import { Boundary } from './Boundary.tsx';
import { EmptyProject } from './EmptyProject.tsx';
import { focusNext } from './focus.ts';
import { type SelectedMeter, useSelectedMeter } from './meter.ts';
import { Checks } from './panel/Checks.tsx';
import { Curve } from './panel/Curve.tsx';
import { DutyTable } from './panel/DutyTable.tsx';
import { Notes } from './panel/Notes.tsx';
import { States } from './panel/States.tsx';
import { Working } from './panel/Working.tsx';
import styles from './Size.module.css';

/** Enter in a text box goes on to the next field. */
function onEnter(event: KeyboardEvent): void {
  const { target } = event;
  if (event.key !== 'Enter' || !(target instanceof HTMLInputElement) || target.dataset.field === undefined) return;
  event.preventDefault();
  focusNext(target);
}

export function Size() {
  const selected = useSelectedMeter();
  if (selected === undefined) return <EmptyProject />;
  return (
    // biome-ignore lint/a11y/noStaticElementInteractions: Enter is only passed on to the next field
    <div className={styles.size} onKeyDown={onEnter}>
      <Answer selected={selected} />
      <Along key={selected.key} selected={selected} />
      <Boundary of={selected.sizing}>{selected.sizing && <Found selected={selected} />}</Boundary>
    </div>
  );
}

function Found({ selected: { sizing, stale } }: { readonly selected: SelectedMeter }) {
  if (sizing === undefined) return null;
  return (
    <>
      <div className={styles.columns}>
        <div className={styles.column}>
          <DutyTable sizing={sizing} stale={stale} />
          <Curve sizing={sizing} stale={stale} />
          <States sizing={sizing} stale={stale} />
        </div>
        <Checks groups={sizing.checks} stale={stale} />
      </div>
      <Working sizing={sizing} stale={stale} />
      <Notes sizing={sizing} />
    </>
  );
}
