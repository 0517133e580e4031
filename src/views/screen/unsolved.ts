/** What stands between a refused meter and its result: figures that cannot be used, and figures not given. */
import type { PresentedProblem } from '../present/model.ts';
import { valueAt } from './text.ts';

interface Unsolved {
  readonly wrong: readonly PresentedProblem[];
  readonly missing: readonly PresentedProblem[];
  /** Some figure of the pipe, the element or the duty is written already. */
  readonly begun: boolean;
}

const FIGURES = ['pipe.bore', 'element.bore', 'differential', 'duty', 'upstream'];

const isEmpty = (written: unknown): boolean => written === undefined || written === '';

/** An item as it is written, and the problems of its result. */
export interface Troubled {
  readonly now: { readonly problems: readonly PresentedProblem[] };
  readonly meter: unknown;
}

export function unsolved({ now, meter }: Troubled): Unsolved {
  const missing = now.problems.filter(({ field }) => isEmpty(valueAt(meter, field)));
  return {
    wrong: now.problems.filter((problem) => !missing.includes(problem)),
    missing,
    begun: FIGURES.some((path) => !isEmpty(valueAt(meter, path))),
  };
}
