/** Totals of small logs that can be added up by hand. */
import { describe, expect, test } from 'vitest';
import { ACCOUNT } from '../../../src/core/log/account.ts';
import { type Batch, drop, openBatch } from '../../../src/core/log/batch.ts';
import { daysOfZone } from '../../../src/core/log/days.ts';
import { periodRecord } from '../../../src/core/log/summary.ts';
import {
  closeTotals,
  openTotals,
  type Rule,
  substitutesOf,
  type Totals,
  takeRows,
  wholeOf,
} from '../../../src/core/log/totals.ts';
import { zoneOf } from '../../../src/core/log/zone.ts';

type Row = readonly [time: number, flow: number, account?: number, differential?: number];

const batchOf = (rows: readonly Row[]): Batch => {
  const batch = openBatch(rows.length);
  for (const [at, [time, flow, account = ACCOUNT.converted, differential = flow ** 2]] of rows.entries()) {
    batch.row[at] = at + 1;
    batch.time[at] = time;
    batch.flow[at] = flow;
    batch.density[at] = 2;
    batch.differential[at] = differential;
    batch.pressure[at] = 1e5 + at;
    batch.temperature[at] = 300;
    batch.account[at] = account;
  }
  batch.size = rows.length;
  return batch;
};

const zone = (name: string) => {
  const found = zoneOf(name);
  if (found === undefined) throw new Error(`expected a zone, got ${name}`);
  return found;
};

const totalsOf = (rows: readonly Row[], rule: Partial<Rule> = {}, pieces = rows.length): Totals => {
  const totals = openTotals({ held: false, maxGap: 10, dayOf: daysOfZone(zone('UTC')), ...rule });
  const batch = batchOf(rows);
  while (batch.size > 0) {
    const taken = Math.min(pieces, batch.size);
    takeRows(totals, batch, taken);
    drop(batch, taken);
  }
  closeTotals(totals);
  return totals;
};

const recordOf = (totals: Totals) => periodRecord(wholeOf(totals), undefined);

const { fault, belowCutOff, backward } = ACCOUNT;

describe('sampled values', () => {
  test('are joined by straight lines', () => {
    const whole = recordOf(
      totalsOf([
        [0, 1],
        [2, 3],
        [5, 3],
      ]),
    );
    expect(whole).toMatchObject({
      total_kg: 4 + 9,
      seconds: 5,
      volume_m3: 6.5,
      meanMassFlow_kg_s: 13 / 5,
      converted: 3,
    });
  });

  test('are joined across a row that was not converted, when the interval is no gap', () => {
    const whole = recordOf(
      totalsOf([
        [0, 2],
        [4, 0, fault],
        [8, 2],
      ]),
    );
    expect(whole).toMatchObject({ total_kg: 16, seconds: 8, rows: 3, converted: 2, reasons_s: { 'signal-fault': 4 } });
  });

  test('that are farther apart are not: the gap is told with its length and with what it may have held', () => {
    const totals = totalsOf([
      [0, 2],
      [10, 2],
      [30, 6],
      [31, 6],
    ]);
    expect(recordOf(totals)).toMatchObject({ total_kg: 20 + 6, seconds: 11, gap_s: 20, gaps: 1 });
    expect(substitutesOf(totals)).toEqual({ held_kg: 40, straightLine_kg: 80 });
    expect(totals).toMatchObject({ longestGap: 20, longestGapFrom: 10 });
  });

  test('of no flow count as time without flow', () => {
    const whole = recordOf(
      totalsOf([
        [0, 4],
        [2, 0, belowCutOff, 0.5],
        [4, 0, belowCutOff, 0.5],
      ]),
    );
    expect(whole).toMatchObject({ total_kg: 4, flowing_s: 1, still_s: 3, reasons_s: { 'below-cut-off': 3 } });
  });

  test('without a place in time count as rows alone', () => {
    const totals = totalsOf([
      [5, 1],
      [3, 9, backward],
      [6, 1],
    ]);
    expect(recordOf(totals)).toMatchObject({ total_kg: 1, rows: 3, converted: 2 });
    expect(totals.untimed[backward]).toBe(1);
  });
});

describe('values that hold', () => {
  test('count until the next is reported', () => {
    expect(
      recordOf(
        totalsOf(
          [
            [0, 1],
            [2, 3],
            [5, 7],
          ],
          { held: true },
        ),
      ),
    ).toMatchObject({ total_kg: 2 + 9, seconds: 5 });
  });

  test('hold no further than to a row that says nothing', () => {
    const totals = totalsOf(
      [
        [0, 1],
        [2, 0, fault],
        [5, 1],
        [6, 1],
      ],
      { held: true },
    );
    expect(recordOf(totals)).toMatchObject({ total_kg: 3, seconds: 3, gap_s: 3, gaps: 1 });
  });

  test('hold no longer than a gap may be', () => {
    expect(
      recordOf(
        totalsOf(
          [
            [0, 1],
            [11, 1],
            [12, 1],
          ],
          { held: true },
        ),
      ),
    ).toMatchObject({ total_kg: 1, gap_s: 11 });
  });
});

describe('days', () => {
  const midnight = Date.parse('2026-03-15T00:00:00Z') / 1000;

  test('share the time across midnight: the line is cut there, not the interval', () => {
    const { days } = totalsOf([
      [midnight - 3, 0],
      [midnight + 1, 4],
    ]);
    const [before, after] = days.map((day) => periodRecord(day, undefined));
    expect(before).toMatchObject({ total_kg: 4.5, seconds: 3, rows: 1 });
    expect(after).toMatchObject({ total_kg: 3.5, seconds: 1, rows: 1 });
  });

  test('share a gap across midnight', () => {
    const { days } = totalsOf([
      [midnight - 100, 1],
      [midnight + 50, 1],
    ]);
    expect(days.map(({ gaps, gapSeconds }) => [gaps, gapSeconds])).toEqual([
      [1, 100],
      [0, 50],
    ]);
  });

  test('between two far samples that are bridged stand on their own', () => {
    const day = 86400;
    const { days } = totalsOf(
      [
        [midnight, 1],
        [midnight + 3 * day, 1],
      ],
      { maxGap: 4 * day },
    );
    expect(days.map((one) => periodRecord(one, undefined).total_kg)).toEqual([day, day, day, 0]);
    expect(days.map(({ from }) => (from - midnight) / day)).toEqual([0, 1, 2, 3]);
  });

  test('have 23 and 25 hours where clocks move', () => {
    const dayOf = daysOfZone(zone('Europe/Oslo'));
    const length = (text: string) => {
      const { from, to } = dayOf(Date.parse(text) / 1000);
      return (to - from) / 3600;
    };
    expect(['2026-03-28T12:00Z', '2026-03-29T12:00Z', '2026-10-25T12:00Z'].map(length)).toEqual([24, 23, 25]);
  });

  test('begin when the contract says', () => {
    const { from, to } = daysOfZone(zone('+01:00'), 6 * 3600)(Date.parse('2026-03-15T04:59:59Z') / 1000);
    expect([from, to].map((time) => new Date(time * 1000).toISOString())).toEqual([
      '2026-03-14T05:00:00.000Z',
      '2026-03-15T05:00:00.000Z',
    ]);
  });

  test('never fill the memory, and lose nothing', () => {
    const rows = Array.from({ length: 9000 }, (_, at): Row => [at * 86400, 1]);
    const totals = totalsOf(rows, { maxGap: 86400 });
    expect(totals.days.length).toBe(4000);
    expect(recordOf(totals)).toMatchObject({ total_kg: 8999 * 86400, rows: 9000 });
  });
});

test('extremes are kept with their times', () => {
  const { extremes } = recordOf(
    totalsOf([
      [0, 2],
      [1, 5],
      [2, 1],
      [3, 9, fault],
    ]),
  );
  expect(extremes?.massFlow_kg_s).toEqual({ least: 1, leastAt_s: 2, most: 5, mostAt_s: 1 });
});

test('pressure is weighted by flow while something flows', () => {
  const whole = recordOf(
    totalsOf([
      [0, 1],
      [1, 0],
      [2, 0],
    ]),
  );
  expect(whole.meanPressure_Pa).toBe(1e5);
  expect(
    recordOf(
      totalsOf([
        [0, 0],
        [2, 0],
      ]),
    ).meanPressure_Pa,
  ).toBe(1e5 + 0.5);
});

test.each([1, 3, 7, 1000])('in pieces of %d rows the totals are the same to the last bit', (pieces) => {
  const rows = Array.from({ length: 1000 }, (_, at): Row => {
    const time = 86000 + at + (at % 13) / 10 + (at > 500 ? 60 : 0);
    return [time, 1 + Math.sin(at) / 3, at % 17 === 0 ? fault : at % 29 === 0 ? belowCutOff : 0];
  });
  const bare = ({ rule: _, ...totals }: Totals) => totals; // functions are never equal
  for (const held of [false, true]) {
    expect(bare(totalsOf(rows, { held }, pieces))).toEqual(bare(totalsOf(rows, { held })));
  }
});
