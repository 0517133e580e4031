/**
 * What a field of an element is: its name in the document and how its text is read. Elements declare their own fields
 * with it, so that input can read them without knowing who they belong to.
 */
import type { Measure } from '../quantity/units.ts';

export type Field =
  | { readonly name: string; readonly type: 'quantity'; readonly measure: Measure; readonly required: boolean }
  | { readonly name: string; readonly type: 'choice'; readonly choices: readonly string[]; readonly required: boolean }
  | { readonly name: string; readonly type: 'number'; readonly required: boolean };
