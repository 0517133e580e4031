/**
 * Averaging pitot: a bar across the whole pipe, from its head outside the wall to a guide in the wall opposite. Inside
 * run two passages, one to the ports in front and one to those behind. The bar and its ports are not to scale.
 */
import type { DimensionRow, Shape } from '../present/model.ts';
import { figureOf, pipeFluid, radii, sizeOf } from './casing.ts';
import type { Diameters, Draft, Measure, Reach, Section } from './contract.ts';
import { streamlinesAlong } from './jet.ts';
import { at, bothSides, type Path, polygon, polyline } from './path.ts';

/** Depth of the bar along the flow as drawn, in pipe bores; that of its width within these, so that its ports show. */
const drawn = { usual: 0.14, least: 0.12, most: 0.2 };
/** Radii of the ports as drawn: the middles of two rings of equal area. */
const ports = [0.5, 0.866]; // sqrt(1/4), sqrt(3/4)
/** Head of the bar above the wall, in pipe bores. */
const headHeight = 0.3;

/** Half the depth of the bar, its walls and the web between its passages, m. */
function barOf({ pipe: D }: Shape, rows: readonly DimensionRow[]) {
  const width = sizeOf(rows, 'bar-width', drawn.usual * D);
  const half = Math.min(Math.max(width, drawn.least * D), drawn.most * D) / 2;
  return { half, shell: 0.3 * half, web: 0.16 * half, port: 0.34 * half };
}

/** Stretches of the axis of the bar between its ports, from its foot up to a height. */
function stretches(foot: number, top: number, radius: number, port: number): readonly (readonly [number, number])[] {
  const holes = ports.flatMap((share) => [-share * radius, share * radius]).sort((one, other) => one - other);
  const edges = [foot, ...holes.flatMap((place) => [place - port, place + port]), top];
  return edges.flatMap((from, index) => (index % 2 === 0 ? [[from, edges[index + 1] ?? top] as const] : []));
}

/** The metal of the bar cut along its axis: front and back between the ports, the web, and the closed foot. */
function metalOf(shape: Shape, rows: readonly DimensionRow[]): readonly Path[] {
  const { half, shell, web, port } = barOf(shape, rows);
  const { bore, wall } = radii(shape.pipe);
  const foot = -bore - 0.5 * (wall - bore); // let into the wall opposite
  const top = wall + headHeight * shape.pipe;
  const box = (left: number, right: number, low: number, high: number): Path =>
    polygon([at(left, low), at(right, low), at(right, high), at(left, high)]);
  const sides = stretches(foot, top, bore, port).flatMap(([low, high]) => [
    box(-half, -half + shell, low, high),
    box(half - shell, half, low, high),
  ]);
  return [...sides, box(-web, web, foot, top), box(-half, half, foot - shell, foot)];
}

/** The wall, opened for the bar above and let in for its foot below. */
function wallsOf(shape: Shape, half: number, reach: Reach): readonly Path[] {
  const { bore, wall } = radii(shape.pipe);
  const side = (from: number, to: number): Path =>
    polygon([at(from, bore), at(to, bore), at(to, wall), at(from, wall)]);
  return bothSides([side(reach.from, -half), side(half, reach.to)]);
}

/** A boss on the wall that holds the bar. */
function bossOf(shape: Shape, half: number): readonly Path[] {
  const { wall } = radii(shape.pipe);
  const [inner, outer, high] = [half, half + 0.11 * shape.pipe, wall + 0.13 * shape.pipe];
  const right = polygon([at(inner, wall), at(outer, wall), at(outer, high), at(inner, high)]);
  const left = polygon([at(-inner, wall), at(-outer, wall), at(-outer, high), at(-inner, high)]);
  return [left, right];
}

/** Closes the opening in the wall opposite, behind the foot of the bar. */
function seatOf(shape: Shape, half: number, shell: number): Path {
  const { bore, wall } = radii(shape.pipe);
  const top = -bore - 0.5 * (wall - bore) - shell;
  return polygon([at(-half, -wall), at(half, -wall), at(half, top), at(-half, top)]);
}

function section(shape: Shape, rows: readonly DimensionRow[], reach: Reach): Section {
  const { half, shell, web } = barOf(shape, rows);
  const { bore, wall } = radii(shape.pipe);
  const top = wall + headHeight * shape.pipe;
  const passage = { inner: -bore, outer: top, width: half - shell - web };
  const middle = (half - shell + web) / 2;
  return {
    profile: polyline([at(-half, bore), at(half, bore)]),
    walls: wallsOf(shape, half, reach),
    metal: [...bossOf(shape, half), seatOf(shape, half, shell), ...metalOf(shape, rows)],
    fluid: pipeFluid(shape.pipe, reach),
    streamlines: streamlinesAlong([at(-half, bore), at(half, bore)], reach),
    tappings: [
      { x: -middle, ...passage },
      { x: middle, ...passage },
    ],
    edge: at(0, bore),
    outside: top,
    below: wall,
  };
}

function measures(shape: Shape, rows: readonly DimensionRow[], reach: Reach, printed: Diameters): readonly Measure[] {
  const { half } = barOf(shape, rows);
  const width = figureOf(rows, 'bar-width');
  const x = reach.from * 0.64;
  return [
    { kind: 'diameter', x, radius: shape.pipe / 2, edge: x, text: `Ø ${printed.pipe}` },
    ...(width === undefined
      ? []
      : [{ kind: 'note', at: at(half, 0.2 * shape.pipe), shift: at(9, 5), text: `w ${width}` } as const]),
  ];
}

export const averagingPitot: Draft = {
  reach: ({ pipe }, compact) => ({ from: (compact ? -1.7 : -3.4) * pipe, to: (compact ? 2.2 : 4.6) * pipe }),
  sheetReach: ({ pipe }) => ({ from: -1.75 * pipe, to: 1.75 * pipe }),
  section,
  measures,
  edgeDetail: false,
};
