import { describe, expect, it } from 'vitest';
import type { StraightLength } from '../../../src/core/element/contract.ts';
import { straightLengths } from '../../../src/core/element/shared/straight.ts';
import { nozzleLengths } from '../../../src/core/element/shared/straight-nozzle.table.ts';
import { orificeLengths } from '../../../src/core/element/shared/straight-orifice.table.ts';
import { venturiLengths } from '../../../src/core/element/shared/straight-venturi.table.ts';
import { primary } from './primaries.ts';

function row(lengths: readonly StraightLength[], fitting: string): StraightLength {
  const found = lengths.find((one) => one.fitting === fitting);
  if (found === undefined) throw new Error(`expected the fitting ${fitting}`);
  return found;
}
const orifice = (ratio: number, fitting: string, reynolds = 1e5) =>
  row(straightLengths(orificeLengths, ratio, reynolds), fitting);

describe('a row of the table', () => {
  it.each([
    ['orifice', orificeLengths, 13],
    ['nozzle', nozzleLengths, 8],
    ['Venturi', venturiLengths, 7],
  ])('is answered as it stands: %s', (_, table, columns) => {
    expect(table.fittings).toHaveLength(columns);
    for (const { ratio, columns: printed } of table.rows) {
      expect(printed).toHaveLength(columns);
      const lengths = straightLengths(table, ratio, 1e5);
      for (const [index, [full, reduced]] of printed.entries()) {
        expect(lengths[index]?.full).toBe(full);
        expect(lengths[index]?.reduced).toBe(reduced);
      }
    }
  });

  it('agrees with figures known of ISO 5167-2:2003, Table 3', () => {
    expect(orifice(0.6, 'single-bend')).toMatchObject({ full: 42, reduced: 13, side: 'upstream' });
    expect(orifice(0.75, 'full-bore-valve')).toMatchObject({ full: 24, reduced: 12 });
    expect(orifice(0.75, 'downstream')).toMatchObject({ full: 8, reduced: 4, side: 'downstream' });
  });

  it('never asks for more in column B than in column A', () => {
    for (const table of [orificeLengths, nozzleLengths, venturiLengths]) {
      for (const [full, reduced = 0] of table.rows.flatMap((one) => one.columns)) expect(reduced).toBeLessThan(full);
    }
  });
});

describe('between the rows', () => {
  it('is linear in beta and rounded up to half a bore', () => {
    expect(orifice(0.55, 'single-bend')).toMatchObject({ full: 32, reduced: 11 }); // 22..42, 9..13
    expect(orifice(0.63, 'single-bend')).toMatchObject({ full: 43, reduced: 16 }); // 42.857, 16
    expect(orifice(0.3, 'single-bend')).toMatchObject({ full: 11, reduced: 3 });
  });

  it('has no column B where one of the rows has none', () => {
    expect(orifice(0.45, 'two-bends-same-plane-far')).not.toHaveProperty('reduced');
    expect(orifice(0.3, 'tee-or-mitre')).not.toHaveProperty('reduced');
  });

  it('holds the first and the last row outside them', () => {
    expect(orifice(0.1, 'single-bend')).toMatchObject({ full: 6, reduced: 3 });
    expect(orifice(0.8, 'single-bend')).toMatchObject({ full: 44, reduced: 20 });
  });
});

describe('two bends in perpendicular planes, closer than 5D', () => {
  const close = 'two-bends-perpendicular-close';
  it('asks for 95D at beta 0.6 above Re_D = 2e6, and says so', () => {
    expect(orifice(0.6, close, 2e6)).toMatchObject({ full: 65, note: 'straight-perpendicular-conditioner' });
    expect(orifice(0.6, close, 2.0001e6)).toMatchObject({
      full: 95,
      reduced: 25,
      note: 'straight-perpendicular-high-reynolds',
    });
    expect(orifice(0.5, close, 5e6)).toMatchObject({ full: 75, note: 'straight-perpendicular-conditioner' });
  });
});

describe('downstream of a Venturi tube', () => {
  it('is four throat diameters from the throat tappings, rounded up to half a bore', () => {
    const lengths = (ratio: number) => row(primary('venturi-tube.machined').straightLengths(ratio, 1e6), 'downstream');
    expect(lengths(0.5)).toMatchObject({ full: 2, side: 'downstream', note: 'straight-from-throat-tapping' });
    expect(lengths(0.6).full).toBe(2.5);
  });
});
