/** Turns the one unknown into a meter that stands, and then asks that meter for every duty point. */

import type { DutyName } from '../document/project.ts';
import type { Primary } from '../element/contract.ts';
import type { FluidState } from '../fluid/contract.ts';
import type { FlowInput, MeterInput } from '../input/meter.ts';
import type { Length, MassFlow, PressureDifference } from '../quantity/kinds.ts';
import { fail, type Outcome, ok } from '../quantity/outcome.ts';
import { boreFrom } from './bore.ts';
import { differentialFrom } from './differential.ts';
import type { Downstream } from './downstream.ts';
import { type Meter, meterOf, type Operation } from './equation.ts';
import { flowFrom } from './flow.ts';
import { asMeasured, hotPipe, hotSection } from './metal.ts';

/** The flows of a meter; the maximum is always there, given or found. */
type Duty = Partial<Record<DutyName, Operation>> & Record<'maximum', Operation>;

export interface Solution {
  readonly meter: Meter;
  /** Absent where the element has no bore. */
  readonly boreAsMeasured?: Length;
  readonly pipeAsMeasured: Length;
  readonly duty: Readonly<Duty>;
  /** The differential of the span: what was set, or that of the maximum flow. */
  readonly span: PressureDifference;
  /** Where the temperature was measured behind the element: what was made of it. */
  readonly downstream?: Downstream;
}

/**
 * Solves the unknown of a meter and its other duty points.
 * Problems: those of flow.ts, differential.ts, bore.ts, metal.ts and of the element; bore-none, an element without one.
 */
export function solve(input: MeterInput, primary: Primary, state: FluidState): Outcome<Solution> {
  const first = solveUnknown(input, primary, state);
  if (!first.ok) return first;
  const { maximum, ...found } = first.value;
  const { meter } = found;
  const span = input.differential ?? maximum.differential;
  const duty: Duty = { maximum };
  for (const name of ['normal', 'minimum'] as const) {
    const flow = input.duty[name];
    if (flow === undefined) continue;
    const operation = operate(flow, meter, name, span);
    if (!operation.ok) return operation;
    duty[name] = operation.value;
  }
  return ok({ ...found, pipeAsMeasured: input.pipe.bore, duty, span });
}

interface First {
  readonly meter: Meter;
  readonly boreAsMeasured?: Length;
  readonly maximum: Operation;
}

function solveUnknown(input: MeterInput, primary: Primary, state: FluidState): Outcome<First> {
  if (input.find === 'bore') return findBore(input, primary, state);
  const boreAsMeasured = primary.insertion === undefined ? known(input.element.bore, 'element.bore') : undefined;
  const geometry = hotSection(primary, boreAsMeasured, input, state.temperature);
  if (!geometry.ok) return geometry;
  const meter = meterOf(primary, geometry.value, state);
  const maximum =
    input.find === 'flow'
      ? flowFrom(known(input.differential, 'differential'), meter)
      : operate(known(input.duty.maximum, 'duty.maximum'), meter, 'maximum', 0);
  if (!maximum.ok) return maximum;
  return ok({ meter, maximum: maximum.value, ...(boreAsMeasured === undefined ? {} : { boreAsMeasured }) });
}

function findBore(input: MeterInput, primary: Primary, state: FluidState): Outcome<First> {
  if (primary.insertion !== undefined) return fail('bore-none', 'find');
  const massFlow = massFlowOf(known(input.duty.maximum, 'duty.maximum'), state, 'duty.maximum');
  if (!massFlow.ok) return massFlow;
  const line = state.temperature;
  const pipe = hotPipe(input, line);
  const found = boreFrom(massFlow.value, known(input.differential, 'differential'), pipe, primary, state);
  if (!found.ok) return found;
  const { geometry, operation } = found.value;
  return ok({
    meter: meterOf(primary, geometry, state),
    boreAsMeasured: asMeasured(geometry.bore, input.element, line),
    maximum: operation,
  });
}

const operate = (flow: FlowInput, meter: Meter, name: DutyName, span: number): Outcome<Operation> => {
  const massFlow = massFlowOf(flow, meter.state, `duty.${name}`);
  return massFlow.ok ? differentialFrom(massFlow.value, meter, `duty.${name}`, span) : massFlow;
};

/** A flow as mass. Problem base-density-missing: this fluid has no base volume. */
function massFlowOf(flow: FlowInput, state: FluidState, field: string): Outcome<MassFlow> {
  if (flow.basis === 'mass') return ok(flow.value);
  if (flow.basis === 'volume') return ok((flow.value * state.density) as MassFlow);
  if (state.baseDensity === undefined) return fail('base-density-missing', field, {});
  return ok((flow.value * state.baseDensity) as MassFlow);
}

/** What input has already required; its absence here is our error. */
function known<Value>(value: Value | undefined, field: string): Value {
  if (value === undefined) throw new Error(`solve: expected ${field}, got nothing`);
  return value;
}
