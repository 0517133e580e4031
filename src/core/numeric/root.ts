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

/** The newest points and the sizes of the newest steps, relative to x. One record: a search leaves no litter behind. */
interface Trail {
  points: number; // how many of the three are known
  away: boolean; // halved at least once: the caller's slope, which holds near the start, proves nothing here
  x2: number; // the newest
  y2: number;
  x1: number;
  y1: number;
  x0: number;
  y0: number;
  steps: number; // how many of the three sizes are known; 1 stands for each other
  size2: number; // the newest
  size1: number;
  size0: number;
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
export function root({ f, lower, upper, start, slope }: Search): Root {
  let below: number | undefined; // the largest x at which f has been found negative
  let above: number | undefined; // the smallest x at which it has not
  let evaluations = 0;
  let x = start;
  const trail = newTrail();
  while (evaluations < MOST_EVALUATIONS) {
    const y = valueAt(f, x);
    evaluations += 1;
    if (y === 0) return { found: true, x, evaluations };
    if (y < 0) below = x;
    else above = x;
    addPoint(trail, x, y);
    const next = x + step(trail, slope);
    addSize(trail, Math.abs(next - x) / Math.abs(next || 1));
    const straight = isStraight(trail, slope);
    if (straight && isSettled(trail)) return { found: true, x: next, evaluations };
    if (straight && next > (below ?? lower) && next < (above ?? upper)) {
      x = next;
      continue;
    }
    const side = y < 0 ? 'above' : 'below'; // where the root lies from here
    const end = side === 'above' ? upper : lower;
    if ((side === 'above' ? above : below) === undefined) {
      const negative = x === end ? y < 0 : valueAt(f, end) < 0;
      if (x !== end) evaluations += 1;
      if (negative === y < 0) return { found: false, side, lower, upper, evaluations };
      if (negative) below = end;
      else above = end;
    }
    const [a, b] = [below ?? lower, above ?? upper];
    if (b - a <= NOISE * Math.abs(b)) return { found: true, x: b, evaluations };
    x = a + (b - a) / 2;
    forget(trail);
  }
  return { found: false, side: 'unsettled', lower: below ?? lower, upper: above ?? upper, evaluations };
}

function valueAt(f: (x: number) => number, x: number): number {
  const y = f(x);
  if (Number.isFinite(y)) return y;
  throw new Error(`root: expected a number at ${x}, got ${y}`);
}

const newTrail = (): Trail => ({
  points: 0,
  away: false,
  x2: 0,
  y2: 0,
  x1: 0,
  y1: 0,
  x0: 0,
  y0: 0,
  steps: 0,
  size2: 1,
  size1: 1,
  size0: 1,
});

function addPoint(trail: Trail, x: number, y: number): void {
  trail.x0 = trail.x1;
  trail.y0 = trail.y1;
  trail.x1 = trail.x2;
  trail.y1 = trail.y2;
  trail.x2 = x;
  trail.y2 = y;
  if (trail.points < 3) trail.points += 1;
}

function addSize(trail: Trail, size: number): void {
  trail.size0 = trail.size1;
  trail.size1 = trail.size2;
  trail.size2 = size;
  if (trail.steps < 3) trail.steps += 1;
}

function forget(trail: Trail): void {
  trail.points = 0;
  trail.away = true;
  trail.steps = 0;
  trail.size2 = 1;
  trail.size1 = 1;
}

const isSettled = ({ points, away, steps, size2, size1, size0 }: Trail): boolean =>
  (size2 <= NOISE && (points > 1 || !away)) || (steps > 1 && size2 * size1 * size0 <= SETTLED);

/** The step from the newest point: Newton, secant or inverse quadratic, by how many points there are. */
function step({ points, x2, y2, x1, y1, x0, y0 }: Trail, slope: number): number {
  if (points < 2 || y2 === y1) return -y2 / slope;
  const r = (x2 - x1) / (y2 - y1);
  if (points < 3 || y1 === y0 || y2 === y0) return -y2 * r;
  const q = (x1 - x0) / (y1 - y0);
  return -y2 * (r - (y1 * (r - q)) / (y2 - y0)); // Newton's form of the inverse parabola, at y = 0
}

/** Whether the newest two slopes agree: a small step on a curve that has just bent says nothing of the root. */
function isStraight({ points, x2, y2, x1, y1, x0, y0 }: Trail, slope: number): boolean {
  if (points < 2) return true;
  const newest = (x2 - x1) / (y2 - y1); // inverse slopes
  const before = points < 3 ? 1 / slope : (x1 - x0) / (y1 - y0);
  return newest > before / STRAIGHT && newest < before * STRAIGHT;
}
