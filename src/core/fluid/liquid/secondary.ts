/**
 * Aqueous mixtures without inhibitors: glycols, alcohols, glycerol, ammonia and brines.
 * Standard: none; Melinder, Properties of Secondary Working Fluids for Indirect Systems, IIR 2010. Symbols: those of the
 * source; x in mass per cent, t in degC, SI at the outside.
 */
import { celsius, kelvin } from '../../quantity/constants.ts';
import { type Outcome, ok } from '../../quantity/outcome.ts';
import type { Source } from '../../quantity/source.ts';
import { aqueousModulus, concentrationWithin, waterBound } from './aqueous.ts';
import { furthestBeyond, type Liquid, type Property } from './contract.ts';
import { exponents, mixtures } from './secondary.table.ts';

const source: Source = {
  clause: 'Melinder, IIR 2010, polynomial in concentration and temperature',
  seen: 'second-hand',
};

/** Mixtures whose vapour is not that of water alone. */
const volatile: readonly string[] = ['ethanol-water', 'methanol-water', 'ammonia-water'];

/** Sum of c_k (x - x_m)^i (t - t_m)^j. */
export function polynomial(
  c: readonly number[],
  { x: xm, t: tm }: { readonly x: number; readonly t: number },
  x: number,
  t: number,
): number {
  return exponents.reduce((sum, [i, j], k) => sum + (c[k] as number) * (x - xm) ** i * (t - tm) ** j, 0);
}

/** The mixture of a name at a mass fraction; undefined where the list has none. Problems: those of the concentration. */
export function secondaryFluid(name: string, share: number | undefined, path: string): Outcome<Liquid> | undefined {
  const row = mixtures.find((candidate) => candidate.name === name);
  if (row === undefined) return undefined;
  const settled = concentrationWithin(share, { min: row.x.min / 100, max: row.x.max / 100 }, path);
  if (!settled.ok) return settled;
  const x = 100 * settled.value; // mass per cent
  const { mean } = row;
  const range = {
    min: kelvin(polynomial(row.freezing, mean, x, mean.t)), // the freezing temperature does not depend on t
    max: kelvin(row.highest),
    below: 0,
    above: furthestBeyond,
    source,
  };
  const density: Property = {
    ...range,
    at: (T) => polynomial(row.density, mean, x, celsius(T)),
    share: 0.002, // own estimate against the tables
    remark: 'liquid-mixture-density',
  };
  const viscosity: Property = {
    ...range,
    at: (T) => 1e-3 * Math.exp(polynomial(row.viscosity, mean, x, celsius(T))), // ln of mPa.s
    share: 0.04, // own estimate against the tables
    remark: 'liquid-mixture-viscosity',
  };
  return ok({
    name,
    density,
    viscosity,
    ...(volatile.includes(name) ? {} : { vapourPressure: waterBound }),
    boils: false,
    bulkModulus: aqueousModulus,
  });
}
