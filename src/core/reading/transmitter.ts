/**
 * Transmitter: a signal stands for a pressure difference, linear or as its root, within limits beyond which it is a fault.
 * Of two cells with stacked ranges the lower is used while it is not near its end.
 */
import type { Caution } from '../fluid/contract.ts';
import type { ReadingInput } from '../input/reading.ts';
import { ok } from '../quantity/outcome.ts';
import type { Source } from '../quantity/source.ts';
import { named, type Working } from '../quantity/working.ts';
import { asked } from './asked.ts';
import { type CellFields, readCell, readCellFields } from './cell.ts';
import type { Conditions, Instrument, Shown, Standing } from './contract.ts';
import { reversedCautions } from './reversed.ts';
import {
  differentialOf,
  NE43,
  placeOf,
  type Range,
  type Signal,
  type SignalLimits,
  type SignalState,
  slopeAt,
  stateOfSignal,
} from './signal.ts';
import { chooseCell, overlapCautions } from './stacked.ts';
import { combinedWorking, statedParts } from './stated.ts';
import { readTransmitterFields, type TransmitterFields } from './transmitter-fields.ts';

const MAPPING: Source = { clause: 'IEC 60381-1 and -2, signal in proportion', seen: 'memory' };
const CUT_OFF: Source = { clause: 'low-flow cut-off as stated', seen: 'read' };

export const transmitter: Instrument = {
  kind: 'transmitter',
  settle(form) {
    const own = readTransmitterFields(form);
    const fields = readCellFields(form, true);
    if (own === undefined) return undefined;
    return {
      kind: 'transmitter',
      asks: { shows: [own.signal.measure], lowRange: own.lowRange !== undefined },
      read: (reading, at) => ok(shownOf(reading, own, fields, at)),
    };
  },
};

function shownOf(reading: ReadingInput, own: TransmitterFields, fields: CellFields, at: Conditions): Shown {
  const { signal, output, limits } = own;
  const chosen = chooseCell(reading, own, at.inUse);
  const { range, zero, value } = chosen;
  const x = placeOf(value, signal);
  const seen = differentialOf(x, range, output) - zero;
  const { differential, cautions: ofLegs, working, picture } = readCell(seen, fields, at);
  const state = stateOfSignal(value, limits);
  const standing = standingOf(state, differential, own.cutOff);
  const span = range.upper - range.lower;
  const whole = { span, reading: Math.abs(differential), perSignal: slopeAt(x, range, output) };
  const parts = statedParts(fields.uncertainty, whole);
  const cautions = [
    ...signalCautions(state, value, signal, limits),
    ...cutOffCautions(standing, differential, own.cutOff),
    ...(standing === 'as-shown' || standing === 'at-least'
      ? reversedCautions(differential, own.cutOff > 0 ? 0 : span)
      : []),
    ...(standing === 'failed' ? [] : ofLegs),
    ...overlapCautions(reading, own, fields.uncertainty),
  ];
  return {
    standing,
    differential,
    cautions,
    working: [...mappingLines(value, x, own, range, zero, seen), ...working, ...combinedWorking(parts)],
    uncertainty: parts,
    picture: { ...picture, share: placeOf(asked(reading.value, 'a value').si, signal), ...chosen.picture },
    ...(own.lowRange === undefined ? {} : { inUse: chosen.cell }),
  };
}

function standingOf(state: SignalState, differential: number, cutOff: number): Standing {
  if (state === 'faulty') return 'failed';
  if (state === 'saturated') return 'at-least';
  return Math.abs(differential) < cutOff ? 'cut-off' : 'as-shown';
}

/** A failed, uncertain or saturated signal; a valid one is said to be inside. */
function signalCautions(
  state: SignalState,
  value: number,
  { unit, size }: Signal,
  { failLow, low, high, failHigh }: SignalLimits,
): readonly Caution[] {
  const common = { value: value / size, unit, source: NE43, detail: { unit } } as const;
  const between = (min: number, max: number) => ({ min: min / size, max: max / size });
  if (state === 'faulty')
    return [{ ...common, id: 'signal-failed', verdict: 'outside', limit: between(failLow, failHigh) }];
  if (state === 'saturated')
    return [{ ...common, id: 'signal-saturated', verdict: 'outside', limit: between(low, high) }];
  if (state === 'uncertain')
    return [{ ...common, id: 'signal-uncertain', verdict: 'caution', limit: between(low, high) }];
  return [];
}

const cutOffCautions = (standing: Standing, differential: number, cutOff: number): readonly Caution[] =>
  standing === 'cut-off'
    ? [
        {
          id: 'below-cut-off',
          verdict: 'caution',
          value: differential,
          unit: 'Pa',
          limit: { min: cutOff },
          source: CUT_OFF,
        },
      ]
    : [];

function mappingLines(
  value: number,
  x: number,
  { signal, output }: TransmitterFields,
  { lower, upper }: Range,
  zero: number,
  seen: number,
): readonly Working[] {
  const { unit, size } = signal;
  const place: Working = {
    id: 'place',
    symbol: 'x',
    formula: '(s - s_0) / (s_1 - s_0)',
    given: [
      named('s', value / size, unit, 'signal'),
      named('s_0', signal.zero / size, unit, 'signal-zero'),
      named('s_1', signal.full / size, unit, 'signal-full'),
    ],
    value: x,
    unit: '',
    source: MAPPING,
  };
  const tare = zero === 0 ? '' : ' - Δp_z';
  const given = [
    ...(output === 'linear' ? [named('Δp_0', lower, 'Pa', 'range-lower')] : []),
    named('Δp_1', upper, 'Pa', 'range-upper'),
    named('x', x, '', 'place-of-signal'),
    ...(zero === 0 ? [] : [named('Δp_z', zero, 'Pa', 'zero-of-cell')]),
  ];
  const formula = output === 'linear' ? 'Δp_0 + x * (Δp_1 - Δp_0)' : 'Δp_1 * x * abs(x)';
  return [
    place,
    { id: 'cell', symbol: 'Δp_c', formula: `${formula}${tare}`, given, value: seen, unit: 'Pa', source: MAPPING },
  ];
}
