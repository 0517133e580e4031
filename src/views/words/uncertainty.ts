/** Names of the terms of the uncertainty. */
import type { PointRecord } from '../../core/result/record.ts';
import { coefficientWords, type Rules } from './elements.ts';

export type TermName = PointRecord['uncertainty']['terms'][number]['name'];

/** What the uncertainty of a flow leaves out, by its code; `{rules}` stands for what sets the limits. */
const openNames: Readonly<Record<string, string>> = {
  coefficient: 'the uncertainty of the coefficient is not stated',
  expansibility: 'the uncertainty of the expansibility factor is not stated',
  pipe: 'the uncertainty of the pipe bore is not stated',
  differential: 'the uncertainty of the differential is not stated',
  density: 'the uncertainty of the density is not stated',
  'reynolds-pipe': 'a flow lies outside the Reynolds numbers of the {rules}',
  'straight-length': 'the straight pipe is shorter than the {rules} allows',
};

/** One sentence for all that is left out; none for nothing. `known` where a figure stands all the same. */
export function certaintyNote(open: readonly string[], rules: Rules, known: boolean): string {
  if (open.length === 0) return '';
  const reasons = open.map((code) => {
    const name = openNames[code];
    if (name === undefined) throw new Error(`expected words for what the uncertainty leaves out, got ${code}`);
    return name.replace('{rules}', rules);
  });
  const first = known ? 'The uncertainty is at least what stands here' : 'The uncertainty cannot be said';
  return `${first}: ${reasons.join('; ')}.`;
}

const termNames: Readonly<Record<TermName, string>> = {
  C: 'Discharge coefficient',
  epsilon: 'Expansibility factor',
  pipe: 'Pipe bore',
  bore: 'Bore',
  differential: 'Differential pressure',
  density: 'Density',
};

/** Name of a term in the budget of an element. */
export const termName = (name: TermName, element: string): string =>
  name === 'C' ? coefficientWords(element).name : termNames[name];
