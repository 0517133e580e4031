/**
 * The workbench store, in layers from outside in: results follow the project in the same change (following), each
 * change of the project is remembered (temporal), the actions (editing, listing, standing).
 */
import { temporal, type ZundoOptions } from 'zundo';
import { createStore } from 'zustand/vanilla';
import { emptyProject, encode } from '../core/document/codec.ts';
import type { Project } from '../core/document/project.ts';
import { type Core, createDerive } from './derive.ts';
import { editing, type Hands } from './editing.ts';
import { following } from './following.ts';
import { listing } from './listing.ts';
import { createSteps, type Steps } from './steps.ts';
import type { Workbench, WorkbenchActions, WorkbenchState, WorkbenchStore } from './workbench.ts';

/** What history holds of each past state. */
type Trace = Pick<WorkbenchState, 'project' | 'keys' | 'traverseKeys'>;
type Standing = Pick<
  WorkbenchActions,
  'setKeeping' | 'setNotice' | 'dismissNotice' | 'setUpdate' | 'setProjects' | 'setLog'
>;

export const HISTORY_LIMIT = 200;

/** A workbench with an empty project; `core` solves it. */
export function createWorkbench(core: Core): WorkbenchStore {
  const steps = createSteps();
  const newKey = createKeys();
  const store = createStore<Workbench>()(
    following(
      core,
      temporal((set, get) => {
        const hands: Hands = { get, set, steps, forgetStep: () => forgetStep() };
        const travel = (way: 'undo' | 'redo'): void => {
          steps.end();
          store.temporal.getState()[way]();
        };
        return {
          ...initial(core, newKey),
          ...editing(hands),
          ...listing(hands, newKey),
          ...standing(set),
          undo: () => travel('undo'),
          redo: () => travel('redo'),
          open: (project, source) => {
            steps.end();
            set({ project, opened: { project, source }, ...opening(project, newKey) });
            store.temporal.getState().clear();
          },
        };
      }, remembering(steps)),
    ),
  );
  const forgetStep = (): void => store.temporal.setState(({ pastStates }) => ({ pastStates: pastStates.slice(0, -1) }));
  store.temporal.subscribe(({ pastStates, futureStates }) =>
    store.setState({ canUndo: pastStates.length > 0, canRedo: futureStates.length > 0 }),
  );
  return store;
}

const remembering = (steps: Steps): ZundoOptions<Workbench, Trace> => ({
  partialize: ({ project, keys, traverseKeys }) => ({ project, keys, traverseKeys }),
  equality: (past, current) => past.project === current.project,
  limit: HISTORY_LIMIT,
  handleSet: (save) => (past, _replace, current, delta) => {
    if (!steps.goesOn()) (save as (...step: readonly unknown[]) => void)(past, undefined, current, delta);
  },
});

/** The lists of a project as it comes to hand: the first of each selected, nothing solved before. */
function opening(project: Project, newKey: () => string) {
  const [keys, traverseKeys] = [project.meters.map(newKey), (project.traverses ?? []).map(newKey)];
  return {
    keys,
    selected: Math.min(0, keys.length - 1),
    lastSolved: {},
    traverseKeys,
    traverseSelected: Math.min(0, traverseKeys.length - 1),
    lastSurveyed: {},
    hand: keys.length === 0 && traverseKeys.length > 0 ? ('traverses' as const) : ('meters' as const),
  };
}

function initial(core: Core, newKey: () => string): WorkbenchState {
  const project = emptyProject();
  return {
    project,
    ...opening(project, newKey),
    results: createDerive(core)(project),
    opened: { project, source: encode(project) },
    keeping: { state: 'reading' },
    deleted: undefined,
    canUndo: false,
    canRedo: false,
    notice: undefined,
    update: false,
    projects: [],
    log: undefined,
  };
}

const standing = (set: (change: Partial<Workbench>) => void): Standing => ({
  setKeeping: (keeping) => set({ keeping }),
  setNotice: (notice) => set({ notice }),
  dismissNotice: () => set({ notice: undefined }),
  setUpdate: (update) => set({ update }),
  setProjects: (projects) => set({ projects }),
  setLog: (log) => set({ log }),
});

function createKeys(): () => string {
  let count = 0;
  return () => {
    count += 1;
    return `item-${count}`;
  };
}
