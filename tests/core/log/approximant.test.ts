/** C explicit against C searched for, at places the approximant has not seen. */
import { describe, expect, it } from 'vitest';
import type { Geometry, Primary } from '../../../src/core/element/contract.ts';
import { calibrated } from '../../../src/core/element/shared/calibration.ts';
import { approximantOf, coefficientAt } from '../../../src/core/log/approximant.ts';
import type { Span } from '../../../src/core/log/spans.ts';
import { heldDischarge } from '../../../src/core/solve/equation.ts';
import { coefficientFrom } from '../../../src/core/solve/flow.ts';
import { everyPrimary, generator, randomMeter } from '../../laws/random.ts';

const PLACES = 4000;
const span: Span = { lower: 300, upper: 350, moves: true };
const still: Span = { lower: 300, upper: 300, moves: false };

/** The metal of a random meter, pipe and bore growing by different shares. */
const growing =
  ({ pipe, bore }: Geometry) =>
  (T: number): Geometry => {
    const [D, d] = [pipe * (1 + 1.2e-5 * (T - 300)), bore * (1 + 1.7e-5 * (T - 300))];
    return { pipe: D as Geometry['pipe'], bore: d as Geometry['bore'], ratio: d / D };
  };

/** Largest relative distance over Re from a decade below the floor to 1e8, and the share of places that it reaches. */
function worstOf(primary: Primary, geometryAt: (T: number) => Geometry, over: Span) {
  const approximant = approximantOf(primary, [over], geometryAt);
  const random = generator(8);
  let [worst, reached] = [0, 0];
  for (let place = 0; place < PLACES; place += 1) {
    const t = 2 * random() - 1;
    const held = heldDischarge(
      primary,
      geometryAt((over.lower + over.upper) / 2 + (t * (over.upper - over.lower)) / 2),
    );
    const a1 = 0.1 * held.floor * (1e9 / held.floor) ** random();
    const found = coefficientFrom(a1, held, primary.guess);
    const explicit = coefficientAt(approximant, 0, a1, t, !over.moves);
    if (!found.found) throw new Error(`expected C at Re/C = ${a1}, got ${found.side}`);
    if (explicit === 0) continue;
    reached += 1;
    worst = Math.max(worst, Math.abs(explicit / found.x - 1));
  }
  return { worst, reached: reached / PLACES, bound: approximant.bound };
}

describe('C explicit in Re/C', () => {
  it.each(everyPrimary.map((primary) => [primary.name, primary] as const))('of %s is C', (name, primary) => {
    const random = generator(17);
    for (let turn = 0; turn < 3; turn += 1) {
      let meter = randomMeter(random);
      while (meter.primary.name !== name) meter = randomMeter(random);
      for (const [geometryAt, over] of [
        [growing(meter.geometry), span],
        [() => meter.geometry, still],
      ] as const) {
        const { worst, reached, bound } = worstOf(primary, geometryAt, over);
        expect(bound).toBeLessThanOrEqual(1e-12);
        expect(worst).toBeLessThanOrEqual(bound);
        expect(reached).toBeGreaterThan(0.9);
      }
    }
  });

  it('leaves the piece open in which a calibration bends', () => {
    const [meter] = [randomMeter(generator(5))];
    const primary = calibrated(meter.primary, [
      { reynolds: 6e4, coefficient: 0.61 },
      { reynolds: 3e5, coefficient: 0.6 },
      { reynolds: 2e6, coefficient: 0.602 },
    ]);
    const approximant = approximantOf(primary, [still], () => meter.geometry);
    expect(coefficientAt(approximant, 0, 3e5 / 0.6, 0, true)).toBe(0);
    expect(coefficientAt(approximant, 0, (3e5 / 0.6) * 1.2, 0, true)).toBeGreaterThan(0.6);
    expect(worstOf(primary, () => meter.geometry, still).worst).toBeLessThanOrEqual(1e-12);
  });

  it('does not answer above the Reynolds numbers it was made for, nor for no number', () => {
    const meter = randomMeter(generator(5));
    const approximant = approximantOf(meter.primary, [still], () => meter.geometry);
    expect(coefficientAt(approximant, 0, 1e12, 0, true)).toBe(0);
    expect(coefficientAt(approximant, 0, Number.NaN, 0, true)).toBe(0);
  });
});
