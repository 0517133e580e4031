/** Viscosity of gases: the laws that it keeps whatever the mixture, and where it says that it does not know. */
import { describe, expect, it } from 'vitest';
import { references } from '../../../src/core/fluid/gas-viscosity/pure.ts';
import {
  gasViscosity,
  schemeOf,
  viscosityBasis,
  viscosityCautions,
} from '../../../src/core/fluid/gas-viscosity/viscosity.ts';
import { components } from '../../../src/core/fluid/helmholtz/components.table.ts';
import { as } from '../../../src/core/quantity/brand.ts';
import { seeded } from './seeded.ts';

const kelvin = (T: number) => as<'temperature'>(T);
const fractions = (named: Readonly<Record<string, number>>): readonly number[] =>
  components.map(({ name }) => named[name] ?? 0);

const natural = fractions({ methane: 0.9, ethane: 0.05, propane: 0.02, nitrogen: 0.02, 'carbon-dioxide': 0.01 });
const dryAir = fractions({ nitrogen: 0.7812, oxygen: 0.2096, argon: 0.0092 });

/** A mixture of all 21 components, drawn. */
function drawn(random: () => number): readonly number[] {
  const parts = components.map(() => random() ** 4);
  const sum = parts.reduce((total, part) => total + part, 0);
  return parts.map((part) => part / sum);
}

describe('the scheme of mixtures', () => {
  const seed = 19500517;
  it(`is positive and a number from 20 K to 3000 K, to 30 mol/dm3 (seed ${seed})`, () => {
    const random = seeded(seed);
    const wrong: string[] = [];
    for (let index = 0; index < 3000; index++) {
      const x = drawn(random);
      const T = kelvin(20 + 2980 * random());
      const rho = 30e3 * random() ** 3;
      const eta = gasViscosity(x, T, rho);
      if (!(eta > 0 && Number.isFinite(eta))) wrong.push(`${T} K, ${rho} mol/m3: ${eta}`);
    }
    expect(wrong).toEqual([]);
  });

  it('is the dilute mixture at no density, and comes to it without a step', () => {
    for (const x of [natural, dryAir, fractions({ helium: 1 })]) {
      const dilute = schemeOf(x, kelvin(300), 0);
      expect(schemeOf(x, kelvin(300), 1e-6) / dilute).toBeCloseTo(1, 9);
      expect(schemeOf(x, kelvin(300), 40) / dilute).toBeCloseTo(1, 2); // 1 bar
    }
  });

  it('rises with density, and of a dilute gas with temperature', () => {
    const etas = [0, 1e3, 2e3, 4e3, 8e3].map((rho) => schemeOf(natural, kelvin(300), rho));
    const hotter = [150, 200, 250, 300, 400, 600].map((T) => schemeOf(natural, kelvin(T), 0));
    for (const rising of [etas, hotter]) expect([...rising].sort((one, other) => one - other)).toEqual(rising);
  });

  it('has no step where a dilute gas leaves the range of its fit', () => {
    const lowest = [180, 200, 230, 240, 273.15];
    for (const [at, { name }] of components.entries())
      for (const T of lowest) {
        const alone = components.map((_, i) => (i === at ? 1 : 0));
        const [below, above] = [schemeOf(alone, kelvin(T - 1e-6), 0), schemeOf(alone, kelvin(T + 1e-6), 0)];
        expect(Math.abs(above / below - 1), `${name} at ${T} K`).toBeLessThan(1e-7);
      }
  });

  it('does not change with what is not there, and equals the pure gas for two shares of one', () => {
    const pair = fractions({ methane: 0.5, nitrogen: 0.5 });
    const with0 = pair.map((x) => (x === 0 ? 0 : x));
    expect(schemeOf(with0, kelvin(300), 100)).toBe(schemeOf(pair, kelvin(300), 100));
    // Isobutane and n-butane have one molar mass: their mixture lies between them.
    const [iso, normal] = ['isobutane', 'n-butane'].map((name) => schemeOf(fractions({ [name]: 1 }), kelvin(350), 0));
    const mixed = schemeOf(fractions({ isobutane: 0.5, 'n-butane': 0.5 }), kelvin(350), 0);
    expect(mixed).toBeGreaterThan(Math.min(iso ?? 0, normal ?? 0));
    expect(mixed).toBeLessThan(Math.max(iso ?? 0, normal ?? 0));
  });
});

describe('the choice between reference and scheme', () => {
  const methodOf = (x: readonly number[], T = 300, rho = 40) => viscosityBasis(x, kelvin(T), rho).method;

  it('takes the reference of a pure gas and of dry air', () => {
    for (const name of Object.keys(references).filter((gas) => gas !== 'air'))
      expect(methodOf(fractions({ [name]: 1 }), 400), name).toBe('reference');
    expect(methodOf(dryAir)).toBe('reference');
    expect(methodOf(fractions({ nitrogen: 0.9992, methane: 0.0008 }))).toBe('reference');
    expect(methodOf(natural)).toBe('scheme');
    expect(methodOf(fractions({ methane: 1 }))).toBe('scheme');
    expect(methodOf(fractions({ nitrogen: 0.79, oxygen: 0.21 }))).toBe('scheme');
  });

  it('leaves the reference outside its range, and is then within its own uncertainty', () => {
    expect(methodOf(fractions({ ethane: 1 }), 700)).toBe('scheme');
    expect(methodOf(fractions({ propane: 1 }), 300, 20e3)).toBe('scheme');
    for (const name of ['nitrogen', 'oxygen', 'argon', 'hydrogen', 'carbon-dioxide', 'ethane'] as const) {
      const x = fractions({ [name]: 1 });
      const reference = gasViscosity(x, kelvin(350), 100);
      expect(Math.abs(schemeOf(x, kelvin(350), 100) / reference - 1), name).toBeLessThan(0.02);
    }
  });

  it('says how well it knows: 3 % for light gases to 12 MPa, 10 % for the rest', () => {
    expect(viscosityBasis(natural, kelvin(300), 5e3).uncertainty).toBe(0.03);
    expect(viscosityBasis(natural, kelvin(300), 9e3).uncertainty).toBe(0.1);
    expect(viscosityBasis(fractions({ methane: 0.5, propane: 0.5 }), kelvin(300), 40).uncertainty).toBe(0.1);
    expect(viscosityBasis(dryAir, kelvin(300), 40).uncertainty).toBe(0.02);
  });

  it('warns of a temperature outside the fits of what counts in the mixture', () => {
    const cautions = (x: readonly number[], T: number) =>
      viscosityCautions(viscosityBasis(x, kelvin(T), 40), kelvin(T)).map(({ id, limit }) => ({ id, ...limit }));
    expect(cautions(natural, 300)).toEqual([]);
    expect(cautions(natural, 190)).toEqual([{ id: 'viscosity-range-temperature', min: 200, max: 700 }]);
    expect(cautions(fractions({ methane: 0.995, 'n-decane': 0.005 }), 230)).toEqual([]);
  });
});
