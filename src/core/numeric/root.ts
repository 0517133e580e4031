/**
 * One root of a function that rises through zero once, inside a bracket. Knows no physics and no units.
 *
 * Newton's step with the caller's slope first, then the secant, then inverse quadratic interpolation (order 1.84), with
 * no derivative asked of the function. A step that leaves the bracket is replaced by an end or the middle, so that no
 * point outside the bracket is ever evaluated and the answer is one root, proved, or none, with the last bracket.
 */

export interface Search {
  readonly f: (x: number) => number;
  readonly lower: number;
  readonly upper: number;
  /** First guess, inside the bracket. */
  readonly start: number;
  /** Slope of f near the start; an estimate is enough, it must be positive. */
  readonly slope: number;
}

export type Root =
  | { readonly found: true; readonly x: number; readonly evaluations: number }
  /** `side`: f is negative on the whole bracket (the root lies above it), or positive (below it), or it did not settle. */
  | {
      readonly found: false;
      readonly side: 'above' | 'below' | 'unsettled';
      readonly lower: number;
      readonly upper: number;
      readonly evaluations: number;
    };

interface Point {
  readonly x: number;
  readonly y: number;
}

const MOST_EVALUATIONS = 200; // bisection alone needs about 60
/**
 * The error left after a step is the product of the errors of the points it was drawn through, each about the relative
 * size of the step taken from it, times the curvature that those points left unseen. For functions as straight as the
 * meter equations that is a hundredth or less, so that below this product nothing is left that a double could hold.
 */
const SETTLED = 1e-13;
/** A step this small, relative to x, is rounding. */
const NOISE = 4 * Number.EPSILON;
/** Slopes of neighbouring steps that differ by more than this factor do not belong to one straight piece. */
const STRAIGHT = 2;

/** Finds the root, to the last few bits of a double. Throws a defect when f answers with no number. */
export function root(search: Search): Root {
  const { lower, upper, slope } = search;
  let below: number | undefined; // the largest x at which f has been found negative
  let above: number | undefined; // the smallest x at which it has not
  let evaluations = 0;
  const evaluate = (x: number): Point => {
    const y = search.f(x);
    evaluations += 1;
    if (!Number.isFinite(y)) throw new Error(`root: expected a number at ${x}, got ${y}`);
    if (y < 0) below = x;
    else above = x;
    return { x, y };
  };
  const found = (x: number): Root => ({ found: true, x, evaluations });
  let x = search.start;
  let past: Point[] = []; // newest first
  let sizes: number[] = []; // relative sizes of the steps from them
  while (evaluations < MOST_EVALUATIONS) {
    const point = evaluate(x);
    if (point.y === 0) return found(x);
    past = [point, ...past].slice(0, 3);
    const next = x + step(past, slope);
    sizes = [Math.abs(next - x) / Math.abs(next || 1), ...sizes].slice(0, 3);
    const straight = isStraight(past, slope);
    if (straight && isSettled(sizes)) return found(next);
    if (straight && next > (below ?? lower) && next < (above ?? upper)) {
      x = next;
      continue;
    }
    const side = point.y < 0 ? 'above' : 'below'; // where the root lies from here
    const end = side === 'above' ? upper : lower;
    if ((side === 'above' ? above : below) === undefined && (x === end || evaluate(end).y < 0 === point.y < 0))
      return { found: false, side, lower, upper, evaluations };
    const [a, b] = [below ?? lower, above ?? upper];
    if (b - a <= NOISE * Math.abs(b)) return found(b);
    x = a + (b - a) / 2;
    past = [];
    sizes = [];
  }
  return { found: false, side: 'unsettled', lower: below ?? lower, upper: above ?? upper, evaluations };
}

const isSettled = (sizes: readonly number[]): boolean => {
  const left = sizes.reduce((product, size) => product * size, 1);
  return (sizes[0] ?? 1) <= NOISE || (sizes.length > 1 && left <= SETTLED);
};

/** The step from the newest point: Newton, secant or inverse quadratic, by how many points there are. */
function step([p2, p1, p0]: readonly Point[], slope: number): number {
  if (p2 === undefined) return 0;
  if (p1 === undefined || p2.y === p1.y) return -p2.y / slope;
  const r = run(p2, p1);
  if (p0 === undefined || p1.y === p0.y || p2.y === p0.y) return -p2.y * r;
  const q = run(p1, p0);
  return -p2.y * (r - (p1.y * (r - q)) / (p2.y - p0.y)); // Newton's form of the inverse parabola, at y = 0
}

/** Whether the newest two slopes agree: a small step on a curve that has just bent says nothing of the root. */
function isStraight([p2, p1, p0]: readonly Point[], slope: number): boolean {
  if (p2 === undefined || p1 === undefined) return true;
  const newest = run(p2, p1);
  const before = p0 === undefined ? 1 / slope : run(p1, p0);
  return newest > before / STRAIGHT && newest < before * STRAIGHT;
}

/** Inverse slope between two points. */
const run = (one: Point, other: Point): number => (one.x - other.x) / (one.y - other.y);
