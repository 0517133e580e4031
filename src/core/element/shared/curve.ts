/** A discharge coefficient given by points over the Reynolds number: linear in ln Re_D, the end values held outside. */
import type { Source } from '../../quantity/source.ts';
import type { Given, Working } from '../../quantity/working.ts';

/** Pipe Reynolds number and coefficient, both above zero. */
export interface CurvePoint {
  readonly reynolds: number;
  readonly coefficient: number;
}

/** The points on both sides of a Reynolds number; the same point twice where the end value is held. */
const around = (points: readonly CurvePoint[], reynolds: number): readonly [CurvePoint, CurvePoint] => {
  const after = points.findIndex((point) => point.reynolds > reynolds);
  const high = points[after < 0 ? points.length - 1 : after] as CurvePoint;
  const low = after <= 0 ? high : (points[after - 1] as CurvePoint);
  return [low, high];
};

/** C at `reynolds` > 0 from points in rising order of Re_D, at least one. */
export const coefficientAt = (points: readonly CurvePoint[], reynolds: number): number => {
  const [low, high] = around(points, reynolds);
  if (low === high) return low.coefficient;
  const share = Math.log(reynolds / low.reynolds) / Math.log(high.reynolds / low.reynolds);
  return low.coefficient + share * (high.coefficient - low.coefficient);
};

/** The working of `coefficientAt`: the interpolation between two points, or the held value without a formula. */
export const curveWorking = (
  points: readonly CurvePoint[],
  reynolds: number,
  said: { readonly symbol: string; readonly source: Source; readonly between: string; readonly held: string },
): Working => {
  const [low, high] = around(points, reynolds);
  const { symbol } = said;
  const base = { id: 'C', symbol, value: coefficientAt(points, reynolds), unit: '', source: said.source };
  if (low === high) return { ...base, given: [], remark: said.held };
  const given: readonly Given[] = [
    { symbol: `${symbol}_1`, value: low.coefficient, unit: '', words: 'curve-coefficient' },
    { symbol: `${symbol}_2`, value: high.coefficient, unit: '', words: 'curve-coefficient' },
    { symbol: 'Re_1', value: low.reynolds, unit: '', words: 'curve-reynolds' },
    { symbol: 'Re_2', value: high.reynolds, unit: '', words: 'curve-reynolds' },
    { symbol: 'Re_D', value: reynolds, unit: '', words: 'reynolds-pipe' },
  ];
  const formula = `${symbol}_1 + (${symbol}_2 - ${symbol}_1) * ln(Re_D / Re_1) / ln(Re_2 / Re_1)`;
  return { ...base, formula, given, remark: said.between };
};
