/** Venturi nozzle: ISA 1932 inlet, throat with its tappings, divergent to the pipe bore. ISO 5167-3:2003, 5.3.2, 5.3.3. */
import type { DimensionRow, Shape } from '../present/model.ts';
import { cornerWidth, figureOf, flangedWalls, pipeFluid, radii, sizeOf, tappingAt } from './casing.ts';
import type { Diameters, Draft, Measure, Reach, Section } from './contract.ts';
import { isaInlet } from './isa-inlet.ts';
import { easing, streamlinesAlong } from './jet.ts';
import { at, bothSides, closedThrough, line, type Path } from './path.ts';
import { radiusAt } from './profile.ts';

/** Throat tapping 0.3 d behind the inlet; 0.45 d more of throat, as drawn within 0.4 d to 0.45 d. */
const toTapping = 0.3;
const throat = 0.75;
/** Included angle of the divergent as drawn where the dimensions leave it open, degrees. */
const drawnAngle = 15;

function bodyOf(shape: Shape, rows: readonly DimensionRow[]) {
  const { pipe: D, bore: d } = shape;
  const inlet = isaInlet(D, d, throat);
  const angle = sizeOf(rows, 'divergent-angle', drawnAngle);
  const exit = inlet.throatTo + (D - d) / (2 * Math.tan((angle * Math.PI) / 360));
  const profile: Path = { ...inlet.contour, segments: [...inlet.contour.segments, line(at(exit, D / 2))] };
  return { ...inlet, profile, exit, angle, tapping: inlet.throatFrom + toTapping * d };
}

function section(shape: Shape, rows: readonly DimensionRow[], reach: Reach): Section {
  const { profile, exit, tapping, throatFrom, throatTo } = bodyOf(shape, rows);
  const { pipe: D, bore: d } = shape;
  const { wall, flange } = radii(D);
  const length = 0.2 * D;
  const joint = { from: 0, to: exit, upstream: length, downstream: 0.14 * D };
  const hole = 0.5 * cornerWidth(shape);
  const inlet = easing(at(-0.9 * D, D / 2), at(throatFrom, d / 2));
  const divergent = [throatTo, 0.5 * (throatTo + exit), exit].map((x) => at(x, radiusAt(profile, x)));
  const body = [at(exit, flange), at(exit - 0.14 * D, flange), at(exit - 0.14 * D, wall), at(0.14 * D, wall)];
  return {
    profile,
    walls: flangedWalls(D, joint, reach),
    metal: bothSides([closedThrough(profile, [...body, at(0.14 * D, flange), at(0, flange)])]),
    fluid: pipeFluid(D, reach),
    streamlines: streamlinesAlong([...inlet, ...divergent, at(exit + 0.8 * D, D / 2)], reach),
    tappings: [
      tappingAt(shape, -hole, joint, 2 * hole),
      { x: tapping, inner: d / 2, outer: wall, width: Math.min(0.04 * d, 0.01) }, // 5.3.3.2
    ],
    edge: at(throatTo, d / 2),
    outside: flange,
  };
}

function measures(shape: Shape, rows: readonly DimensionRow[], reach: Reach, printed: Diameters): readonly Measure[] {
  const { throatFrom, throatTo, tapping, exit, angle } = bodyOf(shape, rows);
  const radius = shape.bore / 2;
  const half = angle / 2;
  const apex = at(throatTo - radius / Math.tan((half * Math.PI) / 180), 0);
  const along = (from: number, to: number, row: number, text: string | undefined): readonly Measure[] =>
    text === undefined ? [] : [{ kind: 'length', from: at(from, -radius), to: at(to, -radius), row, text }];
  const degrees = figureOf(rows, 'divergent-angle');
  const tappingText = figureOf(rows, 'tapping-throat');
  const { wall, flange } = radii(shape.pipe);
  return [
    ...(tappingText === undefined
      ? []
      : [{ kind: 'length', from: at(0, flange), to: at(tapping, wall), row: 1, text: tappingText } as const]),
    ...along(throatFrom, throatTo, -1, figureOf(rows, 'throat-length')),
    ...(degrees === undefined
      ? []
      : [{ kind: 'angle', apex, distance: 0.8 * exit - apex.x, half, text: degrees } as const]),
    {
      kind: 'diameter',
      x: reach.from * 0.62,
      radius: shape.pipe / 2,
      edge: reach.from * 0.62,
      text: `Ø ${printed.pipe}`,
    },
    { kind: 'diameter', x: 0.5 * (tapping + throatTo), radius, edge: throatTo, text: `Ø ${printed.bore}` },
  ];
}

const exitOf = (shape: Shape): number => bodyOf(shape, []).exit;

export const venturiNozzle: Draft = {
  reach: (shape, compact) => ({
    from: (compact ? -1.6 : -3.15) * shape.pipe,
    to: Math.max(exitOf(shape) + 0.8 * shape.pipe, (shape.recovery_D + (compact ? 0.4 : 1)) * shape.pipe),
  }),
  sheetReach: (shape) => ({ from: -1.2 * shape.pipe, to: exitOf(shape) + 0.8 * shape.pipe }),
  section,
  measures,
  edgeDetail: false,
};
