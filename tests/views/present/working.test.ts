import { describe, expect, it } from 'vitest';
import { evaluate } from '../../../src/views/present/evaluate.ts';
import { parseFormula } from '../../../src/views/present/formula.ts';
import { meters, solved } from './meters.ts';

describe.each(meters.map((meter) => [meter.tag ?? '', meter] as const))('%s', (_, meter) => {
  const { result, presented } = solved(meter);
  const lines = [...result.working, ...Object.values(result.points).flatMap((point) => point.working)];

  it('each formula with its numbers gives the figure it explains', () => {
    const formulas = lines.filter((line) => line.formula !== undefined);
    expect(formulas.length).toBeGreaterThan(6);
    for (const { id, formula = '', given, value } of formulas) {
      const values = Object.fromEntries(given.map((item) => [item.symbol, item.value]));
      const again = evaluate(parseFormula(formula), values);
      // Only the order of rounding differs; the printed form of ε also loses digits as τ nears 1, the core's does not.
      const tolerance = id === 'epsilon' ? 1e-8 : 1e-12;
      expect(Math.abs(again - value) / Math.abs(value || 1), id).toBeLessThan(tolerance);
    }
  });

  it('the printed line has no name left but π', () => {
    for (const { id, substituted } of presented.working.flatMap((group) => group.rows)) {
      const names = JSON.stringify(substituted ?? {}).match(/"type":"name","base":"[^"]+"/g) ?? [];
      expect(
        names.filter((name) => !name.endsWith('"π"')),
        id,
      ).toEqual([]);
    }
  });

  it('every row that opens a working line finds it', () => {
    const ids = new Set(presented.working.flatMap((group) => group.rows.map((row) => row.id)));
    const opened = [...presented.state, ...presented.pipe, ...presented.metal].flatMap(({ working }) => working ?? []);
    expect(opened.length).toBeGreaterThan(2);
    expect(opened.filter((id) => !ids.has(id))).toEqual([]);
  });
});
