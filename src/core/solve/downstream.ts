/**
 * The temperature upstream where it was measured behind the element: a fluid that is throttled changes its temperature.
 * Standard: ISO 5167-1:2003, 5.4.4.1: T1 = T3 + μ_JT Δϖ, with the coefficient at the upstream state. Symbols: theirs; SI.
 */
import type { Primary } from '../element/contract.ts';
import type { FluidState } from '../fluid/contract.ts';
import type { Upstream } from '../input/upstream.ts';
import type { Temperature } from '../quantity/kinds.ts';
import { fail, type Outcome, ok } from '../quantity/outcome.ts';
import type { Source } from '../quantity/source.ts';
import { named, type Working } from '../quantity/working.ts';

const clause: Source = { clause: 'ISO 5167-1:2003, 5.4.4.1', seen: 'memory' };
const byEquation: Source = {
  clause: '∂T/∂p at constant enthalpy, from the equation of state of the density',
  seen: 'derived',
};

/** What a temperature upstream was found from. */
export interface Correction {
  readonly measured: Temperature; // T3, behind the element
  readonly jouleThomson: number; // μ_JT at the upstream state, K/Pa
  readonly loss: number; // Δϖ, Pa
  readonly temperature: Temperature; // T1
}

/** Why a temperature measured downstream stands for that upstream as it is. */
export interface Uncorrected {
  readonly measured: Temperature;
  /** No coefficient is known of this fluid, no loss of this element, or pressure and temperature are tied on the saturation line. */
  readonly why: 'no-coefficient' | 'no-loss' | 'on-saturation-line';
}

export type Downstream = Correction | Uncorrected;

/** What follows from one temperature upstream, whatever is asked. */
export interface Attempt<Value> {
  readonly value: Value;
  readonly state: FluidState;
  /** Permanent pressure loss at the flow in question, Pa. */
  readonly loss: number;
}

/** Steps of substitution; a gas far from its critical point takes five. */
const MOST_STEPS = 40;
/** A temperature that moves by less is settled, K: no figure of a result shows it. */
const LEAST_STEP = 1e-10;

/** What stands in the way of a correction; undefined where it can be made. */
export function uncorrected(
  { pressure, temperature }: Upstream,
  { jouleThomson, quality, temperature: settled }: FluidState,
  { lossShare }: Primary,
): Uncorrected | undefined {
  const measured = temperature ?? settled;
  if (pressure === undefined || temperature === undefined || quality !== undefined)
    return { measured, why: 'on-saturation-line' };
  if (lossShare === undefined) return { measured, why: 'no-loss' };
  return jouleThomson === undefined ? { measured, why: 'no-coefficient' } : undefined;
}

/**
 * Finds T1 = T3 + μ_JT(T1) Δϖ(T1) by substitution, for any flow of any meter.
 * @param measured T3, K
 * @param attempt the state and the loss that a temperature upstream leads to
 * @param field where a problem is shown
 * Problems: those of the attempt; temperature-unsettled, with the last bracket.
 */
export function upstreamFrom<Value>(
  measured: Temperature,
  attempt: (temperature: Temperature) => Outcome<Attempt<Value>>,
  field: string,
): Outcome<{ readonly value: Value; readonly correction: Correction }> {
  let temperature = measured;
  let before = measured;
  for (let step = 0; step < MOST_STEPS; step += 1) {
    const found = attempt(temperature);
    if (!found.ok) return found;
    const { value, state, loss } = found.value;
    const jouleThomson = coefficientOf(state);
    const next = measured + jouleThomson * loss; // ISO 5167-1:2003, 5.4.4.1
    if (Math.abs(next - temperature) < LEAST_STEP)
      return ok({ value, correction: { measured, jouleThomson, loss, temperature } });
    before = temperature;
    temperature = next as Temperature;
    if (!(next > 0)) break; // no temperature
  }
  const [lower, upper] = [Math.min(before, temperature), Math.max(before, temperature)];
  return fail('temperature-unsettled', field, { lower: Math.max(lower, 0), upper });
}

function coefficientOf({ jouleThomson, phase }: FluidState): number {
  if (jouleThomson !== undefined) return jouleThomson;
  throw new Error(`downstream: expected a Joule-Thomson coefficient of the ${phase}, got none`);
}

/** The working of a correction at the pressure upstream, Pa: the coefficient, then the temperature. */
export function correctionWorking(
  { measured, jouleThomson, loss, temperature }: Correction,
  pressure: number,
): readonly Working[] {
  const given = [
    named('p_1', pressure, 'Pa(a)', 'pressure-upstream'),
    named('T_1', temperature, 'K', 'temperature-upstream'),
  ];
  const parts = [
    named('T_3', measured, 'K', 'temperature-downstream'),
    named('μ_JT', jouleThomson, 'K/Pa', 'joule-thomson'),
    named('Δϖ', loss, 'Pa', 'permanent-loss'),
  ];
  return [
    {
      id: 'jouleThomson',
      symbol: 'μ_JT',
      given,
      value: jouleThomson,
      unit: 'K/Pa',
      source: byEquation,
      remark: 'joule-thomson',
    },
    {
      id: 'temperature',
      symbol: 'T_1',
      formula: 'T_3 + μ_JT * Δϖ',
      given: parts,
      value: temperature,
      unit: 'K',
      source: clause,
      remark: 'temperature-from-downstream',
    },
  ];
}
