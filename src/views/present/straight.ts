/** Straight pipe for each fitting of the element's table, in pipe bores. */
import type { Solved } from '../../core/result/record.ts';
import { fittingLabel } from '../words/fittings.ts';
import { noteText } from '../words/notes.ts';
import { cited } from './cited.ts';
import type { Context } from './context.ts';
import type { StraightRow } from './model.ts';

export function straightRows({ meter, print }: Context, result: Solved): readonly StraightRow[] {
  const chosen = meter.installation?.fitting;
  return result.straightLengths.map(({ fitting, side, full, reduced, source, note }) => ({
    fitting,
    label: fittingLabel(fitting),
    side,
    full: print.limit(full, 'bores'),
    reduced: reduced === undefined ? '–' : print.limit(reduced, 'bores'),
    cited: cited(source),
    ...(note === undefined ? {} : { note: noteText(note) }),
    chosen: fitting === chosen,
  }));
}
