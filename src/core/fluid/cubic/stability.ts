/**
 * Would a fluid split into two phases? The tangent-plane test of a cubic equation from two starts, a liquid-like and a
 * gas-like trial phase. A caution, not a proof: a cubic without interaction parameters misses the dew point by some kelvin.
 * Standard: none; Michelsen, Fluid Phase Equilib. 9 (1982) 1, with the equation of Peng and Robinson. SI.
 */
import { type CubicComponent, type CubicState, cubicPhase, cubicState, type Root } from './peng-robinson.ts';

const mostSteps = 300;
const settled = 1e-10; // change of ln W
const margin = 1e-7; // of the sum of the trial phase above 1
const alike = 1e-4; // Σ (ln W/z)² of a trial phase that has become the feed

/**
 * The sum of the trial phase, at most 1 where the mixture is stable, above 1 where a second phase would form.
 * @param z amounts of `components`; those with 0 are left out here
 * @param feed the root that the mixture itself is taken to be in; a gas beyond its dew point is told by its gas root
 * alone, and a liquid that would boil by its liquid one
 */
export function trialSum(
  components: readonly CubicComponent[],
  z: readonly number[],
  T: number,
  p: number,
  feed: Root,
): number {
  const used = components.flatMap((component, i) => ((z[i] ?? 0) > 0 ? [{ component, z: z[i] ?? 0 }] : []));
  if (used.length === 0) return 1;
  const total = used.reduce((sum, entry) => sum + entry.z, 0);
  const x = Float64Array.from(used, (entry) => entry.z / total);
  const own = used.map(({ component }) => component);
  const state = cubicState(own, T, p);
  const { lnPhi } = cubicPhase(state, x, feed);
  const lnZ = x.map(Math.log);
  const d = lnZ.map((value, i) => value + (lnPhi[i] ?? 0)); // Michelsen 1982, Eq. 15
  const lnK = own.map((component) => wilson(component, T, p));
  const starts = [-1, 1].map((sign) => lnZ.map((value, i) => value + sign * (lnK[i] ?? 0)));
  return Math.max(1, ...starts.map((start) => trialFrom(state, lnZ, d, start)));
}

/** Is the sum above 1 by more than rounding? */
export const splits = (sum: number): boolean => sum > 1 + margin;

/** ln K of Wilson's estimate, p_i = p_c exp(5.373 (1 + ω)(1 - T_c/T)) (practice, as in Michelsen 1982). */
const wilson = ({ Tc, pc, omega }: CubicComponent, T: number, p: number): number =>
  Math.log(pc / p) + 5.373 * (1 + omega) * (1 - Tc / T); // Wilson, as in Michelsen 1982

/** Successive substitution ln W_i = d_i - ln φ_i(W); the sum of W where it settles away from the feed, else 1. */
function trialFrom(state: CubicState, lnZ: Float64Array, d: Float64Array, start: Float64Array): number {
  const size = d.length;
  const lnW = Float64Array.from(start);
  const x = new Float64Array(size);
  for (let step = 0; step < mostSteps; step++) {
    fractionsOf(lnW, x);
    const { lnPhi } = cubicPhase(state, x);
    let [change, distance] = [0, 0];
    for (let i = 0; i < size; i++) {
      const next = (d[i] as number) - (lnPhi[i] as number);
      const away = next - (lnZ[i] as number);
      change = Math.max(change, Math.abs(next - (lnW[i] as number)));
      distance += away * away;
      lnW[i] = next;
    }
    if (distance < alike) return 1;
    if (change < settled) break;
  }
  return lnW.reduce((total, value) => total + Math.exp(value), 0);
}

/** Fills `x` with the fractions whose logarithms differ from `lnW` by one number; no overflow. */
function fractionsOf(lnW: Float64Array, x: Float64Array): void {
  const top = lnW.reduce((most, value) => Math.max(most, value), Number.NEGATIVE_INFINITY);
  let sum = 0;
  for (let i = 0; i < x.length; i++) sum += x[i] = Math.exp((lnW[i] as number) - top);
  for (let i = 0; i < x.length; i++) x[i] = (x[i] as number) / sum;
}
