/**
 * Properties of water and steam at a place, by the region's own equation.
 * Standard: IAPWS R7-97(2012), Eq. 7, 15, 28 and 32. Symbols: those of the release; SI.
 */
import type { AbsolutePressure, Density, Temperature } from '../../quantity/kinds.ts';
import type { Place } from './place.ts';
import type { WaterProperties } from './properties.ts';
import { densityOfRegion1, region1 } from './region1.ts';
import { densityOfRegion2, region2 } from './region2.ts';
import { densityOfRegion3, region3 } from './region3.ts';
import { densityOfRegion5, region5 } from './region5.ts';

/** All properties; undefined where the side has no stable state at p and T (only a phase held against the state can). */
export function propertiesAt(p: AbsolutePressure, T: Temperature, place: Place): WaterProperties | undefined {
  const found = byRegion(p, T, place);
  if (found === undefined) return undefined;
  const stable = found.density > 0 && found.speedOfSoundSquared > 0 && found.isobaricHeatCapacity > 0;
  return stable ? found : undefined;
}

function byRegion(p: AbsolutePressure, T: Temperature, { region, side }: Place): WaterProperties | undefined {
  if (region === 1) return region1(p, T);
  if (region === 2) return region2(p, T);
  if (region === 5) return region5(p, T);
  const rho = densityOfRegion3(p, T, side);
  return rho === undefined ? undefined : region3(rho, T);
}

/** Density alone, kg/m3, at less than half the cost of all properties; undefined where region 3 has no such side. */
export function densityAt(p: AbsolutePressure, T: Temperature, { region, side }: Place): Density | undefined {
  if (region === 1) return densityOfRegion1(p, T);
  if (region === 2) return densityOfRegion2(p, T);
  if (region === 5) return densityOfRegion5(p, T);
  return densityOfRegion3(p, T, side);
}
