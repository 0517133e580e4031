/**
 * Region 1 of IAPWS-IF97: liquid water, 273.15 K to 623.15 K, from the saturation line to 100 MPa.
 * Standard: IAPWS R7-97(2012), Eq. 7. Symbols: those of the release; SI.
 */
import { powerSum } from '../../numeric/power-sum.ts';
import type { AbsolutePressure, Density, Temperature } from '../../quantity/kinds.ts';
import { fromGibbs, R, type WaterProperties } from './properties.ts';
import { terms } from './region1.table.ts';

const pStar = 16.53e6; // Pa, Eq. 7
const TStar = 1386; // K, Eq. 7
const piShift = 7.1; // Eq. 7
const tauShift = 1.222; // Eq. 7
const sum = powerSum(terms); // of x = 7.1 - π and y = τ - 1.222

/** All properties of liquid water at p and T (see the head of the file for the range). */
export function region1(p: AbsolutePressure, T: Temperature): WaterProperties {
  const pi = p / pStar;
  const tau = TStar / T;
  const { value, x, xx, y, yy, xy } = sum.expand(piShift - pi, tau - tauShift);
  return fromGibbs({ g: value, gp: -x, gpp: xx, gt: y, gtt: yy, gpt: -xy }, pi, tau, pStar, T); // Table 4
}

/** Density of liquid water alone, kg/m3, at p and T. IAPWS R7-97(2012), Tables 3 and 4. */
export function densityOfRegion1(p: AbsolutePressure, T: Temperature): Density {
  return (-pStar / (R * T * sum.slope(piShift - p / pStar, TStar / T - tauShift))) as Density;
}
