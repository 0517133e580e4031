/**
 * Region 5 of IAPWS-IF97: steam, 1073.15 K to 2273.15 K, to 50 MPa.
 * Standard: IAPWS R7-97(2012), Eq. 32 to 34. Symbols: those of the release; SI.
 */
import { ideal, residual } from './region5.table.ts';
import { steamRegion } from './steam-region.ts';

const steam = steamRegion({ ideal, residual, TStar: 1000, shift: 0 }); // Eq. 33 and 34

/** All properties of steam at p and T (see the head of the file for the range). */
export const region5 = steam.properties;

/** Density of steam alone, kg/m3, at p and T. */
export const densityOfRegion5 = steam.density;
