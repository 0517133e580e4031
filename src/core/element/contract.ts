/**
 * What solve, check and uncertainty know of a primary element, and all they know. Pure functions of the geometry.
 *
 * An element file exports one `Element`; registry.ts lists it. Elements share through shared/, never with each other.
 */
import type { Field } from '../input/field.ts';
import type { Length } from '../quantity/kinds.ts';
import type { Outcome } from '../quantity/outcome.ts';
import type { Source } from '../quantity/source.ts';
import type { Working } from '../quantity/working.ts';

/** The metal at the line temperature. */
export interface Geometry {
  readonly pipe: Length; // D
  readonly bore: Length; // d
  readonly ratio: number; // beta
}

/** Conditions of one flow that limits and uncertainties may depend on. */
export interface Condition {
  readonly reynolds: number; // Re_D
  readonly expansion: number; // x = dp/p1
  readonly isentropicExponent?: number; // kappa; absent where the fluid does not expand
  readonly expands: boolean;
}

/** A limit of use. Bounds are in SI; a bound that does not exist is absent. */
export interface Limit {
  /** One of: pipe-bore, element-bore, diameter-ratio, reynolds-pipe, pressure-ratio, pipe-roughness, pipe-velocity. */
  readonly id: LimitId;
  readonly min?: number;
  readonly max?: number;
  readonly source: Source;
}
export type LimitId =
  | 'pipe-bore'
  | 'element-bore'
  | 'diameter-ratio'
  | 'reynolds-pipe'
  | 'pressure-ratio'
  | 'pipe-roughness'
  | 'pipe-velocity';

/** One additive part of a relative expanded uncertainty, in percent at 95 %. */
export interface Part {
  /** Code of its words: base, small-pipe, low-reynolds, ... */
  readonly id: string;
  readonly percent: number;
  readonly source: Source;
}

/** Discharge coefficient against pipe Reynolds number, prepared for one geometry. */
export type Discharge = (reynolds: number) => number;
/** Expansibility factor against x = dp/p1, prepared for one ratio and isentropic exponent. */
export type Expansibility = (expansion: number) => number;

/** Required straight length for one fitting, in pipe bores. */
export interface StraightLength {
  readonly fitting: string; // code, see views/words
  readonly side: 'upstream' | 'downstream';
  readonly full: number; // column A: no additional uncertainty
  readonly reduced?: number; // column B: adds 0.5 % to the uncertainty of C
  readonly source: Source;
  /** Code of a note of the table that applies. */
  readonly note?: string;
}

/** One dimension of the element for the drawing and the sheet, SI; tolerance as the standard words it. */
export interface Dimension {
  /** Code, for example plate-thickness-edge, tapping-upstream, convergent-angle; see views/words. */
  readonly id: string;
  readonly symbol?: string; // e, E, l_1 ...
  readonly min?: number;
  readonly max?: number;
  readonly nominal?: number;
  readonly unit: 'm' | 'deg' | '1';
  readonly source: Source;
}

/** A section whose pressure is that of one of the tappings. */
export interface Section {
  readonly station: string;
  readonly position: number;
  readonly level: 'upstream' | 'throat';
}

/** A bar across the pipe: it has no bore, and its coefficient counts a section of the pipe instead. */
export interface Insertion {
  /**
   * The section at the line temperature: ratio 0, so that the velocity of approach factor is 1; `bore` is the diameter of
   * a circle of its area. Problems: figures of the element that leave no section, or exclude each other.
   */
  readonly section: (pipe: Length) => Outcome<Geometry>;
  /** The working of its area, m2; absent where it is that of the pipe. */
  readonly area?: (pipe: Length) => Working;
  /** What one percent of D moves the flow by, %. */
  readonly pipeSensitivity: (pipe: Length) => number;
  /** False where the expansibility factor is taken as 1 for want of a figure. */
  readonly expansionStated: boolean;
}

/** An element whose own fields are settled (tappings, convergent, ...). */
export interface Primary {
  readonly kind: string;
  /** Code of the words that name kind and variant, for example `orifice-plate.flange`. */
  readonly name: string;
  readonly standard: string; // 'ISO 5167-2:2022'
  /** Dimensions that the solver may search, as a diameter ratio. */
  readonly ratioRange: { readonly min: number; readonly max: number };
  /** Pipe Reynolds number below which C is held, about a tenth of the lower limit; continuous in the ratio. */
  readonly reynoldsFloor: (at: Geometry) => number;
  /** First guess of C for the solver: ISO 5167-1:2003, Annex A (0.606 for orifice plates, 1 for the others). */
  readonly guess: number;
  readonly discharge: (at: Geometry) => Discharge;
  /** Present where the element has no bore. */
  readonly insertion?: Insertion;
  readonly expansibility: (ratio: number, isentropicExponent: number) => Expansibility;
  /** Permanent pressure loss as a share of the differential; absent where nothing says it. */
  readonly lossShare?: (at: Geometry, coefficient: number, reynolds: number) => number;
  readonly limits: (at: Geometry, reynolds: number) => readonly Limit[];
  /** Parts of the uncertainty of C, to be added arithmetically; none where nothing says it. */
  readonly coefficientUncertainty: (at: Geometry, flow: Condition) => readonly Part[];
  /** Undefined where nothing says it. */
  readonly expansibilityUncertainty: (at: Geometry, flow: Condition) => Part | undefined;
  readonly straightLengths: (ratio: number, reynolds: number) => readonly StraightLength[];
  readonly dimensions: (at: Geometry) => readonly Dimension[];
  /** Distance of the two tappings from the upstream face (or tapping planes), for drawing and head lines, m. */
  readonly tappings: (at: Geometry) => { readonly upstream: number; readonly downstream: number };
  /** Further sections at which the heads are known, m from the upstream face; a Venturi tube has them. */
  readonly sections?: (at: Geometry) => readonly Section[];
  /** Distance downstream within which the pressure recovers, in pipe bores; absent where nothing says it. */
  readonly recovery?: number;
  readonly working: {
    readonly coefficient: (at: Geometry, reynolds: number) => Working;
    readonly expansibility: (ratio: number, isentropicExponent: number, expansion: number) => Working;
    /** Present with `lossShare`. */
    readonly loss?: (at: Geometry, coefficient: number, reynolds: number, differential: number) => Working;
  };
}

export interface Element {
  /** As written in the file, `element.kind`. */
  readonly kind: string;
  /** Where the element has no bore to be asked for. */
  readonly bore?: 'none';
  /** The element's own fields beside bore, material and measuredAt. */
  readonly fields: readonly Field[];
  /** The element with its fields settled; the values come parsed, by field name. */
  readonly primary: (fields: Readonly<Record<string, string | number>>) => Primary;
}
