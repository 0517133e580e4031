/** Presents each result once: results keep their identity while their meter stands, and so does what was made of them. */
import type { MeterText, Project } from '../../core/document/project.ts';
import type { MeterResult, Solved } from '../../core/result/record.ts';
import type { WorkbenchState } from '../../state/workbench.ts';
import { presentMeter } from '../present/meter.ts';
import type { PresentedMeter, PresentedSizing } from '../present/model.ts';

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

/** To be told of every state of the workbench, also of those that are never drawn. */
export function rememberOrigins({ project, results }: Pick<WorkbenchState, 'project' | 'results'>): void {
  results.results.forEach((result, index) => {
    const meter = project.meters[index];
    if (meter !== undefined && !origins.has(result)) origins.set(result, meter);
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
