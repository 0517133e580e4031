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

/** The newest three points, newest first; `known` says how many there are. One record, so that a search makes no litter. */
interface Trail {
  known: number;
  x2: number;
  y2: number;
  x1: number;
  y1: number;
  x0: number;
  y0: number;
}

/** Finds the root, to the last few bits of a double. Throws a defect when f answers with no number. */
export function root({ f, lower, upper, start, slope }: Search): Root {
  let [a, b] = [lower, upper]; // f(a) < 0 < f(b), once they have been evaluated
  let evaluations = 0;
  const trail: Trail = { known: 0, x2: 0, y2: 0, x1: 0, y1: 0, x0: 0, y0: 0 };
  let [size1, size0] = [1, 1]; // relative sizes of the steps before the next one; 1 where there was none
  let x = start;
  while (evaluations < MOST_EVALUATIONS) {
    const y = valueAt(f, x);
    evaluations += 1;
    if (y === 0) return { found: true, x, evaluations };
    if (y < 0) a = x;
    else b = x;
    follow(trail, x, y);
    let next = x + step(trail, slope);
    if (Math.abs(next - x) <= NOISE * Math.abs(x)) return { found: true, x: next, evaluations };
    if (!(next > a && next < b)) {
      const end = y < 0 ? b : a;
      if (y < 0 ? b === upper : a === lower) {
        const edge = valueAt(f, end);
        evaluations += 1;
        if (edge === 0) return { found: true, x: end, evaluations };
        if (edge < 0 === y < 0) return { found: false, side: y < 0 ? 'above' : 'below', lower, upper, evaluations };
      }
      next = a + (b - a) / 2;
      trail.known = 1; // the curve bent away: interpolate afresh from here
      [size1, size0] = [1, 1];
    }
    const size = Math.abs(next - x) / Math.abs(next || 1);
    if (size1 !== 1 && size * size1 * size0 <= SETTLED) return { found: true, x: next, evaluations };
    [size0, size1] = [size1, size];
    x = next;
  }
  return { found: false, side: 'unsettled', lower: a, upper: b, evaluations };
}

function valueAt(f: (x: number) => number, x: number): number {
  const y = f(x);
  if (Number.isFinite(y)) return y;
  throw new Error(`root: expected a number at ${x}, got ${y}`);
}

function follow(trail: Trail, x: number, y: number): void {
  trail.x0 = trail.x1;
  trail.y0 = trail.y1;
  trail.x1 = trail.x2;
  trail.y1 = trail.y2;
  trail.x2 = x;
  trail.y2 = y;
  trail.known = Math.min(trail.known + 1, 3);
}

/** The step from the newest point: Newton, secant or inverse quadratic, by how many points there are. */
function step({ known, x2, y2, x1, y1, x0, y0 }: Trail, slope: number): number {
  if (known < 2 || y2 === y1) return -y2 / slope;
  const r = (x2 - x1) / (y2 - y1);
  if (known < 3 || y1 === y0 || y2 === y0) return -y2 * r;
  const q = (x1 - x0) / (y1 - y0);
  return -y2 * (r - (y1 * (r - q)) / (y2 - y0)); // Newton's form of the inverse parabola, at y = 0
}
