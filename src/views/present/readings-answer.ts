/** The answer of one reading: a sentence with what was read, what that is, and what flows; the line below it. */
import type { SolvedReading } from '../../core/result/readings-record.ts';
import type { Solved } from '../../core/result/record.ts';
import { fluidLabel } from '../words/fluids.ts';
import { instrumentWords, liquidWord } from '../words/instruments.ts';
import { endPieces, failedPieces, ofLowRange, type ReadPiece, readPieces, underReading } from '../words/readings.ts';
import { verdictWords } from '../words/verdicts.ts';
import type { Context } from './context.ts';
import type { Segment } from './model.ts';
import { asWritten } from './numbers.ts';
import { readFlow } from './readings-flow.ts';
import { written as writtenQuantity } from './units.ts';

type Written = Readonly<Record<string, string>>;
const SHOWN = [
  'length',
  'current',
  'voltage',
  'share',
  'pressure difference',
  'gauge pressure',
  'absolute pressure',
  'temperature',
  'density',
  'angle',
  'share of span',
  'share of reading',
] as const;

/** What was read, digit for digit. */
export function asRead(text: string | undefined): string {
  const read = writtenQuantity(text, SHOWN);
  return read === undefined ? (text ?? '') : asWritten(read).text;
}

export function readingAnswer(
  at: Context,
  row: SolvedReading,
  kind: string,
  texts: Written,
  result: Solved,
): readonly Segment[] {
  const differential = row.differential_Pa === undefined ? '' : at.value(row.differential_Pa, 'differential').text;
  const figures = {
    reading: shownReading(row, kind, texts),
    throat: asRead(texts.throat),
    differential,
    flow: readFlow(at, row)?.text ?? '',
  };
  return piecesOf(at, row, kind, result).map((piece) => {
    if (typeof piece === 'string') return { text: piece, role: 'words' };
    return { text: figures[piece.figure], role: piece.figure === 'flow' ? 'found' : 'given' };
  });
}

/** What the differential was read from: of two cells the one in use. */
function shownReading({ picture }: SolvedReading, kind: string, texts: Written): string {
  if (picture.lowRangeInUse === true) return ofLowRange(asRead(texts.lowRange));
  return asRead(kind === 'gauges' ? texts.upstream : texts.value);
}

function piecesOf({ meter }: Context, row: SolvedReading, kind: string, result: Solved): readonly ReadPiece[] {
  if (row.standing === 'failed') return failedPieces;
  const inverted = kind === 'inverted-u-tube';
  const liquid = liquidWord(meter.instrument?.liquid ?? (inverted ? 'air' : undefined));
  return [...readPieces(kind, liquid, overOf(meter.fluid?.kind, meter.fluid?.name, result)), ...endPieces[endOf(row)]];
}

function endOf({ standing, differential_Pa: differential = 0 }: SolvedReading): keyof typeof endPieces {
  if (standing === 'cut-off' || standing === 'at-least') return standing;
  if (differential < 0) return 'reversed';
  return differential === 0 ? 'still' : 'flows';
}

/** What stands over the gauge liquid, as far as its name is short. */
export function overOf(kind: unknown, name: unknown, { state }: Solved): string {
  if (typeof kind !== 'string' || kind === 'stated' || kind === 'gas') return instrumentWords.process;
  const label = fluidLabel(kind, state.phase, typeof name === 'string' ? name : '');
  return label.charAt(0).toLowerCase() + label.slice(1);
}

/** Uncertainty, share of the reading, Reynolds number with its verdict. */
export function readingUnder(at: Context, { uncertainty, reynoldsPipe, checks }: SolvedReading): string {
  if (uncertainty === undefined || reynoldsPipe === undefined) return '';
  const percent = at.value(uncertainty.expanded_percent, 'uncertainty').text;
  const sure = uncertainty.open.length > 0 ? underReading.atLeast(percent) : underReading.sure(percent);
  const share = uncertainty.readingPercentOfFlow;
  const verdict = checks.find(({ id }) => id === 'reynolds-pipe')?.verdict;
  const reynolds = underReading.reynolds(at.value(reynoldsPipe, 'reynolds').text);
  return [
    [sure, ...(share === undefined ? [] : [underReading.ofReading(at.value(share, 'uncertainty').text)])].join(', '),
    [reynolds, ...(verdict === undefined ? [] : [verdictWords[verdict]])].join(', '),
  ].join(' · ');
}
