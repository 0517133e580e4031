/** The probe in its duct: coefficient, size, stem, distance from the wall, alignment, Reynolds number of its hole. */
import type { Source } from '../quantity/source.ts';
import type { Measured } from '../traverse/survey.ts';
import { USUAL_COEFFICIENT } from '../traverse/velocity.ts';
import { within } from './case.ts';
import type { Finding, Verdict } from './finding.ts';
import type { TraverseCase } from './traverse-case.ts';

const iso = (clause: string): Source => ({ clause: `ISO 3966, ${clause}`, seen: 'memory' });
const CUSTOM: Source = { clause: 'custom of the trade', seen: 'practice' };

const MOST_HEAD = 0.02; // of the diameter
const STEM = { full: 1, most: 2 }; // % of the area
const MOST_ANGLE = (3 * Math.PI) / 180; // rad
const LEAST_REYNOLDS = 200; // of the total-pressure hole

export const checkProbe = (subject: TraverseCase): readonly Finding[] => [
  ...checkCoefficient(subject),
  ...checkHead(subject),
  ...checkStem(subject),
  ...checkWall(subject),
  ...checkAlignment(subject),
  ...checkHole(subject),
];

/** A coefficient that nobody stated is a custom, not a property of this probe. */
function checkCoefficient({ input: { probe } }: TraverseCase): readonly Finding[] {
  if (probe.coefficient !== undefined || probe.calibration.length > 0) return [];
  const { value, source } = USUAL_COEFFICIENT[probe.kind];
  const common = { id: 'traverse-usual-coefficient', assumption: 'range-and-span', verdict: 'caution' } as const;
  return [{ ...common, value, unit: '1', limit: {}, source }];
}

function checkHead({ input: { probe }, survey: { plan } }: TraverseCase): readonly Finding[] {
  if (probe.head === undefined) return [];
  const value = probe.head / plan.hydraulicDiameter;
  const limit = { max: MOST_HEAD };
  const verdict = within(value, limit);
  const common = { id: 'traverse-head-size', assumption: 'one-streamline', verdict, unit: '1' } as const;
  return [{ ...common, value, limit, source: iso('diameter of the head') }];
}

/** At the deepest point. */
function checkStem({ input: { probe }, survey: { plan } }: TraverseCase): readonly Finding[] {
  if (probe.stem === undefined) return [];
  const deepest = Math.max(...plan.lines.flatMap(({ points }) => points.map(({ position }) => position)));
  const value = (100 * probe.stem * deepest) / plan.area; // frontal area over that of the duct
  const below = (max: number): boolean => within(value, { max }) === 'inside';
  const verdict: Verdict = below(STEM.full) ? 'inside' : below(STEM.most) ? 'caution' : 'outside';
  const common = { id: 'traverse-stem-blockage', assumption: 'one-streamline', verdict, unit: '%' } as const;
  return [{ ...common, value, limit: { max: STEM.full }, source: CUSTOM, detail: { most: STEM.most } }];
}

function checkWall({ survey: { plan } }: TraverseCase): readonly Finding[] {
  if (plan.wall === undefined) return [];
  const { least, source } = plan.wall;
  const nearest = ({ position }: { readonly position: number }) => Math.min(position, plan.reach - position);
  const points = plan.lines.flatMap((line) => line.points);
  const value = Math.min(...points.map(nearest));
  const moved = points.filter((point) => point.moved).length;
  const limit = { min: least };
  const verdict = within(value, { min: least * (1 - 1e-9) }); // a point moved to the distance stands on it
  const common = { id: 'traverse-wall-distance', assumption: 'one-streamline', verdict, unit: 'm' } as const;
  return [{ ...common, value, limit, source, detail: { moved } }];
}

/** Only where it is stated: nothing else in the file says how the probe was held. */
function checkAlignment({ input: { probe } }: TraverseCase): readonly Finding[] {
  if (probe.alignment === undefined) return [];
  const limit = { max: MOST_ANGLE };
  const verdict = within(probe.alignment, limit);
  const common = { id: 'traverse-alignment', assumption: 'one-streamline', verdict, unit: 'rad' } as const;
  return [{ ...common, value: probe.alignment, limit, source: iso('alignment') }];
}

/** At the slowest point that moves. */
function checkHole({ input: { probe }, survey: { measured, state } }: TraverseCase): readonly Finding[] {
  const moving = measured.filter(({ velocity }: Measured) => velocity > 0);
  if (probe.hole === undefined || moving.length === 0) return [];
  const slowest = Math.min(...moving.map(({ velocity }) => velocity));
  const value = (state.density * slowest * probe.hole) / state.viscosity;
  const limit = { min: LEAST_REYNOLDS };
  const verdict = within(value, limit);
  const common = { id: 'traverse-hole-reynolds', assumption: 'frictionless', verdict, unit: '1' } as const;
  return [{ ...common, value, limit, source: iso('Reynolds number of the hole') }];
}
