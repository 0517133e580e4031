import { describe, expect, it } from 'vitest';
import { bored, geometry, primary } from './primaries.ts';

function dimension(name: string, id: string, pipe = 0.2, ratio = 0.5) {
  const found = primary(name)
    .dimensions(geometry(pipe, ratio))
    .find((one) => one.id === id);
  if (found === undefined) throw new Error(`expected the dimension ${id} of ${name}`);
  return found;
}

describe('dimensions', () => {
  it('have bounds in order, an id of their own and a source', () => {
    for (const one of bored) {
      for (const [pipe, ratio] of [
        [0.05, 0.3],
        [0.2, 0.5],
        [0.5, 0.75],
      ] as const) {
        const all = one.dimensions(geometry(pipe, ratio));
        expect(new Set(all.map((d) => d.id)).size, one.name).toBe(all.length);
        for (const { id, min, nominal, max, source } of all) {
          const given = [min, nominal, max].filter((bound) => bound !== undefined);
          expect(given.length, `${one.name}, ${id}`).toBeGreaterThan(0);
          expect(
            [...given].sort((a, b) => a - b),
            `${one.name}, ${id}`,
          ).toEqual(given);
          expect(source.clause).toMatch(/^ISO 5167-[234]:\d{4}, /);
        }
      }
    }
  });

  it('of a plate: thickness, edge and flange tappings (ISO 5167-2:2003, 5.1 and 5.2)', () => {
    expect(dimension('orifice-plate.flange', 'plate-thickness-edge')).toMatchObject({ min: 0.001, max: 0.004 });
    expect(dimension('orifice-plate.flange', 'plate-thickness').max).toBeCloseTo(0.01, 12);
    expect(dimension('orifice-plate.flange', 'plate-thickness', 0.06).max).toBe(0.0032);
    expect(dimension('orifice-plate.flange', 'edge-radius').max).toBeCloseTo(0.00004, 12);
    expect(dimension('orifice-plate.flange', 'tapping-upstream', 0.1, 0.65).max).toBeCloseTo(0.0259, 12);
    expect(dimension('orifice-plate.flange', 'tapping-upstream', 0.2, 0.65).max).toBeCloseTo(0.0264, 12);
    expect(dimension('orifice-plate.D-D/2', 'tapping-downstream', 0.2, 0.65)).toMatchObject({
      nominal: 0.1,
      max: expect.closeTo(0.102, 12),
    });
  });

  it('of a Venturi tube: cones of 21, 15 and 7 degrees are 2.70, 3.80 and 8.17 (D - d) long', () => {
    expect(dimension('venturi-tube.machined', 'convergent-length').nominal).toBeCloseTo(2.698 * 0.1, 4);
    expect(dimension('venturi-tube.machined', 'divergent-length').min).toBeCloseTo(3.8 * 0.1, 3);
    expect(dimension('venturi-tube.machined', 'divergent-length').max).toBeCloseTo(8.175 * 0.1, 4);
  });

  it('of an ISA 1932 nozzle: the profile is 0.6041 d long and shorter above beta = 2/3, without a jump', () => {
    expect(dimension('isa-1932-nozzle', 'profile-length').nominal).toBeCloseTo(0.06041, 12);
    const long = dimension('isa-1932-nozzle', 'profile-length', 0.3, 0.666666).nominal ?? 0;
    const short = dimension('isa-1932-nozzle', 'profile-length', 0.3, 0.666668).nominal ?? 0;
    expect(Math.abs(short / long - 1)).toBeLessThan(0.0005);
    expect(dimension('isa-1932-nozzle', 'profile-length', 0.3, 0.8).nominal).toBeLessThan(0.6041 * 0.24);
  });

  it('put both tappings where the standard has them', () => {
    expect(primary('orifice-plate.corner').tappings(geometry(0.2, 0.5))).toEqual({ upstream: 0, downstream: 0 });
    expect(primary('orifice-plate.flange').tappings(geometry(0.2, 0.5))).toEqual({
      upstream: 0.0254,
      downstream: 0.0254,
    });
    expect(primary('orifice-plate.D-D/2').tappings(geometry(0.2, 0.5))).toEqual({ upstream: 0.2, downstream: 0.1 });
    expect(primary('long-radius-nozzle').tappings(geometry(0.2, 0.5))).toEqual({ upstream: 0.2, downstream: 0.1 });
    const { upstream, downstream } = primary('venturi-tube.machined').tappings(geometry(0.2, 0.5));
    expect(upstream).toBe(0.1);
    expect(downstream).toBeCloseTo(0.2698 + 0.05, 3);
  });
});
