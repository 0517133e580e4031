/** The uncertainty of each duty point there is. */
import type { DutyName } from '../document/project.ts';
import type { Part } from '../element/contract.ts';
import type { StatedUncertainty } from '../input/uncertainty.ts';
import type { Solution } from '../solve/solve.ts';
import { type Budget, flowUncertainty } from './iso5167.ts';

export type Budgets = Readonly<Partial<Record<DutyName, Budget>>>;

/** `extra` are additive parts of C beside the element's own. */
export function dutyUncertainty(solution: Solution, stated: StatedUncertainty, extra: readonly Part[]): Budgets {
  const budgets: Partial<Record<DutyName, Budget>> = {};
  for (const name of ['maximum', 'normal', 'minimum'] as const) {
    const operation = solution.duty[name];
    if (operation) budgets[name] = flowUncertainty(solution.meter, operation, stated, solution.span, extra);
  }
  return budgets;
}
