/** The paper of the sheets, the day they are printed, and the place of each, for every page. */
import { createContext } from 'react';

export type Paper = 'A4' | 'Letter';

/** Sheets of a meter, of its log, and of a survey; checks and working are of both. */
export type SheetKind = 'sizing' | 'readings' | 'log' | 'form' | 'survey' | 'checks' | 'dimensions' | 'working';

/** Where a page stands among the sheets of its meter, from 1. */
export interface Place {
  readonly sheet: number;
  readonly of: number;
}

export const SheetContext = createContext<{ readonly paper: Paper; readonly printedOn: string }>({
  paper: 'A4',
  printedOn: '',
});
