/** What a bar across the pipe asks beside its own limits: a figure for the expansion of a gas, and no boiling behind it. */
import type { Source } from '../quantity/source.ts';
import { type Case, flowsOf, largest } from './case.ts';
import type { Finding } from './finding.ts';

const SHEET: Source = { clause: 'maker’s sheet, as entered', seen: 'read' };
/** The ports behind the bar feel at least p1 - dp: the ports in front feel p1 and the velocity. */
const BEHIND: Source = { clause: 'pressure at the ports behind the bar', seen: 'derived' };

/** Findings for an averaging pitot; none for an element with a bore. */
export function checkBar(subject: Case): readonly Finding[] {
  if (subject.solution.meter.primary.insertion === undefined) return [];
  return [...checkExpansion(subject), ...checkBoiling(subject)];
}

/** A gas expands on its way round the bar: without the maker's figure its factor is taken as 1. */
function checkExpansion(subject: Case): Finding[] {
  const { state, primary } = subject.solution.meter;
  if (!state.expands || primary.insertion?.expansionStated !== false) return [];
  const flow = largest(flowsOf(subject), ({ differential }) => differential);
  const value = (100 * flow.differential) / state.pressure;
  const common = { id: 'expansion-number', assumption: 'incompressible', verdict: 'caution' } as const;
  return [{ ...common, value, unit: '%', limit: {}, source: SHEET, at: flow.name }];
}

function checkBoiling(subject: Case): Finding[] {
  const { state } = subject.solution.meter;
  const vapour = state.vapourPressure;
  if (state.phase !== 'liquid' || vapour === undefined) return [];
  const flow = largest(flowsOf(subject), ({ differential }) => differential);
  const value = state.pressure - flow.differential;
  const verdict = value <= vapour ? 'outside' : 'inside';
  const common = { id: 'bar-cavitation', assumption: 'one-phase', verdict } as const;
  return [{ ...common, value, unit: 'Pa', limit: { min: vapour }, source: BEHIND, at: flow.name }];
}
