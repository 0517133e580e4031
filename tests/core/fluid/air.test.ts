/** Air: its limits, what its moisture may say, what is refused, and random states in and beyond its range. */
import { describe, expect, it } from 'vitest';
import type { FluidText } from '../../../src/core/document/project.ts';
import { airState } from '../../../src/core/fluid/air/air.ts';
import { airDensity } from '../../../src/core/fluid/air/mixture.ts';
import { sublimationPressure } from '../../../src/core/fluid/air/saturation.ts';
import type { FluidState } from '../../../src/core/fluid/contract.ts';
import { saturationPressure } from '../../../src/core/fluid/if97/saturation.ts';
import { stateOf } from '../../../src/core/fluid/state.ts';
import { as } from '../../../src/core/quantity/brand.ts';
import type { Outcome } from '../../../src/core/quantity/outcome.ts';
import { evaluate } from '../../../src/views/present/evaluate.ts';
import { parseFormula } from '../../../src/views/present/formula.ts';
import { seeded } from './seeded.ts';

const kelvin = (T: number) => as<'temperature'>(T);
const pascal = (p: number) => as<'absolute pressure'>(p);
const base = { pressure: pascal(101325), temperature: kelvin(288.15) };
const room = { pressure: pascal(101325), temperature: kelvin(293.15) };

const read = (fluid: object, state = room) =>
  stateOf({ kind: 'air', ...fluid } as FluidText, state, base, pascal(101325));

function solved(fluid: object, state = room) {
  const found = read(fluid, state);
  if (!found.ok) throw new Error(`expected a state, got ${JSON.stringify(found.problems)}`);
  return found.value;
}

const problems = (fluid: object, state = room) => {
  const found = read(fluid, state);
  return found.ok ? [] : found.problems.map(({ code, field }) => `${code} ${field}`);
};

const at = (p: number, T: number) => ({ pressure: pascal(p), temperature: kelvin(T) });
const cautionIds = (fluid: object, state = room) => (solved(fluid, state).cautions ?? []).map(({ id }) => id);
const fractionOf = (fluid: object, state = room) =>
  solved(fluid, state).working.find(({ id }) => id === 'water-fraction')?.value ?? 0;

describe('dry air', () => {
  it('is a gas with every figure', () => {
    const state = solved({});
    expect(state).toMatchObject({ phase: 'gas', expands: true });
    // CIPM-2007 at 20 degC and 101.325 kPa without water: 1.2045 kg/m3.
    expect(state.density).toBeCloseTo(1.2045, 3);
    // Ratio of heat capacities 1.4 of a diatomic gas, and 343.2 m/s in dry air at 20 degC (handbooks).
    expect(state.isentropicExponent).toBeCloseTo(1.401, 3);
    expect(state.speedOfSound).toBeCloseTo(343.3, 0);
    expect(state.baseDensity).toBeCloseTo(1.2255, 4);
    // Lemmon and others, J. Phys. Chem. Ref. Data 29 (2000) 331 (by CoolProp): 2.179e-6 K/Pa at 300 K and 1 MPa.
    expect((solved({}, at(1e6, 300)).jouleThomson ?? 0) / 2.179e-6).toBeCloseTo(1, 1);
    expect(state).not.toHaveProperty('cautions');
    expect(state.working.map(({ id }) => id)).not.toContain('water-fraction');
  });

  it('is the limit of moist air as the moisture goes', () => {
    for (const state of [room, at(5e5, 350), at(2e5, 250)]) {
      const dry = solved({}, state);
      const nearly = solved({ relativeHumidity: 1e-9 }, state);
      for (const figure of ['density', 'viscosity', 'isentropicExponent', 'speedOfSound', 'baseDensity'] as const)
        expect(nearly[figure]).toBeCloseTo(dry[figure] ?? 0, 7);
      expect(solved({ relativeHumidity: 0 }, state).viscosity).toBe(dry.viscosity);
    }
  });

  it('comes to the ideal gas as the pressure goes', () => {
    const state = solved({}, at(10, 400));
    expect(state.compressibility).toBeCloseTo(1, 6);
    expect(state.density).toBeCloseTo((10 * 0.0289657) / (8.314462618 * 400), 9);
  });

  it('does not jump where the formula of metrology ends', () => {
    for (const h of [0, 0.5, 1])
      for (const [inside, beyond] of [
        [at(101325, 300.15), at(101325, 300.1500001)],
        [at(101325, 288.15), at(101325, 288.1499999)],
        [at(110e3, 293.15), at(110000.001, 293.15)],
        [at(60e3, 293.15), at(59999.999, 293.15)],
      ] as const) {
        const [one, other] = [solved({ relativeHumidity: h }, inside), solved({ relativeHumidity: h }, beyond)];
        // GERG-2008 and CIPM-2007: 1e-5 apart for dry air, 2e-4 with much water vapour.
        expect(Math.abs(one.density / other.density - 1)).toBeLessThan(h === 0 ? 1e-5 : 2e-4);
      }
  });
});

describe('moist air', () => {
  it('is lighter and more compressible in sound the more humid it is', () => {
    const states = [0, 0.2, 0.4, 0.6, 0.8, 1].map((h) => solved({ relativeHumidity: h }, at(101325, 320)));
    states.slice(1).forEach((state, index) => {
      const before = states[index];
      expect(state.density).toBeLessThan(before?.density ?? 0);
      expect(state.speedOfSound).toBeGreaterThan(before?.speedOfSound ?? 0);
      expect(state.isentropicExponent).toBeLessThan(before?.isentropicExponent ?? 0);
      expect(state.viscosity).toBeLessThan(before?.viscosity ?? 0);
    });
  });

  it('reads 60 %, 0.6 and the dew point that they mean as one', () => {
    const share = fractionOf({ relativeHumidity: '60 %' });
    expect(fractionOf({ relativeHumidity: 0.6 })).toBe(share);
    expect(share).toBeCloseTo(0.0139, 4); // 0.6 of 2339 Pa over 101325 Pa, and 0.4 % for the air
    // ASHRAE psychrometric chart No. 1: 20 degC at 60 % has a dew point of 12.0 degC and a wet bulb of 15.2 degC.
    expect(fractionOf({ dewPoint: '12.0 degC' })).toBeCloseTo(share, 4);
    expect(Math.abs(fractionOf({ wetBulb: '15.2 degC' }) / share - 1)).toBeLessThan(0.02);
  });

  it('takes a dew point below freezing as a frost point', () => {
    // IAPWS R14-08(2011), computer-program verification: 8.94735 Pa at 230 K.
    expect(sublimationPressure(kelvin(230))).toBeCloseTo(8.94735, 5);
    const state = solved({ dewPoint: '-40 degC' }, at(8e5, 293.15));
    const ice = state.working.find(({ id }) => id === 'saturation-pressure');
    expect(ice?.value).toBeCloseTo(sublimationPressure(kelvin(233.15)), 9);
    expect(ice?.remark).toBe('over-ice');
    expect(sublimationPressure(kelvin(273.16))).toBeCloseTo(saturationPressure(kelvin(273.16)), 1);
  });

  it('counts base volumes of the moist air or of the dry air in it', () => {
    const wet = solved({ relativeHumidity: '80 %' });
    const dry = solved({ relativeHumidity: '80 %', baseBasis: 'dry' });
    const x = fractionOf({ relativeHumidity: '80 %' });
    const shareOfDry = ((1 - x) * 28.96546) / ((1 - x) * 28.96546 + x * 18.01528);
    const alone = airDensity(base.pressure, base.temperature, 0)?.density ?? 0;
    expect((dry.baseDensity ?? 0) * shareOfDry).toBeCloseTo(alone, 9);
    expect(wet.baseDensity ?? 0).toBeLessThan(alone);
    expect(solved({ baseBasis: 'dry' }).baseDensity).toBe(solved({}).baseDensity);
  });

  it('warns where its formulas are not known', () => {
    expect(cautionIds({ relativeHumidity: '50 %' }, at(5e6, 300))).toEqual(['enhancement-pressure']);
    expect(cautionIds({ relativeHumidity: '10 %' }, at(5e5, 390))).toEqual(['enhancement-temperature']);
    expect(cautionIds({ wetBulb: '25 degC' }, at(5e5, 300))).toEqual(['psychrometer-pressure']);
    expect(cautionIds({}, at(1e5, 500))).toEqual(['fluid-range-temperature']);
    expect(solved({}, at(1e5, 500)).uncertainties).not.toHaveProperty('density');
  });
});

describe('the working of air', () => {
  it.each([
    ['dry', {}, room],
    ['humid', { relativeHumidity: '60 %' }, room],
    ['humid, its dry air counted', { relativeHumidity: '60 %', baseBasis: 'dry' }, room],
    ['by dew point, under pressure', { dewPoint: '5 degC' }, at(8e5, 300)],
    ['by wet bulb, warm', { wetBulb: '35 degC' }, at(1e5, 330)],
  ] as const)('%s: each formula with its numbers gives the figure it explains', (_, fluid, state) => {
    const formulas = solved(fluid, state).working.filter(({ formula }) => formula !== undefined);
    expect(formulas.length).toBeGreaterThanOrEqual(3);
    for (const { id, formula = '', given, value } of formulas) {
      const values = Object.fromEntries(given.map((item) => [item.symbol, item.value]));
      expect(evaluate(parseFormula(formula), values) / value, id).toBeCloseTo(1, 12);
    }
  });
});

describe('what air refuses', () => {
  it('moisture that is said twice or cannot be', () => {
    expect(problems({ relativeHumidity: '50 %', dewPoint: '10 degC' })).toEqual(['moisture-twice fluid.dewPoint']);
    expect(problems({ dewPoint: '10 degC', wetBulb: '12 degC' })).toEqual(['moisture-twice fluid.wetBulb']);
    expect(problems({ relativeHumidity: '110 %' })).toEqual(['share-out-of-range fluid.relativeHumidity']);
    expect(problems({ relativeHumidity: 60 })).toEqual(['share-out-of-range fluid.relativeHumidity']);
    expect(problems({ dewPoint: '21 degC' })).toEqual(['dew-point-above-temperature fluid.dewPoint']);
    expect(problems({ dewPoint: '-120 degC' })).toEqual(['dew-point-out-of-range fluid.dewPoint']);
    expect(problems({ wetBulb: '21 degC' })).toEqual(['wet-bulb-above-temperature fluid.wetBulb']);
    expect(problems({ wetBulb: '-1 degC' })).toEqual(['wet-bulb-out-of-range fluid.wetBulb']);
    expect(problems({ wetBulb: '2 degC' })).toEqual(['wet-bulb-too-low fluid.wetBulb']);
    const hot = at(101325, 423.15);
    expect(problems({ relativeHumidity: '60 %' }, hot)).toEqual(['vapour-exceeds-pressure fluid.relativeHumidity']);
    expect(problems({ relativeHumidity: '1 %' }, at(1e5, 700))).toEqual([
      'humidity-out-of-range fluid.relativeHumidity',
    ]);
  });

  it('what cannot be read', () => {
    expect(problems({ relativeHumidity: 'half' })).toEqual(['number-unreadable fluid.relativeHumidity']);
    expect(problems({ dewPoint: 10 })).toEqual(['text-expected fluid.dewPoint']);
    expect(problems({ wetBulb: '300 degC of difference' })[0]).toMatch(/fluid\.wetBulb$/);
    expect(problems({ baseBasis: 'damp' })).toEqual(['choice-unknown fluid.baseBasis']);
  });

  it('states where air is no gas', () => {
    expect(problems({}, at(1e5, 60))).toEqual(['gas-density-none upstream.pressure']);
    expect(cautionIds({}, at(1e5, 65))).toContain('fluid-two-phase');
    expect(problems({}, at(1e5, 5000))).toEqual(['gas-out-of-range upstream.temperature']);
    expect(problems({}, at(1e9, 300))).toEqual(['gas-out-of-range upstream.pressure']);
  });
});

/** Every figure a number, those that must be above zero above it, or a reason. */
function isAnswer(found: Outcome<FluidState>): boolean {
  if (!found.ok) return found.problems[0].code !== '';
  const { density, viscosity, isentropicExponent = 0, speedOfSound = 0, working } = found.value;
  const figures = [density, viscosity, speedOfSound, ...working.map(({ value }) => value)];
  return figures.every((x) => x >= 0 && Number.isFinite(x)) && density * viscosity > 0 && isentropicExponent > 1;
}

describe('5000 random states', () => {
  const seed = 20070101;
  it(`are answered with figures or a reason (seed ${seed})`, () => {
    const random = seeded(seed);
    const between = (low: number, high: number) => low + (high - low) * random();
    const counts = { solved: 0, refused: 0 };
    const wrong: string[] = [];
    for (let index = 0; index < 5000; index++) {
      const T = kelvin(between(10, 1200));
      const state = { pressure: pascal(10 ** between(-2, 8.5)), temperature: T, base };
      const moisture = [
        undefined,
        { by: 'relativeHumidity', h: random() } as const,
        { by: 'dewPoint', temperature: kelvin(between(150, 1.02 * T)) } as const,
        { by: 'wetBulb', temperature: kelvin(between(250, 1.02 * T)) } as const,
      ][index % 4];
      const paths = { pressure: 'p', temperature: 'T', own: (name: string) => name };
      const found = airState(moisture, { ...state, paths });
      counts[found.ok ? 'solved' : 'refused'] += 1;
      if (!isAnswer(found)) wrong.push(`${state.pressure} Pa, ${T} K, ${JSON.stringify(moisture)}`);
    }
    expect(wrong).toEqual([]);
    expect(counts.solved).toBeGreaterThan(1500);
    expect(counts.refused).toBeGreaterThan(500);
  });
});
