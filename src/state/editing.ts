/** Actions that write values. */
import type { MeterText, Project } from '../core/document/project.ts';
import { writeAt } from './edit.ts';
import type { Steps } from './steps.ts';
import type { Workbench, WorkbenchActions } from './workbench.ts';

type Editing = Pick<WorkbenchActions, 'write' | 'writeAll' | 'writeProject' | 'setDisplay' | 'settle'>;

/** What carries an edit through: the store, the steps of undo, and how to take the last step back out of history. */
export interface Hands {
  readonly get: () => Workbench;
  readonly set: (change: Partial<Workbench>) => void;
  readonly steps: Steps;
  readonly forgetStep: () => void;
}

export function editing(hands: Hands): Editing {
  const writeProject = (path: string, value: unknown): void => {
    if (/^(format|version|meters)(\.|$)/.test(path))
      throw new Error(`expected a path beside the meters, got '${path}'`);
    edit(hands, `project ${path}`, writeAt(hands.get().project, path, value));
  };
  return {
    write: (path, value) => {
      const { project, keys, selected } = hands.get();
      if (selected < 0) return;
      const next = withValue(project, selected, path, value);
      edit(hands, `${keys[selected]} ${path}`, next);
    },
    writeAll: (values) => {
      const { project, selected } = hands.get();
      if (selected < 0) return;
      hands.steps.end();
      const next = values.reduce((made, [path, value]) => withValue(made, selected, path, value), project);
      edit(hands, 'several', next);
      hands.steps.end();
    },
    writeProject,
    setDisplay: (display) => {
      hands.steps.end();
      writeProject('display', display);
    },
    settle: () => hands.steps.end(),
  };
}

function withValue(project: Project, index: number, path: string, value: unknown): Project {
  const meter: unknown = project.meters[index];
  const root = typeof meter === 'object' && meter !== null && !Array.isArray(meter) ? (meter as MeterText) : {};
  const next = writeAt(root, path, value);
  return next === root ? project : { ...project, meters: project.meters.with(index, next) };
}

/** Text typed and taken back again leaves no step: the project is the one from before it. */
function edit({ get, set, steps, forgetStep }: Hands, field: string, next: Project): void {
  const { project, selected } = get();
  if (next === project) return;
  const before = steps.before(field);
  const takenBack = before !== undefined && textAt(before, selected) === textAt(next, selected);
  steps.during(field, project, () => set({ project: takenBack ? before : next }));
  if (!takenBack) return;
  steps.end();
  forgetStep();
}

/** All that one edit can change: the project beside its meters, and the meter at hand. */
const textAt = (project: Project, index: number): string =>
  JSON.stringify({ ...project, meters: project.meters.slice(Math.max(0, index)).slice(0, 1) });
