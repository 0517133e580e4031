/** The element's own limits of use: sizes, diameter ratio, Reynolds number, velocity, p2/p1, pipe roughness. */
import type { Limit, LimitId } from '../element/contract.ts';
import { velocityOf } from '../solve/equation.ts';
import { boundsOf, type Case, type Flow, flowsOf, largest, limitOf, within } from './case.ts';
import type { Finding } from './finding.ts';

/** One finding for each limit that the element's standard or sheet sets and the meter states a figure for. */
export function checkLimits(subject: Case): readonly Finding[] {
  const { geometry, primary } = subject.solution.meter;
  const limits = primary.limits(geometry, 0); // of sizes, which depend on no flow
  return [
    ...size(limits, 'pipe-bore', geometry.pipe, 'm'),
    ...size(limits, 'element-bore', geometry.bore, 'm'),
    ...size(limits, 'diameter-ratio', geometry.ratio, '1'),
    ...checkReynolds(subject),
    ...checkVelocity(subject),
    ...checkPressureRatio(subject),
    ...checkRoughness(subject),
  ];
}

function size(limits: readonly Limit[], id: LimitId, value: number, unit: string): Finding[] {
  const limit = limits.find((one) => one.id === id);
  if (limit === undefined) return [];
  const bounds = boundsOf(limit);
  return [
    {
      id,
      assumption: 'range-and-span',
      verdict: within(value, bounds),
      value,
      unit,
      limit: bounds,
      source: limit.source,
    },
  ];
}

/** One finding when every flow is inside, from the lowest to the highest; else one for each flow that is not. */
function checkReynolds(subject: Case): Finding[] {
  const flows = flowsOf(subject);
  const finding = (flow: Flow): Finding[] => {
    const limit = limitOf(subject, 'reynolds-pipe', flow.reynolds);
    if (limit === undefined) return [];
    const bounds = boundsOf(limit);
    const held = flow.heldAt === undefined ? {} : { heldAt: flow.heldAt };
    const verdict = within(flow.reynolds, bounds);
    const common = {
      id: 'reynolds-pipe',
      assumption: 'frictionless',
      verdict,
      value: flow.reynolds,
      unit: '1',
    } as const;
    return [{ ...common, limit: bounds, source: limit.source, at: flow.name, detail: held }];
  };
  const all = flows.flatMap(finding);
  const outside = all.filter(({ verdict }) => verdict !== 'inside');
  if (outside.length > 0) return outside;
  const lowest = finding(largest(flows, ({ reynolds }) => -reynolds));
  const highest = largest(flows, ({ reynolds }) => reynolds).reynolds;
  return lowest.map(({ at: _, ...rest }) => ({ ...rest, detail: { highest } }));
}

/** What the element itself may be run at, for its strength or its coefficient; custom has its own in practice.ts. */
function checkVelocity(subject: Case): Finding[] {
  const { state, geometry } = subject.solution.meter;
  const flow = largest(flowsOf(subject), ({ massFlow }) => massFlow);
  const limit = limitOf(subject, 'pipe-velocity', flow.reynolds);
  if (limit === undefined) return [];
  const value = velocityOf(flow.massFlow, state.density, geometry.pipe);
  const bounds = boundsOf(limit);
  const common = { id: 'pipe-velocity', assumption: 'range-and-span', verdict: within(value, bounds) } as const;
  return [{ ...common, value, unit: 'm/s', limit: bounds, source: limit.source, at: flow.name }];
}

/** p2/p1 matters to a fluid that expands. */
function checkPressureRatio(subject: Case): Finding[] {
  const { state } = subject.solution.meter;
  if (!state.expands) return [];
  const flow = largest(flowsOf(subject), ({ differential }) => differential);
  const limit = limitOf(subject, 'pressure-ratio', flow.reynolds);
  if (limit === undefined) return [];
  const value = 1 - flow.differential / state.pressure;
  const bounds = boundsOf(limit);
  const verdict = within(value, bounds);
  return [
    {
      id: 'pressure-ratio',
      assumption: 'incompressible',
      verdict,
      value,
      unit: '1',
      limit: bounds,
      source: limit.source,
      at: flow.name,
    },
  ];
}

/** Judged at the flow whose limits are narrowest, the largest Reynolds number. */
function checkRoughness(subject: Case): Finding[] {
  const roughness = subject.input.pipe.roughness;
  if (roughness === undefined) return [];
  const flow = largest(flowsOf(subject), ({ reynolds }) => reynolds);
  const limit = limitOf(subject, 'pipe-roughness', flow.reynolds);
  if (limit === undefined) return [];
  const bounds = boundsOf(limit);
  const verdict = within(roughness, bounds);
  return [
    {
      id: 'pipe-roughness',
      assumption: 'frictionless',
      verdict,
      value: roughness,
      unit: 'm',
      limit: bounds,
      source: limit.source,
      at: flow.name,
    },
  ];
}
