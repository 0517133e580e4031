/** Names of the terms of the uncertainty. */
import type { PointRecord } from '../../core/result/record.ts';

export type TermName = PointRecord['uncertainty']['terms'][number]['name'];

/** What the uncertainty of a flow leaves out, by its code. */
const openNames: Readonly<Record<string, string>> = {
  differential: 'the uncertainty of the differential is not stated',
  density: 'the uncertainty of the density is not stated',
  'reynolds-pipe': 'a flow lies outside the Reynolds numbers of the standard',
  'straight-length': 'the straight pipe is shorter than the standard allows',
};

/** One sentence for all that is left out; none for nothing. */
export function certaintyNote(open: readonly string[]): string {
  if (open.length === 0) return '';
  const reasons = open.map((code) => {
    const name = openNames[code];
    if (name === undefined) throw new Error(`expected words for what the uncertainty leaves out, got ${code}`);
    return name;
  });
  return `The uncertainty is at least what stands here: ${reasons.join('; ')}.`;
}

export const termNames: Readonly<Record<TermName, string>> = {
  C: 'Discharge coefficient',
  epsilon: 'Expansibility factor',
  pipe: 'Pipe bore',
  bore: 'Bore',
  differential: 'Differential pressure',
  density: 'Density',
};
