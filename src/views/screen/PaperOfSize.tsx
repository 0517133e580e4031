/**
 * What the printer gets while a meter or a survey is worked on: its sheets, drawn when the typing rests, and at once when the
 * browser is about to print.
 */
import { Suspense, useMemo, useSyncExternalStore } from 'react';
import { type ListName, standingOf } from '../../state/lists.ts';
import { useWorkbench } from './binding.tsx';
import { useLogConversion } from './log-conversion.ts';
import { paperFor, type SheetsView } from './SheetPlace.tsx';
import { useRested } from './useRested.ts';

const REST = 1000; // ms

interface Props {
  readonly list: ListName;
  readonly sheets: SheetsView;
}

export function PaperOfSize({ list, sheets: Sheets }: Props) {
  const project = useWorkbench((state) => state.project);
  const results = useWorkbench((state) => state.results);
  const index = useWorkbench((state) => standingOf(state, list).selected);
  const now = useMemo(() => ({ project, results, only: { list, index } }), [project, results, list, index]);
  const log = useLogConversion();
  const rested = useRested(now, REST);
  const printing = usePrinting();
  const shown = printing ? now : rested;
  if (shown === undefined || shown.only.index < 0) return null;
  return (
    <Suspense fallback={null}>
      <Sheets {...shown} {...(log === undefined ? {} : { log })} paper={paperFor(shown.project)} paperOnly />
    </Suspense>
  );
}

/** True from just before the browser prints until it has; a store outside React, so that the page follows at once. */
const usePrinting = (): boolean => useSyncExternalStore(subscribe, isPrinting);

let printing = false;
const isPrinting = (): boolean => printing;

function subscribe(changed: () => void): () => void {
  const turn = (to: boolean) => () => {
    printing = to;
    changed();
  };
  const [before, after] = [turn(true), turn(false)];
  window.addEventListener('beforeprint', before);
  window.addEventListener('afterprint', after);
  return () => {
    window.removeEventListener('beforeprint', before);
    window.removeEventListener('afterprint', after);
  };
}
