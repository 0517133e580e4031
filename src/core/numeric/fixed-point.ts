/**
 * The point x = g(x) of a function that hardly moves. Knows no physics and no units.
 *
 * The steps of root.ts for x - g(x), Newton with the slope 1, secant, inverse quadratic, written out for the few points
 * they need, at a third of the cost. Nothing is proved here: where the steps do not settle the caller takes root.ts.
 */

export interface FixedPoint {
  readonly x: number;
  readonly evaluations: number;
}

/** As in root.ts: below this product of steps nothing is left that a double could hold; a step this small is rounding. */
const SETTLED = 1e-13;
const NOISE = 4 * Number.EPSILON;
/** Neighbouring slopes of x - g(x) that differ by more than this factor do not belong to one straight piece. */
const STRAIGHT = 2;

const agree = (slope: number, before: number): boolean => slope > before / STRAIGHT && slope < before * STRAIGHT;

/** The fixed point near `start`, to the last few bits, after at most four evaluations; undefined where they do not settle. */
export function fixedPoint(g: (x: number) => number, start: number): FixedPoint | undefined {
  const x1 = start;
  const y1 = x1 - g(x1);
  const x2 = x1 - y1;
  const size1 = Math.abs(y1 / x2);
  if (size1 <= NOISE) return { x: x2, evaluations: 1 };
  const y2 = x2 - g(x2);
  if (y2 === 0) return { x: x2, evaluations: 2 };
  const q = (x2 - x1) / (y2 - y1); // inverse slopes
  const x3 = x2 - y2 * q; // secant
  const size2 = Math.abs((x3 - x2) / x3);
  if (!agree(q, 1)) return undefined;
  if (size2 <= NOISE || size2 * size1 <= SETTLED) return { x: x3, evaluations: 2 };
  const y3 = x3 - g(x3);
  if (y3 === 0) return { x: x3, evaluations: 3 };
  const r = (x3 - x2) / (y3 - y2);
  const x4 = x3 - y3 * (r - (y2 * (r - q)) / (y3 - y1)); // Newton's form of the inverse parabola, at y = 0
  const size3 = Math.abs((x4 - x3) / x4);
  if (!agree(r, q)) return undefined;
  if (size3 <= NOISE || size3 * size2 * size1 <= SETTLED) return { x: x4, evaluations: 3 };
  const y4 = x4 - g(x4);
  if (y4 === 0) return { x: x4, evaluations: 4 };
  const s = (x4 - x3) / (y4 - y3);
  const x5 = x4 - y4 * (s - (y3 * (s - r)) / (y4 - y2));
  const size4 = Math.abs((x5 - x4) / x5);
  return agree(s, r) && (size4 <= NOISE || size4 * size3 * size2 <= SETTLED) ? { x: x5, evaluations: 4 } : undefined;
}
