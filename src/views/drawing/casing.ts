/**
 * The pipe round an element: walls with a pair of flanges, tapping holes, the water inside.
 *
 * To scale: bores, tapping positions and holes. Wall thickness and flanges are not.
 */
import type { DimensionRow, Shape } from '../present/model.ts';
import type { Reach, Tapping } from './contract.ts';
import type { Path } from './path.ts';
import { at, bothSides, polygon } from './path.ts';

/** Wall, flange height above the wall, and flange length, in pipe bores. */
export const wallShare = 0.06;
const flangeHeight = 0.17;
const flangeLength = 0.14;

/** The drawn radii of the pipe, m. */
export const radii = (pipe: number) => ({
  bore: pipe / 2,
  wall: pipe * (0.5 + wallShare),
  flange: pipe * (0.5 + wallShare + flangeHeight),
});

/** The row of an id. */
export const rowOf = (rows: readonly DimensionRow[], ...ids: readonly string[]): DimensionRow | undefined =>
  rows.find((row) => ids.includes(row.id));

/** Nominal size of the first row that has one, else the size at which the drawing is made. */
export const sizeOf = (rows: readonly DimensionRow[], id: string, drawn: number): number =>
  rows.find((row) => row.id === id)?.nominal ?? drawn;

/** Printed text of a row without its unit of length: a drawing names the unit once. */
export const figureOf = (rows: readonly DimensionRow[], ...ids: readonly string[]): string | undefined =>
  rowOf(rows, ...ids)?.text.replace(/[\s\u00a0\u202f]*(mm|in)$/, '');

/** Width of a tapping hole as drawn: within 0.13 D and 13 mm (ISO 5167-2:2003, 5.2.2.7). */
export const holeWidth = (pipe: number): number => Math.min(0.07 * pipe, 0.01);

/** Width of a corner tapping, the largest of 5.2.3 within 10 mm. */
export const cornerWidth = ({ pipe, ratio }: Shape): number => Math.min((ratio <= 0.65 ? 0.03 : 0.02) * pipe, 0.01);

interface Joint {
  /** Faces between which the element is clamped. */
  readonly from: number;
  readonly to: number;
  /** Axial room that a tapping needs inside each flange. */
  readonly upstream: number;
  readonly downstream: number;
}

/** Axial length of a flange that holds a tapping at a distance from its face, m. */
export function flangeFor(pipe: number, distance: number): number {
  const inFlange = distance <= 0.3 * pipe;
  return Math.max(flangeLength * pipe, inFlange ? distance + 1.6 * holeWidth(pipe) : 0);
}

/** The two pipe walls with their flanges, upper and lower. */
export function flangedWalls(pipe: number, joint: Joint, reach: Reach): readonly Path[] {
  const { bore, wall, flange } = radii(pipe);
  const before = joint.from - joint.upstream;
  const after = joint.to + joint.downstream;
  const upstream = polygon([
    at(reach.from, bore),
    at(joint.from, bore),
    at(joint.from, flange),
    at(before, flange),
    at(before, wall),
    at(reach.from, wall),
  ]);
  const downstream = polygon([
    at(joint.to, bore),
    at(reach.to, bore),
    at(reach.to, wall),
    at(after, wall),
    at(after, flange),
    at(joint.to, flange),
  ]);
  return bothSides([upstream, downstream]);
}

/** A hole at x through whatever stands there: flange or wall. */
export function tappingAt(shape: Shape, x: number, joint: Joint, width = holeWidth(shape.pipe)): Tapping {
  const { bore, wall, flange } = radii(shape.pipe);
  const inFlange = x > joint.from - joint.upstream && x < joint.to + joint.downstream;
  return { x, inner: bore, outer: inFlange ? flange : wall, width };
}

/** Everything inside a straight pipe. */
export function pipeFluid(pipe: number, reach: Reach): Path {
  const bore = pipe / 2;
  return polygon([at(reach.from, bore), at(reach.to, bore), at(reach.to, -bore), at(reach.from, -bore)]);
}

/** The part of a pipe worth drawing: the tapping with room before it, and on until the pressure has recovered. */
export function pipeReach(shape: Shape, compact: boolean): Reach {
  const { pipe, tappingUpstream, recovery_D } = shape;
  if (compact) return { from: -(tappingUpstream + 1.5 * pipe), to: (recovery_D + 0.5) * pipe };
  return { from: -(tappingUpstream + 3.15 * pipe), to: Math.max(8, recovery_D + 1.5) * pipe };
}
