/**
 * What the first rows of a log show, and what the columns that the document names come to in them: enough for a user to
 * judge the mapping before anything is converted.
 */
import type { Problem } from '../quantity/outcome.ts';

/** A cell of the sample; row 0 stands near the end of the log, at a row that is not counted. */
export interface LookedCell {
  readonly text: string;
  readonly row: number;
}

/** What a sample decides once for a column, with the cell it stands on; or both readings of a cell. */
export type LookedDecision<Value> =
  | { readonly kind: 'decided'; readonly value: Value; readonly evidence?: LookedCell }
  | {
      readonly kind: 'open';
      readonly sample: LookedCell;
      readonly readings: readonly { readonly value: Value; readonly reads: number }[];
    };

export interface LookedColumn {
  readonly name: string;
  readonly kind: 'time' | 'clock' | 'figures' | 'text' | 'empty';
  readonly figures: LookedDecision<{ readonly decimal: '.' | ','; readonly group: string }>;
  /** What the column means as a time, where it can mean one: a format of `log.time.format`. */
  readonly time?: LookedDecision<string>;
}

/** A row as the conversion will read it, in SI; what is missing in it is absent. */
export interface LookedRow {
  readonly row: number;
  readonly time_s?: number; // s since 1970-01-01 UTC
  /** Pa of a differential; mA, V or per cent of a signal. */
  readonly signal?: number;
  readonly pressure_Pa?: number;
  readonly temperature_K?: number;
  /** Why it cannot be read. */
  readonly trouble?: string;
}

/** Places of the columns, 0 for the first, and what was decided for the whole log. */
export interface LookedMapping {
  readonly time: number;
  readonly clock?: number;
  readonly signal: number;
  readonly signalKind: 'differential' | 'current' | 'voltage' | 'percent';
  readonly pressure?: number;
  readonly temperature?: number;
  readonly timeFormat: string;
  readonly zone: string;
  /** Whether the stamps name their own zone, so that the stated one is not needed. */
  readonly zoned: boolean;
  /** What was taken because the document says nothing: `zone`, `interpretation`. */
  readonly assumed: readonly string[];
  readonly read: readonly LookedRow[];
}

export interface LogLook {
  readonly encoding: string;
  readonly delimiter: string;
  readonly hasHeader: boolean;
  /** Rows before the first row of data, the header among them. */
  readonly skip: number;
  readonly columns: readonly LookedColumn[];
  /** The first rows of data as they are written. */
  readonly rows: readonly (readonly string[])[];
  /** Absent while a problem of the columns stands in the way. */
  readonly mapping?: LookedMapping;
  /** What stands in the way of a conversion; empty when it can begin. */
  readonly problems: readonly Problem[];
}
