/**
 * Points on the diameters of a circular section, from the defining rule of each method at full precision.
 * Standard: ISO 3966 (log-linear, log-Tchebycheff); EPA Method 1, 40 CFR 60 App. A (equal area). Symbols: R = 1 the radius,
 * r from the axis, y = 1 - r from the wall, n points on a radius.
 */
import { equalWeightNodes } from '../numeric/equal-weights.ts';
import type { Source } from '../quantity/source.ts';
import { evenly, type Layout, type Rule } from './layout.ts';

export type CircularRule = Exclude<Rule, 'single-point'>;

const sources: Readonly<Record<CircularRule, Source>> = {
  'log-linear': { clause: 'ISO 3966, log-linear method', seen: 'derived' },
  'log-tchebycheff': { clause: 'ISO 3966, log-Tchebycheff method', seen: 'derived' },
  'equal-area': { clause: '40 CFR 60 App. A, Method 1, equal areas', seen: 'derived' },
};

/** Numbers of points on a diameter that a rule has; more than this nobody can mark on a tube. */
const MOST = 40;
const upTo = (from: number): readonly number[] =>
  Array.from({ length: (MOST - from) / 2 + 1 }, (_, step) => from + 2 * step);

export const CIRCULAR_COUNTS: Readonly<Record<CircularRule, readonly number[]>> = {
  'log-linear': upTo(4),
  'log-tchebycheff': [6, 8, 10, 12, 14, 16, 20], // the inner nodes are real for 7 and 9 on a radius only beyond 6
  'equal-area': upTo(2),
};

/** The traverse of a number of diameters, evenly turned, each with a number of points that the rule has. */
export function circularLayout(rule: CircularRule, diameters: number, onDiameter: number): Layout {
  const wall = distances(rule, onDiameter / 2);
  const places = [...wall.map((y) => y / 2), ...wall.map((y) => 1 - y / 2).reverse()]; // y / D
  const turned = Array.from({ length: diameters }, (_, line) => ({ angle: (line * Math.PI) / diameters }));
  return { lines: evenly(turned, places), source: sources[rule] };
}

/** Distances from the wall on a radius, the nearest first. */
function distances(rule: CircularRule, n: number): readonly number[] {
  const found = { 'log-linear': logLinear, 'log-tchebycheff': logTchebycheff, 'equal-area': equalArea }[rule](n);
  return [...found].sort((one, other) => one - other);
}

/**
 * Rings of equal area, 2/n of the section each, with a pair of points that has the sum and the product that a logarithmic
 * profile y, ln y asks for; where n is odd, the outermost ring of 1/n has one point.
 */
function logLinear(n: number): readonly number[] {
  const single = n % 2 === 1 ? [Math.exp(meanLogarithm(1 - 1 / n, 1))] : [];
  const rings = Array.from({ length: Math.floor(n / 2) }, (_, ring) => [(2 * ring) / n, (2 * ring + 2) / n] as const);
  const pairs = rings.flatMap(([inner, outer]) => {
    const m = meanDistance(inner, outer);
    const g = Math.exp(meanLogarithm(inner, outer));
    const half = Math.sqrt(m ** 2 - g ** 2); // y1 + y2 = 2 m, y1 y2 = g^2
    return [g ** 2 / (m + half), m + half];
  });
  return [...single, ...pairs];
}

/** One point in the outermost ring of 1/n; Chebyshev's nodes of the area r^2 inside it. */
function logTchebycheff(n: number): readonly number[] {
  const nodes = equalWeightNodes(n - 1);
  if (nodes === undefined) throw new Error(`logTchebycheff: expected a count that has real nodes, got ${n}`);
  return [Math.exp(meanLogarithm(1 - 1 / n, 1)), ...nodes.map((share) => 1 - Math.sqrt((share * (n - 1)) / n))];
}

/** The middle of each of n rings of equal area: r = R sqrt((2 i - 1) / (2 n)). */
const equalArea = (n: number): readonly number[] =>
  Array.from({ length: n }, (_, ring) => 1 - Math.sqrt((2 * ring + 1) / (2 * n))); // Method 1, Table 1-2

/** Mean over the area of y between two shares of it, from the axis. */
const meanDistance = (inner: number, outer: number): number =>
  1 - ((2 / 3) * (outer ** 1.5 - inner ** 1.5)) / (outer - inner); // integral of (1 - r) 2 r dr

/** Mean over the area of ln y: the integral of 2 (1 - y) ln y dy in closed form. */
function meanLogarithm(inner: number, outer: number): number {
  const whole = (y: number): number => (y === 0 ? 0 : 2 * y * (Math.log(y) - 1) - y ** 2 * (Math.log(y) - 0.5));
  return (whole(1 - Math.sqrt(inner)) - whole(1 - Math.sqrt(outer))) / (outer - inner);
}
