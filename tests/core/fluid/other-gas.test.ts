/** Gases by the cubic equation: their names, limits, refusals, and the error that they show. */
import { describe, expect, it } from 'vitest';
import type { FluidText } from '../../../src/core/document/project.ts';
import { critical } from '../../../src/core/fluid/cubic/critical.table.ts';
import { pureGas } from '../../../src/core/fluid/cubic/pure.ts';
import { gasState } from '../../../src/core/fluid/gas/gas.ts';
import { otherGases } from '../../../src/core/fluid/gas/other-gas.table.ts';
import { otherGasState } from '../../../src/core/fluid/gas/other-gas.ts';
import { mixtureOf } from '../../../src/core/fluid/gerg/mixture.ts';
import { componentNames } from '../../../src/core/fluid/helmholtz/components.ts';
import { isothermOf } from '../../../src/core/fluid/helmholtz/isotherm.ts';
import { propertiesAt } from '../../../src/core/fluid/helmholtz/properties.ts';
import { stateOf } from '../../../src/core/fluid/state.ts';
import { as } from '../../../src/core/quantity/brand.ts';
import { evaluate } from '../../../src/views/present/evaluate.ts';
import { parseFormula } from '../../../src/views/present/formula.ts';
import { seeded } from './seeded.ts';

const at = (p: number, T: number) => ({ pressure: as<'absolute pressure'>(p), temperature: as<'temperature'>(T) });
const base = at(101325, 288.15);
const paths = { pressure: 'p', temperature: 'T', own: (name: string) => name };

const read = (fluid: object, state = at(3e5, 350)) =>
  stateOf({ kind: 'gas', ...fluid } as FluidText, state, base, base.pressure);
const problems = (fluid: object, state = at(3e5, 350)) => {
  const found = read(fluid, state);
  return found.ok ? [] : found.problems.map(({ code, field }) => `${code} ${field}`);
};
function solved(name: string, state = at(3e5, 350)) {
  const found = otherGasState(name, { ...state, base, paths });
  if (!found.ok) throw new Error(`expected a state of ${name}, got ${JSON.stringify(found.problems)}`);
  return found.value;
}

describe('a gas by its name', () => {
  it('is read in every spelling', () => {
    for (const name of ['ammonia', 'Ammonia', 'NH3', ' nh3 ', 'R717'])
      expect(read({ name })).toMatchObject({ ok: true, value: { density: solved('ammonia').density } });
    expect(read({ name: 'sulphur dioxide' })).toMatchObject({ ok: true });
    for (const { name } of otherGases) expect(problems({ name }, at(1e4, 400)), name).toEqual([]);
  });

  it('may be one of the mixture, which then keeps its own equation', () => {
    const x = componentNames.map((name) => (name === 'methane' ? 1 : 0));
    const alone = gasState(x, { ...at(3e5, 350), base, paths });
    const found = read({ name: 'CH4' });
    expect(found.ok && alone.ok && found.value.density === alone.value.density).toBe(true);
  });

  it('is refused where it is none, or said twice, or not at all', () => {
    expect(problems({ name: 'phlogiston' })).toEqual(['fluid-name-unknown fluid.name']);
    expect(problems({ name: 'ammonia', composition: { methane: 1 } })).toEqual(['gas-named-twice fluid.name']);
    expect(problems({})).toEqual(['field-missing fluid.composition']);
    expect(problems({ name: 'ammonia', phase: 'liquid' })).toEqual(['gas-density-none fluid.phase']);
  });
});

describe('the cubic equation', () => {
  it('comes to the ideal gas as the pressure goes', () => {
    for (const { name, M, a, caloric } of otherGases) {
      const T = Math.min(400, caloric[1]);
      const state = solved(name, at(1, T));
      const cp = a.reduceRight((sum, next) => sum * T + next, 0);
      expect(state.density / (M / 1e3 / (8.31446261815324 * T)), name).toBeCloseTo(1, 5);
      expect(state.isentropicExponent, name).toBeCloseTo(cp / (cp - 1), 5); // c_p/c_v of the ideal gas
    }
  });

  it('rises in density with pressure at one temperature', () => {
    for (const { name, Tc, pc, caloric } of otherGases) {
      const T = Math.min(1.1 * Tc, caloric[1]);
      const densities = [0.01, 0.1, 0.3, 0.6, 0.9].map((share) => solved(name, at(share * pc * 1e6, T)).density);
      expect(
        [...densities].sort((one, other) => one - other),
        name,
      ).toEqual(densities);
    }
  });

  it('shows its error, larger the denser the gas', () => {
    const share = (p: number) => solved('ammonia', at(p, 420)).uncertainties?.density?.share ?? 0;
    expect(share(1e4)).toBeCloseTo(0.005, 3);
    expect(share(5e6)).toBeGreaterThan(0.02);
    expect(share(8e6)).toBeGreaterThan(share(5e6) + 0.01);
    expect(solved('methanol', at(1e4, 420)).uncertainties?.density?.share).toBeCloseTo(0.035, 3);
    const dense = solved('ammonia', at(16e6, 440)).cautions?.map(({ id, verdict }) => `${id} ${verdict}`);
    expect(dense).toEqual(['fluid-range-density outside']);
    expect(solved('ammonia')).not.toHaveProperty('cautions');
  });

  it('explains its figures by formulas that give them', () => {
    const formulas = solved('ammonia').working.filter(({ formula }) => formula !== undefined);
    expect(formulas.map(({ id }) => id)).toEqual(['density', 'speedOfSound', 'baseDensity']);
    for (const { id, formula = '', given, value } of formulas) {
      const values = Object.fromEntries(given.map((item) => [item.symbol, item.value]));
      expect(evaluate(parseFormula(formula), values) / value, id).toBeCloseTo(1, 12);
    }
  });

  it('takes the ideal gas at a base state where the gas would be a liquid', () => {
    const state = solved('benzene', at(1e5, 400));
    expect(state.sources.baseDensity?.clause).toContain('Z_b = 1');
    expect(state.baseDensity).toBeCloseTo((101325 * 0.07811184) / (8.314462618 * 288.15), 6);
    expect(solved('ammonia').sources.baseDensity?.clause).toContain('Peng and Robinson');
  });

  it('refuses a liquid, a temperature without heat capacity, and a density beyond the critical one', () => {
    expect(problems({ name: 'ammonia' }, at(2e6, 290))).toEqual(['gas-density-none upstream.pressure']);
    expect(problems({ name: 'ammonia' }, at(1e5, 1200))).toEqual(['gas-out-of-range upstream.temperature']);
    expect(problems({ name: 'ammonia' }, at(5e8, 500))).toEqual(['gas-out-of-range upstream.pressure']);
    expect(problems({ name: 'ammonia' }, at(3e7, 420))).toEqual(['gas-beyond-equation upstream.pressure']);
  });

  const seed = 19760101;
  it(`answers 4000 random states with figures or a reason (seed ${seed})`, () => {
    const random = seeded(seed);
    const wrong: string[] = [];
    let figures = 0;
    for (let index = 0; index < 4000; index++) {
      const name = otherGases[index % otherGases.length]?.name ?? '';
      const state = at(10 ** (9.5 * random() - 1), 1100 * random());
      const found = otherGasState(name, { ...state, base, paths });
      if (!found.ok) continue;
      figures += 1;
      const { density, viscosity, isentropicExponent = 0, speedOfSound = 0, baseDensity = 0 } = found.value;
      const all = [density, viscosity, isentropicExponent, speedOfSound, baseDensity];
      if (!all.every((x) => x > 0 && Number.isFinite(x)) || isentropicExponent < 0.5)
        wrong.push(`${name} at ${state.pressure} Pa, ${state.temperature} K: ${all}`);
    }
    expect(wrong).toEqual([]);
    expect(figures).toBeGreaterThan(1500);
  });
});

describe('the Joule–Thomson coefficient of the cubic equation', () => {
  /** A gas of the mixtures by both equations, with the heat capacity of its ideal gas from the better one. */
  function byBoth(name: string, p: number, T: number): readonly [cubic: number, gerg: number, reduced: number] {
    const x = componentNames.map((one) => (one === name ? 1 : 0));
    const isotherm = isothermOf(mixtureOf(x), T);
    const [, Tc = 0, pc = 0, omega = 0] = critical.find(([one]) => one === name) ?? [];
    const ideal = propertiesAt(isotherm, 1e-6).isobaricHeatCapacity;
    const cubic = pureGas({ Tc, pc: pc * 1e6, omega }, ideal, p, T);
    const gerg = gasState(x, { ...at(p, T), base, paths });
    if (cubic === undefined || !gerg.ok) throw new Error(`expected ${name} as a gas at ${p} Pa, ${T} K`);
    return [cubic.jouleThomson, gerg.value.jouleThomson ?? Number.NaN, T / Tc];
  }

  it('is that of GERG-2008 within a tenth, and within a quarter far above the critical temperature', () => {
    for (const name of ['methane', 'nitrogen', 'carbon-dioxide', 'ethane', 'propane', 'oxygen'])
      for (const [p, T] of [
        [1e5, 300],
        [5e5, 320],
        [2e6, 400],
      ] as const) {
        const [cubic, gerg, reduced] = byBoth(name, p, T);
        expect(Math.abs(cubic / gerg - 1), `${name}, ${p} Pa, ${T} K`).toBeLessThan(reduced < 1.3 ? 0.1 : 0.26);
      }
  });

  it('stands in the state of every gas by its name', () => {
    for (const { name } of otherGases) {
      const { jouleThomson = Number.NaN } = solved(name, at(1e5, 400));
      expect(jouleThomson, name)[name === 'neon' ? 'toBeLessThan' : 'toBeGreaterThan'](0); // neon warms above 230 K
    }
  });
});
