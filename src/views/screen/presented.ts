/** Presents each result once: results keep their identity while their meter stands, and so does what was made of them. */
import type { MeterText, Project } from '../../core/document/project.ts';
import type { MeterResult } from '../../core/result/record.ts';
import type { PresentedMeter, PresentedSizing } from '../present/model.ts';
import { presentMeter } from '../present/meter.ts';

interface Entry {
  readonly meter: MeterText;
  readonly display: unknown;
  readonly site: unknown;
  readonly base: unknown;
  readonly presented: PresentedMeter | PresentedSizing;
}

const entries = new WeakMap<MeterResult, Entry>();

export function presented(meter: MeterText, project: Project, result: MeterResult): PresentedMeter | PresentedSizing {
  const { display, site, base } = project;
  const known = entries.get(result);
  if (known && known.meter === meter && known.display === display && known.site === site && known.base === base)
    return known.presented;
  const fresh = presentMeter(meter, project, result);
  entries.set(result, { meter, display, site, base, presented: fresh });
  return fresh;
}

export const isSizing = (meter: PresentedMeter | PresentedSizing): meter is PresentedSizing => meter.status === 'solved';
