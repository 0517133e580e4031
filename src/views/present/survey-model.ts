/** A survey as the views print it: plan, readings and result in display units. */
import type { SolvedTraverse } from '../../core/result/record.ts';
import type { CheckGroup, Cited, Row, Segment, Value, WorkingGroup } from './model.ts';
import type { ListedSurvey } from './survey-list.ts';

export interface SurveyPoint {
  readonly number: number; // in the order of measuring
  readonly line: number; // from 0
  readonly point: number; // from 0
  /** Mark on the tube: from the outer end of the port where its length is entered, else from the wall. */
  readonly depth: Value;
  /** From the wall at which the probe enters. */
  readonly position: Value;
  readonly weight: Value;
  readonly moved: boolean;
  readonly differential?: Value;
  readonly velocity?: Value;
  /** For the drawings, SI. */
  readonly position_m: number;
  readonly velocity_m_s?: number;
}

export interface SurveyLine {
  readonly at: number; // from 0
  readonly title: string; // 'Line 1'
  readonly place: string; // '90 mm from the wall', '90° from the first'; '' for the only one
  readonly points: readonly SurveyPoint[];
  readonly mean?: Value;
  readonly across_m?: number;
  readonly angle_rad?: number;
}

export interface SurveyShape {
  readonly section: SolvedTraverse['section'];
  readonly lines: readonly SurveyLine[];
  /** Whether the points count alike. */
  readonly weighted: boolean;
}

export interface SurveySuggestion {
  readonly key: string;
  readonly text: string; // 'Air balancing: log-Tchebycheff, 5 lines of 5 points'
  readonly rule: string;
  readonly lines: number;
  readonly pointsPerLine: number;
  readonly cited: Cited;
  readonly chosen: boolean;
}

/** The picture of the velocities, in the unit of the display. */
export interface SurveyProfile {
  readonly lines: readonly {
    readonly at: number;
    readonly title: string;
    /** Share of the line inside the duct, and the velocity where it is read. */
    readonly points: readonly { readonly number: number; readonly at: number; readonly velocity?: number }[];
    readonly mean?: number;
  }[];
  readonly mean: { readonly at: number; readonly text: string } | undefined;
  readonly top: { readonly at: number; readonly text: string };
  readonly half: { readonly at: number; readonly text: string };
  readonly unit: string;
  readonly summary: string;
}

/** A survey with its plan; figures as far as it is read. */
export interface PresentedSurvey extends ListedSurvey {
  /** 'planned' while the fluid is not known: points and depths stand, velocities and flow wait. */
  readonly status: 'solved' | 'planned';
  readonly answer: readonly Segment[];
  readonly under: string;
  readonly measured: number;
  readonly points: number;
  readonly fromPort: boolean;
  readonly units: { readonly depth: string; readonly differential: string; readonly velocity: string };
  readonly lines: readonly SurveyLine[];
  readonly section: string; // '900 mm by 600 mm'
  readonly shape: SurveyShape;
  readonly profile: SurveyProfile;
  readonly results: readonly Row[];
  readonly quality: readonly Row[];
  readonly plan: readonly Row[];
  readonly state: readonly Row[];
  readonly fluid: string;
  readonly overridable: boolean;
  readonly terms: readonly Row[];
  readonly certainty: string;
  readonly suggestions: readonly SurveySuggestion[];
  readonly checks: readonly CheckGroup[];
  readonly working: readonly WorkingGroup[];
  readonly notes: readonly string[];
  readonly cautions: readonly string[];
}
