/** What the record of a traverse holds beside its tag and its fluid's state. A number that does not apply is absent. */
import type { Finding } from '../check/finding.ts';
import type { Unchecked } from '../check/unchecked.ts';
import type { Source } from '../quantity/source.ts';
import type { Working } from '../quantity/working.ts';

export interface TraversePointRecord {
  /** Counted from 1 in the order of measuring, over all lines. */
  readonly number: number;
  /** From the inside of the wall at which the probe enters. */
  readonly position_m: number;
  /** Mark on the tube, from the outer end of the port. */
  readonly depth_m: number;
  /** Share of the mean that the point stands for. */
  readonly weight: number;
  /** Whether the wall rule moved it. */
  readonly moved: boolean;
  readonly differential_Pa?: number;
  readonly velocity_m_s?: number;
}

export interface TraverseLineRecord {
  /** Of a diameter, from that of the first line. */
  readonly angle_rad?: number;
  /** Of a line in a rectangular section, from the inside of the wall. */
  readonly across_m?: number;
  readonly points: readonly TraversePointRecord[];
  readonly meanVelocity_m_s?: number;
}

/** Numbers of points that a practice asks for. */
export interface SuggestionRecord {
  readonly practice: 'iso-3966' | 'epa-method-1' | 'air-balancing';
  readonly rule: string;
  readonly lines: number;
  readonly pointsPerLine: number;
  readonly source: Source;
}

export interface QualityRecord {
  /** Mean by the weights of the points that are read so far, before the factor of the wall. */
  readonly meanSoFar_m_s: number;
  readonly leastVelocity_m_s: number;
  readonly mostVelocity_m_s: number;
  readonly scatter_percent?: number;
  /** Between the means of the lines. */
  readonly lines_percent?: number;
  readonly strongReadings_percent: number;
  readonly reversedReadings: number;
  readonly stillReadings: number;
  readonly drift_percent?: number;
  /** What averaging the differentials instead of the velocities would have added. */
  readonly differentialAveraging_percent?: number;
  /** Mean of this rule on a 1/7-power profile, over the true one. */
  readonly ruleOnPowerLaw_percent?: number;
}

export interface TraverseUncertaintyRecord {
  readonly expanded_percent: number;
  readonly terms: readonly {
    readonly name: 'reading' | 'coefficient' | 'density' | 'area' | 'points';
    readonly percentOfFlow: number;
    readonly stated: boolean;
  }[];
  readonly source: Source;
}

export interface TraverseFlowRecord {
  readonly meanVelocity_m_s: number;
  readonly volumeFlow_m3_s: number;
  readonly massFlow_kg_s: number;
  readonly baseVolumeFlow_m3_s?: number;
  readonly reynolds: number;
}

export interface TraverseFigures {
  readonly service?: string;
  readonly rule: string;
  readonly section:
    | { readonly shape: 'circular'; readonly diameter_m: number }
    | {
        readonly shape: 'rectangular';
        readonly width_m: number;
        readonly height_m: number;
        readonly ports: 'width' | 'height';
      };
  readonly area_m2: number;
  readonly hydraulicDiameter_m: number;
  readonly port_m: number;
  readonly lines: readonly TraverseLineRecord[];
  /** Points of the plan, and how many of them are read. */
  readonly points: number;
  readonly measured: number;
  readonly suggestions: readonly SuggestionRecord[];
  /** Absent until every point is read. */
  readonly flow?: TraverseFlowRecord;
  /** Absent until something is read. */
  readonly quality?: QualityRecord;
  readonly uncertainty?: TraverseUncertaintyRecord;
  readonly checks: readonly Finding[];
  /** Checks that could not be made, and the field each would need. */
  readonly unchecked: readonly Unchecked[];
  readonly working: readonly Working[];
  /** Every source behind the plan and the checks, worst `seen` first, each once. */
  readonly sources: readonly Source[];
}
