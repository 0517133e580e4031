/** What the vectors of gas mixtures put to the test; units as the sources print them. */

import { splits } from '../../../src/core/fluid/cubic/stability.ts';
import { detailMixtureOf } from '../../../src/core/fluid/detail/mixture.ts';
import { compositionOf } from '../../../src/core/fluid/gas/composition.ts';
import { phaseSum } from '../../../src/core/fluid/gas/range.ts';
import { mixtureOf } from '../../../src/core/fluid/gerg/mixture.ts';
import { gasDensity, liquidDensity } from '../../../src/core/fluid/helmholtz/density.ts';
import { type Isotherm, isothermOf, pressureAt } from '../../../src/core/fluid/helmholtz/isotherm.ts';
import type { Mixture } from '../../../src/core/fluid/helmholtz/mixture.ts';
import { propertiesAt } from '../../../src/core/fluid/helmholtz/properties.ts';
import { energiesAt } from './gas-energy.ts';

type Given = Record<string, number | string>;
type Subject = (given: Given) => Record<string, number>;

const figure = (given: Given, name: string): number => {
  const value = given[name];
  if (typeof value !== 'number') throw new Error(`expected a number ${name}, got ${value}`);
  return value;
};

/** 'methane 0.9, nitrogen 0.1' as mole fractions of the components. */
function fractions(given: Given): readonly number[] {
  const written = String(given.x)
    .split(', ')
    .map((entry) => entry.split(' '))
    .map(([name = '', value]) => ({ name, value: Number(value) }));
  const read = compositionOf(written, 'mole', false, 'x');
  if (!read.ok) throw new Error(`expected a composition, got ${read.problems[0].code}`);
  return read.value;
}

type Equation = (x: readonly number[]) => Mixture;

const isotherm = (given: Given, equation: Equation): Isotherm =>
  isothermOf(equation(fractions(given)), figure(given, 'T'));

/** The gas root, and where p and T have none the liquid one: the sources print both kinds. */
function densityAt(along: Isotherm, p: number): number {
  const rho = gasDensity(along, p) ?? liquidDensity(along, p);
  if (rho === undefined) throw new Error(`expected a density at ${p} Pa, ${along.T} K, got none`);
  return rho;
}

function printed(along: Isotherm, rho: number): Record<string, number> {
  const found = propertiesAt(along, rho);
  return {
    p: found.pressure / 1e6,
    Z: found.compressibility,
    cv: found.isochoricHeatCapacity,
    cp: found.isobaricHeatCapacity,
    w: Math.sqrt(found.speedOfSoundSquared),
    density: rho * along.mixture.molarMass,
    JT: found.jouleThomson * 1e6,
  };
}

const atPressure =
  (equation: Equation): Subject =>
  (given) => {
    const along = isotherm(given, equation);
    const p = 'P' in given ? figure(given, 'P') * 1e3 : figure(given, 'p') * 1e6;
    return printed(along, densityAt(along, p));
  };

const atDensity =
  (equation: Equation): Subject =>
  (given) =>
    printed(isotherm(given, equation), figure(given, 'rho') * 1e3);

const example =
  (equation: Equation): Subject =>
  (given) => {
    const along = isotherm(given, equation);
    const rho = densityAt(along, figure(given, 'P0') * 1e3);
    const found = propertiesAt(along, rho);
    const energies = energiesAt(along, rho);
    const step = 1e-3 * rho;
    const slope = (steps: number): number => pressureAt(along, rho + steps * step).slope;
    return {
      M: along.mixture.molarMass * 1e3,
      D: rho / 1e3,
      P: found.pressure / 1e3,
      Z: found.compressibility,
      dPdD: found.slope,
      d2PdD2: (1e3 * (8 * (slope(1) - slope(-1)) - slope(2) + slope(-2))) / (12 * step), // five-point difference
      dPdT: found.thermal / 1e3,
      U: energies.internalEnergy,
      H: energies.enthalpy,
      S: energies.entropy,
      G: energies.gibbsEnergy,
      Cv: found.isochoricHeatCapacity,
      Cp: found.isobaricHeatCapacity,
      W: Math.sqrt(found.speedOfSoundSquared),
      JT: found.jouleThomson * 1e3,
      Kappa: found.isentropicExponent,
    };
  };

const poundForce = 6894.757293168361; // Pa, 1 lbf/in2

function phases(given: Given): Record<string, number> {
  const T = (figure(given, 'F') + 459.67) / 1.8;
  return { phases: splits(phaseSum(fractions(given), figure(given, 'psia') * poundForce, T)) ? 2 : 1 };
}

export const subjects: Record<string, Subject> = {
  'gerg-example': example(mixtureOf),
  'gerg-at-pressure': atPressure(mixtureOf),
  'gerg-at-density': atDensity(mixtureOf),
  'detail-example': example(detailMixtureOf),
  'detail-at-pressure': atPressure(detailMixtureOf),
  'detail-at-density': atDensity(detailMixtureOf),
  'gas-phases': phases,
};
