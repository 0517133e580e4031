/**
 * Uncertainty of the flow of a traverse: relative, expanded, at 95 %. The reading's is that of one gauge at all points and
 * adds up along them; the terms add in squares.
 * Standard: ISO 3966, clause 13, and ISO 5168, of the form q = A K sum(w sqrt(2 Δp/ρ)). Symbols: U expanded; SI.
 */
import type { TraverseInput } from '../input/traverse.ts';
import type { PressureDifference } from '../quantity/kinds.ts';
import type { Source } from '../quantity/source.ts';
import { biasOnPowerLaw } from '../traverse/bias.ts';
import type { Measured, Survey } from '../traverse/survey.ts';
import { indicatedVelocity, pointVelocity } from '../traverse/velocity.ts';

const EQUATION: Source = { clause: 'ISO 3966, clause 13', seen: 'memory' };
const POWER_LAW = 7; // u ~ y^(1/7), the profile by which a rule is judged

type TraverseTermName = 'reading' | 'coefficient' | 'density' | 'area' | 'points';

export interface TraverseTerm {
  readonly name: TraverseTermName;
  readonly percentOfFlow: number;
  /** Whether the user stated it; what is not stated is taken from the rule or the fluid, or is left out as zero. */
  readonly stated: boolean;
}

export interface TraverseBudget {
  readonly expandedPercent: number;
  readonly terms: readonly TraverseTerm[];
  readonly source: Source;
}

/** The budget of a complete survey in motion; undefined without a flow. */
export function traverseUncertainty(input: TraverseInput, survey: Survey): TraverseBudget | undefined {
  const { uncertainty: stated } = input;
  if (survey.flow === undefined || survey.flow.meanVelocity <= 0) return undefined;
  const density = stated.density ?? survey.state.uncertainties?.density?.share ?? 0;
  const terms: readonly TraverseTerm[] = [
    { name: 'reading', percentOfFlow: readingPercent(input, survey), stated: stated.reading !== undefined },
    { name: 'coefficient', percentOfFlow: 100 * (stated.coefficient ?? 0), stated: stated.coefficient !== undefined },
    { name: 'density', percentOfFlow: 100 * density * 0.5, stated: stated.density !== undefined }, // of v ~ ρ^-1/2
    { name: 'area', percentOfFlow: 100 * (stated.area ?? 0), stated: stated.area !== undefined },
    {
      name: 'points',
      percentOfFlow: stated.points === undefined ? pointsPercent(input, survey) : 100 * stated.points,
      stated: stated.points !== undefined,
    },
  ];
  const squares = terms.reduce((sum, { percentOfFlow }) => sum + percentOfFlow ** 2, 0);
  return { expandedPercent: Math.sqrt(squares), terms, source: EQUATION };
}

/** Sum of w v U/(2 Δp) over the mean; a reading below U counts as one of U, where the root still has a slope. */
function readingPercent({ uncertainty: { reading }, probe }: TraverseInput, { measured, state }: Survey): number {
  if (reading === undefined) return 0;
  if (reading.of === 'reading') return (100 * reading.share) / 2; // v ~ Δp^1/2 at every point
  const U = reading.value;
  if (U === 0) return 0;
  const part = ({ differential, velocity, weight }: Measured): number => {
    const held = differential < U;
    const v = held ? pointVelocity(indicatedVelocity(U as PressureDifference, state), probe) : velocity;
    return (weight * v * U) / (2 * (held ? U : differential));
  };
  const mean = measured.reduce((sum, { weight, velocity }) => sum + weight * velocity, 0);
  return (100 * measured.reduce((sum, point) => sum + part(point), 0)) / mean;
}

/**
 * Where it is not stated: the error of the rule on a 1/7-power profile, and in a circle half the difference between the
 * means of its diameters. For a single point there is no such estimate.
 */
function pointsPercent({ rule }: TraverseInput, { plan, lines, flow }: Survey): number {
  if (rule === 'single-point' || flow === undefined) return 0;
  const bias = 100 * Math.abs(biasOnPowerLaw(plan.layout, POWER_LAW));
  const means = lines.flatMap(({ angle, mean }) => (angle === undefined || mean === undefined ? [] : [mean]));
  if (means.length < 2) return bias;
  const all = means.reduce((sum, mean) => sum + mean, 0) / means.length;
  const half = all > 0 ? (50 * (Math.max(...means) - Math.min(...means))) / all : 0;
  return Math.hypot(bias, half / Math.sqrt(means.length));
}
