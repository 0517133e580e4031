/** One streamline: the straight duct on both sides of the plane, swirl in it, and how many points look at it. */
import type { TraverseInput } from '../input/traverse.ts';
import type { Source } from '../quantity/source.ts';
import { positionsOf } from '../traverse/layout.ts';
import { within } from './case.ts';
import type { Finding, Verdict } from './finding.ts';
import type { TraverseCase } from './traverse-case.ts';

interface Lengths {
  readonly full: number;
  readonly least: number;
  readonly source: Source;
}

const ISO: Source = { clause: 'ISO 3966, straight length; with less as in air balancing', seen: 'memory' };
const METHOD_1: Source = { clause: '40 CFR 60 App. A, Method 1, 11.1', seen: 'second-hand' };
/** Hydraulic diameters, before and after; between least and full the plane serves, with more points. */
const VELOCITY_AREA = {
  before: { full: 20, least: 7.5, source: ISO },
  after: { full: 5, least: 3, source: ISO },
} as const;
const EQUAL_AREA = {
  before: { full: 8, least: 2, source: METHOD_1 },
  after: { full: 2, least: 0.5, source: METHOD_1 },
} as const;

const COUNT: Source = { clause: 'ISO 3966, least number of points', seen: 'memory' };
const COUNT_METHOD_1: Source = { clause: '40 CFR 60 App. A, Method 1, 11.2', seen: 'second-hand' };
const SWIRL: Source = { clause: '40 CFR 60 App. A, Method 1, 11.4', seen: 'memory' };
const MOST_SWIRL = (20 * Math.PI) / 180; // rad
const LARGE = 0.61; // m, Method 1, 11.2

export const checkPlane = (subject: TraverseCase): readonly Finding[] => [
  ...checkStraight(subject.input),
  ...checkSwirl(subject.input),
  ...checkCount(subject),
];

function checkStraight({ rule, straight }: TraverseInput): readonly Finding[] {
  const lengths = rule === 'equal-area' ? EQUAL_AREA : VELOCITY_AREA;
  const judged = (value: number, { full, least, source }: Lengths): Omit<Finding, 'id'> => {
    const reaches = (min: number): boolean => within(value, { min }) === 'inside';
    const verdict: Verdict = reaches(full) ? 'inside' : reaches(least) ? 'caution' : 'outside';
    return { assumption: 'one-streamline', verdict, value, unit: 'D', limit: { min: full }, source, detail: { least } };
  };
  const { before, after } = straight;
  return [
    ...(before === undefined ? [] : [{ id: 'traverse-straight-before', ...judged(before, lengths.before) }]),
    ...(after === undefined ? [] : [{ id: 'traverse-straight-after', ...judged(after, lengths.after) }]),
  ];
}

function checkSwirl({ nullAngle }: TraverseInput): readonly Finding[] {
  if (nullAngle === undefined) return [];
  const limit = { max: MOST_SWIRL };
  const verdict = within(nullAngle, limit);
  const common = { id: 'traverse-swirl', assumption: 'one-streamline', verdict, unit: 'rad' } as const;
  return [{ ...common, value: nullAngle, limit, source: SWIRL }];
}

/** Points of the rule; a merged point counts as those it was made of. */
function checkCount({ input: { rule, section }, survey: { plan } }: TraverseCase): readonly Finding[] {
  const value = positionsOf(plan.layout).length;
  const [circular, rectangular] = plan.hydraulicDiameter > LARGE ? [12, 12] : [8, 9]; // Method 1, 11.2, ideal plane
  const method1 = section.shape === 'circular' ? circular : rectangular;
  const iso = section.shape === 'circular' ? 12 : 25; // ISO 3966
  const min = rule === 'equal-area' ? method1 : iso;
  const source = rule === 'equal-area' ? COUNT_METHOD_1 : COUNT;
  const verdict: Verdict = value >= min ? 'inside' : rule === 'single-point' ? 'caution' : 'outside';
  const common = { id: 'traverse-point-count', assumption: 'one-streamline', verdict, unit: '1' } as const;
  return [{ ...common, value, limit: { min }, source, detail: { points: value } }];
}
