/** The liquids of gauges. */
import { describe, expect, it } from 'vitest';
import { gaugeWaterDensity, mercuryDensity } from '../../../src/core/fluid/gauge-liquid.ts';
import { as } from '../../../src/core/quantity/brand.ts';

describe('liquids of gauges', () => {
  it('are denser under pressure and lighter when warm', () => {
    const [cold, warm] = [as<'temperature'>(283.15), as<'temperature'>(303.15)];
    for (const density of [mercuryDensity, gaugeWaterDensity]) {
      expect(density(warm)).toBeLessThan(density(cold));
      expect(density(cold, as<'absolute pressure'>(1e7))).toBeGreaterThan(density(cold));
    }
    // IAPWS-95: water at 20 degC is 1002.7 kg/m3 at 10 MPa.
    expect(gaugeWaterDensity(as<'temperature'>(293.15), as<'absolute pressure'>(1e7))).toBeCloseTo(1002.7, 0);
  });
});
