/**
 * Uncertainties that the user states of an instrument, in pascals of the differential, expanded at 95 %.
 * Standard: JCGM 100:2008, 4.3.7 (a rectangular half-width a is a standard uncertainty a/sqrt(3)), coverage factor 2.
 */
import type { InstrumentUncertainty } from '../input/instrument.ts';
import { named, type Working } from '../quantity/working.ts';
import type { UncertaintyPart } from './contract.ts';

/** What a stated share is a share of, Pa; `span` is 0 where the instrument has none. */
export interface Whole {
  readonly span: number;
  readonly reading: number;
  /** What the whole span of the signal is worth at its place: the span of a linear one, 2 x times it of a root signal. */
  readonly perSignal?: number;
}

/** Each stated term in Pa. */
export function statedParts({ as, terms }: InstrumentUncertainty, whole: Whole): readonly UncertaintyPart[] {
  const widen = as === 'rectangular' ? 2 / Math.sqrt(3) : 1; // JCGM 100:2008, 4.3.7
  return terms.map(({ name, value }) => {
    if (value.of === 'pressure') return { name, pascal: widen * value.value };
    const span = name === 'output' ? (whole.perSignal ?? whole.span) : whole.span;
    return { name, pascal: widen * value.share * (value.of === 'span' ? span : whole.reading) };
  });
}

/** Root of the sum of squares of the parts, Pa. JCGM 100:2008, 5.1.2. */
export const combined = (parts: readonly UncertaintyPart[]): number => Math.hypot(...parts.map(({ pascal }) => pascal));

/** The working of `combined`; nothing where nothing is stated. */
export function combinedWorking(parts: readonly UncertaintyPart[]): readonly Working[] {
  if (parts.length === 0) return [];
  const given = parts.map(({ name, pascal }, at) => named(`U_${at + 1}`, pascal, 'Pa', `uncertainty-of-${name}`));
  return [
    {
      id: 'uncertaintyOfReading',
      symbol: 'U_Δp',
      formula: `sqrt(${given.map(({ symbol }) => `${symbol}^2`).join(' + ')})`,
      given,
      value: combined(parts),
      unit: 'Pa',
      source: { clause: 'JCGM 100:2008, 4.3.7 and 5.1.2', seen: 'second-hand' },
    },
  ];
}
