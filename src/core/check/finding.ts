/** A finding: solved, and this is how the meter stands against one limit. Views put the words to it by `id`. */
import type { Source } from '../quantity/source.ts';

export type Verdict = 'inside' | 'caution' | 'outside';

/** The assumption of Bernoulli's equation that a limit guards. */
export type Assumption =
  | 'steady'
  | 'incompressible'
  | 'frictionless'
  | 'one-streamline'
  | 'one-phase'
  | 'range-and-span';

export interface Finding {
  /** Code, its sentence stands in views/words/findings.ts; the same id may stand once for each duty point. */
  readonly id: string;
  readonly assumption: Assumption;
  readonly verdict: Verdict;
  /** The figure compared, in `unit`. */
  readonly value: number;
  readonly unit: string; // file spelling of an SI unit, '1', '%', 'D' (pipe bores)
  readonly limit: { readonly min?: number; readonly max?: number };
  readonly source: Source;
  /** The duty point or point of the range it was found at, where it depends on one. */
  readonly at?: 'maximum' | 'normal' | 'minimum';
  /** What the sentence needs beside value and limit (figures in SI, codes of words). */
  readonly detail?: Readonly<Record<string, string | number>>;
}
