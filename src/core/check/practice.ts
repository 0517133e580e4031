/** Custom of the trade, not a standard: pipe velocity, size of the span, turndown against the span. */
import type { Source } from '../quantity/source.ts';
import type { Budgets } from '../uncertainty/duty.ts';
import { type Case, flowsOf, largest } from './case.ts';
import type { Finding, Verdict } from './finding.ts';

const CUSTOM: Source = { clause: 'custom of the trade', seen: 'practice' };
/** Usual highest pipe velocities, m/s: liquids, gases, steam near saturation, superheated steam. */
const VELOCITY = { liquid: 5, gas: 30, saturated: 40, superheated: 60 };
const NEAR_SATURATION = 5; // K
const SPAN = { min: 2500, max: 50000 }; // Pa
/** A differential below a sixteenth of the span is less than a quarter of the flow. */
const LEAST_SHARE = 6.25; // %

export function checkPractice(subject: Case, budgets: Budgets): readonly Finding[] {
  return [checkVelocity(subject), checkSpan(subject), ...checkTurndown(subject, budgets)];
}

const caution = (bad: boolean): Verdict => (bad ? 'caution' : 'inside');

function checkVelocity(subject: Case): Finding {
  const { state, geometry } = subject.solution.meter;
  const flow = largest(flowsOf(subject), ({ massFlow }) => massFlow);
  const value = flow.massFlow / (state.density * (Math.PI / 4) * geometry.pipe ** 2); // continuity
  const superheat = state.temperature - (state.saturationTemperature ?? 0);
  const steam = superheat < NEAR_SATURATION ? VELOCITY.saturated : VELOCITY.superheated;
  const byPhase = { liquid: VELOCITY.liquid, gas: VELOCITY.gas, vapour: steam, supercritical: VELOCITY.superheated };
  const max = byPhase[state.phase];
  const common = { id: 'velocity', assumption: 'range-and-span', verdict: caution(value > max) } as const;
  return { ...common, value, unit: 'm/s', limit: { max }, source: CUSTOM, at: flow.name };
}

function checkSpan({ solution }: Case): Finding {
  const value = solution.span;
  const bad = value < SPAN.min || value > SPAN.max;
  const common = { id: 'span', assumption: 'range-and-span', verdict: caution(bad) } as const;
  return { ...common, value, unit: 'Pa', limit: SPAN, source: CUSTOM };
}

/** The smallest differential as a share of the span, and what the differential alone makes of the flow there. */
function checkTurndown(subject: Case, budgets: Budgets): Finding[] {
  const flows = flowsOf(subject);
  if (flows.length < 2) return [];
  const flow = largest(flows, ({ differential }) => -differential);
  const value = (100 * flow.differential) / subject.solution.span;
  const alone = budgets[flow.name]?.terms.find(({ name, stated }) => name === 'differential' && stated);
  return [
    {
      id: 'turndown',
      assumption: 'range-and-span',
      verdict: caution(value < LEAST_SHARE),
      value,
      unit: '%',
      limit: { min: LEAST_SHARE },
      source: CUSTOM,
      at: flow.name,
      ...(alone === undefined ? {} : { detail: { alone: alone.percentOfFlow } }),
    },
  ];
}
