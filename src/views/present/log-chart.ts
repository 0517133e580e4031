/** Mass flow over time in display units, with the marks of its axis of time. */

import { fromSI } from '../../core/quantity/units.ts';
import { chartSummaryText } from '../words/logs.ts';
import type { LogContext } from './log-context.ts';
import type { LogChart } from './log-model.ts';

const MARKS = 6; // at most
/** s between two marks: of a clock, then whole days. */
const STEPS = [1, 5, 15, 30, 60, 300, 900, 1800, 3600, 10_800, 21_600, 43_200, 86_400] as const;
const DAY = 86_400; // s

export function logChart({ record, units, value, stamp }: LogContext): LogChart {
  const { chart, extremes, zone } = record;
  const points = chart.flatMap(({ time_s, massFlow_kg_s, afterGap }, at) => {
    const point = { time: time_s, flow: fromSI(massFlow_kg_s, units.massFlow) };
    return afterGap && at > 0 ? [{ time: time_s }, point] : [point]; // nothing lies before the first
  });
  const [least, most] = [extremes?.massFlow_kg_s.least ?? 0, extremes?.massFlow_kg_s.most ?? 0];
  return {
    points,
    ticks: marksOf(chart[0]?.time_s ?? 0, chart.at(-1)?.time_s ?? 0, stamp),
    unit: units.massFlow.print,
    most: fromSI(most, units.massFlow),
    summary: chartSummaryText(value(least, 'massFlow').text, value(most, 'massFlow').text),
    zone,
  };
}

/** Marks at whole steps of the clock of the log; days carry their date, moments their clock. */
function marksOf(from: number, to: number, stamp: (seconds: number) => string): LogChart['ticks'] {
  const span = to - from;
  if (!(span > 0)) return [{ time: from, label: stamp(from) }];
  const step = STEPS.find((one) => span / one <= MARKS) ?? DAY * Math.ceil(span / DAY / MARKS);
  const first = from - (clockOf(stamp(from)) % Math.min(step, DAY));
  const marks = Array.from({ length: MARKS + 2 }, (_, at) => first + at * step);
  const shown = marks.filter((time) => time >= from && time <= to);
  return shown.map((time) => ({ time, label: markText(stamp(time), step) }));
}

/** s since midnight that a stamp shows. */
function clockOf(stamp: string): number {
  const [hours = 0, minutes = 0, seconds = 0] = stamp.slice(11).split(':').map(Number);
  return 3600 * hours + 60 * minutes + seconds;
}

function markText(stamp: string, step: number): string {
  const [date, clock] = [stamp.slice(0, 10), stamp.slice(11)];
  if (step >= DAY || clock === '00:00:00') return date;
  return step < 60 ? clock : clock.slice(0, 5);
}
