/**
 * What the density in a leg stands on: a leg full of the process fluid counts with the density of the line, and one that
 * stands at another temperature holds another. Standard: none, hydrostatics; the limit of 20 K is practice.
 */
import type { Caution, FluidState } from '../fluid/contract.ts';
import type { Legs } from '../input/instrument.ts';
import type { Temperature } from '../quantity/kinds.ts';
import type { Source } from '../quantity/source.ts';

const PRACTICE: Source = { clause: 'temperature of the legs, custom of the trade', seen: 'memory' };
/** Difference between line and instrument from which on the densities are told apart, K. */
const APART = 20; // custom of the trade
/** Share of the differential that a gas in the legs may move without a word: a twentieth of a percent of the flow. */
const UNNOTICED = 1e-3;

/** Metres of each leg in the differential: what one kg/m3 more in it adds is that times gravity. */
export interface LegLengths {
  readonly upstream: number;
  readonly downstream: number;
}

/** One reading as its legs see it. */
export interface LegsSeen {
  readonly temperature: Temperature; // at the instrument
  readonly differential: number; // Pa
  readonly state: FluidState;
  readonly gravity: number; // m/s2
}

/** A caution where the process fluid in the legs enters the differential and stands at another stated temperature. */
export function legTemperatureCautions(legs: Legs, lengths: LegLengths, seen: LegsSeen): readonly Caution[] {
  const { temperature, state } = seen;
  const length =
    (legs.upstream === 'process' ? lengths.upstream : 0) + (legs.downstream === 'process' ? lengths.downstream : 0);
  const apart = Math.abs(temperature - state.temperature) > APART;
  if (!legs.temperatureStated || !apart || !isNoticed(Math.abs(length), seen)) return [];
  return [
    {
      id: 'legs-at-line-temperature',
      verdict: 'caution',
      value: temperature,
      unit: 'K',
      limit: { min: state.temperature - APART, max: state.temperature + APART },
      source: PRACTICE,
    },
  ];
}

/**
 * Whether another density in so many metres can move the differential: that of a gas follows the temperature; what a
 * liquid or a vapour becomes only its model knows, and any length counts.
 */
function isNoticed(length: number, { temperature, differential, state, gravity }: LegsSeen): boolean {
  if (length < 1e-9) return false; // the rounding of lengths
  if (state.phase !== 'gas') return true;
  const change = state.density * Math.abs(state.temperature / temperature - 1); // rho ~ 1/T at one pressure
  return change * gravity * length > UNNOTICED * Math.abs(differential);
}
