/**
 * One gas by the cubic equation of Peng and Robinson: density, heat capacities, speed of sound.
 * Standard: none; Peng and Robinson, Ind. Eng. Chem. Fundam. 15 (1976) 59. Symbols: those of the paper; SI, molar.
 */
import { molarGasConstant } from '../../quantity/constants.ts';
import { type CubicComponent, cubicPhase, cubicState } from './peng-robinson.ts';

const R = molarGasConstant.exact;

/** What the equation answers. */
export interface PureGas {
  readonly molarVolume: number; // m3/mol
  readonly compressibility: number;
  readonly isentropicExponent: number; // w2 ρ M / p
  readonly jouleThomson: number; // ∂T/∂p at constant enthalpy, K/Pa
}

const root2 = Math.SQRT2;
const criticalVolumes = 3.9514; // v_c/b of the equation, derived: at it both slopes of p(v) vanish

/**
 * The gas at p, Pa, and T, K; undefined where the equation has the liquid there.
 * @param heatCapacity of the ideal gas at constant pressure, J/(mol.K)
 */
export function pureGas(component: CubicComponent, heatCapacity: number, p: number, T: number): PureGas | undefined {
  const { Tc, pc, omega } = component;
  const Z = cubicPhase(cubicState([component], T, p), Float64Array.of(1)).Z;
  const v = (Z * R * T) / p;
  const b = (0.0778 * R * Tc) / pc; // Eq. 10
  if (T < Tc && v < criticalVolumes * b) return undefined;
  const atCritical = (0.45724 * (R * Tc) ** 2) / pc; // Eq. 9
  const m = 0.37464 + 1.54226 * omega - 0.26992 * omega ** 2; // Eq. 18
  const rootAlpha = 1 + m * (1 - Math.sqrt(T / Tc)); // Eq. 17
  const a = atCritical * rootAlpha ** 2; // Eq. 12
  const aT = (-atCritical * m * rootAlpha) / Math.sqrt(T * Tc); // da/dT
  const aTT = atCritical * (m ** 2 / (2 * T * Tc) + (m * rootAlpha) / (2 * T * Math.sqrt(T * Tc))); // d2a/dT2
  const q = v ** 2 + 2 * b * v - b ** 2; // Eq. 4: p = R T/(v - b) - a/q
  const pT = R / (v - b) - aT / q; // ∂p/∂T
  const pv = (-R * T) / (v - b) ** 2 + (a * (2 * v + 2 * b)) / q ** 2; // ∂p/∂v
  const spread = Math.log((v + (1 + root2) * b) / (v + (1 - root2) * b));
  const cv = heatCapacity - R + ((T * aTT) / (2 * root2 * b)) * spread; // c_v = c_p° - R + ∫ T ∂2p/∂T2 dv
  const cp = cv - (T * pT ** 2) / pv; // c_p - c_v = -T (∂p/∂T)² / (∂p/∂v)
  return {
    molarVolume: v,
    compressibility: Z,
    isentropicExponent: (-v / p) * (cp / cv) * pv, // κ = -(v/p) (c_p/c_v) ∂p/∂v
    jouleThomson: ((-T * pT) / pv - v) / cp, // (T ∂v/∂T - v)/c_p, ∂v/∂T = -(∂p/∂T)/(∂p/∂v)
  };
}
