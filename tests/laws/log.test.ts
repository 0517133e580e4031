/** A converted log against a plain loop over run(): the same flow in every row, within the bound that the log states. */
import { describe, expect, test } from 'vitest';
import type { MeterText } from '../../src/core/document/project.ts';
import { standing } from '../../src/core/run/standing.ts';
import { solveMeter } from '../../src/core/run.ts';
import { converted, logOf, projectOf, steamMeter } from '../core/log/example.ts';
import { generator } from './random.ts';

const ROWS = 3_400; // of each of three meters

const gasMeter: MeterText = {
  tag: 'FE-3102',
  fluid: {
    kind: 'gas',
    composition: { methane: '91 %', ethane: '5 %', propane: '1 %', nitrogen: '1 %', 'carbon-dioxide': '2 %' },
  },
  upstream: { pressure: '25 bar(g)', temperature: '15 degC' },
  pipe: { bore: '154.08 mm', material: 'carbon-steel' },
  element: { kind: 'orifice-plate', tappings: 'flange', bore: '90 mm', material: 'stainless-316' },
  duty: { maximum: '5 kg/s' },
  find: 'differential',
};
const waterMeter: MeterText = {
  tag: 'FE-4101',
  fluid: { kind: 'water' },
  upstream: { pressure: '4 bar(g)', temperature: '20 degC' },
  pipe: { bore: '300 mm', material: 'carbon-steel' },
  element: { kind: 'venturi-tube', convergent: 'machined', bore: '150 mm', material: 'carbon-steel' },
  duty: { maximum: '600 m3/h' },
  find: 'differential',
};

const columns = {
  time: { column: 'time', format: 'epoch-s' },
  differential: { column: 'dp', unit: 'Pa' },
  pressure: { column: 'p', unit: 'Pa(a)' },
  temperature: { column: 'T', unit: 'K' },
};

interface Around {
  readonly meter: MeterText;
  readonly pressure: readonly [number, number]; // Pa
  readonly temperature: readonly [number, number]; // K
  readonly differential: readonly [number, number]; // Pa
}

const cases: readonly (readonly [string, Around])[] = [
  [
    'steam through a nozzle',
    { meter: steamMeter, pressure: [35e5, 44e5], temperature: [640, 700], differential: [200, 6e4] },
  ],
  [
    'natural gas through a plate',
    { meter: gasMeter, pressure: [20e5, 30e5], temperature: [278, 303], differential: [100, 5e4] },
  ],
  [
    'water through a Venturi tube',
    { meter: waterMeter, pressure: [3e5, 7e5], temperature: [276, 310], differential: [50, 6e4] },
  ],
];

describe.each(cases)('%s', (_name, { meter: { instrument: _, ...plain }, pressure, temperature, differential }) => {
  const meter: MeterText = { ...plain, log: columns };
  const random = generator(1203);
  const between = ([from, to]: readonly [number, number]): number => from + (to - from) * random();
  const rows = Array.from({ length: ROWS }, () => ({
    dp: between(differential),
    p: between(pressure),
    T: between(temperature),
  }));
  const text = rows.map(({ dp, p, T }, at) => `${1e9 + at},${dp},${p},${T}`);
  const { result, text: out } = converted(logOf(text, 'time,dp,p,T'), meter, { digits: 'all' });
  const flows = out
    .trim()
    .split('\n')
    .slice(1)
    .map((line) => Number(line.split(',')[4]));

  test('each row within the bound', () => {
    const stands = standing(meter, 0, projectOf(meter));
    if (!stands.ok) throw new Error(JSON.stringify(stands.problems));
    const bore = `${stands.value.solution.boreAsMeasured} m`;
    const bound = result.path.bounds?.massFlow ?? 0;
    expect(bound).toBeGreaterThan(0);
    expect(bound).toBeLessThan(1e-7);
    expect(result.path.surfaceRows).toBeGreaterThan(0.9 * ROWS);
    let worst = 0;
    for (const [at, { dp, p, T }] of rows.entries()) {
      const upstream = { pressure: `${p} Pa(a)`, temperature: `${T} K` };
      const text: MeterText = {
        ...meter,
        upstream,
        differential: `${dp} Pa`,
        find: 'flow',
        element: { ...meter.element, bore },
      };
      const solved = solveMeter(text, 0, {});
      if (solved.status === 'refused') throw new Error(JSON.stringify(solved.problems));
      const flow = solved.points.maximum?.massFlow_kg_s ?? Number.NaN;
      worst = Math.max(worst, Math.abs((flows[at] as number) / flow - 1));
    }
    expect(worst).toBeLessThanOrEqual(bound);
    expect(worst).toBeGreaterThan(0);
  });

  test('and with the exact path to rounding', () => {
    const some = text.slice(0, 300);
    const exact = converted(
      logOf(some, 'time,dp,p,T'),
      { ...meter, log: { ...columns, exact: true } },
      { digits: 'all' },
    );
    expect(exact.result.path).toMatchObject({ kind: 'exact', exactRows: 300, surfaceRows: 0 });
    expect(
      Math.abs(exact.result.total_kg / converted(logOf(some, 'time,dp,p,T'), meter).result.total_kg - 1),
    ).toBeLessThan(1e-7);
  });
});
