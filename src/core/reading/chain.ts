/**
 * The chain rule of hydrostatics: down a column the pressure rises by rho g times the fall, up it falls, and it is equal
 * at equal levels of one connected liquid at rest. Every instrument is a chain from the upstream tapping to the other.
 * Standard: none, hydrostatics. Symbols: z above the zero mark; 1 upstream, 2 downstream; SI.
 */
import { as } from '../quantity/brand.ts';
import type { PressureDifference } from '../quantity/kinds.ts';
import type { Source } from '../quantity/source.ts';
import type { LegDensities } from './legs.ts';

export const hydrostatics: Source = { clause: 'hydrostatics, columns of liquid at rest', seen: 'derived' };

export interface Column {
  readonly density: number; // kg/m3
  /** From the beginning of the column down to its end; negative where it rises. */
  readonly fall: number; // m
}

/** Pressure at the end of a chain that begins at `start`, Pa; `g` in m/s2. */
export const alongChain = (start: number, chain: readonly Column[], g: number): number =>
  chain.reduce((pressure, { density, fall }) => pressure + density * g * fall, start); // p + sum of rho g (fall)

/** (p1 + rho g z1) - (p2 + rho g z2) from p1 - p2: what the flow equation asks for. */
const piezometric = (between: number, { process, rise }: LegDensities, g: number): PressureDifference =>
  as<'pressure difference'>(between - process * g * rise); // z1 - z2 = -rise

/** Two menisci of a gauge liquid at `upstream` and `downstream`, m above the zero mark. */
export function columnsDifferential(
  levels: { readonly upstream: number; readonly downstream: number },
  liquid: number,
  legs: LegDensities,
  g: number,
): PressureDifference {
  const chain: readonly Column[] = [
    { density: legs.upstream, fall: legs.drop - levels.upstream },
    { density: liquid, fall: levels.upstream - levels.downstream },
    { density: legs.downstream, fall: levels.downstream - legs.drop - legs.rise },
  ];
  return piezometric(-alongChain(0, chain, g), legs, g);
}

/** A cell at the zero mark that sees `cell`, Pa, between its two sides. */
export function cellDifferential(cell: number, legs: LegDensities, g: number): PressureDifference {
  const down = alongChain(0, [{ density: legs.upstream, fall: legs.drop }], g);
  const up = alongChain(down - cell, [{ density: legs.downstream, fall: -legs.drop - legs.rise }], g);
  return piezometric(-up, legs, g);
}
