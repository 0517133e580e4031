/**
 * The working of a figure as data: its formula, the values put in, the result and the clause. Views render it.
 *
 * Formula notation, one line of plain text, read by views/present/formula.ts and evaluated by a test that compares
 * it with the reported value:
 *   names     Latin or Greek letters, an underscore starts the subscript: q_m, Re_D, ρ_1, Δp, β, L_1
 *   numbers   0.5961, 1e6
 *   operators + − written as -, * for a product, / for a fraction, ^ for a power, parentheses
 *   functions sqrt( ), exp( ), ln( ), abs( ), min( ; ), max( ; )
 *   π is the constant; every other name must have a value in `values`.
 */
import type { Source } from './source.ts';

export interface Given {
  readonly symbol: string; // as written in the formula
  readonly value: number; // in `unit`
  readonly unit: string; // '' when it has none; file spelling, for example 'kg/m3'
  readonly words: string; // code of the name of the quantity, see views/words
}

/** A value of a formula: `words` is the code of its name. */
export const named = (symbol: string, value: number, unit: string, words: string): Given => ({
  symbol,
  value,
  unit,
  words,
});

export interface Working {
  /** Which reported figure this explains, for example `C`, `epsilon`, `differential`; unique within one point. */
  readonly id: string;
  readonly symbol: string;
  /** The right-hand side in the notation above; absent when the value is stated or comes from a table or a release. */
  readonly formula?: string;
  readonly given: readonly Given[];
  readonly value: number;
  readonly unit: string;
  readonly source: Source;
  /** Code of a sentence that says what the formula cannot, see views/words. */
  readonly remark?: string;
}
