/** Carries out the keys of keys.table.ts. */
import { useEffect } from 'react';
import type { Commands } from '../../../state/commands.ts';
import type { Workbench } from '../../../state/workbench.ts';
import { useCommands, useWorkbenchStore } from '../binding.tsx';
import { placeNow } from '../place.ts';
import { type DialogName, useDialogs } from './dialogs.tsx';
import { type Order, orderOf } from './keys.table.ts';

function follow(order: Order, state: Workbench, commands: Commands, show: (name: DialogName) => void): void {
  const surveying = placeNow() === 'survey';
  const selected = surveying ? state.traverseSelected : state.selected;
  const count = (surveying ? state.project.traverses : state.project.meters)?.length ?? 0;
  const within = (index: number): boolean => index >= 0 && index < count;
  const select = surveying ? state.selectTraverse : state.select;
  const move = surveying ? state.moveTraverse : state.moveMeter;
  const orders: Readonly<Record<Order, () => void>> = {
    keys: () => show('keys'),
    find: () => show('find'),
    undo: () => state.undo(),
    redo: () => state.redo(),
    save: () => void commands.saveFile(),
    open: () => void commands.openFile(),
    previous: () => within(selected - 1) && select(selected - 1),
    next: () => within(selected + 1) && select(selected + 1),
    up: () => within(selected - 1) && move(selected, selected - 1),
    down: () => within(selected + 1) && move(selected, selected + 1),
  };
  orders[order]();
}

export function Hotkeys() {
  const store = useWorkbenchStore();
  const commands = useCommands();
  const { open, show } = useDialogs();
  useEffect(() => {
    const onKeyDown = (event: KeyboardEvent): void => {
      const order = open === undefined && !event.defaultPrevented ? orderOf(event) : undefined;
      if (order === undefined) return;
      event.preventDefault();
      follow(order, store.getState(), commands, show);
    };
    window.addEventListener('keydown', onKeyDown);
    return () => window.removeEventListener('keydown', onKeyDown);
  }, [store, commands, open, show]);
  return null;
}
