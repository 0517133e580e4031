/**
 * Points of a rectangular section: lines across the side that holds the ports, points along each line, by one rule.
 * Standard: ISO 3966 (log-Tchebycheff, log-linear); EPA Method 1, 40 CFR 60 App. A (equal area). Symbols: n points on a
 * side of length 1, y from the wall.
 */
import { equalWeightNodes } from '../numeric/equal-weights.ts';
import type { Source } from '../quantity/source.ts';
import { evenly, type Layout } from './layout.ts';
import { LOG_LINEAR_26, LOG_LINEAR_26_SUM } from './log-linear-26.table.ts';

const TCHEBYCHEFF: Source = { clause: 'ISO 3966, log-Tchebycheff method', seen: 'derived' };
const EQUAL_AREA: Source = { clause: '40 CFR 60 App. A, Method 1, equal areas', seen: 'derived' };
const LOG_LINEAR: Source = { clause: 'ISO 3966, log-linear method, 26 points', seen: 'memory' };

/** Numbers of points on a side that a rule has; the log-linear rule has its one pattern. */
export const RECTANGULAR_COUNTS = {
  'log-tchebycheff': [3, 4, 5, 6, 7, 8, 9, 11], // 8 inner nodes are not all real
  'equal-area': Array.from({ length: 20 }, (_, count) => count + 1),
} as const;

export type RectangularRule = keyof typeof RECTANGULAR_COUNTS;

/** A grid of lines and points. */
export function rectangularLayout(rule: RectangularRule, lines: number, onLine: number): Layout {
  const places = rule === 'equal-area' ? middles : tchebycheff;
  const across = places(lines).map((place) => ({ across: place }));
  return { lines: evenly(across, places(onLine)), source: rule === 'equal-area' ? EQUAL_AREA : TCHEBYCHEFF };
}

/** The pattern of 26 points in four lines of 7, 6, 6 and 7, with unequal weights. */
export function logLinearPattern(): Layout {
  const across = [...new Set(LOG_LINEAR_26.map(([, l]) => l))].sort((one, other) => one - other);
  const lines = across.map((place) => ({
    across: place,
    points: LOG_LINEAR_26.filter(([, l]) => l === place).map(([at, , weight]) => ({
      at,
      weight: weight / LOG_LINEAR_26_SUM,
    })),
  }));
  return { lines, source: LOG_LINEAR };
}

/** One point at y = 1 / (n e) in the strip of 1/n at each wall; Chebyshev's nodes of equal weight between the strips. */
function tchebycheff(n: number): readonly number[] {
  const nodes = equalWeightNodes(n - 2);
  if (nodes === undefined) throw new Error(`tchebycheff: expected a count that has real nodes, got ${n}`);
  const wall = 1 / (n * Math.E); // ln y is the mean of ln y over the strip
  return [wall, ...nodes.map((node) => (1 + node * (n - 2)) / n), 1 - wall];
}

/** The middles of n equal parts. */
const middles = (n: number): readonly number[] => Array.from({ length: n }, (_, part) => (2 * part + 1) / (2 * n));
