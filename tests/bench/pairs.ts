/**
 * Ratios instead of times: both sides run in turn, in slices of some milliseconds, in one process. Each neighbouring
 * pair of slices gives a ratio; the median and the quartiles of the pairs are told. Absolute times are told for
 * orientation only, since they wander with the machine.
 */

/** Runs `count` operations with varied inputs and answers with something that depends on all of them. */
export type Work = (count: number) => number;

export interface Spread {
  readonly median: number;
  readonly lower: number; // quartile
  readonly upper: number; // quartile
}

export interface Ratio extends Spread {
  readonly pairs: number;
  /** Median time of one operation of each side, s. */
  readonly above: number;
  readonly below: number;
}

const WARM_UPS = 6;
const PAIRS = 21;
const SLICE = 0.03; // s

let consumed = 0;
/** What all results came to; printed, so that no engine can leave them out. */
export const checksum = (): number => consumed;

const timed = (work: Work, count: number): number => {
  const started = performance.now();
  consumed += work(count);
  return (performance.now() - started) / 1000 / count;
};

export function spread(values: readonly number[]): Spread {
  const sorted = [...values].sort((one, other) => one - other);
  const at = (share: number): number => {
    const place = (sorted.length - 1) * share;
    const low = sorted[Math.floor(place)] ?? Number.NaN;
    const high = sorted[Math.ceil(place)] ?? Number.NaN;
    return low + (high - low) * (place - Math.floor(place));
  };
  return { median: at(0.5), lower: at(0.25), upper: at(0.75) };
}

/** How many operations fill a slice, found while both sides warm up. */
function warmUp(work: Work): number {
  let count = 1;
  let warmed = 0;
  while (warmed < WARM_UPS) {
    const time = timed(work, count) * count;
    if (time < SLICE / 2) count *= 2;
    else warmed += 1;
  }
  return count;
}

/** Time of `above` over time of `below`. */
export function compare(above: Work, below: Work, pairs = PAIRS): Ratio {
  const counts = [warmUp(above), warmUp(below)] as const;
  const times = Array.from({ length: pairs }, () => [timed(above, counts[0]), timed(below, counts[1])] as const);
  return ratioOf(times);
}

/** The ratios of times that were taken elsewhere, pair by pair. */
export function ratioOf(times: readonly (readonly [above: number, below: number])[]): Ratio {
  return {
    ...spread(times.map(([one, other]) => one / other)),
    pairs: times.length,
    above: spread(times.map(([one]) => one)).median,
    below: spread(times.map(([, other]) => other)).median,
  };
}

/** A work that takes its inputs in turn. */
export function inTurn<Input>(inputs: readonly Input[], one: (input: Input) => number): Work {
  let cursor = 0;
  return (count) => {
    let sum = 0;
    for (let done = 0; done < count; done += 1) {
      sum += one(inputs[cursor] as Input);
      cursor = cursor + 1 < inputs.length ? cursor + 1 : 0;
    }
    return sum;
  };
}
