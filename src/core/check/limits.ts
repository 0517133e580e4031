/** The standard's own limits of use: sizes, diameter ratio, Reynolds number, p2/p1, pipe roughness. */
import type { LimitId } from '../element/contract.ts';
import { boundsOf, type Case, type Flow, flowsOf, largest, limitOf, within } from './case.ts';
import type { Assumption, Finding } from './finding.ts';

export function checkLimits(subject: Case): readonly Finding[] {
  const { geometry } = subject.solution.meter;
  return [
    ...size(subject, 'pipe-bore', 'range-and-span', geometry.pipe, 'm'),
    ...size(subject, 'element-bore', 'range-and-span', geometry.bore, 'm'),
    ...size(subject, 'diameter-ratio', 'range-and-span', geometry.ratio, '1'),
    ...checkReynolds(subject),
    ...checkPressureRatio(subject),
    ...checkRoughness(subject),
  ];
}

function size(subject: Case, id: LimitId, assumption: Assumption, value: number, unit: string): Finding[] {
  const limit = limitOf(subject, id, 0);
  if (limit === undefined) return [];
  const bounds = boundsOf(limit);
  return [{ id, assumption, verdict: within(value, bounds), value, unit, limit: bounds, source: limit.source }];
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
