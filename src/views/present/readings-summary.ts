/** What the rows of readings come to, in sentences. */
import type { ReadingSummary } from '../../core/result/readings-record.ts';
import { readingFlags } from '../words/findings-of-readings.ts';
import { flagSentence, leftOut, meanSentence, oneFlag, rootedSentence } from '../words/readings.ts';
import type { Context } from './context.ts';
import { readFlow } from './readings-flow.ts';

export function togetherOf(at: Context, summary: ReadingSummary): readonly string[] {
  const { rows, refused, counted, mean, minimum, maximum, rooted, flags } = summary;
  const text = (flow: Parameters<typeof readFlow>[1] | undefined): string =>
    flow === undefined ? '' : (readFlow(at, flow)?.text ?? '');
  const out = rows - counted - refused;
  return [
    ...(mean === undefined ? [] : [meanSentence(counted, text(mean), text(minimum), text(maximum))]),
    ...(rooted === undefined || counted < 2
      ? []
      : [
          rootedSentence(
            text(rooted),
            at.value(Math.abs(rooted.error_percent), 'percent').text,
            rooted.error_percent >= 0,
          ),
        ]),
    ...(out > 0 ? [leftOut(out)] : []),
    ...(flags.length === 0 ? [] : [flagSentence(flags.map(({ id, count }) => oneFlag(count, readingFlags[id] ?? id)))]),
  ];
}
