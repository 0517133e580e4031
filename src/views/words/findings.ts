/** Every finding as a line: the figure that was compared, where, and the limit it was held against. */
import type { Finding } from '../../core/check/finding.ts';
import { detailOf, type FindingWords } from './detail.ts';
import { fieldPlace } from './fields.ts';
import { checksOfAir } from './findings-of-air.ts';
import { checksOfFlow } from './findings-of-flow.ts';
import { checksOfLiquids } from './findings-of-liquids.ts';
import { checksOfReadings } from './findings-of-readings.ts';
import { checksOfSize } from './findings-of-size.ts';
import { checksOfTraverse } from './findings-of-traverse.ts';
import type { Print } from './print.ts';
import { dutyLabels } from './verdicts.ts';

export const findingWords: Readonly<Record<string, FindingWords>> = {
  ...checksOfSize,
  ...checksOfFlow,
  ...checksOfLiquids,
  ...checksOfAir,
  ...checksOfTraverse,
  ...checksOfReadings,
};

/** The line of a finding and its limit, figures printed by `print`. A code without words is a defect. */
export function findingText(finding: Finding, print: Print): { readonly text: string; readonly limit: string } {
  const { id, value, limit, at, detail: values = {} } = finding;
  const words = findingWords[id];
  if (words === undefined) throw new Error(`expected words for the finding ${id}, got none`);
  const detail = detailOf(id, '', values, print);
  const first = print.figure(value, words.role);
  const figure = detail.has('highest') ? range(first, detail.figure('highest', words.role)) : first;
  const where = at === undefined ? '' : ` at ${dutyLabels[at]} flow`;
  const bounds = boundsText(limit, (bound) => print.limit(bound, words.role));
  return {
    text: words.text(figure, detail).replace('{where}', where),
    limit: words.limit?.(bounds, detail) ?? bounds,
  };
}

/** 'at least a', 'at most b', 'a to b', or nothing. */
export function boundsText(limit: Finding['limit'], print: (value: number) => string): string {
  const { min, max } = limit;
  if (min !== undefined && max !== undefined) return range(print(min), print(max));
  if (min !== undefined) return `at least ${print(min)}`;
  return max === undefined ? '' : `at most ${print(max)}`;
}

/** 'a to b', the unit once where both have the same; one figure where both are alike. */
export function range(from: string, to: string): string {
  if (from === to) return from;
  const gap = from.lastIndexOf('\u00a0');
  const unit = gap < 0 ? '' : from.slice(gap);
  return `${unit !== '' && to.endsWith(unit) ? from.slice(0, gap) : from} to ${to}`;
}

/** A check that is open for want of one field. */
export const uncheckedText = (needs: string): string => `Not checked: ${fieldPlace(needs)} is not given.`;
