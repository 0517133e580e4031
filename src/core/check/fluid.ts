/** Limits of the fluid's own formulation, as its state reports them. */
import type { Case } from './case.ts';
import type { Finding } from './finding.ts';

export const checkFluid = ({ solution }: Case): readonly Finding[] =>
  (solution.meter.state.cautions ?? []).map((caution) => ({ ...caution, assumption: 'one-phase' }));
