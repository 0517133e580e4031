/** Every finding as a line: the figure that was compared, where, and the limit it was held against. */
import type { Finding } from '../../core/check/finding.ts';
import { type Detail, detailOf } from './detail.ts';
import { checksOfSize } from './findings-of-size.ts';
import { checksOfFlow } from './findings-of-flow.ts';
import type { Print, Role } from './print.ts';
import { dutyLabels } from './verdicts.ts';

/** How one kind of finding is worded. `figure` is the printed value, or 'a to b' where it stands for a range. */
export interface FindingWords {
  readonly role: Role;
  readonly text: (figure: string, detail: Detail) => string;
  /** Where the plain 'at least', 'at most', 'a to b' does not say it. */
  readonly limit?: (bounds: string, detail: Detail) => string;
}

export const findingWords: Readonly<Record<string, FindingWords>> = { ...checksOfSize, ...checksOfFlow };

/** The line of a finding and its limit, figures printed by `print`. A code without words is a defect. */
export function findingText(finding: Finding, print: Print): { readonly text: string; readonly limit: string } {
  const words = findingWords[finding.id];
  if (words === undefined) throw new Error(`expected words for the finding ${finding.id}, got none`);
  const values = finding.detail ?? {};
  const detail = detailOf(finding.id, '', values, print);
  const first = print(finding.value, words.role);
  const highest = values['highest'];
  const figure = highest === undefined ? first : range(first, print(Number(highest), words.role));
  const where = finding.at === undefined ? '' : ` at ${dutyLabels[finding.at]} flow`;
  const bounds = boundsText(finding.limit, (value) => print(value, words.role));
  const limit = words.limit?.(bounds, detail) ?? bounds;
  return { text: `${words.text(figure, detail).replace('{where}', where)}`, limit };
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
