/** Contours of the bore: arcs that touch, rounded corners, and the radius at a place along the axis. */
import type { ArcSegment, Path, Point, Segment } from './path.ts';
import { at, line } from './path.ts';

/** Radius of the contour at x; the first or last radius beyond its ends. Contours of lines and arcs only. */
export function radiusAt(profile: Path, x: number): number {
  let from = profile.start;
  if (x <= from.x) return from.y;
  for (const segment of profile.segments) {
    if (x <= segment.to.x && segment.to.x > from.x) return radiusOn(segment, from, x);
    from = segment.to;
  }
  return from.y;
}

function radiusOn(segment: Segment, from: Point, x: number): number {
  if (segment.kind === 'arc') {
    const share = (x - segment.centre.x) / segment.semiX;
    const rise = segment.semiY * Math.sqrt(Math.max(0, 1 - share * share));
    const below = from.y + segment.to.y < 2 * segment.centre.y;
    return below ? segment.centre.y - rise : segment.centre.y + rise;
  }
  return from.y + ((segment.to.y - from.y) * (x - from.x)) / (segment.to.x - from.x);
}

const away = (from: Point, to: Point, length: number): Point => {
  const whole = Math.hypot(to.x - from.x, to.y - from.y);
  return at(from.x + ((to.x - from.x) * length) / whole, from.y + ((to.y - from.y) * length) / whole);
};

/** The corner between two straight lines rounded with a radius: a line up to the arc, and the arc. */
function rounded(before: Point, corner: Point, after: Point, radius: number): readonly Segment[] {
  const turnIn = Math.atan2(corner.y - before.y, corner.x - before.x);
  const turnOut = Math.atan2(after.y - corner.y, after.x - corner.x);
  const turn = turnOut - turnIn;
  const tangent = radius * Math.tan(Math.abs(turn) / 2);
  const begin = away(corner, before, tangent);
  const side = Math.sign(turn);
  const centre = at(begin.x - side * radius * Math.sin(turnIn), begin.y + side * radius * Math.cos(turnIn));
  const arc: ArcSegment = {
    kind: 'arc',
    to: away(corner, after, tangent),
    centre,
    semiX: radius,
    semiY: radius,
    clockwise: turn < 0,
  };
  return [line(begin), arc];
}

export interface Corner {
  readonly point: Point;
  readonly radius: number; // 0: sharp
}

/** A contour of straight lines with rounded corners. */
export function roundedLine(corners: readonly Corner[]): Path {
  const first = corners[0];
  if (first === undefined) throw new Error('roundedLine: expected at least one corner, got none');
  const segments = corners.slice(1).flatMap((corner, index): readonly Segment[] => {
    const before = corners[index];
    const after = corners[index + 2];
    if (before === undefined || after === undefined || corner.radius === 0) return [line(corner.point)];
    return rounded(before.point, corner.point, after.point, corner.radius);
  });
  return { start: first.point, segments, closed: false };
}
