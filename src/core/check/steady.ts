/** Steady: the root of a fluctuating differential reads high, and the standard allows little fluctuation. */
import type { Source } from '../quantity/source.ts';
import { type Case, within } from './case.ts';
import type { Finding } from './finding.ts';

const STEADY: Source = { clause: 'ISO 5167-1:2003, 6.3.1', seen: 'memory' };
/** Root-mean-square fluctuation of the differential against its mean. */
const MOST_FLUCTUATION = 10; // %

/** Only where a fluctuation is stated: nothing else in the file says whether the flow pulsates. */
export function checkSteady({ input }: Case): readonly Finding[] {
  const { fluctuation } = input.installation;
  if (fluctuation === undefined) return [];
  const value = 100 * fluctuation;
  const limit = { max: MOST_FLUCTUATION };
  const high = 100 * (1 / Math.sqrt((1 + Math.sqrt(Math.max(0, 1 - fluctuation ** 2))) / 2) - 1); // quasi-steady flow
  const common = { id: 'fluctuation', assumption: 'steady', verdict: within(value, limit), unit: '%' } as const;
  return [{ ...common, value, limit, source: STEADY, detail: { high } }];
}
