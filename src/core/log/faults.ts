/** Rows as they are read -> rows with a differential, a pressure and a temperature, each with the first of its account. */
import {
  differentialOf,
  type Output,
  placeOf,
  type Range,
  type Signal,
  type SignalLimits,
  type SignalState,
  stateOfSignal,
} from '../reading/signal.ts';
import { ACCOUNT, accountOfTrouble } from './account.ts';
import { type Batch, makeRoom } from './batch.ts';
import { type Chunk, PRESSURE_MISSING, TEMPERATURE_MISSING, TIME_REPEATED } from './chunk.ts';
import { isSpike, openSpikes, type Spikes } from './spike.ts';

/** Figure of every row where no column holds it, and what stands in where a row of the column has none. */
export interface StandIn {
  readonly constant: number;
  readonly fallback?: number;
}

/** The signal of a transmitter, all in the unit of the column. */
export interface SignalRule {
  readonly ends: Pick<Signal, 'zero' | 'full'>;
  readonly range: Range;
  readonly output: Output;
  readonly zero: number; // of the cell, Pa
  readonly limits: SignalLimits;
}

export interface FaultRule {
  /** Absent where the column holds the differential. */
  readonly signal?: SignalRule;
  readonly pressure: StandIn; // Pa absolute
  readonly temperature: StandIn; // K
  /** A differential below it, on either side of zero, is no flow, Pa; 0 where no cut-off is stated. */
  readonly cutOff: number;
  /** Rows with one and the same signal from which on they count as frozen; absent where that is not looked for. */
  readonly frozen?: number;
  /** Distance from the median of the rows before, in median absolute deviations; absent where that is not looked for. */
  readonly spike?: number;
}

export interface Faults {
  readonly rule: FaultRule;
  /** The latest stamp. */
  clock: number;
  signal: number;
  same: number; // rows that have shown it so far
  readonly spikes?: Spikes;
}

export const openFaults = (rule: FaultRule): Faults => ({
  rule,
  clock: Number.NEGATIVE_INFINITY,
  signal: Number.NaN,
  same: 0,
  ...(rule.spike === undefined ? {} : { spikes: openSpikes(rule.spike) }),
});

/** Puts the rows of a chunk behind those of a batch. */
export function screen(faults: Faults, chunk: Chunk, batch: Batch): void {
  makeRoom(batch, chunk.size);
  for (let at = 0; at < chunk.size; at += 1) {
    const place = batch.size + at;
    const trouble = chunk.trouble[at] as number;
    const time = chunk.time[at] as number;
    batch.row[place] = chunk.row[at] as number;
    batch.time[place] = time;
    batch.flow[place] = 0;
    batch.density[place] = 0;
    if (trouble !== 0) batch.account[place] = accountOfTrouble(trouble);
    else if (time < faults.clock) batch.account[place] = ACCOUNT.backward;
    else {
      faults.clock = time;
      batch.account[place] = judge(faults, chunk, at, batch, place);
    }
  }
  batch.size += chunk.size;
}

/** What the limits of a signal make of its row. */
const OF_STATE: Readonly<Record<SignalState, number>> = {
  valid: ACCOUNT.converted,
  uncertain: ACCOUNT.uncertain,
  saturated: ACCOUNT.saturated,
  faulty: ACCOUNT.fault,
};

/** The account of a row that has its place in time; fills in its figures. */
function judge(faults: Faults, chunk: Chunk, at: number, batch: Batch, place: number): number {
  const { rule, spikes } = faults;
  const signal = chunk.signal[at] as number;
  const missing = chunk.missing[at] as number;
  const frozen = isFrozen(faults, signal);
  const state = rule.signal === undefined ? ACCOUNT.converted : OF_STATE[stateOfSignal(signal, rule.signal.limits)];
  if (state === ACCOUNT.fault) return state;
  const differential = rule.signal === undefined ? signal : seen(rule.signal, signal);
  const spike = spikes !== undefined && isSpike(spikes, differential);
  batch.differential[place] = differential;
  const noPressure = (missing & PRESSURE_MISSING) !== 0;
  const pressure = noPressure ? rule.pressure.fallback : (chunk.pressure?.[at] ?? rule.pressure.constant);
  if (pressure === undefined) return ACCOUNT.pressureMissing;
  const noTemperature = (missing & TEMPERATURE_MISSING) !== 0;
  const temperature = noTemperature
    ? rule.temperature.fallback
    : (chunk.temperature?.[at] ?? rule.temperature.constant);
  if (temperature === undefined) return ACCOUNT.temperatureMissing;
  batch.pressure[place] = pressure;
  batch.temperature[place] = temperature;
  if (state !== ACCOUNT.converted) return state;
  if (Math.abs(differential) < rule.cutOff) return ACCOUNT.belowCutOff;
  if (differential < 0) return ACCOUNT.negative;
  if (noPressure) return ACCOUNT.pressureSubstituted;
  if (noTemperature) return ACCOUNT.temperatureSubstituted;
  if (spike) return ACCOUNT.spike;
  if (frozen) return ACCOUNT.frozen;
  return (missing & TIME_REPEATED) === 0 ? ACCOUNT.converted : ACCOUNT.hourRepeated;
}

/** Differential of a signal, Pa. */
const seen = ({ ends, range, output, zero }: SignalRule, signal: number): number =>
  differentialOf(placeOf(signal, ends), range, output) - zero;

/** Whether the signal has stood still for as many rows as are stated. */
function isFrozen(faults: Faults, signal: number): boolean {
  faults.same = signal === faults.signal ? faults.same + 1 : 1;
  faults.signal = signal;
  return faults.rule.frozen !== undefined && faults.same >= faults.rule.frozen;
}
