/**
 * Uncertainty of the flow rate by ISO 5167-1:2003, 8.2.2.1, Eq (3): relative, expanded, at 95 %; additive parts of C
 * are summed before the squares. What the user does not state takes the standard's allowance (pipe, bore) or is left out;
 * a bar across the pipe has no bore and no allowance for its pipe.
 */
import type { Condition, Part } from '../element/contract.ts';
import { exponentOf } from '../element/shared/expansibility.ts';
import type { StatedUncertainty } from '../input/uncertainty.ts';
import { isInside } from '../numeric/bounds.ts';
import type { Source } from '../quantity/source.ts';
import type { Meter, Operation } from '../solve/equation.ts';

/** The equation of the budget. */
export const EQUATION: Source = { clause: 'ISO 5167-1:2003, 8.2.2.1, Eq (3)', seen: 'memory' };
/** Largest uncertainty the standard itself leaves for D, used where none is stated. */
export const PIPE_ALLOWANCE = 0.4; // %, ISO 5167-1:2003, 8.2.2.2
/** The same for d. */
export const BORE_ALLOWANCE = 0.1; // %, ISO 5167-1:2003, 8.2.2.3

export type TermName = 'C' | 'epsilon' | 'pipe' | 'bore' | 'differential' | 'density';

export interface Term {
  readonly name: TermName;
  /** Relative uncertainty of the quantity itself, %. */
  readonly percent: number;
  /** What one percent of it moves the flow by. */
  readonly sensitivity: number;
  readonly percentOfFlow: number;
  readonly stated: boolean;
}

export interface Budget {
  readonly expandedPercent: number;
  readonly terms: readonly Term[];
  readonly coefficientParts: readonly Part[];
  /** Why the flow is less certain than the figure says; empty when nothing is left out. */
  readonly open: readonly Open[];
}

/** A term that is not stated, or a limit beyond which nothing says the uncertainty of C. */
export type Open =
  | 'coefficient'
  | 'expansibility'
  | 'pipe'
  | 'differential'
  | 'density'
  | 'reynolds-pipe'
  | 'straight-length';

/** Whether the budget says anything: one whose terms are all open is no uncertainty of nothing. */
export const isKnown = ({ terms, open }: Budget): boolean =>
  terms.some(({ percent: own }) => own > 0) || open.length === 0;

/** Conditions of one operation for limits and uncertainties. */
export const conditionOf = ({ state }: Meter, { reynolds, differential }: Operation): Condition => {
  const expansion = differential / state.pressure;
  if (!state.expands) return { reynolds, expansion, expands: false };
  return { reynolds, expansion, expands: true, isentropicExponent: exponentOf(state) };
};

/** Uncertainty of the flow of one operation; `extra` are further additive parts of C (straight lengths). */
export function flowUncertainty(
  meter: Meter,
  operation: Operation,
  stated: StatedUncertainty,
  span: number,
  extra: readonly Part[] = [],
): Budget {
  const { primary, geometry, state } = meter;
  const condition = conditionOf(meter, operation);
  const own = primary.coefficientUncertainty(geometry, condition);
  const coefficientParts = [...own, ...extra];
  const coefficient = coefficientParts.reduce((sum, part) => sum + part.percent, 0);
  const epsilon = state.expands ? primary.expansibilityUncertainty(geometry, condition)?.percent : 0;
  const terms = [
    term('C', coefficient, 1, own.length > 0),
    term('epsilon', epsilon ?? 0, 1, epsilon !== undefined),
    ...metalTerms(meter, stated),
    term('differential', differentialPercent(stated, operation, span), 0.5, stated.differential !== undefined), // Eq (3)
    term('density', percent(stated.density) ?? 0, 0.5, stated.density !== undefined), // Eq (3)
  ];
  const squares = terms.reduce((sum, { percentOfFlow }) => sum + percentOfFlow ** 2, 0); // Eq (3)
  const open = openTerms(meter, terms);
  const limit = primary.limits(geometry, 0).find(({ id }) => id === 'reynolds-pipe');
  if (limit !== undefined && !isInside(operation.reynolds, limit)) open.push('reynolds-pipe');
  return { expandedPercent: Math.sqrt(squares), terms, coefficientParts, open };
}

/** Pipe and bore; only the pipe where there is no bore. */
function metalTerms({ primary: { insertion }, geometry }: Meter, stated: StatedUncertainty): readonly Term[] {
  if (insertion !== undefined) {
    const sensitivity = insertion.pipeSensitivity(geometry.pipe);
    return [term('pipe', percent(stated.pipe) ?? 0, sensitivity, stated.pipe !== undefined)];
  }
  const b4 = geometry.ratio ** 4;
  return [
    term('pipe', percent(stated.pipe) ?? PIPE_ALLOWANCE, (2 * b4) / (1 - b4), stated.pipe !== undefined), // Eq (3)
    term('bore', percent(stated.bore) ?? BORE_ALLOWANCE, 2 / (1 - b4), stated.bore !== undefined), // Eq (3)
  ];
}

/** What a term is called that is not stated; an allowance stands in for those that are not named here. */
const OPEN: Readonly<Partial<Record<TermName, Open>>> = {
  C: 'coefficient',
  epsilon: 'expansibility',
  differential: 'differential',
  density: 'density',
};

/** The terms that are left out for want of a figure. */
function openTerms({ primary }: Meter, terms: readonly Term[]): Open[] {
  const names = primary.insertion === undefined ? OPEN : { ...OPEN, pipe: 'pipe' as const };
  return terms.flatMap(({ name, stated }) => {
    const open = stated ? undefined : names[name];
    return open === undefined ? [] : [open];
  });
}

const term = (name: TermName, percentage: number, sensitivity: number, stated: boolean): Term => ({
  name,
  percent: percentage,
  sensitivity,
  percentOfFlow: sensitivity * percentage,
  stated,
});

const percent = (share: number | undefined): number | undefined => (share === undefined ? undefined : 100 * share);

/** Relative uncertainty of the differential itself, %. */
function differentialPercent({ differential }: StatedUncertainty, operation: Operation, span: number): number {
  if (differential === undefined) return 0;
  if (differential.of === 'pressure') return (100 * differential.value) / operation.differential;
  const whole = differential.of === 'span' ? span : operation.differential;
  return (100 * differential.share * whole) / operation.differential;
}
