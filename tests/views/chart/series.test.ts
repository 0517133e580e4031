import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { axisText, extremes, plotRows, ticksTo } from '../../../src/views/chart/series.ts';
import { chart } from './chart.ts';

describe('rows of the plot', () => {
  const rows = plotRows(chart.points);

  it('draw a full line only inside the limits', () => {
    rows.forEach((row, index) => {
      expect('inside' in row).toBe(chart.points[index]?.inside);
    });
  });

  it('let the dashed line start at the last point inside, so that the two meet', () => {
    const both = rows.filter((row) => row.inside !== undefined && row.outside !== undefined);
    expect(both.map((row) => row.differential)).toEqual([10, 200]);
    for (const row of both) expect(row.inside).toBe(row.outside);
  });

  it('leave no point without a line and keep the band about the curve', () => {
    for (const row of rows) {
      const flow = row.inside ?? row.outside ?? Number.NaN;
      expect(row.band[0]).toBeLessThan(flow);
      expect(row.band[1]).toBeGreaterThan(flow);
    }
  });
});

describe('axes', () => {
  it('reach the largest value with round steps', () => {
    expect(ticksTo(62, 4)).toEqual([0, 20, 40, 60, 80]);
    expect(ticksTo(250, 6)).toEqual([0, 50, 100, 150, 200, 250]);
    expect(ticksTo(0.3, 4).map(axisText)).toEqual(['0', '0.1', '0.2', '0.3']);
    expect(ticksTo(0, 4)).toEqual([0, 1]);
  });

  it('group five digits and more in threes', () => {
    expect([0, 2.5, 9500, 15000, 150000, 1200000].map(axisText)).toEqual([
      '0',
      '2.5',
      '9500',
      '15\u202f000',
      '150\u202f000',
      '1\u202f200\u202f000',
    ]);
  });

  it('hold every value, with few ticks, for any range', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-6, max: 1e9, noNaN: true }), fc.integer({ min: 3, max: 8 }), (most, count) => {
        const ticks = ticksTo(most, count);
        expect(ticks.at(-1)).toBeGreaterThanOrEqual(most * (1 - 1e-8));
        expect(ticks.length).toBeLessThanOrEqual(count + 2);
        expect(ticks.length).toBeGreaterThanOrEqual(2);
      }),
    );
  });

  it('take the duty points and the upper edge of the band into account', () => {
    expect(extremes(chart)).toEqual({ differential: 275, flow: chart.points.at(-1)?.high });
    expect(extremes({ ...chart, points: [] })).toEqual({ differential: 250, flow: 60 });
  });
});
