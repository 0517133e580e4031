/**
 * What the two regions of steam have in common: a Gibbs function of an ideal part ln π + Σ n τ^J and a residual part
 * Σ n π^I (τ - shift)^J, with p* = 1 MPa.
 * Standard: IAPWS R7-97(2012), Eq. 15 to 17 and 32 to 34. Symbols: those of the release; SI.
 */
import { powerSum, type Term } from '../../numeric/power-sum.ts';
import type { AbsolutePressure, Density, Temperature } from '../../quantity/kinds.ts';
import { fromGibbs, R, type WaterProperties } from './properties.ts';

const pStar = 1e6; // Pa

/** The terms of a region and its reducing figures. */
interface Equation {
  readonly ideal: readonly Term[];
  readonly residual: readonly Term[];
  readonly TStar: number; // K
  /** What τ is lessened by in the residual part. */
  readonly shift: number;
}

/** A region of steam: all properties at p and T, and the density alone, kg/m3. */
export interface SteamRegion {
  readonly properties: (p: AbsolutePressure, T: Temperature) => WaterProperties;
  readonly density: (p: AbsolutePressure, T: Temperature) => Density;
}

/** The region of an equation. IAPWS R7-97(2012), Tables 12 to 14 and 39 to 41. */
export function steamRegion({ ideal, residual, TStar, shift }: Equation): SteamRegion {
  const idealSum = powerSum(ideal); // of y = τ; the term ln π stands apart
  const residualSum = powerSum(residual); // of x = π and y = τ - shift
  return {
    properties(p, T) {
      const pi = p / pStar;
      const tau = TStar / T;
      const o = idealSum.expand(1, tau);
      const r = residualSum.expand(pi, tau - shift);
      const gibbs = {
        g: Math.log(pi) + o.value + r.value,
        gp: 1 / pi + r.x,
        gpp: -1 / (pi * pi) + r.xx,
        gt: o.y + r.y,
        gtt: o.yy + r.yy,
        gpt: r.xy,
      }; // Tables 13, 14, 40 and 41
      return fromGibbs(gibbs, pi, tau, pStar, T);
    },
    density(p, T) {
      const pi = p / pStar;
      return (pStar / (R * T * (1 / pi + residualSum.slope(pi, TStar / T - shift)))) as Density; // v = π γ_π R T / p
    },
  };
}
