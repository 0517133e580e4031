/** Whole conversions: the example day against what was put into it, and small logs row by row. */
import { describe, expect, test } from 'vitest';
import type { MeterText } from '../../../src/core/document/project.ts';
import { MISHAPS, type Mishap } from '../../../src/core/log/example.ts';
import { converted, exampleBytes, logOf, midnight, steamMeter } from './example.ts';

const secondsOf = (...kinds: readonly Mishap[]): number =>
  MISHAPS.filter(({ what }) => kinds.includes(what)).reduce((sum, { seconds }) => sum + seconds, 0);

describe('the example day', () => {
  const bytes = exampleBytes();
  const { result, text } = converted(bytes);
  const rows = Object.fromEntries(result.accounts.map(({ code, rows: count }) => [code, count]));

  test('has a row for every second but those left out, and one more for each that stands twice', () => {
    expect(result.rows).toBe(86_400 - secondsOf('no-rows') + secondsOf('twice'));
  });

  test('has an account for everything that went wrong, and for nothing else', () => {
    const { converted: clean, ...others } = rows;
    expect(others).toEqual({
      'signal-fault': secondsOf('fault-high', 'fault-low'),
      'signal-saturated': secondsOf('saturated'),
      'signal-uncertain': secondsOf('uncertain'),
      'below-cut-off': secondsOf('stopped'),
      'pressure-substituted': secondsOf('no-pressure'),
      'temperature-missing': secondsOf('no-temperature'),
      'stamp-repeated': secondsOf('twice'),
      'stamp-backward': secondsOf('clock-back'),
      'signal-unreadable': secondsOf('unreadable'),
    });
    const sum = Object.values(rows).reduce((one, other) => one + other, 0);
    expect(sum).toBe(result.rows);
    expect(clean).toBeGreaterThan(80_000);
  });

  test('bridges what is short, leaves the rest as gaps, and loses no second', () => {
    expect(result.seconds + result.gap_s).toBe(86_399);
    const refused = secondsOf('fault-high', 'fault-low', 'no-temperature', 'clock-back');
    const long = MISHAPS.filter(({ what, seconds }) => what === 'no-rows' && seconds > 10);
    expect(result.gaps).toBe(long.length + 4);
    expect(result.gap_s).toBe(refused + long.reduce((sum, { seconds }) => sum + seconds, 0) + result.gaps);
    expect(result.longestGap).toEqual({ seconds: 1261, from_s: midnight + 21_899 });
  });

  test('gives every second but those of gaps without stamps to an account', () => {
    const accounted = result.accounts.reduce((sum, { seconds }) => sum + seconds, 0);
    expect(accounted).toBe(86_399 - 1261 - 13); // the clock that was put back leaves a gap too
  });

  test('adds up: the total is that of its day and of its output', () => {
    expect(result.days).toHaveLength(1);
    expect(result.days[0]?.total_kg).toBe(result.total_kg);
    const flows = text
      .trim()
      .split('\n')
      .slice(1)
      .map((line) => line.split(','))
      .filter(([, , , , flow]) => flow !== '')
      .map(([, time = '', , , flow]) => ({ time: Date.parse(time) / 1000, flow: Number(flow) }));
    let total = 0;
    for (const [at, { time, flow }] of flows.entries()) {
      const before = flows[at - 1];
      if (before && time - before.time <= 10) total += ((flow + before.flow) / 2) * (time - before.time);
    }
    expect(Math.abs(total / result.total_kg - 1)).toBeLessThan(1e-7);
  });

  test('comes by a surface whose bound is stated', () => {
    expect(result.path).toMatchObject({ kind: 'surface', exactRows: 0 });
    expect(result.path.bounds?.massFlow).toBeLessThan(1e-7);
  });

  test('has an output of one row for each row, in order', () => {
    const lines = text.trim().split('\n');
    expect(lines[0]).toBe('row,time,differential_Pa,density_kg_m3,massFlow_kg_s,account');
    expect(lines.slice(1).every((line, at) => line.startsWith(`${at + 1},`))).toBe(true);
    expect(lines).toHaveLength(result.rows + 1);
  });
});

describe.each([1, 7, 65_536])('worked on %d rows at once', (chunkRows) => {
  const bytes = exampleBytes({ seconds: 30_000 });
  const one = converted(bytes);
  test.each([{}, { log: { ...(steamMeter.log as object), interpretation: 'held', maxGap: '5 min' } }])(
    'record and output are the same to the last byte %#',
    (more) => {
      const meter = { ...steamMeter, ...more };
      const other = converted(bytes, meter, { chunkRows }, 65_536);
      const usual = 'log' in more ? converted(bytes, meter) : one;
      expect(other.result).toEqual(usual.result);
      expect(other.text === usual.text).toBe(true);
    },
  );
});

test('surfaces that grow on the way do not make the answer depend on the chunks', () => {
  const rows = Array.from(
    { length: 3000 },
    (_, at) => `${midnight + at},${8 + (at % 7)},${20 + at / 80},${380 + at / 60}`,
  );
  const { time: _, ...log } = steamMeter.log as Record<string, unknown>;
  const meter = { ...steamMeter, log: { ...log, time: { column: 'time', format: 'epoch-s' } } };
  const [whole, ...others] = [65_536, 1, 7, 1000].map((chunkRows) =>
    converted(logOf(rows), meter, { chunkRows, digits: 'all' }),
  );
  expect(whole?.result.path).toMatchObject({ kind: 'surface', exactRows: 0 });
  for (const other of others) {
    expect(other.result).toEqual(whole?.result);
    expect(other.text === whole?.text).toBe(true);
  }
});

test('cut into single bytes a log comes out the same', () => {
  const bytes = exampleBytes({ seconds: 300 });
  const whole = converted(bytes);
  const cut = converted(bytes, steamMeter, {}, 1);
  expect(cut).toEqual(whole);
});

/** Accounts of the rows of a small log, in their order. */
const accountsOf = (rows: readonly string[], meter: Partial<MeterText> = {}): string[] => {
  const { text } = converted(logOf(rows), { ...steamMeter, ...meter });
  return text
    .trim()
    .split('\n')
    .slice(1)
    .map((line) => line.split(',').at(-1) ?? '');
};
const stamp = (second: number): string => new Date((midnight + second) * 1000).toISOString();
const row = (
  second: number,
  signal: number | string = 12,
  pressure: number | string = 39,
  temperature: number | string = 400,
) => `${stamp(second)},${signal},${pressure},${temperature}`;
const withLog = (more: object): Partial<MeterText> => ({ log: { ...(steamMeter.log as object), ...more } });

describe('limits of the signal', () => {
  test('of NAMUR NE 43: those of a fault belong to the fault, the others to the values', () => {
    const signals = [3.59, 3.6, 3.61, 3.79, 3.8, 20.5, 20.51, 20.99, 21, 21.01];
    expect(accountsOf(signals.map((signal, at) => row(at, signal)))).toEqual([
      'signal-fault',
      'signal-fault',
      'signal-uncertain',
      'signal-uncertain',
      'differential-negative',
      'converted',
      'signal-saturated',
      'signal-saturated',
      'signal-fault',
      'signal-fault',
    ]);
  });

  test('noise about zero is below the cut-off on either side, and a differential below zero beyond it', () => {
    const signals = [3.98, 3.99, 4, 4.01, 4.02]; // the cut-off is 3 % of the flow: 54 Pa, 14.4 µA
    expect(accountsOf(signals.map((signal, at) => row(at, signal)))).toEqual([
      'differential-negative',
      'below-cut-off',
      'below-cut-off',
      'below-cut-off',
      'converted',
    ]);
    const instrument = { ...(steamMeter.instrument as object), cutOff: '0 mbar' };
    expect(accountsOf([row(0, 3.99), row(1, 4.01)], { instrument })).toEqual(['differential-negative', 'converted']);
  });

  test('can be others', () => {
    const instrument = { ...(steamMeter.instrument as object), limits: { failHigh: '21.75 mA' } };
    expect(accountsOf([row(0, 21.5), row(1, 21.75)], { instrument })).toEqual(['signal-saturated', 'signal-fault']);
  });
});

describe('rows of one stamp', () => {
  test('the last good one counts', () => {
    expect(accountsOf([row(0), row(1), row(1, 13), row(1, 14), row(2)])).toEqual([
      'converted',
      'stamp-repeated',
      'stamp-repeated',
      'converted',
      'converted',
    ]);
  });

  test('a bad one does not take the place of a good one', () => {
    expect(accountsOf([row(0), row(1), row(1, 22), row(2)])).toEqual([
      'converted',
      'converted',
      'signal-fault',
      'converted',
    ]);
    expect(accountsOf([row(0), row(0, 22), row(0, 'x'), row(0)])).toEqual([
      'stamp-repeated',
      'signal-fault',
      'signal-unreadable',
      'converted',
    ]);
  });

  test('a clock that stands still fills no memory, and every row has its account', () => {
    const rows = [row(0), ...Array.from({ length: 3000 }, () => row(0, 22)), row(0), row(1)];
    const { result } = converted(logOf(rows));
    const counts = Object.fromEntries(result.accounts.map(({ code, rows: count }) => [code, count]));
    expect(counts).toEqual({ converted: 2, 'signal-fault': 3000, 'stamp-repeated': 1 });
  });
});

test('a stamp before an earlier one has no place in time, whatever the earlier row was', () => {
  expect(accountsOf([row(5), row(9, 22), row(7), row(10)])).toEqual([
    'converted',
    'signal-fault',
    'stamp-backward',
    'converted',
  ]);
});

describe('pressure and temperature', () => {
  test('are substituted where that is stated, and said', () => {
    expect(accountsOf([row(0), row(1, 12, '', 400), row(2, 12, 39, '')])).toEqual([
      'converted',
      'pressure-substituted',
      'temperature-missing',
    ]);
  });

  test('of another phase go through the whole calculation; impossible ones are told with their problem', () => {
    const { result, text } = converted(logOf([row(0), row(1, 12, 39, 100), row(2, 20, -1.0, 400), row(3)]));
    expect(text).toContain('not-solved');
    const refused = result.accounts.find(({ code }) => code === 'not-solved');
    expect(refused?.first.every(({ problem }) => typeof problem === 'string')).toBe(true);
    expect(result.path.exactRows).toBeGreaterThan(0);
  });

  test('beyond the limits of the standard the row is converted with a remark', () => {
    expect(accountsOf([row(0, 5, 39), row(1, 20, 1, 400)])).toEqual(['converted', 'outside-limits']);
  });
});

describe('what is looked for where it is stated', () => {
  test('a signal that stands still', () => {
    const rows = [row(0, 11), ...[1, 2, 3, 4].map((at) => row(at, 12)), row(5, 11)];
    expect(accountsOf(rows, withLog({ frozen: 3 }))).toEqual([
      'converted',
      'converted',
      'converted',
      'frozen',
      'frozen',
      'converted',
    ]);
    expect(accountsOf(rows)).not.toContain('frozen');
  });

  test('a spike', () => {
    const rows = Array.from({ length: 60 }, (_, at) => row(at, 12 + (at % 5) / 100 + (at === 45 ? 3 : 0)));
    const found = accountsOf(rows, withLog({ spike: 10 }));
    expect(found.indexOf('spike')).toBe(45);
    expect(found.filter((code) => code === 'spike')).toHaveLength(1);
    expect(accountsOf(rows)).not.toContain('spike');
  });
});

describe('time', () => {
  test('where no longest interval is stated, ten times the usual one is bridged', () => {
    const times = [...Array.from({ length: 150 }, (_, at) => at), 158, 170];
    const { maxGap: _, ...log } = steamMeter.log as Record<string, unknown>;
    const { result } = converted(logOf(times.map((time) => row(time))), { ...steamMeter, log });
    expect(result).toMatchObject({ maxGap_s: 10, maxGapStated: false, seconds: 158, gaps: 1, gap_s: 12 });
  });

  test('days are those of the zone, or of the contract', () => {
    const rows = [row(22.5 * 3600), row(23.5 * 3600)];
    const days = (more: object) =>
      converted(logOf(rows), { ...steamMeter, ...withLog({ maxGap: '2 h', ...more }) }).result.days.map(
        ({ date, seconds }) => [date, seconds],
      );
    expect(days({})).toEqual([['2026-03-14', 3600]]);
    expect(days({ zone: 'Europe/Oslo' })).toEqual([
      ['2026-03-14', 1800],
      ['2026-03-15', 1800],
    ]);
    expect(days({ dayStart: '23:00' })).toEqual([
      ['2026-03-13', 1800],
      ['2026-03-14', 1800],
    ]);
  });

  test('a log without rows, or with one, has no mean and no error', () => {
    expect(converted(logOf([row(0)])).result).toMatchObject({
      rows: 1,
      converted: 1,
      total_kg: 0,
      seconds: 0,
      gaps: 0,
    });
    expect(converted(logOf([row(0)])).result.meanMassFlow_kg_s).toBeUndefined();
  });
});
