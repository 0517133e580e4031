/** The rows of a meter together: each on its own, mean, extremes, what rooting the mean would add, compensation. */
import { describe, expect, test } from 'vitest';
import type { MeterText } from '../../../src/core/document/project.ts';
import type { Conditions } from '../../../src/core/reading/contract.ts';
import { instrumentOf } from '../../../src/core/reading/registry.ts';
import { evaluate } from '../../../src/views/present/evaluate.ts';
import { parseFormula } from '../../../src/views/present/formula.ts';
import { quantityName } from '../../../src/views/words/quantities.ts';
import { workingTitle } from '../../../src/views/words/working.ts';
import { solved, steam } from '../sample.ts';
import { reading, readings, refusalOf, transmitter, uTube, venturi } from './sample.ts';

describe('each row on its own', () => {
  test('trouble in one refuses that one', () => {
    const { rows, summary } = readings(uTube, [{ value: '152 mm' }, { value: '15,2 cm' }, {}, 7, { value: '41 mm' }]);
    expect(rows.map(({ status }) => status)).toEqual(['solved', 'refused', 'refused', 'refused', 'solved']);
    const places = rows.map((row) => (row.status === 'refused' ? `${row.problem.code} at ${row.problem.field}` : ''));
    expect(places).toEqual([
      '',
      'number-grouping at readings.1.value',
      'field-missing at readings.2.value',
      'group-expected at readings.3',
      '',
    ]);
    expect(summary).toMatchObject({ rows: 5, refused: 3, counted: 2 });
  });
  test('trouble in the instrument refuses them all and leaves the meter solved', () => {
    const all = readings({ kind: 'u-tube' }, [{ value: '152 mm' }]);
    expect(all.problems.map(({ code, field }) => `${code} at ${field}`)).toEqual([
      'field-missing at instrument.liquid',
    ]);
    expect(all.rows[0]).toMatchObject({ status: 'refused' });
    expect(readings({ kind: 'abacus' }, []).problems[0]?.code).toBe('choice-unknown');
    expect(readings(uTube, 'many').problems[0]?.code).toBe('list-expected');
    expect(readings(null, [{ value: '1 mm' }]).rows[0]?.status).toBe('refused');
  });
  test('no instrument is read as a pressure difference; a meter without readings has none', () => {
    expect(readings(undefined, [{ value: '186.3 mbar' }]).rows[0]).toMatchObject({ differential_Pa: 18630 });
    expect(solved(venturi).readings).toBeUndefined();
  });
  test('a differential that no flow makes is the fault of the reading', () => {
    expect(refusalOf({ kind: 'differential' }, { value: '5 bar' })).toEqual([
      'differential-exceeds-pressure at readings.0.value',
    ]);
  });
  test('a difference that the pressure of the line hides is none', () => {
    const [hidden, least] = readings(uTube, [{ value: '7.4e-321 mm' }, { value: '1e-9 mm' }]).rows;
    expect(hidden).toMatchObject({ status: 'solved', counted: true, massFlow_kg_s: 0 });
    expect(hidden).not.toHaveProperty('uncertainty');
    expect(least).toMatchObject({ status: 'solved', counted: true });
    expect(least?.status === 'solved' && Number.isFinite(least.uncertainty?.expanded_percent)).toBe(true);
  });
  test('a state that cannot be is the fault of the row', () => {
    const cold = { ...transmitter, upper: '500 mbar' };
    expect(refusalOf(cold, { value: '12 mA', temperature: '9000 degC' }, steam)).toEqual([
      'water-out-of-range at readings.0.temperature',
    ]);
    expect(refusalOf(cold, { value: '12 mA', pressure: '-2 bar(g)' }, steam)).toEqual([
      'not-above-vacuum at readings.0.pressure',
    ]);
  });
});

test('a row that does not hold what its instrument asks for is a defect', () => {
  for (const instrument of [uTube, transmitter, { kind: 'gauges' }, { kind: 'differential' }]) {
    const settled = instrumentOf({ ...venturi, instrument });
    if (!settled.ok) throw new Error(`expected an instrument, got ${JSON.stringify(settled.problems)}`);
    expect(() => settled.value.read({}, {} as Conditions)).toThrow(/expected an? .+, got none/);
  }
});

describe('together', () => {
  const rows = ['152 mm', '149 mm', '41 mm', '-12 mm'].map((value) => ({ value }));
  const { summary, rows: all } = readings(uTube, rows);
  const flows = all.flatMap((row) => (row.status === 'solved' && row.counted ? [row.volumeFlow_m3_s ?? 0] : []));
  test('mean and extremes of the rows that count', () => {
    expect(flows).toHaveLength(3);
    expect(summary.mean?.volumeFlow_m3_s).toBeCloseTo(
      (flows[0] ?? 0) / 3 + (flows[1] ?? 0) / 3 + (flows[2] ?? 0) / 3,
      14,
    );
    expect([summary.maximum?.row, summary.minimum?.row]).toEqual([0, 2]);
    expect(summary.flags).toEqual([{ id: 'reading-reversed', verdict: 'outside', count: 1 }]);
  });
  test('the root of the mean lies above the mean of the roots', () => {
    const expected = Math.sqrt((152 + 149 + 41) / 3) / ((Math.sqrt(152) + Math.sqrt(149) + Math.sqrt(41)) / 3);
    expect(summary.rooted?.error_percent).toBeCloseTo(100 * (expected - 1), 6); // C of this tube is a constant
  });
  test('a square wave of 25 and 75 kPa reads 3.5 % high', () => {
    const wave = readings({ kind: 'differential' }, [{ value: '25 kPa' }, { value: '75 kPa' }]);
    expect(wave.summary.rooted?.error_percent).toBeCloseTo(3.528, 3);
  });
  test('nothing that counts has no mean', () => {
    expect(readings(uTube, [{ value: '-1 mm' }]).summary).not.toHaveProperty('mean');
  });
});

describe('a signal scaled for the design', () => {
  const meter: MeterText = { ...steam, instrument: { ...transmitter, upper: '500 mbar', output: 'square-root' } };
  const row = (changes: object) => reading(meter.instrument ?? {}, { value: '16 mA', ...changes }, meter);
  test('at the design state only C and expansibility are left', () => {
    const here = row({}).compensation;
    expect(here?.densityFactor).toBe(1);
    expect(Math.abs(here?.residual_percent ?? 9)).toBeLessThan(0.5);
    expect(row({ value: '20 mA' }).compensation?.residual_percent).toBeCloseTo(0, 9);
  });
  test('at another state the root of the densities', () => {
    const hot = row({ pressure: '30 bar(g)', temperature: '380 degC' });
    const design = solved(meter).state.density_kg_m3;
    expect(hot.compensation?.densityFactor).toBeCloseTo(Math.sqrt(hot.density_kg_m3 / design), 14);
    const { corrected, indicated } = hot.compensation ?? {};
    expect(corrected?.massFlow_kg_s).toBeLessThan(indicated?.massFlow_kg_s ?? 0);
    const residual = 100 * ((corrected?.massFlow_kg_s ?? 0) / (hot.massFlow_kg_s ?? 1) - 1);
    expect(hot.compensation?.residual_percent).toBeCloseTo(residual, 12);
  });
});

describe('working', () => {
  const filled = { density: '1200 kg/m3' };
  test.each([
    ['differential', { kind: 'differential', zero: '1 mbar', above: filled, rise: '1 m' }, { value: '120 mbar' }],
    ['u-tube', { ...uTube, zero: '1 mm', division: '1 mm', scaleMetal: 'steel' }, { value: '152 mm' }],
    ['one filling', { ...uTube, above: filled, rise: '1 m' }, { value: '152 mm' }],
    [
      'two fillings',
      { ...uTube, above: filled, aboveDownstream: 'water', drop: '2 m', rise: '1 m' },
      { value: '152 mm' },
    ],
    ['inverted', { kind: 'inverted-u-tube' }, { value: '152 mm' }],
    ['well', { kind: 'well', scale: 'plain', liquid: 'mercury', tube: '10 mm', well: '60 mm' }, { value: '152 mm' }],
    ['inclined', { kind: 'inclined', angle: '20 deg', liquid: 'mercury', zero: '1 mm' }, { value: '152 mm' }],
    ['gauges', { kind: 'gauges', rise: '1 m' }, { upstream: '3.1 bar(g)', throat: '2.8 bar(g)' }],
    ['transmitter', { ...transmitter, zero: '1 mbar', uncertainty: { accuracy: '0.1 % of span' } }, { value: '12 mA' }],
    ['root', { ...transmitter, output: 'square-root' }, { value: '12 mA' }],
  ] as const)('%s: every formula gives its figure, every name has words', (_, instrument, row) => {
    const lines = reading(instrument, row).working;
    expect(new Set(lines.map(({ id }) => id)).size).toBe(lines.length);
    expect(lines.map(({ id }) => id)).toContain('mass-flow');
    for (const { id, formula, given, value } of lines) {
      expect(workingTitle(id)).toMatch(/\S/);
      for (const { words } of given) expect(quantityName(words)).toMatch(/\S/);
      if (formula === undefined) continue;
      const put = evaluate(parseFormula(formula), Object.fromEntries(given.map((one) => [one.symbol, one.value])));
      expect(Math.abs(put / value - 1), `${id}: ${put} against ${value}`).toBeLessThan(1e-12);
    }
  });
});

test('a temperature measured downstream leads back by the loss of the row’s own flow', () => {
  const behind: MeterText = { ...steam, upstream: { ...steam.upstream, temperatureAt: 'downstream' } };
  const cell = { kind: 'differential' };
  const row = (value: string) => reading(cell, { value, temperature: '400 degC' }, behind).temperature_K - 673.15;
  expect(row('500 mbar')).toBeGreaterThan(row('100 mbar'));
  expect(row('100 mbar')).toBeGreaterThan(0);
});
