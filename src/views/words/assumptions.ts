/** The assumptions of Bernoulli's equation under which the checks stand: title, and what stands in for each. */
import type { Finding } from '../../core/check/finding.ts';

export type Assumption = Finding['assumption'];

export interface AssumptionWords {
  readonly assumption: Assumption;
  readonly title: string;
  readonly meaning: string;
}

/** In the order of the list. */
export const assumptions: readonly AssumptionWords[] = [
  {
    assumption: 'steady',
    title: 'Steady',
    meaning: 'The flow does not change with time. Pulsation makes any differential meter read high.',
  },
  {
    assumption: 'incompressible',
    title: 'Incompressible',
    meaning: 'The density stays the same through the element. For a gas the expansibility factor stands in.',
  },
  {
    assumption: 'frictionless',
    title: 'Frictionless',
    meaning: 'Nothing is lost to friction and contraction. The discharge coefficient stands in, within its limits.',
  },
  {
    assumption: 'one-streamline',
    title: 'One streamline',
    meaning: 'The whole stream moves as one. Straight pipe makes the profile that the coefficient was measured in.',
  },
  {
    assumption: 'one-phase',
    title: 'One phase',
    meaning: 'Only liquid, or only gas. A liquid must not boil at the jet, a vapour must not condense.',
  },
  {
    assumption: 'range-and-span',
    title: 'Range and span',
    meaning:
      'The sizes lie in the range of the standard, the fluid in that of its figures, the flows in that of the instrument.',
  },
];
