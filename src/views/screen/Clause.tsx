/** Where a figure comes from. The mark says how that was seen, holds to the last word and explains itself when pointed at. */
import type { Cited } from '../present/model.ts';
import { markMeaning } from '../words/provenance.ts';

export const Clause = ({ cited: { clause, mark } }: { readonly cited: Cited }) => (
  <span>
    {clause}
    <Mark mark={mark} />
  </span>
);

export const Mark = ({ mark }: { readonly mark: Cited['mark'] }) =>
  mark === '' ? null : <span title={markMeaning[mark]}>{`\u202f${mark}`}</span>;
