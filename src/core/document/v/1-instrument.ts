/** Of the project file, version 1: the instrument a meter is read on, and what was read. */

/** A liquid by its name, or by its density. */
export type LiquidText = string | { density?: string; [key: string]: unknown };

/** One more cell on the same tappings, with a range below that of the first. */
export interface LowRangeText {
  lower?: string;
  upper?: string;
  zero?: string;
  up?: string; // share of its range above which the first takes over, '90 %'
  down?: string; // share below which it takes over again
  [key: string]: unknown;
}

/** Signals at which a value stops being one: NAMUR NE 43 where they are not stated. */
export interface SignalLimitsText {
  failLow?: string;
  low?: string;
  high?: string;
  failHigh?: string;
  [key: string]: unknown;
}

/** Uncertainties of the instrument: '0.1 % of span', '0.2 % of reading' or a pressure difference. */
export interface InstrumentUncertaintyText {
  as?: string; // 'expanded' (95 %, the default) | 'rectangular'
  accuracy?: string;
  stability?: string;
  ambient?: string;
  staticPressure?: string;
  output?: string; // of the signal itself and the card that reads it
  legs?: string;
  angle?: string; // of an inclined tube
  [key: string]: unknown;
}

export interface InstrumentText {
  kind?: string;
  liquid?: LiquidText; // 'mercury' | 'water' | 'air' (of an inverted tube)
  temperature?: string; // of the gauge liquid and its scale
  above?: LiquidText; // what fills the legs: 'process' (the default) | 'water' | a density
  aboveDownstream?: LiquidText; // the leg of the downstream tapping where it is filled otherwise
  rise?: string; // from the upstream tapping up to the downstream one
  drop?: string; // from the upstream tapping down to the zero mark or the cell
  high?: string; // the limb that stands higher for a positive reading: 'upstream' | 'downstream'
  zero?: string; // what it shows at no difference
  division?: string; // of the scale
  scale?: string; // 'plain' | 'corrected'
  scaleMetal?: string; // 'brass' | 'steel'
  scaleTrueAt?: string;
  tube?: string;
  well?: string;
  angle?: string; // of the tube from the horizontal
  heightUpstream?: string; // of a gauge above its own tapping
  heightThroat?: string;
  lower?: string;
  upper?: string;
  signal?: string; // '4-20 mA' | '1-5 V' | 'percent'
  output?: string; // 'linear' | 'square-root'
  limits?: SignalLimitsText;
  cutOff?: string; // share of the flow at `upper`, or a pressure difference
  lowRange?: LowRangeText;
  uncertainty?: InstrumentUncertaintyText;
  [key: string]: unknown;
}

/** One row: when, what the instrument showed, and what else was measured beside it. */
export interface ReadingText {
  time?: string;
  value?: string;
  lowRange?: string; // what the cell of the lower range showed
  upstream?: string; // of two gauges
  throat?: string;
  pressure?: string;
  temperature?: string;
  [key: string]: unknown;
}
