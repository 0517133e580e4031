/** One solve in each direction: against the textbook's substitution, its evaluations, and its error against 40 digits. */
import type { Length } from '../../src/core/quantity/kinds.ts';
import type { Outcome } from '../../src/core/quantity/outcome.ts';
import { boreFrom } from '../../src/core/solve/bore.ts';
import { differentialFrom } from '../../src/core/solve/differential.ts';
import { meterOf } from '../../src/core/solve/equation.ts';
import { flowFrom } from '../../src/core/solve/flow.ts';
import { decimal, distance, type Exact, residual } from '../laws/model.ts';
import { generator, type RandomMeter, randomMeter } from '../laws/random.ts';
import { compare, inTurn, spread } from './pairs.ts';
import { type Line, ratioLine } from './report.ts';
import * as textbook from './yardsticks.ts';

const METERS = 60_000;
/** Meters that stand and are asked for many flows each, as readings and curves do: together as many inputs. */
const STANDING = 100;
const REFEREED = 400;
const SEED = 7;

interface Case {
  readonly meter: RandomMeter;
  readonly plate: textbook.Plate;
  readonly massFlow: number;
}

const solved = <Value>(outcome: Outcome<Value>): Value => {
  if (!outcome.ok) throw new Error(`expected a solution, got ${JSON.stringify(outcome.problems)}`);
  return outcome.value;
};

const distances: Readonly<Record<string, (D: number) => readonly [number, number]>> = {
  'orifice-plate.corner': () => [0, 0],
  'orifice-plate.flange': (D) => [0.0254 / D, 0.0254 / D],
  'orifice-plate.D-D/2': () => [1, 0.47],
};

function plateOf({ primary, geometry, state }: RandomMeter): textbook.Plate {
  const [L1, L2] = distances[primary.name]?.(geometry.pipe) ?? [0, 0];
  const { pipe: D, bore: d } = geometry;
  return {
    ...{ D, d, L1, L2 },
    ...{ p1: state.pressure, rho: state.density, mu: state.viscosity, kappa: state.isentropicExponent ?? 0 },
  };
}

/** Orifice plates of all tappings, liquids and gases, over the whole range of the standard. */
export function orificeCases(count = METERS): Case[] {
  const random = generator(SEED);
  const cases: Case[] = [];
  while (cases.length < count) {
    const meter = randomMeter(random);
    if (meter.primary.kind !== 'orifice-plate') continue;
    const { massFlow } = solved(flowFrom(meter.differential, meter));
    cases.push({ meter, plate: plateOf(meter), massFlow });
  }
  return cases;
}

const own = {
  flow: ({ meter }: Case) => solved(flowFrom(meter.differential, meter)),
  differential: ({ meter, massFlow }: Case) => solved(differentialFrom(massFlow as never, meter, 'duty.maximum')),
  bore: ({ meter: { geometry, differential, primary, state }, massFlow }: Case) =>
    solved(boreFrom(massFlow as never, differential, geometry.pipe as Length, primary, state)),
};

const theirs = {
  flow: ({ plate, meter }: Case) => textbook.flow(plate, meter.differential),
  differential: ({ plate, massFlow }: Case) => textbook.differential(plate, massFlow),
  bore: ({ plate, meter, massFlow }: Case) => textbook.ratio(plate, massFlow, meter.differential),
};

export const ownFlow = (cases: readonly Case[]) => inTurn(cases, (one) => own.flow(one).massFlow);

/** The same meters asked for many flows each, from a quarter of their differential up. */
const manyFlows = (cases: readonly Case[]) =>
  cases.slice(0, STANDING).flatMap(({ meter, plate }) =>
    Array.from({ length: METERS / STANDING }, (_, at) => {
      const share = 0.25 + (0.75 * at * STANDING) / METERS;
      return { meter, plate, differential: (share * meter.differential) as typeof meter.differential };
    }),
  );

/** A flow of a meter that is prepared for it alone. */
const preparedFlow = ({ meter: { primary, geometry, state, differential } }: Case): number =>
  solved(flowFrom(differential, meterOf(primary, geometry, state))).massFlow;

function timings(cases: readonly Case[]): Line[] {
  const many = manyFlows(cases);
  const gases = cases.filter(({ meter }) => meter.state.expands);
  const flow = compare(
    inTurn(many, ({ plate, differential: dp }) => textbook.flow(plate, dp)),
    inTurn(many, ({ meter, differential: dp }) => solved(flowFrom(dp, meter)).massFlow),
  );
  const first = compare(inTurn(cases, theirs.flow), inTurn(cases, preparedFlow));
  const differential = compare(
    inTurn(gases, theirs.differential),
    inTurn(gases, (one) => own.differential(one).differential),
  );
  const bore = compare(
    inTurn(cases, theirs.bore),
    inTurn(cases, (one) => own.bore(one).geometry.ratio),
  );
  return [
    ratioLine('flow, many of each meter: textbook substitution / own', flow, '>= 2.5'),
    ratioLine('flow, one of each meter: textbook substitution / own with the preparation', first),
    ratioLine('differential of a gas: textbook substitution / own', differential),
    ratioLine('bore: textbook substitution / own', bore),
  ];
}

/** The textbook must find what we find, or its time means nothing. */
function agreement(cases: readonly Case[]): Line {
  const worst = cases.slice(0, REFEREED).map((one) => {
    const { ratio } = one.meter.geometry;
    const off = (value: number, by: number) => Math.abs(value / by - 1);
    return Math.max(
      off(theirs.flow(one), one.massFlow),
      off(theirs.differential(one), one.meter.differential),
      off(theirs.bore(one), ratio),
    );
  });
  return { name: 'largest distance of the textbook from own, relative', value: Math.max(...worst) };
}

function evaluations(cases: readonly Case[]): Line[] {
  const counted = (name: string, counts: readonly number[], most: number): Line[] => [
    { name: `${name}: evaluations, typical`, value: spread(counts).median },
    { name: `${name}: evaluations, most`, value: counts.reduce((a, b) => Math.max(a, b), 0), target: `<= ${most}` },
  ];
  const textbookCounts = cases.map((one) => {
    textbook.count.evaluations = 0;
    theirs.flow(one);
    return textbook.count.evaluations;
  });
  return [
    ...counted(
      'flow',
      cases.map((one) => own.flow(one).evaluations),
      4,
    ),
    ...counted(
      'differential',
      cases.map((one) => own.differential(one).evaluations),
      4,
    ),
    ...counted(
      'bore',
      cases.map((one) => own.bore(one).operation.evaluations),
      5,
    ),
    { name: 'flow by the textbook: evaluations, typical', value: spread(textbookCounts).median },
  ];
}

const exact = ({ primary, geometry, state }: RandomMeter): Exact => ({
  element: primary.name,
  pipe: decimal(geometry.pipe),
  density: decimal(state.density),
  viscosity: decimal(state.viscosity),
  pressure: decimal(state.pressure),
  ...(state.isentropicExponent === undefined ? {} : { exponent: decimal(state.isentropicExponent) }),
});

function errors(cases: readonly Case[]): Line[] {
  const refereed = cases.slice(0, REFEREED);
  const largest = (error: (one: Case, is: Exact) => number): number =>
    refereed.reduce((most, one) => Math.max(most, error(one, exact(one.meter))), 0);
  const ratioOf = ({ meter }: Case) => decimal(meter.geometry.bore).div(decimal(meter.geometry.pipe));
  const flow = largest((one, is) =>
    distance(own.flow(one).massFlow, (q) => residual(is, ratioOf(one), q, decimal(one.meter.differential))),
  );
  const differential = largest((one, is) =>
    distance(own.differential(one).differential, (dp) => residual(is, ratioOf(one), decimal(one.massFlow), dp)),
  );
  const bore = largest((one, is) =>
    distance(own.bore(one).geometry.ratio, (b) =>
      residual(is, b, decimal(one.massFlow), decimal(one.meter.differential)),
    ),
  );
  const roundTrip = largest((one) => Math.abs(own.differential(one).differential / one.meter.differential - 1));
  return [
    { name: 'flow: largest error against 40 digits', value: flow, target: '<= 1e-13' },
    { name: 'differential: largest error against 40 digits', value: differential, target: '<= 1e-13' },
    { name: 'bore: largest error against 40 digits', value: bore, target: '<= 1e-13' },
    { name: 'differential -> flow -> differential', value: roundTrip, target: '<= 1e-12' },
  ];
}

export function solving(cases: readonly Case[]): Line[] {
  return [...timings(cases), ...evaluations(cases), ...errors(cases), agreement(cases)];
}
