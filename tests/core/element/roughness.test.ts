import { describe, expect, it } from 'vitest';
import { nozzleRoughness, orificeRoughness } from '../../../src/core/element/shared/roughness.ts';
import type { Length } from '../../../src/core/quantity/kinds.ts';
import { geometry, primary } from './primaries.ts';

const pipe = (D: number): Length => D as Length;

describe('roughness of the pipe before an orifice plate, ISO 5167-2:2003, Tables 1 and 2', () => {
  it('is the figure of the table at its ratios and Reynolds numbers, below 150 mm', () => {
    expect(orificeRoughness(pipe(0.1), 0.5, 1e5).max).toBeCloseTo(4.9e-4 * 0.1, 15);
    expect(orificeRoughness(pipe(0.1), 0.6, 1e6).max).toBeCloseTo(1.0e-4 * 0.1, 15);
    expect(orificeRoughness(pipe(0.1), 0.65, 1e7)).toMatchObject({ min: expect.closeTo(0.013e-4 * 0.1, 15) });
  });

  it('holds the outermost rows and columns', () => {
    expect(orificeRoughness(pipe(0.1), 0.12, 5e3).max).toBeCloseTo(15e-4 * 0.1, 15);
    expect(orificeRoughness(pipe(0.1), 0.75, 1e9).max).toBeCloseTo(0.3e-4 * 0.1, 15);
  });

  it('lies between its neighbours in beta and Re_D', () => {
    expect(orificeRoughness(pipe(0.1), 0.55, 1e5).max).toBeCloseTo(((4.9 + 2.5) / 2) * 1e-4 * 0.1, 15);
    expect(orificeRoughness(pipe(0.1), 0.5, Math.sqrt(1e5 * 3e5)).max).toBeCloseTo(((4.9 + 3.3) / 2) * 1e-4 * 0.1, 15);
  });

  it('has no minimum below Re_D = 3e6 and none at beta 0.5 or less', () => {
    expect(orificeRoughness(pipe(0.1), 0.7, 2.9e6)).not.toHaveProperty('min');
    expect(orificeRoughness(pipe(0.1), 0.5, 1e8)).not.toHaveProperty('min');
  });

  it('accepts 6 micrometres in bores of 150 mm and more, up to Re_D = 1.5e7 above beta 0.6', () => {
    expect(orificeRoughness(pipe(0.15), 0.7, 1.5e7).max).toBe(6e-6);
    expect(orificeRoughness(pipe(0.15), 0.7, 1.51e7).max).toBeLessThan(6e-6);
    expect(orificeRoughness(pipe(0.1499), 0.7, 1.5e7).max).toBeLessThan(6e-6);
    expect(orificeRoughness(pipe(0.15), 0.6, 5e7).max).toBeGreaterThanOrEqual(6e-6);
  });
});

describe('roughness before the other elements', () => {
  it('ISA 1932 and Venturi nozzles, ISO 5167-3:2003, Tables 1 and 2', () => {
    expect(nozzleRoughness(pipe(0.2), 0.3).max).toBeCloseTo(8e-4 * 0.2, 15);
    expect(nozzleRoughness(pipe(0.2), 0.5).max).toBeCloseTo(1.8e-4 * 0.2, 15);
    expect(nozzleRoughness(pipe(0.2), 0.55).max).toBeCloseTo(1.6e-4 * 0.2, 15);
    expect(nozzleRoughness(pipe(0.2), 0.8).max).toBeCloseTo(1.2e-4 * 0.2, 15);
  });

  it('long-radius nozzle and Venturi tube: Ra/D up to 3.2e-4', () => {
    for (const name of ['long-radius-nozzle', 'venturi-tube.machined']) {
      const limit = primary(name)
        .limits(geometry(0.2, 0.5), 1e6)
        .find((one) => one.id === 'pipe-roughness');
      expect(limit?.max).toBeCloseTo(6.4e-5, 15);
    }
  });
});
