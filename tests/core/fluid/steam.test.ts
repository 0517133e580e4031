/** Steam and water on the saturation line, wet steam, and figures put in by hand. */
import { describe, expect, it } from 'vitest';
import { evaluate } from '../../../src/views/present/evaluate.ts';
import { parseFormula } from '../../../src/views/present/formula.ts';
import { remarks } from '../../../src/views/words/notes.ts';
import { refusal as meterRefusal, solved as meterSolved, steam } from '../sample.ts';
import { cautions, liquid, problems, solved } from './liquid-sample.ts';
import { seeded } from './seeded.ts';

const off = (got: number | undefined, truth: number) => Math.abs((got ?? Number.NaN) / truth - 1);
const water = (more: object = {}) => ({ kind: 'water', ...more });

describe('one figure gives the other', () => {
  it.each([
    // IAPWS R7-97(2012), Tables 36 and 35.
    [0.1e6, 372.755919],
    [1e6, 453.035632],
    [10e6, 584.149488],
  ])('steam at %d Pa', (p, T) => {
    const vapour = solved(water({ phase: 'vapour' }), p);
    expect(off(vapour.temperature, T)).toBeLessThan(1.4e-9); // printed to 9 digits
    expect(vapour).toMatchObject({ phase: 'vapour', expands: true, pressure: p });
    expect(solved(water({ phase: 'liquid' }), p)).toMatchObject({ phase: 'liquid', temperature: vapour.temperature });
  });
  it.each([
    [500, 2.63889776e6],
    [600, 12.3443146e6],
  ])('steam at %d K', (T, p) => {
    const state = solved(water({ phase: 'vapour' }), undefined, T - 273.15);
    expect(off(state.pressure, p)).toBeLessThan(1e-8);
    expect(off(state.vapourPressure, p)).toBeLessThan(1e-8);
  });
  it('only where the phase says on which side', () => {
    expect(problems(water(), 1e6)).toEqual(['field-missing upstream.temperature']);
    expect(problems(water(), undefined, 100)).toEqual(['field-missing upstream.pressure']);
    expect(problems(water({ phase: 'vapour' }))).toEqual([
      'field-missing upstream.pressure',
      'field-missing upstream.temperature',
    ]);
    expect(problems(water({ phase: 'vapour' }), 30e6)).toEqual(['no-saturation-pressure upstream.pressure']);
    expect(problems(water({ phase: 'vapour' }), 100)).toEqual(['no-saturation-pressure upstream.pressure']);
    expect(problems(water({ quality: 0.9 }), undefined, 400)).toEqual([
      'no-saturation-temperature upstream.temperature',
    ]);
  });
  it('and no other fluid does without both', () => {
    expect(problems(liquid('methanol'), 1e6)).toEqual(['field-missing upstream.temperature']);
    const stated = { kind: 'stated', density: '850 kg/m3', viscosity: '8 cP' };
    expect(problems(stated, undefined, 20)).toEqual(['field-missing upstream.pressure']);
  });
});

describe('wet steam', () => {
  it('has the density of both phases by mass', () => {
    // International Steam Tables (Wagner and Kretzschmar), 1 MPa: v' = 0.00112723, v'' = 0.194349 m3/kg.
    for (const x of [0.8, 0.95, 0.999]) {
      const state = solved(water({ quality: x }), 1e6);
      expect(off(state.density, 1 / ((1 - x) * 0.00112723 + x * 0.194349))).toBeLessThan(1e-5);
      expect(state).toMatchObject({ phase: 'vapour', expands: true, quality: x });
    }
    expect(solved(water({ quality: '95 %' }), 1e6).density).toBe(solved(water({ quality: 0.95 }), 1e6).density);
  });
  it('keeps exponent and viscosity of the dry vapour, and says so', () => {
    const wet = solved(water({ quality: '90 %' }), 1e6);
    const dry = solved(water({ phase: 'vapour' }), 1e6);
    expect(wet.isentropicExponent).toBe(dry.isentropicExponent);
    expect(wet.viscosity).toBe(dry.viscosity);
    expect(wet.cautions).toMatchObject([
      { id: 'wet-steam', verdict: 'caution', value: 90, unit: '%', limit: { min: 100 } },
    ]);
    expect(wet).not.toHaveProperty('speedOfSound');
    expect(wet).not.toHaveProperty('compressibility');
    expect(cautions(solved(water({ quality: 1 }), 1e6))).toEqual([]);
  });
  it('is given by temperature too, or by both where they agree', () => {
    expect(off(solved(water({ quality: 0.9 }), undefined, 179.886).pressure, 1e6)).toBeLessThan(1e-4);
    expect(solved(water({ quality: 0.9 }), 1e6, 181).temperature).toBeCloseTo(453.035632, 5);
    expect(problems(water({ quality: 0.9 }), 1e6, 190)).toEqual(['wet-steam-off-line upstream.temperature']);
  });
  it('is no liquid', () => {
    expect(problems(water({ quality: 0 }), 1e6)).toEqual(['quality-of-liquid fluid.quality']);
    expect(problems(water({ quality: 0.9, phase: 'liquid' }), 1e6)).toEqual(['quality-of-liquid fluid.quality']);
    expect(problems(water({ quality: '101 %' }), 1e6)).toEqual(['share-out-of-range fluid.quality']);
    expect(problems(water({ quality: -0.1 }), 1e6)).toEqual(['share-out-of-range fluid.quality']);
    expect(problems(water({ quality: {} }), 1e6)).toEqual(['number-expected fluid.quality']);
  });
  it('grows denser as it grows wetter, and its working gives its figures', () => {
    const states = [1, 0.99, 0.9, 0.7, 0.4, 0.1].map((quality) => solved(water({ quality }), 2e6));
    for (const [index, state] of states.entries()) {
      expect(state.density).toBeGreaterThan(states[index - 1]?.density ?? 0);
      for (const { formula, given, value, remark } of state.working) {
        if (remark !== undefined) expect(remarks).toHaveProperty(remark);
        if (formula === undefined) continue;
        const put = evaluate(parseFormula(formula), Object.fromEntries(given.map((one) => [one.symbol, one.value])));
        expect(off(put, value)).toBeLessThan(1e-12);
      }
    }
  });
  it('is metered: the metal grows to the temperature that was found', () => {
    const { temperature: _, ...upstream } = steam.upstream ?? {};
    const meter = {
      ...steam,
      upstream,
      pipe: { ...steam.pipe, material: 'carbon-steel' },
      fluid: water({ quality: '97 %' }),
    };
    const result = meterSolved(meter);
    expect(result.state.temperature_K).toBeCloseTo(523.5, 0); // 40.013 bar(a)
    expect(result.state.quality).toBe(0.97);
    expect(result.pipe_m).toBeGreaterThan(result.pipeAsMeasured_m);
    expect(result.checks.filter(({ id }) => id === 'wet-steam' || id === 'superheat')).toMatchObject([
      { id: 'wet-steam', verdict: 'caution' },
    ]);
    expect(meterRefusal({ ...meter, fluid: water() })).toEqual(['field-missing at upstream.temperature']);
  });
  it('answers 5,000 random states with numbers or a reason', () => {
    const random = seeded(97);
    let found = 0;
    for (let k = 0; k < 5000; k++) {
      const quality = 1.2 * random() - 0.1;
      const p = random() < 0.5 ? 10 ** (1 + 7 * random()) : undefined;
      const t = p === undefined || random() < 0.2 ? -50 + 500 * random() : undefined;
      const refused = problems(water({ quality }), p, t);
      if (refused.length > 0) continue;
      found++;
      const figures = Object.values(solved(water({ quality }), p, t)).filter((value) => typeof value === 'number');
      expect(
        figures.every((value) => Number.isFinite(value) && value > 0),
        `${quality} ${p} ${t}`,
      ).toBe(true);
    }
    expect(found).toBeGreaterThan(500); // of 5000 states
  });
});

describe('a figure put in by hand', () => {
  const gas = water({ override: { density: '5 kg/m3', isentropicExponent: 1.3 } });
  it('takes the place of the model, and the rest stays', () => {
    const plain = solved(water(), 1e6, 200);
    const state = solved(gas, 1e6, 200);
    expect(state).toMatchObject({ density: 5, isentropicExponent: 1.3, viscosity: plain.viscosity });
    expect(state.overridden).toEqual(['density', 'isentropicExponent']);
    expect(state.sources.density).toEqual({ clause: 'stated by the user', seen: 'practice' });
    expect(state.sources.viscosity).toEqual(plain.sources.viscosity);
    expect(plain).not.toHaveProperty('overridden');
  });
  it('takes what follows from it with it', () => {
    const state = solved(gas, 1e6, 200);
    expect(state).not.toHaveProperty('compressibility');
    expect(state).not.toHaveProperty('speedOfSound');
    expect(state.working.map(({ id }) => id)).not.toContain('speedOfSound');
    expect(state.uncertainties).not.toHaveProperty('density');
    expect(state.working.find(({ id }) => id === 'density')).toMatchObject({ remark: 'override', value: 5, given: [] });
    expect(remarks).toHaveProperty('override');
  });
  it('a kinematic viscosity stands on the density that holds', () => {
    const both = { density: '800 kg/m3', viscosity: '2 cSt' };
    expect(solved(liquid('methanol', { override: both }), 1e5, 20).viscosity).toBeCloseTo(0.0016, 15);
  });
  it('a vapour pressure may be new to the state, and feeds flashing', () => {
    const acid = liquid('nitric-acid-solution', { concentration: '20 %', override: { vapourPressure: '40 mbar(a)' } });
    const state = solved(acid, 1e5, 20);
    expect(state.vapourPressure).toBe(4000);
    expect(state.working.at(-1)).toMatchObject({ id: 'vapourPressure', remark: 'override' });
  });
  it('is refused where it is of no use or cannot be read', () => {
    const of = (override: unknown) => problems(liquid('methanol', { override }), 1e5, 20);
    expect(of({ isentropicExponent: 1.3 })).toEqual(['override-unused fluid.override.isentropicExponent']);
    expect(of({ density: '800' })).toEqual(['unit-missing fluid.override.density']);
    expect(of({ density: 800 })).toEqual(['text-expected fluid.override.density']);
    expect(of('800 kg/m3')).toEqual(['group-expected fluid.override']);
    expect(of([])).toEqual(['group-expected fluid.override']);
    expect(of(null)).toEqual(['group-expected fluid.override']);
    expect(of({})).toEqual([]);
    expect(problems(water({ override: { isentropicExponent: 99 } }), 1e6, 200)).toEqual([
      'isentropic-exponent-implausible fluid.override.isentropicExponent',
    ]);
    expect(problems(water({ override: { vapourPressure: '1 bar(a)' } }), 1e6, 200)).toEqual([
      'override-unused fluid.override.vapourPressure',
    ]);
  });
  it('stands in the record of the meter', () => {
    const result = meterSolved({ ...steam, fluid: water({ override: { density: '13 kg/m3' } }) });
    expect(result.state).toMatchObject({ density_kg_m3: 13, overridden: ['density'] });
  });
});
