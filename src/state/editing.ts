/** Actions that write values. */
import type { Project } from '../core/document/project.ts';
import { writeAt } from './edit.ts';
import { itemsIn, type ListName, standingOf, withItems } from './lists.ts';
import { withReadings } from './readings.ts';
import type { Steps } from './steps.ts';
import type { Workbench, WorkbenchActions } from './workbench.ts';

type Editing = Pick<
  WorkbenchActions,
  'write' | 'writeAll' | 'writeReadings' | 'writeProject' | 'setDisplay' | 'settle'
>;

/** What carries an edit through: the store, the steps of undo, and how to take the last step back out of history. */
export interface Hands {
  readonly get: () => Workbench;
  readonly set: (change: Partial<Workbench>) => void;
  readonly steps: Steps;
  readonly forgetStep: () => void;
}

export function editing(hands: Hands): Editing {
  const { get, steps } = hands;
  const writeProject = (path: string, value: unknown): void => {
    if (/^(format|version|meters|traverses)(\.|$)/.test(path))
      throw new Error(`expected a path beside the lists of the project, got '${path}'`);
    edit(hands, `project ${path}`, writeAt(get().project, path, value));
  };
  return {
    write: (path, value, list = 'meters') => {
      const { keys, selected } = standingOf(get(), list);
      if (selected < 0) return;
      edit(hands, `${keys[selected]} ${path}`, withValue(get().project, { list, selected }, path, value), list);
    },
    writeAll: (values, list = 'meters') => {
      const { selected } = standingOf(get(), list);
      if (selected < 0) return;
      steps.end();
      const at = { list, selected };
      const next = values.reduce((made, [path, value]) => withValue(made, at, path, value), get().project);
      edit(hands, 'several', next, list);
      steps.end();
    },
    writeReadings: (cells) => {
      const { keys, selected } = standingOf(get(), 'traverses');
      const [first, ...more] = cells;
      if (selected < 0 || first === undefined) return;
      const { project } = get();
      const readings = withReadings(project.traverses?.[selected]?.readings, cells);
      const next = withValue(project, { list: 'traverses', selected }, 'readings', readings);
      if (more.length > 0) steps.end();
      edit(hands, `${keys[selected]} readings.${first.line}.${first.point}`, next, 'traverses');
      if (more.length > 0) steps.end();
    },
    writeProject,
    setDisplay: (display) => {
      steps.end();
      writeProject('display', display);
    },
    settle: () => steps.end(),
  };
}

interface At {
  readonly list: ListName;
  readonly selected: number;
}

function withValue(project: Project, { list, selected }: At, path: string, value: unknown): Project {
  const items = itemsIn(project, list);
  const item = items[selected];
  const root = typeof item === 'object' && item !== null && !Array.isArray(item) ? item : {};
  const next = writeAt(root, path, value);
  return next === root ? project : withItems(project, list, items.with(selected, next));
}

/** Text typed and taken back again leaves no step: the project is the one from before it. */
function edit({ get, set, steps, forgetStep }: Hands, field: string, next: Project, list?: ListName): void {
  const { project } = get();
  if (next === project) return;
  const before = steps.before(field);
  const takenBack = before !== undefined && textAt(before, get()) === textAt(next, get());
  const hand = list === undefined ? {} : { hand: list };
  steps.during(field, project, () => set({ project: takenBack ? before : next, ...hand }));
  if (!takenBack) return;
  steps.end();
  forgetStep();
}

/** All that one edit can change: the project beside its lists, and the items at hand. */
function textAt(project: Project, { selected, traverseSelected }: Workbench): string {
  const meter = project.meters[selected];
  return JSON.stringify({ ...project, meters: meter, traverses: project.traverses?.[traverseSelected] });
}
