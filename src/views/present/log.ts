/** One converted log, ready to print: every row, sentence, table and the picture that the views show. */
import type { LogResult } from '../../core/result/log-record.ts';
import {
  blankText,
  exactBecause,
  gapsText,
  logAnswer,
  logNoAnswer,
  longestGapText,
  openEnd,
  resultWords,
  rowsAccount,
  shareText,
  spanningText,
  logRows as words,
} from '../words/logs.ts';
import { logChart } from './log-chart.ts';
import { configurationOf } from './log-configuration.ts';
import { type Conversion, type LogContext, logContext } from './log-context.ts';
import type { PresentedLog } from './log-model.ts';
import { accountRows, dayRows, extremeRows } from './log-tables.ts';
import { presentMeter } from './meter.ts';
import type { Row, Segment, Value } from './model.ts';
import { headOf } from './sheet.ts';
import { duration } from './stamps.ts';

export function presentLog(conversion: Conversion): PresentedLog {
  const { record, meter, project, result, stale } = conversion;
  const at = logContext(conversion);
  const presented = presentMeter(meter, project, result);
  return {
    answer: answerOf(at),
    share: shareText(at.value((100 * record.converted) / Math.max(1, record.rows), 'percent').text),
    account: accountOf(at, conversion.seconds),
    totals: totalRows(at),
    means: meanRows(at),
    extremes: extremeRows(at),
    reasons: accountRows(at),
    days: dayRows(at),
    chart: logChart(at),
    configuration: configurationOf(at, conversion),
    notes: notesOf(record, at),
    head: headOf(meter, project, presented, stale),
  };
}

const wordsOf = (text: string): Segment => ({ text, role: 'words' });

/** The total as one sentence. */
function answerOf({ record, value, stamp }: LogContext): readonly Segment[] {
  const { total_kg, meanMassFlow_kg_s: mean, from_s, to_s } = record;
  if (mean === undefined || from_s === undefined || to_s === undefined) return [wordsOf(logNoAnswer)];
  const [mass, flow] = [value(total_kg, 'mass').text, value(mean, 'massFlow').text];
  const [before, between = '', behind = ''] = logAnswer('\0', stamp(from_s), stamp(to_s), '\0').split('\0');
  const found = (text: string): Segment => ({ text, role: 'found' });
  return [wordsOf(before ?? ''), found(mass), wordsOf(between), found(flow), wordsOf(behind)];
}

function accountOf({ record, count }: LogContext, seconds: number): string {
  const { rows, converted, accounts } = record;
  const remarked = accounts.reduce((sum, one) => sum + (one.fate === 'remarked' ? one.rows : 0), 0);
  const [all, good, some, none] = [rows, converted, remarked, rows - converted].map((one) => count(one).number);
  return rowsAccount(all ?? '', good ?? '', some ?? '', none ?? '', duration(seconds).text);
}

const row = (id: string, label: string, value: Value, note = ''): Row => ({
  id,
  label,
  value,
  ...(note === '' ? {} : { note }),
});

function totalRows(at: LogContext): readonly Row[] {
  const { record, value, count, stamp } = at;
  const { longestGap, substitutes } = record;
  const gap =
    record.gaps === 0 || longestGap === undefined
      ? []
      : [
          {
            ...row('gaps', words.gaps, duration(record.gap_s)),
            note: `${gapsText(count(record.gaps).number)}, ${longestGapText(duration(longestGap.seconds).text, stamp(longestGap.from_s))}`,
          },
          row('substitute-held', words.substituteHeld, value(substitutes.held_kg, 'mass')),
          row('substitute-line', words.substituteLine, value(substitutes.straightLine_kg, 'mass')),
        ];
  return [
    row('mass', words.mass, value(record.total_kg, 'mass')),
    ...(record.baseVolume_m3 === undefined
      ? []
      : [row('base-volume', words.baseVolume, value(record.baseVolume_m3, 'volume'))]),
    row('volume', words.volume, value(record.volume_m3, 'volume')),
    row('counted', words.counted, duration(record.seconds)),
    row('flowing', words.flowing, duration(record.flowing_s)),
    row('still', words.still, duration(record.still_s)),
    ...gap,
  ];
}

function meanRows({ record, value }: LogContext): readonly Row[] {
  const { meanMassFlow_kg_s, meanDifferential_Pa, meanPressure_Pa, meanTemperature_K, rootingError_percent } = record;
  const rows: readonly (Row | undefined)[] = [
    meanMassFlow_kg_s === undefined ? undefined : row('mean', words.meanFlow, value(meanMassFlow_kg_s, 'massFlow')),
    meanDifferential_Pa === undefined
      ? undefined
      : row('differential', words.differential, value(meanDifferential_Pa, 'differential')),
    meanPressure_Pa === undefined ? undefined : row('pressure', words.pressure, value(meanPressure_Pa, 'pressure')),
    meanTemperature_K === undefined
      ? undefined
      : row('temperature', words.temperature, value(meanTemperature_K, 'temperature')),
    rootingError_percent === undefined
      ? undefined
      : row('rooting', words.rooting, value(rootingError_percent, 'percent'), resultWords.tooHigh),
  ];
  return rows.filter((one) => one !== undefined);
}

/** What a reader of the totals has to know beside them. */
function notesOf({ path, endsOpen, spanningRows, blankLines }: LogResult, { count }: LogContext): readonly string[] {
  return [
    ...(path.why === undefined
      ? []
      : [`${words.exactRows}: ${count(path.exactRows).number}. ${exactBecause(path.why)}`]),
    ...(endsOpen ? [openEnd] : []),
    ...(spanningRows > 0 ? [spanningText(count(spanningRows).number)] : []),
    ...(blankLines > 0 ? [blankText(count(blankLines).number)] : []),
  ];
}
