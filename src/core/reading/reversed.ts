/** What a differential below zero says: flow against the meter, crossed legs, or a leg that holds a second phase. */
import type { Caution } from '../fluid/contract.ts';
import { hydrostatics } from './chain.ts';

/** One finding where the differential is below zero. */
export const reversedCautions = (differential: number): readonly Caution[] =>
  differential < 0
    ? [
        {
          id: 'reading-reversed',
          verdict: 'outside',
          value: differential,
          unit: 'Pa',
          limit: { min: 0 },
          source: hydrostatics,
        },
      ]
    : [];
