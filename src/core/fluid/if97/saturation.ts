/**
 * Region 4 of IAPWS-IF97: the saturation line, 273.15 K to 647.096 K, 611.212677 Pa to 22.064 MPa.
 * Standard: IAPWS R7-97(2012), Eq. 30 (pressure) and Eq. 31 (temperature). Symbols: those of the release; SI.
 */
import type { AbsolutePressure, Temperature } from '../../quantity/kinds.ts';
import { coefficients } from './saturation.table.ts';

/** Critical point: the end of the line. */
export const criticalTemperature = 647.096 as Temperature; // K, IAPWS R7-97(2012), Eq. 2
export const criticalPressure = 22.064e6 as AbsolutePressure; // Pa, IAPWS R7-97(2012), Eq. 3

const [n1, n2, n3, n4, n5, n6, n7, n8, n9, n10] = coefficients;
const pStar = 1e6; // Pa, Eq. 29

/** Saturation pressure at T, 273.15 K to 647.096 K. IAPWS R7-97(2012), Eq. 30. */
export function saturationPressure(T: Temperature): AbsolutePressure {
  const theta = T + n9 / (T - n10); // Eq. 29b
  const A = theta * theta + n1 * theta + n2;
  const B = n3 * theta * theta + n4 * theta + n5;
  const C = n6 * theta * theta + n7 * theta + n8;
  const root = (2 * C) / (-B + Math.sqrt(B * B - 4 * A * C));
  return (pStar * root * root * root * root) as AbsolutePressure; // Eq. 30
}

/** Saturation temperature at p, 611.212677 Pa to 22.064 MPa. IAPWS R7-97(2012), Eq. 31. */
export function saturationTemperature(p: AbsolutePressure): Temperature {
  const beta = Math.sqrt(Math.sqrt(p / pStar)); // Eq. 29a
  const E = beta * beta + n3 * beta + n6;
  const F = n1 * beta * beta + n4 * beta + n7;
  const G = n2 * beta * beta + n5 * beta + n8;
  const D = (2 * G) / (-F - Math.sqrt(F * F - 4 * E * G));
  return ((n10 + D - Math.sqrt((n10 + D) * (n10 + D) - 4 * (n9 + n10 * D))) / 2) as Temperature; // Eq. 31
}
