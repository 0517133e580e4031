/**
 * What a field of an element is: its name in the document and how its text is read. It is a quantity above zero, one of a
 * list of words, a number within bounds, or a share of a whole, '1 %'. Elements declare their own fields with it, so that
 * input can read them without knowing who they belong to.
 */
import type { Measure } from '../quantity/units.ts';

export type Field =
  | { readonly name: string; readonly type: 'quantity'; readonly measure: Measure; readonly required: boolean }
  | { readonly name: string; readonly type: 'choice'; readonly choices: readonly string[]; readonly required: boolean }
  | NumberField
  | { readonly name: string; readonly type: 'share'; readonly required: boolean };

/** A plain number and the bounds beyond which it is no figure of a meter. */
export interface NumberField {
  readonly name: string;
  readonly type: 'number';
  /** 'uncalibrated': only where no calibration stands in its place. */
  readonly required: boolean | 'uncalibrated';
  readonly least: number;
  readonly most: number;
}
