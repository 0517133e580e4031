/** Reading one meter: the answer, the instrument as it stands, the table of readings, and what follows from them. */
import { type KeyboardEvent, lazy, Suspense, useState } from 'react';
import type { ReadingRow } from '../../present/readings-model.ts';
import { Boundary } from '../Boundary.tsx';

import { focusNext } from '../focus.ts';
import { type SelectedMeter, useMeterText, useSelectedMeter } from '../meter.ts';
import { Notes } from '../panel/Notes.tsx';
import size from '../Size.module.css';
import { Compensate } from './Compensate.tsx';
import { EmptyRead } from './EmptyRead.tsx';
import { InstrumentPanel } from './InstrumentPanel.tsx';
import styles from './Read.module.css';
import { ReadAnswer } from './ReadAnswer.tsx';
import { ReadingsPanel } from './ReadingsPanel.tsx';
import { RowChecks, RowWorking } from './RowPanels.tsx';
import { presentedReadings } from './selected.ts';

const LogPanel = lazy(() => import('../log/LogPanel.tsx').then((module) => ({ default: module.LogPanel })));

/** Enter in a text box goes on to the next field; the boxes of the table have their own way. */
function onEnter(event: KeyboardEvent): void {
  const { target } = event;
  if (event.key !== 'Enter' || !(target instanceof HTMLInputElement) || target.dataset.field === undefined) return;
  event.preventDefault();
  focusNext(target);
}

export function Read() {
  const selected = useSelectedMeter();
  if (selected === undefined) return <EmptyRead />;
  return (
    // biome-ignore lint/a11y/noStaticElementInteractions: Enter is only passed on to the next field
    <div className={size.size} onKeyDown={onEnter}>
      <One key={selected.key} selected={selected} />
      <Suspense fallback={null}>
        <LogPanel />
      </Suspense>
    </div>
  );
}

function One({ selected }: { readonly selected: SelectedMeter }) {
  const { meter, project, result, now } = selected;
  const kind = useMeterText('instrument.kind') || 'differential';
  const readings = result.status === 'solved' ? presentedReadings(meter, project, result) : undefined;
  const [chosen, setCurrent] = useState<number>();
  const rows = readings?.rows ?? [];
  const current = chosen !== undefined && chosen < rows.length ? chosen : Math.max(0, lastTelling(rows));
  const row = rows[current];
  return (
    <>
      <ReadAnswer selected={selected} row={row} />
      <div className={styles.columns}>
        <InstrumentPanel kind={kind} readings={readings} row={row} />
        <div className={size.column}>
          <ReadingsPanel kind={kind} tag={now.tag} readings={readings} current={current} setCurrent={setCurrent} />
          <Boundary of={readings}>{readings && <Compensate readings={readings} />}</Boundary>
          {row && <RowChecks row={row} />}
          <Boundary of={row}>{row && <RowWorking row={row} />}</Boundary>
        </div>
      </div>
      {readings && <Notes sizing={readings} />}
    </>
  );
}

/** The last row that flows, else the last that can be read. */
function lastTelling(rows: readonly ReadingRow[]): number {
  const flowing = rows.findLastIndex(({ figures }) => figures.reynolds !== undefined);
  return flowing >= 0 ? flowing : rows.findLastIndex(({ status }) => status === 'solved');
}
