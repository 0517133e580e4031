/** What a differential below zero says: flow against the meter, crossed legs, or a leg that holds a second phase. */
import type { Caution } from '../fluid/contract.ts';
import { hydrostatics } from './chain.ts';

/** Share of the span below zero that a zero which has drifted explains as well. */
const DRIFT = 0.02; // custom of the trade

/** One finding where the differential is below zero; `span`, Pa, of a transmitter without a cut-off, else 0. */
export const reversedCautions = (differential: number, span = 0): readonly Caution[] =>
  differential < 0
    ? [
        {
          id: 'reading-reversed',
          verdict: 'outside',
          value: differential,
          unit: 'Pa',
          limit: { min: 0 },
          source: hydrostatics,
          ...(-differential < DRIFT * span ? { detail: { near: 'zero' } } : {}),
        },
      ]
    : [];
