/** Quantity text of a file: a number with a decimal point and its unit, for example `7 bar(g)`. */
import type { Measure, Unit } from './measure.ts';
import type { Outcome } from './outcome.ts';
import { fail } from './outcome.ts';

export interface Quantity {
  readonly measure: Measure;
  readonly unit: Unit;
  /** The number as written, without its unit. */
  readonly number: string;
  /** SI value; a gauge pressure stays a gauge pressure in Pa, no atmosphere is added here. */
  readonly si: number;
}

export function readQuantity(text: string, _measures: readonly Measure[], field: string): Outcome<Quantity> {
  return fail('number-unreadable', field, { written: text });
}
