/**
 * What a rule makes of a known profile: the mean of its points over the true mean, less 1.
 * Standard: none; the power law u = y^(1/n) in a circle, the product of two such in a rectangle. Symbols: y from the nearest
 * wall over half the length of the line.
 */
import { type Layout, type Line, positionsOf } from './layout.ts';
import { meanOverCentre } from './profile.ts';

/** Relative error of the mean on a power-law profile of exponent n; without a unit. */
export function biasOnPowerLaw(layout: Layout, n: number): number {
  const velocity = (at: number): number => (2 * Math.min(at, 1 - at)) ** (1 / n);
  const mean = layout.lines.reduce((sum, line) => sum + lineMean(line, velocity), 0);
  const weights = positionsOf(layout).reduce((sum, { weight }) => sum + weight, 0);
  const rectangular = layout.lines.some(({ across }) => across !== undefined);
  const truth = rectangular ? (n / (n + 1)) ** 2 : meanOverCentre({ kind: 'power', at: 'centre', exponent: n });
  return mean / weights / truth - 1;
}

const lineMean = ({ across, points }: Line, velocity: (at: number) => number): number =>
  points.reduce((sum, { at, weight }) => sum + weight * velocity(at), 0) *
  (across === undefined ? 1 : velocity(across));
