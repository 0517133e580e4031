/** Where the formulation of each figure holds: the bounds that the sources print. */
import { describe, expect, it } from 'vitest';
import { solved, steam, water } from '../sample.ts';

const ranges = (fluid: object, upstream: object) =>
  solved({ ...water, fluid, upstream, duty: { maximum: '0.5 t/h' }, find: 'differential' }).state.ranges;
const line = { pressure: '7 bar(g)', temperature: '20 degC' };
const gerg = { minTemperature_K: 250, maxTemperature_K: 450, maxPressure_Pa: 35e6 };
const methane = { kind: 'gas', composition: { methane: 1 } };

describe('the range of every figure', () => {
  it('of water and steam', () => {
    const industrial = { minTemperature_K: 273.15, maxTemperature_K: 1073.15, maxPressure_Pa: 100e6 };
    const expected = {
      density: industrial,
      viscosity: { ...industrial, maxTemperature_K: 1173.15 },
      isentropicExponent: industrial,
      vapourPressure: { minTemperature_K: 273.15, maxTemperature_K: 647.096 },
    };
    expect(solved(water).state.ranges).toMatchObject(expected);
    expect(solved(steam).state.ranges).toMatchObject(expected);
    const hot = ranges({ kind: 'water' }, { pressure: '7 bar(g)', temperature: '1000 degC' });
    expect(hot?.density).toEqual({ minTemperature_K: 1073.15, maxTemperature_K: 2273.15, maxPressure_Pa: 50e6 });
  });

  it('of a gas: that of the uncertainty it states, or the normal one', () => {
    expect(ranges(methane, line)).toMatchObject({ density: gerg, isentropicExponent: gerg, compressibility: gerg });
    const cold = ranges(methane, { pressure: '7 bar(g)', temperature: '-50 degC' });
    expect(cold?.density).toEqual({ minTemperature_K: 90, maxTemperature_K: 450, maxPressure_Pa: 35e6 });
    const detail = ranges({ ...methane, equation: 'aga8-detail' }, line);
    expect(detail?.density).toEqual({ minTemperature_K: 263, maxTemperature_K: 338, maxPressure_Pa: 12e6 });
    expect(ranges({ kind: 'gas', name: 'ammonia' }, line)?.density).not.toHaveProperty('maxPressure_Pa');
  });

  it('of air: the formula of metrology, or the mixture', () => {
    const formula = { minTemperature_K: 288.15, maxTemperature_K: 300.15, minPressure_Pa: 60e3, maxPressure_Pa: 110e3 };
    const near = ranges({ kind: 'air' }, { pressure: '0 bar(g)', temperature: '20 degC' });
    expect(near).toMatchObject({ density: formula, compressibility: formula, isentropicExponent: gerg });
    expect(ranges({ kind: 'air' }, line)).toMatchObject({ density: gerg, baseDensity: formula });
  });

  it('of a liquid: its tables', () => {
    const methanol = ranges({ kind: 'liquid', name: 'methanol' }, line);
    expect(methanol).toMatchObject({
      density: { minTemperature_K: 175.47, maxTemperature_K: 512.5 },
      viscosity: { minTemperature_K: 175.47, maxTemperature_K: 337.85 },
      vapourPressure: { minTemperature_K: 175.47, maxTemperature_K: 512.5 },
    });
  });

  it('of nothing that was stated', () => {
    const own = { kind: 'liquid', name: 'methanol', viscosity: '0.6 mPa.s', vapourPressure: '0.13 bar(a)' };
    expect(Object.keys(ranges(own, line) ?? {})).toEqual(['density', 'baseDensity']);
    expect(ranges({ kind: 'stated', density: '800 kg/m3', viscosity: '1 mPa.s' }, line)).toBeUndefined();
    const over = ranges({ ...methane, override: { density: '5 kg/m3' } }, line);
    expect(Object.keys(over ?? {})).toEqual(['viscosity', 'isentropicExponent', 'baseDensity']);
  });
});

describe('the working', () => {
  const ids = (meter: object) => solved(meter).working.map(({ id }) => id);

  it('of a liquid has no exponent and no compressibility factor', () => {
    expect(ids(water)).not.toContain('isentropicExponent');
    expect(ids(water)).not.toContain('compressibility');
    expect(ids(steam)).toContain('isentropicExponent');
    expect(solved(water).state.isentropicExponent).toBeGreaterThan(100); // the figure itself stays in the record
    const propane = { kind: 'gas', name: 'propane', phase: 'liquid' };
    const meter = { ...water, fluid: propane, upstream: { pressure: '20 bar(g)', temperature: '20 degC' } };
    expect(ids(meter)).not.toContain('compressibility');
  });

  it('says where a composition does not add up to 1', () => {
    const mixture = (nitrogen: number) => ({
      ...water,
      fluid: { kind: 'gas', composition: { methane: 0.95, nitrogen } },
      upstream: line,
      duty: { maximum: '3 t/h' },
      find: 'differential',
    });
    const line0 = solved(mixture(0.0496)).working[0];
    expect(line0).toMatchObject({ id: 'composition-sum', remark: 'composition-normalised' });
    expect(line0?.value).toBeCloseTo(0.9996, 12);
    expect(ids(mixture(0.05))).not.toContain('composition-sum');
    const on = { ...mixture(0.15), fluid: { ...mixture(0.15).fluid, normalise: true } };
    expect(solved(on).working[0]?.value).toBeCloseTo(1.1, 12);
  });
});
