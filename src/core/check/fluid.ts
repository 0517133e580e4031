/** Limits of the fluid's own formulation, as its state reports them. */
import type { Case } from './case.ts';
import type { Finding } from './finding.ts';

/** One finding for each caution of the state, under the same id. */
export const checkFluid = ({ solution }: Case): readonly Finding[] =>
  (solution.meter.state.cautions ?? []).map((caution) => ({ ...caution, assumption: 'one-phase' }));
