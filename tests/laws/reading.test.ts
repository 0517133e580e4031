/** Laws of reading an instrument: what must not change the differential, whatever the figures are. */
import { describe, expect, test } from 'vitest';
import type { InstrumentText } from '../../src/core/document/project.ts';
import { as } from '../../src/core/quantity/brand.ts';
import { columnsDifferential } from '../../src/core/reading/chain.ts';
import { differentialOf, placeFrom, placeOf, signals } from '../../src/core/reading/signal.ts';
import { reading, readings, transmitter, venturi } from '../core/reading/sample.ts';
import { generator } from './random.ts';

const SEED = 20261201;
const RUNS = 60;

/** Runs a law on drawn figures; the failing draw is printed with its seed. */
function law(name: string, check: (between: (low: number, high: number) => number) => void): void {
  test(name, () => {
    for (let run = 0; run < RUNS; run += 1) {
      const random = generator(SEED + run);
      try {
        check((low, high) => low + (high - low) * random());
      } catch (problem) {
        throw new Error(`seed ${SEED + run}: ${String(problem)}`);
      }
    }
  });
}

const near = (one: number, other: number, share = 1e-12): void => {
  if (!(Math.abs(one - other) <= share * Math.max(Math.abs(one), Math.abs(other), 1)))
    throw new Error(`expected ${one}, got ${other}`);
};
const dp = (instrument: InstrumentText, value: string): number =>
  reading(instrument, { value }).differential_Pa ?? Number.NaN;

describe('columns', () => {
  law('the tappings may lie anywhere while the process fluid fills both legs', (between) => {
    const [h, liquid, process, g] = [between(-1, 1), between(1500, 14000), between(1, 1400), between(9.78, 9.84)];
    const legs = { process, upstream: process, downstream: process, rise: between(-10, 10), drop: between(-20, 20) };
    const level = between(-1, 1);
    const found = columnsDifferential({ upstream: level - h / 2, downstream: level + h / 2 }, liquid, legs, g);
    near(found, (liquid - process) * g * h, 1e-9);
  });
  law('a column of the process fluid itself adds nothing', (between) => {
    const process = between(1, 1400);
    const legs = { process, upstream: process, downstream: process, rise: between(-5, 5), drop: between(0, 5) };
    near(columnsDifferential({ upstream: between(-1, 1), downstream: between(-1, 1) }, process, legs, 9.8), 0, 1e-6);
  });
  law('a tube laid over reads along itself what it read upright', (between) => {
    const liquid = { density: `${between(1100, 14000)} kg/m3` };
    const [angle, h] = [between(3, 90), between(0.001, 2)];
    const along = h / Math.sin((angle * Math.PI) / 180);
    const laid = dp({ kind: 'inclined', liquid, angle: `${angle} deg` }, `${along} m`);
    near(laid, dp({ kind: 'u-tube', liquid }, `${h} m`));
  });
  law('limbs exchanged with the sign turned', (between) => {
    const [liquid, value] = [{ density: `${between(1100, 14000)} kg/m3` }, between(-1, 1)];
    near(
      dp({ kind: 'u-tube', liquid, high: 'upstream' }, `${-value} m`),
      dp({ kind: 'u-tube', liquid, high: 'downstream' }, `${value} m`),
    );
  });
  law('a corrected scale is a plain one with its divisions drawn together', (between) => {
    const [tube, well, read] = [between(2, 12), between(20, 120), between(0.01, 1)];
    const bores = { tube: `${tube} mm`, well: `${well} mm`, liquid: { density: '13600 kg/m3' } };
    const plain = dp({ kind: 'well', scale: 'plain', ...bores }, `${read} m`);
    near(plain, dp({ kind: 'well', scale: 'corrected', ...bores }, `${read * (1 + (tube / well) ** 2)} m`));
  });
});

describe('units and order', () => {
  law('the unit of a reading leaves the flow alone', (between) => {
    const value = Number(between(1, 1500).toFixed(3));
    const liquid = { density: '13595.1 kg/m3' };
    const flow = (text: string) => reading({ kind: 'u-tube', liquid }, { value: text }).massFlow_kg_s ?? Number.NaN;
    near(flow(`${value} mm`), flow(`${value / 10} cm`));
    near(flow(`${value} mm`), flow(`${value / 25.4} in`));
  });
  law('rows stand alone: their order leaves each of them as it was', (between) => {
    const values = [between(1, 200), between(1, 200), between(1, 200)].map((value) => ({ value: `${value} mbar` }));
    const flows = (rows: typeof values) =>
      readings({ kind: 'differential' }, rows, venturi).rows.map((row) =>
        row.status === 'solved' ? row.massFlow_kg_s : 0,
      );
    expect(flows([...values].reverse())).toEqual([...flows(values)].reverse());
  });
});

describe('signals', () => {
  law('a differential becomes a signal and is itself again', (between) => {
    const [lower, span, x] = [between(-5e4, 5e4), between(100, 1e5), between(-0.1, 1.1)];
    const range = { lower: as<'pressure difference'>(lower), upper: as<'pressure difference'>(lower + span) };
    near(placeFrom(differentialOf(x, range, 'linear'), range, 'linear'), x, 1e-9);
    const root = { lower: as<'pressure difference'>(0), upper: as<'pressure difference'>(span) };
    near(placeFrom(differentialOf(x, root, 'square-root'), root, 'square-root'), x, 1e-9);
  });
  law('the three signals say the same at the same place', (between) => {
    const x = between(0, 1);
    const values = [`${4 + 16 * x} mA`, `${1 + 4 * x} V`, `${100 * x} %`];
    const names = ['4-20 mA', '1-5 V', 'percent'];
    const all = values.map((value, at) => dp({ ...transmitter, signal: names[at] ?? '' }, value));
    near(all[0] ?? 0, all[1] ?? 1, 1e-9);
    near(all[0] ?? 0, all[2] ?? 1, 1e-9);
  });
  test('the ends of every signal are 0 and 1', () => {
    for (const signal of Object.values(signals))
      expect([placeOf(signal.zero, signal), placeOf(signal.full, signal)]).toEqual([0, 1]);
  });
});
