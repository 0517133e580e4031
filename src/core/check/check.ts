/** Every check of a solved meter, grouped by the order of the assumptions. */
import type { Budgets } from '../uncertainty/duty.ts';
import { checkBar } from './bar.ts';
import { checkCalibration } from './calibration.ts';
import type { Case } from './case.ts';
import type { Assumption, Finding } from './finding.ts';
import { checkFluid } from './fluid.ts';
import { checkLimits } from './limits.ts';
import { checkPhase } from './phase.ts';
import { checkPlate } from './plate.ts';
import { checkPractice } from './practice.ts';
import { checkSteady } from './steady.ts';

/** The assumptions of Bernoulli's equation, in the order in which the findings stand. */
export const ASSUMPTIONS: readonly Assumption[] = [
  'steady',
  'incompressible',
  'frictionless',
  'one-streamline',
  'one-phase',
  'range-and-span',
];

/** All findings; `straight` are those of straight.ts, which the uncertainty needed earlier. */
export function check(subject: Case, budgets: Budgets, straight: readonly Finding[]): readonly Finding[] {
  const findings = [
    ...checkSteady(subject),
    ...checkLimits(subject),
    ...checkCalibration(subject),
    ...straight,
    ...checkBar(subject),
    ...checkFluid(subject),
    ...checkPhase(subject),
    ...checkPlate(subject),
    ...checkPractice(subject, budgets),
  ];
  const rank = ({ assumption }: Finding) => ASSUMPTIONS.indexOf(assumption);
  return findings.sort((one, other) => rank(one) - rank(other));
}
