/** The selected meter as the panels need it: its text, its result, and the last good result while it cannot be solved. */
import { useDeferredValue } from 'react';
import type { MeterText, Project } from '../../core/document/project.ts';
import type { MeterResult } from '../../core/result/record.ts';
import type { PresentedMeter, PresentedSizing } from '../present/model.ts';
import { useWorkbench } from './binding.tsx';
import { isSizing, presented, presentedEarlier } from './presented.ts';
import { textAt } from './text.ts';

export interface SelectedMeter {
  readonly index: number;
  readonly key: string;
  readonly meter: MeterText;
  readonly project: Project;
  readonly result: MeterResult;
  readonly now: PresentedMeter | PresentedSizing;
  /** What the panels show: the result as it stands, or the last good one. Absent before the first. */
  readonly sizing: PresentedSizing | undefined;
  /** True while `sizing` belongs to an earlier input. */
  readonly stale: boolean;
}

/** The selected meter; undefined when the project has none. */
export function useSelectedMeter(): SelectedMeter | undefined {
  const project = useWorkbench((state) => state.project);
  const results = useWorkbench((state) => state.results);
  const index = useWorkbench((state) => state.selected);
  const keys = useWorkbench((state) => state.keys);
  const lastSolved = useWorkbench((state) => state.lastSolved);
  const meter = project.meters[index];
  const result = results.results[index];
  const key = keys[index];
  if (meter === undefined || result === undefined || key === undefined) return undefined;
  const now = presented(meter, project, result);
  const last = lastSolved[key];
  const sizing = isSizing(now) ? now : last && presentedEarlier(project, last);
  return { index, key, meter, project, result, now, sizing, stale: !isSizing(now) };
}

/** A part of the result that may be drawn a moment later than the figures. */
export const useLater = <Part>(part: Part): Part => useDeferredValue(part);

/** The text of one field of the selected meter. */
export const useMeterText = (path: string): string =>
  useWorkbench((state) => textAt(state.project.meters[state.selected], path));

/** The sentence of the problem at a field of the selected meter, undefined when there is none. */
export const useProblem = (path: string): string | undefined =>
  useWorkbench((state) => {
    const meter = state.project.meters[state.selected];
    const result = state.results.results[state.selected];
    if (meter === undefined || result === undefined || result.status === 'solved') return undefined;
    return presented(meter, state.project, result).problems.find((problem) => problem.field === path)?.sentence;
  });

/** True until the selected meter has been solved once: an empty field is then no fault yet. */
export const useUntried = (): boolean =>
  useWorkbench(({ keys, selected, lastSolved }) => lastSolved[keys[selected] ?? ''] === undefined);
