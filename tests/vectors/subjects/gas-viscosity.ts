/** What the vectors of gas viscosity put to the test: T in K, rho in mol/dm3, viscosity in uPa.s. */
import { references } from '../../../src/core/fluid/gas-viscosity/pure.ts';
import { schemeOf } from '../../../src/core/fluid/gas-viscosity/viscosity.ts';
import { components } from '../../../src/core/fluid/helmholtz/components.table.ts';
import { as } from '../../../src/core/quantity/brand.ts';

type Given = Record<string, number | string>;

const dryAir: Given = { nitrogen: 0.7812, oxygen: 0.2096, argon: 0.0092 }; // Lemmon and Jacobsen 2004

const figure = (given: Given, name: string): number => {
  const value = given[name];
  if (typeof value !== 'number') throw new Error(`expected a number ${name}, got ${value}`);
  return value;
};

/** The mole fractions that a case names, or those of its one gas. */
function fractionsOf(given: Given): readonly number[] {
  const named = given.gas === 'air' ? dryAir : typeof given.gas === 'string' ? { [given.gas]: 1 } : given;
  const fractions = components.map(({ name }) => Number(named[name] ?? 0));
  const sum = fractions.reduce((total, x) => total + x, 0);
  if (Math.abs(sum - 1) > 1e-9) throw new Error(`expected mole fractions that add up to 1, got ${sum}`);
  return fractions;
}

function reference(given: Given): Record<string, number> {
  const found = Object.entries(references).find(([name]) => name === given.gas)?.[1];
  if (found === undefined) throw new Error(`expected a gas with a reference correlation, got ${given.gas}`);
  const eta = found.eta(figure(given, 'T'), figure(given, 'rho'));
  return { eta, etaBelowTen: eta, etaAboveHundred: eta };
}

const shares = ['1', '1.5', '2', '3', '4', '5']; // % for which a file has a field

function scheme(given: Given): Record<string, number> {
  const T = as<'temperature'>(figure(given, 'T'));
  const eta = schemeOf(fractionsOf(given), T, figure(given, 'rho') * 1e3) * 1e6;
  return Object.fromEntries(shares.map((share) => [`eta within ${share} %`, eta]));
}

export const subjects: Readonly<Record<string, (given: Given) => Record<string, number>>> = {
  'gas-viscosity-reference': reference,
  'gas-viscosity-scheme': scheme,
};
