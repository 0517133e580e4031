/** Where the explicit way does not reach: the whole calculation, told by its reason. */
import { describe, expect, it } from 'vitest';
import type { MeterText } from '../../../src/core/document/project.ts';
import { kernelOf, PATH, type Rows } from '../../../src/core/log/kernel.ts';
import type { Box } from '../../../src/core/log/surface.ts';
import { flowAt, standing } from '../../../src/core/run/standing.ts';
import { logMeter } from './meters.ts';

const flowsFor = (count: number) => ({
  massFlow: new Float64Array(count),
  path: new Uint8Array(count),
  density: new Float64Array(count),
});
const column = (...values: number[]) => Float64Array.from(values);

const standingOf = (fluid: Record<string, unknown>, upstream: Record<string, string>) => {
  const meter = {
    fluid,
    upstream,
    pipe: { bore: '102.26 mm' },
    element: { kind: 'orifice-plate', tappings: 'flange', bore: '62.5 mm' },
    duty: {},
    differential: '10 kPa',
    find: 'flow',
  } as unknown as MeterText;
  const found = standing(meter, 0, {});
  if (!found.ok) throw new Error(JSON.stringify(found.problems));
  return found.value;
};

const water = (pressure: string, temperature: string) => standingOf({ kind: 'water' }, { pressure, temperature });

describe('a box without a surface', () => {
  it.each<[string, ReturnType<typeof standingOf>, Box]>([
    ['two-phases', water('10 bar(a)', '450 K'), { pressure: [9e5, 11e5], temperature: [440, 470] }],
    ['fluid-refused', water('10 bar(a)', '300 K'), { pressure: [9e5, 11e5], temperature: [270, 300] }],
    ['not-smooth', water('200 bar(a)', '700 K'), { pressure: [17e6, 30e6], temperature: [660, 760] }],
    [
      'two-phases',
      standingOf(
        { kind: 'gas', composition: { methane: '90 %', 'n-pentane': '10 %' } },
        { pressure: '5 bar(a)', temperature: '330 K' },
      ),
      { pressure: [1e5, 30e5], temperature: [260, 340] },
    ],
    [
      'partly-outside',
      standingOf({ kind: 'gas', name: 'nitrogen' }, { pressure: '5 bar(a)', temperature: '690 K' }),
      { pressure: [4e5, 6e5], temperature: [680, 720] },
    ],
    [
      'temperature-tied',
      standingOf({ kind: 'water', quality: '97 %' }, { pressure: '8 bar(a)' }),
      { pressure: [7e5, 9e5], temperature: [443, 444] },
    ],
    [
      'downstream-temperature',
      standingOf(
        { kind: 'gas', name: 'methane' },
        { pressure: '50 bar(a)', temperature: '290 K', temperatureAt: 'downstream' },
      ),
      { pressure: [4e6, 6e6], temperature: [280, 300] },
    ],
  ])('says %s, and its rows are those of the whole calculation', (why, stands, box) => {
    const kernel = kernelOf(stands, box);
    expect(kernel.why).toBe(why);
    expect(kernel.bounds).toBeUndefined();
    const rows: Rows = { differential: column(8000) };
    const flows = flowsFor(1);
    kernel.convert(rows, flows, 0, 1);
    const known = flowAt(stands, {}, 8000 as never);
    if (!known.ok) throw new Error(JSON.stringify(known.problems));
    expect(flows.path[0]).toBe(PATH.whole);
    expect(flows.massFlow[0]).toBe(known.value.operation.massFlow);
  });
});

describe('steam along its saturation line', () => {
  const rows: Required<Rows> = {
    differential: column(5e3, 2e4, 8e3, 2e4),
    pressure: column(6.1e5, 7.7e5, 8.9e5, 12e5),
    temperature: column(443, 443, 443, 443), // not logged: a constant that says nothing
  };
  it.each([
    ['dry', { kind: 'water', phase: 'vapour' }],
    ['wet', { kind: 'water', quality: '97 %' }],
  ])('is explicit where only the pressure is logged: %s', (_, fluid) => {
    const stands = standingOf(fluid, { pressure: '8 bar(a)' });
    const kernel = kernelOf(stands, { pressure: [6e5, 9e5], temperature: [443, 443] });
    const flows = flowsFor(4);
    kernel.convert(rows, flows, 0, 4);
    const { explicit, whole } = PATH;
    expect([...flows.path]).toEqual([explicit, explicit, explicit, whole]);
    rows.pressure.forEach((pressure, row) => {
      const known = flowAt(stands, { pressure: pressure as never }, rows.differential[row] as never);
      if (!known.ok) throw new Error(JSON.stringify(known.problems));
      const off = Math.abs((flows.massFlow[row] as number) / known.value.operation.massFlow - 1);
      expect(off).toBeLessThanOrEqual(kernel.bounds?.massFlow ?? 0);
    });
  });

  it('goes the whole way where only its temperature is known', () => {
    const kernel = kernelOf(standingOf({ kind: 'water', phase: 'vapour' }, { temperature: '450 K' }), {
      pressure: [9e5, 9e5],
      temperature: [440, 460],
    });
    expect(kernel.why).toBe('pressure-tied');
  });
});

describe('a row that the box does not hold', () => {
  const { stands, box } = logMeter('steam', 'ISA 1932 nozzle');
  const kernel = kernelOf(stands, box);
  const rows: Required<Rows> = {
    differential: column(2e4, 2e4, 0, -5, 2e4, 2e4, 3e6, 4e6),
    pressure: column(40e5, 20e5, 40e5, 40e5, 40e5, 0, 40e5, 40e5),
    temperature: column(650, 650, 650, 650, 3000, 650, 650, 650),
  };
  const flows = flowsFor(8);
  kernel.convert(rows, flows, 0, 8);

  it('goes the whole way, or is refused with its problem', () => {
    const { explicit, whole, refused } = PATH;
    expect([...flows.path]).toEqual([explicit, whole, refused, refused, refused, refused, refused, refused]);
    expect(rows.differential.length).toBe(8);
    expect([2, 4, 5, 6, 7].map((row) => kernel.problemOf(rows, row))).toEqual([
      undefined,
      'water-out-of-range',
      'water-out-of-range',
      'differential-beyond-critical',
      'differential-exceeds-pressure',
    ]);
  });

  it('leaves no figure of a refused row behind', () => {
    expect([...flows.massFlow].slice(2)).toEqual([0, 0, 0, 0, 0, 0]);
    expect([...flows.density].slice(2)).toEqual([0, 0, 0, 0, 0, 0]);
  });

  it('of one state is at that state, not at that of the meter', () => {
    const other = kernelOf(stands, { pressure: [38e5, 38e5], temperature: [655, 655] });
    const one = flowsFor(2);
    const rows: Rows = { differential: column(2e4, 2e4), pressure: column(38e5, 40e5), temperature: column(655, 655) };
    other.convert(rows, one, 0, 2);
    expect([...one.path]).toEqual([PATH.explicit, PATH.whole]);
    for (const row of [0, 1]) {
      const known = flowAt(
        stands,
        { pressure: rows.pressure?.[row] as never, temperature: 655 as never },
        2e4 as never,
      );
      if (!known.ok) throw new Error(JSON.stringify(known.problems));
      expect(Math.abs((one.massFlow[row] as number) / known.value.operation.massFlow - 1)).toBeLessThan(1e-12);
    }
  });

  it('takes rows from one to another and leaves the others alone', () => {
    const some = flowsFor(3);
    kernel.convert({ differential: column(1e4, 2e4, 3e4) }, some, 1, 2);
    expect(some.massFlow[1]).toBeGreaterThan(0);
    expect([some.massFlow[0], some.massFlow[2]]).toEqual([0, 0]);
  });
});

describe('a row on a seam of the formulation', () => {
  it('belongs to the side that the formulation gives it', () => {
    const { stands, box } = logMeter('air of a duct', 'orifice corner');
    const kernel = kernelOf(stands, box);
    const [on, beyond] = [300.15, 300.15 * (1 + 1e-9)]; // the formula of metrology ends at 27 degC, and holds there
    const rows: Required<Rows> = {
      differential: column(500, 500, 500, 500),
      pressure: column(1e5, 1e5, 110e3, 110e3 * (1 + 1e-9)),
      temperature: column(on, beyond, 295, 295),
    };
    const flows = flowsFor(4);
    kernel.convert(rows, flows, 0, 4);
    for (let row = 0; row < 4; row += 1) {
      const moment = { pressure: rows.pressure[row] as never, temperature: rows.temperature[row] as never };
      const known = flowAt(stands, moment, 500 as never);
      if (!known.ok) throw new Error(JSON.stringify(known.problems));
      expect(flows.path[row]).toBe(PATH.explicit);
      expect(Math.abs((flows.density[row] as number) / known.value.meter.state.density - 1)).toBeLessThan(2e-8);
    }
    expect(Math.abs((flows.density[0] as number) / (flows.density[1] as number) - 1)).toBeGreaterThan(1e-7); // it jumps
  });
});
