/** Names of the terms of the uncertainty. */
import type { PointRecord } from '../../core/result/record.ts';

export type TermName = PointRecord['uncertainty']['terms'][number]['name'];

export const termNames: Readonly<Record<TermName, string>> = {
  C: 'Discharge coefficient',
  epsilon: 'Expansibility factor',
  pipe: 'Pipe bore',
  bore: 'Bore',
  differential: 'Differential pressure',
  density: 'Density',
};
