/**
 * The preview of a log: its encoding, delimiter, header and columns, from the first bytes and, where given, the last
 * ones. Every decision names the cell it stands on; what cannot be decided is a question (evidence.ts).
 */
import type { Spelling } from './encoding.ts';
import {
  areClocks,
  areFigures,
  type Cell,
  type Decision,
  decideFigures,
  decideNumericTime,
  decideTime,
  type Marks,
  marksOf,
} from './evidence.ts';
import type { FigureFormat } from './figure.ts';
import { delimiterOf, type SampleBytes, type SampleRow, sampleBytes, sampleRows, usualCount } from './sample.ts';
import { afterLineEnd } from './split.ts';
import type { TimeFormat } from './time.ts';

export interface ColumnPreview {
  /** Name in the header, else the number of the column. */
  readonly name: string;
  readonly kind: 'time' | 'clock' | 'figures' | 'text' | 'empty';
  readonly cells: readonly Cell[];
  readonly figures: Decision<FigureFormat>;
  /** What the column means as a time, where it can mean one. */
  readonly time?: Decision<TimeFormat>;
}

export interface Preview {
  readonly spelling: Spelling;
  readonly delimiter: string;
  /** Rows before the data, the header among them. */
  readonly skip: number;
  readonly hasHeader: boolean;
  readonly header: Uint8Array;
  readonly quotes: boolean;
  readonly columns: readonly ColumnPreview[];
  /** The first rows of data, for the screen. */
  readonly rows: readonly (readonly string[])[];
}

export interface PreviewOptions {
  /** Whether the bytes are the whole log. */
  readonly complete?: boolean;
  /** The last bytes of the log. */
  readonly last?: Uint8Array;
  /** The delimiter, where it is stated. */
  readonly delimiter?: string;
}

const MOST_ROWS = 2000;
const SHOWN_ROWS = 20;

/** Looks at the first bytes of a log, 64 KiB or so; undefined when they hold no row. */
export function previewLog(first: Uint8Array, options: PreviewOptions = {}): Preview | undefined {
  const { complete = false, last } = options;
  const sample = sampleBytes(first);
  const delimiter = options.delimiter ?? delimiterOf(sample, complete);
  const rows = sampleRows(sample, delimiter.charCodeAt(0), complete, MOST_ROWS);
  const fields = usualCount(rows.map((row) => row.fields.length));
  const isTailed = rows.every((row) => row.fields.length !== fields || row.fields.at(-1) === '');
  const least = isTailed ? fields - 1 : fields;
  const top = rows.findIndex((row) => row.fields.length === fields || row.fields.length === least);
  const head = rows[top];
  if (fields === 0 || head === undefined) return undefined;
  const below = rows.slice(top + 1).filter((row) => row.fields.length === fields);
  const hasHeader = isHeader(head);
  const data = hasHeader ? below : [head, ...below];
  const ends = last === undefined ? [] : lastRows(sample, last, delimiter, fields);
  return {
    spelling: sample.spelling,
    delimiter,
    skip: hasHeader ? top + 1 : top,
    hasHeader,
    header: hasHeader ? head.bytes : new Uint8Array(0),
    quotes: rows.some(({ quoted }) => quoted),
    columns: columnsOf(hasHeader ? head.fields : [], data, ends, fields, delimiter),
    rows: data.slice(0, SHOWN_ROWS).map((row) => row.fields),
  };
}

/** A row of names: nothing in it is a figure or a time, and something is there. */
function isHeader(head: SampleRow): boolean {
  const cells = head.fields.filter((text) => text !== '').map((text) => ({ text, row: 0 }));
  const isData = ({ text }: Cell): boolean =>
    marksOf([{ text, row: 0 }]).figures > 0 || decideTime([{ text, row: 0 }]) !== undefined;
  return cells.length > 0 && !cells.some(isData);
}

/** Rows of the last bytes, from their first line end on. Those of UTF-16 may begin inside a letter and are left. */
function lastRows({ spelling }: SampleBytes, last: Uint8Array, delimiter: string, fields: number): SampleRow[] {
  const from = afterLineEnd(last, 0, last.length);
  if (from < 0 || spelling.encoding.startsWith('utf-16')) return [];
  const rows = sampleRows({ spelling, bytes: last.subarray(from) }, delimiter.charCodeAt(0), true, MOST_ROWS);
  return rows.filter((row) => row.fields.length === fields);
}

function columnsOf(
  names: readonly string[],
  data: readonly SampleRow[],
  ends: readonly SampleRow[],
  fields: number,
  delimiter: string,
): ColumnPreview[] {
  const cells = Array.from({ length: fields }, (_, column): Cell[] => [
    ...data.map((row, at) => ({ text: row.fields[column] ?? '', row: at + 1 })),
    ...ends.map((row) => ({ text: row.fields[column] ?? '', row: 0 })),
  ]);
  const marks = cells.map(marksOf);
  const others = marks.filter(areFigures);
  return cells.map((column, at) =>
    columnOf(names[at] || String(at + 1), column, marks[at] as Marks, others, delimiter),
  );
}

function columnOf(
  name: string,
  cells: readonly Cell[],
  marks: Marks,
  others: readonly Marks[],
  delimiter: string,
): ColumnPreview {
  const filled = cells.filter(({ text }) => text !== '');
  const figures = decideFigures(marks, others, delimiter);
  const date = decideTime(filled);
  if (filled.length === 0) return { name, kind: 'empty', cells, figures };
  if (date) return { name, kind: 'time', cells, figures, time: date };
  if (areClocks(filled)) return { name, kind: 'clock', cells, figures };
  if (!areFigures(marks)) return { name, kind: 'text', cells, figures };
  const format = figures.kind === 'decided' ? figures.value : ({ decimal: '.', group: '' } as const);
  const time = decideNumericTime(filled, format);
  return { name, kind: 'figures', cells, figures, ...(time ? { time } : {}) };
}
