/** Plain SI numbers made into kinds, for what is read from text or typed in a table. Formulas brand on their return line. */
import type { Kind } from './kinds.ts';
import type { Measure } from './measure.ts';
import type { Quantity } from './text.ts';

/** A number known to be of a kind: `as<'length'>(0.1)`. The caller states the kind, nothing checks it. */
export const as = <Name extends string>(si: number): Kind<Name> => si as Kind<Name>;

/** The SI value of a quantity of one measure, or undefined when it is another: the kind follows the measure. */
export const kindOf = <Name extends Measure>(quantity: Quantity, measure: Name): Kind<Name> | undefined =>
  quantity.measure === measure ? as<Name>(quantity.si) : undefined;
