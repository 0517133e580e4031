/**
 * The points of a chart of a log of any length: the smallest and the largest flow of each stretch of time, at their own
 * times, so that no peak is lost. Stretches double in length when they have become too many.
 */
import type { ChartPoint } from '../result/log-record.ts';

/** Two points of each stretch at most: 2,000. */
const MOST_STRETCHES = 1000;
const FIRST_WIDTH = 2 ** -10; // s; a power of two, so that every later border is one of the earlier ones
const FIELDS = 4; // of a stretch: time and flow of its smallest, then of its largest

export interface Decimation {
  /** By place: number of the stretch, counted from the first time. */
  readonly numbers: Float64Array;
  readonly stretches: Float64Array;
  /** By place: 1 where a gap lies before the stretch. */
  readonly gaps: Uint8Array;
  used: number;
  width: number; // s
  start: number; // s
}

export const openDecimation = (): Decimation => ({
  numbers: new Float64Array(MOST_STRETCHES),
  stretches: new Float64Array(FIELDS * MOST_STRETCHES),
  gaps: new Uint8Array(MOST_STRETCHES),
  used: 0,
  width: FIRST_WIDTH,
  start: 0,
});

/** Takes the next flow, no earlier than the one before; `gap` where a gap lies between them. */
export function addPoint(chart: Decimation, time: number, flow: number, gap: boolean): void {
  const { stretches } = chart;
  if (chart.used === 0) chart.start = time;
  let number = Math.floor((time - chart.start) / chart.width);
  const last = FIELDS * (chart.used - 1);
  if (chart.used > 0 && number === chart.numbers[chart.used - 1]) {
    if (flow < (stretches[last + 1] as number)) setExtreme(stretches, last, time, flow);
    if (flow > (stretches[last + 3] as number)) setExtreme(stretches, last + 2, time, flow);
    return;
  }
  while (chart.used === MOST_STRETCHES) {
    widen(chart);
    number = Math.floor((time - chart.start) / chart.width);
    if (number === chart.numbers[chart.used - 1]) {
      addPoint(chart, time, flow, gap);
      return;
    }
  }
  chart.numbers[chart.used] = number;
  chart.gaps[chart.used] = gap ? 1 : 0;
  setExtreme(stretches, FIELDS * chart.used, time, flow);
  setExtreme(stretches, FIELDS * chart.used + 2, time, flow);
  chart.used += 1;
}

function setExtreme(stretches: Float64Array, at: number, time: number, flow: number): void {
  stretches[at] = time;
  stretches[at + 1] = flow;
}

/** Doubles the length of the stretches: neighbours that fall together keep the smaller and the larger of both. */
function widen(chart: Decimation): void {
  const { numbers, stretches, gaps, used } = chart;
  let kept = -1;
  for (let place = 0; place < used; place += 1) {
    const number = Math.floor((numbers[place] as number) / 2);
    const from = FIELDS * place;
    if (kept >= 0 && numbers[kept] === number) {
      const to = FIELDS * kept;
      if ((stretches[from + 1] as number) < (stretches[to + 1] as number)) stretches.copyWithin(to, from, from + 2);
      if ((stretches[from + 3] as number) > (stretches[to + 3] as number))
        stretches.copyWithin(to + 2, from + 2, from + 4);
      continue;
    }
    kept += 1;
    numbers[kept] = number;
    gaps[kept] = gaps[place] as number;
    stretches.copyWithin(FIELDS * kept, from, from + FIELDS);
  }
  chart.used = kept + 1;
  chart.width *= 2;
}

/** The points in the order of time; a stretch with one flow has one point. */
export function chartPoints({ stretches, gaps, used }: Decimation): readonly ChartPoint[] {
  return Array.from({ length: used }, (_, place) => {
    const [lowTime = 0, low = 0, highTime = 0, high = 0] = stretches.subarray(FIELDS * place, FIELDS * (place + 1));
    const smallest = { time_s: lowTime, massFlow_kg_s: low };
    const largest = { time_s: highTime, massFlow_kg_s: high };
    const [first, second] = lowTime <= highTime ? [smallest, largest] : [largest, smallest];
    const marked = gaps[place] === 1 ? { ...first, afterGap: true as const } : first;
    return lowTime === highTime ? [marked] : [marked, second];
  }).flat();
}
