/** The selected survey as the place needs it: its text, its result, and the last good result while it cannot be solved. */
import type { Project, TraverseText } from '../../../core/document/project.ts';
import type { PlannedTraverse, SolvedTraverse } from '../../../core/result/record.ts';
import { presentSurvey } from '../../present/survey.ts';
import type { ListedSurvey } from '../../present/survey-list.ts';
import type { PresentedSurvey } from '../../present/survey-model.ts';
import { useWorkbench } from '../binding.tsx';
import { listed, originOf } from '../presented.ts';

export interface SelectedSurvey {
  readonly index: number;
  readonly key: string;
  readonly traverse: TraverseText;
  readonly now: ListedSurvey;
  /** What is shown: the result as it stands, without readings that cannot be read, its plan, or the last good one. */
  readonly survey: PresentedSurvey | undefined;
  /** True while `survey` belongs to an earlier input. */
  readonly stale: boolean;
  /** True while some readings stand in the way and the others are shown. */
  readonly besides: boolean;
}

/** The selected survey; undefined when the project has none. */
export function useSelectedSurvey(): SelectedSurvey | undefined {
  const project = useWorkbench((state) => state.project);
  const results = useWorkbench((state) => state.results.traverses);
  const index = useWorkbench((state) => state.traverseSelected);
  const keys = useWorkbench((state) => state.traverseKeys);
  const last = useWorkbench((state) => state.lastSurveyed);
  const [traverse, result, key] = [project.traverses?.[index], results[index], keys[index]];
  if (traverse === undefined || result === undefined || key === undefined) return undefined;
  const solved = result.status === 'solved' ? result : (result.besides ?? result.planned);
  const earlier = last[key];
  const from = earlier && originOf(earlier);
  const survey =
    solved !== undefined
      ? presented(traverse, project, solved)
      : earlier !== undefined && from !== undefined
        ? presented(from, project, earlier)
        : undefined;
  return {
    index,
    key,
    traverse,
    now: listed(traverse, project, result),
    survey,
    stale: solved === undefined,
    besides: result.status === 'refused' && result.besides !== undefined,
  };
}

interface Entry extends Pick<Project, 'display' | 'site' | 'base'> {
  readonly traverse: TraverseText;
  readonly survey: PresentedSurvey;
}

const entries = new WeakMap<SolvedTraverse | PlannedTraverse, Entry>();

/** Presents each result once. */
function presented(
  traverse: TraverseText,
  project: Project,
  result: SolvedTraverse | PlannedTraverse,
): PresentedSurvey {
  const { display, site, base } = project;
  const known = entries.get(result);
  if (known && known.traverse === traverse && known.display === display && known.site === site && known.base === base)
    return known.survey;
  const survey = presentSurvey(traverse, project, result);
  entries.set(result, { traverse, display, site, base, survey } as Entry);
  return survey;
}
