/**
 * Would a gas split into two phases? The tangent-plane test of a cubic equation from two starts, a liquid-like and a
 * vapour-like trial phase. A caution, not a proof: a cubic without interaction parameters misses the dew point by some kelvin.
 * Standard: none; Michelsen, Fluid Phase Equilib. 9 (1982) 1, with the equation of Peng and Robinson. SI.
 */
import { type CubicComponent, type CubicState, cubicPhase, cubicState } from './peng-robinson.ts';

const mostSteps = 300;
const settled = 1e-10; // change of ln W
const margin = 1e-7; // of the sum of the trial phase above 1
const alike = 1e-4; // Σ (ln W/z)² of a trial phase that has become the feed

/**
 * The sum of the trial phase, at most 1 where the mixture is stable, above 1 where a second phase would form.
 * @param z mole fractions of `components`; those with 0 are left out here
 */
export function trialSum(components: readonly CubicComponent[], z: readonly number[], T: number, p: number): number {
  const used = components.flatMap((component, i) => ((z[i] ?? 0) > 0 ? [{ component, z: z[i] ?? 0 }] : []));
  const total = used.reduce((sum, entry) => sum + entry.z, 0);
  if (used.length === 0) return 1;
  const feed = used.map((entry) => entry.z / total);
  const state = cubicState(
    used.map(({ component }) => component),
    T,
    p,
  );
  const { lnPhi } = cubicPhase(state, feed);
  const d = feed.map((zi, i) => Math.log(zi) + (lnPhi[i] ?? 0)); // Michelsen 1982, Eq. 15
  const lnK = used.map(({ component }) => wilson(component, T, p));
  const starts = [-1, 1].map((sign) => feed.map((zi, i) => Math.log(zi) + sign * (lnK[i] ?? 0)));
  return Math.max(1, ...starts.map((start) => trialFrom(state, feed, d, start)));
}

/** Is the sum above 1 by more than rounding? */
export const splits = (sum: number): boolean => sum > 1 + margin;

/** ln K of Wilson's estimate, p_i = p_c exp(5.373 (1 + ω)(1 - T_c/T)) (practice, as in Michelsen 1982). */
const wilson = ({ Tc, pc, omega }: CubicComponent, T: number, p: number): number =>
  Math.log(pc / p) + 5.373 * (1 + omega) * (1 - Tc / T);

/** Successive substitution ln W_i = d_i - ln φ_i(W); the sum of W where it settles away from the feed, else 1. */
function trialFrom(state: CubicState, feed: readonly number[], d: readonly number[], start: readonly number[]): number {
  let lnW = start;
  for (let step = 0; step < mostSteps; step++) {
    const top = Math.max(...lnW); // only the ratios matter here: no overflow
    const scaled = lnW.map((value) => Math.exp(value - top));
    const sum = scaled.reduce((total, value) => total + value, 0);
    const { lnPhi } = cubicPhase(
      state,
      scaled.map((value) => value / sum),
    );
    const next = d.map((di, i) => di - (lnPhi[i] ?? 0));
    const change = Math.max(...next.map((value, i) => Math.abs(value - (lnW[i] ?? 0))));
    lnW = next;
    const distance = lnW.reduce((total, value, i) => total + (value - Math.log(feed[i] ?? 1)) ** 2, 0);
    if (distance < alike) return 1;
    if (change < settled) break;
  }
  return lnW.reduce((total, value) => total + Math.exp(value), 0);
}
