/** The points of a chart: few, in order, and with every extreme of the log. */
import { describe, expect, test } from 'vitest';
import { addPoint, chartPoints, openDecimation } from '../../../src/core/log/decimate.ts';
import { generator } from '../../laws/random.ts';

const chartOf = (flows: readonly (readonly [time: number, flow: number])[], maxGap = Number.POSITIVE_INFINITY) => {
  const chart = openDecimation();
  let before = flows[0]?.[0] ?? 0;
  for (const [time, flow] of flows) {
    addPoint(chart, time, flow, time - before > maxGap);
    before = time;
  }
  return chartPoints(chart);
};

test('few rows stand as they are', () => {
  const flows = [0, 1, 2, 3].map((time) => [time, time * time] as const);
  expect(chartOf(flows)).toEqual(flows.map(([time_s, massFlow_kg_s]) => ({ time_s, massFlow_kg_s })));
});

describe.each([10_000, 123_457, 1_000_000])('%d rows', (count) => {
  const random = generator(7);
  const flows = Array.from({ length: count }, (_, at) => [1e9 + at, random()] as const);
  const [low, high] = [Math.floor(count * 0.37), Math.floor(count * 0.71)];
  flows[low] = [1e9 + low, -1];
  flows[high] = [1e9 + high, 2];
  const points = chartOf(flows);

  test('make at most two thousand points, and no fewer than five hundred', () => {
    expect(points.length).toBeLessThanOrEqual(2000);
    expect(points.length).toBeGreaterThan(500);
  });

  test('keep the smallest and the largest flow at their times', () => {
    expect(points).toContainEqual({ time_s: 1e9 + low, massFlow_kg_s: -1 });
    expect(points).toContainEqual({ time_s: 1e9 + high, massFlow_kg_s: 2 });
  });

  test('are rows of the log, in order of time', () => {
    for (const { time_s, massFlow_kg_s } of points) expect(flows[time_s - 1e9]?.[1]).toBe(massFlow_kg_s);
    expect(points.every(({ time_s }, at) => at === 0 || time_s > (points[at - 1]?.time_s ?? 0))).toBe(true);
  });
});

test('a gap is marked on the point after it, also when stretches have doubled', () => {
  const flows = Array.from({ length: 50_000 }, (_, at) => [at < 20_000 ? at : at + 30_000, 1 + (at % 3)] as const);
  const marked = chartOf(flows, 10).filter(({ afterGap }) => afterGap);
  expect(marked).toEqual([{ time_s: 50_000, massFlow_kg_s: expect.any(Number), afterGap: true }]);
});

test('stamps far apart need no more room', () => {
  const flows = Array.from({ length: 5000 }, (_, at) => [at ** 4, at] as const);
  const points = chartOf(flows);
  expect(points.length).toBeLessThanOrEqual(2000);
  expect(points.at(-1)).toMatchObject({ massFlow_kg_s: 4999 });
});
