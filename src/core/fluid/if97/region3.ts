/**
 * Region 3 of IAPWS-IF97: water and steam around the critical point, 623.15 K to 863.15 K, above the border with
 * region 2, to 100 MPa. Its equation gives the pressure from density and temperature; the density at p and T is found.
 * Standard: IAPWS R7-97(2012), Eq. 28. Symbols: those of the release; SI.
 */
import { collapse, powerSum, type Term } from '../../numeric/power-sum.ts';
import type { AbsolutePressure, Density, Temperature } from '../../quantity/kinds.ts';
import { fromHelmholtz, R, type WaterProperties } from './properties.ts';
import { logarithm as n1, terms } from './region3.table.ts';
import { criticalTemperature } from './saturation.ts';

/** The two sides of the saturation line. */
export type Side = 'liquid' | 'vapour';

const rhoStar = 322; // kg/m3, Eq. 28
const TStar = 647.096; // K, Eq. 28
const sum = powerSum(terms); // of x = δ and y = τ
const slopes = terms.filter(([I]) => I > 0).map(([I, J, n]): Term => [I - 1, J, I * n]);
const inDensity = collapse(slopes); // s(δ) = Σ I n δ^(I-1) τ^J as a polynomial in δ, so that δ φ_δ = n1 + δ s

/** Starts and bracket of the density, kg/m3; derived: outside every density that region 3 holds (113 to 760 kg/m3). */
const start = { liquid: 780, vapour: 50, fluid: 322, lowest: 20, highest: 800 } as const;
const relativeStep = 1e-13; // the smallest step that rounding leaves a meaning
const mostSteps = 100; // 6 are usual; bisection alone needs 50

/** All properties at density and temperature. IAPWS R7-97(2012), Tables 31 and 32. */
export function region3(rho: Density, T: Temperature): WaterProperties {
  const delta = rho / rhoStar;
  const tau = TStar / T;
  const { value, x, xx, y, yy, xy } = sum.expand(delta, tau);
  const helmholtz = {
    f: n1 * Math.log(delta) + value,
    fd: n1 / delta + x,
    fdd: -n1 / (delta * delta) + xx,
    ft: y,
    ftt: yy,
    fdt: xy,
  };
  return fromHelmholtz(helmholtz, rho, delta, tau, T);
}

/** Pressure at density and temperature, Pa. IAPWS R7-97(2012), Table 31: p = ρ R T δ φ_δ. */
export function pressureOfRegion3(rho: Density, T: Temperature): AbsolutePressure {
  return pressureAlong(isotherm(T), rho).at as AbsolutePressure;
}

/** An isotherm: the coefficients of s(δ) and R T. The powers of τ are formed once for all densities. */
interface Isotherm {
  readonly coefficients: Float64Array;
  readonly RT: number;
}

const isotherm = (T: Temperature): Isotherm => ({ coefficients: inDensity(TStar / T), RT: R * T });

/** Pressure and its slope at a density, Pa and J/kg. IAPWS R7-97(2012), Table 31: p = ρ R T δ φ_δ, δ φ_δ = n1 + δ s. */
function pressureAlong({ coefficients, RT }: Isotherm, rho: number): { readonly at: number; readonly slope: number } {
  const delta = rho / rhoStar;
  let s = 0;
  let ds = 0; // ds/dδ
  for (let k = 0; k < coefficients.length; k++) {
    ds = ds * delta + s;
    s = s * delta + (coefficients[k] as number);
  }
  return { at: rho * RT * (n1 + delta * s), slope: RT * (n1 + 2 * delta * s + delta * delta * ds) };
}

/**
 * Density at p and T on one side of the saturation line, kg/m3; undefined where that side has no state (beyond the
 * end of its stability). Above the critical temperature both sides are one.
 * Below it Newton's method starts beyond the outermost density of the side. The isotherm is convex on the liquid and
 * concave on the vapour side, so that the steps approach from outside and never cross the unstable part.
 */
export function densityOfRegion3(p: AbsolutePressure, T: Temperature, side: Side): Density | undefined {
  const along = isotherm(T);
  return T < criticalTemperature ? fromOutside(along, p, start[side]) : withinBracket(along, p);
}

function fromOutside(along: Isotherm, p: number, from: number): Density | undefined {
  let rho = from;
  for (let step = 0; step < mostSteps; step++) {
    const { at, slope } = pressureAlong(along, rho);
    if (slope <= 0) return undefined; // the side ended before it met the pressure
    const next = rho + (p - at) / slope;
    if (Math.abs(next - rho) <= relativeStep * rho) return next as Density;
    // Once past the root, rounding alone moves the point: the steps had one direction before.
    if (step > 1 && next > rho === from > next && Math.abs(p - at) <= 1e-12 * p) return next as Density;
    rho = next;
  }
  return undefined;
}

function withinBracket(along: Isotherm, p: number): Density {
  let low: number = start.lowest;
  let high: number = start.highest;
  let rho: number = start.fluid;
  for (let step = 0; step < mostSteps; step++) {
    const { at, slope } = pressureAlong(along, rho);
    if (at < p) low = rho;
    else high = rho;
    const newton = rho + (p - at) / slope;
    const next = slope > 0 && newton > low && newton < high ? newton : (low + high) / 2;
    if (Math.abs(next - rho) <= relativeStep * rho) return next as Density;
    rho = next;
  }
  return rho as Density; // the bracket has shrunk to rounding
}
