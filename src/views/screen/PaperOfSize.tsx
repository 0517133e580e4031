/**
 * What the printer gets while a meter is being sized: its sheets, drawn when the typing rests, and at once when the
 * browser is about to print.
 */
import { Suspense, useMemo, useSyncExternalStore } from 'react';
import { useWorkbench } from './binding.tsx';
import { paperFor, type SheetsView } from './SheetPlace.tsx';
import { useRested } from './useRested.ts';

const REST = 1000; // ms

export function PaperOfSize({ sheets: Sheets }: { readonly sheets: SheetsView }) {
  const project = useWorkbench((state) => state.project);
  const results = useWorkbench((state) => state.results);
  const only = useWorkbench((state) => state.selected);
  const now = useMemo(() => ({ project, results, only }), [project, results, only]);
  const rested = useRested(now, REST);
  const printing = usePrinting();
  const shown = printing ? now : rested;
  if (shown === undefined || shown.only < 0) return null;
  return (
    <Suspense fallback={null}>
      <Sheets {...shown} paper={paperFor(shown.project)} paperOnly />
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
