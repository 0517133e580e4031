/** Petroleum by its density, held against the tables of the edition before, which has other constants and no shift. */
import { describe, expect, it } from 'vitest';
import { groups } from '../../../src/core/fluid/liquid/petroleum.table.ts';
import { compressionFactor, expansionFactor, onIpts68, thermal } from '../../../src/core/fluid/liquid/petroleum.ts';
import { atmosphere, cautions, liquid, problems, solved } from './liquid-sample.ts';

const bar = 1e5;
const oil = (name: string, density: number, more: object = {}) =>
  liquid(name, { densityAt15: `${density} kg/m3`, viscosity: '10 cSt', ...more });
const off = (got: number, truth: number) => Math.abs(got / truth - 1);

/** Volume correction to 15 degC of ASTM D1250-80, Tables 54A, 54B and 54D: K0 and K1 at 15 degC. */
const before = (K0: number, K1: number, rho15: number, t: number): number => {
  const alpha = (K0 / rho15 + K1) / rho15;
  const step = alpha * (t - 15);
  return Math.exp(-step * (1 + 0.8 * step));
};

describe('density over temperature', () => {
  it.each([
    ['crude-oil', 613.9723, 0, 850],
    ['crude-oil', 613.9723, 0, 780],
    ['refined-product', 186.9696, 0.4862, 900], // fuel oil
    ['refined-product', 594.5418, 0, 800], // jet fuel
    ['refined-product', 346.4228, 0.4388, 740], // petrol
    ['lubricating-oil', 0, 0.6278, 880],
  ])('%s of ASTM D1250-80 with K0 %d, K1 %d, density %d', (name, K0, K1, rho15) => {
    for (const t of [-10, 5, 15, 30, 60, 90]) {
      const { density } = solved(oil(name, rho15), atmosphere, t);
      expect(off(density / rho15, before(K0, K1, rho15, t)), `${t} degC`).toBeLessThan(1.5e-4);
    }
  });

  it('gives back the stated density at its own temperature', () => {
    expect(solved(oil('crude-oil', 870), atmosphere, 15).density).toBeCloseTo(870, 9);
    const at60 = { kind: 'liquid', name: 'refined-product', densityAt60F: '745 kg/m3', viscosity: '1 cSt' };
    expect(solved(at60, atmosphere, 140 / 9).density).toBeCloseTo(745, 6);
  });

  it('reads the API gravity: 10 is the density of water at 60 degF', () => {
    const heavy = liquid('crude-oil', { apiGravity: 10, viscosity: '500 cSt' });
    expect(solved(heavy, atmosphere, 140 / 9).density).toBeCloseTo(999.016, 5); // API MPMS 11.1-2004
    // API MPMS 11.1: 35 degrees API is a relative density of 0.8498.
    const light = solved(liquid('crude-oil', { apiGravity: '35', viscosity: '8 cSt' }), atmosphere, 140 / 9);
    expect(light.density / 999.016).toBeCloseTo(0.8498, 4);
  });

  it('falls with temperature without a jump, also across the groups of refined products', () => {
    const at = (rho15: number) => solved(oil('refined-product', rho15), atmosphere, 60).density;
    for (let rho15 = 620; rho15 < 1150; rho15 += 1) expect(at(rho15 + 1)).toBeGreaterThan(at(rho15) - 0.05);
  });

  it('shifts 60 degF by what the standard names its base', () => {
    expect(onIpts68(60)).toBeCloseTo(60.0068749, 7);
    const [crude] = groups;
    expect(expansionFactor(crude, 850, 288.7055555555556)).toBeCloseTo(1, 9);
    expect(off(thermal(crude, 850).shifted, 850)).toBeLessThan(1e-5);
  });
});

describe('density over pressure', () => {
  it('is that of API MPMS 11.2.1M within 1 % of the compression', () => {
    const [crude] = groups;
    for (const [rho15, t] of [
      [850, 40],
      [800, 20],
      [920, 80],
    ] as const) {
      const r = rho15 / 1000;
      const F = Math.exp(-1.6208 + 0.00021592 * t + 0.87096 / r ** 2 + (0.0042092 * t) / r ** 2); // 11.2.1M, 1e-6 per kPa
      const got = 1 - 1 / compressionFactor(crude, rho15, atmosphere + 5e6, t + 273.15);
      expect(off(got, F * 1e-6 * 5000)).toBeLessThan(0.01);
    }
  });
  it('is one at the atmosphere, says so above its range and ends at twice that', () => {
    expect(cautions(solved(oil('crude-oil', 850), 100 * bar, 30))).toEqual([]);
    expect(cautions(solved(oil('crude-oil', 850), 120 * bar, 30))).toEqual(['liquid-pressure-range']);
    expect(problems(oil('crude-oil', 850), 300 * bar, 30)).toEqual(['liquid-pressure-too-high upstream.pressure']);
    const own = solved(oil('crude-oil', 850, { bulkModulus: '1500 MPa' }), atmosphere + 15e6, 15);
    expect(own.density).toBeCloseTo(850 * 1.01, 8);
  });
});

describe('what an oil needs', () => {
  it('one density, inside the tables', () => {
    const bare = liquid('crude-oil', { viscosity: '8 cSt' });
    expect(problems(bare, bar, 20)).toEqual(['petroleum-density-missing fluid.densityAt15']);
    expect(problems({ ...bare, densityAt15: '850 kg/m3', apiGravity: 30 }, bar, 20)).toEqual([
      'petroleum-density-twice fluid.apiGravity',
    ]);
    for (const density of [500, 1200, 1e6, 1e-6])
      expect(problems(oil('refined-product', density), bar, 20)).toEqual([
        'petroleum-density-out-of-range fluid.densityAt15',
      ]);
    for (const apiGravity of [-131.5, -200, 1e9])
      expect(problems({ ...bare, apiGravity }, bar, 20)).toEqual(['petroleum-density-out-of-range fluid.apiGravity']);
    expect(problems(oil('lubricating-oil', 780), bar, 20)).toEqual([
      'petroleum-density-out-of-range fluid.densityAt15',
    ]);
  });

  it('a viscosity, or two for the line of ASTM D341', () => {
    const viscosities = [
      { temperature: '40 degC', viscosity: '46 cSt' },
      { temperature: '100 degC', viscosity: '6.8 cSt' },
    ];
    const lubricant = (list: unknown) => liquid('lubricating-oil', { densityAt15: '875 kg/m3', viscosities: list });
    const nu = (t: number) => {
      const state = solved(lubricant(viscosities), bar, t);
      return (1e6 * state.viscosity) / state.density;
    };
    expect(nu(40)).toBeCloseTo(46, 2);
    expect(nu(100)).toBeCloseTo(6.8, 3);
    const [W0, W1] = [46, 6.8].map((one) => Math.log10(Math.log10(one + 0.7))) as [number, number]; // ASTM D341
    const share = Math.log10(343.15 / 313.15) / Math.log10(373.15 / 313.15);
    expect(nu(70)).toBeCloseTo(10 ** (10 ** (W0 + share * (W1 - W0))) - 0.7, 2);
    expect(cautions(solved(lubricant(viscosities), bar, 20))).toEqual(['liquid-viscosity-range']);
    expect(problems(lubricant(viscosities), bar, -30)).toEqual(['liquid-viscosity-out-of-range upstream.temperature']);
    expect(problems(lubricant([...viscosities].reverse()), bar, 50)).toEqual([
      'table-order fluid.viscosities.1.temperature',
    ]);
    const rising = [viscosities[0], { ...viscosities[1], viscosity: '60 cSt' }];
    expect(problems(lubricant(rising), bar, 50)).toEqual(['viscosity-rises fluid.viscosities.1.viscosity']);
    expect(problems(lubricant(undefined), bar, 50)).toEqual(['liquid-viscosity-missing fluid.viscosity']);
  });

  it('a caution where the line of D341 is thin', () => {
    const petrol = liquid('refined-product', {
      densityAt15: '740 kg/m3',
      viscosities: [
        { temperature: '0 degC', viscosity: '2.4 cSt' },
        { temperature: '40 degC', viscosity: '0.9 cSt' },
      ],
    });
    expect(cautions(solved(petrol, bar, 2))).toEqual([]);
    expect(cautions(solved(petrol, bar, 30))).toEqual(['viscosity-thin']);
  });

  it('a temperature inside the tables, or within 10 K of them', () => {
    expect(cautions(solved(oil('crude-oil', 900), bar, 155))).toEqual(['liquid-density-range']);
    expect(problems(oil('crude-oil', 900), bar, 161)).toEqual(['liquid-density-out-of-range upstream.temperature']);
  });
});
