/** Limits of the fluid's own formulation, as its state reports them, and a temperature that stands as measured downstream. */
import type { Caution } from '../fluid/contract.ts';
import type { Source } from '../quantity/source.ts';
import type { Case } from './case.ts';
import type { Finding } from './finding.ts';

const UPSTREAM: Source = { clause: 'ISO 5167-1:2003, 5.4.4.1', seen: 'memory' };

/** One finding for each caution of the state, under the same id, and one where the temperature is not corrected. */
export const checkFluid = ({ solution }: Case): readonly Finding[] => [
  ...(solution.meter.state.cautions ?? []).map(findingOf),
  ...checkTemperature(solution),
];

/** A caution as a finding: about the phase itself, or about the range of what was computed. */
export const findingOf = ({ ofPhase = false, ...caution }: Caution): Finding => ({
  ...caution,
  assumption: ofPhase ? 'one-phase' : 'range-and-span',
});

function checkTemperature({ downstream }: Case['solution']): readonly Finding[] {
  if (downstream === undefined || !('why' in downstream)) return [];
  const { measured, why } = downstream;
  return [
    {
      id: 'temperature-downstream',
      assumption: 'range-and-span',
      verdict: 'caution',
      value: measured,
      unit: 'K',
      limit: {},
      source: UPSTREAM,
      detail: { why },
    },
  ];
}
