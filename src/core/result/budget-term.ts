/** One term of the uncertainty of a flow, by its name. */
import type { Budget, Term, TermName } from '../uncertainty/iso5167.ts';

/** Throws a defect for a term that the budget of this element does not have. */
export function termOf({ terms }: Budget, name: TermName): Term {
  const term = terms.find((one) => one.name === name);
  if (term === undefined) throw new Error(`result: expected the term ${name} in the budget, got none`);
  return term;
}
