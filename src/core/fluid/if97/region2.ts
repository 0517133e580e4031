/**
 * Region 2 of IAPWS-IF97: steam, 273.15 K to 1073.15 K, below the saturation line, the border with region 3 and 100 MPa.
 * Standard: IAPWS R7-97(2012), Eq. 15 to 17. Symbols: those of the release; SI.
 */
import { powerSum } from '../../numeric/power-sum.ts';
import type { AbsolutePressure, Density, Temperature } from '../../quantity/kinds.ts';
import { fromGibbs, R, type WaterProperties } from './properties.ts';
import { ideal, residual } from './region2.table.ts';

const pStar = 1e6; // Pa
const TStar = 540; // K
const idealSum = powerSum(ideal); // of y = τ; the term ln π stands apart
const residualSum = powerSum(residual); // of x = π and y = τ - 0.5

/** All properties of steam at p and T (see the head of the file for the range). */
export function region2(p: AbsolutePressure, T: Temperature): WaterProperties {
  const pi = p / pStar;
  const tau = TStar / T;
  const o = idealSum.expand(1, tau);
  const r = residualSum.expand(pi, tau - 0.5);
  const gibbs = {
    g: Math.log(pi) + o.value + r.value,
    gp: 1 / pi + r.x,
    gpp: -1 / (pi * pi) + r.xx,
    gt: o.y + r.y,
    gtt: o.yy + r.yy,
    gpt: r.xy,
  }; // Tables 12 to 14
  return fromGibbs(gibbs, pi, tau, pStar, T);
}

/** Density of steam alone, kg/m3, at p and T. IAPWS R7-97(2012), Tables 12 to 14. */
export function densityOfRegion2(p: AbsolutePressure, T: Temperature): Density {
  const pi = p / pStar;
  return (pStar / (R * T * (1 / pi + residualSum.slope(pi, TStar / T - 0.5)))) as Density;
}
