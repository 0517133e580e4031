/** Where the points of a survey lie on the page: the section to scale, its ports at the edge, numbers that keep clear. */
import type { SurveyShape } from '../present/survey-model.ts';

export interface Spot {
  readonly number: number;
  readonly line: number;
  readonly x: number;
  readonly y: number;
  readonly moved: boolean;
  readonly read: boolean;
  /** Where its number stands; absent where it would run into another. */
  readonly label?: { readonly x: number; readonly y: number };
}

export interface Port {
  readonly line: number;
  readonly title: string; // '1'
  /** From outside to the wall. */
  readonly from: readonly [x: number, y: number];
  readonly to: readonly [x: number, y: number];
  /** The far end of the line. */
  readonly end: readonly [x: number, y: number];
  readonly label: { readonly x: number; readonly y: number };
}

export interface SurveyLayout {
  readonly width: number;
  readonly height: number;
  readonly outline:
    | { readonly shape: 'circle'; readonly x: number; readonly y: number; readonly radius: number }
    | {
        readonly shape: 'rect';
        readonly x: number;
        readonly y: number;
        readonly width: number;
        readonly height: number;
      };
  readonly spots: readonly Spot[];
  readonly ports: readonly Port[];
  readonly radius: number; // of a spot
}

export interface Box {
  readonly width: number;
  readonly height: number;
  /** Height of the type. */
  readonly type: number;
}

const STUB = 13; // length of a port on the page
const EDGE = 30; // room for ports and their numbers
const TAIL = 22; // room for the dimension on the other sides

/** Lays the section out as large as the box allows. */
export function surveyLayout({ section, lines }: SurveyShape, box: Box): SurveyLayout {
  const place = section.shape === 'circular' ? circle(section.diameter_m, box) : rectangle(section, box);
  const { outline, point, port } = place;
  const ports = lines.map((line): Port => {
    const shares = section.shape === 'circular' ? (line.angle_rad ?? 0) : (line.across_m ?? 0);
    return { line: line.at, title: String(line.at + 1), ...port(shares) };
  });
  const all = lines.flatMap((line) =>
    line.points.map(({ number, position_m, moved, velocity_m_s }) => {
      const [x, y] = point(section.shape === 'circular' ? (line.angle_rad ?? 0) : (line.across_m ?? 0), position_m);
      return { number, line: line.at, x, y, moved, read: velocity_m_s !== undefined };
    }),
  );
  const closest = nearest(all);
  const radius = Math.max(2, Math.min(5, closest / 2.6));
  return {
    width: box.width,
    height: place.height,
    outline,
    spots: labelled(all, radius, box.type, insideOf(outline)),
    ports,
    radius,
  };
}

/** Whether a place on the page is clear of the wall. */
function insideOf(outline: SurveyLayout['outline']): (x: number, y: number) => boolean {
  if (outline.shape === 'circle') return (x, y) => Math.hypot(x - outline.x, y - outline.y) < outline.radius - 2;
  const { x: left, y: top, width, height } = outline;
  return (x, y) => x > left + 2 && x < left + width - 2 && y > top + 2 && y < top + height - 2;
}

type XY = readonly [x: number, y: number];

interface Place {
  readonly height: number;
  readonly outline: SurveyLayout['outline'];
  /** A point by the place of its line (angle, or distance across) and its distance from the wall. */
  readonly point: (line: number, from: number) => XY;
  readonly port: (line: number) => Omit<Port, 'line' | 'title'>;
}

/** The first port stands on top, the others follow clockwise. */
function circle(diameter: number, box: Box): Place {
  const radius = Math.min(box.width - 2 * EDGE, box.height - EDGE - TAIL) / 2;
  const [cx, cy] = [box.width / 2, EDGE + radius];
  const along = (angle: number, distance: number): XY => [
    cx + distance * Math.sin(angle),
    cy - distance * Math.cos(angle),
  ];
  return {
    height: 2 * radius + EDGE + TAIL,
    outline: { shape: 'circle', x: cx, y: cy, radius },
    point: (angle, from) => along(angle, radius * (1 - (2 * from) / diameter)),
    port: (angle) => {
      const [x, y] = along(angle, radius + STUB + 8);
      const [from, to, end] = [along(angle, radius + STUB), along(angle, radius), along(angle, -radius)];
      return { from, to, end, label: { x, y } };
    },
  };
}

/** Ports stand on top where they are spread over the width, at the left where over the height. */
function rectangle(
  { width_m, height_m, ports }: Extract<SurveyShape['section'], { shape: 'rectangular' }>,
  box: Box,
): Place {
  const onTop = ports === 'width';
  const room = { width: box.width - EDGE - TAIL - 8, height: box.height - EDGE - TAIL };
  const scale = Math.min(room.width / width_m, room.height / height_m);
  const [width, height] = [width_m * scale, height_m * scale];
  const [x, y] = [EDGE + (room.width - width) / 2, onTop ? EDGE : 10];
  const point = (across: number, from: number): XY =>
    onTop ? [x + across * scale, y + from * scale] : [x + from * scale, y + across * scale];
  const reach = onTop ? height_m : width_m;
  return {
    height: height + y + TAIL,
    outline: { shape: 'rect', x, y, width, height },
    point,
    port: (across) => {
      const [to, end] = [point(across, 0), point(across, reach)];
      const from: XY = onTop ? [to[0], to[1] - STUB] : [to[0] - STUB, to[1]];
      return { from, to, end, label: onTop ? { x: from[0], y: from[1] - 8 } : { x: from[0] - 8, y: from[1] } };
    },
  };
}

type Bare = Omit<Spot, 'label'>;

const apart = (one: { x: number; y: number }, other: { x: number; y: number }): number =>
  Math.hypot(one.x - other.x, one.y - other.y);

/** Distance between neighbours on a line, the least of all. */
function nearest(spots: readonly Bare[]): number {
  const gaps = spots.flatMap((spot, at) => {
    const next = spots[at + 1];
    return next === undefined || next.line !== spot.line ? [] : [apart(spot, next)];
  });
  return Math.min(14, ...gaps);
}

/** Whether the line of a point runs level, so that its number stands clear above or below it. */
function isLevel(spot: Bare, spots: readonly Bare[]): boolean {
  const other = spots.find(({ line, number }) => line === spot.line && number !== spot.number);
  return other !== undefined && Math.abs(other.y - spot.y) < 0.2 * Math.abs(other.x - spot.x);
}

/** A number stands beside its point, or where there is room; it is left out where it would cover something. */
function labelled(
  spots: readonly Bare[],
  radius: number,
  type: number,
  inside: (x: number, y: number) => boolean,
): readonly Spot[] {
  const taken: { readonly x: number; readonly y: number; readonly half: number }[] = [];
  const middle = spots.reduce((sum, { x }) => sum + x, 0) / spots.length;
  return spots.map((spot) => {
    const half = type * 0.31 * String(spot.number).length;
    const [aside, above] = [radius + 2 + half, radius + 1 + type * 0.5];
    const beside = [
      { x: spot.x + aside, y: spot.y },
      { x: spot.x - aside, y: spot.y },
    ];
    const over = [
      { x: spot.x, y: spot.y - above },
      { x: spot.x, y: spot.y + above },
    ];
    const toMiddle = Math.sign(middle - spot.x) * half;
    const inward = over.map(({ x, y }) => ({ x: x + toMiddle, y })); // near the wall of a circle
    const places = isLevel(spot, spots) ? [...over, ...beside, ...inward] : [...beside, ...over];
    const free = places.find(
      ({ x, y }) =>
        inside(x - half, y) &&
        inside(x + half, y) &&
        taken.every((one) => Math.abs(one.x - x) > one.half + half || Math.abs(one.y - y) > type * 0.85) &&
        spots.every((one) => Math.abs(one.x - x) > radius + half || Math.abs(one.y - y) > radius + type * 0.35),
    );
    if (free === undefined) return spot;
    taken.push({ ...free, half });
    return { ...spot, label: free };
  });
}
