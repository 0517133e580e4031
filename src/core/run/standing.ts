/** A meter that stands, sized or given, and its flow at any moment: what readings and logs are put to. */
import type { MeterText, Project } from '../document/project.ts';
import type { Primary } from '../element/contract.ts';
import { elementOf } from '../element/registry.ts';
import { settled } from '../element/settle.ts';
import { materialKeys } from '../element/shared/growth.ts';
import type { FluidState } from '../fluid/contract.ts';
import { stateOf } from '../fluid/state.ts';
import { type MeterInput, readMeter } from '../input/meter.ts';
import { meterShape } from '../input/shape.ts';
import { readSite, type Site } from '../input/site.ts';
import { readUpstream, type Upstream } from '../input/upstream.ts';
import type { AbsolutePressure, PressureDifference, Temperature } from '../quantity/kinds.ts';
import { gather, type Outcome, ok } from '../quantity/outcome.ts';
import { tagOf } from '../result/refuse.ts';
import { type Attempt, type Correction, uncorrected, upstreamFrom } from '../solve/downstream.ts';
import { knownLoss, type Meter, meterOf, type Operation } from '../solve/equation.ts';
import { flowFrom } from '../solve/flow.ts';
import { hotSection } from '../solve/metal.ts';
import type { Solution } from '../solve/solve.ts';
import { settle } from './settle.ts';

export type Surroundings = Pick<Project, 'site' | 'base'>;

/** A solved meter with all that went into it. */
export interface Standing {
  readonly tag: string;
  readonly written: MeterText;
  readonly site: Site;
  readonly input: MeterInput;
  readonly primary: Primary;
  /** The state as written: what a moment without its own is at. */
  readonly upstream: Upstream;
  /** Meter, bore as measured, duty points and span at that state. */
  readonly solution: Solution;
}

/** What was measured beside a differential; what is absent is as the meter has it. */
export interface Moment {
  readonly pressure?: AbsolutePressure;
  readonly temperature?: Temperature;
}

/** One flow through the meter as it is at a moment. */
export interface MomentFlow {
  readonly meter: Meter;
  readonly operation: Operation;
  /** Where the temperature was measured behind the element and leads back to one upstream. */
  readonly correction?: Correction;
}

/** Solves a meter as far as its unknown and its duty points; its place in the list names it where it has no tag. */
export function standing(meter: MeterText, index: number, project: Surroundings): Outcome<Standing> {
  const site = readSite(project); // 1 the site and the base state
  const shape = meterShape(meter); // 2 is this a meter at all
  if (!site.ok || !shape.ok) return gather(site, shape);
  const written = shape.value;
  const element = elementOf(written.element?.kind); // 3 the element, and which fields are its own
  const input = readMeter(written, element.ok ? element.value : { fields: [] }, materialKeys); // 4 texts to quantities
  const upstream = readUpstream(written, site.value);
  const stateAt = (at: Upstream) => stateOn(written, site.value, at);
  const state = upstream.ok ? stateAt(upstream.value) : upstream; // 5 the fluid
  if (!element.ok || !input.ok || !upstream.ok || !state.ok) return gather(element, input, state);
  const { own, calibration } = input.value.element;
  const primary = settled(element.value, own, calibration); // 6 the element with its fields settled
  const solution = settle({ input: input.value, primary, upstream: upstream.value, state: state.value, stateAt }); // 7 the unknown, then every duty point
  if (!solution.ok) return solution;
  const parts = { site: site.value, input: input.value, primary, upstream: upstream.value, solution: solution.value };
  return ok({ tag: tagOf(written, index), written, ...parts });
}

/**
 * The meter at the state of a moment, its metal at that temperature; a temperature measured downstream stands as it is.
 * Problems: those of stateOf under `field`, where the moment is written; bore-not-below-pipe.
 */
export function meterAt(stands: Standing, moment: Moment, field = 'upstream'): Outcome<Meter> {
  const { written, site, upstream, solution } = stands;
  if (moment.pressure === undefined && moment.temperature === undefined) return ok(solution.meter);
  const state = stateOn(written, site, { ...upstream, ...moment }, field);
  return state.ok ? meterWith(stands, state.value) : state;
}

/**
 * The flow that a differential in Pa above zero makes at a moment. A temperature measured behind the element leads to
 * that upstream by the loss of this very flow. Problems: those of meterAt, flowFrom, upstreamFrom.
 */
export function flowAt(
  stands: Standing,
  moment: Moment,
  differential: PressureDifference,
  field = 'upstream',
): Outcome<MomentFlow> {
  const { written, site } = stands;
  const upstream = { ...stands.upstream, ...moment };
  if (upstream.downstream !== true) return flowOf(meterAt(stands, moment, field), differential);
  const first = stateOn(written, site, upstream, field);
  if (!first.ok) return first;
  const measured = upstream.temperature;
  if (measured === undefined || uncorrected(upstream, first.value, stands.primary) !== undefined)
    return flowOf(meterWith(stands, first.value), differential);
  const found = upstreamFrom(
    measured,
    (temperature) => {
      const state = temperature === measured ? first : stateOn(written, site, { ...upstream, temperature }, field);
      return state.ok ? attemptAt(stands, state.value, differential) : state;
    },
    `${field}.temperature`,
  );
  return found.ok ? ok({ ...found.value.value, correction: found.value.correction }) : found;
}

function attemptAt(
  stands: Standing,
  state: FluidState,
  differential: PressureDifference,
): Outcome<Attempt<MomentFlow>> {
  const flow = flowOf(meterWith(stands, state), differential);
  if (!flow.ok) return flow;
  const { meter, operation } = flow.value;
  return ok({ value: flow.value, state, loss: knownLoss(meter, operation) });
}

function flowOf(meter: Outcome<Meter>, differential: PressureDifference): Outcome<MomentFlow> {
  if (!meter.ok) return meter;
  const operation = flowFrom(differential, meter.value);
  return operation.ok ? ok({ meter: meter.value, operation: operation.value }) : operation;
}

function meterWith({ input, primary, solution }: Standing, state: FluidState): Outcome<Meter> {
  const geometry = hotSection(primary, solution.boreAsMeasured, input, state.temperature);
  return geometry.ok ? ok(meterOf(primary, geometry.value, state)) : geometry;
}

const stateOn = ({ fluid }: MeterText, { base, atmosphere }: Site, at: Upstream, field = 'upstream') =>
  stateOf(fluid ?? {}, at, base, atmosphere, 'fluid', field);
