/** Every check of a traverse, grouped by the order of the assumptions: the plane, the probe, the points and the readings. */
import type { Source } from '../quantity/source.ts';
import { type Quality, STRONG } from '../traverse/quality.ts';
import type { Survey } from '../traverse/survey.ts';
import { machOf } from '../traverse/velocity.ts';
import { within } from './case.ts';
import { ASSUMPTIONS } from './check.ts';
import type { Finding } from './finding.ts';
import { findingOf } from './fluid.ts';
import type { TraverseCase } from './traverse-case.ts';
import { checkPlane } from './traverse-plane.ts';
import { checkProbe } from './traverse-probe.ts';

const MACH: Source = { clause: 'ISO 3966, scope', seen: 'second-hand' };
const BALANCING: Source = { clause: 'air balancing after ASHRAE 111', seen: 'memory' };
const METHOD_2: Source = { clause: '40 CFR 60 App. A, Method 2, 6.2', seen: 'memory' };
const RESOLUTION: Source = { clause: 'custom of the trade, gauge of 1 Pa', seen: 'practice' };
const DRIFT: Source = { clause: 'custom of the trade', seen: 'practice' };

const MOST_MACH = 0.25;
const LEAST_STRONG = 75; // %
const LEAST_VELOCITY = 3; // m/s, of a gas
const MOST_SENSITIVITY = 1.05;
const MOST_DRIFT = 5; // %

/** All findings: those of the plane and the probe before anything is read, those of the readings as they come. */
export function checkTraverse(subject: TraverseCase): readonly Finding[] {
  const { state } = subject.survey;
  const findings: Finding[] = [
    ...checkPlane(subject),
    ...checkProbe(subject),
    ...(state.cautions ?? []).map(findingOf),
    ...checkReadings(subject),
    ...checkDrift(subject),
    ...checkMach(subject),
  ];
  const rank = ({ assumption }: Finding) => ASSUMPTIONS.indexOf(assumption);
  return findings.sort((one, other) => rank(one) - rank(other));
}

function checkReadings({ input, survey, quality }: TraverseCase): readonly Finding[] {
  if (quality === undefined) return [];
  return [
    ...checkWeak(quality),
    ...checkReversed(quality),
    ...(survey.state.expands ? checkSlow(survey) : []),
    ...(input.rule === 'equal-area' ? checkGauge(quality) : []),
  ];
}

function checkWeak({ strongPercent, largest }: Quality): readonly Finding[] {
  const limit = { min: LEAST_STRONG };
  const verdict = within(strongPercent, limit);
  const common = { id: 'traverse-weak-readings', assumption: 'one-streamline', verdict, unit: '%' } as const;
  return [{ ...common, value: strongPercent, limit, source: BALANCING, detail: { share: 100 * STRONG, largest } }];
}

/** A reading at or below zero counts as no velocity. */
function checkReversed({ reversed, still }: Quality): readonly Finding[] {
  const verdict = reversed > 0 ? 'outside' : still > 0 ? 'caution' : 'inside';
  const common = { id: 'traverse-reversed', assumption: 'one-streamline', verdict, unit: '1' } as const;
  return [{ ...common, value: reversed, limit: { max: 0 }, source: BALANCING, detail: { reversed, still } }];
}

function checkSlow({ flow }: Survey): readonly Finding[] {
  if (flow === undefined) return [];
  const value = flow.meanVelocity;
  const verdict = value < LEAST_VELOCITY ? 'caution' : 'inside';
  const common = { id: 'traverse-slow', assumption: 'range-and-span', verdict, unit: 'm/s' } as const;
  return [{ ...common, value, limit: { min: LEAST_VELOCITY }, source: RESOLUTION }];
}

function checkGauge({ sensitivity }: Quality): readonly Finding[] {
  if (sensitivity === undefined) return [];
  const limit = { max: MOST_SENSITIVITY };
  const verdict = within(sensitivity, limit);
  const common = { id: 'traverse-gauge', assumption: 'range-and-span', verdict, unit: '1' } as const;
  return [{ ...common, value: sensitivity, limit, source: METHOD_2 }];
}

function checkDrift({ quality }: TraverseCase): readonly Finding[] {
  if (quality?.driftPercent === undefined) return [];
  const value = quality.driftPercent;
  const verdict = value > MOST_DRIFT ? 'caution' : 'inside';
  const common = { id: 'traverse-drift', assumption: 'steady', verdict, unit: '%' } as const;
  return [{ ...common, value, limit: { max: MOST_DRIFT }, source: DRIFT }];
}

function checkMach({ survey: { state }, quality }: TraverseCase): readonly Finding[] {
  const kappa = state.expands ? state.isentropicExponent : undefined;
  if (quality === undefined || kappa === undefined) return [];
  const value = machOf(Math.max(0, quality.largest) / state.pressure, kappa);
  const limit = { max: MOST_MACH };
  const verdict = within(value, limit);
  const common = { id: 'traverse-mach', assumption: 'incompressible', verdict, unit: '1' } as const;
  return [{ ...common, value, limit, source: MACH }];
}
