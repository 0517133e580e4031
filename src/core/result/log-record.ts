/**
 * What the conversion of a log comes to: the one record that every view of a log reads. Keys carry their SI unit. A
 * number that does not apply is absent. Times are s since 1970-01-01 UTC.
 */

/** What became of a row: converted, converted with a remark, or not converted. */
export type Fate = 'converted' | 'remarked' | 'refused';

/** A point of the chart: the smallest or the largest flow of a stretch of time, at its own time. */
export interface ChartPoint {
  readonly time_s: number;
  readonly massFlow_kg_s: number;
  /** Nothing is known between the point before and this one. */
  readonly afterGap?: true;
}

/** Largest relative errors that the explicit rows have against the whole calculation. */
export interface KernelBounds {
  readonly density: number;
  readonly viscosity: number;
  readonly isentropicExponent: number;
  readonly coefficient: number;
  readonly epsilon: number;
  readonly massFlow: number;
}

export interface ShownRow {
  readonly row: number;
  readonly time_s?: number;
  /** The beginning of a row that could not be read. */
  readonly text?: string;
  /** Code of the problem of a row that could not be solved. */
  readonly problem?: string;
}

/** One reason: its rows, the time that it lasted and the mass that passed in it as far as it was converted. */
export interface AccountRecord {
  readonly code: string;
  readonly fate: Fate;
  readonly rows: number;
  readonly seconds: number;
  readonly mass_kg?: number;
  /** The first of them. */
  readonly first: readonly ShownRow[];
}

export interface Extreme {
  readonly least: number;
  readonly leastAt_s: number;
  readonly most: number;
  readonly mostAt_s: number;
}

/** What a day or the whole log comes to. */
export interface PeriodRecord {
  /** Rows with a stamp in it, and those of them that were converted. */
  readonly rows: number;
  readonly converted: number;
  readonly total_kg: number;
  /** At the state of each row, and at the base state where the fluid has one. */
  readonly volume_m3: number;
  readonly baseVolume_m3?: number;
  /** Time that the total stands for, that of it in which something flowed, and in which nothing did. */
  readonly seconds: number;
  readonly flowing_s: number;
  readonly still_s: number;
  /** Time between converted rows that the total does not stand for. */
  readonly gap_s: number;
  readonly gaps: number;
  readonly meanMassFlow_kg_s?: number;
  /** Weighted by time. */
  readonly meanDifferential_Pa?: number;
  readonly meanRoot_rootPa?: number;
  /** Weighted by flow while something flows, by time where nothing did. */
  readonly meanPressure_Pa?: number;
  readonly meanTemperature_K?: number;
  /** What the root of the mean differential would read too high, against the mean of the roots. */
  readonly rootingError_percent?: number;
  readonly extremes?: {
    readonly massFlow_kg_s: Extreme;
    readonly differential_Pa: Extreme;
    readonly pressure_Pa: Extreme;
    readonly temperature_K: Extreme;
  };
  /** Seconds by the code of the account, of those that are not clean. */
  readonly reasons_s: Readonly<Record<string, number>>;
}

export interface DayRecord extends PeriodRecord {
  /** Date on which the day begins, '2026-03-14'. */
  readonly date: string;
  readonly from_s: number;
  readonly to_s: number;
}

/** How the rows were computed. */
export interface PathRecord {
  readonly kind: 'surface' | 'exact';
  /** Why no wider surface was built, where one was wanted. */
  readonly why?: string;
  /** Rows by the surface, and rows in full. */
  readonly surfaceRows: number;
  readonly exactRows: number;
  /** Largest relative errors of the rows by the surface against the whole calculation. */
  readonly bounds?: KernelBounds;
}

export interface LogResult extends PeriodRecord {
  readonly tag: string;
  readonly from_s?: number;
  readonly to_s?: number;
  readonly accounts: readonly AccountRecord[];
  readonly days: readonly DayRecord[];
  readonly chart: readonly ChartPoint[];
  readonly longestGap?: { readonly seconds: number; readonly from_s: number };
  /** What would have passed in the gaps; it is no part of the total. */
  readonly substitutes: { readonly held_kg: number; readonly straightLine_kg: number };
  /** Longest interval that is bridged; absent where every one is. */
  readonly maxGap_s?: number;
  readonly maxGapStated: boolean;
  readonly interpretation: 'sampled' | 'held';
  readonly zone: string;
  readonly assumed: readonly string[];
  readonly path: PathRecord;
  /** Lines of no characters, rows over several lines, and whether the last row lacks its line end. */
  readonly blankLines: number;
  readonly spanningRows: number;
  readonly endsOpen: boolean;
}
