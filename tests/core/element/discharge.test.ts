import { describe, expect, it } from 'vitest';
import { geometry, primaries, primary } from './primaries.ts';

/** Relative step of C over a step of one part in 1e9 of its argument, on both sides of `edge`. */
function jump(f: (x: number) => number, edge: number): number {
  return Math.abs(f(edge * (1 + 1e-9)) / f(edge * (1 - 1e-9)) - 1);
}

describe('the discharge coefficient', () => {
  it('does not jump where the small-pipe term of the orifice plate ends, D = 71.12 mm', () => {
    for (const tappings of ['corner', 'flange', 'D-D/2']) {
      const coefficient = (D: number) => primary(`orifice-plate.${tappings}`).discharge(geometry(D, 0.5))(1e5);
      expect(jump(coefficient, 0.07112)).toBeLessThan(1e-8);
    }
  });

  it('does not jump at a point of Annex B or at an end of the Reynolds range of a Venturi tube', () => {
    for (const [variant, edges] of [
      ['as-cast', [4e4, 6e4, 1e5, 1.5e5, 2e5, 2e6]],
      ['machined', [2e5, 1e6]],
      ['fabricated', [4e4, 6e4, 1e5, 2e5, 2e6]],
    ] as const) {
      const C = primary(`venturi-tube.${variant}`).discharge(geometry(0.2, 0.5));
      for (const edge of edges) expect(jump(C, edge)).toBeLessThan(1e-8);
    }
  });

  it('of a Venturi tube is the constant of its clause inside the range and Annex B below it', () => {
    const cast = primary('venturi-tube.as-cast').discharge(geometry(0.2, 0.5));
    expect([2e5, 7e5, 2e6, 1e8].map(cast)).toEqual([0.984, 0.984, 0.984, 0.984]); // ISO 5167-4, 5.5.2
    expect([1e4, 4e4, 6e4, 1e5, 1.5e5].map(cast)).toEqual([0.957, 0.957, 0.966, 0.976, 0.982]); // Annex B
    const welded = primary('venturi-tube.fabricated').discharge(geometry(0.3, 0.5));
    expect([4e4, 6e4, 1e5, 2e5].map(welded)).toEqual([0.96, 0.97, 0.98, 0.985]); // Annex B, 5.5.4
    const machined = primary('venturi-tube.machined').discharge(geometry(0.2, 0.5));
    expect([1e4, 1e5, 2e5, 1e6, 1e7].map(machined)).toEqual([0.995, 0.995, 0.995, 0.995, 0.995]); // 5.5.3, held
  });

  it('is finite and above zero from the floor up, over every ratio that can be searched', () => {
    for (const one of primaries) {
      for (let step = 0; step <= 40; step++) {
        const ratio = one.ratioRange.min + (step / 40) * (one.ratioRange.max - one.ratioRange.min);
        const at = geometry(0.1, ratio);
        const C = one.discharge(at);
        for (let lg = 0; lg <= 6; lg += 0.25) {
          const value = C(one.reynoldsFloor(at) * 10 ** lg);
          expect(value, `${one.name}, beta ${ratio}, lg Re ${lg}`).toBeGreaterThan(0.3);
          expect(value, `${one.name}, beta ${ratio}, lg Re ${lg}`).toBeLessThan(1.6);
        }
      }
    }
  });
});
