/** A liquid by the user's own table. */
import { describe, expect, it } from 'vitest';
import { cautions, problems, solved } from './liquid-sample.ts';

const bar = 1e5;
const row = (temperature: string, density: string, viscosity: string) => ({ temperature, density, viscosity });
const rows = [
  row('20 degC', '880 kg/m3', '60 mPa.s'),
  row('60 degC', '856 kg/m3', '12 mPa.s'),
  row('100 degC', '832 kg/m3', '4.4 mPa.s'),
];
const table = (more: object = {}, list: unknown = rows) => ({ kind: 'liquid', table: list, ...more });

describe('between the rows', () => {
  it('density is a straight line in the temperature and holds at any pressure', () => {
    expect(solved(table(), bar, 60).density).toBe(856);
    expect(solved(table(), bar, 50).density).toBeCloseTo(862, 10);
    expect(solved(table(), 50 * bar, 50).density).toBeCloseTo(862, 10);
  });
  it('unless a bulk modulus is stated', () => {
    const pressed = solved(table({ bulkModulus: '1400 MPa' }), 101325 + 14e6, 50);
    expect(pressed.density).toBeCloseTo(862 * 1.01, 9);
  });
  it('ln of the viscosity is a straight line over 1/T', () => {
    const [T0, T1] = [293.15, 333.15];
    const T = 2 / (1 / T0 + 1 / T1); // halfway over 1/T: the geometric mean of the two
    expect(solved(table(), bar, T - 273.15).viscosity).toBeCloseTo(Math.sqrt(0.06 * 0.012), 12);
    expect(solved(table(), bar, 60).viscosity).toBeCloseTo(0.012, 15);
  });
  it('or log log of the kinematic one over log T', () => {
    const state = solved(table({ viscosityRule: 'walther' }), bar, 60);
    expect(state.viscosity).toBeCloseTo(0.012, 14);
    const between = solved(table({ viscosityRule: 'walther' }), bar, 40).viscosity;
    expect(between).toBeLessThan(0.06);
    expect(between).toBeGreaterThan(0.012);
  });
  it('a kinematic viscosity is taken times the density', () => {
    const kinematic = [row('20 degC', '900 kg/m3', '10 cSt'), row('40 degC', '900 kg/m3', '5 cSt')];
    expect(solved(table({}, kinematic), bar, 20).viscosity).toBeCloseTo(0.009, 14);
  });
});

describe('beyond the rows', () => {
  it('goes on for 10 K with a caution, then no more', () => {
    expect(cautions(solved(table(), bar, 20))).toEqual([]);
    const beyond = solved(table(), bar, 12);
    expect(beyond.density).toBeCloseTo(884.8, 9);
    expect(cautions(beyond)).toEqual(['liquid-density-range', 'liquid-viscosity-range']);
    expect(beyond.cautions?.[0]).toMatchObject({ verdict: 'caution', unit: 'K' });
    expect(problems(table(), bar, 110)).toEqual([]);
    expect(problems(table(), bar, 110.1)).toEqual(['liquid-density-out-of-range upstream.temperature']);
    expect(problems(table(), bar, 9.9)).toEqual(['liquid-density-out-of-range upstream.temperature']);
  });
  it('never runs into a density below zero', () => {
    const steep = [row('20 degC', '900 kg/m3', '1 cP'), row('21 degC', '100 kg/m3', '1 cP')];
    expect(problems(table({}, steep), bar, 25)).toEqual(['liquid-density-out-of-range upstream.temperature']);
  });
  it('has no base density where the base state is beyond', () => {
    expect(solved(table(), bar, 60).baseDensity).toBeCloseTo(883, 9); // 15 degC is 5 K below
    const hot = rows.slice(1);
    expect(solved(table({}, hot), bar, 60)).not.toHaveProperty('baseDensity');
    expect(solved(table({ baseDensity: '890 kg/m3' }, hot), bar, 60).baseDensity).toBe(890);
  });
});

describe('rows that make no table', () => {
  it.each<[string, unknown, readonly string[]]>([
    ['one row', rows.slice(0, 1), ['table-too-short fluid.table']],
    ['no row', [], ['table-too-short fluid.table']],
    ['a row twice', [rows[0], rows[0], rows[1]], ['table-order fluid.table.1.temperature']],
    [
      'falling',
      [...rows].reverse(),
      ['table-order fluid.table.1.temperature', 'table-order fluid.table.2.temperature'],
    ],
    ['a missing cell', [{ ...rows[0], density: undefined }, rows[1]], ['field-missing fluid.table.0.density']],
    ['a density below zero', [{ ...rows[0], density: '-880 kg/m3' }, rows[1]], ['not-positive fluid.table.0.density']],
    ['no unit', [{ ...rows[0], density: '880' }, rows[1]], ['unit-missing fluid.table.0.density']],
    ['a number for text', [{ ...rows[0], viscosity: 60 }, rows[1]], ['text-expected fluid.table.0.viscosity']],
    ['a text for a list', 'rows', ['list-expected fluid.table']],
    ['nothing for a row', [null, rows[0], rows[1]], ['group-expected fluid.table.0']],
    ['a list for a row', [[], rows[0], rows[1]], ['group-expected fluid.table.0']],
    ['600 rows', Array.from({ length: 600 }, () => rows[0]), ['table-too-long fluid.table']],
  ])('%s', (_, list, expected) => {
    expect(problems(table({}, list), bar, 40)).toEqual(expected);
  });
  it('too thin for the line of an oil', () => {
    const thin = [row('20 degC', '900 kg/m3', '0.5 cSt'), row('40 degC', '900 kg/m3', '0.25 cSt')];
    expect(problems(table({ viscosityRule: 'walther' }, thin), bar, 30)).toEqual([
      'walther-too-thin fluid.table.1.viscosity',
    ]);
    expect(problems(table({}, thin), bar, 30)).toEqual([]);
  });
  it('a name beside a table', () => {
    expect(problems(table({ name: 'methanol' }), bar, 40)).toEqual(['liquid-twice fluid.table']);
  });
});
