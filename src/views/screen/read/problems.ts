/** The problems of the readings of the selected meter, for the boxes that they stand at. */
import type { Solved } from '../../../core/result/record.ts';
import type { Workbench } from '../../../state/workbench.ts';
import { contextOf } from '../../present/context.ts';
import type { PresentedProblem } from '../../present/model.ts';
import { readingProblems as problemsOf } from '../../present/readings-problems.ts';

/** Whether a field belongs to the instrument or to a row of readings. */
export const isOfReadings = (path: string): boolean => /^(instrument|readings)(\.|$)/.test(path);

const NONE: readonly PresentedProblem[] = [];
const known = new WeakMap<Solved, { readonly display: unknown; readonly problems: readonly PresentedProblem[] }>();

/** A meter that is not solved says its own problems instead. */
export function readingProblems({ project, results, selected }: Workbench): readonly PresentedProblem[] {
  const [meter, result] = [project.meters[selected], results.results[selected]];
  if (meter === undefined || result?.status !== 'solved' || result.readings === undefined) return NONE;
  const before = known.get(result);
  if (before !== undefined && before.display === project.display) return before.problems;
  const problems = problemsOf(result.readings, contextOf(meter, project).print);
  known.set(result, { display: project.display, problems });
  return problems;
}
