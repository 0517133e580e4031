/**
 * The project file, version 1: what the user wrote, as text. Every value with a dimension is a string kept byte for
 * byte; a plain number stands only for what has no unit. Keys this version does not know are kept.
 */
import type { InstrumentText, ReadingText } from './1-instrument.ts';
import type { LogText } from './1-log.ts';

export type Unknown = 'bore' | 'differential' | 'flow';
export type Display = 'SI' | 'US';
export type DutyName = 'maximum' | 'normal' | 'minimum';

export interface FluidText {
  kind?: string;
  phase?: string; // 'liquid' | 'vapour' settles the saturation line
  density?: string;
  viscosity?: string;
  isentropicExponent?: string | number;
  molarMass?: string;
  compressibility?: string | number;
  vapourPressure?: string;
  baseDensity?: string;
  quality?: string | number; // of wet steam, '95 %' or 0.95
  name?: string; // of a liquid or of a pure gas
  relativeHumidity?: string | number; // of air, '60 %' or 0.6; or one of the two that follow
  dewPoint?: string; // of air, at its own pressure
  wetBulb?: string;
  baseBasis?: string; // 'wet' | 'dry': what a base volume of moist air counts
  concentration?: string | number; // of a mixture with water, '30 %' or 0.3
  table?: LiquidRow[];
  override?: FluidOverride;
  [key: string]: unknown;
}

/** A row of a liquid's own table. */
export interface LiquidRow {
  temperature?: string;
  density?: string;
  viscosity?: string;
  [key: string]: unknown;
}

/** Single figures that the user puts in place of the model's. */
export interface FluidOverride {
  density?: string;
  viscosity?: string;
  isentropicExponent?: string | number;
  vapourPressure?: string;
  [key: string]: unknown;
}

export interface PipeText {
  size?: string; // name of the pipe size the bore was taken from, for example 'DN 100, 40'
  bore?: string;
  material?: string;
  measuredAt?: string;
  roughness?: string; // Ra
  [key: string]: unknown;
}

export interface CalibrationRow {
  reynolds?: string | number;
  coefficient?: string | number;
  [key: string]: unknown;
}

export interface ElementText {
  kind?: string;
  tappings?: string;
  convergent?: string;
  bore?: string;
  material?: string;
  measuredAt?: string;
  plateThickness?: string; // E
  edgeThickness?: string; // e
  coefficient?: string | number; // K of an averaging pitot; what follows is of its sheet
  area?: string; // 'pipe' | 'clear': what K counts
  width?: string; // of the bar, across the flow
  coefficientUncertainty?: string; // '1 %'
  expansion?: string | number; // a of ε = 1 - a Δp/(κ p₁)
  reynoldsMin?: string | number;
  reynoldsMax?: string | number;
  velocityMax?: string;
  straightBefore?: string; // '9 D'
  straightAfter?: string;
  loss?: string; // share of the differential, '8 %'
  calibration?: CalibrationRow[];
  [key: string]: unknown;
}

/** What stands before and after the element; lengths as '30 D' or as a length. */
export interface InstallationText {
  fitting?: string; // nearest fitting upstream
  before?: string;
  after?: string;
  fluctuation?: string; // rms of the differential against its mean, as '4 %'
  [key: string]: unknown;
}

/** Expanded relative uncertainties at 95 %, as '0.4 %'; the differential as '0.1 % of span' or '% of reading'. */
export interface UncertaintyText {
  bore?: string;
  pipe?: string;
  differential?: string;
  density?: string;
  [key: string]: unknown;
}

export interface MeterText {
  tag?: string;
  service?: string;
  fluid?: FluidText;
  upstream?: {
    pressure?: string;
    temperature?: string;
    temperatureAt?: string; // 'upstream' | 'downstream' of the element; upstream unless it is said
    [key: string]: unknown;
  };
  pipe?: PipeText;
  element?: ElementText;
  duty?: { maximum?: string; normal?: string; minimum?: string; [key: string]: unknown };
  differential?: string;
  find?: Unknown;
  uncertainty?: UncertaintyText;
  installation?: InstallationText;
  instrument?: InstrumentText;
  readings?: ReadingText[];
  log?: LogText;
  [key: string]: unknown;
}

/** A row of a probe's calibration. */
export interface ProbeRow {
  velocity?: string;
  coefficient?: string | number;
  [key: string]: unknown;
}

export interface ProbeText {
  kind?: string; // 'pitot-static' | 's-type'
  coefficient?: string | number;
  calibration?: ProbeRow[]; // it replaces the coefficient
  head?: string; // diameters
  stem?: string;
  hole?: string;
  alignment?: string; // angle from the axis of the duct
  [key: string]: unknown;
}

/** A survey of the velocities in a section of a duct or pipe. */
export interface TraverseText {
  tag?: string;
  service?: string;
  section?: {
    shape?: string;
    diameter?: string;
    width?: string;
    height?: string;
    ports?: string;
    [key: string]: unknown;
  };
  rule?: string; // 'log-linear' | 'log-tchebycheff' | 'equal-area' | 'single-point'
  lines?: string | number;
  pointsPerLine?: string | number;
  wallRule?: string; // 'leave' | 'move' | 'merge'
  profile?: {
    kind?: string; // of a single point: 'laminar' | 'power' | 'stated'
    at?: string; // 'centre' | 'mean-velocity'
    exponent?: string | number;
    meanOverCentre?: string | number;
    [key: string]: unknown;
  };
  port?: string; // its length, from the outer end to the inside of the wall
  straight?: { before?: string; after?: string; [key: string]: unknown };
  probe?: ProbeText;
  fluid?: FluidText;
  state?: { pressure?: string; temperature?: string; [key: string]: unknown };
  manometer?: {
    liquid?: string | { density?: string; [key: string]: unknown };
    temperature?: string;
    angle?: string; // of the tube from the horizontal
    [key: string]: unknown;
  };
  /** One list for each line; an empty text is a point that is not read yet. */
  readings?: string[][];
  /** A second probe at one point, in the order of time. */
  reference?: string[];
  nullAngle?: string;
  corrections?: { blockage?: string; turbulence?: string; wall?: string | number; [key: string]: unknown };
  uncertainty?: {
    reading?: string;
    coefficient?: string;
    density?: string;
    area?: string;
    points?: string;
    [key: string]: unknown;
  };
  [key: string]: unknown;
}

export interface ProjectV1 {
  format: 'headwright';
  version: 1;
  title?: string;
  revision?: string;
  preparedBy?: string;
  checkedBy?: string;
  site?: {
    atmosphere?: string;
    gravity?: string;
    altitude?: string; // above the sea; the atmosphere follows from it where none is stated
    latitude?: string; // '52.1 deg', south negative; gravity follows from it where none is stated
    [key: string]: unknown;
  };
  base?: { pressure?: string; temperature?: string; [key: string]: unknown };
  display?: Display;
  /** Anything may stand in the list: what is no meter is refused where it stands, the others are solved. */
  meters: MeterText[];
  /** As in the list of meters, anything may stand here. */
  traverses?: TraverseText[];
  [key: string]: unknown;
}
