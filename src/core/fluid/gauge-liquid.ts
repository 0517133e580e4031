/**
 * Density of the two liquids of manometers that have a formula: mercury and air-free water.
 * Standard: none; the papers at each function, from memory: check your copy. Symbols: t in degC; SI.
 */
import { standardAtmosphere as atmosphere, celsius } from '../quantity/constants.ts';
import type { AbsolutePressure, Density, Temperature } from '../quantity/kinds.ts';

/**
 * Mercury, kg/m3, -20 degC to 300 degC. Beattie and others, Proc. Am. Acad. Arts Sci. 74 (1941) 371 (expansion); Cook,
 * Phil. Trans. A 254 (1961) 125 (13545.87 kg/m3 at 20 degC and 101.325 kPa).
 */
export function mercuryDensity(T: Temperature, p: AbsolutePressure = atmosphere): Density {
  const t = celsius(T);
  const expansion = 18144.01 * t + 0.7016 * t ** 2 + 2.8625e-3 * t ** 3 + 2.617e-6 * t ** 4; // Beattie 1941, 1e-8
  return ((13595.08 / (1 + 1e-8 * expansion)) * (1 + 4e-11 * (p - atmosphere))) as Density; // Cook 1961
}

/**
 * Water without air, kg/m3, 0 degC to 40 degC. Tanaka and others, Metrologia 38 (2001) 301, Eq. 1 and 6; expanded
 * relative uncertainty 1e-6 at the pressure of the atmosphere.
 */
export function gaugeWaterDensity(T: Temperature, p: AbsolutePressure = atmosphere): Density {
  const t = celsius(T);
  const [a1, a2, a3, a4, a5] = [-3.983035, 301.797, 522528.9, 69.34881, 999.97495]; // Eq. 1
  const rho = a5 * (1 - ((t + a1) ** 2 * (t + a2)) / (a3 * (t + a4))); // Eq. 1
  const compressibility = (50.74 - 0.326 * t + 0.00416 * t ** 2) * 1e-11; // 1/Pa; Eq. 6
  return (rho * (1 + compressibility * (p - atmosphere))) as Density;
}
