/** How one reading stands: what its instrument reports, and those limits of the meter that depend on the flow. */
import type { Caution } from '../fluid/contract.ts';
import type { Source } from '../quantity/source.ts';
import type { Case } from './case.ts';
import type { Finding } from './finding.ts';
import { checkFluid, findingOf } from './fluid.ts';
import { checkLimits } from './limits.ts';
import { checkPhase } from './phase.ts';

const SPAN: Source = { clause: 'span of the meter as set', seen: 'read' };
/** Limits that a flow can leave; sizes were judged with the meter. */
const OF_FLOW: readonly string[] = ['reynolds-pipe', 'pressure-ratio'];

/** Findings of an instrument alone, where nothing flows or nothing can be said. */
export const checkInstrument = (cautions: readonly Caution[]): readonly Finding[] => cautions.map(findingOf);

/** Findings of a reading that makes a flow; `subject` is the meter at that moment with that flow as its only one. */
export function checkReading(subject: Case, cautions: readonly Caution[]): readonly Finding[] {
  const { duty, span } = subject.solution;
  const value = duty.maximum.differential;
  const above: Finding = {
    id: 'reading-above-span',
    assumption: 'range-and-span',
    verdict: 'caution',
    value,
    unit: 'Pa',
    limit: { max: span },
    source: SPAN,
  };
  const ofMeter = [
    ...checkLimits(subject).filter(({ id }) => OF_FLOW.includes(id)),
    ...checkFluid(subject),
    ...checkPhase(subject),
  ].map(alone);
  return [...checkInstrument(cautions), ...(value > span ? [above] : []), ...ofMeter];
}

/** A finding of one flow names no duty point and no other flow. */
function alone({ at: _, detail, ...finding }: Finding): Finding {
  const { highest: __, ...kept } = detail ?? {};
  return Object.keys(kept).length === 0 ? finding : { ...finding, detail: kept };
}
