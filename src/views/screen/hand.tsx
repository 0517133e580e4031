/** The item that the fields on a place write to: the selected meter, or on the place of surveys the selected traverse. */
import { createContext, type ReactNode, use } from 'react';
import type { MeterText, TraverseText } from '../../core/document/project.ts';
import { itemsIn, type ListName, standingOf } from '../../state/lists.ts';
import type { Workbench, WorkbenchActions } from '../../state/workbench.ts';
import { useWorkbench } from './binding.tsx';
import { valueAt } from './text.ts';

const HandContext = createContext<ListName>('meters');

export const HandProvider = ({ list, children }: { readonly list: ListName; readonly children: ReactNode }) => (
  <HandContext value={list}>{children}</HandContext>
);

export const useHand = (): ListName => use(HandContext);

/** The item at hand as it is written; a file may hold anything in its place. */
export const itemAt = (state: Workbench, list: ListName): MeterText | TraverseText | undefined =>
  itemsIn(state.project, list)[standingOf(state, list).selected] as MeterText | TraverseText | undefined;

/** What is written at a path of the item at hand. */
export function useWritten(path: string): unknown {
  const list = useHand();
  return useWorkbench((state) => valueAt(itemAt(state, list), path));
}

/** A part of the item at hand. */
export function useItem<Part>(select: (item: MeterText | TraverseText | undefined) => Part): Part {
  const list = useHand();
  return useWorkbench((state) => select(itemAt(state, list)));
}

/** Writes one value of the item at hand. */
export function useWrite(): (path: string, value: unknown) => void {
  const list = useHand();
  const write = useWorkbench((state) => state.write);
  return (path, value) => write(path, value, list);
}

/** Writes several values of the item at hand as one step of undo. */
export function useWriteAll(): (values: Parameters<WorkbenchActions['writeAll']>[0]) => void {
  const list = useHand();
  const writeAll = useWorkbench((state) => state.writeAll);
  return (values) => writeAll(values, list);
}
