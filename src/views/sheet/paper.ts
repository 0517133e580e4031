/** The paper of the sheets and the day they are printed, for every page. */
import { createContext } from 'react';

export type Paper = 'A4' | 'Letter';

export const SheetContext = createContext<{ readonly paper: Paper; readonly printedOn: string }>({
  paper: 'A4',
  printedOn: '',
});
