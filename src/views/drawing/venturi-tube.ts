/**
 * Classical Venturi tube: entrance cylinder, convergent of 21 degrees, throat, divergent. ISO 5167-4:2003, 5.2, 5.4.
 * x counts from the start of the convergent.
 */
import type { DimensionRow, Shape } from '../present/model.ts';
import { figureOf, holeWidth, radii, sizeOf, wallShare } from './casing.ts';
import type { Diameters, Draft, Measure, Reach, Section } from './contract.ts';
import { streamlinesAlong } from './jet.ts';
import { at, bothSides, closedThrough, mirrored, type Path, pathReversed, polygon } from './path.ts';
import { type Corner, radiusAt, roundedLine } from './profile.ts';

/** Included angles as drawn where the dimensions leave them open, degrees; the divergent within 7 to 15. */
const drawnConvergent = 21;
const drawnDivergent = 8;
const entrance = 1; // length of the entrance cylinder, in D

const slopeOf = (degrees: number): number => Math.tan((degrees * Math.PI) / 360);

/** Places along the axis and angles, m and degrees. */
export function stationsOf(shape: Shape, rows: readonly DimensionRow[]) {
  const { pipe: D, bore: d } = shape;
  const convergent = sizeOf(rows, 'convergent-angle', drawnConvergent);
  const divergent = sizeOf(rows, 'divergent-angle', drawnDivergent);
  const throatFrom = (D - d) / (2 * slopeOf(convergent)); // 5.2.4
  const throatTo = throatFrom + d; // 5.2.5
  const exit = throatTo + (D - d) / (2 * slopeOf(divergent)); // 5.2.6
  const tapping = throatFrom + 0.5 * d; // 5.4.3
  return { entry: -entrance * D, convergent, divergent, throatFrom, throatTo, exit, tapping };
}

type Stations = ReturnType<typeof stationsOf>;

/** Radii of the corners: 5.2.8 as cast; sharp for a machined or fabricated tube, as these prefer. */
function cornersOf(shape: Shape): readonly [number, number, number] {
  return shape.element.endsWith('as-cast') ? [1.375 * shape.pipe, 3.625 * shape.bore, 10 * shape.bore] : [0, 0, 0];
}

function contourOf(shape: Shape, rows: readonly DimensionRow[]): Path {
  const { entry, throatFrom, throatTo, exit } = stationsOf(shape, rows);
  const [first, second, third] = cornersOf(shape);
  const [R, r] = [shape.pipe / 2, shape.bore / 2];
  const corners: readonly Corner[] = [
    { point: at(entry, R), radius: 0 },
    { point: at(0, R), radius: first },
    { point: at(throatFrom, r), radius: second },
    { point: at(throatTo, r), radius: third },
    { point: at(exit, R), radius: 0 },
  ];
  return roundedLine(corners);
}

/** The same contour moved outwards: the outside of the shell. */
function shellOf(shape: Shape, profile: Path): Path {
  const lift = wallShare * shape.pipe;
  const up = (point: Path['start']) => at(point.x, point.y + lift);
  return {
    start: up(profile.start),
    segments: profile.segments.map((segment) =>
      segment.kind === 'arc'
        ? { ...segment, to: up(segment.to), centre: up(segment.centre) }
        : { kind: 'line', to: up(segment.to) },
    ),
    closed: false,
  };
}

/** Pipe walls with a flange at the tube's entry and one at its exit. */
function wallsOf(pipe: number, entry: number, exit: number, reach: Reach): readonly Path[] {
  const { bore, wall, flange } = radii(pipe);
  const thick = 0.1 * pipe;
  const before = [
    at(reach.from, bore),
    at(entry, bore),
    at(entry, flange),
    at(entry - thick, flange),
    at(entry - thick, wall),
    at(reach.from, wall),
  ] as const;
  const after = [
    at(exit, bore),
    at(reach.to, bore),
    at(reach.to, wall),
    at(exit + thick, wall),
    at(exit + thick, flange),
    at(exit, flange),
  ] as const;
  return bothSides([polygon(before), polygon(after)]);
}

/** The tube itself: its contour and shell, closed by the flange at either end. */
function tubeOf(shape: Shape, { entry, exit }: Stations, profile: Path, shell: Path): Path {
  const thick = 0.1 * shape.pipe;
  const { flange, wall } = radii(shape.pipe);
  const metal = closedThrough(profile, [
    at(exit, flange),
    at(exit - thick, flange),
    at(exit - thick, radiusAt(shell, exit - thick)),
  ]);
  return {
    ...metal,
    segments: [
      ...metal.segments,
      ...pathReversed(shell).segments.slice(0, -1),
      { kind: 'line', to: at(entry + thick, wall) },
      { kind: 'line', to: at(entry + thick, flange) },
      { kind: 'line', to: at(entry, flange) },
    ],
  };
}

/** What flows, from wall to wall. */
function fluidOf({ pipe: D }: Shape, profile: Path, reach: Reach): Path {
  const lower = pathReversed(mirrored(profile));
  const upper: Path = {
    start: at(reach.from, D / 2),
    segments: [{ kind: 'line', to: profile.start }, ...profile.segments],
    closed: false,
  };
  const fluid = closedThrough(upper, [at(reach.to, D / 2), at(reach.to, -D / 2), lower.start]);
  return { ...fluid, segments: [...fluid.segments, ...lower.segments, { kind: 'line', to: at(reach.from, -D / 2) }] };
}

function section(shape: Shape, rows: readonly DimensionRow[], reach: Reach): Section {
  const { pipe: D, bore: d } = shape;
  const stations = stationsOf(shape, rows);
  const { entry, throatFrom, throatTo, exit, tapping } = stations;
  const profile = contourOf(shape, rows);
  const shell = shellOf(shape, profile);
  const { flange, wall } = radii(D);
  const jet = [0, 0.5 * throatFrom, throatFrom, throatTo, 0.5 * (throatTo + exit), exit];
  return {
    profile,
    walls: wallsOf(D, entry, exit, reach),
    metal: bothSides([tubeOf(shape, stations, profile, shell)]),
    fluid: fluidOf(shape, profile, reach),
    streamlines: streamlinesAlong(
      [at(-0.3 * D, D / 2), ...jet.map((x) => at(x, radiusAt(profile, x))), at(exit + 0.6 * D, D / 2)],
      reach,
    ),
    tappings: [
      { x: -shape.tappingUpstream, inner: D / 2, outer: wall, width: holeWidth(D) },
      { x: tapping, inner: d / 2, outer: radiusAt(shell, tapping), width: Math.min(0.1 * d, 0.01) }, // 5.4.2
    ],
    edge: at(throatFrom + 0.85 * d, d / 2),
    outside: flange,
  };
}

const cone = (x: number, radius: number, degrees: number, opens: 1 | -1) =>
  at(x - (opens * radius) / slopeOf(degrees), 0);

function measures(shape: Shape, rows: readonly DimensionRow[], _: Reach, printed: Diameters): readonly Measure[] {
  const { convergent, divergent, throatFrom, throatTo, exit, tapping } = stationsOf(shape, rows);
  const [R, r] = [shape.pipe / 2, shape.bore / 2];
  const { wall } = radii(shape.pipe);
  const length = (from: number, to: number, y: number, row: number, text: string | undefined): readonly Measure[] =>
    text === undefined ? [] : [{ kind: 'length', from: at(from, y), to: at(to, y), row, text }];
  const angle = (
    apex: ReturnType<typeof at>,
    x: number,
    degrees: number,
    text: string | undefined,
  ): readonly Measure[] =>
    text === undefined ? [] : [{ kind: 'angle', apex, distance: x - apex.x, half: degrees / 2, text }];
  const radiusNote = (x: number, y: number, text: string | undefined): readonly Measure[] =>
    text === undefined || cornersOf(shape)[0] === 0
      ? []
      : [{ kind: 'note', at: at(x, y), shift: at(3.5, 6.5), text: `R ${text}` }];
  return [
    ...length(-shape.tappingUpstream, 0, wall, 1, figureOf(rows, 'tapping-upstream')),
    ...length(0, throatFrom, -R, -1, figureOf(rows, 'convergent-length')),
    ...length(throatFrom, tapping, r, 1, figureOf(rows, 'tapping-throat')),
    ...length(throatFrom, throatTo, -r, -2, figureOf(rows, 'throat-length')),
    ...length(throatTo, exit, -r, -1, figureOf(rows, 'divergent-length')),
    ...angle(cone(throatFrom, r, convergent, -1), 0.35 * throatFrom, convergent, figureOf(rows, 'convergent-angle')),
    ...angle(
      cone(throatTo, r, divergent, 1),
      throatTo + 0.62 * (exit - throatTo),
      divergent,
      figureOf(rows, 'divergent-angle'),
    ),
    ...radiusNote(0, R, figureOf(rows, 'radius-entrance')),
    { kind: 'diameter', x: -0.86 * shape.pipe, radius: R, edge: -0.86 * shape.pipe, text: `Ø ${printed.pipe}` },
    { kind: 'diameter', x: 0.5 * (tapping + throatTo), radius: r, edge: tapping, text: `Ø ${printed.bore}` },
  ];
}

const exitOf = (shape: Shape): number => stationsOf(shape, []).exit;

export const venturiTube: Draft = {
  reach: (shape, compact) => ({
    from: -(shape.tappingUpstream + (compact ? 1.9 : 2.1) * shape.pipe),
    to: Math.max(exitOf(shape) + 0.5 * shape.pipe, (shape.recovery_D + (compact ? 0.4 : 1)) * shape.pipe),
  }),
  sheetReach: (shape) => ({ from: -1.5 * shape.pipe, to: exitOf(shape) + 0.5 * shape.pipe }),
  section,
  measures,
  edgeDetail: false,
};
