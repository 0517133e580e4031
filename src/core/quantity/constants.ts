/**
 * Conventional constants as doubles, SI, for formulas. Figures that units are built from come from factors.table.ts and
 * units.table.ts, which name their sources; those that no unit has stand here with theirs.
 */
import { fractionOf, nearestDouble } from './exact.ts';
import type { AbsolutePressure, Acceleration, Length } from './kinds.ts';
import { UNIT_ROWS } from './units.table.ts';

/** The double nearest to a factor of the unit table. */
function double(factor: string): number {
  const { numerator, denominator } = fractionOf(factor);
  return nearestDouble(numerator.div(denominator));
}

/** Standard atmosphere, 101325 Pa. NIST SP 811, B.8. */
export const standardAtmosphere = double('atm') as AbsolutePressure;
/** Standard acceleration of free fall, 9.80665 m/s2. CGPM 1901. */
export const standardGravity = double('gn') as Acceleration;
/** Inch, 0.0254 m. International yard and pound, 1959. */
export const inch = double('in') as Length;
/** Pound-force per square inch, Pa: a factor of any pressure. International yard and pound, 1959; CGPM 1901. */
export const poundPerSquareInch = double('lbf / in / in');

function zeroOf(symbol: string): number {
  const offset = UNIT_ROWS.temperature.find((row) => row.symbol === symbol)?.offset;
  if (offset === undefined) throw new Error(`constants: expected a unit ${symbol} with an offset, got none`);
  return Number(offset);
}

/** 0 degC in K, 273.15. SI Brochure, 9th edition, 2.3.1. */
export const zeroCelsius = zeroOf('degC');
/** A temperature in K as one in degC. */
export const celsius = (T: number): number => T - zeroCelsius;
/** A temperature in degC as one in K. */
export const kelvin = (t: number): number => t + zeroCelsius;

/**
 * Molar gas constant, J/(mol.K). An equation keeps the value it was fitted with; everything else takes the exact one.
 * SI Brochure, 9th edition (N_A k, exact); CODATA 1986; CODATA 2002, unchanged in 2006.
 */
export const molarGasConstant = { exact: 8.31446261815324, codata1986: 8.31451, codata2002: 8.314472 } as const; // J/(mol.K)
