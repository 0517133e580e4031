/** Whether a figure stands between bounds. */

/** A bound that does not exist is absent. */
export interface Bounds {
  readonly min?: number;
  readonly max?: number;
}

/** Rounding of a quotient such as d/D, relative to the bound. */
const ROUNDING = 1e-12;

/** Whether a figure is inside; one that stands on its bound is, whatever rounding did to it, and NaN never is. */
export function isInside(value: number, { min, max }: Bounds): boolean {
  const above = min === undefined || value >= min - ROUNDING * Math.abs(min);
  const below = max === undefined || value <= max + ROUNDING * Math.abs(max);
  return above && below && !Number.isNaN(value);
}
