/** Actions on the lists of meters and of traverses. Each is one step of undo. */
import type { Hands } from './editing.ts';
import { itemsIn, type ListName, standingAs, standingOf, withItems } from './lists.ts';
import { copyOf, newMeter, newTraverse, tagOf } from './meters.ts';
import type { WorkbenchActions } from './workbench.ts';

type Listing = Pick<
  WorkbenchActions,
  | 'select'
  | 'addMeter'
  | 'duplicateMeter'
  | 'moveMeter'
  | 'deleteMeter'
  | 'selectTraverse'
  | 'addTraverse'
  | 'duplicateTraverse'
  | 'moveTraverse'
  | 'deleteTraverse'
  | 'takeToHand'
  | 'dismissDeleted'
>;

export function listing(hands: Hands, newKey: () => string): Listing {
  const meters = listOf(hands, newKey, 'meters');
  const traverses = listOf(hands, newKey, 'traverses');
  return {
    select: meters.select,
    addMeter: (meter) => meters.add(meter ?? newMeter(meters.items())),
    duplicateMeter: meters.duplicate,
    moveMeter: meters.move,
    deleteMeter: meters.remove,
    selectTraverse: traverses.select,
    addTraverse: (traverse) => traverses.add(traverse ?? newTraverse(traverses.items())),
    duplicateTraverse: traverses.duplicate,
    moveTraverse: traverses.move,
    deleteTraverse: traverses.remove,
    takeToHand: (hand) => hands.set({ hand }),
    dismissDeleted: () => hands.set({ deleted: undefined }),
  };
}

type Reach = Pick<Hands, 'get' | 'set' | 'steps'>;

function listOf({ get, set, steps }: Reach, newKey: () => string, list: ListName) {
  const items = (): readonly unknown[] => itemsIn(get().project, list);
  const has = (index: number): boolean => Number.isInteger(index) && index >= 0 && index < items().length;
  const insert = (place: number, item: unknown): void => {
    steps.end();
    set({
      project: withItems(get().project, list, items().toSpliced(place, 0, item)),
      ...standingAs(list, { keys: standingOf(get(), list).keys.toSpliced(place, 0, newKey()), selected: place }),
    });
  };
  return {
    items,
    add: (item: unknown) => insert(items().length, item),
    duplicate: (index: number) => {
      if (has(index)) insert(index + 1, copyOf(items()[index], items()));
    },
    select: (index: number) => {
      if (!has(index)) return;
      steps.end();
      set(standingAs(list, { ...standingOf(get(), list), selected: index }));
    },
    move: (index: number, to: number) => {
      if (has(index) && has(to) && index !== to) move({ get, set, steps }, list, index, to);
    },
    remove: (index: number) => {
      if (has(index)) remove({ get, set, steps }, list, index);
    },
  };
}

function move({ get, set, steps }: Reach, list: ListName, index: number, to: number): void {
  const { project } = get();
  const { keys, selected } = standingOf(get(), list);
  const moved = <Item>(items: readonly Item[]): Item[] =>
    items.toSpliced(index, 1).toSpliced(to, 0, ...items.slice(index, index + 1));
  const nextKeys = moved(keys);
  steps.end();
  set({
    project: withItems(project, list, moved(itemsIn(project, list))),
    ...standingAs(list, { keys: nextKeys, selected: nextKeys.indexOf(keys[selected] ?? '') }),
  });
}

function remove({ get, set, steps }: Reach, list: ListName, index: number): void {
  const { project } = get();
  const { keys, selected } = standingOf(get(), list);
  const before = itemsIn(project, list);
  const items = before.toSpliced(index, 1);
  steps.end();
  set({
    project: withItems(project, list, items),
    ...standingAs(list, {
      keys: keys.toSpliced(index, 1),
      selected: Math.min(selected > index ? selected - 1 : selected, items.length - 1),
    }),
    deleted: { tag: tagOf(before[index]), list },
  });
}
