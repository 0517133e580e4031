/** Words of the curve of flow against differential. */
import { range } from './findings.ts';

export const belowReynolds = 'below the Reynolds numbers of the standard';
export const aboveReynolds = 'above the Reynolds numbers of the standard';

/** One sentence for those who do not see the curve. */
export function chartSummary(duty: readonly string[], outside: readonly string[]): string {
  const marked =
    outside.length === 0
      ? ' From 0.2\u00a0% of the span on, the curve is inside the Reynolds numbers of the standard.'
      : '';
  const parts = outside.map((range) => ` ${range}.`).join('');
  return `Flow against differential pressure: ${duty.join(', ')}.${marked}${parts}`;
}

export const dutyAt = (flow: string, differential: string): string => `${flow} at ${differential}`;
export const outsideRange = (from: string, to: string, label: string): string =>
  `From ${range(from, to)} it is ${label}`;
