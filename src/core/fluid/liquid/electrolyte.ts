/**
 * Solutions of one salt, acid or base in water.
 * Standard: none; Laliberté and Cooper 2004 (density), Laliberté 2007 and 2009 (viscosity). Symbols: those of the papers;
 * t in degC, w mass fractions, viscosity inside in mPa.s.
 */
import { celsius, kelvin } from '../../quantity/constants.ts';
import { type Outcome, ok } from '../../quantity/outcome.ts';
import type { Source } from '../../quantity/source.ts';
import { aqueousModulus, concentrationWithin, waterBound } from './aqueous.ts';
import { furthestBeyond, type Liquid, type Property } from './contract.ts';
import { solutes } from './electrolyte.table.ts';

const densityBy: Source = { clause: 'Laliberté and Cooper, J. Chem. Eng. Data 49 (2004) 1141', seen: 'second-hand' };
const viscosityBy: Source = {
  clause: 'Laliberté, J. Chem. Eng. Data 52 (2007) 321 and 54 (2009) 1725',
  seen: 'second-hand',
};

/** Caustic soda is about 0.6 % too light at 50 % against handbook densities. */
const caustic = { name: 'sodium-hydroxide-solution', max: 0.4 } as const;
const handbook: Source = { clause: 'comparison with handbook densities of caustic soda at 20 °C', seen: 'derived' };

/** Solutes that boil off with the water. */
const volatile: readonly string[] = ['ammonia-solution', 'hydrochloric-acid-solution', 'nitric-acid-solution'];

type Five = readonly [number, number, number, number, number];
type Six = readonly [number, number, number, number, number, number];

/** Density of water at 1 atm, kg/m3, t in degC. Kell 1975, rational polynomial. */
function waterDensity(t: number): number {
  const top = [16.945176, -0.0079870401, -4.6170461e-5, 1.0556302e-7, -2.8054253e-10]; // Kell 1975
  return (top.reduceRight((sum, c) => sum * t + c, 0) * t + 999.83952) / (1 + 0.01687985 * t); // Kell 1975
}

/** Viscosity of water, mPa.s. Laliberté 2007. */
const waterViscosity = (t: number): number => (t + 246) / ((0.05594 * t + 5.2842) * t + 137.37); // Laliberté 2007

/** Density of the solution, kg/m3; w is the mass fraction of the solute. Laliberté and Cooper 2004. */
export function solutionDensity([c0, c1, c2, c3, c4]: Five, w: number, t: number): number {
  const solute = ((c0 * w + c1) * Math.exp(1e-6 * (t + c4) ** 2)) / (w + c2 + c3 * t); // kg/m3
  return 1 / ((1 - w) / waterDensity(t) + w / solute);
}

/** Viscosity of the solution, mPa.s. Laliberté 2007. */
export function solutionViscosity([v1, v2, v3, v4, v5, v6]: Six, w: number, t: number): number {
  if (w === 0) return waterViscosity(t);
  const lnSolute = (v1 * w ** v2 + v3) / (v4 * t + 1) - Math.log(v5 * w ** v6 + 1);
  return Math.exp((1 - w) * Math.log(waterViscosity(t)) + w * lnSolute);
}

/** The solution of a name at a mass fraction; undefined where the list has none. Problems: those of the concentration. */
export function electrolyte(name: string, share: number | undefined, path: string): Outcome<Liquid> | undefined {
  const row = solutes.find((candidate) => candidate.name === name);
  if (row === undefined) return undefined;
  const { density, viscosity } = row;
  const settled = concentrationWithin(share, { min: 0, max: density.most }, path);
  if (!settled.ok) return settled;
  const w = settled.value;
  const along = ({ min, max }: { readonly min: number; readonly max: number }) => ({
    min: kelvin(min),
    max: kelvin(max),
    below: furthestBeyond,
    above: furthestBeyond,
  });
  const rho: Property = {
    ...along(density),
    at: (T) => solutionDensity(density.c, w, celsius(T)),
    source: densityBy,
    share: 0.003, // mean error by its authors, up to 0.3 %
    remark: 'liquid-solution-density',
  };
  const mu: Property = {
    ...along(viscosity),
    at: (T) => 1e-3 * solutionViscosity(viscosity.c, w, celsius(T)),
    source: viscosityBy,
    share: 0.04, // 2 to 4 % by its authors
    remark: 'liquid-solution-viscosity',
  };
  const doubtful = name === caustic.name && w > caustic.max;
  return ok({
    name,
    density: rho,
    ...(w <= viscosity.most ? { viscosity: mu } : {}),
    ...(volatile.includes(name) ? {} : { vapourPressure: waterBound }),
    boils: false,
    bulkModulus: aqueousModulus,
    ...(doubtful ? { doubt: { id: 'caustic-strong', value: 100 * w, max: 100 * caustic.max, source: handbook } } : {}),
  });
}
