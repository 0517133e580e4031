/** What the vectors of worked examples ask of the solver: flow, bore and loss of an incompressible fluid. */

import type { Primary } from '../../../src/core/element/contract.ts';
import { calibrated } from '../../../src/core/element/shared/calibration.ts';
import type { FluidState } from '../../../src/core/fluid/contract.ts';
import type {
  AbsolutePressure,
  Density,
  DynamicViscosity,
  Length,
  MassFlow,
  PressureDifference,
  Temperature,
} from '../../../src/core/quantity/kinds.ts';
import type { Outcome } from '../../../src/core/quantity/outcome.ts';
import { boreFrom } from '../../../src/core/solve/bore.ts';
import { meterOf } from '../../../src/core/solve/equation.ts';
import { flowFrom } from '../../../src/core/solve/flow.ts';
import { geometryOf, lossShareOf, number, primaryOf } from './element.ts';

type Given = Readonly<Record<string, number | string>>;

/** The examples state no line pressure: far enough above the differential that nothing boils. */
const PRESSURE = 1e7 as AbsolutePressure;
/** Where an example gives C, the viscosity plays no part. */
const ANY_VISCOSITY = 1e-3;

const liquid = (given: Given): FluidState => {
  const source = { clause: 'as the example states', seen: 'read' } as const;
  return {
    pressure: PRESSURE,
    temperature: 288.15 as Temperature,
    density: number(given, 'rho') as Density,
    viscosity: ('mu' in given ? number(given, 'mu') : ANY_VISCOSITY) as DynamicViscosity,
    phase: 'liquid',
    expands: false,
    sources: { density: source, viscosity: source },
    working: [],
  };
};

const solved = <Value>(outcome: Outcome<Value>): Value => {
  if (!outcome.ok) throw new Error(`expected a solution, got ${JSON.stringify(outcome.problems)}`);
  return outcome.value;
};

const flow = (given: Given, primary: Primary): Record<string, number> => {
  const geometry = geometryOf(given);
  const meter = meterOf(primary, geometry, liquid(given));
  const { massFlow } = solved(flowFrom(number(given, 'dp') as PressureDifference, meter));
  const volume = massFlow / number(given, 'rho');
  return { q_m: massFlow, q_v: volume, V: volume / ((Math.PI / 4) * geometry.pipe ** 2) };
};

const bore = (given: Given) => {
  const rho = number(given, 'rho');
  const massFlow = ('q_m' in given ? number(given, 'q_m') : number(given, 'q_v') * rho) as MassFlow;
  const primary = primaryOf(String(given.element));
  const pipe = number(given, 'D') as Length;
  return {
    primary,
    ...solved(boreFrom(massFlow, number(given, 'dp') as PressureDifference, pipe, primary, liquid(given))),
  };
};

export const subjects: Readonly<Record<string, (given: Given) => Record<string, number>>> = {
  'flow-from-differential': (given) => flow(given, primaryOf(String(given.element))),
  'given-coefficient-flow': (given) => {
    const constant = [{ reynolds: 1, coefficient: number(given, 'C') }];
    return flow(given, calibrated(primaryOf(String(given.element)), constant));
  },
  'bore-from-flow': (given) => {
    const { geometry } = bore(given);
    return { d: geometry.bore, beta: geometry.ratio };
  },
  'loss-at-found-bore': (given) => {
    const { primary, geometry, operation } = bore(given);
    const share = lossShareOf(primary, geometry, operation.coefficient, operation.reynolds);
    return { loss: share * operation.differential };
  },
};
