/** Custom of the trade, not a standard: pipe velocity, size of the span, turndown against the span. */
import type { FluidState } from '../fluid/contract.ts';
import type { Source } from '../quantity/source.ts';
import { velocityOf } from '../solve/equation.ts';
import type { Budgets } from '../uncertainty/duty.ts';
import { type Case, flowsOf, largest, NEAR_SATURATION } from './case.ts';
import type { Finding, Verdict } from './finding.ts';

const CUSTOM: Source = { clause: 'custom of the trade', seen: 'practice' };
/** Usual highest pipe velocities, m/s: liquids, gases, steam near saturation, superheated steam. */
const VELOCITY = { liquid: 5, gas: 30, saturated: 40, superheated: 60 };
const SPAN = { min: 2500, max: 50000 }; // Pa
/** A differential below a sixteenth of the span is less than a quarter of the flow. */
const LEAST_SHARE = 6.25; // %

/** Pipe velocity and span against the usual ones; the turndown, where there is more than one flow. */
export function checkPractice(subject: Case, budgets: Budgets): readonly Finding[] {
  const { insertion } = subject.solution.meter.primary;
  const span = insertion === undefined ? [checkSpan(subject)] : []; // the differential of a bar is what the flow makes it
  return [checkVelocity(subject), ...span, ...checkTurndown(subject, budgets)];
}

const caution = (bad: boolean): Verdict => (bad ? 'caution' : 'inside');

function checkVelocity(subject: Case): Finding {
  const { state, geometry } = subject.solution.meter;
  const flow = largest(flowsOf(subject), ({ massFlow }) => massFlow);
  const value = velocityOf(flow.massFlow, state.density, geometry.pipe);
  const max = usualVelocity(state);
  const common = { id: 'velocity', assumption: 'range-and-span', verdict: caution(value > max) } as const;
  return { ...common, value, unit: 'm/s', limit: { max }, source: CUSTOM, at: flow.name };
}

/** Usual highest velocity of the phase; a vapour above the critical pressure has no line to be near. */
function usualVelocity({ phase, temperature, saturationTemperature }: FluidState): number {
  if (phase === 'liquid' || phase === 'gas') return VELOCITY[phase];
  const near = saturationTemperature !== undefined && temperature - saturationTemperature < NEAR_SATURATION;
  return phase === 'vapour' && near ? VELOCITY.saturated : VELOCITY.superheated;
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
