/** What the views print of a log: its first rows, and what its conversion came to. */
import type { PresentedProblem, Row, Segment, Value } from './model.ts';
import type { SheetHead } from './sheet.ts';

/** A column of the log as the choice of columns shows it. */
export interface LogColumn {
  readonly name: string;
  readonly at: number;
}

/** The first rows of a log. */
export interface PresentedLook {
  readonly spelling: string; // 'UTF-8, parted by comma, 1 row above the data'
  readonly columns: readonly LogColumn[];
  /** Whether a column holds clocks without dates. */
  readonly hasClock: boolean;
  /** Part of the meter that a column stands for, by its place. */
  readonly roles: Readonly<Record<number, string>>;
  readonly rows: readonly {
    readonly row: number;
    readonly cells: readonly { readonly text: string; readonly read?: string }[];
    readonly trouble?: string;
  }[];
  /** What was decided for a part and what it stands on, by the part's key. */
  readonly decided: Readonly<Record<string, string>>;
  /** What was taken because nothing is stated: `zone`, `interpretation`. */
  readonly assumed: readonly string[];
  /** Whether the stamps name their own zone. */
  readonly zoned: boolean;
  readonly questions: readonly LogQuestion[];
  readonly problems: readonly PresentedProblem[];
}

/** A cell that can be read in two ways, and what settles it. */
export interface LogQuestion {
  readonly text: string;
  readonly path: string;
  readonly answers: readonly { readonly label: string; readonly value: string }[];
}

export interface AccountRow {
  readonly code: string;
  readonly label: string;
  readonly meaning: string;
  readonly fate: string;
  readonly rows: Value;
  readonly share: Value;
  readonly time?: Value; // absent where the rows have no place in time
  readonly mass?: Value;
  /** The first of them: '1 204 (2026-03-14 06:30:00)', or the beginning of what is written there. */
  readonly first: readonly string[];
}

export interface DayRow {
  readonly key: string;
  readonly date: string;
  readonly mass: Value;
  readonly baseVolume?: Value;
  readonly mean?: Value;
  readonly least?: Value;
  readonly most?: Value;
  readonly flowing: Value;
  readonly flagged: Value;
  readonly gap: Value;
}

export interface ExtremeRow {
  readonly key: string;
  readonly label: string;
  readonly least: Value;
  readonly leastAt: string;
  readonly most: Value;
  readonly mostAt: string;
}

/** Mass flow over time in display units; a point without a flow is a gap. */
export interface LogChart {
  readonly points: readonly { readonly time: number; readonly flow?: number }[];
  readonly ticks: readonly { readonly time: number; readonly label: string }[];
  readonly unit: string;
  readonly most: number;
  readonly summary: string;
  readonly zone: string;
}

export interface PresentedLog {
  readonly answer: readonly Segment[];
  readonly share: string; // '98.8 % of the rows converted'
  readonly account: string; // '86 400 rows in 3.1 s: ...'
  readonly totals: readonly Row[];
  readonly means: readonly Row[];
  readonly extremes: readonly ExtremeRow[];
  readonly reasons: readonly AccountRow[];
  readonly days: readonly DayRow[];
  readonly chart: LogChart;
  /** How it was converted: columns, rules, zone, path. */
  readonly configuration: readonly { readonly label: string; readonly text: string }[];
  readonly notes: readonly string[];
  readonly head: SheetHead;
}
