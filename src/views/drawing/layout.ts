/** Where things stand in the picture of the pipe, px: one scale along and across, head lines on the same axis. */
import type { DimensionRow, Heads, Shape } from '../present/model.ts';
import type { Section } from './contract.ts';
import { smoothThrough } from './curve.ts';
import type { Path, Point, Scale } from './path.ts';
import { at } from './path.ts';
import { draftOf } from './registry.ts';

const compactBelow = 640;
const margin = 14;
/** Room above the total head for its label, between the lines and the metal, and for one line of text. */
const above = 30;
const between = 22;
const textLine = 18;

export interface PictureLayout {
  readonly compact: boolean;
  readonly width: number;
  readonly height: number;
  readonly margin: number;
  readonly section: Section;
  readonly scale: Scale;
  readonly band: { readonly top: number; readonly bottom: number };
  /** Lowest edge of the metal; the texts below it. */
  readonly below: number;
}

/** Layout of the picture at a width, with or without the head lines; the pipe runs out of the picture at both ends. */
export function pictureLayout(
  shape: Shape,
  dimensions: readonly DimensionRow[],
  width: number,
  headed = true,
): PictureLayout {
  const compact = width < compactBelow;
  const draft = draftOf(shape.element);
  const wanted = draft.reach(shape, compact);
  const room = width - 2 * margin;
  const factor = Math.min(room / (wanted.to - wanted.from), (compact ? 60 : 118) / shape.pipe);
  const spare = room / factor - (wanted.to - wanted.from);
  const from = wanted.from - 0.3 * spare;
  const originX = margin - from * factor;
  const reach = { from: -(originX + 6) / factor, to: (width - originX + 6) / factor };
  const section = draft.section(shape, dimensions, reach);
  const band = headed ? { top: above, bottom: above + (compact ? 84 : 108) } : { top: 0, bottom: 0 };
  const originY = band.bottom + between + section.outside * factor;
  const below = originY + (section.below ?? section.outside) * factor;
  return {
    compact,
    width,
    height: Math.ceil(below + 6 + textLine),
    margin,
    section,
    scale: { factor, originX, originY },
    band,
    below,
  };
}

export interface HeadMark {
  readonly station: string;
  readonly x: number;
  readonly total: number; // y on the page
  readonly pressure: number;
  readonly computed: boolean;
}

export interface HeadLines {
  readonly marks: readonly HeadMark[];
  readonly total: Path;
  readonly pressure: Path;
}

/** Tapping stations stand over their holes; the others where the heads say. */
function placeOf(station: string, position: number, shape: Shape, layout: PictureLayout): number {
  const [upstream, downstream] = layout.section.tappings;
  const hole = station === 'tapping-upstream' ? upstream : station === 'tapping-downstream' ? downstream : undefined;
  return layout.scale.originX + layout.scale.factor * (hole?.x ?? position * shape.pipe);
}

/** The two head lines in the band above the pipe, in page coordinates, level to both edges of the picture. */
export function headLines(heads: Heads, shape: Shape, layout: PictureLayout): HeadLines {
  const values = heads.points.flatMap((point) => [point.total, point.pressure]);
  const most = Math.max(...values);
  const span = most - Math.min(...values);
  const { top, bottom } = layout.band;
  const y = (head: number): number => (span > 0 ? top + ((most - head) / span) * (bottom - top) : top);
  const marks = heads.points
    .map((point) => ({
      station: point.station,
      x: placeOf(point.station, point.position_D, shape, layout),
      total: y(point.total),
      pressure: y(point.pressure),
      computed: point.computed,
    }))
    .sort((left, right) => left.x - right.x);
  const smooth = (pick: (mark: HeadMark) => number): Path => {
    const points = marks.map((mark) => at(mark.x, pick(mark)));
    return smoothThrough(toEdges(points, layout.width));
  };
  return { marks, total: smooth((mark) => mark.total), pressure: smooth((mark) => mark.pressure) };
}

/** The points with one more at each edge of the picture, level with its neighbour, where none stands there. */
function toEdges(points: readonly Point[], width: number): readonly Point[] {
  const [first, last] = [points[0], points.at(-1)];
  if (first === undefined || last === undefined) return points;
  const left = first.x > -4 ? [at(-4, first.y)] : [];
  const right = last.x < width + 4 ? [at(width + 4, last.y)] : [];
  return [...left, ...points, ...right];
}

/** The page itself as a scale, for paths that are already in page coordinates. */
export const pageData = (path: Path): string => {
  const pair = (point: Point): string => `${Math.round(point.x * 100) / 100} ${Math.round(point.y * 100) / 100}`;
  const steps = path.segments.map((segment) =>
    segment.kind === 'cubic'
      ? `C${pair(segment.first)} ${pair(segment.second)} ${pair(segment.to)}`
      : `L${pair(segment.to)}`,
  );
  return `M${pair(path.start)}${steps.join('')}`;
};
