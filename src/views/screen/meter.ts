/** The selected meter as the panels need it: its text, its result, and the last good result while it cannot be solved. */
import { useDeferredValue } from 'react';
import type { MeterText, Project } from '../../core/document/project.ts';
import type { MeterResult } from '../../core/result/record.ts';
import { type ListName, standingOf } from '../../state/lists.ts';
import type { Workbench } from '../../state/workbench.ts';
import type { PresentedMeter, PresentedProblem, PresentedSizing } from '../present/model.ts';
import { useWorkbench } from './binding.tsx';
import { useHand, useItem } from './hand.tsx';
import { isSizing, listed, presented, presentedEarlier } from './presented.ts';
import { isOfReadings, readingProblems } from './read/problems.ts';
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

/** The text of one field of the item at hand. */
export const useMeterText = (path: string): string => useItem((item) => textAt(item, path));

const NONE: readonly PresentedProblem[] = [];

/** What stands in the way of the item at hand. */
export function useProblems(): readonly PresentedProblem[] {
  const list = useHand();
  return useWorkbench((state) => problemsOf(state, list));
}

function problemsOf({ project, results, ...at }: Workbench, list: ListName): readonly PresentedProblem[] {
  const { selected } = standingOf(at, list);
  if (list === 'traverses') {
    const [traverse, result] = [project.traverses?.[selected], results.traverses[selected]];
    return traverse === undefined || result === undefined ? NONE : listed(traverse, project, result).problems;
  }
  const [meter, result] = [project.meters[selected], results.results[selected]];
  if (meter === undefined || result === undefined || result.status === 'solved') return NONE;
  return presented(meter, project, result).problems;
}

/** The sentence of the problem at a field of the item at hand, undefined when there is none. */
export function useProblem(path: string): string | undefined {
  const list = useHand();
  const ofReadings = list === 'meters' && isOfReadings(path);
  return useWorkbench((state) => {
    const problems = ofReadings ? readingProblems(state) : problemsOf(state, list);
    return problems.find((problem) => problem.field === path)?.sentence;
  });
}

/** True until the item at hand has been solved once: an empty field is then no fault yet. */
export function useUntried(): boolean {
  const list = useHand();
  return useWorkbench((state) => {
    const { keys, selected } = standingOf(state, list);
    const last = list === 'meters' ? state.lastSolved : state.lastSurveyed;
    return last[keys[selected] ?? ''] === undefined;
  });
}
