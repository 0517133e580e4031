/**
 * Results follow the project by reference: a meter is solved again when its own object or the site or base state it
 * stands on is another one, and not otherwise.
 */
import type { MeterText, Project } from '../core/document/project.ts';
import type { MeterResult, Results, Solved } from '../core/result/record.ts';
import { tagOf } from './meters.ts';

/** The part of the core the workbench needs; app hands in the real one. */
export interface Core {
  run(project: Project): Results;
  solveMeter(meter: MeterText, index: number, project: Project): MeterResult;
}

interface Remembered {
  readonly site: unknown;
  readonly base: unknown;
  readonly traverses: unknown;
  readonly meters: ReadonlyMap<unknown, { readonly index: number; readonly result: MeterResult }>;
  readonly results: Results;
}

/** Remembers the last project only: what history holds would keep two hundred results of each meter alive. */
export function createDerive(core: Core): (project: Project) => Results {
  let last: Remembered | undefined;
  return (project) => {
    const { site, base, traverses } = project;
    const same = last !== undefined && last.site === site && last.base === base ? last : undefined;
    const results = project.meters.map((meter, index) => {
      const known = same?.meters.get(meter);
      // A meter without a tag is named after its place.
      const holds = known !== undefined && (known.index === index || tagOf(meter) !== '');
      return holds ? known.result : core.solveMeter(meter, index, project);
    });
    const derived: Results = {
      results,
      traverses:
        same !== undefined && same.traverses === traverses
          ? same.results.traverses
          : core.run({ ...project, meters: [] }).traverses,
    };
    const meters = new Map(
      project.meters.map((meter, index) => [meter, { index, result: results[index] as MeterResult }] as const),
    );
    last = { site, base, traverses, meters, results: derived };
    return derived;
  };
}

/** The last solved result of each meter at hand, by key. */
export function lastSolvedOf(
  before: Readonly<Record<string, Solved>>,
  keys: readonly string[],
  results: Results,
): Readonly<Record<string, Solved>> {
  const solved: Record<string, Solved> = {};
  keys.forEach((key, index) => {
    const result = results.results[index];
    const value = result?.status === 'solved' ? result : before[key];
    if (value !== undefined) solved[key] = value;
  });
  return solved;
}
