/** A quantity's text as the field shows it: the number as written at the left, its unit at the right. */
import { readQuantity } from '../../../core/quantity/text.ts';
import { type Measure, type Unit, unitsFor } from '../../../core/quantity/units.ts';

export interface Split {
  readonly number: string;
  readonly unit: Unit | undefined;
}

/** Text that cannot be read stays whole, without a unit. */
export function split(text: string, measures: readonly Measure[]): Split {
  const read = readQuantity(text, measures, '');
  return read.ok ? { number: read.value.number, unit: read.value.unit } : { number: text, unit: undefined };
}

export interface UnitGroup {
  readonly measure: Measure;
  readonly units: readonly Unit[];
}

/** The units a field offers, those of one measure together. */
export const unitMenu = (measures: readonly Measure[]): readonly UnitGroup[] =>
  measures.map((measure) => ({ measure, units: unitsFor(measure) }));
