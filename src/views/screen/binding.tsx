/** Binds the screen to the store and the commands that app hands in. */
import { createContext, type ReactNode, use, useEffect } from 'react';
import { useStore } from 'zustand';
import type { Commands } from '../../state/commands.ts';
import type { Workbench, WorkbenchStore } from '../../state/workbench.ts';
import { rememberOrigins } from './presented.ts';

interface Binding {
  readonly store: WorkbenchStore;
  readonly commands: Commands;
}

const BindingContext = createContext<Binding | undefined>(undefined);

export function BindingProvider({ children, ...binding }: Binding & { readonly children: ReactNode }) {
  const { store } = binding;
  useEffect(() => {
    rememberOrigins(store.getState());
    return store.subscribe(rememberOrigins);
  }, [store]);
  return <BindingContext value={binding}>{children}</BindingContext>;
}

function useBinding(): Binding {
  const binding = use(BindingContext);
  if (binding === undefined) throw new Error('expected a component inside BindingProvider, got none around it');
  return binding;
}

/** One part of the workbench; the component is drawn again when that part changes. */
export const useWorkbench = <Part,>(select: (state: Workbench) => Part): Part => useStore(useBinding().store, select);

/** The store itself, for what is done on a key or a click. */
export const useWorkbenchStore = (): WorkbenchStore => useBinding().store;

export const useCommands = (): Commands => useBinding().commands;
