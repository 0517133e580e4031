/** What the vectors of water and steam put to the test: p in MPa, T in K, the rest as the releases print it. */
import { borderPressure } from '../../../src/core/fluid/if97/boundary.ts';
import { placeOf } from '../../../src/core/fluid/if97/place.ts';
import type { WaterProperties } from '../../../src/core/fluid/if97/properties.ts';
import { region1 } from '../../../src/core/fluid/if97/region1.ts';
import { region2 } from '../../../src/core/fluid/if97/region2.ts';
import { densityOfRegion3, pressureOfRegion3, region3 } from '../../../src/core/fluid/if97/region3.ts';
import { region5 } from '../../../src/core/fluid/if97/region5.ts';
import { saturationPressure, saturationTemperature } from '../../../src/core/fluid/if97/saturation.ts';
import { viscosity } from '../../../src/core/fluid/if97/viscosity.ts';
import { waterState } from '../../../src/core/fluid/water/water.ts';
import type { AbsolutePressure, Density, Temperature } from '../../../src/core/quantity/kinds.ts';
import {
  borderTemperature as backwardBorder,
  subregionOf,
  volumeIn,
} from '../../core/fluid/referee/region3-backward.ts';

type Given = Record<string, number | string>;
type Subject = (given: Given) => Record<string, number>;

const figure = (given: Given, name: string): number => {
  const value = given[name];
  if (typeof value !== 'number') throw new Error(`expected a number ${name}, got ${value}`);
  return value;
};
const pressure = (given: Given) => (figure(given, 'p') * 1e6) as AbsolutePressure;
const temperature = (given: Given) => figure(given, 'T') as Temperature;
const density = (given: Given) => figure(given, 'rho') as Density;

const printed = (properties: WaterProperties): Record<string, number> => ({
  v: 1 / properties.density,
  h: properties.enthalpy / 1e3,
  u: properties.internalEnergy / 1e3,
  s: properties.entropy / 1e3,
  cp: properties.isobaricHeatCapacity / 1e3,
  w: Math.sqrt(properties.speedOfSoundSquared),
});

type Region = (p: AbsolutePressure, T: Temperature) => WaterProperties;
const byRegion =
  (region: Region): Subject =>
  (given) =>
    printed(region(pressure(given), temperature(given)));

/** One way or the other along a line, by what is given. */
const line =
  (up: (T: Temperature) => number, back: (p: AbsolutePressure) => number): Subject =>
  (given) =>
    'T' in given ? { p: up(temperature(given)) / 1e6 } : { T: back(pressure(given)) };

/** The temperature at which the border, Eq. 5, stands at a pressure: what Eq. 6 says the other way round. */
function temperatureOfBorder(p: AbsolutePressure): number {
  let [low, high] = [623, 864];
  for (let step = 0; step < 60; step++) {
    const middle = (low + high) / 2;
    if (borderPressure(middle as Temperature) < p) low = middle;
    else high = middle;
  }
  return low;
}

function rootOfRegion3(given: Given): Record<string, number> {
  const { region, side } = placeOf(pressure(given), temperature(given));
  if (region !== 3) throw new Error(`expected a state in region 3, got region ${region}`);
  const rho = densityOfRegion3(pressure(given), temperature(given), side);
  if (rho === undefined) throw new Error('expected a density, got none');
  return { v: 1 / rho };
}

function backward(given: Given): Record<string, number> {
  const [p, T] = [figure(given, 'p'), figure(given, 'T')];
  const letter = subregionOf(p, T);
  if (letter !== given.subregion) throw new Error(`expected subregion ${given.subregion}, got ${letter}`);
  return { v: volumeIn(letter, p, T) };
}

const sides = ['liquid', 'vapour'] as const;

function wholeState(given: Given): Record<string, number> {
  const [p, T] = [pressure(given), temperature(given)];
  const phase = sides.find((side) => side === given.phase);
  const conditions = { pressure: p, temperature: T, base: { pressure: p, temperature: T } };
  const paths = { pressure: 'p', temperature: 'T', own: (name: string) => name };
  const state = waterState({ ...conditions, paths }, phase);
  if (!state.ok) throw new Error(`expected a state, got ${state.problems[0].code}`);
  const { density: rho, speedOfSound: w = 0, viscosity: mu, vapourPressure } = state.value;
  return { rho, w, mu: mu * 1e6, ...(vapourPressure === undefined ? {} : { psat: vapourPressure / 1e6 }) };
}

export const subjects: Record<string, Subject> = {
  'if97-region-1': byRegion(region1),
  'if97-region-2': byRegion(region2),
  'if97-region-3': (given) => ({
    ...printed(region3(density(given), temperature(given))),
    p: pressureOfRegion3(density(given), temperature(given)) / 1e6,
  }),
  'if97-region-5': byRegion(region5),
  'if97-saturation': line(saturationPressure, saturationTemperature),
  'if97-boundary': line(borderPressure, temperatureOfBorder),
  'if97-region-3-density': rootOfRegion3,
  'if97-region-3-backward': backward,
  'if97-region-3-border': (given) => ({ T: backwardBorder(String(given.border), figure(given, 'p')) }),
  'iapws-viscosity': (given) => ({ mu: viscosity(temperature(given), density(given)) * 1e6 }),
  'water-state': wholeState,
};
