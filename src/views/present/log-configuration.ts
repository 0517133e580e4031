/** How a log was converted, row by row as it is printed: file, columns, rules, and the way the rows took. */
import { fieldLabel } from '../words/fields.ts';
import { assumedText, interpretationLabel, logRows, logSheet, usualGap } from '../words/logs.ts';
import type { Conversion, LogContext } from './log-context.ts';
import { writtenIn } from './sheet.ts';
import { duration } from './stamps.ts';

interface Line {
  readonly label: string;
  readonly text: string;
}

const textOf = (written: unknown): string => (typeof written === 'string' ? written : '');

export function configurationOf(at: LogContext, { name, meter }: Conversion): readonly Line[] {
  const { record, count, value } = at;
  const { path, zone, interpretation, assumed, maxGap_s, maxGapStated } = record;
  const written = writtenIn(meter.log, 'log').filter(([field]) => !OWN_LINES.includes(field));
  const gap = maxGap_s === undefined ? [] : [duration(maxGap_s).text, maxGapStated ? '' : usualGap];
  return [
    { label: logSheet.file, text: name },
    ...written.map(([field, text]) => ({ label: fieldLabel(field), text })),
    { label: fieldLabel('log.zone'), text: withNote(zone, assumed.includes('zone')) },
    {
      label: fieldLabel('log.interpretation'),
      text: withNote(interpretationLabel(interpretation), assumed.includes('interpretation')),
    },
    ...(gap.length === 0 ? [] : [{ label: fieldLabel('log.maxGap'), text: gap.filter(Boolean).join(', ') }]),
    ...instrumentLines(meter.instrument),
    { label: logRows.path, text: count(path.surfaceRows).number },
    { label: logRows.exactRows, text: count(path.exactRows).number },
    ...(path.bounds === undefined
      ? []
      : [{ label: logRows.bound, text: value(100 * path.bounds.massFlow, 'percent').text }]),
  ];
}

/** Told from the record, with what was taken where nothing is written. */
const OWN_LINES = ['log.zone', 'log.interpretation', 'log.maxGap'];

const withNote = (text: string, isAssumed: boolean): string => (isAssumed ? `${text}, ${assumedText}` : text);

/** The transmitter of a signal. */
function instrumentLines(instrument: unknown): readonly Line[] {
  const kind = textOf((instrument as { kind?: unknown } | undefined)?.kind);
  if (kind !== 'transmitter') return [];
  return writtenIn(instrument, 'instrument').map(([field, text]) => ({ label: fieldLabel(field), text }));
}
