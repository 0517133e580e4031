/**
 * The surface at hand and its box. A log is read once, so that nobody knows beforehand which pressures and temperatures
 * will come: the box begins around the first row and grows when a row leaves it, a limited number of times. Row by row
 * in their order, so that the answer does not depend on how many are worked on at once.
 */
import type { Standing } from '../run/standing.ts';
import { type Kernel, type KernelBounds, kernelOf } from './kernel.ts';
import type { Box } from './surface.ts';

export interface Covering {
  readonly stands: Standing;
  /** Whether the log has no column of it, so that it never moves. */
  readonly fixed: { readonly pressure: boolean; readonly temperature: boolean };
  /** Absent while no row was covered. */
  kernel?: Kernel;
  box: Box;
  /** The largest of those of every surface so far. */
  bounds?: KernelBounds;
  /** Called before a surface is built, which takes a while. */
  readonly announce: () => void;
  /** Surfaces that may still be built. */
  left: number;
  /** The first of the margins still worth trying: beside a border of the fluid the wider one fails each time. */
  margin: number;
  /** Why there was none, where one was wanted. */
  why?: string;
}

const MOST_SURFACES = 16;
/** What a box has beyond the rows that it is built for: of its width, and at least so much of p and so many K. */
const MARGINS = [
  { width: 1, pressure: 0.1, temperature: 10 }, // tried first
  { width: 0.1, pressure: 0.01, temperature: 0.5 }, // beside a border of the fluid
] as const;

type Side = Box['pressure'];

const NOWHERE: Side = [Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY];

export const openCovering = (
  stands: Standing,
  fixed: Covering['fixed'],
  exact: boolean,
  announce: Covering['announce'] = () => undefined,
): Covering => ({
  stands,
  fixed,
  announce,
  box: { pressure: NOWHERE, temperature: NOWHERE },
  left: exact ? 0 : MOST_SURFACES,
  margin: 0,
});

/** Whether the surface at hand covers a state. */
export const covers = ({ box: { pressure, temperature } }: Covering, p: number, T: number): boolean =>
  p >= pressure[0] && p <= pressure[1] && T >= temperature[0] && T <= temperature[1];

/** Builds a surface that covers a state too, where that is still allowed and works; else the one at hand stays. */
export function widen(covering: Covering, p: number, T: number): void {
  const { stands, box, fixed } = covering;
  for (const [at, { width, pressure, temperature }] of MARGINS.entries()) {
    if (at < covering.margin) continue;
    if (covering.left === 0) return;
    covering.left -= 1;
    covering.announce();
    const wider = {
      pressure: fixed.pressure ? ([p, p] as const) : widened(box.pressure, p, width, pressure * p),
      temperature: fixed.temperature ? ([T, T] as const) : widened(box.temperature, T, width, temperature),
    };
    const kernel = kernelOf(stands, wider);
    if (kernel.bounds !== undefined) {
      covering.kernel = kernel;
      covering.bounds = covering.bounds === undefined ? kernel.bounds : largest(covering.bounds, kernel.bounds);
      covering.box = wider;
      covering.margin = at;
      return;
    }
    covering.why = kernel.why ?? 'not-smooth';
    if (kernel.why === 'downstream-temperature') covering.left = 0;
  }
}

const largest = (one: KernelBounds, other: KernelBounds): KernelBounds => ({
  density: Math.max(one.density, other.density),
  viscosity: Math.max(one.viscosity, other.viscosity),
  isentropicExponent: Math.max(one.isentropicExponent, other.isentropicExponent),
  coefficient: Math.max(one.coefficient, other.coefficient),
  epsilon: Math.max(one.epsilon, other.epsilon),
  massFlow: Math.max(one.massFlow, other.massFlow),
});

/** The side with a figure, and with a margin where the figure lies beyond it. */
function widened([lower, upper]: Side, figure: number, share: number, least: number): Side {
  if (figure >= lower && figure <= upper) return [lower, upper];
  const [from, to] = [Math.min(lower, figure), Math.max(upper, figure)];
  const margin = Math.max(least, share * (to - from));
  const below = figure < lower ? Math.max(from - margin, from / 2) : from;
  return [below, figure > upper ? to + margin : to];
}
