/** Straight lines between the points of a table, in whatever scales the caller puts in. */

export type Point = readonly [x: number, y: number];

/** Value at x on the line through the two points nearest around it; the end lines go on beyond the ends. At least one point. */
export function interpolate(points: readonly Point[], x: number): number {
  const [first] = points;
  if (first === undefined) throw new Error('interpolate: expected at least one point, got none');
  if (points.length === 1) return first[1];
  const after = points.findIndex(([at]) => at >= x);
  const right = after === -1 ? points.length - 1 : Math.max(1, after);
  const [x0, y0] = points[right - 1] as Point;
  const [x1, y1] = points[right] as Point;
  return x === x1 ? y1 : y0 + ((y1 - y0) * (x - x0)) / (x1 - x0);
}
