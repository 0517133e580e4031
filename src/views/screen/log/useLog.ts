/** The log at hand as the panel shows it, and what its fields need. */
import { useMemo } from 'react';
import type { OpenLog } from '../../../state/logs.ts';
import { presentLog } from '../../present/log.ts';
import { presentLook } from '../../present/log-look.ts';
import type { PresentedLog, PresentedLook } from '../../present/log-model.ts';
import { presentProblem } from '../../present/problem.ts';
import { useWorkbench } from '../binding.tsx';
import { useLogConversion } from '../log-conversion.ts';
import { useSelectedMeter } from '../meter.ts';

/** The log of the selected meter; `elsewhere` is the tag of another meter that has it. */
export function useLog(): { readonly log: OpenLog | undefined; readonly elsewhere: string | undefined } {
  const log = useWorkbench((state) => state.log);
  const key = useWorkbench((state) => state.keys[state.selected]);
  const tag = useWorkbench((state) => state.results.results[state.keys.indexOf(state.log?.key ?? '')]?.tag);
  const isHere = log !== undefined && log.key === key;
  return { log: isHere ? log : undefined, elsewhere: log !== undefined && !isHere ? tag : undefined };
}

export function useLook({ look }: OpenLog): PresentedLook | undefined {
  const selected = useSelectedMeter();
  const { meter, project } = selected ?? {};
  return useMemo(
    () => (look && meter && project ? presentLook(look, meter, project) : undefined),
    [look, meter, project],
  );
}

/** What the last conversion came to; undefined while there is none. */
export function useConverted(): { readonly log: PresentedLog; readonly stale: boolean } | undefined {
  const conversion = useLogConversion();
  const log = useMemo(() => conversion && presentLog(conversion), [conversion]);
  return log && { log, stale: conversion?.stale ?? false };
}

/** The sentence of the problem at a field of the log. */
export function useLogProblem(path: string): string | undefined {
  const { log } = useLog();
  const found = log?.look?.problems.find(({ field }) => field === path || field === `${path}.column`);
  return useMemo(() => found && presentProblem(found).sentence, [found]);
}
