/**
 * The metal of a meter along the temperature: spans in which it grows without a bend, and in each a short polynomial for
 * everything a row asks of it. The figures of the materials' tables bend at their temperatures.
 */
import type { Geometry } from '../element/contract.ts';
import { materialOf } from '../element/shared/growth.ts';
import type { MeterInput } from '../input/meter.ts';
import { chebyshevCoefficients, chebyshevPoints, powersOf } from '../numeric/chebyshev.ts';
import { kelvin } from '../quantity/constants.ts';
import { idealFlow } from '../solve/equation.ts';
import type { Side } from './patch.ts';

/** A span of temperature, K. */
export interface Span {
  readonly lower: number;
  readonly upper: number;
  /** Whether the metal grows in it. */
  readonly moves: boolean;
}

/** No span is wider: what a polynomial leaves out falls with the fourth power of the width. K. */
const WIDEST = 50;

/** The spans of a box, in rising order. */
export function spansOf(input: MeterInput, [lower, upper]: Side): readonly Span[] {
  const materials = [input.pipe.material, input.element.material].flatMap((key) =>
    key === undefined ? [] : [materialOf(key)],
  );
  const moves = materials.length > 0 && upper > lower;
  if (!moves) return [{ lower, upper, moves }];
  const bends = materials.flatMap((material) => (material?.celsius ?? []).map(kelvin));
  const inner = [...new Set(bends)].filter((T) => T > lower && T < upper).sort((one, other) => one - other);
  const ends = [lower, ...inner, upper];
  return ends.slice(1).flatMap((end, at) => {
    const start = ends[at] as number;
    const count = Math.ceil((end - start) / WIDEST);
    const cut = (i: number): number => (i === count ? end : start + ((end - start) * i) / count);
    return Array.from({ length: count }, (_, i) => ({ lower: cut(i), upper: cut(i + 1), moves }));
  });
}

/** Of each span: its upper end, middle and half width turned round, and three polynomials of degree 3. */
export interface Growth {
  readonly upper: Float64Array;
  readonly middle: Float64Array;
  readonly perHalf: Float64Array;
  /** q_m/(C epsilon) at 1 Pa and 1 kg/m3, 4/(π D) and the ratio: highest power first, 12 figures a span. */
  readonly terms: Float64Array;
  /** Whether the ratio is the same at every temperature. */
  readonly rigid: boolean;
}

const DEGREE = 3;
const POWERS = DEGREE + 1;
export const FLOW = 0;
export const REYNOLDS = POWERS;
export const RATIO = 2 * POWERS;
const FIGURES = 3 * POWERS;
/** Ratios that differ by less are one: the rounding of two lengths that grow alike. */
const ALIKE = 1e-15;

/** The metal over its spans. */
export function growthOf(spans: readonly Span[], geometryAt: (T: number) => Geometry): Growth {
  const terms = new Float64Array(spans.length * FIGURES);
  const ratios: number[] = [];
  spans.forEach(({ lower, upper, moves }, span) => {
    const metals = chebyshevPoints(moves ? POWERS : 1, lower, upper).map(geometryAt);
    ratios.push(...metals.map(({ ratio }) => ratio));
    const put = (place: number, values: readonly number[]): void =>
      powersOf(chebyshevCoefficients(values)).forEach((power, i) => {
        terms[span * FIGURES + place + DEGREE - i] = power;
      });
    put(
      FLOW,
      metals.map((metal) => idealFlow(metal, 1, 1)),
    );
    put(
      REYNOLDS,
      metals.map(({ pipe }) => 4 / (Math.PI * pipe)), // ISO 5167-1:2003, 3.3.2
    );
    put(
      RATIO,
      metals.map(({ ratio }) => ratio),
    );
  });
  return {
    upper: Float64Array.from(spans, ({ upper }) => upper),
    middle: Float64Array.from(spans, ({ lower, upper }) => (lower + upper) / 2),
    perHalf: Float64Array.from(spans, ({ lower, upper }) => (upper > lower ? 2 / (upper - lower) : 0)),
    terms,
    rigid: Math.max(...ratios) - Math.min(...ratios) <= ALIKE,
  };
}

/** The span that a temperature of the box lies in. */
export function spanAt({ upper }: Growth, T: number): number {
  let span = 0;
  while (span < upper.length - 1 && T > (upper[span] as number)) span += 1;
  return span;
}

/** One of the three figures in a span, with t from -1 to 1 in it. */
export function figureAt({ terms }: Growth, span: number, figure: number, t: number): number {
  const at = span * FIGURES + figure;
  return (
    (((terms[at] as number) * t + (terms[at + 1] as number)) * t + (terms[at + 2] as number)) * t +
    (terms[at + 3] as number)
  );
}
