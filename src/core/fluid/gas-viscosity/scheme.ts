/**
 * Viscosity of a gas mixture from its pure dilute gases: their mixture, and what the density adds to it. Positive and
 * smooth, and the mixture of dilute gases alone at no density.
 * Standard: none; Wilke, J. Chem. Phys. 18 (1950) 517, and Dean and Stiel, AIChE J. 11 (1965) 526. Symbols: theirs.
 */
import { standardAtmosphere } from '../../quantity/constants.ts';
import type { DynamicViscosity, Temperature } from '../../quantity/kinds.ts';

/** What the scheme asks of one gas. The dilute gas is C1 T^C2 / (1 + C3/T + C4/T2) Pa.s between two temperatures. */
export interface ViscousGas {
  readonly M: number; // g/mol
  readonly C: readonly [C1: number, C2: number, C3: number, C4: number];
  readonly lowest: number; // K
  readonly highest: number; // K
  readonly Tc: number; // K
  readonly pc: number; // MPa
  readonly Vc: number; // cm3/mol
}

/** A gas and its mole fraction. */
export interface Share {
  readonly x: number;
  readonly gas: ViscousGas;
}

/** Viscosity at temperature T, K, and molar density rho, mol/m3, in Pa.s. The mole fractions add up to 1. */
export function schemeViscosity(shares: readonly Share[], T: Temperature, rho: number): DynamicViscosity {
  return (mixed(shares, T) + denseResidual(shares, rho)) as DynamicViscosity;
}

/**
 * Viscosity of one dilute gas, Pa.s. Below its lowest temperature the form of the fit turns over; there the viscosity
 * is taken as proportional to T (practice: that of a dilute gas well below its critical temperature).
 */
export function diluteViscosity({ C: [C1, C2, C3, C4], lowest }: ViscousGas, T: number): number {
  const t = Math.max(T, lowest);
  const eta0 = (C1 * t ** C2) / (1 + C3 / t + C4 / t ** 2); // form of Perry's Handbook, Table 2-312
  return T < lowest ? (eta0 * T) / lowest : eta0;
}

/** Mixture of dilute gases. Wilke 1950. */
function mixed(shares: readonly Share[], T: number): number {
  const pure = shares.map(({ x, gas }) => ({ x, M: gas.M, eta: diluteViscosity(gas, T) }));
  return pure.reduce((sum, i) => {
    const among = pure.reduce((total, j) => {
      const root = 1 + Math.sqrt(i.eta / j.eta) * (j.M / i.M) ** 0.25;
      return total + (j.x * root ** 2) / Math.sqrt(8 * (1 + i.M / j.M)); // x_j phi_ij
    }, 0);
    return sum + (i.x * i.eta) / among;
  }, 0);
}

const cP = 1e-3; // Pa.s

/** What the density adds, with the pseudocritical rules of the same paper. Dean and Stiel 1965. */
function denseResidual(shares: readonly Share[], rho: number): number {
  const rr = reducedDensity(shares, rho);
  const Tc = average(shares, ({ Tc }) => Tc);
  const M = average(shares, ({ M }) => M);
  const pc = average(shares, ({ pc }) => pc) / (standardAtmosphere / 1e6); // MPa in atmospheres
  const xi = Tc ** (1 / 6) / (Math.sqrt(M) * pc ** (2 / 3));
  return (10.8e-5 * cP * (Math.exp(1.439 * rr) - Math.exp(-1.111 * rr ** 1.858))) / xi; // 10.8e-5 cP
}

/** Density over the pseudocritical density, at rho in mol/m3. */
export const reducedDensity = (shares: readonly Share[], rho: number): number =>
  rho * 1e-6 * average(shares, ({ Vc }) => Vc);

const average = (shares: readonly Share[], of: (gas: ViscousGas) => number): number =>
  shares.reduce((sum, { x, gas }) => sum + x * of(gas), 0);
