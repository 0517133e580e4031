/** The readings of the selected meter, presented once for each result. */
import type { MeterText, Project } from '../../../core/document/project.ts';
import type { Solved } from '../../../core/result/record.ts';
import { presentReadings } from '../../present/readings.ts';
import type { PresentedReadings } from '../../present/readings-model.ts';

interface Entry {
  readonly display: unknown;
  readonly site: unknown;
  readonly base: unknown;
  readonly readings: PresentedReadings;
}

const entries = new WeakMap<Solved, Entry>();

export function presentedReadings(meter: MeterText, project: Project, result: Solved): PresentedReadings {
  const { display, site, base } = project;
  const known = entries.get(result);
  if (known && known.display === display && known.site === site && known.base === base) return known.readings;
  const readings = presentReadings(meter, project, result);
  entries.set(result, { display, site, base, readings });
  return readings;
}
