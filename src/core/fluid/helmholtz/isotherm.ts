/**
 * A mixture along one isotherm: the powers of temperature are formed once, and a pressure costs a polynomial for each
 * shape of exponential.
 * Standard: none of its own, the equation of the mixture (ISO 20765-2:2015, AGA Report No. 8, Part 1). Symbols: α reduced
 * residual Helmholtz energy, δ = ρ/ρ_r, τ = T_r/T; SI, densities in mol/m3.
 */
import type { Mixture } from './mixture.ts';
import { figuresPerShape, type Gathered } from './slots.ts';

/** A mixture at one temperature. */
export interface Isotherm {
  readonly mixture: Mixture;
  readonly T: number; // K
  readonly tau: number;
  readonly RT: number; // J/mol
  /** Σ n τ^t of each shape and power of δ. */
  readonly coefficients: Float64Array;
}

/** The isotherm of a mixture at T, K: the work that all its densities share. */
export const isothermOf = (mixture: Mixture, T: number): Isotherm => {
  const tau = mixture.Tr / T;
  return { mixture, T, tau, RT: mixture.R * T, coefficients: coefficientsOf(mixture, tau, 0) };
};

/** Coefficients of α_r (order 0), of τ ∂α_r/∂τ (order 1) or of τ² ∂²α_r/∂τ² (order 2). */
export function coefficientsOf({ set, slots, factors }: Mixture, tau: number, order: 0 | 1 | 2): Float64Array {
  const logarithm = Math.log(tau);
  const coefficients = new Float64Array(set.top.length * set.columns);
  let t = 0;
  let power = 1;
  for (let k = 0; k < slots.length; k++) {
    const slot = slots[k] as number;
    const own = set.power[slot] as number;
    if (own !== t) {
      t = own;
      power = Math.exp(t * logarithm);
    }
    const lowered = order === 0 ? power : order === 1 ? t * power : t * (t - 1) * power;
    const place = set.place[slot] as number;
    coefficients[place] = (coefficients[place] as number) + (factors[k] as number) * lowered;
  }
  return coefficients;
}

/** α, δ ∂α/∂δ and δ² ∂²α/∂δ² of a table of coefficients at δ. */
export interface Expanded {
  readonly a: number;
  readonly a1: number;
  readonly a2: number;
}

/** Sums a table of coefficients: for each shape exp(h) Σ A_d δ^d with u = δ h' and v = δ² h''. */
export function expand({ set, shapes }: Gathered, coefficients: Float64Array, delta: number): Expanded {
  const { columns, figures, top } = set;
  let a = 0;
  let a1 = 0;
  let a2 = 0;
  for (let k = 0; k < shapes.length; k++) {
    const shape = shapes[k] as number;
    let P = 0; // Σ A_d δ^(d-1), then its two derivatives
    let P1 = 0;
    let P2 = 0;
    for (let power = top[shape] as number; power > 0; power--) {
      P2 = P2 * delta + P1;
      P1 = P1 * delta + P;
      P = P * delta + (coefficients[shape * columns + power - 1] as number); // the table starts at δ^1
    }
    P2 = 2 * delta * delta * (P2 * delta + P1); // Σ d (d-1) A_d δ^d
    P1 = delta * (P1 * delta + P); // Σ d A_d δ^d
    P *= delta; // Σ A_d δ^d
    const own = shape * figuresPerShape;
    const order = figures[own] as number;
    let h = 0;
    let u = 0;
    let v = 0;
    if (order > 0) {
      h = -raised(delta, order);
      u = order * h;
      v = (order - 1) * u;
    } else {
      const eta = figures[own + 1] as number;
      const beta = figures[own + 3] as number;
      const away = delta - (figures[own + 2] as number);
      h = -eta * away * away - beta * (delta - (figures[own + 4] as number));
      u = -delta * (2 * eta * away + beta);
      v = -2 * eta * delta * delta;
    }
    const g = h === 0 ? 1 : Math.exp(h);
    a += g * P;
    a1 += g * (P1 + u * P);
    a2 += g * (P2 + 2 * u * P1 + (u * u + v) * P);
  }
  return { a, a1, a2 };
}

function raised(delta: number, order: number): number {
  let power = delta;
  for (let k = 1; k < order; k++) power *= delta;
  return power;
}

/** Pressure and its slope with the molar density: p = ρ R T (1 + α_01), ∂p/∂ρ = R T (1 + 2 α_01 + α_02). Pa, J/mol. */
export function pressureAt(isotherm: Isotherm, rho: number): { readonly p: number; readonly slope: number } {
  const { mixture, RT, coefficients } = isotherm;
  const { a1, a2 } = expand(mixture, coefficients, rho / mixture.rhoR);
  return { p: rho * RT * (1 + a1), slope: RT * (1 + 2 * a1 + a2) };
}
