/**
 * Outlines of the drawings: points, lines, arcs of ellipses and cubics, and how they become SVG path data.
 *
 * A path lives in the coordinates of the section: x along the axis from the upstream face, y from the axis upwards.
 */
export interface Point {
  readonly x: number;
  readonly y: number;
}

export interface LineSegment {
  readonly kind: 'line';
  readonly to: Point;
}
/** Arc of an axis-parallel ellipse, shorter than half a turn; `clockwise` as seen on the drawing. */
export interface ArcSegment {
  readonly kind: 'arc';
  readonly to: Point;
  readonly centre: Point;
  readonly semiX: number;
  readonly semiY: number;
  readonly clockwise: boolean;
}
export interface CubicSegment {
  readonly kind: 'cubic';
  readonly to: Point;
  readonly first: Point;
  readonly second: Point;
}
export type Segment = LineSegment | ArcSegment | CubicSegment;

export interface Path {
  readonly start: Point;
  readonly segments: readonly Segment[];
  readonly closed: boolean;
}

/** From the section to the page: uniform scale, y turned downwards. */
export interface Scale {
  readonly factor: number;
  readonly originX: number;
  readonly originY: number;
}

export const at = (x: number, y: number): Point => ({ x, y });
export const line = (to: Point): LineSegment => ({ kind: 'line', to });

/** Open path through the points. */
export const polyline = (points: readonly [Point, ...Point[]]): Path => ({
  start: points[0],
  segments: points.slice(1).map(line),
  closed: false,
});

/** Closed path through the points. */
export const polygon = (points: readonly [Point, ...Point[]]): Path => ({ ...polyline(points), closed: true });

/** Where the path ends. */
export const endOf = (path: Path): Point => path.segments.at(-1)?.to ?? path.start;

/** A closed path: the open one, then straight lines through the points and back to the start. */
export const closedThrough = (path: Path, points: readonly Point[]): Path => ({
  start: path.start,
  segments: [...path.segments, ...points.map(line)],
  closed: true,
});

/** The same open path walked from its end to its start. */
export function pathReversed(path: Path): Path {
  const starts = [path.start, ...path.segments.map((segment) => segment.to)];
  const segments = path.segments.map((segment, index): Segment => {
    const to = starts[index] ?? path.start;
    if (segment.kind === 'line') return line(to);
    if (segment.kind === 'cubic') return { kind: 'cubic', to, first: segment.second, second: segment.first };
    return { ...segment, to, clockwise: !segment.clockwise };
  });
  return { start: endOf(path), segments: segments.reverse(), closed: path.closed };
}

const flip = (point: Point): Point => at(point.x, -point.y);

/** The path on the other side of the axis. */
export function mirrored(path: Path): Path {
  const segments = path.segments.map((segment): Segment => {
    if (segment.kind === 'line') return line(flip(segment.to));
    if (segment.kind === 'cubic')
      return { kind: 'cubic', to: flip(segment.to), first: flip(segment.first), second: flip(segment.second) };
    return { ...segment, to: flip(segment.to), centre: flip(segment.centre), clockwise: !segment.clockwise };
  });
  return { start: flip(path.start), segments, closed: path.closed };
}

/** Both halves of what is turned round the axis. */
export const bothSides = (paths: readonly Path[]): readonly Path[] => [...paths, ...paths.map(mirrored)];

/** A point of the section on the page. */
export const onPage = (point: Point, scale: Scale): Point =>
  at(scale.originX + scale.factor * point.x, scale.originY - scale.factor * point.y);

const digits = (value: number): string => String(Math.round(value * 1000) / 1000);
const pair = (point: Point, scale: Scale): string => {
  const page = onPage(point, scale);
  return `${digits(page.x)} ${digits(page.y)}`;
};

/** SVG path data of a path at a scale. */
export function pathData(path: Path, scale: Scale): string {
  const steps = path.segments.map((segment) => {
    if (segment.kind === 'line') return `L${pair(segment.to, scale)}`;
    if (segment.kind === 'cubic')
      return `C${pair(segment.first, scale)} ${pair(segment.second, scale)} ${pair(segment.to, scale)}`;
    const semi = `${digits(segment.semiX * scale.factor)} ${digits(segment.semiY * scale.factor)}`;
    return `A${semi} 0 0 ${segment.clockwise ? 1 : 0} ${pair(segment.to, scale)}`;
  });
  return `M${pair(path.start, scale)}${steps.join('')}${path.closed ? 'Z' : ''}`;
}
