/**
 * Results follow the project by reference: a meter or a traverse is solved again when its own object or the site or
 * base state it stands on is another one, and not otherwise.
 */
import type { MeterText, Project, TraverseText } from '../core/document/project.ts';
import type { MeterResult, Refused, Results, SiteRecord, TraverseResult } from '../core/result/record.ts';
import { tagOf } from './meters.ts';

/** The part of the core the workbench needs; app hands in the real one. */
export interface Core {
  solveMeter(meter: MeterText, index: number, project: Project): MeterResult;
  solveTraverse(traverse: TraverseText, index: number, project: Project): TraverseResult;
  solveSite(project: Project): SiteRecord | undefined;
}

/** Remembers the last project only: what history holds would keep two hundred results of each meter alive. */
export function createDerive(core: Core): (project: Project) => Results {
  let site: unknown;
  let base: unknown;
  const meters = following<MeterText, MeterResult>((meter, index, project) => core.solveMeter(meter, index, project));
  const traverses = following<TraverseText, TraverseResult>((traverse, index, project) =>
    core.solveTraverse(traverse, index, project),
  );
  return (project) => {
    const same = project.site === site && project.base === base;
    ({ site, base } = project);
    const found = core.solveSite(project);
    return {
      ...(found === undefined ? {} : { site: found }),
      results: meters(project.meters, project, same),
      traverses: traverses(project.traverses ?? [], project, same),
    };
  };
}

type Solve<Item, Result> = (item: Item, index: number, project: Project) => Result;
/** `same` while site and base state are those of the last time. */
type Follow<Item, Result> = (items: readonly Item[], project: Project, same: boolean) => readonly Result[];

function following<Item, Result>(solve: Solve<Item, Result>): Follow<Item, Result> {
  let known: ReadonlyMap<Item, { readonly index: number; readonly result: Result }> = new Map();
  let last: readonly Result[] = [];
  return (items, project, same) => {
    const results = items.map((item, index) => {
      const before = same ? known.get(item) : undefined;
      // An item without a tag is named after its place.
      const holds = before !== undefined && (before.index === index || tagOf(item) !== '');
      return holds ? before.result : solve(item, index, project);
    });
    known = new Map(items.map((item, index) => [item, { index, result: results[index] as Result }] as const));
    const unchanged = results.length === last.length && results.every((result, at) => result === last[at]);
    if (!unchanged) last = results;
    return last;
  };
}

/** The last solved result of each item at hand, by key. */
export function lastSolvedOf<Solved extends { readonly status: 'solved' }>(
  before: Readonly<Record<string, Solved>>,
  keys: readonly string[],
  results: readonly (Solved | Refused)[],
): Readonly<Record<string, Solved>> {
  const solved: Record<string, Solved> = {};
  keys.forEach((key, index) => {
    const result = results[index];
    const value = result?.status === 'solved' ? result : before[key];
    if (value !== undefined) solved[key] = value;
  });
  return solved;
}
