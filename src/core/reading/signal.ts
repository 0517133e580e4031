/**
 * The signal of a transmitter: its ends, its place between them, the differential it stands for, and where it stops being
 * a value. Standard: IEC 60381-1 and -2 (ends of current and voltage); NAMUR NE 43 (limits), second-hand. Symbols: x the
 * place between the ends, 0 to 1 inside the range; Δp_0, Δp_1 the range; SI.
 */
import { as } from '../quantity/brand.ts';
import type { PressureDifference } from '../quantity/kinds.ts';
import type { Source } from '../quantity/source.ts';
import type { Measure } from '../quantity/units.ts';

export const SIGNALS = ['4-20 mA', '1-5 V', 'percent'] as const;
export type SignalName = (typeof SIGNALS)[number];
export const OUTPUTS = ['linear', 'square-root'] as const;
export type Output = (typeof OUTPUTS)[number];

export interface Signal {
  readonly measure: Extract<Measure, 'current' | 'voltage' | 'share'>;
  /** Its ends, SI. */
  readonly zero: number;
  readonly full: number;
  /** Unit of findings and workings, with its size in SI. */
  readonly unit: string;
  readonly size: number;
}

/** IEC 60381-1 and -2; a share of the range. */
export const signals: Readonly<Record<SignalName, Signal>> = {
  '4-20 mA': { measure: 'current', zero: 4e-3, full: 20e-3, unit: 'mA', size: 1e-3 },
  '1-5 V': { measure: 'voltage', zero: 1, full: 5, unit: 'V', size: 1 },
  percent: { measure: 'share', zero: 0, full: 1, unit: '%', size: 1e-2 },
};

/** Signals at which a value stops being one, SI. */
export interface SignalLimits {
  readonly failLow: number;
  readonly low: number;
  readonly high: number;
  readonly failHigh: number;
}

export const NE43: Source = { clause: 'NAMUR NE 43', seen: 'second-hand' };
/** 3.6, 3.8, 20.5 and 21 mA as places between 4 and 20 mA. NAMUR NE 43, second-hand. */
const USUAL = { failLow: -0.025, low: -0.0125, high: 1.03125, failHigh: 1.0625 } as const; // NE 43

/** The usual limits of a signal: of voltages and shares in proportion. */
export const usualLimits = ({ zero, full }: Signal): SignalLimits => ({
  failLow: at(USUAL.failLow, zero, full),
  low: at(USUAL.low, zero, full),
  high: at(USUAL.high, zero, full),
  failHigh: at(USUAL.failHigh, zero, full),
});

const at = (x: number, zero: number, full: number): number => zero + x * (full - zero);

/** Place of a signal between its ends, all three in one unit. */
export const placeOf = (signal: number, { zero, full }: Pick<Signal, 'zero' | 'full'>): number =>
  (signal - zero) / (full - zero);

/** What a limit says of a signal; the limits of failure themselves are failures. */
export type SignalState = 'faulty' | 'uncertain' | 'valid' | 'saturated';

export function stateOfSignal(signal: number, { failLow, low, high, failHigh }: SignalLimits): SignalState {
  if (signal <= failLow || signal >= failHigh) return 'faulty';
  if (signal > high) return 'saturated';
  return signal < low ? 'uncertain' : 'valid';
}

export interface Range {
  readonly lower: PressureDifference;
  readonly upper: PressureDifference;
}

/** Differential of a place; the root of a signed difference keeps its sign. Root signals have a range from zero. */
export function differentialOf(x: number, { lower, upper }: Range, output: Output): PressureDifference {
  if (output === 'linear') return as<'pressure difference'>(lower + x * (upper - lower));
  return as<'pressure difference'>(upper * x * Math.abs(x)); // sign(x) x2
}

/** Place of a differential, the inverse. */
export function placeFrom(differential: number, { lower, upper }: Range, output: Output): number {
  if (output === 'linear') return (differential - lower) / (upper - lower);
  return Math.sign(differential) * Math.sqrt(Math.abs(differential) / upper);
}

/** What one unit of place is in the differential at a place, Pa. */
export const slopeAt = (x: number, { lower, upper }: Range, output: Output): number =>
  output === 'linear' ? upper - lower : 2 * upper * Math.abs(x);
