/**
 * How good the plane and the readings were: scatter, symmetry, weak and reversed readings, drift, and what a mean of
 * differentials instead of velocities would have made of them.
 */
import { standardGravity } from '../quantity/constants.ts';
import type { PressureDifference, Velocity } from '../quantity/kinds.ts';
import type { Measured, Survey } from './survey.ts';

/** A reading counts as strong above this share of the largest (air balancing practice). */
export const STRONG = 0.1;
/** K of the sensitivity test of a gauge, 0.127 mmH2O. */
const SENSITIVITY = 0.127 * standardGravity; // Pa; 40 CFR 60 App. A, Method 2, 6.2

export interface Quality {
  readonly largest: PressureDifference;
  /** Readings above a tenth of the largest, of all that were taken. */
  readonly strongPercent: number;
  readonly reversed: number; // below zero
  readonly still: number; // zero
  /** Standard deviation of the velocities about their mean, over the mean. */
  readonly scatterPercent?: number;
  /** Largest less smallest mean of a line, over the mean of all. */
  readonly linesPercent?: number;
  /** What the root of the mean differential is above the mean of the roots. */
  readonly differentialAveragingPercent?: number;
  /** Mean by the weights of what is read so far. */
  readonly meanVelocity: Velocity;
  readonly leastVelocity: Velocity;
  readonly mostVelocity: Velocity;
  /** Largest less smallest root of the reference readings, over their mean. */
  readonly driftPercent?: number;
  /** T of the sensitivity test; 1 for an infinitely fine gauge. */
  readonly sensitivity?: number;
}

/** Undefined until something is read. */
export function qualityOf({ measured, lines, reference, complete }: Survey): Quality | undefined {
  if (measured.length === 0) return undefined;
  const differentials = measured.map(({ differential }) => differential);
  const velocities = measured.map(({ velocity }) => velocity);
  const largest = Math.max(...differentials);
  const strong = differentials.filter((one) => one > STRONG * largest && one > 0).length;
  const means = lines.flatMap(({ mean }) => mean ?? []);
  const spread = complete && means.length > 1 ? { linesPercent: rangePercent(means) } : {};
  return {
    largest: largest as PressureDifference,
    strongPercent: (100 * strong) / measured.length,
    reversed: differentials.filter((one) => one < 0).length,
    still: differentials.filter((one) => one === 0).length,
    ...figure('scatterPercent', scatter(measured)),
    ...figure('differentialAveragingPercent', averaging(measured)),
    ...figure('sensitivity', sensitivity(differentials)),
    ...figure('linesPercent', spread.linesPercent),
    ...figure('driftPercent', reference.length > 1 ? rangePercent(reference.map(root)) : undefined),
    meanVelocity: weighted(measured, ({ velocity }) => velocity) as Velocity,
    leastVelocity: Math.min(...velocities) as Velocity,
    mostVelocity: Math.max(...velocities) as Velocity,
  };
}

const root = (differential: number): number => Math.sqrt(Math.max(0, differential));

function figure<Key extends string>(key: Key, value: number | undefined): { readonly [K in Key]?: number } {
  return (value === undefined ? {} : { [key]: value }) as { readonly [K in Key]?: number };
}

/** Largest less smallest over the mean, in per cent; undefined where the mean is zero. */
function rangePercent(values: readonly number[]): number | undefined {
  const mean = values.reduce((sum, value) => sum + value, 0) / values.length;
  return mean > 0 ? (100 * (Math.max(...values) - Math.min(...values))) / mean : undefined;
}

/** Weighted mean of a figure of the points. */
function weighted(points: readonly Measured[], of: (point: Measured) => number): number {
  const weights = points.reduce((sum, { weight }) => sum + weight, 0);
  return points.reduce((sum, point) => sum + point.weight * of(point), 0) / weights;
}

function scatter(points: readonly Measured[]): number | undefined {
  if (points.length < 2) return undefined;
  const mean = weighted(points, ({ velocity }) => velocity);
  const variance = weighted(points, ({ velocity }) => (velocity - mean) ** 2);
  return mean > 0 ? (100 * Math.sqrt(variance)) / mean : undefined;
}

/** The root of the mean is above the mean of the roots, by about an eighth of the relative variance of the readings. */
function averaging(points: readonly Measured[]): number | undefined {
  const roots = weighted(points, ({ differential }) => root(differential));
  const whole = root(weighted(points, ({ differential }) => Math.max(0, differential)));
  return roots > 0 ? 100 * (whole / roots - 1) : undefined;
}

/** T = sum of sqrt(Δp + K) over the sum of sqrt(Δp). */
function sensitivity(differentials: readonly number[]): number | undefined {
  const sum = (shift: number): number =>
    differentials.reduce((total, one) => total + root(Math.max(0, one) + shift), 0);
  return sum(0) > 0 ? sum(SENSITIVITY) / sum(0) : undefined; // Method 2, 6.2
}
