/**
 * Fixed yardsticks: the textbook way, written out plainly. Nobody makes these faster, or the ratios of different days
 * can no longer be compared. Orifice plate alone; ISO 5167-1:2003, Annex A, by plain substitution.
 */

export interface Plate {
  readonly D: number; // m
  readonly d: number; // m
  readonly L1: number; // distance of the upstream tapping over D
  readonly L2: number; // distance of the downstream tapping over D
  readonly p1: number; // Pa
  readonly rho: number; // kg/m3
  readonly mu: number; // Pa.s
  readonly kappa: number; // 0 for a liquid
}

/** Relative change at which the substitution ends. */
const PRECISION = 1e-12;
const MOST_TURNS = 100;

/** How often C or the expansibility was evaluated in the last call. */
export const count = { evaluations: 0 };

/** C of ISO 5167-2:2022, Formula (4), term by term. */
export function coefficient({ D, L1, L2 }: Plate, beta: number, Re: number): number {
  count.evaluations += 1;
  const A = ((19000 * beta) / Re) ** 0.8;
  const M2 = (2 * L2) / (1 - beta);
  let C =
    0.5961 +
    0.0261 * beta ** 2 -
    0.216 * beta ** 8 +
    0.000521 * ((1e6 * beta) / Re) ** 0.7 +
    (0.0188 + 0.0063 * A) * beta ** 3.5 * (1e6 / Re) ** 0.3 +
    ((0.043 + 0.08 * Math.exp(-10 * L1) - 0.123 * Math.exp(-7 * L1)) * (1 - 0.11 * A) * beta ** 4) / (1 - beta ** 4) -
    0.031 * (M2 - 0.8 * M2 ** 1.1) * beta ** 1.3;
  if (D < 0.07112) C += 0.011 * (0.75 - beta) * (2.8 - D / 0.0254);
  return C;
}

/** Expansibility factor of ISO 5167-2:2022, Formula (5). */
export function expansibility({ p1, kappa }: Plate, beta: number, dp: number): number {
  if (kappa === 0) return 1;
  const slope = 0.351 + 0.256 * beta ** 4 + 0.93 * beta ** 8;
  return 1 - slope * (1 - ((p1 - dp) / p1) ** (1 / kappa));
}

/** Flow from differential, kg/s: C, Re and the flow in turn until nothing moves. */
export function flow(plate: Plate, dp: number): number {
  const { D, d, rho, mu } = plate;
  const beta = d / D;
  const epsilon = expansibility(plate, beta, dp);
  let q = 0;
  let C = 0.606;
  for (let turn = 0; turn < MOST_TURNS; turn += 1) {
    const area = (Math.PI / 4) * d ** 2;
    const next = (C / Math.sqrt(1 - beta ** 4)) * epsilon * area * Math.sqrt(2 * dp * rho);
    const moved = Math.abs(next - q);
    q = next;
    if (moved <= PRECISION * q) break;
    C = coefficient(plate, beta, (4 * q) / (Math.PI * mu * D));
  }
  return q;
}

/** Differential from flow, Pa: the expansibility and the differential in turn. */
export function differential(plate: Plate, q: number): number {
  const { D, d, rho, mu, p1 } = plate;
  const beta = d / D;
  const C = coefficient(plate, beta, (4 * q) / (Math.PI * mu * D));
  const area = (Math.PI / 4) * d ** 2;
  const alpha = (C / Math.sqrt(1 - beta ** 4)) * area;
  let dp = 0;
  let epsilon = 1;
  for (let turn = 0; turn < MOST_TURNS; turn += 1) {
    const next = Math.min((q / (alpha * epsilon)) ** 2 / (2 * rho), p1);
    const moved = Math.abs(next - dp);
    dp = next;
    if (moved <= PRECISION * dp) break;
    count.evaluations += 1;
    epsilon = expansibility(plate, beta, dp);
  }
  return dp;
}

/** Diameter ratio from flow and differential: C, the expansibility and the ratio in turn. */
export function ratio(plate: Plate, q: number, dp: number): number {
  const { D, rho, mu } = plate;
  const Re = (4 * q) / (Math.PI * mu * D);
  const A2 = q / ((Math.PI / 4) * D ** 2 * Math.sqrt(2 * dp * rho)); // C eps beta2/sqrt(1 - beta4)
  let beta = 0;
  let C = 0.606;
  let epsilon = plate.kappa === 0 ? 1 : 0.97;
  for (let turn = 0; turn < MOST_TURNS; turn += 1) {
    const X = A2 / (C * epsilon);
    const next = (X ** 2 / (1 + X ** 2)) ** 0.25;
    const moved = Math.abs(next - beta);
    beta = next;
    if (moved <= PRECISION * beta) break;
    C = coefficient(plate, beta, Re);
    epsilon = expansibility(plate, beta, dp);
  }
  return beta;
}

/** The least that a row of a log can cost: one root and one product, from column to column. */
export function rootLoop(differential: Float64Array, factor: number, into: Float64Array, count: number): void {
  for (let row = 0; row < count; row += 1) into[row] = factor * Math.sqrt(differential[row] as number);
}
