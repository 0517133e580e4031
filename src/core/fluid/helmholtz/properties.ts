/**
 * Properties of a mixture at density and temperature, the ideal gas always that of GERG-2008.
 * Standard: ISO 20765-2:2015 (GERG-2008). Symbols: α_ij = δ^i τ^j ∂^(i+j)α/∂δ^i∂τ^j of the residual part; SI, molar.
 */
import { molarGasConstant } from '../../quantity/constants.ts';
import { components } from './components.table.ts';
import { coefficientsOf, expand, type Isotherm } from './isotherm.ts';
import type { Mixture } from './mixture.ts';

/** Gas constant that the ideal parts were fitted with, J/(mol.K). Source: Kunz and Wagner 2012. */
export const idealR = molarGasConstant.codata1986;

/** Everything that follows from density and temperature. */
export interface GasProperties {
  readonly pressure: number; // Pa
  readonly compressibility: number;
  readonly slope: number; // ∂p/∂ρ at constant T, J/mol
  readonly thermal: number; // ∂p/∂T at constant ρ, Pa/K
  readonly isochoricHeatCapacity: number; // J/(mol.K)
  readonly isobaricHeatCapacity: number; // J/(mol.K)
  readonly speedOfSoundSquared: number; // m2/s2
  readonly isentropicExponent: number; // w2 ρ M / p
  readonly jouleThomson: number; // ∂T/∂p at constant enthalpy, K/Pa
}

/** All properties at the molar density `rho`, mol/m3, on an isotherm. */
export function propertiesAt(isotherm: Isotherm, rho: number): GasProperties {
  const { mixture, T, tau, RT, coefficients } = isotherm;
  const { R } = mixture;
  const delta = rho / mixture.rhoR;
  const { a1: a01, a2: a02 } = expand(mixture, coefficients, delta);
  const { a1: a11 } = expand(mixture, coefficientsOf(mixture, tau, 1), delta);
  const { a: a20 } = expand(mixture, coefficientsOf(mixture, tau, 2), delta);
  const Z = 1 + a01;
  const pressure = rho * RT * Z; // p = ρ R T (1 + α_01)
  const slope = RT * (1 + 2 * a01 + a02); // ∂p/∂ρ
  const thermal = rho * R * (1 + a01 - a11); // ∂p/∂T
  const cv = idealHeatCapacity(mixture, T) - R * a20; // c_v = -R (α°_20 + α_20)
  const cp = cv + (T * thermal * thermal) / (rho * rho * slope); // c_p = c_v + T (∂p/∂T)² / (ρ² ∂p/∂ρ)
  return {
    pressure,
    compressibility: Z,
    slope,
    thermal,
    isochoricHeatCapacity: cv,
    isobaricHeatCapacity: cp,
    speedOfSoundSquared: (cp / cv) * (slope / mixture.molarMass), // w² = (c_p/c_v) (∂p/∂ρ)/M
    isentropicExponent: ((cp / cv) * rho * slope) / pressure, // κ = w² ρ M / p
    jouleThomson: ((T * thermal) / (rho * slope) - 1) / (rho * cp), // μ_JT = (T (∂p/∂T) / (ρ ∂p/∂ρ) - 1) / (ρ c_p)
  };
}

/** Isochoric heat capacity of the ideal gas, J/(mol.K). Kunz and Wagner 2012: c_p°/R* = n3 + Σ n (z/sinh z)², z = ϑ/T. */
function idealHeatCapacity({ x }: Mixture, T: number): number {
  let sum = 0;
  for (let i = 0; i < components.length; i++) {
    const xi = x[i] as number;
    if (xi === 0) continue;
    const { n, theta } = components[i] as (typeof components)[number];
    let own = (n[2] as number) - 1;
    for (let k = 0; k < 4; k++) {
      const factor = n[3 + k] as number;
      if (factor === 0) continue;
      const z = (theta[k] as number) / T;
      const ratio = z / (k % 2 === 0 ? Math.sinh(z) : Math.cosh(z)); // sinh for n4 and n6, cosh for n5 and n7
      own += factor * ratio * ratio;
    }
    sum += xi * own;
  }
  return idealR * sum;
}
