import { describe, expect, it } from 'vitest';
import { relativeDensity } from '../../../src/core/fluid/air/relative-density.ts';
import type { AbsolutePressure, Density, Temperature } from '../../../src/core/quantity/kinds.ts';

/** ISO 6976:1995, Table 1 and note: dry air at 101.325 kPa, kg/m3; its molar mass was 1e-4 below that of CIPM-2007. */
const air = [
  { celsius: 0, density: 1.292923 },
  { celsius: 15, density: 1.22541 },
  { celsius: 20, density: 1.204449 },
] as const;
const OLDER_AIR = 2e-4;

const at = (celsius: number) => ({
  pressure: 101325 as AbsolutePressure,
  temperature: (celsius + 273.15) as Temperature,
});

describe('relative density', () => {
  it.each(air)('stands on dry air at the base state, $celsius °C', ({ celsius, density }) => {
    const line = relativeDensity(density as Density, at(celsius));
    expect(Math.abs((line?.value ?? 0) - 1)).toBeLessThan(OLDER_AIR);
    expect(line?.given.find(({ symbol }) => symbol === 'ρ_air')?.value).toBeCloseTo(density, 3);
  });

  it('of methane is that of ISO 6976', () => {
    // ISO 6976:1995: 0.6797 kg/m3 at 15 °C and 101.325 kPa, relative density 0.5547
    const line = relativeDensity(0.6797 as Density, at(15));
    expect(Math.abs((line?.value ?? 0) - 0.5547)).toBeLessThan(1e-4 + 0.5547 * OLDER_AIR);
  });

  it('is not given where air is no gas', () => {
    expect(
      relativeDensity(1 as Density, { pressure: 101325 as AbsolutePressure, temperature: 60 as Temperature }),
    ).toBe(undefined);
  });
});
