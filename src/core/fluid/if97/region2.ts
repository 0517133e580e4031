/**
 * Region 2 of IAPWS-IF97: steam, 273.15 K to 1073.15 K, below the saturation line, the border with region 3 and 100 MPa.
 * Standard: IAPWS R7-97(2012), Eq. 15 to 17. Symbols: those of the release; SI.
 */
import { ideal, residual } from './region2.table.ts';
import { steamRegion } from './steam-region.ts';

const steam = steamRegion({ ideal, residual, TStar: 540, shift: 0.5 }); // Eq. 16 and 17

/** All properties of steam at p and T (see the head of the file for the range). */
export const region2 = steam.properties;

/** Density of steam alone, kg/m3, at p and T. */
export const densityOfRegion2 = steam.density;
