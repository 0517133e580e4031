/** The fields of a transmitter: signal, range, output, limits, cut-off, and a second cell of a lower range. */
import { at, type Form } from '../input/form.ts';
import { as } from '../quantity/brand.ts';
import type { PressureDifference } from '../quantity/kinds.ts';
import {
  OUTPUTS,
  type Output,
  type Range,
  SIGNALS,
  type Signal,
  type SignalLimits,
  signals,
  usualLimits,
} from './signal.ts';

export interface LowRange {
  readonly range: Range;
  readonly zero: number; // Pa
  /** Places in its range between which the cell in use stays. */
  readonly up: number;
  readonly down: number;
}

export interface TransmitterFields {
  readonly signal: Signal;
  readonly output: Output;
  readonly range: Range;
  readonly limits: SignalLimits;
  readonly zero: number; // Pa
  /** Differential below which no flow is counted, Pa; 0 where none is stated. */
  readonly cutOff: number;
  readonly lowRange?: LowRange;
}

/** Usual change-over of stacked ranges, by practice from memory: up between 90 and 95 %, down between 80 and 90 %. */
const CHANGE = { up: 0.9, down: 0.85 } as const;

/**
 * Reads the fields. Problems: range-not-rising; root-from-zero (a root signal needs a range from zero); limits-order;
 * low-range-not-lower; change-order.
 */
export function readTransmitterFields(form: Form): TransmitterFields | undefined {
  const name = form.choice('instrument.signal', SIGNALS, true);
  const output = form.choice('instrument.output', OUTPUTS) ?? 'linear';
  const range = readRange(form, 'instrument', output);
  const zero = readDifference(form, 'instrument.zero');
  if (name === undefined || range === undefined) return undefined;
  const signal = signals[name];
  const limits = readLimits(form, signal);
  const cutOff = readCutOff(form, range);
  const lowRange = readLowRange(form, range, output);
  return { signal, output, range, limits, zero, cutOff, ...(lowRange === undefined ? {} : { lowRange }) };
}

const readDifference = (form: Form, field: string): number => form.quantity(field, ['pressure difference'])?.si ?? 0;

function readRange(form: Form, group: string, output: Output): Range | undefined {
  const lower = form.quantity(`${group}.lower`, ['pressure difference'])?.si ?? as<'pressure difference'>(0);
  const upper = form.quantity(`${group}.upper`, ['pressure difference'], true)?.si;
  if (upper === undefined) return undefined;
  if (upper <= lower) return form.report('range-not-rising', `${group}.upper`, { lower, upper });
  if (output === 'square-root' && lower !== 0) return form.report('root-from-zero', `${group}.lower`, { lower });
  return { lower, upper };
}

function readLimits(form: Form, signal: Signal): SignalLimits {
  const usual = usualLimits(signal);
  const read = (name: keyof SignalLimits) =>
    form.quantity(`instrument.limits.${name}`, [signal.measure])?.si ?? usual[name];
  const limits = { failLow: read('failLow'), low: read('low'), high: read('high'), failHigh: read('failHigh') };
  const { failLow, low, high, failHigh } = limits;
  if (!(failLow <= low && low < high && high <= failHigh)) form.report('limits-order', 'instrument.limits', {});
  return limits;
}

/** A share of the flow at the end of the range, or a differential. */
function readCutOff(form: Form, { lower, upper }: Range): PressureDifference {
  const field = 'instrument.cutOff';
  const read = form.quantity(field, ['share', 'pressure difference']);
  if (read === undefined) return as<'pressure difference'>(0);
  if (read.si < 0) form.report('negative', field, { written: `${read.number} ${read.unit.symbol}` });
  const full = Math.max(Math.abs(lower), upper);
  return as<'pressure difference'>(read.measure === 'share' ? read.si ** 2 * full : read.si); // dp = f2 of full
}

function readLowRange(form: Form, main: Range, output: Output): LowRange | undefined {
  const group = 'instrument.lowRange';
  const written = at(form.group, group);
  if (typeof written !== 'object' || written === null) return undefined;
  const range = readRange(form, group, output);
  const zero = readDifference(form, `${group}.zero`);
  const up = form.quantity(`${group}.up`, ['share'])?.si ?? CHANGE.up;
  const down = form.quantity(`${group}.down`, ['share'])?.si ?? CHANGE.down;
  if (range === undefined) return undefined;
  if (range.upper >= main.upper) return form.report('low-range-not-lower', `${group}.upper`, { upper: range.upper });
  if (!(down > 0 && down < up && up <= 1)) return form.report('change-order', `${group}.up`, { up, down });
  return { range, zero, up, down };
}
