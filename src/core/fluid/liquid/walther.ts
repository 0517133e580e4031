/**
 * Viscosity along the temperature: the line of an oil, or the line of any liquid over 1/T.
 * Standard: ASTM D341 in its simple form (Walther 1931), for more than 2 mm2/s. Symbols: W = log log(ν + 0.7), ν in mm2/s,
 * T in K.
 */
import { interpolate, type Point } from '../../numeric/interpolate.ts';

/** Below it the simple form loses its footing, m2/s. */
export const thin = 2e-6;

/** W of a kinematic viscosity in m2/s; undefined where there is none, at 0.3 mm2/s and less. */
export function waltherOf(nu: number): number | undefined {
  const inner = Math.log10(1e6 * nu + 0.7); // D341, Eq. of the simple form
  return inner > 0 ? Math.log10(inner) : undefined;
}

/** Kinematic viscosity of W, m2/s. */
export const viscosityOf = (W: number): number => 1e-6 * (10 ** (10 ** W) - 0.7); // D341, the simple form

/** Kinematic viscosity in m2/s at T, W a straight line over log T between the points (T, W). */
export const walther = (points: readonly Point[], T: number): number =>
  viscosityOf(
    interpolate(
      points.map(([at, W]) => [Math.log10(at), W] as const),
      Math.log10(T),
    ),
  );

/** Viscosity at T, ln μ a straight line over 1/T between the points (T, μ). Andrade 1934. */
export const andrade = (points: readonly Point[], T: number): number =>
  Math.exp(
    interpolate(
      points.map(([at, mu]) => [-1 / at, Math.log(mu)] as const), // rises with T
      -1 / T,
    ),
  );
