/** What a stretch of a log comes to, a day or all of it: sums weighted by time, and extremes with their times. */
import { add, addAll, sumOf, sums } from '../numeric/neumaier.ts';

/** The sums of a period: each is the integral over time of what its name says. */
export const SUM = {
  seconds: 0,
  mass: 1,
  volume: 2, // at the state of each row
  flowing: 3, // s
  differential: 4,
  root: 5, // of the differential
  pressure: 6,
  temperature: 7,
  flowPressure: 8, // mass flow times pressure
  flowTemperature: 9,
} as const;
const SUMS = 10;

/** Columns whose extremes are kept, and their place. */
export const EXTREME = { flow: 0, differential: 1, pressure: 2, temperature: 3 } as const;
const EXTREMES = 4;
const FIELDS = 4; // least, its time, most, its time

export interface Period {
  /** Bounds of the day, s; the second is outside. */
  readonly from: number;
  readonly to: number;
  readonly sums: Float64Array;
  /** By account: rows, seconds, and the mass in kg that passed while it lasted. */
  readonly rows: Float64Array;
  readonly seconds: Float64Array;
  readonly mass: Float64Array;
  readonly extremes: Float64Array;
  gaps: number;
  gapSeconds: number;
}

export function openPeriod(from: number, to: number, accounts: number): Period {
  const extremes = new Float64Array(EXTREMES * FIELDS);
  for (let column = 0; column < EXTREMES; column += 1) {
    extremes[FIELDS * column] = Number.POSITIVE_INFINITY;
    extremes[FIELDS * column + 2] = Number.NEGATIVE_INFINITY;
  }
  return {
    from,
    to,
    sums: sums(SUMS),
    rows: new Float64Array(accounts),
    seconds: new Float64Array(accounts),
    mass: sums(accounts),
    extremes,
    gaps: 0,
    gapSeconds: 0,
  };
}

/** A converted row, in SI. */
export interface Sample {
  time: number;
  flow: number;
  density: number;
  differential: number;
  pressure: number;
  temperature: number;
  account: number;
}

export const emptySample = (): Sample => ({
  time: 0,
  flow: 0,
  density: 1,
  differential: 0,
  pressure: 0,
  temperature: 0,
  account: 0,
});

/** Counts a sample in for so many seconds. */
export function weigh(period: Period, sample: Sample, seconds: number): void {
  if (seconds === 0) return;
  const { flow, density, differential, pressure, temperature, account } = sample;
  const { sums: all } = period;
  const mass = flow * seconds;
  add(all, SUM.seconds, seconds);
  add(all, SUM.differential, differential * seconds);
  add(all, SUM.pressure, pressure * seconds);
  add(all, SUM.temperature, temperature * seconds);
  if (account !== 0) add(period.mass, account, mass);
  if (flow === 0) return;
  add(all, SUM.mass, mass);
  add(all, SUM.volume, mass / density);
  add(all, SUM.flowing, seconds);
  add(all, SUM.root, Math.sqrt(differential) * seconds);
  add(all, SUM.flowPressure, pressure * mass);
  add(all, SUM.flowTemperature, temperature * mass);
}

/** Takes the sample into the extremes of the period in which it was logged. */
export function reach({ extremes }: Period, { time, flow, differential, pressure, temperature }: Sample): void {
  stretch(extremes, EXTREME.flow, flow, time);
  stretch(extremes, EXTREME.differential, differential, time);
  stretch(extremes, EXTREME.pressure, pressure, time);
  stretch(extremes, EXTREME.temperature, temperature, time);
}

function stretch(extremes: Float64Array, column: number, value: number, time: number): void {
  const at = FIELDS * column;
  if (value < (extremes[at] as number)) {
    extremes[at] = value;
    extremes[at + 1] = time;
  }
  if (value > (extremes[at + 2] as number)) {
    extremes[at + 2] = value;
    extremes[at + 3] = time;
  }
}

/** Adds a later period to an earlier one. */
export function join(all: Period, later: Period): void {
  addAll(all.sums, later.sums);
  addAll(all.mass, later.mass);
  for (let account = 0; account < all.rows.length; account += 1) {
    all.rows[account] = (all.rows[account] as number) + (later.rows[account] as number);
    all.seconds[account] = (all.seconds[account] as number) + (later.seconds[account] as number);
  }
  for (let column = 0; column < EXTREMES; column += 1) {
    const [least = 0, leastTime = 0, most = 0, mostTime = 0] = extremeOf(later, column);
    stretch(all.extremes, column, least, leastTime);
    stretch(all.extremes, column, most, mostTime);
  }
}

/** Least, its time, most, its time; infinite where the period has no sample. */
export const extremeOf = ({ extremes }: Period, column: number): Float64Array =>
  extremes.subarray(FIELDS * column, FIELDS * (column + 1));

/** The integral of a slot over the period. */
export const integral = (period: Period, slot: number): number => sumOf(period.sums, slot);
