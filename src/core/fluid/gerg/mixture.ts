/**
 * What GERG-2008 makes of a composition alone: molar mass, reducing temperature and density, factors of the terms.
 * Standard: ISO 20765-2:2015 (GERG-2008). Symbols: x mole fraction, r reducing; SI.
 */
import { molarGasConstant } from '../../quantity/constants.ts';
import { components } from '../helmholtz/components.table.ts';
import { molarMasses } from '../helmholtz/components.ts';
import type { Mixture } from '../helmholtz/mixture.ts';
import { type Gathered, gathered } from '../helmholtz/slots.ts';
import { reducing } from './reducing.table.ts';
import { departures, gergSlots, pureShares, type Share } from './terms.ts';

/** Molar gas constant of the equation, J/(mol.K). Source: Kunz and Wagner 2012; the later exact value is not for it. */
export const R = molarGasConstant.codata2002;

const size = components.length;
const criticalTemperature = Float64Array.from(components, ({ Tc }) => Tc);
const criticalVolume = Float64Array.from(components, ({ rhoc }) => 1 / (1000 * rhoc)); // m3/mol

/** Constants of a pair: 2 β_v γ_v v_c,ij, β_v², 2 β_T γ_T T_c,ij, β_T² at (i, j), i < j. */
const pairConstants = new Float64Array(size * size * 4);
for (const [i, j, betaV, gammaV, betaT, gammaT] of reducing) {
  const [a, b] = [i - 1, j - 1];
  const [Ta, Tb, va, vb] = [criticalTemperature[a], criticalTemperature[b], criticalVolume[a], criticalVolume[b]];
  if (Ta === undefined || Tb === undefined || va === undefined || vb === undefined)
    throw new Error(`expected components ${i} and ${j}, got ${size} components`);
  const volume = (Math.cbrt(va) + Math.cbrt(vb)) ** 3 / 8; // 1/ρ_c,ij
  const temperature = Math.sqrt(Ta * Tb);
  pairConstants.set(
    [2 * betaV * gammaV * volume, betaV * betaV, 2 * betaT * gammaT * temperature, betaT * betaT],
    (a * size + b) * 4,
  );
}

/** The mixture of a composition; `x` in the order of componentNames, sum 1. */
export function mixtureOf(x: readonly number[]): Mixture {
  let Tr = 0;
  let volume = 0;
  let molarMass = 0;
  for (let i = 0; i < size; i++) {
    const xi = x[i] as number;
    if (xi === 0) continue;
    molarMass += xi * (molarMasses[i] as number);
    Tr += xi * xi * (criticalTemperature[i] as number);
    volume += xi * xi * (criticalVolume[i] as number);
    for (let j = i + 1; j < size; j++) {
      const xj = x[j] as number;
      if (xj === 0) continue;
      const at = (i * size + j) * 4;
      const both = xi * xj * (xi + xj);
      volume += ((pairConstants[at] as number) * both) / ((pairConstants[at + 1] as number) * xi + xj);
      Tr += ((pairConstants[at + 2] as number) * both) / ((pairConstants[at + 3] as number) * xi + xj);
    }
  }
  return { x, molarMass, R, Tr, rhoR: 1 / volume, ...termsOf(x) };
}

/** α_r = Σ x_i α_r,i + Σ x_i x_j F_ij α_r,ij, as factors of the slots. */
function termsOf(x: readonly number[]): Gathered {
  const sums = new Float64Array(gergSlots.count);
  for (let i = 0; i < size; i++) addTo(sums, pureShares[i] as Share, x[i] as number);
  for (const { i, j, F, share } of departures) addTo(sums, share, (x[i] as number) * (x[j] as number) * F);
  return gathered(gergSlots, sums);
}

function addTo(sums: Float64Array, { slots, factors }: Share, weight: number): void {
  if (weight === 0) return;
  for (let k = 0; k < slots.length; k++) {
    const slot = slots[k] as number;
    sums[slot] = (sums[slot] as number) + weight * (factors[k] as number);
  }
}
