/**
 * Molar density of a mixture at pressure and temperature: the gas root of lowest density, or the liquid root.
 * Standard: none of its own; those of the equations (ISO 20765-2:2015, AGA Report No. 8, Part 1) leave the search to the
 * user. SI, densities in mol/m3.
 */
import { type Isotherm, pressureAt } from './isotherm.ts';

const longestStep = 1.5; // in ln ρ
const settled = 1e-9; // in ln ρ; the next step would be its square
const collapsed = 1e-12; // width of the bracket in ln ρ at which there is no root
const mostSteps = 200; // 4 are usual; bisection alone needs 50
/** Ends of the search, derived: below it Z would be above e^7, above it no equation of the set means anything. */
const lowestFactor = Math.exp(-7); // of p/(R T)
const highestReduced = 8;
/** Below this reduced density no root lies beyond an unstable part (derived: liquids end above it); points to look for one. */
const loopless = 0.5;
const loopPoints = 40;
/** The liquid root is sought from here downwards; liquids near their triple point stay below. */
const liquidStart = 3;

/**
 * Density of the gas, mol/m3: the stable root of lowest density; undefined where p and T have none (a liquid, or a state
 * inside the two-phase region beyond the end of the gas's stability). `near`: a first guess where one is known.
 * Newton's method on ln p over ln ρ inside a bracket: a stable point below p is a lower bound, any other an upper one.
 */
export function gasDensity(isotherm: Isotherm, p: number, near?: number): number | undefined {
  const ideal = p / isotherm.RT;
  const highest = Math.log(highestReduced * isotherm.mixture.rhoR);
  let low = Math.min(Math.log(ideal * lowestFactor), highest - 1);
  let high = highest;
  let y = Math.min(Math.log(near ?? ideal), high);
  for (let step = 0; step < mostSteps; step++) {
    const rho = Math.exp(y);
    const { p: at, slope } = pressureAt(isotherm, rho);
    const stable = slope > 0 && at > 0;
    if (stable && at < p) low = y;
    else high = y;
    const newton = stable ? (Math.log(p / at) * at) / (rho * slope) : Number.NaN;
    if (stable && Math.abs(newton) < settled) return firstStable(isotherm, rho * (1 + newton));
    if (high - low < collapsed) return undefined;
    const next = y + Math.max(-longestStep, Math.min(longestStep, newton));
    y = next > low && next < high ? next : (low + high) / 2;
  }
  return undefined;
}

/** A root is that of the gas where no density below it is unstable; beyond an unstable part it is the liquid's. */
function firstStable(isotherm: Isotherm, rho: number): number | undefined {
  if (rho < loopless * isotherm.mixture.rhoR) return rho;
  for (let k = 1; k < loopPoints; k++) {
    const { slope } = pressureAt(isotherm, (rho * k) / loopPoints);
    if (!(slope > 0)) return undefined;
  }
  return rho;
}

/**
 * Density of the liquid, mol/m3; undefined where p and T have none. From beyond the densest liquid the isotherm is
 * convex, so that Newton's steps come down to the root and meet the end of stability where there is none.
 */
export function liquidDensity(isotherm: Isotherm, p: number): number | undefined {
  const { rhoR } = isotherm.mixture;
  let rho = liquidStart * rhoR;
  for (let step = 0; step < mostSteps; step++) {
    const { p: at, slope } = pressureAt(isotherm, rho);
    if (!(slope > 0)) return undefined;
    const change = (p - at) / slope;
    rho += change;
    if (!(rho > 0.5 * rhoR && rho < highestReduced * rhoR)) return undefined;
    if (Math.abs(change) < settled * rho) return rho;
  }
  return undefined;
}
