/** The uncertainty of each duty point there is. */
import type { DutyName } from '../document/project.ts';
import type { Part } from '../element/contract.ts';
import type { StatedUncertainty } from '../input/uncertainty.ts';
import type { Solution } from '../solve/solve.ts';
import { type Budget, flowUncertainty, type Open } from './iso5167.ts';

export type Budgets = Readonly<Partial<Record<DutyName, Budget>>>;

/** `extra` are additive parts of C beside the element's own, `open` what else makes the flow less certain. */
export function dutyUncertainty(
  solution: Solution,
  stated: StatedUncertainty,
  extra: readonly Part[],
  open: readonly Open[],
): Budgets {
  const budgets: Partial<Record<DutyName, Budget>> = {};
  for (const name of ['maximum', 'normal', 'minimum'] as const) {
    const operation = solution.duty[name];
    if (operation === undefined) continue;
    const budget = flowUncertainty(solution.meter, operation, stated, solution.span, extra);
    budgets[name] = { ...budget, open: [...budget.open, ...open] };
  }
  return budgets;
}
