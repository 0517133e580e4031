/** Velocity of approach factor. */

/**
 * E = 1/sqrt(1 - beta^4), for a diameter ratio 0 <= beta < 1.
 * Throws a defect outside. Source: ISO 5167-1, Eq (1).
 */
export const approachFactor = (ratio: number): number => {
  if (!(ratio >= 0 && ratio < 1)) throw new RangeError(`approach factor: expected 0 <= beta < 1, got ${ratio}`);
  const square = ratio * ratio;
  return 1 / Math.sqrt(1 - square * square); // ISO 5167-1, Formula (1)
};
