/** Straight pipe for each fitting of the element's table, in pipe bores. */
import { spell } from '../../core/quantity/digits.ts';
import type { Solved } from '../../core/result/record.ts';
import { fittingLabel } from '../words/fittings.ts';
import { noteText } from '../words/notes.ts';
import { cited } from './cited.ts';
import type { Context } from './context.ts';
import type { StraightRow } from './model.ts';

export function straightRows({ meter }: Context, result: Solved): readonly StraightRow[] {
  const chosen = meter.installation?.fitting;
  return result.straightLengths.map(({ fitting, side, full, reduced, source, note }) => ({
    fitting,
    label: fittingLabel(fitting),
    side,
    full: bores(full),
    reduced: reduced === undefined ? '–' : bores(reduced),
    cited: cited(source),
    ...(note === undefined ? {} : { note: noteText(note) }),
    chosen: fitting === chosen,
  }));
}

/** The tables go by halves of a bore. */
const bores = (count: number): string => `${spell(count, { typographic: true })}\u00a0D`;
