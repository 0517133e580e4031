/** What the vectors of pitot tubes read as a meter ask of the core: the flow of a differential, and back. */
import { averagingPitot } from '../../../src/core/element/averaging-pitot.ts';
import type { FluidState } from '../../../src/core/fluid/contract.ts';
import type {
  AbsolutePressure,
  Density,
  DynamicViscosity,
  Length,
  PressureDifference,
  Temperature,
} from '../../../src/core/quantity/kinds.ts';
import type { Outcome } from '../../../src/core/quantity/outcome.ts';
import { differentialFrom } from '../../../src/core/solve/differential.ts';
import { meterOf } from '../../../src/core/solve/equation.ts';
import { flowFrom } from '../../../src/core/solve/flow.ts';
import { number } from './element.ts';

type Given = Readonly<Record<string, number | string>>;

const optional = (given: Given, name: string, otherwise: number): number =>
  name in given ? number(given, name) : otherwise;

/** A fluid of stated properties; without an isentropic exponent it is a liquid far above its differential. */
function stateOf(given: Given): FluidState {
  const source = { clause: 'as the case states', seen: 'read' } as const;
  const expands = 'kappa' in given;
  return {
    pressure: optional(given, 'p1', 1e7) as AbsolutePressure,
    temperature: 288.15 as Temperature,
    density: number(given, 'rho') as Density,
    viscosity: optional(given, 'mu', 1e-3) as DynamicViscosity,
    ...(expands ? { isentropicExponent: number(given, 'kappa') } : {}),
    phase: expands ? 'gas' : 'liquid',
    expands,
    sources: { density: source, viscosity: source },
    working: [],
  };
}

const solved = <Value>(outcome: Outcome<Value>): Value => {
  if (!outcome.ok) throw new Error(`expected a solution, got ${JSON.stringify(outcome.problems)}`);
  return outcome.value;
};

/** A bar of width w, or of the whole pipe; a column of another liquid stands for the differential where the case has one. */
function averaging(given: Given): Record<string, number> {
  const primary = averagingPitot.primary({
    coefficient: number(given, 'K') * optional(given, 'meanOverCentre', 1),
    ...('w' in given ? { width: number(given, 'w'), area: 'clear' } : {}),
    ...('a' in given ? { expansion: number(given, 'a') } : {}),
  });
  const section = primary.insertion?.section(number(given, 'D') as Length);
  if (section === undefined) throw new Error('expected a bar across the pipe, got an element with a bore');
  const meter = meterOf(primary, solved(section), stateOf(given));
  const column = (): number =>
    (number(given, 'rhoGauge') - number(given, 'rho')) * number(given, 'g') * number(given, 'h');
  const differential = 'dp' in given ? number(given, 'dp') : column();
  const { massFlow, reynolds, epsilon } = solved(flowFrom(differential as PressureDifference, meter));
  const back = solved(differentialFrom(massFlow, meter, 'duty.maximum'));
  return {
    q_m: massFlow,
    q_v: massFlow / number(given, 'rho'),
    Re: reynolds,
    epsilon,
    dp: back.differential,
  };
}

export const subjects: Readonly<Record<string, (given: Given) => Record<string, number>>> = {
  'averaging-pitot': averaging,
};
