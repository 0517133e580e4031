/** A fluid whose figures are stated, and the reading of any fluid from the document. */
import { describe, expect, it } from 'vitest';
import type { FluidText } from '../../../src/core/document/project.ts';
import { stateOf } from '../../../src/core/fluid/state.ts';
import { as } from '../../../src/core/quantity/brand.ts';

const upstream = { pressure: as<'absolute pressure'>(1.5e6), temperature: as<'temperature'>(290) };
const base = { pressure: as<'absolute pressure'>(101325), temperature: as<'temperature'>(288.15) };
const atmosphere = as<'absolute pressure'>(101325);

const read = (fluid: unknown, field?: string) => stateOf(fluid as FluidText, upstream, base, atmosphere, field);

function solved(fluid: FluidText) {
  const state = read(fluid);
  if (!state.ok) throw new Error(`expected a state, got ${JSON.stringify(state.problems)}`);
  return state.value;
}

const problems = (fluid: unknown, field?: string) => {
  const state = read(fluid, field);
  return state.ok ? [] : state.problems.map(({ code, field: place }) => `${code} ${place}`);
};

const oil: FluidText = { kind: 'stated', density: '850 kg/m3', viscosity: '8 mPa.s' };
const gas: FluidText = { kind: 'stated', density: '11.2 kg/m3', viscosity: '0.011 mPa.s', isentropicExponent: '1.31' };

describe('a stated liquid', () => {
  it('does not expand and has no base density of its own', () => {
    const state = solved(oil);
    expect(state).toMatchObject({ density: 850, viscosity: 0.008, phase: 'liquid', expands: false });
    for (const missing of ['isentropicExponent', 'baseDensity', 'compressibility', 'speedOfSound', 'vapourPressure'])
      expect(state).not.toHaveProperty(missing);
  });

  it('takes a kinematic viscosity times its density', () => {
    const state = solved({ ...oil, viscosity: '10 mm2/s' });
    expect(state.viscosity).toBeCloseTo(850 * 10e-6, 15);
    expect(state.working.find(({ id }) => id === 'viscosity')?.formula).toBe('ρ_1 * ν_1');
    expect(state.sources.viscosity.seen).toBe('derived');
  });

  it('takes a vapour pressure and a base density', () => {
    const state = solved({ ...oil, vapourPressure: '0.2 bar(g)', baseDensity: '860 kg/m3' });
    expect(state.vapourPressure).toBeCloseTo(121325, 9);
    expect(state.baseDensity).toBe(860);
    expect(state.sources.baseDensity?.clause).toBe('stated by the user');
    expect(solved({ ...oil, vapourPressure: '-50 kPa(g)' }).vapourPressure).toBeCloseTo(51325, 9);
  });

  it('has no base density from a molar mass', () => {
    expect(solved({ ...oil, molarMass: '120 g/mol' })).not.toHaveProperty('baseDensity');
  });
});

describe('a stated gas', () => {
  it('expands, with the speed of sound that its exponent means', () => {
    const state = solved(gas);
    expect(state).toMatchObject({ phase: 'gas', expands: true, isentropicExponent: 1.31 });
    expect(state.speedOfSound).toBeCloseTo(Math.sqrt((1.31 * 1.5e6) / 11.2), 9);
    expect(state).not.toHaveProperty('baseDensity');
  });

  it('gets its base density and compressibility from its molar mass', () => {
    const state = solved({ ...gas, molarMass: '16.9 g/mol' });
    // ISO 13443: the molar volume of an ideal gas at 15 degC and 101.325 kPa is 23.64 L/mol.
    expect(state.baseDensity).toBeCloseTo(16.9 / 23.6445, 4);
    expect(state.compressibility).toBeCloseTo((1.5e6 * 0.0169) / (11.2 * 8.314462618 * 290), 9);
    expect(state.sources.baseDensity?.clause).toContain('Z_b = 1');
  });

  it('keeps what is stated before what follows', () => {
    const state = solved({ ...gas, molarMass: '16.9 g/mol', baseDensity: '0.72 kg/m3', compressibility: 0.97 });
    expect(state.baseDensity).toBe(0.72);
    expect(state.compressibility).toBe(0.97);
    expect(state.working.every(({ formula, given }) => formula !== undefined || given.length === 0)).toBe(true);
  });

  it('refuses an exponent or a compressibility that no gas has', () => {
    const exponent = (isentropicExponent: string | number) => problems({ ...gas, isentropicExponent });
    expect(exponent(1.05)).toEqual([]);
    expect(exponent(0.8)).toEqual([]);
    expect(exponent(131)).toEqual(['isentropic-exponent-implausible fluid.isentropicExponent']);
    expect(exponent(0.1)).toEqual(['isentropic-exponent-implausible fluid.isentropicExponent']);
    expect(exponent(0)).toEqual(['not-positive fluid.isentropicExponent']);
    expect(exponent(-1.3)).toEqual(['not-positive fluid.isentropicExponent']);
    expect(exponent(Number.NaN)).toEqual(['number-unreadable fluid.isentropicExponent']);
    expect(exponent('1,3')).toEqual(['number-unreadable fluid.isentropicExponent']);
    expect(problems({ ...gas, compressibility: 97 })).toEqual(['compressibility-implausible fluid.compressibility']);
  });
});

describe('the working of a stated fluid', () => {
  it('names every symbol of its formulas', () => {
    const state = solved({ ...gas, viscosity: '1 mm2/s', molarMass: '16.9 g/mol' });
    const formulas = state.working.filter(({ formula }) => formula !== undefined);
    expect(formulas.map(({ id }) => id)).toEqual(['viscosity', 'speedOfSound', 'compressibility', 'baseDensity']);
    for (const { formula = '', given } of formulas) {
      const symbols = new Set(formula.replace('sqrt', '').match(/[\p{L}_]\w*/gu));
      expect(symbols).toEqual(new Set(given.map(({ symbol }) => symbol)));
    }
  });
});

describe('the fluid of the document', () => {
  it('must have a kind that is offered', () => {
    expect(problems({})).toEqual(['field-missing fluid.kind']);
    expect(problems({ kind: '' })).toEqual(['field-missing fluid.kind']);
    expect(problems({ kind: 7 })).toEqual(['text-expected fluid.kind']);
    expect(problems({ kind: 'treacle' })).toEqual(['fluid-unknown fluid.kind']);
  });

  it('is refused with every trouble at once, at its place', () => {
    expect(problems({ kind: 'stated', density: 850, isentropicExponent: true }, 'meters.2.fluid')).toEqual([
      'text-expected meters.2.fluid.density',
      'field-missing meters.2.fluid.viscosity',
      'number-expected meters.2.fluid.isentropicExponent',
    ]);
  });

  it('must have figures above zero in a unit of their own', () => {
    expect(problems({ ...oil, density: '0 kg/m3' })).toEqual(['not-positive fluid.density']);
    expect(problems({ ...oil, density: '-850 kg/m3' })).toEqual(['not-positive fluid.density']);
    expect(problems({ ...oil, vapourPressure: '-2 bar(g)' })).toEqual(['not-positive fluid.vapourPressure']);
    expect(problems({ ...oil, density: '850 kg' })).toHaveLength(1);
    expect(problems({ ...oil, vapourPressure: '0.2 bar' })).toHaveLength(1);
  });
});
