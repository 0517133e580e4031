/** The equations of state that a gas may be computed with, each with its source, range and uncertainty. */
import type { Source } from '../../quantity/source.ts';
import type { Caution, FigureRange, StatedUncertainty } from '../contract.ts';
import { detailMixtureOf } from '../detail/mixture.ts';
import { DETAIL, detailCautions, detailRange, detailUncertainty } from '../detail/range.ts';
import { mixtureOf } from '../gerg/mixture.ts';
import type { Mixture } from '../helmholtz/mixture.ts';
import { GERG, gasUncertainty, gergCautions, gergRange } from './range.ts';

/** An equation of state of a gas mixture. */
export interface GasEquation {
  readonly source: Source;
  /** The mixture of mole fractions in the order of componentNames. */
  readonly mixtureOf: (x: readonly number[]) => Mixture;
  /** In what a state leaves the range of the equation; Pa, K. */
  readonly cautions: (x: readonly number[], p: number, T: number) => readonly Caution[];
  /** Where density and speed of sound hold with that uncertainty, or at all. */
  readonly range: (x: readonly number[], p: number, T: number) => FigureRange;
  /** Uncertainty of density and speed of sound where one is stated; Pa, K. */
  readonly uncertainty: (x: readonly number[], p: number, T: number) => StatedUncertainty | undefined;
}

/** By the names of the file. */
export const gasEquations = {
  'gerg-2008': {
    source: GERG,
    mixtureOf,
    cautions: gergCautions,
    range: gergRange,
    uncertainty: gasUncertainty,
  },
  'aga8-detail': {
    source: DETAIL,
    mixtureOf: detailMixtureOf,
    cautions: detailCautions,
    range: () => detailRange,
    uncertainty: detailUncertainty,
  },
} as const satisfies Readonly<Record<string, GasEquation>>;

/** A name of an equation in the file. */
export type EquationName = keyof typeof gasEquations;
/** Those names, in the order they are offered. */
export const equationNames = Object.keys(gasEquations) as readonly EquationName[];
