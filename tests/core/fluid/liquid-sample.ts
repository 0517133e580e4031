/** Liquids of the document, read at a state, for the tests of this folder. */
import type { FluidText } from '../../../src/core/document/project.ts';
import type { FluidState } from '../../../src/core/fluid/contract.ts';
import { stateOf } from '../../../src/core/fluid/state.ts';
import { as } from '../../../src/core/quantity/brand.ts';
import type { Outcome } from '../../../src/core/quantity/outcome.ts';

export const atmosphere = as<'absolute pressure'>(101325);
const base = { pressure: atmosphere, temperature: as<'temperature'>(288.15) };

/** The state at p in Pa absolute and t in degC; what is undefined is not given. */
export function at(fluid: unknown, p: number | undefined, t: number | undefined): Outcome<FluidState> {
  const upstream = {
    ...(p === undefined ? {} : { pressure: as<'absolute pressure'>(p) }),
    ...(t === undefined ? {} : { temperature: as<'temperature'>(t + 273.15) }),
  };
  return stateOf(fluid as FluidText, upstream, base, atmosphere);
}

export function solved(fluid: unknown, p?: number, t?: number): FluidState {
  const state = at(fluid, p, t);
  if (!state.ok) throw new Error(`expected a state, got ${JSON.stringify(state.problems)}`);
  return state.value;
}

/** Codes and fields of a refusal; none where there is a state. */
export function problems(fluid: unknown, p?: number, t?: number): readonly string[] {
  const state = at(fluid, p, t);
  return state.ok ? [] : state.problems.map(({ code, field }) => `${code} ${field}`);
}

export const liquid = (name: string, more: object = {}) => ({ kind: 'liquid', name, ...more });
export const cautions = (state: FluidState): readonly string[] => (state.cautions ?? []).map(({ id }) => id);
