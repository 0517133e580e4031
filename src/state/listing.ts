/** Actions on the list of meters. Each is one step of undo. */
import type { MeterText } from '../core/document/project.ts';
import type { Hands } from './editing.ts';
import { copyOf, newMeter, tagOf } from './meters.ts';
import type { WorkbenchActions } from './workbench.ts';

type Listing = Pick<
  WorkbenchActions,
  'select' | 'addMeter' | 'duplicateMeter' | 'moveMeter' | 'deleteMeter' | 'dismissDeleted'
>;

export function listing({ get, set, steps }: Hands, newKey: () => string): Listing {
  const insert = (place: number, meter: MeterText): void => {
    const { project, keys } = get();
    steps.end();
    set({
      project: { ...project, meters: project.meters.toSpliced(place, 0, meter) },
      keys: keys.toSpliced(place, 0, newKey()),
      selected: place,
    });
  };
  const has = (index: number): boolean => Number.isInteger(index) && index >= 0 && index < get().project.meters.length;
  return {
    select: (index) => {
      if (!has(index)) return;
      steps.end();
      set({ selected: index });
    },
    addMeter: (meter) => insert(get().project.meters.length, meter ?? newMeter(get().project.meters)),
    duplicateMeter: (index) => {
      const { meters } = get().project;
      if (has(index)) insert(index + 1, copyOf(meters[index], meters));
    },
    moveMeter: (index, to) => {
      if (has(index) && has(to) && index !== to) move({ get, set, steps }, index, to);
    },
    deleteMeter: (index) => {
      if (has(index)) remove({ get, set, steps }, index);
    },
    dismissDeleted: () => set({ deleted: undefined }),
  };
}

type Reach = Pick<Hands, 'get' | 'set' | 'steps'>;

function move({ get, set, steps }: Reach, index: number, to: number): void {
  const { project, keys, selected } = get();
  const moved = <Item>(items: readonly Item[]): Item[] =>
    items.toSpliced(index, 1).toSpliced(to, 0, ...items.slice(index, index + 1));
  const nextKeys = moved(keys);
  steps.end();
  set({
    project: { ...project, meters: moved(project.meters) },
    keys: nextKeys,
    selected: nextKeys.indexOf(keys[selected] ?? ''),
  });
}

function remove({ get, set, steps }: Reach, index: number): void {
  const { project, keys, selected } = get();
  const meters = project.meters.toSpliced(index, 1);
  steps.end();
  set({
    project: { ...project, meters },
    keys: keys.toSpliced(index, 1),
    selected: Math.min(selected > index ? selected - 1 : selected, meters.length - 1),
    deleted: { tag: tagOf(project.meters[index]) },
  });
}
