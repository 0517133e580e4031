import { describe, expect, it } from 'vitest';
import { PIPE_SIZE_ROWS } from '../../../src/core/document/pipe-sizes.table.ts';
import { namedOutright, PIPE_SIZES, searchPipeSizes } from '../../../src/core/document/pipe-sizes.ts';

const named = (name: string) => PIPE_SIZES.find((size) => size.name === name);

describe('pipe sizes', () => {
  it('has every row of the table, each under a name of its own', () => {
    expect(PIPE_SIZES).toHaveLength(355);
    expect(new Set(PIPE_SIZES.map(({ name }) => name)).size).toBe(355);
    expect(
      PIPE_SIZE_ROWS.every(
        ([, , , outside, wall]) => /^\d+(\.\d{1,2})?$/.test(outside) && /^\d+(\.\d{1,2})?$/.test(wall),
      ),
    ).toBe(true);
  });

  it('takes two walls from the outside diameter, exactly', () => {
    for (const { outside, wall, bore } of PIPE_SIZES) {
      expect(bore).toMatch(/^\d+(\.\d{1,2})?$/);
      expect(Math.round(Number(bore) * 100)).toBe(
        Math.round(Number(outside) * 100) - 2 * Math.round(Number(wall) * 100),
      );
    }
  });

  // Inside diameters in inches as pipe handbooks print them; the metric table rounds the outside
  // diameter to 0.1 mm, and to 1 mm from DN 400 on.
  it.each([
    ['DN 25, 40', 1.049],
    ['DN 50, 40', 2.067],
    ['DN 100, 40', 4.026],
    ['DN 150, 80', 5.761],
    ['DN 200, 40', 7.981],
    ['DN 300, STD', 12.0],
    ['DN 600, XS', 23.0],
  ])('%s has a bore of %d in', (name, inches) => {
    expect(Math.abs(Number(named(name)?.bore) - inches * 25.4)).toBeLessThan(inches < 16 ? 0.25 : 0.5);
  });

  it('cites the stainless schedules from their own standard', () => {
    expect(named('DN 100, 40S')?.source.clause).toBe('ASME B36.19M');
    expect(named('DN 100, XS')?.source.clause).toBe('ASME B36.10M');
    expect(PIPE_SIZES.every(({ source }) => source.seen === 'second-hand')).toBe(true);
  });

  it('finds a size however it is named', () => {
    for (const query of ['DN 100, 40', 'dn100 40', '100 sch 40', '4" 40', 'NPS 4 40'])
      expect(searchPipeSizes(query).map(({ name }) => name)).toContain('DN 100, 40');
    expect(searchPipeSizes('1 1/2 80').map(({ name }) => name)).toContain('DN 40, 80');
    expect(searchPipeSizes('')).toHaveLength(355);
    expect(searchPipeSizes('DN 77')).toEqual([]);
  });
});

describe('what a person types', () => {
  it.each([
    ['DN 100 schedule 40', 'DN 100, 40'],
    ['NPS 4 STD', 'DN 100, STD'],
    ['4" sch 40', 'DN 100, 40'],
    ['DN100 40S', 'DN 100, 40S'],
    ['1 1/2 80', 'DN 40, 80'],
  ])('%s comes first, and is named outright', (query, name) => {
    expect(searchPipeSizes(query)[0]?.name).toBe(name);
    expect(namedOutright(query)?.name).toBe(name);
  });

  it('an outside diameter and a wall find their sizes, and name several', () => {
    expect(searchPipeSizes('114.3 x 6.02').map(({ name }) => name)).toEqual([
      'DN 100, 40S',
      'DN 100, 40',
      'DN 100, STD',
    ]);
    expect(namedOutright('114.3 x 6.02')).toBeUndefined();
  });

  it('a nominal size alone, or nothing of the table, names nothing', () => {
    for (const query of ['', 'DN 100', '40', 'DN 100 sch 41', 'hose']) expect(namedOutright(query)).toBeUndefined();
  });
});
