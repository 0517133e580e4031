/** A primary whose discharge coefficient is replaced by the figures of its own calibration. */
import type { Source } from '../../quantity/source.ts';
import type { Primary } from '../contract.ts';
import { type CurvePoint, coefficientAt, curveWorking } from './curve.ts';

/** One point of the calibration: pipe Reynolds number and coefficient, both above zero. */
export type CalibrationPoint = CurvePoint;

const source: Source = { clause: 'Calibration of this meter', seen: 'read' };

/**
 * The primary with C from `rows`: linear in ln Re_D between the points, the end value held outside, one row a constant.
 * Uncertainties and limits stay those of the standard, since the file states none for the calibration.
 * Throws a defect for an empty list and for points that are not above zero or share a Reynolds number.
 */
export const calibrated = (primary: Primary, rows: readonly CalibrationPoint[]): Primary => {
  const points = ordered(rows);
  const held = points.length === 1 ? 'calibration-constant' : 'calibration-held';
  const symbol = primary.insertion === undefined ? 'C' : 'K';
  const said = { symbol, source, between: 'calibration-interpolated', held };
  return {
    ...primary,
    discharge: () => (reynolds) => coefficientAt(points, reynolds),
    working: { ...primary.working, coefficient: (_, reynolds) => curveWorking(points, reynolds, said) },
  };
};

/** Reynolds numbers that the calibration covers; a single row, a constant, covers its own alone. */
export const calibrationRange = (rows: readonly CalibrationPoint[]): { readonly min: number; readonly max: number } => {
  const points = ordered(rows);
  const [first, last] = [points[0] as CalibrationPoint, points[points.length - 1] as CalibrationPoint];
  return { min: first.reynolds, max: last.reynolds };
};

const ordered = (rows: readonly CalibrationPoint[]): readonly CalibrationPoint[] => {
  const points = [...rows].sort((a, b) => a.reynolds - b.reynolds);
  const bad = points.findIndex((p, i) => !(p.reynolds > (points[i - 1]?.reynolds ?? 0) && p.coefficient > 0));
  if (points.length === 0 || bad >= 0) {
    const got = bad >= 0 ? JSON.stringify(points[bad]) : 'no row';
    throw new RangeError(`calibration: expected rows with rising Re_D > 0 and C > 0, got ${got}`);
  }
  return points;
};
