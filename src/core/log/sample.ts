/** The rows of the beginning of a log, and of its end, taken apart: what the preview decides on. */
import { openTranscoder, type Spelling, spellingOf, textOf, toUtf8 } from './encoding.ts';
import { afterLineEnd, CR, fieldBytes, LF, QUOTE, splitRow } from './split.ts';

export interface SampleRow {
  readonly fields: readonly string[];
  readonly bytes: Uint8Array;
  readonly quoted: boolean;
}

export interface SampleBytes {
  readonly spelling: Spelling;
  /** UTF-8 or windows-1252, without a mark. */
  readonly bytes: Uint8Array;
}

/** The beginning of a log as the reader will meet it. */
export function sampleBytes(first: Uint8Array): SampleBytes {
  const spelling = spellingOf(first);
  const bytes = first.subarray(spelling.mark);
  const wide = spelling.encoding.startsWith('utf-16');
  return { spelling, bytes: wide ? toUtf8(openTranscoder(spelling.encoding), bytes) : bytes };
}

/** Rows that can be taken apart; the last one only when it has its line end or the log is `complete`. */
export function sampleRows(
  { bytes, spelling }: SampleBytes,
  delimiter: number,
  complete: boolean,
  most: number,
): SampleRow[] {
  const rows: SampleRow[] = [];
  for (let at = 0; at >= 0 && at < bytes.length && rows.length < most; ) {
    if (bytes[at] === LF || bytes[at] === CR) {
      at += 1;
      continue;
    }
    const split = splitRow(bytes, at, bytes.length, delimiter, complete);
    if (split.state === 'partial') break;
    const fields: string[] = [];
    for (let edge = 0; edge < split.edges.length && split.state === 'whole'; edge += 2)
      fields.push(
        textOf(fieldBytes(bytes, split.edges[edge] ?? 0, split.edges[edge + 1] ?? 0), spelling.encoding).trim(),
      );
    const quoted = split.edges.some((edge, place) => place % 2 === 0 && bytes[edge] === QUOTE);
    rows.push({ fields, bytes: bytes.slice(at, split.end), quoted });
    at = afterLineEnd(bytes, split.state === 'quote-open' ? at : split.end, bytes.length);
  }
  return rows;
}

const DELIMITERS = ['\t', ';', '|', ','] as const;
/** Rows that are counted, and the share of them that must have one and the same number of fields. */
const COUNTED = 200;
const ALIKE = 0.8;

/** The delimiter of a log: the first that parts most rows alike, those that are never decimal marks before the comma. */
export function delimiterOf(sample: SampleBytes, complete: boolean): string {
  for (const delimiter of DELIMITERS) {
    const counts = sampleRows(sample, delimiter.charCodeAt(0), complete, COUNTED).map(({ fields }) => fields.length);
    const usual = usualCount(counts);
    const alike = counts.filter((count) => count === usual).length;
    if (usual > 1 && alike >= ALIKE * counts.length) return delimiter;
  }
  return ',';
}

/** The number that occurs most often; the larger of two that occur as often. */
export function usualCount(counts: readonly number[]): number {
  const times = new Map<number, number>();
  for (const count of counts) times.set(count, (times.get(count) ?? 0) + 1);
  const [usual] = [...times].sort(([one, oneTimes], [other, otherTimes]) => otherTimes - oneTimes || other - one);
  return usual?.[0] ?? 0;
}
