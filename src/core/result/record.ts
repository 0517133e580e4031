/**
 * The one record every view reads. Keys that the headless output prints carry their SI unit, as the contract of the
 * file writes them. A number that does not apply is absent.
 */
import type { Finding } from '../check/finding.ts';
import type { Unchecked } from '../check/unchecked.ts';
import type { DutyName, Unknown } from '../document/project.ts';
import type { Dimension, StraightLength } from '../element/contract.ts';
import type { Phase } from '../fluid/contract.ts';
import type { SiteFigureFrom } from '../input/site.ts';
import type { Problem } from '../quantity/outcome.ts';
import type { Source } from '../quantity/source.ts';
import type { Working } from '../quantity/working.ts';
import type { Readings } from './readings-record.ts';
import type { TraverseFigures } from './traverse-record.ts';

/** Bounds of a range; one that its source does not give is absent. */
export interface RangeRecord {
  readonly minTemperature_K?: number;
  readonly maxTemperature_K?: number;
  readonly minPressure_Pa?: number;
  readonly maxPressure_Pa?: number;
}

export interface StateRecord {
  readonly density_kg_m3: number;
  readonly viscosity_Pa_s: number;
  readonly isentropicExponent?: number;
  readonly compressibility?: number;
  readonly phase: Phase;
  readonly vapourPressure_Pa?: number;
  readonly saturationTemperature_K?: number;
  readonly baseDensity_kg_m3?: number;
  readonly molarMass_kg_mol?: number;
  /** Density at the base state over that of dry air there. */
  readonly relativeDensity?: number;
  /** Mass fraction of vapour in wet steam. */
  readonly quality?: number;
  /** Figures that the user put in place of the model's. */
  readonly overridden?: readonly string[];
  /** Expanded, 95 %, as the formulation of the figure states it, by the name of the figure. */
  readonly uncertainty_percent?: Readonly<Record<string, number>>;
  /** Where the formulation of a figure holds, by the name of the figure; absolute pressures. */
  readonly ranges?: Readonly<Record<string, RangeRecord>>;
  readonly pressure_Pa: number; // absolute, upstream tapping
  readonly temperature_K: number;
  /** Joule-Thomson coefficient, where the formulation gives it. */
  readonly jouleThomson_K_Pa?: number;
  /** Where the temperature was measured behind the element: that reading, and what leads from it to the one upstream. */
  readonly downstream?: {
    readonly measured_K: number;
    readonly loss_Pa?: number; // absent where no correction could be made
  };
}

/** The site and the base state that the figures were computed with, stated or usual. */
export interface SiteRecord {
  readonly atmosphere_Pa: number;
  /** `place`: of the standard atmosphere at the altitude. */
  readonly atmosphereFrom: SiteFigureFrom;
  readonly gravity_m_s2: number;
  /** `place`: normal gravity at latitude and altitude. */
  readonly gravityFrom: SiteFigureFrom;
  readonly altitude_m?: number;
  readonly latitude_rad?: number;
  /** What the place has, whether or not another figure is stated. */
  readonly suggestedAtmosphere_Pa?: number;
  readonly suggestedGravity_m_s2?: number;
  readonly basePressure_Pa: number;
  readonly baseTemperature_K: number;
}

export interface UncertaintyTerm {
  readonly name: 'C' | 'epsilon' | 'pipe' | 'bore' | 'differential' | 'density';
  readonly percentOfFlow: number;
}

export interface PointUncertainty {
  /** Absent where no term of it is stated. */
  readonly expanded_percent?: number;
  readonly terms: readonly UncertaintyTerm[];
  /** Additive parts of the uncertainty of C, by the id of their words. */
  readonly parts: readonly { readonly name: string; readonly percentOfC: number }[];
  /** What the figure leaves out: terms that are not stated, limits beyond which nothing is known; it is at least so much. */
  readonly open: readonly string[];
}

export interface PointRecord {
  readonly massFlow_kg_s: number;
  readonly volumeFlow_m3_s: number;
  readonly baseVolumeFlow_m3_s?: number;
  readonly differential_Pa: number;
  readonly C: number;
  readonly epsilon: number;
  readonly reynoldsPipe: number;
  /** Absent where nothing says it. */
  readonly permanentLoss_Pa?: number;
  readonly velocityPipe_m_s: number;
  readonly velocityBore_m_s?: number;
  readonly uncertainty: PointUncertainty;
  /** The working of every figure of this point, in the order of the calculation. */
  readonly working: readonly Working[];
}

/** A point of flow against differential; `inside` is false outside the Reynolds limits of the element. */
export interface CurvePoint {
  readonly differential_Pa: number;
  readonly massFlow_kg_s: number;
  readonly reynoldsPipe: number;
  readonly expanded_percent: number;
  readonly inside: boolean;
}

/** Heads above the pipe axis at maximum flow, relative to the outlet's pressure head; metres of flowing fluid. None where the loss is not known. */
export interface HeadPoint {
  /** inlet, tapping-upstream, tapping-downstream, recovered; sections of a Venturi between. */
  readonly station: string;
  /** Distance from the upstream face of the element, in pipe bores. */
  readonly position_D: number;
  readonly total_m: number;
  readonly pressure_m: number;
  /** False for a point that is drawn, not computed. */
  readonly computed: boolean;
}

export interface Solved {
  readonly tag: string;
  readonly status: 'solved';
  readonly find: Unknown;
  /** Code of the words of kind and variant, for example `orifice-plate.flange`. */
  readonly element: string;
  readonly standard: string;
  readonly site: SiteRecord;
  readonly state: StateRecord;
  /** Bore and ratio are absent for an element without a bore. */
  readonly bore_m?: number;
  readonly pipe_m: number;
  readonly diameterRatio?: number;
  readonly boreAsMeasured_m?: number;
  readonly pipeAsMeasured_m: number;
  readonly points: Readonly<Partial<Record<DutyName, PointRecord>>>;
  /** The differential of the span: what the user set, or that of the maximum flow. */
  readonly span_Pa: number;
  readonly checks: readonly Finding[];
  /** Checks that could not be made, and the field each would need. */
  readonly unchecked: readonly Unchecked[];
  readonly curve: readonly CurvePoint[];
  /** Pipe Reynolds numbers and differentials between which the element's coefficient is known; none where nothing says it. */
  readonly reynoldsLimits: {
    readonly min?: number;
    readonly max?: number;
    readonly minDifferential_Pa?: number;
    readonly maxDifferential_Pa?: number;
    readonly source?: Source;
  };
  readonly heads: readonly HeadPoint[];
  readonly dimensions: readonly Dimension[];
  readonly tappings: { readonly upstream_m: number; readonly downstream_m: number };
  readonly straightLengths: readonly StraightLength[];
  /** Working that belongs to the meter, not to one flow: state, thermal growth, diameter ratio, the found bore. */
  readonly working: readonly Working[];
  /** Every source behind the figures of this result, worst `seen` first, each once. */
  readonly sources: readonly Source[];
  /** What was read on the meter's instrument; absent where the file has neither. */
  readonly readings?: Readings;
  /** Keys of the meter that this version keeps but does not evaluate (log, ...). */
  readonly unread: readonly string[];
}

export interface Refused {
  readonly tag: string;
  readonly status: 'refused';
  /** The first cause; `problems` has all of them. */
  readonly problem: Problem;
  readonly problems: readonly Problem[];
}

export type MeterResult = Solved | Refused;

/** A traverse with its plan; its velocities as far as it is read, its flow once it is read to the end. */
export interface SolvedTraverse extends TraverseFigures {
  readonly tag: string;
  readonly status: 'solved';
  readonly state: StateRecord;
}

/** The points of a traverse whose fluid is not known yet: nothing that needs a density. */
export interface PlannedTraverse extends TraverseFigures {
  readonly tag: string;
  readonly status: 'planned';
}

/** A traverse that was not solved. */
export interface RefusedTraverse extends Refused {
  /** Where readings alone stand in the way: the traverse as it is without them. */
  readonly besides?: SolvedTraverse;
  /** Where the state of the fluid stands in the way: the plan, which needs the section alone. */
  readonly planned?: PlannedTraverse;
}

export type TraverseResult = SolvedTraverse | RefusedTraverse;

export interface Results {
  /** The site of the project; absent where it cannot be read. */
  readonly site?: SiteRecord;
  readonly results: readonly MeterResult[];
  readonly traverses: readonly TraverseResult[];
}
