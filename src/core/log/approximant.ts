/**
 * C of a meter, explicit in X = Re_D/C and in the temperature of its metal: X is known from differential, density and
 * viscosity, so that a row needs no search. ISO 5167-1:2003, Annex A, where A1 = X.
 *
 * X is cut into sixteen pieces an octave, found by the leading bits of the double; the temperature into spans without a
 * bend of the metal's expansion. In each a short polynomial stands for C. Where it is not within the bound, as at a bend
 * of a calibration, of Annex B or at the floor of the element, the piece stays open and the row is solved.
 */
import type { Geometry, Primary } from '../element/contract.ts';
import { chebyshevCoefficients, chebyshevPoints, chebyshevTable, powersOf, turned } from '../numeric/chebyshev.ts';
import { heldDischarge } from '../solve/equation.ts';
import { coefficientFrom } from '../solve/flow.ts';
import type { Span } from './spans.ts';

export interface Approximant {
  /** Leading bits of the first piece, and how many pieces there are. */
  readonly first: number;
  readonly pieces: number;
  /** Middle of each piece, and half its width turned round. */
  readonly middle: Float64Array;
  readonly perHalf: Float64Array;
  /** For each span, then each piece: 1 where the polynomial is within the bound. */
  readonly closed: Uint8Array;
  /** For each span, then each piece: coefficients, the highest power of the temperature first, and of X in each. */
  readonly terms: Float64Array;
  /** Whether `held` is within the bound. */
  readonly holds: boolean;
  /** For each span: C below the first piece, where the element holds it, by the powers of the temperature, highest first. */
  readonly held: Float64Array;
  /** Largest relative error of C found in a closed piece, with what a search for C leaves itself. */
  readonly bound: number;
  /** Largest |dC/C| / |dX/X| of a closed piece: how much of an error in viscosity gets into C. */
  readonly steepness: number;
}

/** Relative error of C that a closed piece may have. */
const MOST_ERROR = 1e-12;
/** What a search leaves beside a bend of C. */
const SEARCHED = 5e-14;
/** Pipe Reynolds numbers reach from the floor of the element up to here. */
const MOST_REYNOLDS = 1e9;
/** Degrees in X for each power of the temperature, the constant first: the metal moves C but little. */
const DEGREES = [6, 4, 2, 1] as const;
const TERMS = DEGREES.reduce((sum: number, degree) => sum + degree + 1, 0);
/** The leading bits of a double that number its piece: sign, exponent and four of the mantissa. */
const SHIFT = 16;

const double = new Float64Array(1);
const words = new Uint32Array(double.buffer);
const high = new Uint32Array(new Float64Array([1]).buffer)[0] === 0 ? 1 : 0; // the word that holds the exponent

/** Number of the piece that X lies in, over all doubles. */
const pieceOf = (x: number): number => {
  double[0] = x;
  return (words[high] as number) >>> SHIFT;
};

/** Least X of a piece. */
const startOf = (piece: number): number => {
  words[1 - high] = 0;
  words[high] = piece << SHIFT;
  return double[0] as number;
};

/** The approximant of an element whose metal is at `geometryAt` of a temperature, over the spans of it. */
export function approximantOf(
  primary: Primary,
  spans: readonly Span[],
  geometryAt: (T: number) => Geometry,
): Approximant {
  const nodes = spans.map((span) => nodesOf(primary, span, geometryAt));
  const least = Math.min(...nodes.flat().map(({ held }) => held.floor / held.at(held.floor)));
  const first = pieceOf(least);
  const pieces = pieceOf(MOST_REYNOLDS / primary.guess) - first + 1;
  const middle = new Float64Array(pieces);
  const perHalf = new Float64Array(pieces);
  for (let piece = 0; piece < pieces; piece += 1) {
    const [from, to] = [startOf(first + piece), startOf(first + piece + 1)];
    middle[piece] = (from + to) / 2;
    perHalf[piece] = 2 / (to - from);
  }
  const closed = new Uint8Array(spans.length * pieces);
  const terms = new Float64Array(spans.length * pieces * TERMS);
  let [bound, steepness] = [0, 0];
  nodes.forEach((metals, span) => {
    for (let piece = 0; piece < pieces; piece += 1) {
      const at = span * pieces + piece;
      const found = throughPiece(metals, middle[piece] as number, 1 / (perHalf[piece] as number), primary.guess);
      if (found === undefined) continue;
      closed[at] = 1;
      terms.set(found.terms, at * TERMS);
      bound = Math.max(bound, found.error);
      steepness = Math.max(steepness, found.steepness);
    }
  });
  const floors = nodes.map(heldTerms);
  const off = Math.max(...floors.map(({ error }) => error));
  const holds = off <= MOST_ERROR;
  const held = Float64Array.from(floors.flatMap(({ powers }) => powers));
  bound = Math.max(bound, holds ? off : 0) + SEARCHED;
  return { first, pieces, middle, perHalf, closed, terms, holds, held, bound, steepness };
}

/** C that the element holds below its floor, over one span. */
function heldTerms(metals: readonly Metal[]): { readonly powers: readonly number[]; readonly error: number } {
  const known = ({ held }: Metal): number => held.at(0);
  const found = powersOf(chebyshevCoefficients(metals.filter(({ node }) => node).map(known)));
  const powers = DEGREES.map((_, at) => found[DEGREES.length - 1 - at] ?? 0);
  const error = metals.map((metal) => Math.abs(cubic(powers, 0, metal.t) / known(metal) - 1));
  return { powers, error: Math.max(...error) };
}

const cubic = (c: ArrayLike<number>, at: number, t: number): number =>
  (((c[at] as number) * t + (c[at + 1] as number)) * t + (c[at + 2] as number)) * t + (c[at + 3] as number);

/** The element at one temperature of a span: a node of the polynomial, or a place to look at. */
interface Metal {
  readonly t: number; // -1 to 1 over the span
  readonly node: boolean;
  readonly held: ReturnType<typeof heldDischarge>;
}

/** As many nodes as the metal asks for, and both ends of the span with a place between to look at. */
function nodesOf(primary: Primary, { lower, upper, moves }: Span, geometryAt: (T: number) => Geometry): Metal[] {
  const metal = (node: boolean) => (t: number) => {
    const T = (lower + upper) / 2 + (t * (upper - lower)) / 2;
    return { t, node, held: heldDischarge(primary, geometryAt(T)) };
  };
  const nodes = chebyshevPoints(moves ? DEGREES.length : 1, -1, 1).map(metal(true));
  return moves ? [...nodes, ...[-1, 0.17, 1].map(metal(false))] : nodes;
}

/** Places in a piece that are looked at: both ends, where an unseen bend shows most, and between the nodes. */
const LOOKED_AT = [-1, -0.93, -0.61, -0.2, 0.23, 0.64, 0.92, 1] as const;

interface Fit {
  readonly terms: Float64Array;
  readonly error: number;
  readonly steepness: number;
}

/** The polynomial of one piece in one span; undefined where it misses the bound, or C does not settle. */
function throughPiece(metals: readonly Metal[], middle: number, half: number, guess: number): Fit | undefined {
  const solved = (held: Metal['held'], u: number): number | undefined => {
    const found = coefficientFrom(middle + half * u, held, guess);
    return found.found ? found.x : undefined;
  };
  const nodes = metals.filter(({ node }) => node);
  const places = chebyshevPoints(DEGREES[0] + 1, -1, 1);
  const values = nodes.map(({ held }) => places.map((u) => solved(held, u)));
  if (values.some((row) => row.includes(undefined))) return undefined;
  const terms = termsOf(values as number[][]);
  let error = 0;
  for (const { held, t } of metals) {
    for (const u of LOOKED_AT) {
      const known = solved(held, u);
      if (known === undefined) return undefined;
      error = Math.max(error, Math.abs(polynomial(terms, 0, u, t) / known - 1));
    }
    if (!(error <= MOST_ERROR)) return undefined;
  }
  const [from, to] = [polynomial(terms, 0, -1, 0), polynomial(terms, 0, 1, 0)];
  const steepness = Math.abs(Math.log(to / from) / Math.log((middle + half) / (middle - half)));
  return { terms, error, steepness };
}

/** Coefficients in the order of `polynomial` from values at the nodes, a row for each temperature. */
function termsOf(values: readonly (readonly number[])[]): Float64Array {
  const table = chebyshevTable(values).map((row, j) => row.map((c, i) => (i <= (DEGREES[j] as number) ? c : 0)));
  const byPowers = turned(turned(table.map(powersOf)).map(powersOf)); // power of the temperature, then of X
  const terms = DEGREES.flatMap((_, at) => {
    const j = DEGREES.length - 1 - at;
    const degree = DEGREES[j] as number;
    return Array.from({ length: degree + 1 }, (__, i) => byPowers[j]?.[degree - i] ?? 0);
  });
  return Float64Array.from(terms);
}

/** The polynomial whose coefficients start at `at`, by Horner's rule: degrees 1, 2, 4 and 6 in u for t³, t², t and 1. */
function polynomial(c: ArrayLike<number>, at: number, u: number, t: number): number {
  const cube = (c[at] as number) * u + (c[at + 1] as number);
  const square = ((c[at + 2] as number) * u + (c[at + 3] as number)) * u + (c[at + 4] as number);
  const line = quartic(c, at + 5, u);
  const still = sextic(c, at + 10, u);
  return ((cube * t + square) * t + line) * t + still;
}

const sextic = (c: ArrayLike<number>, at: number, u: number): number =>
  (quartic(c, at, u) * u + (c[at + 5] as number)) * u + (c[at + 6] as number);

const quartic = (c: ArrayLike<number>, at: number, u: number): number =>
  ((((c[at] as number) * u + (c[at + 1] as number)) * u + (c[at + 2] as number)) * u + (c[at + 3] as number)) * u +
  (c[at + 4] as number);

/**
 * C at X in a span, with t from -1 to 1 in it; 0 where the approximant does not reach, and C is to be searched for.
 * `still` leaves out the powers of the temperature, where the metal does not move.
 */
export function coefficientAt(of: Approximant, span: number, x: number, t: number, still: boolean): number {
  const piece = pieceOf(x) - of.first;
  if (piece < 0) return of.holds ? cubic(of.held, span * DEGREES.length, t) : 0;
  const at = span * of.pieces + piece;
  if (piece >= of.pieces || of.closed[at] !== 1) return 0;
  const u = (x - (of.middle[piece] as number)) * (of.perHalf[piece] as number);
  const from = at * TERMS;
  return still ? sextic(of.terms, from + 10, u) : polynomial(of.terms, from, u, t);
}
