/**
 * Enthalpy, internal energy, entropy and Gibbs energy of a mixture by GERG-2008; zero enthalpy and entropy for each pure
 * ideal gas at 298.15 K and 101.325 kPa.
 * Standard: ISO 20765-2:2015 (GERG-2008). Symbols: α° ideal part, α residual part; SI, molar.
 */
import { components } from '../../../src/core/fluid/helmholtz/components.table.ts';
import { coefficientsOf, expand, type Isotherm } from '../../../src/core/fluid/helmholtz/isotherm.ts';
import type { Mixture } from '../../../src/core/fluid/helmholtz/mixture.ts';
import { idealR } from '../../../src/core/fluid/helmholtz/properties.ts';

export interface GasEnergies {
  readonly enthalpy: number; // J/mol
  readonly internalEnergy: number; // J/mol
  readonly entropy: number; // J/(mol.K)
  readonly gibbsEnergy: number; // J/mol
}

const zeroT = 298.15; // K, zero point of the ideal gas (Kunz and Wagner 2012)
const zeroPressure = 101325; // Pa

/** Energies at the molar density `rho`, mol/m3, on an isotherm. */
export function energiesAt(isotherm: Isotherm, rho: number): GasEnergies {
  const { mixture, T, tau, RT, coefficients } = isotherm;
  const { R } = mixture;
  const delta = rho / mixture.rhoR;
  const { a: a00, a1: a01 } = expand(mixture, coefficients, delta);
  const { a: a10 } = expand(mixture, coefficientsOf(mixture, tau, 1), delta);
  const ideal = idealPart(mixture, T, rho);
  const internalEnergy = RT * (ideal.slope + a10); // u = R T (α°_10 + α_10)
  const enthalpy = internalEnergy + RT * (1 + a01); // h = u + p/ρ
  const entropy = R * (ideal.slope + a10 - ideal.value - a00); // s = R (α°_10 + α_10 - α° - α)
  return { enthalpy, internalEnergy, entropy, gibbsEnergy: enthalpy - T * entropy };
}

/** α° and τ ∂α°/∂τ of a mixture. The fitted constants carry R*, hence the scale. */
function idealPart({ x, R }: Mixture, T: number, rho: number): { readonly value: number; readonly slope: number } {
  const scale = idealR / R;
  const zeroDensity = zeroPressure / (R * zeroT); // mol/m3
  let [value, slope] = [0, 0];
  components.forEach(({ n: [n1 = 0, n2 = 0, n3 = 0, ...factors], theta }, i) => {
    const xi = x[i] ?? 0;
    if (xi === 0) return;
    const constant = scale * (n2 + zeroT) - zeroT; // K
    let hyperbolic = 0;
    let derived = 0;
    factors.forEach((n, k) => {
      if (n === 0) return;
      const z = (theta[k] ?? 0) / T;
      const even = k % 2 === 0; // n4 and n6: + n ln sinh z; n5 and n7: - n ln cosh z
      hyperbolic += even ? n * Math.log(Math.sinh(z)) : -n * Math.log(Math.cosh(z));
      derived += even ? (n * z) / Math.tanh(z) : -n * z * Math.tanh(z);
    });
    value +=
      xi * (Math.log((xi * rho) / zeroDensity) + scale * (n1 - (n3 - 1) * Math.log(T) + hyperbolic) + constant / T);
    slope += xi * (scale * (n3 - 1 + derived) + constant / T);
  });
  return { value, slope };
}
