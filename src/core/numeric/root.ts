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

const MOST_EVALUATIONS = 200; // bisection alone needs about 60
/**
 * The error left after a step is the product of the errors of the points it was drawn through, each about the relative
 * size of the step taken from it, times the curvature that those points left unseen. For functions as straight as the
 * meter equations that is a hundredth or less, so that below this product nothing is left that a double could hold.
 */
const SETTLED = 1e-13;
/** A step this small, relative to x, is rounding. */
const NOISE = 4 * Number.EPSILON;

/** Finds the root, to the last few bits of a double. Throws a defect when f answers with no number. */
export function root({ f, lower, upper, start, slope }: Search): Root {
  let [a, b] = [lower, upper]; // f(a) < 0 < f(b), once they have been evaluated
  let evaluations = 0;
  const past: { x: number; y: number }[] = []; // newest first
  const at = (x: number): number => {
    const y = f(x);
    evaluations += 1;
    if (!Number.isFinite(y)) throw new Error(`root: expected a number at ${x}, got ${y}`);
    if (y < 0) a = x;
    else b = x;
    return y;
  };
  let x = start;
  let sizes: number[] = []; // relative sizes of the steps from the points in `past`, newest first
  while (evaluations < MOST_EVALUATIONS) {
    const y = at(x);
    if (y === 0) return { found: true, x, evaluations };
    past.unshift({ x, y });
    past.length = Math.min(past.length, 3);
    let next = x + step(past, slope);
    if (Math.abs(next - x) <= NOISE * Math.abs(x)) return { found: true, x: next, evaluations };
    if (!(next > a && next < b)) {
      const end = y < 0 ? b : a;
      const unseen = y < 0 ? b === upper : a === lower;
      if (unseen) {
        const edge = at(end);
        if (edge === 0) return { found: true, x: end, evaluations };
        if (edge < 0 === y < 0) return { found: false, side: y < 0 ? 'above' : 'below', lower, upper, evaluations };
      }
      next = a + (b - a) / 2;
      past.length = 1; // the curve bent away: interpolate afresh from here
      sizes = [];
    }
    const size = Math.abs(next - x) / Math.abs(next || 1);
    sizes = [size, ...sizes].slice(0, 3);
    const left = sizes.reduce((product, one) => product * one, 1);
    if (sizes.length > 1 && left <= SETTLED) return { found: true, x: next, evaluations };
    x = next;
  }
  return { found: false, side: 'unsettled', lower: a, upper: b, evaluations };
}

/** The step from the newest point: Newton, secant or inverse quadratic, by how many points there are. */
function step(past: readonly { readonly x: number; readonly y: number }[], slope: number): number {
  const [p2, p1, p0] = past;
  if (p2 === undefined) return 0;
  if (p1 === undefined || p2.y === p1.y) return -p2.y / slope;
  const r = (p2.x - p1.x) / (p2.y - p1.y);
  if (p0 === undefined || p1.y === p0.y || p2.y === p0.y) return -p2.y * r;
  const q = (p1.x - p0.x) / (p1.y - p0.y);
  return -p2.y * (r - (p1.y * (r - q)) / (p2.y - p0.y)); // Newton's form of the inverse parabola, at y = 0
}
