/** Whether a figure stands out from those before it: farther from their median than so many median absolute deviations. */

const WINDOW = 31; // figures; odd, so that the median is one of them

export interface Spikes {
  readonly most: number;
  readonly recent: Float64Array;
  readonly sorted: Float64Array;
  seen: number;
}

export const openSpikes = (most: number): Spikes => ({
  most,
  recent: new Float64Array(WINDOW),
  sorted: new Float64Array(WINDOW),
  seen: 0,
});

/** Judges the next figure, and takes it among those that the next ones are judged by. Figures that do not scatter at all judge nothing. */
export function isSpike(spikes: Spikes, figure: number): boolean {
  const { most, recent, sorted } = spikes;
  const known = spikes.seen >= WINDOW;
  if (known) sorted.set(recent);
  recent[spikes.seen % WINDOW] = figure;
  spikes.seen += 1;
  if (!known) return false;
  const middle = medianOf(sorted);
  for (let at = 0; at < WINDOW; at += 1) sorted[at] = Math.abs((sorted[at] as number) - middle);
  const deviation = medianOf(sorted);
  return deviation > 0 && Math.abs(figure - middle) > most * deviation;
}

const medianOf = (figures: Float64Array): number => figures.sort()[(WINDOW - 1) / 2] as number;
