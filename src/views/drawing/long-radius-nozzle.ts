/**
 * Long-radius nozzle: quarter ellipse, cylindrical throat of 0.6 d. ISO 5167-3:2003, 5.2.2 (high ratio), 5.2.3 (low ratio).
 * High ratio: semi-axes D/2 along and (D - d)/2 across. Low ratio: d along and 2 d/3 across.
 */
import type { DimensionRow, Shape } from '../present/model.ts';
import { figureOf, holeWidth, pipeReach, radii } from './casing.ts';
import type { Diameters, Draft, Measure, Reach, Section } from './contract.ts';
import { nozzleSection } from './nozzle.ts';
import { type ArcSegment, at, line, type Path } from './path.ts';

/** Below this diameter ratio the high-ratio shape is not allowed. */
const lowRatioBelow = 0.25;
const flangeShare = 0.06;

interface Ellipse {
  readonly along: number;
  readonly across: number;
}

/** Semi-axes of the inlet, m. */
export function inletEllipse({ pipe: D, bore: d, ratio, element }: Shape): Ellipse {
  const low = element.includes('low') || ratio < lowRatioBelow;
  return low ? { along: d, across: (2 / 3) * d } : { along: D / 2, across: (D - d) / 2 };
}

/** Contour from the upstream face to the exit; the pipe wall cuts an ellipse that is wider than the pipe. */
function contourOf(shape: Shape): Path {
  const { along, across } = inletEllipse(shape);
  const radius = shape.bore / 2;
  const entry = Math.min(radius + across, shape.pipe / 2);
  const cut = along * (1 - Math.sqrt(Math.max(0, 1 - ((radius + across - entry) / across) ** 2)));
  const start = at(0, entry);
  const end = along - cut;
  const arc: ArcSegment = {
    kind: 'arc',
    to: at(end, radius),
    centre: at(end, radius + across),
    semiX: along,
    semiY: across,
    clockwise: false,
  };
  return { start, segments: [arc, line(at(end + 0.6 * shape.bore, radius))], closed: false };
}

const throatOf = (shape: Shape) => {
  const from = contourOf(shape).segments[0]?.to.x ?? 0;
  return { from, to: from + 0.6 * shape.bore };
};

/** Outside of the shell: an ellipse of smaller semi-axes about the same centre, in short straight steps. */
function shell(shape: Shape, flange: number, wall: number) {
  const { along, across } = inletEllipse(shape);
  const { from, to } = throatOf(shape);
  const radius = shape.bore / 2;
  const clear = 0.47 * shape.pipe; // outside of the throat stays clear of the pipe wall
  const steps = Array.from({ length: 17 }, (_, index) => from + (flange - from) * (index / 16));
  const outer = steps.map((x) => {
    const share = Math.min(1, (from - x) / Math.max(along - wall, 1e-9));
    const height = (across - wall) * Math.sqrt(Math.max(0, 1 - share * share));
    return at(x, Math.min(clear, radius + across - Math.max(0, height)));
  });
  return [at(to, radius + wall), ...outer];
}

function section(shape: Shape, _: readonly DimensionRow[], reach: Reach): Section {
  const flange = flangeShare * shape.pipe;
  const wall = Math.min(0.05 * shape.pipe, 0.013, 0.2 * (shape.pipe - shape.bore)); // F
  const places = { upstream: -shape.tappingUpstream, downstream: shape.tappingDownstream, hole: holeWidth(shape.pipe) };
  return nozzleSection(
    shape,
    { profile: contourOf(shape), back: shell(shape, flange, wall), flange, ...places },
    reach,
  );
}

function measures(shape: Shape, rows: readonly DimensionRow[], reach: Reach, printed: Diameters): readonly Measure[] {
  const throat = throatOf(shape);
  const { bore, wall } = radii(shape.pipe);
  const below = -shape.bore / 2;
  const axial = (from: number, to: number, y: number, row: number, text: string | undefined): readonly Measure[] =>
    text === undefined
      ? []
      : [{ kind: 'length', from: at(Math.min(from, to), y), to: at(Math.max(from, to), y), row, text }];
  return [
    ...axial(-shape.tappingUpstream, 0, wall, 1, figureOf(rows, 'tapping-upstream')),
    ...axial(0, shape.tappingDownstream, wall, 1, figureOf(rows, 'tapping-downstream')),
    ...axial(0, throat.from, below, -1, figureOf(rows, 'ellipse-axial')),
    ...axial(throat.from, throat.to, below, -1, figureOf(rows, 'throat-length')),
    { kind: 'diameter', x: reach.from * 0.7, radius: bore, edge: reach.from * 0.7, text: `Ø ${printed.pipe}` },
    {
      kind: 'diameter',
      x: throat.to + 0.5 * shape.pipe,
      radius: shape.bore / 2,
      edge: throat.to,
      text: `Ø ${printed.bore}`,
    },
  ];
}

export const longRadiusNozzle: Draft = {
  reach: pipeReach,
  sheetReach: (shape) => ({ from: -2.4 * shape.pipe, to: 2.6 * shape.pipe }),
  section,
  measures,
  edgeDetail: false,
};
