/** A primary whose discharge coefficient is replaced by the figures of its own calibration. */
import type { Source } from '../../quantity/source.ts';
import type { Given, Working } from '../../quantity/working.ts';
import type { Primary } from '../contract.ts';

/** One point of the calibration: pipe Reynolds number and coefficient, both above zero. */
export interface CalibrationPoint {
  readonly reynolds: number;
  readonly coefficient: number;
}

const source: Source = { clause: 'Calibration of this meter', seen: 'read' };

/**
 * The primary with C from `rows`: linear in ln Re_D between the points, the end value held outside, one row a constant.
 * Uncertainties and limits stay those of the standard, since the file states none for the calibration.
 * Throws a defect for an empty list and for points that are not above zero or share a Reynolds number.
 */
export const calibrated = (primary: Primary, rows: readonly CalibrationPoint[]): Primary => {
  const points = ordered(rows);
  return {
    ...primary,
    discharge: () => (reynolds) => valueAt(points, reynolds),
    working: { ...primary.working, coefficient: (_, reynolds) => workingAt(points, reynolds) },
  };
};

/** Reynolds numbers that the calibration covers; a single row, a constant, covers its own alone. */
export const calibrationRange = (rows: readonly CalibrationPoint[]): { readonly min: number; readonly max: number } => {
  const points = ordered(rows);
  return {
    min: (points[0] as CalibrationPoint).reynolds,
    max: (points[points.length - 1] as CalibrationPoint).reynolds,
  };
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

/** The points on both sides of a Reynolds number; the same point twice where the end value is held. */
const around = (points: readonly CalibrationPoint[], reynolds: number): [CalibrationPoint, CalibrationPoint] => {
  const after = points.findIndex((point) => point.reynolds > reynolds);
  const high = points[after < 0 ? points.length - 1 : after] as CalibrationPoint;
  const low = after <= 0 ? high : (points[after - 1] as CalibrationPoint);
  return [low, high];
};

const valueAt = (points: readonly CalibrationPoint[], reynolds: number): number => {
  const [low, high] = around(points, reynolds);
  if (low === high) return low.coefficient;
  const share = Math.log(reynolds / low.reynolds) / Math.log(high.reynolds / low.reynolds);
  return low.coefficient + share * (high.coefficient - low.coefficient);
};

const workingAt = (points: readonly CalibrationPoint[], reynolds: number): Working => {
  const [low, high] = around(points, reynolds);
  const base = { id: 'C', symbol: 'C', value: valueAt(points, reynolds), unit: '', source };
  if (low === high)
    return { ...base, given: [], remark: points.length === 1 ? 'calibration-constant' : 'calibration-held' };
  const given: readonly Given[] = [
    { symbol: 'C_1', value: low.coefficient, unit: '', words: 'calibration-coefficient' },
    { symbol: 'C_2', value: high.coefficient, unit: '', words: 'calibration-coefficient' },
    { symbol: 'Re_1', value: low.reynolds, unit: '', words: 'calibration-reynolds' },
    { symbol: 'Re_2', value: high.reynolds, unit: '', words: 'calibration-reynolds' },
    { symbol: 'Re_D', value: reynolds, unit: '', words: 'reynolds-pipe' },
  ];
  return {
    ...base,
    formula: 'C_1 + (C_2 - C_1) * ln(Re_D / Re_1) / ln(Re_2 / Re_1)',
    given,
    remark: 'calibration-interpolated',
  };
};
