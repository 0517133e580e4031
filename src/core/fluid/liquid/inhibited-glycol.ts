/**
 * Inhibited glycols in water, by the tables of their volume concentration.
 * Standard: none; ASHRAE Handbook, Fundamentals. Symbols: volume per cent, t in degC, SI at the outside.
 */

import { interpolate, type Point } from '../../numeric/interpolate.ts';
import { celsius, kelvin } from '../../quantity/constants.ts';
import { fail, type Outcome, ok } from '../../quantity/outcome.ts';
import type { Source } from '../../quantity/source.ts';
import { aqueousModulus, concentrationWithin, waterBound } from './aqueous.ts';
import type { Liquid, Property } from './contract.ts';
import { glycols } from './inhibited-glycol.table.ts';

const source: Source = {
  clause: 'ASHRAE Handbook, Fundamentals, tables of aqueous glycols, between their points',
  seen: 'second-hand',
};

type Grid = readonly (readonly (number | undefined)[])[];

/** The entries of one column of a table, by temperature; what is not printed is left out. */
const columnOf = (grid: Grid, temperature: readonly number[], column: number): readonly Point[] =>
  temperature.flatMap((t, row) => {
    const value = grid[row]?.[column];
    return value === undefined ? [] : [[t, value] as const];
  });

/** Volume per cent of a mass per cent, by the table's own conversion. */
const volumeOf = (pairs: readonly Point[], mass: number): number =>
  interpolate(
    pairs.map(([volume, percent]) => [percent, volume] as const),
    mass,
  );

/** The columns on either side of a volume per cent; one where it stands on a column, which may freeze later than both. */
function columnsAround(volume: readonly number[], v: number): readonly number[] {
  const on = volume.findIndex((column) => Math.abs(column - v) < 1e-9); // rounding of the share
  if (on >= 0) return [on];
  const right = volume.findIndex((column) => column > v);
  return [right - 1, right];
}

/** The glycol of a name at a share of mass or volume. Problems: field-missing, concentration-out-of-range. */
export function inhibitedGlycol(
  name: string,
  share: number | undefined,
  basis: 'mass' | 'volume',
  path: string,
): Outcome<Liquid> | undefined {
  const row = glycols.find((candidate) => candidate.name === name);
  if (row === undefined) return undefined;
  const { volume, temperature, massOfVolume } = row;
  if (share === undefined) return fail('field-missing', path);
  const ends = [volume[0], volume[volume.length - 1] as number] as const;
  const [min, max] = ends.map((end) => (basis === 'volume' ? end : interpolate(massOfVolume, end)) / 100) as [
    number,
    number,
  ];
  const settled = concentrationWithin(share, { min, max }, path);
  if (!settled.ok) return settled;
  const v = basis === 'volume' ? 100 * share : volumeOf(massOfVolume, 100 * share);
  const columns = columnsAround(volume, v);
  const between = (grid: Grid): ((t: number) => number) => {
    const sides = columns.map((column) => columnOf(grid, temperature, column));
    return (t) =>
      interpolate(
        columns.map(
          (column, side) => [volume[column] as number, interpolate(sides[side] as readonly Point[], t)] as const,
        ),
        v,
      );
  };
  return ok(liquidOf(name, row, columns, between));
}

/** Temperatures of the table of a glycol, K, between which it runs straight; none of another name. */
export const inhibitedTemperatures = (name: string | undefined): readonly number[] =>
  (glycols.find((candidate) => candidate.name === name)?.temperature ?? []).map(kelvin);

function liquidOf(
  name: string,
  { density, viscosity, temperature }: (typeof glycols)[number],
  columns: readonly number[],
  between: (grid: Grid) => (t: number) => number,
): Liquid {
  const logarithms = viscosity.map((line) => line.map((mu) => (mu === undefined ? undefined : Math.log(mu))));
  const starts = columns.map((column) => columnOf(density, temperature, column)[0]?.[0] as number);
  const range = {
    min: kelvin(Math.max(...starts)), // below it one of the two mixtures freezes
    max: kelvin(temperature[temperature.length - 1] as number),
    below: 0,
    above: 0,
    source,
  };
  const [rho, lnMu] = [between(density), between(logarithms)];
  const byDensity: Property = { ...range, at: (T) => rho(celsius(T)), remark: 'liquid-table-between' };
  const byViscosity: Property = {
    ...range,
    at: (T) => 1e-3 * Math.exp(lnMu(celsius(T))),
    remark: 'liquid-table-between',
  };
  return {
    name,
    density: byDensity,
    viscosity: byViscosity,
    vapourPressure: waterBound,
    boils: false,
    bulkModulus: aqueousModulus,
  };
}
