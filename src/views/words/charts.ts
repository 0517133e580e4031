/** Words of the curve of flow against differential. */
import type { Rules } from './elements.ts';
import { range } from './findings.ts';

export const belowReynolds = (rules: Rules): string => `below the Reynolds numbers of the ${rules}`;
export const aboveReynolds = (rules: Rules): string => `above the Reynolds numbers of the ${rules}`;

/** One sentence for those who do not see the curve; `rules` where they set limits. */
export function chartSummary(duty: readonly string[], outside: readonly string[], rules: Rules | undefined): string {
  const marked =
    outside.length === 0 && rules !== undefined
      ? ` From 0.2\u00a0% of the span on, the curve is inside the Reynolds numbers of the ${rules}.`
      : '';
  const parts = outside.map((range) => ` ${range}.`).join('');
  return `Flow against differential pressure: ${duty.join(', ')}.${marked}${parts}`;
}

export const dutyAt = (flow: string, differential: string): string => `${flow} at ${differential}`;
export const outsideRange = (from: string, to: string, label: string): string =>
  `From ${range(from, to)} it is ${label}`;
