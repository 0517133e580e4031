/** Law: an explicit row is the row of the whole calculation, within the bound that the kernel states. */
import { describe, expect, it } from 'vitest';
import { kernelOf, PATH, type RowFlows, type Rows } from '../../../src/core/log/kernel.ts';
import type { AbsolutePressure, PressureDifference, Temperature } from '../../../src/core/quantity/kinds.ts';
import { flowAt } from '../../../src/core/run/standing.ts';
import { generator } from '../../laws/random.ts';
import { elementsOf, logged, logMeter } from './meters.ts';

const ROWS = 10_000;
const SEED = 310;

const flowsFor = (count: number): Required<RowFlows> => ({
  massFlow: new Float64Array(count),
  path: new Uint8Array(count),
  density: new Float64Array(count),
  coefficient: new Float64Array(count),
  epsilon: new Float64Array(count),
  reynolds: new Float64Array(count),
});

/** Rows over the box, their differentials over four decades. */
function rowsOf({ box, most }: Pick<ReturnType<typeof logMeter>, 'box' | 'most'>, count: number): Required<Rows> {
  const random = generator(SEED);
  const between = ([lower, upper]: readonly [number, number]) => lower + random() * (upper - lower);
  return {
    differential: Float64Array.from({ length: count }, () => most * 1e-4 ** random()),
    pressure: Float64Array.from({ length: count }, () => between(box.pressure)),
    temperature: Float64Array.from({ length: count }, () => between(box.temperature)),
  };
}

/** Converts rows both ways and keeps the largest relative distance of each figure. */
function worstOf(fluid: string, element: string, count: number) {
  const logs = logMeter(fluid, element);
  const kernel = kernelOf(logs.stands, logs.box);
  if (kernel.bounds === undefined) throw new Error(`${fluid}, ${element}: expected a surface, got ${kernel.why}`);
  const rows = rowsOf(logs, count);
  const flows = flowsFor(count);
  kernel.convert(rows, flows, 0, count);
  const worst = { massFlow: 0, density: 0, coefficient: 0, epsilon: 0 };
  let explicit = 0;
  for (let row = 0; row < count; row += 1) {
    const moment = {
      pressure: rows.pressure[row] as AbsolutePressure,
      temperature: rows.temperature[row] as Temperature,
    };
    const known = flowAt(logs.stands, moment, rows.differential[row] as PressureDifference);
    if (!known.ok) throw new Error(`seed ${SEED}, row ${row}: ${JSON.stringify(known.problems)}`);
    const { operation, meter } = known.value;
    const figures = { ...operation, density: meter.state.density };
    if (flows.path[row] === PATH.explicit) explicit += 1;
    for (const name of Object.keys(worst) as (keyof typeof worst)[])
      worst[name] = Math.max(worst[name], Math.abs((flows[name][row] as number) / figures[name] - 1));
  }
  return { worst, bounds: kernel.bounds, explicit: explicit / count };
}

const every = Object.keys(elementsOf);
const combinations: (readonly [rows: number, fluid: string, element: string])[] = [
  ...Object.keys(logged).map((fluid) => [ROWS, fluid, 'orifice flange'] as const),
  ...every.slice(1).map((element) => [ROWS, 'stated gas', element] as const),
  ...every.slice(1).map((element) => [ROWS / 10, 'liquid water', element] as const),
];

describe('random rows of a log', () => {
  it.each(combinations)('%d of %s, %s, are those of the whole calculation', (count, fluid, element) => {
    const { worst, bounds, explicit } = worstOf(fluid, element, count);
    expect(worst.massFlow).toBeLessThanOrEqual(bounds.massFlow);
    expect(worst.density).toBeLessThanOrEqual(bounds.density);
    expect(worst.coefficient).toBeLessThanOrEqual(bounds.coefficient + 1e-13);
    expect(worst.epsilon).toBeLessThanOrEqual(bounds.epsilon + 1e-13);
    expect(bounds.massFlow).toBeLessThanOrEqual(1e-7);
    expect(explicit).toBeGreaterThan(0.9);
  });
});
