/** The solution of a meter at its temperature upstream: as measured there, or found from that behind the element. */
import type { Primary } from '../element/contract.ts';
import type { FluidState } from '../fluid/contract.ts';
import type { MeterInput } from '../input/meter.ts';
import type { Upstream } from '../input/upstream.ts';
import type { Temperature } from '../quantity/kinds.ts';
import { type Outcome, ok } from '../quantity/outcome.ts';
import { type Attempt, uncorrected, upstreamFrom } from '../solve/downstream.ts';
import { knownLoss } from '../solve/equation.ts';
import { type Solution, solve } from '../solve/solve.ts';

/** What is solved: the meter, the state as written, and the state at any other. */
export interface Task {
  readonly input: MeterInput;
  readonly primary: Primary;
  readonly upstream: Upstream;
  readonly state: FluidState;
  readonly stateAt: (upstream: Upstream) => Outcome<FluidState>;
}

/**
 * The solution; with a temperature measured downstream the loss at maximum flow leads back to that upstream.
 * Problems: those of solve, of the state, and temperature-unsettled.
 */
export function settle({ input, primary, upstream, state, stateAt }: Task): Outcome<Solution> {
  if (upstream.downstream !== true) return solve(input, primary, state);
  const why = uncorrected(upstream, state, primary);
  if (why !== undefined) {
    const solved = solve(input, primary, state);
    return solved.ok ? ok({ ...solved.value, downstream: why }) : solved;
  }
  const attempt = (temperature: Temperature): Outcome<Attempt<Solution>> => {
    const there = temperature === state.temperature ? ok(state) : stateAt({ ...upstream, temperature });
    if (!there.ok) return there;
    const solved = solve(input, primary, there.value);
    return solved.ok ? ok({ value: solved.value, state: there.value, loss: lossOf(solved.value) }) : solved;
  };
  const found = upstreamFrom(state.temperature, attempt, 'upstream.temperature');
  return found.ok ? ok({ ...found.value.value, downstream: found.value.correction }) : found;
}

/** Permanent pressure loss at maximum flow, Pa. */
const lossOf = ({ meter, duty: { maximum } }: Solution): number => knownLoss(meter, maximum);
