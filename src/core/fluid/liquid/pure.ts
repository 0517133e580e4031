/**
 * Pure liquids along saturation.
 * Standard: none; Perry's Chemical Engineers' Handbook, 8th edition, Tables 2-32, 2-313 and 2-8. Symbols: those of the
 * tables; K, and SI after the molar mass.
 */
import type { Source } from '../../quantity/source.ts';
import { furthestBeyond, type Liquid, type Property } from './contract.ts';
import { pureLiquids } from './pure.table.ts';

type Constants = readonly [number, number, number, number, number];

const table = (number: string): Source => ({
  clause: `Perry's Chemical Engineers' Handbook, 8th edition, Table ${number}`,
  seen: 'second-hand',
});

/** ρ = M C1 / C2^(1 + (1 - T/C3)^C4), kg/m3 with M in g/mol and C1 in kmol/m3. Table 2-32, up to the critical C3. */
export const saturatedDensity = (
  [C1, C2, C3, C4]: readonly [number, number, number, number],
  M: number,
  T: number,
): number => (M * C1) / C2 ** (1 + Math.max(0, 1 - T / C3) ** C4);

/** exp(C1 + C2/T + C3 ln T + C4 T^C5): viscosity in Pa.s (Table 2-313), vapour pressure in Pa (Table 2-8). */
export const exponential = ([C1, C2, C3, C4, C5]: Constants, T: number): number =>
  Math.exp(C1 + C2 / T + C3 * Math.log(T) + C4 * T ** C5);

/** Bulk moduli (practice): the typical compressibilities 1e-9 per Pa of organic liquids and 3e-9 of light hydrocarbons. */
const organic = 1e9; // Pa
const light = 1 / 3e-9; // Pa
const lightLiquids: readonly string[] = [
  'ethane',
  'ethylene',
  'propane',
  'propylene',
  'butane',
  'isobutane',
  'carbon-dioxide',
  'hydrogen-sulfide',
];

/** The pure liquid of a name; undefined where the list has none. */
export function pureLiquid(name: string): Liquid | undefined {
  const row = pureLiquids.find((candidate) => candidate.name === name);
  if (row === undefined) return undefined;
  const { density, viscosity, vapour, molarMass: M } = row;
  const along = (
    { c, min, max }: { readonly c: Constants; readonly min: number; readonly max: number },
    number: string,
    remark: string,
    beyond: number,
  ): Property => ({
    at: (T) => exponential(c, T),
    min,
    max,
    below: beyond,
    above: beyond,
    source: table(number),
    remark,
  });
  return {
    name,
    density: {
      at: (T) => saturatedDensity(density.c, M, T),
      min: density.min,
      max: density.max,
      below: 0, // it freezes
      above: 0, // the critical point
      source: table('2-32'),
      share: 0.01, // usual bound of the table
      remark: 'liquid-saturated-density',
    },
    viscosity: { ...along(viscosity, '2-313', 'liquid-viscosity-curve', furthestBeyond), share: 0.05 },
    vapourPressure: along(vapour, '2-8', 'liquid-vapour-curve', 0),
    boils: true,
    bulkModulus: lightLiquids.includes(name) ? light : organic,
  };
}
