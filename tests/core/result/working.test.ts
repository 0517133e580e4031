/** Every working line, its formula put into numbers by the views' own evaluator, gives the figure that is reported. */
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { decode } from '../../../src/core/document/codec.ts';
import type { Working } from '../../../src/core/quantity/working.ts';
import { evaluate } from '../../../src/views/present/evaluate.ts';
import { parseFormula } from '../../../src/views/present/formula.ts';
import { solved, steam, water } from '../sample.ts';

const linesOf = (meter: unknown): readonly Working[] => {
  const result = solved(meter);
  return [...result.working, ...Object.values(result.points).flatMap((point) => point.working)];
};
const example = decode(
  readFileSync(join(import.meta.dirname, '../../../public/examples/tern-island.headwright.json'), 'utf8'),
);
const kinds = [
  { kind: 'orifice-plate', tappings: 'corner' },
  { kind: 'orifice-plate', tappings: 'D-D/2' },
  { kind: 'long-radius-nozzle' },
  { kind: 'venturi-nozzle' },
  { kind: 'venturi-tube', convergent: 'fabricated' },
];
const meters: readonly (readonly [string, unknown])[] = [
  ...(example.ok ? example.value.meters.map((meter) => [meter.tag ?? '', meter] as const) : []),
  ...kinds.map((element) => [element.kind, { ...steam, element: { ...element, bore: '100 mm' } }] as const),
  ['small pipe', { ...water, pipe: { bore: '52 mm' }, element: { ...water.element, bore: '26 mm' } }],
  ['measured hot', { ...water, pipe: { ...water.pipe, measuredAt: '60 degC' } }],
  [
    'calibrated',
    {
      ...water,
      element: {
        ...water.element,
        calibration: [
          { reynolds: 1e5, coefficient: 0.61 },
          { reynolds: 1e6, coefficient: 0.6 },
        ],
      },
    },
  ],
  ...[
    { coefficient: 0.65 },
    { coefficient: '0.65', area: 'clear', width: '20 mm', loss: '8 %', coefficientUncertainty: '1 %', expansion: 0.2 },
    {
      calibration: [
        { reynolds: 1e5, coefficient: 0.61 },
        { reynolds: 1e8, coefficient: 0.6 },
      ],
    },
  ].flatMap((sheet, at) =>
    [water, steam].map(
      (meter) => [`bar ${at + 1}`, { ...meter, element: { kind: 'averaging-pitot', ...sheet } }] as const,
    ),
  ),
  ['held', { ...water, duty: { minimum: '20 kg/h' } }],
];

describe.each(meters)('%s', (_, meter) => {
  const lines = linesOf(meter);

  test('every formula gives its figure', () => {
    const checked = lines.filter(({ formula }) => formula !== undefined);
    expect(checked.length).toBeGreaterThan(8);
    for (const { id, formula = '', given, value } of checked) {
      const values = Object.fromEntries(given.map((one) => [one.symbol, one.value]));
      const put = evaluate(parseFormula(formula), values);
      expect(Math.abs(put / value - 1), `${id}: ${put} against ${value}`).toBeLessThan(1e-12);
    }
  });

  test('every line names its clause', () => {
    for (const { id, source } of lines) expect(source.clause, id).toMatch(/\S/);
  });
});

test('the working of a point covers every figure that is reported of it', () => {
  const ids = solved(steam).points.maximum?.working.map(({ id }) => id);
  for (const id of [
    'diameter-ratio',
    'reynolds-pipe',
    'C',
    'epsilon',
    'mass-flow',
    'volume-flow',
    'velocity',
    'uncertainty',
  ])
    expect(ids).toContain(id);
  expect(new Set(ids).size).toBe(ids?.length);
});
