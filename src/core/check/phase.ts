/** One phase: boiling of a liquid behind and in the jet, condensation of a vapour, a phase settled by the user. */
import type { Source } from '../quantity/source.ts';
import { lossOf } from '../solve/equation.ts';
import { type Case, flowsOf, largest, NEAR_SATURATION } from './case.ts';
import type { Finding } from './finding.ts';

const JET: Source = { clause: 'jet model of ISO 5167-2:2003, Eq (7)', seen: 'derived' };
const MARGIN: Source = { clause: 'cavitation index; least value by custom', seen: 'practice' };
const SATURATION: Source = { clause: 'saturation line; least distance by custom', seen: 'practice' };
/** Of (p1 - dp - pv)/dp. Below it the jet is close to boiling; where C itself may shift is lower, near 0.2. */
const LEAST_MARGIN = 0.5;

/** Where the state nears or leaves its one phase, for a fluid whose saturation line is known. */
export function checkPhase(subject: Case): readonly Finding[] {
  return [...checkBoiling(subject), ...checkSaturation(subject)];
}

/** Pressure behind the element and in the jet against the vapour pressure, at the flow with the largest differential. */
function checkBoiling(subject: Case): Finding[] {
  const { meter } = subject.solution;
  const { state, primary } = meter;
  const vapour = state.vapourPressure;
  if (state.phase !== 'liquid' || vapour === undefined || primary.insertion !== undefined) return []; // see bar.ts
  const flow = largest(flowsOf(subject), ({ differential }) => differential);
  const loss = lossOf(meter, flow);
  const common = { assumption: 'one-phase', at: flow.name } as const;
  const jet = state.pressure - flow.differential;
  const flashing = loss === undefined ? [] : [{ ...common, ...flashingAt(state.pressure - loss, vapour) }];
  const cavitation: Finding = {
    ...common,
    id: 'cavitation',
    verdict: jet <= vapour ? 'outside' : 'inside',
    value: jet,
    unit: 'Pa',
    limit: { min: vapour },
    source: JET,
  };
  const index = (jet - vapour) / flow.differential;
  const margin: Finding = {
    ...common,
    id: 'cavitation-margin',
    verdict: index < LEAST_MARGIN ? 'caution' : 'inside',
    value: index,
    unit: '1',
    limit: { min: LEAST_MARGIN },
    source: MARGIN,
  };
  return jet <= vapour ? [...flashing, cavitation] : [...flashing, cavitation, margin];
}

const flashingAt = (behind: number, vapour: number) =>
  ({
    id: 'flashing',
    verdict: behind <= vapour ? 'outside' : 'inside',
    value: behind,
    unit: 'Pa',
    limit: { min: vapour },
    source: JET,
  }) as const;

/** Distance from the saturation line; a phase that was settled against or on the line is a caution. */
function checkSaturation({ solution }: Case): Finding[] {
  const { state } = solution.meter;
  if (state.saturationTemperature === undefined || state.phase === 'supercritical') return [];
  if (state.quality !== undefined) return []; // on the line by its nature; fluid.ts says so
  const liquid = state.phase === 'liquid';
  const distance = liquid
    ? state.saturationTemperature - state.temperature
    : state.temperature - state.saturationTemperature;
  const near = distance < NEAR_SATURATION;
  return [
    {
      id: liquid ? 'subcooling' : 'superheat',
      assumption: 'one-phase',
      verdict: near || state.phaseForced === true ? 'caution' : 'inside',
      value: distance,
      unit: 'K',
      limit: { min: NEAR_SATURATION },
      source: SATURATION,
      detail: { saturation: state.saturationTemperature, forced: state.phaseForced === true ? 'yes' : 'no' },
    },
  ];
}
