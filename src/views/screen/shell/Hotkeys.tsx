/** Carries out the keys of keys.table.ts. */
import { useEffect } from 'react';
import type { Commands } from '../../../state/commands.ts';
import type { Workbench } from '../../../state/workbench.ts';
import { useCommands, useWorkbenchStore } from '../binding.tsx';
import { type DialogName, useDialogs } from './dialogs.tsx';
import { type Order, orderOf } from './keys.table.ts';

function follow(order: Order, state: Workbench, commands: Commands, show: (name: DialogName) => void): void {
  const { selected, project } = state;
  const within = (index: number): boolean => index >= 0 && index < project.meters.length;
  const orders: Readonly<Record<Order, () => void>> = {
    keys: () => show('keys'),
    find: () => show('find'),
    undo: () => state.undo(),
    redo: () => state.redo(),
    save: () => void commands.saveFile(),
    open: () => void commands.openFile(),
    previous: () => within(selected - 1) && state.select(selected - 1),
    next: () => within(selected + 1) && state.select(selected + 1),
    up: () => within(selected - 1) && state.moveMeter(selected, selected - 1),
    down: () => within(selected + 1) && state.moveMeter(selected, selected + 1),
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
