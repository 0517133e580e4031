/**
 * Dynamic viscosity of water and steam, without the critical enhancement (μ2 = 1, as the release allows for
 * industrial use). Range of the release: from the melting line to 1173.15 K; beyond it the equation extrapolates.
 * Standard: IAPWS R12-08, Eq. 10 to 12. Symbols: those of the release; SI.
 */
import type { Density, DynamicViscosity, Temperature } from '../../quantity/kinds.ts';
import { dilute, finite } from './viscosity.table.ts';

/** The highest temperature of the range above, K. */
export const highestTemperature = 1173.15 as Temperature;

const TStar = 647.096; // K, reference constants of R12-08
const rhoStar = 322; // kg/m3
const muStar = 1e-6; // Pa.s

/** Sum of c_k x^k. */
function polynomial(c: readonly number[], x: number): number {
  return c.reduceRight((sum, next) => sum * x + next, 0);
}

/** Viscosity at T and density, Pa.s. IAPWS R12-08, Eq. 10. */
export function viscosity(T: Temperature, rho: Density): DynamicViscosity {
  const Tr = T / TStar;
  const r = rho / rhoStar;
  const mu0 = (100 * Math.sqrt(Tr)) / polynomial(dilute, 1 / Tr); // Eq. 11
  const sum = finite.reduceRight((outer, row) => outer * (1 / Tr - 1) + polynomial(row, r - 1), 0);
  const mu1 = Math.exp(r * sum); // Eq. 12
  return (muStar * mu0 * mu1) as DynamicViscosity; // Eq. 10 with μ2 = 1
}
