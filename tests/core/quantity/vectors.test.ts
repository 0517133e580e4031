import { describe, expect, test } from 'vitest';
import type { Measure } from '../../../src/core/quantity/measure.ts';
import { readQuantity } from '../../../src/core/quantity/text.ts';
import nist from '../../vectors/units/nist-sp811.json' with { type: 'json' };
import pint from '../../vectors/units/pint.json' with { type: 'json' };

interface VectorCase {
  readonly name: string;
  readonly given: { readonly number: string; readonly unit: string; readonly measure: string };
  readonly expect: Readonly<Record<string, number>>;
}

const files = [
  { file: nist, count: 34 },
  { file: pint, count: 130 },
];

describe.each(files)('units against $file.source', ({ file, count }) => {
  test('no case is missing', () => {
    expect(file.cases).toHaveLength(count);
  });

  test.each(file.cases as readonly VectorCase[])('$name', ({ given, expect: expected }) => {
    const read = readQuantity(`${given.number} ${given.unit}`, [given.measure as Measure], 'field');
    if (!read.ok) throw new Error(`not read: ${JSON.stringify(read.problems)}`);
    const tolerances: Readonly<Record<string, { readonly rel: number }>> = file.tolerance;
    for (const [column, value] of Object.entries(expected)) {
      const rel = tolerances[column]?.rel ?? 0;
      expect(Math.abs(read.value.si - value)).toBeLessThanOrEqual(rel * Math.abs(value));
    }
  });
});
