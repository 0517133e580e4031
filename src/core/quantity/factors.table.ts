/**
 * Every figure that a unit is built from, each typed once: prefixes, definitions, conventional constants. A value is
 * a decimal text or is made of earlier rows by ` * ` and ` / `, read from left to right; results are in SI.
 */
import type { Source } from './source.ts';

export interface Factor {
  readonly value: string;
  readonly source: Source;
  /** False when the value is measured or rounded. */
  readonly exact: boolean;
}

const SI: Source = { clause: 'SI Brochure, 9th edition, 2 and 3', seen: 'second-hand' };
const WITH_SI: Source = { clause: 'SI Brochure, 9th edition, table 8', seen: 'second-hand' };
const YARD_AND_POUND: Source = { clause: 'International yard and pound, 1959; NIST SP 811, B.6', seen: 'second-hand' };
const GRAVITY: Source = { clause: 'CGPM 1901: standard acceleration of free fall', seen: 'second-hand' };
const SP811: Source = { clause: 'NIST SP 811, B.8', seen: 'second-hand' };
const GALLON: Source = { clause: 'NIST Handbook 44, appendix C: US gallon and barrel', seen: 'second-hand' };
const COLUMN: Source = { clause: 'NIST SP 811, B.8: conventional water and mercury', seen: 'second-hand' };
const TANAKA: Source = { clause: 'Tanaka et al., Metrologia 38 (2001) 301, eq. 1: air-free water', seen: 'memory' };

const exact = (value: string, source: Source): Factor => ({ value, source, exact: true });
const rounded = (value: string, source: Source): Factor => ({ value, source, exact: false });

export const FACTORS: ReadonlyMap<string, Factor> = new Map([
  // Prefixes
  ['micro', exact('0.000001', SI)],
  ['milli', exact('0.001', SI)],
  ['centi', exact('0.01', SI)],
  ['hecto', exact('100', SI)],
  ['kilo', exact('1000', SI)],
  ['mega', exact('1000000', SI)],
  // Coherent SI units
  ['m', exact('1', SI)],
  ['s', exact('1', SI)],
  ['kg', exact('1', SI)],
  ['K', exact('1', SI)],
  ['mol', exact('1', SI)],
  ['A', exact('1', SI)],
  ['V', exact('1', SI)],
  ['W', exact('1', SI)],
  ['Pa', exact('1', SI)],
  ['rad', exact('1', SI)],
  ['one', exact('1', SI)],
  ['pi', rounded('3.1415926535897932384626433832795028841972', SI)], // 41 digits, far beyond a double
  // Accepted with the SI
  ['min', exact('60', WITH_SI)],
  ['h', exact('60 * min', WITH_SI)],
  ['d', exact('24 * h', WITH_SI)],
  ['g', exact('milli * kg', SI)],
  ['t', exact('kilo * kg', WITH_SI)],
  ['L', exact('milli * m * m * m', WITH_SI)],
  ['deg', rounded('pi / 180', WITH_SI)],
  ['bar', exact('100000', SP811)],
  ['atm', exact('101325', SP811)],
  ['P', exact('0.1', SP811)], // poise
  ['St', exact('0.0001', SP811)], // stokes
  ['ppm', exact('micro', SI)],
  // Inch and pound
  ['in', exact('0.0254', YARD_AND_POUND)],
  ['ft', exact('12 * in', YARD_AND_POUND)],
  ['ft3', exact('ft * ft * ft', YARD_AND_POUND)],
  ['lb', exact('0.45359237', YARD_AND_POUND)],
  ['gal', exact('231 * in * in * in', GALLON)],
  ['bbl', exact('42 * gal', GALLON)],
  ['degR', exact('5 / 9', SP811)],
  // Force and columns of liquid
  ['gn', exact('9.80665', GRAVITY)],
  ['lbf', exact('lb * gn', SP811)],
  ['hp', exact('550 * ft * lbf', SP811)], // mechanical horsepower, per second
  ['water', exact('1000', COLUMN)], // kg/m3, conventional, 4 degC
  ['mercury', exact('13595.1', COLUMN)], // kg/m3, conventional, 0 degC
  ['water@60degF', rounded('999.017', TANAKA)], // kg/m3
  ['water@20degC', rounded('998.2067', TANAKA)], // kg/m3
]);
