/** Square-edged orifice plate between flanges, bevelled downstream. ISO 5167-2:2003, 5.1 (geometry), 5.2 (tappings). */
import type { DimensionRow, Shape } from '../present/model.ts';
import {
  cornerWidth,
  figureOf,
  flangedWalls,
  flangeFor,
  holeWidth,
  pipeFluid,
  pipeReach,
  radii,
  sizeOf,
  tappingAt,
} from './casing.ts';
import type { Diameters, Draft, Measure, Reach, Section } from './contract.ts';
import { easing, fillingAgain, startThrough, streamlinesAlong } from './jet.ts';
import { at, bothSides, closedThrough, type Path, polyline } from './path.ts';

/** Contraction of the jet's diameter behind a sharp edge, as drawn. */
const contraction = 0.8;

/** Thicknesses as drawn where the dimensions leave them open: within 5.1.5. */
export function plateOf(shape: Shape, rows: readonly DimensionRow[]) {
  const thickness = sizeOf(rows, 'plate-thickness', 0.04 * shape.pipe); // E
  const edge = Math.min(thickness, sizeOf(rows, 'plate-thickness-edge', 0.0125 * shape.pipe)); // e
  const bevel = sizeOf(rows, 'bevel-angle', 45);
  return { thickness, edge, bevel };
}

/** Bore from the upstream face: cylinder of length e, then the bevel. */
function boreContour(shape: Shape, rows: readonly DimensionRow[]): Path {
  const { thickness, edge, bevel } = plateOf(shape, rows);
  const radius = shape.bore / 2;
  const rise = Math.min((thickness - edge) * Math.tan((bevel * Math.PI) / 180), shape.pipe / 2 - radius);
  return polyline([at(0, radius), at(edge, radius), at(thickness, radius + rise)]);
}

const isCorner = (shape: Shape): boolean => shape.element.endsWith('.corner');

/** Where the holes stand: flange tappings count from the face on their own side, D and D/2 from the upstream face. */
function tappingPlaces(shape: Shape, thickness: number) {
  const half = cornerWidth(shape) / 2;
  if (isCorner(shape)) return { upstream: -half, downstream: thickness + half };
  const behind = shape.element.endsWith('.flange') ? thickness : 0;
  return { upstream: -shape.tappingUpstream, downstream: behind + shape.tappingDownstream };
}

/** Edge of the jet: through the hole, narrowest less than half a pipe bore behind the plate. */
function jetOf(shape: Shape) {
  const hole = shape.bore / 2;
  const waist = at(Math.min(0.45 * shape.pipe, 0.8 * shape.bore), contraction * hole);
  const wide = startThrough(shape.pipe / 2, at(0, 0.97 * hole), waist);
  return [...easing(wide, waist), ...fillingAgain(shape, waist)];
}

function section(shape: Shape, rows: readonly DimensionRow[], reach: Reach): Section {
  const { thickness } = plateOf(shape, rows);
  const { flange } = radii(shape.pipe);
  const outside = flange + 0.05 * shape.pipe;
  const profile = boreContour(shape, rows);
  const places = tappingPlaces(shape, thickness);
  const width = isCorner(shape) ? cornerWidth(shape) : holeWidth(shape.pipe);
  const length = flangeFor(shape.pipe, shape.tappingUpstream);
  const joint = { from: 0, to: thickness, upstream: length, downstream: length };
  return {
    profile,
    walls: flangedWalls(shape.pipe, joint, reach),
    metal: bothSides([closedThrough(profile, [at(thickness, outside), at(0, outside)])]),
    fluid: pipeFluid(shape.pipe, reach),
    streamlines: streamlinesAlong(jetOf(shape), reach),
    tappings: [places.upstream, places.downstream].map((x) => tappingAt(shape, x, joint, width)),
    edge: profile.start,
    outside,
  };
}

function measures(shape: Shape, rows: readonly DimensionRow[], reach: Reach, printed: Diameters): readonly Measure[] {
  const { thickness } = plateOf(shape, rows);
  const places = tappingPlaces(shape, thickness);
  const { flange, wall, bore } = radii(shape.pipe);
  const upstream = figureOf(rows, 'tapping-upstream');
  const before = figureOf(rows, 'tapping-downstream');
  const behind = figureOf(rows, 'tapping-downstream-face');
  const top = flange + 0.05 * shape.pipe;
  const reachOf = (x: number): number => (Math.abs(x) < 0.45 * shape.pipe ? flange : wall);
  const between = (from: number, to: number, row: number, text: string | undefined): readonly Measure[] =>
    text === undefined || to <= from
      ? []
      : [
          {
            kind: 'length',
            from: at(from, from < 0 ? reachOf(from) : top),
            to: at(to, to > thickness ? reachOf(to) : top),
            row,
            text,
          },
        ];
  return [
    ...between(places.upstream, 0, 1, upstream),
    ...between(0, places.downstream, upstream === undefined ? 1 : 2, before),
    ...between(thickness, places.downstream, 1, behind),
    { kind: 'diameter', x: reach.from * 0.64, radius: bore, edge: reach.from * 0.64, text: `Ø ${printed.pipe}` },
    { kind: 'diameter', x: 0.95 * shape.pipe, radius: shape.bore / 2, edge: thickness, text: `Ø ${printed.bore}` },
  ];
}

export const orificePlate: Draft = {
  reach: pipeReach,
  sheetReach: (shape) => ({ from: -1.75 * shape.pipe, to: 1.75 * shape.pipe }),
  section,
  measures,
  edgeDetail: true,
};
