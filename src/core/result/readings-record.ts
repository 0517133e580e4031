/** The readings of a meter as every view reads them: each row on its own, and what they come to together. */
import type { Finding, Verdict } from '../check/finding.ts';
import type { Problem } from '../quantity/outcome.ts';
import type { Working } from '../quantity/working.ts';
import type { Picture, Standing } from '../reading/contract.ts';

export type { Picture, Standing } from '../reading/contract.ts';

/** One flow, on each basis that the fluid has. */
export interface FlowRecord {
  readonly massFlow_kg_s: number;
  readonly volumeFlow_m3_s: number;
  readonly baseVolumeFlow_m3_s?: number;
}

/** The signal of a control system scaled for the design state, brought to the state of the row, beside the exact flow. */
export interface CompensationRecord {
  readonly indicated: FlowRecord; // at the design state
  readonly densityFactor: number; // sqrt(rho/rho_d)
  readonly corrected: FlowRecord;
  /** What is left: expansibility, discharge coefficient, growth of the metal. */
  readonly residual_percent: number;
}

export interface ReadingUncertainty {
  readonly expanded_percent: number; // of the flow
  /** Of the reading alone; absent where nothing is stated of the instrument. */
  readonly reading_Pa?: number;
  readonly readingPercentOfFlow?: number;
  /** What the figure leaves out. */
  readonly open: readonly string[];
}

/** A row that could be read. Figures of the flow are absent where the reading gives none. */
export interface SolvedReading extends Partial<FlowRecord> {
  readonly status: 'solved';
  readonly time?: string;
  readonly standing: Standing;
  /** True where the flow stands for what flowed, so that it enters the mean. */
  readonly counted: boolean;
  readonly differential_Pa?: number; // absent where the instrument failed
  readonly pressure_Pa: number;
  readonly temperature_K: number;
  readonly density_kg_m3: number;
  readonly C?: number;
  readonly epsilon?: number;
  readonly reynoldsPipe?: number;
  readonly velocityPipe_m_s?: number;
  readonly uncertainty?: ReadingUncertainty;
  readonly compensation?: CompensationRecord;
  readonly checks: readonly Finding[];
  readonly picture: Picture;
  /** Of the reading and of the flow, in the order of the calculation. */
  readonly working: readonly Working[];
}

export interface RefusedReading {
  readonly status: 'refused';
  readonly time?: string;
  readonly problem: Problem;
  readonly problems: readonly Problem[];
}

export type ReadingRecord = SolvedReading | RefusedReading;

/** One flow of the series, with its row in the list. */
export interface ExtremeRecord extends FlowRecord {
  readonly row: number;
}

export interface ReadingSummary {
  readonly rows: number;
  readonly refused: number;
  readonly counted: number;
  /** Absent where no row counts. */
  readonly mean?: FlowRecord;
  readonly minimum?: ExtremeRecord;
  readonly maximum?: ExtremeRecord;
  /** The flow that the mean differential would make at the mean state: the root of a mean lies above the mean of roots. */
  readonly rooted?: FlowRecord & { readonly differential_Pa: number; readonly error_percent: number };
  /** How many rows have each finding that is not inside. */
  readonly flags: readonly { readonly id: string; readonly verdict: Verdict; readonly count: number }[];
}

/** Everything that the readings of a meter come to. */
export interface Readings {
  /** Kind of the instrument; absent where it cannot be read. */
  readonly instrument?: string;
  /** What is wrong with the instrument itself; then every row is refused. */
  readonly problems: readonly Problem[];
  readonly rows: readonly ReadingRecord[];
  readonly summary: ReadingSummary;
}
