/**
 * Where a state of water lies: inside the formulation or not, in which region, on which side of the saturation line.
 * Standard: IAPWS R7-97(2012), Fig. 1 and the ranges beside Eq. 7, 15, 28, 30 and 32. Symbols: those of the release; SI.
 */
import type { AbsolutePressure, Temperature } from '../../quantity/kinds.ts';
import { borderPressure } from './boundary.ts';
import type { Side } from './region3.ts';
import { criticalPressure, criticalTemperature, saturationPressure, saturationTemperature } from './saturation.ts';

/** Regions of the formulation; 4 is the saturation line. */
export type Region = 1 | 2 | 3 | 5;

/** Where a state lies: which equation holds, and whether it is liquid or vapour. */
export interface Place {
  readonly region: Region;
  readonly side: Side;
}

/** Bounds of the formulation, SI. The lowest pressure is ours: the release says p > 0. */
export const bounds = {
  lowestTemperature: 273.15,
  highestTemperature: 2273.15,
  lowestPressure: 1e-6,
  highestPressure: 100e6,
  highestPressureHot: 50e6, // above `hot`
  hot: 1073.15,
} as const;

/** From here region 3 lies between liquid and vapour, K. */
export const between1And3 = 623.15; // IAPWS R7-97(2012), Fig. 1
const between2And3 = 863.15; // K: from here region 2 reaches to 100 MPa

/** The pressure at which the saturation line begins, at 273.15 K, Pa. IAPWS R7-97(2012), text beside Eq. 30. */
export const lowestSaturationPressure = saturationPressure(bounds.lowestTemperature as Temperature);

/** The highest pressure of the formulation at T, Pa. */
export const highestPressureAt = (T: Temperature): number =>
  T > bounds.hot ? bounds.highestPressureHot : bounds.highestPressure;

/** Which of the two figures is outside the formulation; undefined where both are inside. NaN is outside. */
export function outsideBy(p: AbsolutePressure, T: Temperature): 'temperature' | 'pressure' | undefined {
  if (!(T >= bounds.lowestTemperature && T <= bounds.highestTemperature)) return 'temperature';
  if (!(p >= bounds.lowestPressure && p <= highestPressureAt(T))) return 'pressure';
  return undefined;
}

/** Region and side of a state inside the bounds, as it is at rest. On a border: the region with the smaller number. */
export function placeOf(p: AbsolutePressure, T: Temperature): Place {
  if (T > bounds.hot) return { region: 5, side: 'vapour' };
  if (T <= criticalTemperature && p >= saturationPressure(T)) return sideOf(p, T, 'liquid');
  return sideOf(p, T, 'vapour');
}

/** The region that describes one side of the saturation line at p and T, whether the state is at rest there or not. */
export function sideOf(p: AbsolutePressure, T: Temperature, side: Side): Place {
  if (T > bounds.hot) return { region: 5, side };
  if (T <= between1And3) return { region: side === 'liquid' ? 1 : 2, side };
  if (side === 'liquid' && T <= criticalTemperature) return { region: 3, side };
  return { region: T <= between2And3 && p > borderPressure(T) ? 3 : 2, side };
}

/** True above the critical point in both pressure and temperature. */
export const supercritical = (p: AbsolutePressure, T: Temperature): boolean =>
  T > criticalTemperature && p > criticalPressure;

/** Saturation temperature at p where the line exists, 611.2 Pa to 22.064 MPa. */
export function boilingAt(p: AbsolutePressure): Temperature | undefined {
  return p >= lowestSaturationPressure && p <= criticalPressure ? saturationTemperature(p) : undefined;
}

/** Saturation pressure at T where the line exists, 273.15 K to 647.096 K. */
export function vapourPressureAt(T: Temperature): AbsolutePressure | undefined {
  return T >= bounds.lowestTemperature && T <= criticalTemperature ? saturationPressure(T) : undefined;
}
