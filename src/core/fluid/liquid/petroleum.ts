/**
 * Crude oil, refined products and lubricating oils from their density at 15 degC or 60 degF or their API gravity.
 * Standard: API MPMS Chapter 11.1-2004 (ASTM D1250-04, IP 200/04), 11.1.6; ASTM D341 for viscosity. Symbols: those of the
 * standard; temperatures in degF, pressure in psi above the atmosphere, SI at the outside.
 */
import {
  standardAtmosphere as atmospheric,
  celsius,
  kelvin,
  poundPerSquareInch as psi,
} from '../../quantity/constants.ts';
import { fail, type Outcome, ok } from '../../quantity/outcome.ts';
import type { Source } from '../../quantity/source.ts';
import type { Working } from '../../quantity/working.ts';
import type { Parsed } from '../model.ts';
import { furthestBeyond, type Liquid, type Property } from './contract.ts';
import { baseTemperature68, delta60, groups, shift, waterDensity60 } from './petroleum.table.ts';
import { orderedRows, waltherPoints } from './table.ts';
import { walther } from './walther.ts';

type Group = (typeof groups)[number];

const expansion: Source = { clause: 'API MPMS 11.1-2004, 11.1.6.1 (CTL)', seen: 'second-hand' };
const compression: Source = { clause: 'API MPMS 11.1-2004, 11.1.6.1 (CPL)', seen: 'second-hand' };
const viscosityBy: Source = { clause: 'ASTM D341, line through the stated viscosities', seen: 'memory' };

/** The kinds of oil that can be named. */
export const products = ['crude-oil', 'refined-product', 'lubricating-oil'] as const;
export type Product = (typeof products)[number];

const fahrenheit = (T: number): number => celsius(T) * 1.8 + 32; // degF, exact
const kelvinOf = (t: number): number => kelvin((t - 32) / 1.8); // K, exact
const range = { min: kelvinOf(-58), max: kelvinOf(302) }; // 11.1.3, -58 degF to 302 degF
const highestPressure = atmospheric + 1500 * psi; // 11.1.3, 1500 psig
const fifteen = kelvin(15); // K, the metric base temperature
/** Oils are drawn along the line of D341 this far beyond the stated points (practice), with a finding. */
const furthestAlong = 60; // K

/** Temperature on IPTS-68 of one on ITS-90, degF. 11.1.5.3. */
export function onIpts68(t: number): number {
  const tau = (t - 32) / 1.8 / 630; // 11.1.5.3, degC over 630
  const off = shift.reduceRight((sum, a) => (sum + a) * tau, 0); // degC
  return t - 1.8 * off;
}

/** What the group makes of a density at 60 degF: α_60 in 1/degF and the shifted density. 11.1.6.1, steps 4 and 5. */
export function thermal({ K0, K1, K2 }: Pick<Group, 'K0' | 'K1' | 'K2'>, rho60: number) {
  const A = (delta60 / 2) * ((K0 / rho60 + K1) / rho60 + K2);
  const B = (2 * K0 + K1 * rho60) / (K0 + (K1 + K2 * rho60) * rho60);
  const shifted = rho60 * (1 + Math.expm1(A * (1 + 0.8 * A)) / (1 + A * (1 + 1.6 * A) * B));
  return { shifted, alpha60: (K0 / shifted + K1) / shifted + K2 };
}

/** CTL at T: density there over that at 60 degF. 11.1.6.1, step 6. */
export function expansionFactor(group: Group, rho60: number, T: number): number {
  const { alpha60 } = thermal(group, rho60);
  const step = onIpts68(fahrenheit(T)) - baseTemperature68;
  return Math.exp(-alpha60 * step * (1 + 0.8 * alpha60 * (step + delta60)));
}

/** CPL at p in Pa absolute and T: density there over that at the atmosphere. 11.1.6.1, steps 7 and 8. */
export function compressionFactor(group: Group, rho60: number, p: number, T: number): number {
  const t = onIpts68(fahrenheit(T));
  const { shifted } = thermal(group, rho60);
  const Fp = Math.exp(-1.9947 + 0.00013427 * t + (793920 + 2326 * t) / shifted ** 2); // step 7, 1e-5 per psi
  return 1 / (1 - 1e-5 * Fp * ((p - atmospheric) / psi)); // step 8
}

/** The commodity group of a product; a refined product takes the group of its density. */
function groupOf(product: Product, rho60: number): Group | undefined {
  const named = { 'crude-oil': ['crude'], 'lubricating-oil': ['lubricating'], 'refined-product': undefined }[product];
  const candidates = groups.filter(({ group }) =>
    named ? named.includes(group) : group !== 'crude' && group !== 'lubricating',
  );
  return candidates.find(({ min, max }) => rho60 >= min && rho60 <= max);
}

interface Settled {
  readonly group: Group;
  readonly rho60: number;
}

/** The density at 60 degF and its group. Problems: petroleum-density-missing, petroleum-density-out-of-range. */
function settle(product: Product, { quantities, numbers }: Parsed, own: (name: string) => string): Outcome<Settled> {
  const { densityAt15, densityAt60F } = quantities;
  const stated = { densityAt15, densityAt60F, apiGravity: numbers.apiGravity };
  const [name, ...more] = Object.entries(stated).flatMap(([key, value]) => (value === undefined ? [] : [key]));
  if (name === undefined) return fail('petroleum-density-missing', own('densityAt15'));
  if (more[0] !== undefined) return fail('petroleum-density-twice', own(more[0]));
  const api = numbers.apiGravity;
  const rho = api === undefined ? (densityAt15 ?? densityAt60F)?.si : (141.5 / (api + 131.5)) * waterDensity60; // 11.1.5.1
  const found = densityAt15 === undefined ? rho : at60(product, densityAt15.si);
  const group = found !== undefined && Number.isFinite(found) ? groupOf(product, found) : undefined;
  if (found !== undefined && group !== undefined) return ok({ group, rho60: found });
  const least = product === 'lubricating-oil' ? 'lubricating' : 'crude';
  const { min, max } = groups.find((candidate) => candidate.group === least) as Group;
  return fail('petroleum-density-out-of-range', own(name), { min, max });
}

/** Density at 60 degF of one at 15 degC: each round is a thousand times nearer. Undefined outside every group. */
function at60(product: Product, rho15: number): number | undefined {
  let rho60 = rho15;
  for (let round = 0; round < 8; round += 1) {
    const group = groupOf(product, rho60);
    if (group === undefined) return undefined;
    rho60 = rho15 / expansionFactor(group, rho60, fifteen);
  }
  return rho60;
}

/** The oil that the fields describe. Problems: those of its density and of the stated viscosities. */
export function petroleum(product: Product, parsed: Parsed, own: (name: string) => string): Outcome<Liquid> {
  const settled = settle(product, parsed, own);
  if (!settled.ok) return settled;
  const { group, rho60 } = settled.value;
  const density: Property = {
    ...range,
    at: (T) => rho60 * expansionFactor(group, rho60, T),
    below: furthestBeyond,
    above: furthestBeyond,
    source: expansion,
    share: 0.0035, // the expansion alone, to 250 degF
    remark: `petroleum-${group.group}`,
  };
  const viscosity = viscosityOf(parsed, density, own('viscosities'));
  if (!viscosity.ok) return viscosity;
  return ok({
    name: product,
    density,
    ...(viscosity.value === undefined ? {} : { viscosity: viscosity.value }),
    boils: false,
    pressure: {
      symbol: 'CPL',
      at: (p, T) => compressionFactor(group, rho60, p, T),
      max: highestPressure,
      furthest: 2 * highestPressure,
      source: compression,
      words: 'correction-pressure',
    },
    working: (T) => [expansionWorking(settled.value, T)],
  });
}

function viscosityOf({ rows }: Parsed, density: Property, path: string): Outcome<Property | undefined> {
  const stated = rows.viscosities;
  if (stated === undefined) return ok(undefined);
  const ordered = orderedRows(stated, path);
  if (!ordered.ok) return ordered;
  const points = waltherPoints(stated, density.at, path);
  if (!points.ok) return points;
  const rising = points.value.findIndex(
    ([, W], index) => W >= (points.value[index - 1]?.[1] ?? Number.POSITIVE_INFINITY),
  );
  if (rising > 0) return fail('viscosity-rises', `${path}.${rising}.viscosity`, { row: rising + 1 });
  const temperatures = points.value.map(([T]) => T);
  return ok({
    at: (T) => walther(points.value, T) * density.at(T), // μ = ρ ν
    min: Math.min(...temperatures),
    max: Math.max(...temperatures),
    below: furthestAlong,
    above: furthestAlong,
    source: viscosityBy,
    remark: 'liquid-own-walther',
  });
}

function expansionWorking({ group, rho60 }: Settled, T: number): Working {
  const { alpha60 } = thermal(group, rho60);
  return {
    id: 'density-reference',
    symbol: 'ρ_s',
    formula: 'ρ_60 * exp(-α_60 * Δt * (1 + 0.8 * α_60 * (Δt + δ_60)))',
    given: [
      { symbol: 'ρ_60', value: rho60, unit: 'kg/m3', words: 'density-60' },
      { symbol: 'α_60', value: alpha60, unit: '1/degF', words: 'expansion-60' },
      { symbol: 'Δt', value: onIpts68(fahrenheit(T)) - baseTemperature68, unit: 'degF', words: 'temperature-above-60' },
      { symbol: 'δ_60', value: delta60, unit: 'degF', words: 'shift-60' },
    ],
    value: rho60 * expansionFactor(group, rho60, T),
    unit: 'kg/m3',
    source: expansion,
    remark: `petroleum-${group.group}`,
  };
}
