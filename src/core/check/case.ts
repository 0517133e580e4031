/** What every check looks at: the meter as entered, as solved, and its flows. */
import type { DutyName } from '../document/project.ts';
import type { Limit, LimitId } from '../element/contract.ts';
import type { MeterInput } from '../input/meter.ts';
import { type Bounds, isInside } from '../numeric/bounds.ts';
import type { Operation } from '../solve/equation.ts';
import type { Solution } from '../solve/solve.ts';
import type { Verdict } from './finding.ts';

export interface Case {
  readonly input: MeterInput;
  readonly solution: Solution;
}

export interface Flow extends Operation {
  readonly name: DutyName;
}

const ORDER: readonly DutyName[] = ['maximum', 'normal', 'minimum'];

/** The duty points there are, largest first as named. */
export const flowsOf = ({ solution }: Case): readonly Flow[] =>
  ORDER.flatMap((name) => {
    const operation = solution.duty[name];
    return operation === undefined ? [] : [{ ...operation, name }];
  });

/** The flow that makes a figure largest. */
export const largest = (flows: readonly Flow[], figure: (flow: Flow) => number): Flow => {
  const [first, ...rest] = flows;
  if (first === undefined) throw new Error('check: expected at least one flow, got none');
  return rest.reduce((most, flow) => (figure(flow) > figure(most) ? flow : most), first);
};

/** Inside or outside of bounds; the bounds themselves are inside. */
export const within = (value: number, bounds: Bounds): Verdict => (isInside(value, bounds) ? 'inside' : 'outside');

/** Superheat or subcooling that a line's swings of pressure and temperature may eat up: nearer, it is on the line. */
export const NEAR_SATURATION = 5; // K, custom

/** The bounds of a limit, without what else it carries. */
export const boundsOf = ({ min, max }: Limit): Bounds => ({
  ...(min === undefined ? {} : { min }),
  ...(max === undefined ? {} : { max }),
});

/** One limit of the element at one flow; an element without that limit answers undefined. */
export const limitOf = ({ solution }: Case, id: LimitId, reynolds: number): Limit | undefined =>
  solution.meter.primary.limits(solution.meter.geometry, reynolds).find((limit) => limit.id === id);
