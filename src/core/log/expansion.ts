/**
 * The expansibility of rows, as ε = 1 - x F(x, κ) with F a short polynomial in x = Δp/p₁ and in the isentropic exponent,
 * when the ratio of the metal does not move. Its error is measured against the element's own formula where it is built.
 */
import type { Primary } from '../element/contract.ts';
import { chebyshevPoints, chebyshevTable, powersOf, turned } from '../numeric/chebyshev.ts';
import { seeded } from '../numeric/seeded.ts';
import type { Side } from './patch.ts';

export interface Expansion {
  /** Largest x that the polynomial is for. */
  readonly most: number;
  readonly middle: number; // of κ
  readonly perHalf: number;
  readonly degreeX: number;
  readonly degreeK: number;
  /** For each power of x, the highest first, the powers of κ, the highest first. */
  readonly terms: Float64Array;
  readonly bound: number; // relative
}

/** p2/p1 = 0.75: ISO 5167-2:2022, 5.3.2.2, and its sister clauses. */
const MOST_EXPANSION = 0.25;
const MOST_ERROR = 1e-13;
const DEGREES_X = [6, 8, 10, 12] as const;
/** Degree in κ, where it moves at all. */
const DEGREE_K = 3;
const DRAWN = 128;
const SEED = 51672;

/** The polynomial for a ratio and a range of κ; undefined where no short one is within the bound. */
export function expansionOf(primary: Primary, ratio: number, exponents: Side): Expansion | undefined {
  const degreeK = exponents[0] === exponents[1] ? 0 : DEGREE_K;
  for (const degreeX of DEGREES_X) {
    const draft = through(primary, ratio, exponents, degreeX, degreeK);
    const bound = boundOf(draft, primary, ratio, exponents);
    if (bound <= MOST_ERROR) return { ...draft, bound };
  }
  return undefined;
}

type Draft = Omit<Expansion, 'bound'>;

function through(primary: Primary, ratio: number, exponents: Side, degreeX: number, degreeK: number): Draft {
  const [lower, upper] = exponents;
  const xs = chebyshevPoints(degreeX + 1, 0, MOST_EXPANSION);
  const values = chebyshevPoints(degreeK + 1, lower, upper).map((kappa) => {
    const epsilon = primary.expansibility(ratio, kappa);
    return xs.map((x) => (1 - epsilon(x)) / x);
  });
  const byPowers = turned(turned(chebyshevTable(values).map(powersOf)).map(powersOf)); // power of κ, then of x
  return {
    most: MOST_EXPANSION,
    middle: (lower + upper) / 2,
    perHalf: upper > lower ? 2 / (upper - lower) : 0,
    degreeX,
    degreeK,
    terms: Float64Array.from(
      turned(byPowers)
        .reverse()
        .flatMap((powers) => powers.reverse()),
    ),
  };
}

/** Twice the largest error at places drawn at random and at the ends. */
function boundOf(draft: Draft, primary: Primary, ratio: number, [lower, upper]: Side): number {
  const random = seeded(SEED);
  const drawn = Array.from({ length: DRAWN }, () => [random(), random()] as const);
  const corners = [0, 1].flatMap((k) => [1e-9, 1].map((x) => [x, k] as const));
  const errors = [...drawn, ...corners].map(([x, k]) => {
    const [expansion, kappa] = [x * MOST_EXPANSION, lower + k * (upper - lower)];
    return Math.abs(expansibilityAt(draft, expansion, kappa) / primary.expansibility(ratio, kappa)(expansion) - 1);
  });
  return 2 * Math.max(...errors);
}

/** ε at x from 0 to `most` and an exponent of the range. */
function expansibilityAt(of: Draft, x: number, kappa: number): number {
  const one = (value: number) => Float64Array.of(value);
  const epsilon = one(0);
  expansibilities(of, one(x), one(1), one(kappa), epsilon, 1);
  return epsilon[0] as number;
}

/** ε of the first rows, whose differentials are at most the share `most` of their pressures. */
export function expansibilities(
  { terms, most, degreeX, degreeK, middle, perHalf }: Draft,
  differential: Float64Array,
  pressure: Float64Array,
  exponent: Float64Array,
  epsilon: Float64Array,
  count: number,
): void {
  for (let row = 0; row < count; row += 1) {
    const x = (differential[row] as number) / (pressure[row] as number);
    const u = (2 / most) * x - 1;
    let sum = 0;
    if (degreeK === 0) for (let i = 0; i <= degreeX; i += 1) sum = sum * u + (terms[i] as number);
    else {
      const k = ((exponent[row] as number) - middle) * perHalf;
      for (let at = 0; at <= 4 * degreeX; at += 4) {
        const square = ((terms[at] as number) * k + (terms[at + 1] as number)) * k + (terms[at + 2] as number);
        sum = sum * u + square * k + (terms[at + 3] as number);
      }
    }
    epsilon[row] = 1 - x * sum;
  }
}
