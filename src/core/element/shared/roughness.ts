/** Limits of the roughness of the upstream pipe, Ra in m. */
import type { Length } from '../../quantity/kinds.ts';
import type { Limit } from '../contract.ts';
import { along, between, bracket } from './bracket.ts';
import {
  nozzleRoughest,
  orificeRoughest,
  orificeSmoothest,
  type RoughnessTable,
  smoothBand,
} from './roughness.table.ts';

/**
 * Square-edged orifice plates: Ra/D between the minimum and the maximum of the tables, linear in beta and in lg Re_D
 * between their figures and held outside. In bores of 150 mm and more the band of 1 (or 1.5) to 6 micrometres is
 * accepted as well, up to the Reynolds number given with it.
 */
export const orificeRoughness = (pipe: Length, ratio: number, reynolds: number): Limit => {
  const roughest = 1e-4 * lookUp(orificeRoughest, ratio, reynolds) * pipe; // ISO 5167-2, Table 1
  const bounded = reynolds >= (orificeSmoothest.reynolds[0] as number); // ISO 5167-2, Table 2
  const smoothest = bounded ? 1e-4 * lookUp(orificeSmoothest, ratio, reynolds) * pipe : 0; // ISO 5167-2, Table 2
  const band = smoothBand(ratio);
  const accepted = pipe >= 0.15 && reynolds <= band.reynolds; // ISO 5167-2, 5.3.1
  const max = accepted ? Math.max(roughest, band.max) : roughest;
  const min = accepted ? Math.min(smoothest, band.min) : smoothest;
  return { id: 'pipe-roughness', ...(min > 0 ? { min } : {}), max, source: orificeRoughest.source };
};

/** ISA 1932 and Venturi nozzles: the maximum of Ra/D depends on beta alone. */
export const nozzleRoughness = (pipe: Length, ratio: number): Limit => ({
  id: 'pipe-roughness',
  max: 1e-4 * lookUp(nozzleRoughest, ratio, 1) * pipe, // ISO 5167-3, Tables 1 and 2
  source: nozzleRoughest.source,
});

/** The figure of the table in 1e-4 Ra/D, bilinear in beta and lg Re_D, held outside. */
const lookUp = (table: RoughnessTable, ratio: number, reynolds: number): number => {
  const column = bracket(table.reynolds.map(Math.log10), Math.log10(reynolds));
  const atReynolds = table.values.map((row) => between(row, column));
  return along(table.ratios, atReynolds, ratio);
};
