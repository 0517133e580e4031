/** The layer that keeps results, selection and the offer to undo a deletion in step with the project, in one change. */
import type { StateCreator, StoreMutatorIdentifier } from 'zustand/vanilla';
import type { Project } from '../core/document/project.ts';
import type { SolvedTraverse } from '../core/result/record.ts';
import { type Core, createDerive, lastSolvedOf } from './derive.ts';
import { itemsIn, type ListName, standingOf } from './lists.ts';
import type { Workbench } from './workbench.ts';

type Mutators = [StoreMutatorIdentifier, unknown][];
type Following = <In extends Mutators, Out extends Mutators>(
  core: Core,
  create: StateCreator<Workbench, In, Out>,
) => StateCreator<Workbench, In, Out>;
type Plainly = (core: Core, create: StateCreator<Workbench>) => StateCreator<Workbench>;

const followingPlainly: Plainly = (core, create) => (set, get, api) => {
  const follow = createFollow(core);
  const following: typeof api.setState = (change) =>
    set((state) => follow(state, typeof change === 'function' ? change(state) : change));
  api.setState = following;
  return create(following, get, api);
};

/** The type says that the layers inside keep what they add to the store. */
export const following = followingPlainly as Following;

function createFollow(core: Core): (state: Workbench, change: Partial<Workbench>) => Partial<Workbench> {
  const derive = createDerive(core);
  return (state, change) => {
    const { project } = change;
    if (project === undefined || project === state.project) return change;
    const keys = change.keys ?? state.keys;
    const traverseKeys = change.traverseKeys ?? state.traverseKeys;
    const results = derive(project);
    return {
      deleted: undefined,
      selected: placeOf(state, project, 'meters'),
      traverseSelected: placeOf(state, project, 'traverses'),
      ...change,
      results,
      lastSolved: lastSolvedOf(change.lastSolved ?? state.lastSolved, keys, results.results),
      lastSurveyed: lastSolvedOf<SolvedTraverse>(
        change.lastSurveyed ?? state.lastSurveyed,
        traverseKeys,
        results.traverses,
      ),
    };
  };
}

/** The first item that differs, so that undo shows what it undid; otherwise the one that was selected. */
function placeOf(state: Workbench, project: Project, list: ListName): number {
  const [before, after] = [itemsIn(state.project, list), itemsIn(project, list)];
  const most = Math.max(before.length, after.length);
  let place = 0;
  while (place < most && before[place] === after[place]) place += 1;
  return Math.min(place < most ? place : standingOf(state, list).selected, after.length - 1);
}
