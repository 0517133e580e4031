/**
 * Viscosity of pure gases by their reference correlations: nitrogen, oxygen, argon and air, carbon dioxide, hydrogen,
 * ethane, propane. Standard: none; the papers named in pure.table.ts. Symbols: those of the papers; T in K, molar
 * density rho in mol/dm3, answers in uPa.s.
 */
import { molarGasConstant } from '../../quantity/constants.ts';
import {
  ethane as c2h6,
  propane as c3h8,
  carbonDioxide as co2,
  collision,
  hydrogen as h2,
  initialDensity,
  type SimpleFluid,
} from './pure.table.ts';

/** Viscosity in uPa.s at T, K, and molar density, mol/dm3. */
export type Correlation = (T: number, rho: number) => number;

const sum = <Term>(terms: readonly Term[], of: (term: Term, at: number) => number): number =>
  terms.reduce((total, term, at) => total + of(term, at), 0);

/** Lemmon and Jacobsen 2004: dilute gas and residual. */
export const simpleFluid =
  ({ M, sigma, epsilon, Tc, rhoc, terms }: SimpleFluid): Correlation =>
  (T, rho) => {
    const lnTstar = Math.log(T / epsilon);
    const Omega = Math.exp(sum(collision, (b, i) => b * lnTstar ** i)); // collision integral
    const eta0 = (0.0266958 * Math.sqrt(M * T)) / (sigma ** 2 * Omega); // dilute gas
    const [tau, delta] = [Tc / T, rho / rhoc];
    return (
      eta0 + sum(terms, ([N, t, d, l]) => N * tau ** t * delta ** d * (l === 0 ? 1 : Math.exp(-(delta ** l)))) // residual
    );
  };

const NA = 6.02214076e23; // 1/mol, SI Brochure, 9th edition

/** The reduced second viscosity virial coefficient times N_A sigma^3, dm3/mol. Vogel and others 1998. */
const initialSlope = (sigma: number, Tstar: number): number =>
  NA * (sigma * 1e-9) ** 3 * 1e3 * sum(initialDensity, ([b, t]) => b * Tstar ** t);

/** Laesecke and Muzny 2017: dilute gas, initial density dependence, residual. */
export const carbonDioxide: Correlation = (T, rho) => {
  const [a0, a1, a2, a3, a4, a5, a6] = co2.a;
  const [T6, T3] = [T ** (1 / 6), T ** (1 / 3)];
  const lower = a0 + a1 * T6 + a2 * Math.exp(a3 * T3) + (a4 + a5 * T3) / Math.exp(T3) + a6 * Math.sqrt(T);
  const eta0 = (1005.5 * Math.sqrt(T)) / lower; // dilute gas
  const [Tt, rhot, M] = [216.592, 1178.53, 0.0440098]; // K, kg/m3 and kg/mol: triple point of the liquid
  const etat = (rhot ** (2 / 3) * Math.sqrt(molarGasConstant.codata2002 * Tt)) / (M ** (1 / 6) * 84446887.43579945); // Pa.s
  const [Tr, rr] = [T / Tt, (rho * 1e3 * M) / rhot];
  const residual = etat * (co2.c1 * Tr * rr ** 3 + (rr ** 2 + rr ** co2.gamma) / (Tr - co2.c2)); // residual
  return eta0 * (1 + initialSlope(co2.sigma, T / co2.epsilon) * rho) + 1e6 * residual;
};

/** Muzny, Huber and Kazakov 2013: dilute gas, initial density dependence, residual. */
export const hydrogen: Correlation = (T, rho) => {
  const Tstar = T / h2.epsilon;
  const S = Math.exp(sum(h2.a, (a, i) => a * Math.log(Tstar) ** i));
  const eta0 = (0.021357 * Math.sqrt(h2.M * T)) / (h2.sigma ** 2 * S); // dilute gas
  const slope = NA * (h2.sigma * 1e-9) ** 3 * 1e3 * sum(h2.b, (b, i) => b / Tstar ** i);
  const [c1, c2, c3, c4, c5, c6] = h2.c;
  const [Tr, rr] = [T / 33.145, rho * h2.M * 0.011]; // critical temperature; density over 90.9 kg/m3
  const power = c2 * Tr + c3 / Tr + (c4 * rr ** 2) / (c5 + Tr) + c6 * rr ** 6; // exponent of the residual
  return eta0 * (1 + slope * rho) + 1e6 * c1 * rr ** 2 * Math.exp(power);
};

/** Friend, Ingham and Ely 1991: dilute gas and excess. */
export const ethane: Correlation = (T, rho) => {
  const Tstar = T / 245; // K, potential depth
  const eta0 = 12.0085 * Math.sqrt(Tstar) * sum(c2h6.C, (C, i) => C * Tstar ** (i / 3 - 1)); // dilute gas
  const [tau, delta] = [305.33 / T, rho / 6.87]; // critical point of the paper
  const part = (rows: typeof c2h6.excess | readonly (readonly [number, number, number])[]): number =>
    sum(rows, ([g, r, s]) => g * delta ** r * tau ** s);
  return eta0 + (15.977 * part(c2h6.excess.slice(0, 9))) / (1 + part(c2h6.excess.slice(9))); // excess
};

/** Vogel, Kuechenmeister, Bich and Laesecke 1998: dilute gas, initial density dependence, residual. */
export const propane: Correlation = (T, rho) => {
  const Tstar = T / c3h8.epsilon;
  const S = Math.exp(sum(c3h8.a, ([a, k]) => a * Math.log(Tstar) ** k));
  const eta0 = (0.021357 * Math.sqrt(c3h8.M * T)) / (c3h8.sigma ** 2 * S); // dilute gas
  const [tau, delta] = [369.825 / T, rho / 5]; // critical point of the paper: 5 mol/dm3
  const delta0 = c3h8.g1 * (1 + c3h8.g2 * Math.sqrt(1 / tau)); // close-packed density
  const free = c3h8.f * (delta / (delta0 - delta) - delta / delta0);
  const residual = sum(c3h8.residual, ([e, d, t]) => e * delta ** d * tau ** t) + free;
  return eta0 * (1 + initialSlope(c3h8.sigma, Tstar) * rho) + 1e6 * residual;
};
