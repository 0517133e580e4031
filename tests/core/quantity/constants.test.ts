import { describe, expect, it } from 'vitest';
import {
  celsius,
  inch,
  kelvin,
  molarGasConstant,
  poundPerSquareInch,
  standardAtmosphere,
  standardGravity,
  zeroCelsius,
} from '../../../src/core/quantity/constants.ts';

describe('the constants', () => {
  it('are the figures of their definitions', () => {
    expect(standardAtmosphere).toBe(101325); // NIST SP 811, B.8
    expect(standardGravity).toBe(9.80665); // CGPM 1901
    expect(inch).toBe(0.0254); // International yard and pound, 1959
    expect(poundPerSquareInch).toBe((45359237 * 980665) / 64516e5); // 6894.757 Pa, NIST SP 811, B.8
    expect(zeroCelsius).toBe(273.15); // SI Brochure, 9th edition, 2.3.1
  });

  it('has the molar gas constant as the product of its exact factors', () => {
    // Avogadro and Boltzmann constants, SI Brochure, 9th edition, table 1; in whole numbers, 1e-31 at the end.
    const product = Number(602214076n * 1380649n) / 1e14;
    expect(molarGasConstant.exact).toBeCloseTo(product, 14);
  });

  it('turn a temperature from one scale to the other and back', () => {
    expect(celsius(273.15)).toBe(0);
    expect(kelvin(20)).toBe(293.15);
    expect(kelvin(celsius(300))).toBe(300);
  });
});
