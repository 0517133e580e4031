/** Density and viscosity of water by its state, against one power. */

import { viscosity } from '../../src/core/fluid/if97/viscosity.ts';
import { waterDensity } from '../../src/core/fluid/water/water.ts';
import type { AbsolutePressure, Temperature } from '../../src/core/quantity/kinds.ts';
import { generator } from '../laws/random.ts';
import { compare, inTurn } from './pairs.ts';
import { type Line, ratioLine } from './report.ts';

const STATES = 60_000;

interface State {
  readonly p: AbsolutePressure;
  readonly T: Temperature;
}

/** Boxes of pressure and temperature that lie in one region of IAPWS-IF97 each. */
const boxes = [
  { name: 'liquid water (region 1)', p: [2e6, 2e7], T: [275, 480] },
  { name: 'steam (region 2)', p: [1e5, 2e6], T: [490, 1000] },
  { name: 'near the critical point (region 3)', p: [2.5e7, 6e7], T: [640, 700] },
] as const;

const statesOf = ({ p, T }: (typeof boxes)[number], random: () => number): State[] =>
  Array.from({ length: STATES }, () => ({
    p: (p[0] * (p[1] / p[0]) ** random()) as AbsolutePressure,
    T: (T[0] + (T[1] - T[0]) * random()) as Temperature,
  }));

function properties({ p, T }: State): number {
  const density = waterDensity(p, T);
  if (density === undefined) throw new Error(`expected a density at ${p} Pa, ${T} K, got none`);
  return density + viscosity(T, density);
}

export function water(): Line[] {
  const random = generator(11);
  return boxes.map((box) => {
    const states = statesOf(box, random);
    const power = inTurn(states, ({ p, T }) => p ** (T * 1e-4));
    const wanted = box.name.includes('region 3') ? undefined : '<= 10';
    return ratioLine(
      `${box.name}: density and viscosity / one power`,
      compare(inTurn(states, properties), power),
      wanted,
    );
  });
}
