/** Gas mixtures: what a document says becomes a state, the laws every gas obeys, and answers however far out it is asked. */
import { describe, expect, it } from 'vitest';
import { gasPresets } from '../../../src/core/document/gas-presets.table.ts';
import { splits } from '../../../src/core/fluid/cubic/stability.ts';
import { phaseSum } from '../../../src/core/fluid/gas/range.ts';
import { mixtureOf, R } from '../../../src/core/fluid/gerg/mixture.ts';
import { componentNames } from '../../../src/core/fluid/helmholtz/components.ts';
import { gasDensity, liquidDensity } from '../../../src/core/fluid/helmholtz/density.ts';
import { isothermOf, pressureAt } from '../../../src/core/fluid/helmholtz/isotherm.ts';
import { saturationPressure } from '../../../src/core/fluid/if97/saturation.ts';
import { stateOf } from '../../../src/core/fluid/state.ts';
import { as } from '../../../src/core/quantity/brand.ts';
import type { AbsolutePressure, Temperature } from '../../../src/core/quantity/kinds.ts';
import { evaluate } from '../../../src/views/present/evaluate.ts';
import { parseFormula } from '../../../src/views/present/formula.ts';
import { findingWords } from '../../../src/views/words/findings.ts';
import { remarks } from '../../../src/views/words/notes.ts';
import { problemSentence, problemWords } from '../../../src/views/words/problems.ts';
import { quantityNames } from '../../../src/views/words/quantities.ts';
import { workingTitles } from '../../../src/views/words/working.ts';
import { seeded } from './seeded.ts';

const Pa = (p: number): AbsolutePressure => as(p);
const K = (T: number): Temperature => as(T);
const atmosphere = Pa(101325);
const base = { pressure: Pa(101325), temperature: K(288.15) };

type Composition = Record<string, number | string>;
const at = (p: number, T: number, composition: unknown, more: object = {}, from = base) =>
  stateOf({ kind: 'gas', composition, ...more }, { pressure: Pa(p), temperature: K(T) }, from, atmosphere);

function solved(p: number, T: number, composition: unknown, more: object = {}, from = base) {
  const state = at(p, T, composition, more, from);
  if (!state.ok) throw new Error(`expected a state, got ${JSON.stringify(state.problems)}`);
  return state.value;
}

function problems(composition: unknown, more: object = {}, p = 1e6, T = 300): string[] {
  const state = at(p, T, composition, more);
  return state.ok ? [] : state.problems.map(({ code, field }) => `${code} ${field}`);
}

const natural: Composition = {
  methane: 0.9,
  nitrogen: 0.02,
  'carbon-dioxide': 0.02,
  ethane: 0.04,
  propane: 0.015,
  'n-butane': 0.005,
};

describe('a composition', () => {
  it('may be written as numbers, as text, in percent and in parts per million', () => {
    const numbers = solved(5e6, 300, { methane: 0.94, 'carbon-dioxide': 0.0599, oxygen: 0.0001 });
    expect(solved(5e6, 300, { methane: '0.94', 'carbon-dioxide': '5.99 %', oxygen: '100 ppm' })).toEqual(numbers);
    expect(solved(5e6, 300, { CH4: '94 %', 'Carbon Dioxide': '5.99%', O2: '0.01 %', argon: '' })).toEqual(numbers);
  });

  it('knows every component by its name and its formula', () => {
    for (const name of componentNames)
      expect(problems({ methane: 0.5, [name]: 0.5 }, {}, 1e3, 400)).toEqual(
        name === 'methane' ? ['composition-sum fluid.composition'] : [],
      );
    const formulas = [
      'CH₄',
      'N2',
      'CO2',
      'C2H6',
      'C3H8',
      'i-C4H10',
      'n-C4H10',
      'iC5',
      'nC5',
      'C6',
      'H2S',
      'He',
      'Ar',
      'CO',
      'H2',
    ];
    const each = Object.fromEntries(formulas.map((name) => [name, 1 / formulas.length]));
    expect(problems(each)).toEqual([]);
  });

  it('does not depend on the order it is written in', () => {
    const random = seeded(21);
    const entries = Object.entries(natural);
    const expected = solved(8e6, 290, natural);
    for (let k = 0; k < 20; k++) {
      const shuffled = [...entries].sort(() => random() - 0.5);
      expect(solved(8e6, 290, Object.fromEntries(shuffled))).toEqual(expected);
    }
  });

  it('in mass fractions is the same gas', () => {
    // 0.9 mol of methane and 0.1 mol of nitrogen: 14.438214 g and 2.80134 g.
    const mass = 0.9 * 16.04246 + 0.1 * 28.0134;
    const byMass = { methane: (0.9 * 16.04246) / mass, nitrogen: (0.1 * 28.0134) / mass };
    const state = solved(3e6, 310, byMass, { basis: 'mass' });
    expect(state.density / solved(3e6, 310, { methane: 0.9, nitrogen: 0.1 }).density).toBeCloseTo(1, 12);
    expect(state.molarMass).toBeCloseTo(mass / 1e3, 12);
  });

  it('is brought to 1 within a thousandth, beyond it only on request', () => {
    const off = (by: number) => ({ methane: 0.9, nitrogen: 0.1 + by });
    expect(problems(off(0.00099))).toEqual([]);
    expect(problems(off(-0.00099))).toEqual([]);
    expect(problems(off(0.0011))).toEqual(['composition-sum fluid.composition']);
    expect(problems(off(-0.0011))).toEqual(['composition-sum fluid.composition']);
    expect(problems(off(0.5), { normalise: true })).toEqual([]);
    expect(solved(1e6, 300, { methane: 9, nitrogen: 1 }, { normalise: true }).density).toBeCloseTo(
      solved(1e6, 300, { methane: 0.9, nitrogen: 0.1 }).density,
      12,
    );
    const state = at(1e6, 300, { methane: 50, nitrogen: 40 });
    expect(state.ok ? undefined : state.problems[0].detail.sum).toBe(90);
  });

  it('is refused with every trouble at its place', () => {
    expect(problems({ methane: 0.9, unobtainium: 0.1, nitrogen: -0.1 })).toEqual([
      'component-unknown fluid.composition.unobtainium',
      'fraction-negative fluid.composition.nitrogen',
    ]);
    expect(problems({ methane: 0.5, CH4: 0.5 })).toEqual(['component-twice fluid.composition.CH4']);
    expect(problems({ methane: 'much' })).toEqual(['number-unreadable fluid.composition.methane']);
    expect(problems({ methane: null, nitrogen: '3 bar' })).toEqual([
      'number-expected fluid.composition.methane',
      'number-unreadable fluid.composition.nitrogen',
    ]);
    expect(problems(undefined)).toEqual(['field-missing fluid.composition']);
    expect(problems({})).toEqual(['field-missing fluid.composition']);
    expect(problems([0.5, 0.5])).toEqual(['group-expected fluid.composition']);
    expect(problems('methane')).toEqual(['group-expected fluid.composition']);
    expect(problems({ methane: 0, nitrogen: 0 }, { normalise: true })).toEqual(['composition-sum fluid.composition']);
    expect(problems({ methane: 1 }, { basis: 'volume' })).toEqual(['choice-unknown fluid.basis']);
    expect(problems({ methane: 1 }, { normalise: 'perhaps' })).toEqual(['choice-unknown fluid.normalise']);
    expect(problems(JSON.parse('{"__proto__": 0.5, "constructor": 0.5}'))).toEqual([
      'component-unknown fluid.composition.__proto__',
      'component-unknown fluid.composition.constructor',
    ]);
  });
});

describe('the presets', () => {
  it.each(gasPresets.map((preset) => [preset.name, preset] as const))('%s is one gas at a usual state', (_, preset) => {
    const sum = Object.values(preset.composition).reduce((total, share) => total + Number(share), 0);
    expect(sum).toBeCloseTo(1, 12);
    const state = solved(4e5, 333.15, preset.composition);
    expect(state).toMatchObject({ phase: 'gas', expands: true });
    expect(state.cautions).toBeUndefined();
  });

  it('hold dry air to its known density', () => {
    const air = gasPresets.find(({ name }) => name === 'dry-air')?.composition ?? {};
    // CIPM-2007, Metrologia 45 (2008) 149: M = 28.96546 g/mol, Z = 0.999643 (Eq. 2) at 101325 Pa and 20 °C, dry.
    const density = (101325 * 0.02896546) / (0.999643 * R * 293.15);
    expect(Math.abs(solved(101325, 293.15, air).density / density - 1)).toBeLessThan(3e-5);
  });
});

describe('the state of a gas', () => {
  it('has every figure, its source and its working', () => {
    const state = solved(5e6, 300, natural);
    expect(Object.keys(state.sources).sort()).toEqual(['baseDensity', 'density', 'isentropicExponent', 'viscosity']);
    expect(state.working.map(({ id }) => id)).toEqual([
      'density',
      'viscosity',
      'speedOfSound',
      'isentropicExponent',
      'compressibility',
      'baseDensity',
    ]);
    expect(state.vapourPressure).toBeUndefined();
    expect(state.uncertainties).toMatchObject({ density: { share: 0.001 }, speedOfSound: { share: 0.001 } });
    expect(solved(40e6, 300, natural).uncertainties?.density).toBeUndefined();
    expect(solved(4e6, 270, { methane: 0.8, propane: 0.1, 'n-hexane': 0.1 }).uncertainties?.density).toBeUndefined();
    expect(solved(5e6, 300, { methane: 0.5, hydrogen: 0.5 }).uncertainties?.density?.share).toBe(0.01);
    for (const { id, given, remark } of state.working) {
      expect(Object.keys(workingTitles)).toContain(id);
      if (remark !== undefined) expect(Object.keys(remarks)).toContain(remark);
      for (const { words } of given) expect(Object.keys(quantityNames)).toContain(words);
    }
  });

  it('gives back each figure from the formula of its working', () => {
    for (const [p, count] of [
      [1e5, 3],
      [2e6, 1], // a liquid has no exponent and no compressibility factor
    ] as const) {
      const lines = solved(p, 250, { propane: 1 }).working.filter(({ formula }) => formula !== undefined);
      expect(lines).toHaveLength(count);
      for (const { formula = '', given, value } of lines) {
        const values = Object.fromEntries(given.map((one) => [one.symbol, one.value]));
        expect(Math.abs(evaluate(parseFormula(formula), values) / value - 1)).toBeLessThan(1e-12);
      }
    }
  });

  it('cools or warms as it is throttled by the sign of its substance', () => {
    expect(solved(5e6, 300, natural).jouleThomson).toBeGreaterThan(2e-6);
    expect(solved(5e6, 300, { hydrogen: 1 }).jouleThomson).toBeLessThan(0); // above its inversion temperature, 200 K
  });

  it('stands at the base state that the project names', () => {
    const density = solved(5e6, 300, natural).baseDensity ?? 0;
    // ISO 13443: 15 °C, 101.325 kPa; DIN 1343: 0 °C.
    const normal = { pressure: Pa(101325), temperature: K(273.15) };
    expect(density).toBeCloseTo(solved(101325, 288.15, natural).density, 12);
    expect(solved(5e6, 300, natural, {}, normal).baseDensity).toBeCloseTo(solved(101325, 273.15, natural).density, 12);
    expect(solved(5e6, 300, natural).sources.baseDensity?.clause).toContain('GERG');
  });

  it('has the base density of the ideal gas where something condenses there', () => {
    const wet = solved(2e5, 400, { methane: 0.9, water: 0.1 });
    expect(wet.sources.baseDensity?.clause).toContain('ideal gas');
    expect(wet.baseDensity).toBeCloseTo((101325 * (wet.molarMass ?? 0)) / (R * 288.15), 12);
    expect(solved(1e5, 400, { 'n-hexane': 1 }).sources.baseDensity?.clause).toContain('ideal gas');
  });

  it('is a liquid with a caution where there is no gas, and refused where it would be both', () => {
    const propane = solved(3e6, 293.15, { propane: 1 });
    expect(propane).toMatchObject({ phase: 'liquid', expands: false });
    expect(propane.cautions?.map(({ id }) => id)).toEqual(['fluid-liquid']);
    expect(propane.density).toBe(solved(3e6, 293.15, { propane: 1 }, { phase: 'liquid' }).density);
    const both = { methane: 0.3, 'n-decane': 0.7 };
    expect(problems(both, {}, 5e6, 300)).toEqual(['gas-density-none upstream.pressure']);
  });

  it('may be a liquid on request', () => {
    // Propane: 500.1 kg/m3 saturated at 20 °C (reference equation of Lemmon, McLinden and Wagner 2009, 8.36 bar).
    const liquid = solved(1e6, 293.15, { propane: 1 }, { phase: 'liquid' });
    expect(liquid).toMatchObject({ phase: 'liquid', expands: false });
    expect(Math.abs(liquid.density / 500.5 - 1)).toBeLessThan(2e-3);
    expect(problems({ propane: 1 }, { phase: 'gas' }, 3e6, 293.15)).toEqual(['gas-density-none upstream.pressure']);
    expect(problems({ methane: 1 }, { phase: 'liquid' }, 1e6, 300)).toEqual(['gas-density-none upstream.pressure']);
  });
});

describe('the other equation', () => {
  const detail = { equation: 'aga8-detail' };

  it('agrees with GERG-2008 on gas of pipeline quality and names itself', () => {
    for (const [p, T] of [
      [1e5, 270],
      [3e6, 280],
      [8e6, 300],
      [12e6, 330],
    ] as const) {
      const [one, other] = [solved(p, T, natural), solved(p, T, natural, detail)];
      // Both claim 0.1 % (AGA Report No. 8, Parts 1 and 2).
      expect(Math.abs(one.density / other.density - 1), `${p} Pa`).toBeLessThan(1e-3);
      expect(Math.abs((one.speedOfSound ?? 0) / (other.speedOfSound ?? 1) - 1), `${p} Pa`).toBeLessThan(2e-3);
      expect(other.sources.density.clause).toContain('DETAIL');
      expect(other.sources.baseDensity?.clause).toContain('DETAIL');
      expect(other.cautions).toBeUndefined();
    }
    expect(solved(5e6, 300, natural, { equation: 'gerg-2008' })).toEqual(solved(5e6, 300, natural));
    expect(problems(natural, { equation: 'guess' })).toEqual(['choice-unknown fluid.equation']);
  });

  it('tells where a gas leaves pipeline quality', () => {
    const cautions = (p: number, T: number, composition: Composition) =>
      (solved(p, T, composition, detail).cautions ?? []).map(({ id, detail: more }) =>
        `${id} ${more?.components ?? ''}`.trim(),
      );
    expect(cautions(1e6, 300, { methane: 0.69, ethane: 0.11, nitrogen: 0.2 })).toEqual([
      'detail-composition methane',
      'detail-composition ethane',
    ]);
    expect(cautions(13e6, 345, natural)).toEqual(['fluid-range-temperature', 'fluid-range-pressure']);
    expect(solved(13e6, 345, natural, detail).uncertainties?.density).toBeUndefined();
    expect(Object.keys(findingWords)).toContain('detail-composition');
  });

  it('answers random states with numbers or a reason', () => {
    const random = seeded(8);
    for (let k = 0; k < 1000; k++) {
      const x = randomFractions(random);
      const composition = Object.fromEntries(componentNames.map((name, i) => [name, x[i] ?? 0] as const));
      const [p, T] = [10 ** (2 + 6 * random()), 60 + 700 * random()];
      expect(faultOf(at(p, T, composition, detail), new Set(), new Set()), `${p} Pa, ${T} K, ${x}`).toBeUndefined();
    }
  });
});

describe('the cautions', () => {
  const ids = (p: number, T: number, composition: Composition) =>
    (solved(p, T, composition).cautions ?? []).map(({ id, verdict }) => `${id} ${verdict}`);

  it('are none in a pipeline', () => expect(ids(5e6, 290, natural)).toEqual([]));

  it('tell the range of the equation', () => {
    expect(ids(35e6, 450, natural)).toEqual([]);
    expect(ids(35.1e6, 400, natural)).toEqual(['fluid-range-pressure caution']);
    expect(ids(71e6, 400, natural)).toEqual(['fluid-range-pressure outside']);
    expect(ids(1e6, 460, natural)).toEqual(['fluid-range-temperature caution']);
    expect(ids(1e5, 701, { nitrogen: 1 })).toEqual(['fluid-range-temperature outside']);
  });

  it('tell a second phase', () => {
    const rich = { methane: 0.8, ethane: 0.08, propane: 0.06, 'n-butane': 0.04, 'n-hexane': 0.02 };
    expect(ids(4e6, 270, rich)).toEqual(['fluid-two-phase caution']);
    expect(ids(4e6, 400, rich)).toEqual([]);
  });

  it('tell condensing water from its saturation pressure on', () => {
    const limit = saturationPressure(K(300)) / 0.002;
    expect(ids(limit * 0.999, 300, { methane: 0.998, water: 0.002 })).toEqual([]);
    expect(ids(limit * 1.001, 300, { methane: 0.998, water: 0.002 })).toEqual(['water-dew-point caution']);
    expect(ids(1e6, 250, { methane: 0.998, water: 0.002 })).toEqual(['water-dew-point caution']); // ice would form
  });

  it('have words', () => {
    for (const id of [
      'fluid-range-temperature',
      'fluid-range-pressure',
      'fluid-two-phase',
      'fluid-liquid',
      'water-dew-point',
    ])
      expect(Object.keys(findingWords)).toContain(id);
  });
});

describe('the laws of a gas', () => {
  const presets = gasPresets.map(({ composition }) => composition);

  it('is ideal where its pressure goes to nothing', () => {
    for (const composition of presets)
      for (const T of [250, 300, 400]) {
        const [rare, rarer] = [1e4, 1e2].map((p) => Math.abs((solved(p, T, composition).compressibility ?? 0) - 1));
        expect(rare, `${T} K`).toBeLessThan(2e-3);
        expect((rarer ?? 1) / (rare ?? 1), `${T} K`).toBeCloseTo(0.01, 3); // Z - 1 falls as p
      }
  });

  it('has an isentropic exponent above 1, and at low pressure that of its heat capacities', () => {
    for (const composition of presets)
      for (const T of [260, 300, 400, 450])
        for (const p of [1e3, 1e5, 3e6, 10e6, 30e6])
          expect(solved(p, T, composition).isentropicExponent, `${p} Pa, ${T} K`).toBeGreaterThan(1);
    // Helium and argon: cp/cv = 5/3 of a monatomic ideal gas.
    for (const name of ['helium', 'argon'])
      expect(Math.abs((solved(1e3, 300, { [name]: 1 }).isentropicExponent ?? 0) / (5 / 3) - 1), name).toBeLessThan(
        1e-4,
      );
  });

  it('grows denser with pressure and lighter with temperature', () => {
    for (const composition of presets) {
      const pressures = Array.from({ length: 60 }, (_, k) => 1e4 * 3500 ** (k / 59));
      const along = pressures.map((p) => solved(p, 320, composition).density);
      expect(along.every((rho, k) => k === 0 || rho > (along[k - 1] ?? 0))).toBe(true);
      const across = Array.from({ length: 40 }, (_, k) => solved(6e6, 320 + 3 * k, composition).density);
      expect(across.every((rho, k) => k === 0 || rho < (across[k - 1] ?? 0))).toBe(true);
    }
  });

  it('gives back its pressure, and no stable root of lower density was passed over', () => {
    const random = seeded(2008);
    let found = 0;
    for (let k = 0; k < 1000; k++) {
      const x = randomFractions(random);
      const T = 230 + 190 * random();
      const p = 10 ** (4.7 + 2.84 * random());
      const along = isothermOf(mixtureOf(x), T);
      const rho = gasDensity(along, p);
      if (rho === undefined) continue;
      found++;
      const place = `${p} Pa, ${T} K, ${x}`;
      expect(Math.abs(pressureAt(along, rho).p / p - 1), place).toBeLessThan(1e-11);
      const lower = Array.from({ length: 60 }, (_, i) => pressureAt(along, (rho * (i + 0.5)) / 60.1));
      expect(
        lower.every((point) => point.p < p && point.slope > 0),
        place,
      ).toBe(true);
    }
    expect(found).toBeGreaterThan(500); // of 1000 states
  });

  it('is told from a liquid near the vapour pressure of a pure substance', () => {
    // Vapour pressure of propane at 20 °C, 8.3646 bar (reference equation of Lemmon, McLinden and Wagner 2009).
    const x = componentNames.map((name) => (name === 'propane' ? 1 : 0));
    const along = isothermOf(mixtureOf(x), 293.15);
    expect(gasDensity(along, 8.3e5)).toBeLessThan(liquidDensity(along, 8.3e5) ?? 0);
    expect(splits(phaseSum(x, 8.0e5, 293.15))).toBe(false);
    expect(splits(phaseSum(x, 8.7e5, 293.15))).toBe(true);
  });
});

/** One to eleven components, any shares; every other one a fuel gas with something in it. */
function randomFractions(random: () => number): readonly number[] {
  const amounts = componentNames.map(() => 0);
  const count = 1 + Math.floor(11 * random());
  for (let k = 0; k < count; k++) amounts[Math.floor(random() * amounts.length)] = random() ** 3;
  if (random() < 0.5) amounts[0] = 1 + 20 * random();
  const sum = amounts.reduce((total, value) => total + value, 0);
  return amounts.map((value) => value / sum);
}

/** What is wrong with an answer, whatever it was asked; codes and cautions are noted on the way. */
function faultOf(state: ReturnType<typeof at>, codes: Set<string>, ids: Set<string>): string | undefined {
  if (!state.ok) {
    const [problem] = state.problems;
    codes.add(problem.code);
    return /NaN|undefined|Infinity/.test(problemSentence(problem)) ? problem.code : undefined;
  }
  const { jouleThomson = Number.NaN, cautions = [], ...others } = state.value;
  for (const { id } of cautions) ids.add(id);
  const figures = Object.values(others).filter((value) => typeof value === 'number');
  if (figures.length < 8 || !Number.isFinite(jouleThomson)) return 'a figure is missing';
  if (!cautions.every(({ value }) => Number.isFinite(value) && value >= 0)) return 'a caution has no figure';
  return figures.every((value) => Number.isFinite(value) && value > 0) ? undefined : 'a figure is no figure';
}

describe('a gas anywhere', () => {
  it('answers 20,000 random states in and beyond range with numbers or a reason', () => {
    const random = seeded(20765);
    let solvedStates = 0;
    const faults: string[] = [];
    const codes = new Set<string>();
    const ids = new Set<string>();
    for (let k = 0; k < 20_000; k++) {
      const x = randomFractions(random);
      const composition = Object.fromEntries(componentNames.map((name, i) => [name, x[i] ?? 0] as const));
      const wild = random() < 0.2;
      const T = wild ? 10 ** (4 * random()) : 60 + 640 * random();
      const p = wild ? 10 ** (-3 + 12 * random()) : 10 ** (3 + 4.85 * random());
      const phase = random() < 0.15 ? { phase: 'liquid' } : {};
      const state = at(p, T, composition, phase);
      const wrong = faultOf(state, codes, ids);
      if (wrong !== undefined) faults.push(`seed 20765, case ${k}: ${wrong}: ${p} Pa, ${T} K, ${x}`);
      if (state.ok) solvedStates++;
    }
    expect(faults).toEqual([]);
    expect([...codes].sort()).toEqual(['gas-beyond-equation', 'gas-density-none', 'gas-out-of-range']);
    expect([...codes].every((code) => problemWords[code] !== undefined)).toBe(true);
    expect(ids.size).toBeGreaterThan(5);
    expect([...ids].filter((id) => findingWords[id] === undefined)).toEqual([]);
    expect(solvedStates).toBeGreaterThan(10_000);
    expect(solvedStates).toBeLessThan(19_000);
  }, 120_000);
});
