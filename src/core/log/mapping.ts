/** Which column of a log holds what, how it is spelled, and how a figure becomes SI: all that the reader has to know. */
import type { AbsolutePressure, PressureDifference, Temperature } from '../quantity/kinds.ts';
import type { Spelling } from './encoding.ts';
import type { FigureFormat } from './figure.ts';
import type { TimeFormat } from './time.ts';
import type { Zone } from './zone.ts';

/** What the signal of the log is: Pa, mA, V, or per cent of the span. */
export type SignalKind = 'differential' | 'current' | 'voltage' | 'percent';

/** A column of figures: (figure + before) · factor + after. The unit's factor is the double nearest to it. */
export interface FigureColumn {
  /** Place of the column, 0 for the first. */
  readonly at: number;
  readonly figures: FigureFormat;
  readonly before: number; // zero of the unit's scale
  readonly factor: number;
  readonly after: number; // the atmosphere of the site under a gauge pressure, Pa
}

export interface TimeColumn {
  readonly at: number;
  /** Place of the column of the clock, where date and clock stand apart. */
  readonly clockAt?: number;
  readonly format: TimeFormat;
  readonly figures: FigureFormat;
}

/** How the rows of a log are laid out. */
export interface Layout {
  readonly spelling: Spelling;
  /** Byte between two fields. */
  readonly delimiter: number;
  /** Fields of a row. */
  readonly fields: number;
  /** Rows before the first row of data, the header among them; blank lines are no rows. */
  readonly skip: number;
  /** Bytes of the header, none where there is no header. */
  readonly header: Uint8Array;
}

export interface Mapping {
  readonly layout: Layout;
  readonly time: TimeColumn;
  readonly zone: Zone;
  readonly signal: FigureColumn & { readonly kind: SignalKind };
  readonly pressure?: FigureColumn;
  readonly temperature?: FigureColumn;
  /** Whether a value holds at its moment, or until the next one is reported. */
  readonly interpretation: 'sampled' | 'held';
  /** Longest interval that is bridged, s; none where every interval is. */
  readonly maxGap?: number;
  /** A differential below it is no flow. */
  readonly cutOff?: PressureDifference;
  /** Rows with one and the same signal from which on they count as frozen. */
  readonly frozen?: number;
  /** Distance of a spike from the median of the rows before, in median absolute deviations. */
  readonly spike?: number;
  /** What stands in for a figure that is missing in a row. */
  readonly fallback: { readonly pressure?: AbsolutePressure; readonly temperature?: Temperature };
  /** What was taken because the file says nothing: `zone` for UTC, `interpretation` for sampled. */
  readonly assumed: readonly ('zone' | 'interpretation')[];
}
