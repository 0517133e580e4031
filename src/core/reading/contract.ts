/**
 * What an instrument is: it reads its own fields from the document, and makes of each reading the piezometric
 * differential that the flow equation asks for. Instruments never import each other.
 */
import type { Caution, FluidState } from '../fluid/contract.ts';
import type { Form } from '../input/form.ts';
import type { Asks, ReadingInput } from '../input/reading.ts';
import type { Acceleration, PressureDifference } from '../quantity/kinds.ts';
import type { Outcome } from '../quantity/outcome.ts';
import type { Working } from '../quantity/working.ts';

/** One kind of instrument. */
export interface Instrument {
  readonly kind: string;
  /** Reads the fields of the group `instrument`; undefined where the form has a problem. */
  readonly settle: (form: Form) => Settled | undefined;
}

/** An instrument with its fields read. */
export interface Settled {
  readonly kind: string;
  readonly asks: Asks;
  /** What a reading says; problems of the instrument against the state, for example manometer-liquid-light. */
  readonly read: (reading: ReadingInput, at: Conditions) => Outcome<Shown>;
}

/** What is around the instrument at the moment of a reading. */
export interface Conditions {
  readonly state: FluidState; // at the upstream tapping
  readonly gravity: Acceleration;
  /** The cell in use at the reading before, of two with stacked ranges. */
  readonly inUse?: Cell;
}

export type Cell = 'main' | 'lowRange';

/**
 * How the differential is to be taken: as it stands; as the least it can be (a saturated signal); as none, because flow
 * was cut off; or not at all, because the signal says that the instrument failed.
 */
export type Standing = 'as-shown' | 'at-least' | 'cut-off' | 'failed';

export interface Shown {
  readonly standing: Standing;
  /** Between the tappings, piezometric; at or below zero where nothing flows or the legs are crossed. */
  readonly differential: PressureDifference;
  readonly cautions: readonly Caution[];
  readonly working: readonly Working[];
  /** Of the reading, expanded at 95 %, by what it comes from; empty where nothing is stated. */
  readonly uncertainty: readonly UncertaintyPart[];
  readonly picture: Picture;
  readonly inUse?: Cell;
}

export interface UncertaintyPart {
  readonly name: string;
  readonly pascal: number;
}

/** What a drawing shows of a reading; figures in SI, a figure that does not apply is absent. */
export interface Picture {
  /** Menisci above the zero mark. */
  readonly levelUpstream_m?: number;
  readonly levelDownstream_m?: number;
  readonly liquid_kg_m3?: number;
  /** What fills the legs. */
  readonly upstreamLeg_kg_m3?: number;
  readonly downstreamLeg_kg_m3?: number;
  /** Pressures that two gauges show. */
  readonly upstream_Pa?: number;
  readonly throat_Pa?: number;
  /** Place of the signal between its ends, 0 to 1 inside the range. */
  readonly share?: number;
  readonly lowRangeShare?: number;
  /** True where the cell of the low range was used. */
  readonly lowRangeInUse?: boolean;
  readonly cell_Pa?: number;
}
