/** Plain SI numbers made into kinds, for what is read from text or typed in a table. Formulas brand on their return line. */
import type { Kind, Ratio } from './kinds.ts';
import type { Measure } from './measure.ts';

/** A number known to be of a kind: `as<'length'>(0.1)`. The caller states the kind, nothing checks it. */
export const as = <Name extends string>(si: number): Kind<Name> => si as Kind<Name>;

/** Measures whose unit says of what a figure is a share; the figure itself is a ratio. */
type Relative = 'bores' | 'share' | 'share of span' | 'share of reading';

/** The kind of number that a quantity of a measure has in SI: a measure and its kind have one name. */
export type Kinds = { readonly [Name in Measure]: Name extends Relative ? Ratio : Kind<Name> };
