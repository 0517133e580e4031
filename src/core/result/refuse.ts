/** What stands in the results for a meter that was not solved. */
import type { Problem } from '../quantity/outcome.ts';
import type { Refused } from './record.ts';

/** The refusal of a meter, with every problem found. */
export const refused = (tag: string, problems: readonly [Problem, ...Problem[]]): Refused => ({
  tag,
  status: 'refused',
  problem: problems[0],
  problems,
});

/** The tag of whatever stands in a list; without one its place, counted from 1, names it. */
export function tagOf(written: unknown, index: number): string {
  const tag = typeof written === 'object' && written !== null && 'tag' in written ? written.tag : undefined;
  return typeof tag === 'string' && tag.trim() !== '' ? tag : `#${index + 1}`;
}
