/** Presents each result once: results keep their identity while their meter stands, and so does what was made of them. */
import type { MeterText, Project, TraverseText } from '../../core/document/project.ts';
import type { MeterResult, Solved, SolvedTraverse, TraverseResult } from '../../core/result/record.ts';
import type { WorkbenchState } from '../../state/workbench.ts';
import { presentMeter } from '../present/meter.ts';
import type { PresentedMeter, PresentedSizing } from '../present/model.ts';
import { type ListedSurvey, listSurvey } from '../present/survey-list.ts';

interface Entry {
  readonly meter: MeterText;
  readonly display: unknown;
  readonly site: unknown;
  readonly base: unknown;
  readonly presented: PresentedMeter | PresentedSizing;
}

const entries = new WeakMap<MeterResult, Entry>();

/** The text each result was computed from: a stale result is shown with its own figures, not with what is typed now. */
const origins = new WeakMap<MeterResult, MeterText>();

/** The same of each traverse. */
const surveys = new WeakMap<TraverseResult, TraverseText>();

/** To be told of every state of the workbench, also of those that are never drawn. */
export function rememberOrigins({ project, results }: Pick<WorkbenchState, 'project' | 'results'>): void {
  results.results.forEach((result, index) => {
    const meter = project.meters[index];
    if (meter !== undefined && !origins.has(result)) origins.set(result, meter);
  });
  results.traverses.forEach((result, index) => {
    const traverse = project.traverses?.[index];
    if (traverse !== undefined && !surveys.has(result)) surveys.set(result, traverse);
  });
}

export function presented(meter: MeterText, project: Project, result: MeterResult): PresentedMeter | PresentedSizing {
  const { display, site, base } = project;
  const known = entries.get(result);
  if (known && known.meter === meter && known.display === display && known.site === site && known.base === base)
    return known.presented;
  const fresh = presentMeter(meter, project, result);
  entries.set(result, { meter, display, site, base, presented: fresh });
  return fresh;
}

/** An earlier result of a meter, in today's display. Undefined where its text is not known any more. */
export function presentedEarlier(project: Project, solved: Solved): PresentedSizing | undefined {
  const meter = origins.get(solved);
  const earlier = meter && presented(meter, project, solved);
  return earlier !== undefined && isSizing(earlier) ? earlier : undefined;
}

export const isSizing = (meter: PresentedMeter | PresentedSizing): meter is PresentedSizing =>
  meter.status === 'solved';

interface Listing extends Omit<Entry, 'meter' | 'presented'> {
  readonly traverse: TraverseText;
  readonly listed: ListedSurvey;
}

const listings = new WeakMap<TraverseResult, Listing>();

/** A survey as the list shows it, made once. */
export function listed(traverse: TraverseText, project: Project, result: TraverseResult): ListedSurvey {
  const { display, site, base } = project;
  const known = listings.get(result);
  if (known && known.traverse === traverse && known.display === display && known.site === site && known.base === base)
    return known.listed;
  const fresh = listSurvey(traverse, project, result);
  listings.set(result, { traverse, display, site, base, listed: fresh });
  return fresh;
}

/** The text that a result of a traverse was computed from. */
export const originOf = (result: SolvedTraverse): TraverseText | undefined => surveys.get(result);
