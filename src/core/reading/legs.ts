/** Densities of what fills the legs at the moment of a reading, and their figures in a working. */
import type { FluidState } from '../fluid/contract.ts';
import { gaugeWaterDensity } from '../fluid/gauge-liquid.ts';
import type { Fill, Legs } from '../input/instrument.ts';
import type { Temperature } from '../quantity/kinds.ts';
import { type Given, named } from '../quantity/working.ts';

export interface LegDensities {
  readonly process: number; // kg/m3, in the pipe
  readonly upstream: number;
  readonly downstream: number;
  readonly rise: number; // m
  readonly drop: number; // m
}

/** The legs at a state of the process fluid; `ambient` is the temperature of water in them. */
export function legsAt(
  { upstream, downstream, rise, drop }: Legs,
  state: FluidState,
  ambient: Temperature,
): LegDensities {
  const density = (fill: Fill): number => {
    if (fill === 'process') return state.density;
    return fill === 'water' ? gaugeWaterDensity(ambient, state.pressure) : fill;
  };
  return { process: state.density, upstream: density(upstream), downstream: density(downstream), rise, drop };
}

/** How far the formula of a differential has to go: nothing but the process fluid, one filling of both, or two. */
export type Filling = 'process' | 'one' | 'two';

export function fillingOf({ process, upstream, downstream }: LegDensities): Filling {
  if (upstream !== downstream) return 'two';
  return upstream === process ? 'process' : 'one';
}

/** The figures that the formulas name, as far as a filling needs them. */
export function legsGiven(legs: LegDensities): readonly Given[] {
  const process = named('ρ_1', legs.process, 'kg/m3', 'density');
  const rise = named('s', legs.rise, 'm', 'rise-of-tappings');
  const filling = fillingOf(legs);
  if (filling === 'process') return [process];
  if (filling === 'one') return [process, named('ρ_L', legs.upstream, 'kg/m3', 'density-of-legs'), rise];
  return [
    process,
    named('ρ_L', legs.upstream, 'kg/m3', 'density-of-upstream-leg'),
    named('ρ_M', legs.downstream, 'kg/m3', 'density-of-downstream-leg'),
    rise,
    named('z', legs.drop, 'm', 'drop-of-tapping'),
  ];
}
