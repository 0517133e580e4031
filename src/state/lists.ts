/** The lists of a project that are edited alike, and what the workbench holds of each. */
import type { Project } from '../core/document/project.ts';

export type ListName = 'meters' | 'traverses';

/** What the workbench holds of a list beside its items. */
interface Standing {
  readonly keys: readonly string[];
  readonly selected: number;
}

/** What stands in a list; anything may. */
export const itemsIn = (project: Project, list: ListName): readonly unknown[] =>
  list === 'meters' ? project.meters : (project.traverses ?? []);

/** The project with other items in a list. */
export const withItems = (project: Project, list: ListName, items: readonly unknown[]): Project => ({
  ...project,
  [list]: items,
});

/** The parts of the workbench that hold it. */
interface Held {
  readonly keys: readonly string[];
  readonly selected: number;
  readonly traverseKeys: readonly string[];
  readonly traverseSelected: number;
}

export const standingOf = (state: Held, list: ListName): Standing =>
  list === 'meters'
    ? { keys: state.keys, selected: state.selected }
    : { keys: state.traverseKeys, selected: state.traverseSelected };

/** The change of the workbench that gives a list this standing and takes it to hand. */
export const standingAs = (
  list: ListName,
  { keys, selected }: Standing,
): Partial<Held> & { readonly hand: ListName } =>
  list === 'meters' ? { keys, selected, hand: list } : { traverseKeys: keys, traverseSelected: selected, hand: list };
