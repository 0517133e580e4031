/**
 * The border between regions 2 and 3 of IAPWS-IF97, 623.15 K (16.5292 MPa) to 863.15 K (100 MPa).
 * Standard: IAPWS R7-97(2012), Eq. 5. Symbols: those of the release; SI.
 */
import type { AbsolutePressure, Temperature } from '../../quantity/kinds.ts';
import { coefficients } from './boundary.table.ts';

const [n1, n2, n3] = coefficients;
const pStar = 1e6; // Pa

/** Pressure of the border at T. IAPWS R7-97(2012), Eq. 5. */
export function borderPressure(T: Temperature): AbsolutePressure {
  return (pStar * (n1 + n2 * T + n3 * T * T)) as AbsolutePressure;
}
