/** Which dialog is open; one at a time. */
import { createContext, type ReactNode, use, useState } from 'react';

export type DialogName = 'keys' | 'find' | 'project' | 'kept';

interface Dialogs {
  readonly open: DialogName | undefined;
  readonly show: (name: DialogName | undefined) => void;
}

const DialogContext = createContext<Dialogs | undefined>(undefined);

export function DialogProvider({ children }: { readonly children: ReactNode }) {
  const [open, show] = useState<DialogName>();
  return <DialogContext value={{ open, show }}>{children}</DialogContext>;
}

export function useDialogs(): Dialogs {
  const dialogs = use(DialogContext);
  if (dialogs === undefined) throw new Error('expected a component inside DialogProvider, got none around it');
  return dialogs;
}
