/** ISA 1932 nozzle between flanges, corner tappings. ISO 5167-3:2003, 5.1.2 (profile), 5.1.5 (tappings). */
import type { DimensionRow, Shape } from '../present/model.ts';
import { cornerWidth, figureOf, pipeReach, radii } from './casing.ts';
import type { Diameters, Draft, Measure, Reach, Section } from './contract.ts';
import { isaInlet } from './isa-inlet.ts';
import { nozzleSection } from './nozzle.ts';
import { at } from './path.ts';
import { radiusAt } from './profile.ts';

/** Throat length, 0.3 d; flange thickness as drawn, within 0.1 D. */
const throat = 0.3;
const flangeShare = 0.09;

const contourOf = (shape: Shape) => isaInlet(shape.pipe, shape.bore, throat).contour;
const lengthOf = (shape: Shape) => isaInlet(shape.pipe, shape.bore, throat).throatTo;

/** The downstream hole: where the shape has it, but clear of the flange of the nozzle. */
const downstreamPlace = (shape: Shape): number =>
  Math.max(shape.tappingDownstream, flangeShare * shape.pipe + 0.5 * cornerWidth(shape));

function section(shape: Shape, _: readonly DimensionRow[], reach: Reach): Section {
  const { pipe: D, bore: d } = shape;
  const profile = contourOf(shape);
  const flange = flangeShare * D;
  const exit = lengthOf(shape);
  const body = Math.min(radiusAt(profile, flange) + 0.05 * D, 0.485 * D);
  const recess = Math.min(0.55 * d, 0.5 * (0.5 * d + body)); // protected exit edge, at least 1.06 d across
  const back = [at(exit, recess), at(exit + 0.03 * d, recess), at(exit + 0.03 * d, body), at(flange, body)];
  const hole = 0.5 * cornerWidth(shape);
  return nozzleSection(
    shape,
    { profile, back, flange, upstream: -hole, downstream: downstreamPlace(shape), hole: 2 * hole },
    reach,
  );
}

function measures(shape: Shape, rows: readonly DimensionRow[], reach: Reach, printed: Diameters): readonly Measure[] {
  const { contour, throatFrom, throatTo } = isaInlet(shape.pipe, shape.bore, throat);
  const { bore } = radii(shape.pipe);
  const throatText = figureOf(rows, 'throat-length');
  const whole = figureOf(rows, 'profile-length');
  const first = figureOf(rows, 'profile-radius-inlet');
  const second = figureOf(rows, 'profile-radius-throat');
  const below = -shape.bore / 2;
  const edge = at(0.045 * shape.bore, 0.63 * shape.bore);
  const along = (from: number, to: number, row: number, text: string | undefined): readonly Measure[] =>
    text === undefined ? [] : [{ kind: 'length', from: at(from, below), to: at(to, below), row, text }];
  const behind = figureOf(rows, 'tapping-downstream');
  const lower = shape.ratio < 0.45; // room for the notes beside the face, below it otherwise
  const place = downstreamPlace(shape);
  const top = radii(shape.pipe).flange;
  return [
    ...(behind === undefined
      ? []
      : [{ kind: 'length', from: at(0, top), to: at(place, top), row: 1, text: behind } as const]),
    ...along(throatFrom, throatTo, -1, throatText),
    ...along(0, throatTo, -2, whole),
    ...(first === undefined
      ? []
      : [
          {
            kind: 'note',
            at: at(0, contour.start.y * 0.98),
            shift: at(-9, lower ? 3 : -4.2),
            text: `R ${first}`,
          } as const,
        ]),
    ...(second === undefined
      ? []
      : [{ kind: 'note', at: edge, shift: at(-12, lower ? -1.5 : -8), text: `R ${second}` } as const]),
    { kind: 'diameter', x: reach.from * 0.75, radius: bore, edge: reach.from * 0.75, text: `Ø ${printed.pipe}` },
    { kind: 'diameter', x: 1.15 * shape.pipe, radius: shape.bore / 2, edge: throatTo, text: `Ø ${printed.bore}` },
  ];
}

export const isa1932Nozzle: Draft = {
  reach: pipeReach,
  sheetReach: (shape) => ({ from: -3.2 * shape.pipe, to: 2.4 * shape.pipe }),
  section,
  measures,
  edgeDetail: false,
};
