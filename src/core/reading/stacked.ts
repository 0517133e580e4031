/** Two cells with stacked ranges: which one is used, and whether they agree where both can see the difference. */
import type { Caution } from '../fluid/contract.ts';
import type { InstrumentUncertainty } from '../input/instrument.ts';
import type { ReadingInput } from '../input/reading.ts';
import type { Source } from '../quantity/source.ts';
import { asked } from './asked.ts';
import type { Cell, Picture } from './contract.ts';
import { differentialOf, placeOf, type Range } from './signal.ts';
import { combined, statedParts } from './stated.ts';
import type { TransmitterFields } from './transmitter-fields.ts';

const PRACTICE: Source = { clause: 'stacked ranges, custom of the trade', seen: 'memory' };

export interface Chosen {
  readonly cell: Cell;
  readonly range: Range;
  readonly zero: number; // Pa
  readonly value: number; // SI
  readonly picture: Picture;
}

/**
 * The cell to use. It stays the one in use: from the low range upwards once that passes `up`, back once it is below
 * `down`. At first the low range serves up to `up`. A low range that fails leaves the main one.
 */
export function chooseCell(reading: ReadingInput, own: TransmitterFields, inUse?: Cell): Chosen {
  const { signal, lowRange, range, zero, limits } = own;
  const value = asked(reading.value, 'a value').si;
  const main: Chosen = { cell: 'main', range, zero, value, picture: {} };
  const low = reading.lowRange?.si;
  if (lowRange === undefined || low === undefined) return main;
  const x = placeOf(low, signal);
  const picture = { lowRangeShare: x };
  const failed = low <= limits.failLow || low >= limits.failHigh;
  const share = own.output === 'linear' ? x : x * Math.abs(x); // of the range, as a differential
  const stays = inUse === 'main' ? share < lowRange.down : share <= lowRange.up;
  if (failed || !stays) return { ...main, picture };
  return {
    cell: 'lowRange',
    range: lowRange.range,
    zero: lowRange.zero,
    value: low,
    picture: { ...picture, lowRangeInUse: true },
  };
}

/** The two differentials against their combined uncertainty, where both are inside their ranges and it is stated. */
export function overlapCautions(
  { value, lowRange: low }: ReadingInput,
  { signal, output, range, zero, lowRange }: TransmitterFields,
  uncertainty: InstrumentUncertainty,
): readonly Caution[] {
  if (lowRange === undefined || low === undefined || value === undefined) return [];
  if (uncertainty.terms.length === 0) return [];
  const sides = [
    { x: placeOf(value.si, signal), range, zero },
    { x: placeOf(low.si, signal), range: lowRange.range, zero: lowRange.zero },
  ];
  if (sides.some(({ x }) => x < 0 || x > 1)) return [];
  const seen = sides.map((side) => differentialOf(side.x, side.range, output) - side.zero);
  const parts = sides.flatMap((side, at) =>
    statedParts(uncertainty, { span: side.range.upper - side.range.lower, reading: Math.abs(seen[at] ?? 0) }),
  );
  const apart = Math.abs((seen[0] ?? 0) - (seen[1] ?? 0));
  const max = combined(parts);
  if (apart <= max) return [];
  return [{ id: 'cells-apart', verdict: 'caution', value: apart, unit: 'Pa', limit: { max }, source: PRACTICE }];
}
