import { describe, expect, it } from 'vitest';
import type { LimitId } from '../../../src/core/element/contract.ts';
import { bored, geometry, primary } from './primaries.ts';

function limit(name: string, id: LimitId, pipe = 0.2, ratio = 0.5, reynolds = 1e6) {
  const found = primary(name)
    .limits(geometry(pipe, ratio), reynolds)
    .find((one) => one.id === id);
  if (found === undefined) throw new Error(`expected the limit ${id} of ${name}`);
  return found;
}

describe('the least Reynolds number of an orifice plate, ISO 5167-2, 5.3.1', () => {
  it.each(['corner', 'D-D/2'])('with %s tappings is 5000 up to beta 0.56 and 16000 beta^2 above', (tappings) => {
    expect(limit(`orifice-plate.${tappings}`, 'reynolds-pipe', 0.2, 0.56).min).toBe(5000);
    expect(limit(`orifice-plate.${tappings}`, 'reynolds-pipe', 0.2, 0.5601).min).toBeCloseTo(16000 * 0.5601 ** 2, 9);
    expect(limit(`orifice-plate.${tappings}`, 'reynolds-pipe', 0.2, 0.75).min).toBeCloseTo(9000, 9);
  });

  it('with flange tappings is the greater of 5000 and 170 beta^2 D, D in mm', () => {
    expect(limit('orifice-plate.flange', 'reynolds-pipe', 0.05, 0.6).min).toBe(5000);
    expect(limit('orifice-plate.flange', 'reynolds-pipe', 0.3, 0.6).min).toBeCloseTo(170 * 0.36 * 300, 9);
  });
});

describe('limits that change with the diameter ratio', () => {
  it('ISA 1932 nozzle: Re_D from 7e4 below beta 0.44, from 2e4 on (ISO 5167-3, 5.1.6.1)', () => {
    expect(limit('isa-1932-nozzle', 'reynolds-pipe', 0.2, 0.4399)).toMatchObject({ min: 7e4, max: 1e7 });
    expect(limit('isa-1932-nozzle', 'reynolds-pipe', 0.2, 0.44)).toMatchObject({ min: 2e4, max: 1e7 });
  });
});

describe('bore, ratio and Reynolds limits', () => {
  it.each([
    ['orifice-plate.flange', 0.05, 1, 0.1, 0.75],
    ['isa-1932-nozzle', 0.05, 0.5, 0.3, 0.8],
    ['long-radius-nozzle', 0.05, 0.63, 0.2, 0.8],
    ['venturi-nozzle', 0.065, 0.5, 0.316, 0.775],
    ['venturi-tube.as-cast', 0.1, 0.8, 0.3, 0.75],
    ['venturi-tube.machined', 0.05, 0.25, 0.4, 0.75],
    ['venturi-tube.fabricated', 0.2, 1.2, 0.4, 0.7],
  ])('%s', (name, small, large, low, high) => {
    expect(limit(name, 'pipe-bore')).toMatchObject({ min: small, max: large });
    expect(limit(name, 'diameter-ratio')).toMatchObject({ min: low, max: high });
  });

  it.each([
    ['long-radius-nozzle', 1e4, 1e7],
    ['venturi-nozzle', 1.5e5, 2e6],
    ['venturi-tube.as-cast', 2e5, 2e6],
    ['venturi-tube.machined', 2e5, 1e6],
    ['venturi-tube.fabricated', 2e5, 2e6],
  ])('%s, Re_D', (name, min, max) => expect(limit(name, 'reynolds-pipe')).toMatchObject({ min, max }));

  it('bores of plate and Venturi nozzle', () => {
    expect(limit('orifice-plate.corner', 'element-bore').min).toBe(0.0125);
    expect(limit('venturi-nozzle', 'element-bore').min).toBe(0.05);
  });
});

describe('every primary with a bore', () => {
  it('holds p2/p1 at 0.75 or more and says where that was seen', () => {
    for (const one of bored) {
      expect(limit(one.name, 'pressure-ratio').min).toBe(0.75);
      for (const { source } of one.limits(geometry(0.2, 0.5), 1e6))
        expect(source.clause).toMatch(/^ISO 5167-[234]:\d{4}, /);
    }
  });

  it('holds C from well below the least Reynolds number, without a jump as the ratio changes', () => {
    for (const one of bored) {
      for (const ratio of [0.3, 0.43, 0.44, 0.56, 0.7]) {
        const least = limit(one.name, 'reynolds-pipe', 0.3, ratio).min ?? 0;
        const floor = one.reynoldsFloor(geometry(0.3, ratio));
        expect(floor).toBeLessThan(least / 2);
        expect(floor / one.reynoldsFloor(geometry(0.3, ratio + 1e-9))).toBeCloseTo(1, 2);
      }
    }
  });

  it('can be searched over every ratio of its own standard', () => {
    for (const one of bored) {
      const { min = 0, max = 1 } = limit(one.name, 'diameter-ratio');
      expect(one.ratioRange.min).toBeLessThan(min);
      expect(one.ratioRange.max).toBeGreaterThan(max);
    }
  });
});
