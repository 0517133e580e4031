/** The readings of a meter, ready to print. */
import type { Picture, ReadingSummary } from '../../core/result/readings-record.ts';
import type { Verdict } from '../words/verdicts.ts';
import type { CheckRow, PresentedProblem, Segment, Value, WorkingRow } from './model.ts';

/** Texts in the picture of an instrument. */
export interface InstrumentTexts {
  /** Accessible name and description. */
  readonly title: string;
  readonly description: string;
  readonly reading: string; // '152 mm', '12 mA'
  readonly second: string; // throat gauge, or the cell of the low range; '' where there is none
  readonly liquid: string; // 'mercury, 13 540 kg/m³'
  readonly above: readonly string[]; // 'the process fluid', 'in both legs'
  readonly upstream: readonly string[]; // 'upstream leg', 'stands lower'
  readonly downstream: readonly string[];
  readonly ends: readonly [string, string]; // of a signal
  readonly rise: string; // '' where there is none
}

/** An instrument as it is drawn at one reading. */
export interface Drawn {
  readonly picture: Picture;
  /** Largest vertical distance of two levels in the series, m: all rows are drawn to that scale. */
  readonly most: number;
  /** True for a plate across the pipe, false for a throat. */
  readonly plate: boolean;
  readonly angle: number; // rad, of an inclined tube
  readonly texts: InstrumentTexts;
}

/** Figures of a row that makes a flow; those that do not apply are absent. */
export interface ReadingFigures {
  readonly differential?: Value;
  readonly flow?: Value;
  readonly velocity?: Value;
  readonly reynolds?: Value;
  readonly coefficient?: Value;
  readonly expansibility?: Value;
  readonly uncertainty?: Value;
}

export type ReadingColumn = keyof ReadingFigures;

export interface Compensation {
  readonly indicated: Value;
  readonly factor: Value;
  readonly corrected: Value;
  readonly exact: Value;
  readonly residual: Value;
}

export interface ReadingRow {
  readonly index: number; // in the document
  readonly time: string; // as written
  /** What was read and what was measured beside it, as the document has it. */
  readonly written: Readonly<Record<string, string>>;
  readonly status: 'solved' | 'refused';
  readonly figures: ReadingFigures;
  readonly note: { readonly verdict: Verdict | 'refused'; readonly words: string };
  readonly answer: readonly Segment[];
  readonly under: string;
  /** The sentences of a row that cannot be used. */
  readonly problems: readonly PresentedProblem[];
  readonly checks: readonly CheckRow[];
  readonly working: readonly WorkingRow[];
  /** Present where the row has its own state. */
  readonly compensation?: Compensation;
  readonly drawn?: Drawn;
}

export interface PresentedReadings {
  readonly kind: string; // of the instrument
  readonly instrument: string;
  /** Of the instrument and of every row, by the field. */
  readonly problems: readonly PresentedProblem[];
  readonly rows: readonly ReadingRow[];
  /** The instrument before anything is read. */
  readonly blank: Drawn;
  /** The one unit of each column of figures; '' for a plain number. */
  readonly units: Readonly<Record<ReadingColumn, string>>;
  /** The rows together, in sentences: mean, error of rooting the mean, flags. */
  readonly together: readonly string[];
  readonly summary: ReadingSummary;
  readonly notes: readonly string[];
  readonly cautions: readonly string[];
}
