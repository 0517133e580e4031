/** How many points a section asks for, by each practice that says so: a choice to begin with, never forced. */
import { hydraulicDiameter, type Section } from '../input/traverse-section.ts';
import { isInside } from '../numeric/bounds.ts';
import type { Source } from '../quantity/source.ts';
import type { Rule } from './layout.ts';

export interface Suggestion {
  readonly practice: 'iso-3966' | 'epa-method-1' | 'air-balancing';
  readonly rule: Rule;
  readonly lines: number;
  readonly pointsPerLine: number;
  readonly source: Source;
}

/** Straight duct on both sides, in hydraulic diameters; what is not known counts as short. */
export interface Straight {
  readonly before?: number;
  readonly after?: number;
}

const ISO: Source = { clause: 'ISO 3966, least number of points', seen: 'memory' };
const METHOD_1: Source = { clause: '40 CFR 60 App. A, Method 1, Figure 1-1 and Table 1-1', seen: 'memory' };
const BALANCING: Source = { clause: 'air balancing after ASHRAE 111 and EN 12599', seen: 'second-hand' };

/** The least straight duct for each number of points: before, after, in a circle, in a rectangle as lines by points. */
const STEPS = [
  { before: 8, after: 2, circular: 12, rectangular: [4, 3] },
  { before: 7, after: 1.75, circular: 16, rectangular: [4, 4] },
  { before: 6, after: 1.5, circular: 20, rectangular: [5, 4] },
  { before: 0, after: 0, circular: 24, rectangular: [5, 5] },
] as const; // 40 CFR 60 App. A, Method 1, Figure 1-1

/** Smaller ducts at the ideal plane need fewer points, and below the smallest the method does not apply. */
const SMALL = 0.61; // m, Method 1, 11.2
const SMALLEST = { diameter: 0.3, area: 0.071 }; // m, m2; Method 1, 1.2

/** Side of a rectangle up to which so many points are usual. */
const SIDES = [
  { below: 0.762, points: 5 }, // m, 30 in
  { below: 0.914, points: 6 }, // m, 36 in
] as const;
const LARGEST_SIDE_POINTS = 7;
/** Straight duct that balancing practice asks for. */
const GOOD = { before: 7.5, after: 3 };

/** The suggestions for a section and its straight duct. */
export function suggestionsFor(section: Section, straight: Straight): readonly Suggestion[] {
  return [usualPlan(section), ...method1(section, straight), balancing(section, straight)];
}

/** The least points of ISO 3966, the plan to begin with. */
export function usualPlan({ shape }: Pick<Section, 'shape'>): Suggestion {
  const practice = { practice: 'iso-3966', source: ISO } as const;
  if (shape === 'circular') return { ...practice, rule: 'log-linear', lines: 2, pointsPerLine: 6 }; // 12 points
  return { ...practice, rule: 'log-tchebycheff', lines: 5, pointsPerLine: 5 }; // 25 points
}

function method1(section: Section, { before = 0, after = 0 }: Straight): readonly Suggestion[] {
  const De = hydraulicDiameter(section);
  const circular = section.shape === 'circular';
  const tooSmall = circular ? De < SMALLEST.diameter : section.width * section.height < SMALLEST.area;
  if (tooSmall) return [];
  const step =
    STEPS.find((one) => isInside(before, { min: one.before }) && isInside(after, { min: one.after })) ?? STEPS[3];
  const ideal = step === STEPS[0] && De <= SMALL;
  const [lines, pointsPerLine] = circular ? [2, (ideal ? 8 : step.circular) / 2] : ideal ? [3, 3] : step.rectangular;
  return [{ practice: 'epa-method-1', rule: 'equal-area', lines, pointsPerLine, source: METHOD_1 }];
}

function balancing(section: Section, { before = 0, after = 0 }: Straight): Suggestion {
  const practice = { practice: 'air-balancing', source: BALANCING } as const;
  if (section.shape === 'circular') {
    const good = isInside(before, { min: GOOD.before }) && isInside(after, { min: GOOD.after });
    return { ...practice, rule: 'log-linear', lines: good ? 2 : 3, pointsPerLine: good ? 6 : 10 };
  }
  const points = (side: number): number => SIDES.find(({ below }) => side < below)?.points ?? LARGEST_SIDE_POINTS;
  const [over, along] = section.ports === 'width' ? [section.width, section.height] : [section.height, section.width];
  return { ...practice, rule: 'log-tchebycheff', lines: points(over), pointsPerLine: points(along) };
}
