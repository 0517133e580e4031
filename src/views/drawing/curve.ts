/**
 * A smooth line through points that never overshoots them: monotone cubic interpolation.
 * Source: F. N. Fritsch, J. Butland, SIAM J. Sci. Stat. Comput. 5 (1984) 300-304, weighted harmonic mean of slopes.
 */
import type { CubicSegment, Path, Point } from './path.ts';
import { at } from './path.ts';

const slopeBetween = (from: Point, to: Point): number => (to.y - from.y) / (to.x - from.x);

/** Slope at a middle point; 0 at a turning point, so that the line stays between its neighbours. */
function slopeAt(before: Point, point: Point, after: Point): number {
  const left = slopeBetween(before, point);
  const right = slopeBetween(point, after);
  if (left * right <= 0) return 0;
  const back = point.x - before.x;
  const ahead = after.x - point.x;
  const weightLeft = 2 * ahead + back;
  const weightRight = ahead + 2 * back;
  return (weightLeft + weightRight) / (weightLeft / left + weightRight / right);
}

/** Smooth open path through points of rising x; level at both ends. */
export function smoothThrough(points: readonly Point[]): Path {
  const start = points[0];
  if (start === undefined) throw new Error('smoothThrough: expected at least one point, got none');
  const slopes = points.map((point, index) => {
    const before = points[index - 1];
    const after = points[index + 1];
    return before === undefined || after === undefined ? 0 : slopeAt(before, point, after);
  });
  const segments = points.slice(1).map((to, index): CubicSegment => {
    const from = points[index] ?? start;
    const third = (to.x - from.x) / 3;
    return {
      kind: 'cubic',
      to,
      first: at(from.x + third, from.y + third * (slopes[index] ?? 0)),
      second: at(to.x - third, to.y - third * (slopes[index + 1] ?? 0)),
    };
  });
  return { start, segments, closed: false };
}
