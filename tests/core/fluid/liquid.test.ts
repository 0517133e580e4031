/** Liquids by name. Their figures are judged by the vectors of tests/vectors/liquids as well. */
import { describe, expect, it } from 'vitest';
import { liquidFamilies, liquidNames } from '../../../src/core/fluid/liquid/names.ts';
import { evaluate } from '../../../src/views/present/evaluate.ts';
import { parseFormula } from '../../../src/views/present/formula.ts';
import { remarks } from '../../../src/views/words/notes.ts';
import { atmosphere, cautions, liquid, problems, solved } from './liquid-sample.ts';
import { seeded } from './seeded.ts';

const bar = 1e5;
const off = (got: number | undefined, truth: number) => Math.abs((got ?? Number.NaN) / truth - 1);

describe('pure liquids', () => {
  it.each([
    // Normal boiling points, CRC Handbook: there the vapour pressure is one atmosphere.
    ['methanol', 64.6],
    ['ethanol', 78.29],
    ['acetone', 56.08],
    ['benzene', 80.09],
    ['toluene', 110.63],
    ['hexane', 68.72],
    ['octane', 125.67],
    ['ammonia', -33.33],
    ['propane', -42.11],
    ['butane', -0.5],
    ['chlorine', -34.04],
  ])('%s boils at %d degC under one atmosphere', (name, t) => {
    expect(off(solved(liquid(name), 100 * bar, t).vapourPressure, 101325)).toBeLessThan(0.01);
  });

  it.each([
    // Saturated liquid at 20 degC, reference equations of state as the NIST Chemistry WebBook gives them.
    ['propane', 8.365 * bar, 500.06],
    ['butane', 2.0765 * bar, 578.97],
    ['ammonia', 8.5748 * bar, 610.2],
  ])('%s at 20 degC and its saturation has the density of the reference equation within 1 %%', (name, p, rho) => {
    const state = solved(liquid(name), p, 20);
    expect(off(state.density, rho)).toBeLessThan(0.01);
    expect(off(state.vapourPressure, p)).toBeLessThan(0.01);
  });

  it('grow lighter with temperature and denser with pressure, and their vapour pressure rises', () => {
    for (const name of liquidFamilies.pure) {
      const states = [300, 305, 310].flatMap((T) => {
        if (problems(liquid(name, { viscosity: '1 cP' }), 80 * bar, T - 273.15).length > 0) return [];
        return [solved(liquid(name, { viscosity: '1 cP' }), 80 * bar, T - 273.15)];
      });
      for (const [index, state] of states.entries()) {
        const before = states[index - 1];
        if (before === undefined) continue;
        expect(state.density, name).toBeLessThan(before.density);
        expect(state.vapourPressure, name).toBeGreaterThan(before.vapourPressure as number);
      }
    }
    const pressures = [1, 10, 100, 500].map((p) => solved(liquid('toluene'), p * bar, 20).density);
    expect(pressures).toEqual([...pressures].sort((one, other) => one - other));
    expect(new Set(pressures).size).toBe(4);
  });

  it('are refused below freezing, above the critical point, and where they would be vapour', () => {
    expect(problems(liquid('benzene'), bar, 4)).toEqual(['liquid-density-out-of-range upstream.temperature']);
    expect(problems(liquid('ethylene', { viscosity: '0.1 cP' }), 60 * bar, 20)).toEqual([
      'liquid-density-out-of-range upstream.temperature',
    ]);
    expect(problems(liquid('propane'), bar, 20)).toEqual(['liquid-boils upstream.pressure']);
    expect(problems(liquid('propane'), 8 * bar, 20)).toEqual([]); // within the doubt of the vapour pressure
  });

  it('ask for a viscosity where theirs is not known, and say so within 10 K', () => {
    expect(problems(liquid('methanol'), 20 * bar, 70)).toEqual([]);
    expect(cautions(solved(liquid('methanol'), 20 * bar, 70))).toEqual(['liquid-viscosity-range']);
    expect(problems(liquid('methanol'), 20 * bar, 80)).toEqual(['liquid-viscosity-out-of-range upstream.temperature']);
    const state = solved(liquid('methanol', { viscosity: '0.3 mPa.s' }), 20 * bar, 80);
    expect(state.viscosity).toBeCloseTo(0.3e-3, 15);
    expect(cautions(state)).toEqual([]);
    expect(state.sources.viscosity.clause).toBe('stated by the user');
  });

  it('do not expand, and have a density at the base state', () => {
    const state = solved(liquid('ethanol'), 5 * bar, 40);
    expect(state).toMatchObject({ phase: 'liquid', expands: false });
    expect(state).not.toHaveProperty('isentropicExponent');
    expect(state.baseDensity).toBeCloseTo(solved(liquid('ethanol'), atmosphere, 15).density, 10);
  });

  it('take the bulk modulus that is stated', () => {
    const typical = solved(liquid('acetone'), 100 * bar, 20);
    const stiff = solved(liquid('acetone', { bulkModulus: '1e12 Pa' }), 100 * bar, 20);
    expect(typical.density / stiff.density - 1).toBeCloseTo((100 * bar) / 1e9, 4);
    expect(problems(liquid('acetone'), 2e9, 20)).toEqual(['liquid-pressure-too-high upstream.pressure']);
  });
});

describe('mixtures and solutions', () => {
  const glycol = (concentration: unknown, more = {}) => liquid('ethylene-glycol-water', { concentration, ...more });

  it('read a concentration as per cent or as a fraction', () => {
    expect(solved(glycol('30 %'), bar, 20).density).toBe(solved(glycol(0.3), bar, 20).density);
    expect(problems(glycol('130 %'), bar, 20)).toEqual(['share-out-of-range fluid.concentration']);
    expect(problems(glycol(30), bar, 20)).toEqual(['share-out-of-range fluid.concentration']);
    expect(problems(glycol('30 mm'), bar, 20)).toEqual(['number-unreadable fluid.concentration']);
    expect(problems(glycol(undefined), bar, 20)).toEqual(['field-missing fluid.concentration']);
    expect(problems(glycol('61 %'), bar, 20)).toEqual(['concentration-out-of-range fluid.concentration']);
  });

  it('are refused where they freeze', () => {
    // ASHRAE Handbook, Fundamentals: 30 % of ethylene glycol by mass freezes at -14.1 degC.
    expect(problems(glycol('30 %'), bar, -13.5)).toEqual([]);
    expect(problems(glycol('30 %'), bar, -15)).toEqual(['liquid-density-out-of-range upstream.temperature']);
  });

  it('with inhibitors are known by mass and by volume', () => {
    const inhibited = (more: object) => solved(liquid('propylene-glycol-water-inhibited', more), bar, 20);
    const byVolume = inhibited({ concentration: '30 %', concentrationBasis: 'volume' });
    expect(byVolume.density).toBeCloseTo(inhibited({ concentration: '30.6 %' }).density, 1);
    expect(problems(glycol('30 %', { concentrationBasis: 'volume' }), bar, 20)).toEqual([
      'concentration-basis fluid.concentrationBasis',
    ]);
    const suspect = solved(
      liquid('ethylene-glycol-water-inhibited', { concentration: 0.1, concentrationBasis: 'volume' }),
      atmosphere,
      30,
    );
    expect(suspect.density).toBeCloseTo((1011.69 + 1008.02) / 2, 9); // between its neighbours at 25 and 35 degC
  });

  it('fall back to water as the solute goes', () => {
    // IAPWS R7-97: water at 20 degC and 1 atm.
    for (const name of liquidFamilies.solution)
      expect(
        off(solved(liquid(name, { concentration: 0, viscosity: '1 cP' }), atmosphere, 20).density, 998.207),
      ).toBeLessThan(1e-5);
  });

  it('say that strong caustic soda is doubtful', () => {
    const soda = (concentration: string) => solved(liquid('caustic soda', { concentration }), bar, 25);
    expect(cautions(soda('40 %'))).toEqual([]);
    expect(cautions(soda('45 %'))).toEqual(['caustic-strong']);
  });

  it('have the vapour pressure of water as a bound where the solute stays', () => {
    // IAPWS R7-97, Table 35: 3.53658941e-3 MPa at 300 K.
    const brine = solved(liquid('sodium-chloride-solution', { concentration: '10 %' }), bar, 26.85);
    expect(off(brine.vapourPressure, 3536.58941)).toBeLessThan(1e-8);
    expect(brine.sources.vapourPressure?.seen).toBe('derived');
    const acid = solved(liquid('hydrochloric-acid-solution', { concentration: '10 %' }), bar, 26.85);
    expect(acid).not.toHaveProperty('vapourPressure');
  });

  it('refuse a concentration of what is no mixture', () => {
    expect(problems(liquid('methanol', { concentration: '50 %' }), bar, 20)).toEqual([
      'concentration-unused fluid.concentration',
    ]);
  });
});

describe('the name of a liquid', () => {
  it('is read as people write it', () => {
    for (const name of ['Methanol', ' METHANOL ', 'methanol']) expect(problems(liquid(name), bar, 20)).toEqual([]);
    for (const name of ['1,2-Propylene glycol', 'n-Heptane', 'NaOH', 'Methylethyl ketone', 'Caustic Soda'])
      expect(problems(liquid(name), bar, 20), name).not.toContain('fluid-name-unknown fluid.name');
    expect(liquidNames.get('ammonia')).toBe('ammonia');
  });
  it('must be of the list', () => {
    expect(problems(liquid('treacle'), bar, 20)).toEqual(['fluid-name-unknown fluid.name']);
    expect(problems({ kind: 'liquid', name: 7 }, bar, 20)).toEqual(['text-expected fluid.name']);
    expect(problems({ kind: 'liquid' }, bar, 20)).toEqual(['field-missing fluid.name']);
  });
  it('has 42 pure liquids, 14 mixtures, 13 solutions and 3 oils', () => {
    expect(Object.values(liquidFamilies).map((names) => names.length)).toEqual([42, 14, 13, 3]);
  });
});

it('the working of every liquid gives its figures, with remarks that have words', () => {
  const fluids = [
    liquid('toluene'),
    liquid('sodium-hydroxide-solution', { concentration: '20 %', baseDensity: '1200 kg/m3' }),
    liquid('glycerol-water', { concentration: '20 %', vapourPressure: '30 mbar(a)' }),
    liquid('crude-oil', { apiGravity: 33, viscosity: '8 cSt' }),
  ];
  for (const fluid of fluids) {
    const state = solved(fluid, 20 * bar, 30);
    for (const { formula, given, value, remark, id } of state.working) {
      if (remark !== undefined) expect(remarks, `${fluid.name} ${id}`).toHaveProperty(remark);
      if (formula === undefined) continue;
      const put = evaluate(parseFormula(formula), Object.fromEntries(given.map((one) => [one.symbol, one.value])));
      expect(off(put, value), `${fluid.name} ${id}`).toBeLessThan(1e-12);
    }
    expect(state.working.find(({ id }) => id === 'density')?.value).toBe(state.density);
  }
});

it('answers 20,000 random liquids in and out of range with numbers or a reason', () => {
  const random = seeded(20260);
  const names = Object.values(liquidFamilies).flat();
  const any = <Value>(values: readonly Value[]): Value => values[Math.floor(random() * values.length)] as Value;
  let refused = 0;
  for (let k = 0; k < 20_000; k++) {
    const name = any(names);
    const oil = liquidFamilies.petroleum.some((product) => product === name);
    const watery = !oil && !liquidFamilies.pure.includes(name);
    const fluid = liquid(name, {
      ...(watery ? { concentration: random() * any([0.1, 0.5, 1.1]) } : {}),
      ...(oil ? { densityAt15: `${500 + 800 * random()} kg/m3` } : {}),
      ...(any([true, false, oil]) ? { viscosity: '2 cSt' } : {}),
      ...(any([true, false, false]) ? { concentrationBasis: 'volume' } : {}),
    });
    const [p, t] = [10 ** (3 + 7 * random()), any([-120 + 500 * random(), 60 * random()])];
    const place = `${JSON.stringify(fluid)} at ${p} Pa, ${t} degC`;
    const refusal = problems(fluid, p, t);
    if (refusal.length > 0) {
      refused++;
      for (const reason of refusal) expect(reason, place).toMatch(/^[a-z0-9-]+ (fluid|upstream)\.\w+$/);
      continue;
    }
    const state = solved(fluid, p, t);
    const figures = Object.values(state).filter((value) => typeof value === 'number');
    expect(
      figures.every((value) => Number.isFinite(value) && value > 0),
      place,
    ).toBe(true);
    expect(state.density > 250 && state.density < 2500, `${place}: ${state.density}`).toBe(true);
  }
  expect(refused).toBeGreaterThan(2000);
  expect(refused).toBeLessThan(18_000);
});
