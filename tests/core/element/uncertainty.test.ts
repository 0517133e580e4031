import { describe, expect, it } from 'vitest';
import { geometry, primary } from './primaries.ts';

const flow = { reynolds: 1e6, expansion: 0.02, isentropicExponent: 1.3, expands: true };
const parts = (name: string, pipe: number, ratio: number, reynolds = 1e6) =>
  Object.fromEntries(
    primary(name)
      .coefficientUncertainty(geometry(pipe, ratio), { ...flow, reynolds })
      .map((part) => [part.id, part.percent]),
  );

describe('uncertainty of C, percent', () => {
  it('orifice plate: 0.7 - beta, 0.5, 1.667 beta - 0.5 (ISO 5167-2:2003, 5.3.3.1)', () => {
    expect(parts('orifice-plate.flange', 0.2, 0.15)).toEqual({ base: expect.closeTo(0.55, 12) });
    expect(parts('orifice-plate.flange', 0.2, 0.2)).toEqual({ base: 0.5 });
    expect(parts('orifice-plate.flange', 0.2, 0.6)).toEqual({ base: 0.5 });
    expect(parts('orifice-plate.flange', 0.2, 0.75)).toEqual({ base: expect.closeTo(0.75025, 12) });
  });

  it('orifice plate: the small-pipe part ends at 71.12 mm, the low-Reynolds part at 10 000 and beta 0.5', () => {
    expect(parts('orifice-plate.corner', 0.0508, 0.5)).toEqual({ base: 0.5, 'small-pipe': expect.closeTo(0.18, 12) });
    expect(parts('orifice-plate.corner', 0.07112, 0.5)).toEqual({ base: 0.5 });
    expect(parts('orifice-plate.corner', 0.2, 0.55, 9999)).toEqual({ base: 0.5, 'low-reynolds': 0.5 });
    expect(parts('orifice-plate.corner', 0.2, 0.55, 10000)).toEqual({ base: 0.5 });
    expect(parts('orifice-plate.corner', 0.2, 0.5, 9999)).toEqual({ base: 0.5 });
  });

  it('nozzles (ISO 5167-3:2003, 5.1.7, 5.2.7, 5.3.5)', () => {
    expect(parts('isa-1932-nozzle', 0.2, 0.6)).toEqual({ base: 0.8 });
    expect(parts('isa-1932-nozzle', 0.2, 0.8)).toEqual({ base: expect.closeTo(1.2, 12) });
    expect(parts('long-radius-nozzle', 0.2, 0.8)).toEqual({ base: 2 });
    expect(parts('venturi-nozzle', 0.2, 0.5)).toEqual({ base: expect.closeTo(1.29375, 12) });
  });

  it('Venturi tubes, inside the range and by Annex B outside it (ISO 5167-4:2003, 5.7)', () => {
    expect(parts('venturi-tube.as-cast', 0.2, 0.5)).toEqual({ base: 0.7 });
    expect(parts('venturi-tube.as-cast', 0.2, 0.5, 199999)).toEqual({ 'annex-b': 1 });
    expect(parts('venturi-tube.as-cast', 0.2, 0.5, 6e4)).toEqual({ 'annex-b': 2 });
    expect(parts('venturi-tube.as-cast', 0.2, 0.5, 2e4)).toEqual({ 'annex-b': 2.5 });
    expect(parts('venturi-tube.fabricated', 0.3, 0.5, 2e5)).toEqual({ base: 1.5 });
    expect(parts('venturi-tube.machined', 0.2, 0.5, 1e6)).toEqual({ base: 1 });
    expect(parts('venturi-tube.machined', 0.2, 0.5, 1.01e6)).toEqual({ 'annex-b': 3 });
  });
});

describe('uncertainty of the expansibility, percent', () => {
  const percent = (name: string, change = {}) =>
    primary(name).expansibilityUncertainty(geometry(0.2, 0.5), { ...flow, ...change })?.percent;

  it('is a share of dp/p1', () => {
    expect(percent('orifice-plate.corner')).toBeCloseTo((3.5 * 0.02) / 1.3, 12); // ISO 5167-2:2003, 5.3.3.2
    expect(percent('isa-1932-nozzle')).toBeCloseTo(0.04, 12); // ISO 5167-3:2003, 5.1.7.2
    expect(percent('long-radius-nozzle')).toBeCloseTo(0.04, 12); // 5.2.7.2
    expect(percent('venturi-nozzle')).toBeCloseTo((4 + 100 / 256) * 0.02, 12); // 5.3.5.2
    expect(percent('venturi-tube.machined')).toBeCloseTo((4 + 100 / 256) * 0.02, 12); // ISO 5167-4:2003, 5.8
  });

  it('is nothing for a liquid', () => {
    for (const name of [
      'orifice-plate.corner',
      'isa-1932-nozzle',
      'long-radius-nozzle',
      'venturi-nozzle',
      'venturi-tube.machined',
    ]) {
      expect(percent(name, { expands: false })).toBe(0);
    }
  });
});

it('a fluid that expands without an isentropic exponent is a defect, not a guess', () => {
  const bare = { reynolds: 1e6, expansion: 0.02 };
  const plate = primary('orifice-plate.flange');
  const at = geometry(0.2, 0.6);
  expect(plate.expansibilityUncertainty(at, { ...bare, expands: false })?.percent).toBe(0);
  expect(() => plate.expansibilityUncertainty(at, { ...bare, expands: true })).toThrow('isentropic exponent');
});
