/** What the chart draws: the curve split into what stands inside the Reynolds limits and what does not, axes, labels. */
import type { Chart, ChartPoint } from '../present/model.ts';
import { spelled } from '../present/numbers.ts';

/** One row for the plot; a series without a value at a point is absent there. */
export interface PlotRow {
  readonly differential: number;
  readonly band: readonly [number, number];
  readonly inside?: number;
  readonly outside?: number;
}

/** Rows of the plot. The last point inside belongs to both lines: they meet, and no full line runs outside. */
export function plotRows(points: readonly ChartPoint[]): readonly PlotRow[] {
  const isOutside = (index: number): boolean => points[index]?.inside === false;
  return points.map((point, index) => ({
    differential: point.differential,
    band: [point.low, point.high],
    ...(point.inside ? { inside: point.flow } : {}),
    ...(!point.inside || isOutside(index - 1) || isOutside(index + 1) ? { outside: point.flow } : {}),
  }));
}

const firstStep = (span: number, count: number): number => {
  const raw = span / count;
  const power = 10 ** Math.floor(Math.log10(raw));
  const step = [1, 2, 2.5, 5, 10].find((one) => one * power >= raw) ?? 10;
  return step * power;
};

/** Round ticks from 0 up to the first at or above the largest value. */
export function ticksTo(most: number, count: number): readonly number[] {
  if (!(most > 0)) return [0, 1];
  const step = firstStep(most, count);
  const last = Math.ceil(most / step - 1e-9);
  return Array.from({ length: last + 1 }, (_, index) => index * step);
}

/** Largest value on each axis, duty points and band included. */
export function extremes(chart: Chart): { readonly differential: number; readonly flow: number } {
  const flows = [...chart.points.map((point) => point.high), ...chart.duty.map((duty) => duty.flow)];
  const differentials = [...chart.points, ...chart.duty].map((point) => point.differential);
  return { differential: Math.max(0, ...differentials), flow: Math.max(0, ...flows) };
}

/** A figure of an axis, the rounding of its step left out. */
export const axisText = (value: number): string => spelled(value, { significant: 6, trim: true, plainTo: 1e9 }, true);

/** A value with as many digits as a table of readings needs. */
export const plain = (value: number): string => spelled(value, { significant: 4, trim: true }, false);
