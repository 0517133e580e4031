/** The conversion of the log at hand, for the sheets. */
import { useMemo } from 'react';
import { isCurrent } from '../../state/logs.ts';
import type { Conversion } from '../present/log-context.ts';
import { useWorkbench } from './binding.tsx';

/** The last conversion with the place of its meter, in the display of today; undefined while there is none. */
export function useLogConversion(): (Conversion & { readonly index: number }) | undefined {
  const log = useWorkbench((state) => state.log);
  const now = useWorkbench((state) => state.project);
  const index = useWorkbench((state) => state.keys.indexOf(state.log?.key ?? ''));
  const { converted, name = '' } = log ?? {};
  const meter = now.meters[index];
  const stale = converted !== undefined && !isCurrent(converted, meter, now);
  const display = now.display ?? 'SI';
  return useMemo(
    () => converted && { ...converted, project: { ...converted.project, display }, name, stale, index },
    [converted, display, name, stale, index],
  );
}
