/** What the vectors of air, of the standard atmosphere, of gravity and of gauge liquids put to the test. */
import { airState } from '../../../src/core/fluid/air/air.ts';
import { R } from '../../../src/core/fluid/air/cipm.table.ts';
import { molarMassOfDryAir } from '../../../src/core/fluid/air/cipm.ts';
import type { Moisture } from '../../../src/core/fluid/air/moisture.ts';
import { gaugeWaterDensity, mercuryDensity } from '../../../src/core/fluid/gauge-liquid.ts';
import { mixtureOf } from '../../../src/core/fluid/gerg/mixture.ts';
import { componentNames } from '../../../src/core/fluid/helmholtz/components.ts';
import { gasDensity } from '../../../src/core/fluid/helmholtz/density.ts';
import { isothermOf } from '../../../src/core/fluid/helmholtz/isotherm.ts';
import { as } from '../../../src/core/quantity/brand.ts';
import { grs80, normalGravity, standardAtmosphere, wgs84 } from '../../../src/core/quantity/place.ts';

type Given = Record<string, number | string>;
type Subject = (given: Given) => Record<string, number>;

const figure = (given: Given, name: string): number => {
  const value = given[name];
  if (typeof value !== 'number') throw new Error(`expected a number ${name}, got ${value}`);
  return value;
};

function moistureOf(given: Given): Moisture | undefined {
  if (given.relativeHumidity !== undefined) return { by: 'relativeHumidity', h: figure(given, 'relativeHumidity') };
  if (given.dewPoint !== undefined) return { by: 'dewPoint', temperature: as(figure(given, 'dewPoint')) };
  return given.wetBulb === undefined ? undefined : { by: 'wetBulb', temperature: as(figure(given, 'wetBulb')) };
}

/** Air at T in K and p in kPa. */
const air: Subject = (given) => {
  const state = {
    pressure: as<'absolute pressure'>(figure(given, 'p') * 1e3),
    temperature: as<'temperature'>(figure(given, 'T')),
  };
  const paths = { pressure: 'p', temperature: 'T', own: (name: string) => name };
  const found = airState(moistureOf(given), { ...state, base: state, paths });
  if (!found.ok) throw new Error(`expected a state, got ${JSON.stringify(found.problems)}`);
  const { density, isentropicExponent = 0, speedOfSound = 0, viscosity, working } = found.value;
  const x = working.find(({ id }) => id === 'water-fraction')?.value ?? 0;
  return { rho: density, kappa: isentropicExponent, w: speedOfSound, mu: viscosity * 1e6, x };
};

/** Every figure under the name of its order of magnitude, whose digits its table prints. */
const atmosphere: Subject = (given) => {
  const found = standardAtmosphere(figure(given, 'z'), 'altitude');
  if (!found.ok) throw new Error(`expected an atmosphere, got ${JSON.stringify(found.problems)}`);
  const { temperature: T, pressure: p, density: rho, speedOfSound: c, viscosity } = found.value;
  const figures = { T, p, rho, c, mu: viscosity * 1e6 };
  return Object.fromEntries(
    Object.entries(figures).map(([name, value]) => [`${name}, 1e${Math.floor(Math.log10(value))}`, value]),
  );
};

const gravity: Subject = (given) => {
  const ellipsoid = given.ellipsoid === 'wgs84' ? wgs84 : grs80;
  const g = normalGravity((figure(given, 'latitude') * Math.PI) / 180, Number(given.height ?? 0), ellipsoid);
  return { g, gNineDecimals: g };
};

/** Compressibility factor of a mixture whose mole fractions are first brought to a sum of 1. */
const compressibility: Subject = (given) => {
  const named = componentNames.map((name) => Number(given[name] ?? 0));
  const sum = named.reduce((total, x) => total + x, 0);
  const isotherm = isothermOf(mixtureOf(named.map((x) => x / sum)), figure(given, 'T'));
  const p = figure(given, 'p') * 1e3;
  const rho = gasDensity(isotherm, p);
  if (rho === undefined) throw new Error('expected a density, got none');
  return { Z: p / (rho * isotherm.RT) };
};

const celsius = (given: Given) => as<'temperature'>(figure(given, 't') + 273.15);

const oldLitre = 1.000028; // 1 mL (1901) in cm3

export const subjects: Readonly<Record<string, Subject>> = {
  air,
  'standard-atmosphere': atmosphere,
  'normal-gravity': gravity,
  'mixture-compressibility': compressibility,
  'cipm-factors': () => {
    const factor = (1e3 * molarMassOfDryAir()) / R;
    return { factor, perCarbonDioxide: (1e3 * molarMassOfDryAir(1.0004)) / R - factor };
  },
  'gauge-water': (given) => ({ rho: gaugeWaterDensity(celsius(given)) }),
  'gauge-mercury': (given) => {
    const rho = mercuryDensity(celsius(given));
    return { rho, volume: 1e3 / rho / oldLitre };
  },
  'liquid-column': (given) => {
    const rho = (given.liquid === 'mercury' ? mercuryDensity : gaugeWaterDensity)(celsius(given));
    const pressure = rho * 9.80665 * figure(given, 'height');
    return { pressureTwo: pressure, pressureThree: pressure };
  },
};
