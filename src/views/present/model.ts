/**
 * What the views print. present/ turns a result into these rows in display units, by one rounding rule; screen, chart,
 * sheet and headless print them and compute nothing.
 */
import type { DutyName, Unknown } from '../../core/document/project.ts';
import type { Seen } from '../../core/quantity/source.ts';
import type { Solved } from '../../core/result/record.ts';
import type { CoefficientWords } from '../words/elements.ts';
import type { Mark } from '../words/provenance.ts';
import type { Expression } from './formula.ts';

export type Finding = Solved['checks'][number];
export type Verdict = Finding['verdict'];
export type Assumption = Finding['assumption'];

/** A number as printed. `text` is number, no-break space, unit; `plain` is the same in ASCII, for the clipboard. */
export interface Value {
  readonly number: string;
  readonly unit: string;
  readonly text: string;
  readonly plain: string;
  readonly si: number;
}

/** A clause with its mark: '' for what was read, otherwise a sign that a note explains. */
export interface Cited {
  readonly clause: string;
  readonly seen: Seen;
  /** '', '°' (second-hand or memory: check against your copy) or '†' (practice, not a standard). */
  readonly mark: Mark;
}

export interface Row {
  readonly id: string;
  readonly label: string;
  readonly symbol?: string; // formula notation: 'ρ_1'
  readonly value: Value;
  readonly cited?: Cited;
  /** Id of the working line that opens from this row. */
  readonly working?: string;
  readonly note?: string;
  /** Where the formulation of the figure holds, in words. */
  readonly range?: string;
  /** True where the user put the figure in place of the one that would be found. */
  readonly own?: boolean;
}

/** A piece of a sentence; `found` is the part that was computed, `given` a figure the user set. */
export interface Segment {
  readonly text: string;
  readonly role: 'words' | 'found' | 'given';
}

export interface DutyRow {
  readonly name: DutyName;
  readonly label: string; // 'maximum'
  readonly cells: Cells;
  /** Shares of the uncertainty of this flow, largest first. */
  readonly terms: readonly Row[];
  readonly verdict: Verdict;
}
/** Loss and uncertainty are absent where nothing says them. */
export type Cells = Readonly<Record<Exclude<DutyColumn, Untold>, Value> & Partial<Record<Untold, Value>>>;
type Untold = 'loss' | 'uncertainty';
export type DutyColumn =
  | 'flow'
  | 'differential'
  | 'reynolds'
  | 'coefficient'
  | 'expansibility'
  | 'loss'
  | 'velocity'
  | 'uncertainty';

export interface CheckRow {
  readonly id: string;
  readonly key: string; // unique in the list
  readonly verdict: Verdict;
  readonly verdictWord: string;
  readonly text: string; // 'Pipe Reynolds number 1.25 × 10⁵ at minimum flow'
  readonly limit: string; // 'at least 6 510'
  readonly cited: Cited;
  readonly at?: DutyName;
}
export interface CheckGroup {
  readonly assumption: Assumption;
  readonly title: string; // 'Frictionless'
  readonly meaning: string; // one line: what the assumption leaves out and what stands in for it
  readonly verdict: Verdict | 'unchecked'; // unchecked: no check could be made
  readonly rows: readonly CheckRow[];
  /** What could not be checked, and what it would take. */
  readonly open: readonly string[];
}

export interface WorkingRow {
  readonly id: string;
  readonly title: string; // 'Discharge coefficient'
  readonly symbol: Expression;
  readonly formula?: Expression;
  readonly substituted?: Expression;
  readonly value: Value;
  readonly given: readonly Row[];
  readonly cited: Cited;
  readonly remark?: string;
}
export interface WorkingGroup {
  readonly id: 'meter' | DutyName;
  readonly title: string;
  readonly rows: readonly WorkingRow[];
}

export interface StraightRow {
  readonly fitting: string; // code
  readonly label: string;
  readonly side: 'upstream' | 'downstream';
  readonly full: string; // '26 D'
  readonly reduced: string; // '13 D' or a dash
  readonly cited: Cited;
  readonly note?: string;
  readonly chosen: boolean;
}

/** Flow against differential, in display units. */
export interface ChartPoint {
  readonly differential: number;
  readonly flow: number;
  readonly low: number; // flow less its expanded uncertainty
  readonly high: number;
  readonly inside: boolean;
}
export interface Chart {
  readonly points: readonly ChartPoint[];
  readonly duty: readonly {
    readonly name: DutyName;
    readonly label: string;
    readonly differential: number;
    readonly flow: number;
  }[];
  readonly differentialUnit: string;
  readonly flowUnit: string;
  /** Whether an uncertainty makes a band round the curve, and whether there are Reynolds limits. */
  readonly banded: boolean;
  readonly limited: boolean;
  /** Range of differential outside the Reynolds limits, with its words; empty when the whole curve is inside. */
  readonly outside: readonly { readonly from: number; readonly to: number; readonly label: string }[];
  /** One sentence that says what the chart shows. */
  readonly summary: string;
}

/** The head lines above the pipe, heads in display units with their printed labels. */
export interface Heads {
  readonly points: readonly {
    readonly station: string;
    readonly position_D: number;
    readonly total: number;
    readonly pressure: number;
    readonly computed: boolean;
  }[];
  readonly tappingDrop: Value; // head between the tappings
  readonly loss: Value; // permanent loss as head
}

export interface DimensionRow {
  readonly id: string;
  readonly label: string;
  readonly symbol?: string;
  readonly text: string; // '0.51 to 2.05 mm', '25.4 ± 0.5 mm'
  readonly nominal?: number; // m or degrees, for the drawing
  readonly cited: Cited;
}

/** Figures that the drawing needs, SI, straight from the result. A bar across the pipe leaves its bore open: ratio 1. */
export interface Shape {
  readonly element: string; // words code 'orifice-plate.flange'
  readonly pipe: number;
  readonly bore: number;
  readonly ratio: number;
  readonly tappingUpstream: number;
  readonly tappingDownstream: number;
  readonly recovery_D: number; // 0 where nothing says it
}

export interface PresentedProblem {
  readonly field: string; // path below the meter, 'upstream.pressure'
  readonly sentence: string;
}

export interface PresentedMeter {
  readonly tag: string;
  readonly service: string;
  readonly element: string; // 'Orifice plate, flange tappings'
  readonly standard: string;
  readonly status: 'solved' | 'refused';
  readonly problems: readonly PresentedProblem[];
  readonly verdict: { readonly worst: Verdict | 'refused'; readonly words: string }; // '1 caution', 'inside', 'not solved'
}

/** A solved meter, ready to print. */
export interface PresentedSizing extends PresentedMeter {
  readonly status: 'solved';
  readonly find: Unknown;
  readonly answer: readonly Segment[];
  readonly under: string; // line below the answer: tag, tappings, standard, uncertainty at normal flow
  /** What was found, for the shaded field: bore as measured, differential or flow. */
  readonly found: { readonly value: Value; readonly from: string };
  readonly loss?: Value; // permanent loss at maximum flow
  /** The coefficient's symbol and its names. */
  readonly coefficient: CoefficientWords;
  /** Name and phase of the fluid: 'Water', 'liquid'. */
  readonly fluid: { readonly name: string; readonly phase: string };
  readonly state: readonly Row[];
  /** Whether single figures of the state can be put in place of those found. */
  readonly overridable: boolean;
  /** Whether a temperature measured downstream leads to the one upstream. */
  readonly throttles: boolean;
  readonly pipe: readonly Row[];
  readonly metal: readonly Row[]; // the element: bore, ratio, plate; the coefficient of a bar
  readonly duty: readonly DutyRow[];
  /** What the uncertainty leaves out; empty when nothing. */
  readonly certainty: string;
  readonly checks: readonly CheckGroup[];
  readonly working: readonly WorkingGroup[];
  readonly dimensions: readonly DimensionRow[];
  readonly straight: readonly StraightRow[];
  readonly chart: Chart;
  /** Absent where the loss is not known. */
  readonly heads?: Heads;
  readonly shape: Shape;
  readonly notes: readonly string[]; // provenance notes and what this version leaves unread
  readonly cautions: readonly string[];
}
