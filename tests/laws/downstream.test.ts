/**
 * Whatever the gas and its state: a temperature measured downstream leads to one upstream that gives it back, or the
 * meter is refused in words.
 */
import { expect, it } from 'vitest';
import type { MeterText } from '../../src/core/document/project.ts';
import { solveMeter } from '../../src/core/run.ts';
import { problemWords } from '../../src/views/words/problems.ts';
import { seeded } from '../core/fluid/seeded.ts';

const seed = 54_441;
const gases = [
  { methane: 1 },
  { 'carbon-dioxide': 1 },
  { propane: 1 },
  { methane: 0.7, propane: 0.3 },
  { hydrogen: 1 },
  { ethane: 0.5, 'carbon-dioxide': 0.5 },
].map((composition) => ({ kind: 'gas', composition }));
const fluids = [...gases, { kind: 'air' }, { kind: 'water' }];

/** A meter at a random state: gas, liquid or near the line, with a differential up to a fifth of its pressure. */
function drawn(random: () => number): MeterText {
  const fluid = fluids[Math.floor(random() * fluids.length)] ?? { kind: 'air' };
  const pressure = 10 ** (5 + 2.5 * random());
  const temperature = fluid.kind === 'water' ? 280 + 500 * random() : 200 + 300 * random();
  const differential = pressure * 10 ** (-3 + 2.3 * random());
  return {
    tag: 'FE-1',
    fluid,
    upstream: { pressure: `${pressure} Pa(a)`, temperature: `${temperature} K`, temperatureAt: 'downstream' },
    pipe: { bore: '200 mm' },
    element: { kind: 'orifice-plate', tappings: 'flange', bore: '100 mm' },
    differential: `${differential} Pa`,
    find: 'flow',
  };
}

it(`T1 = T3 + μ_JT Δϖ at 400 random states (seed ${seed})`, () => {
  const random = seeded(seed);
  let largest = 0;
  for (let k = 0; k < 400; k += 1) {
    const meter = drawn(random);
    const said = JSON.stringify([meter.fluid, meter.upstream, meter.differential]);
    const result = solveMeter(meter, 0, {});
    if (result.status === 'refused') {
      expect(problemWords, said).toHaveProperty(result.problem.code);
      continue;
    }
    const { temperature_K: T1, jouleThomson_K_Pa: mu = Number.NaN, downstream } = result.state;
    const { measured_K: T3 = Number.NaN, loss_Pa: loss = Number.NaN } = downstream ?? {};
    expect(Math.abs(T1 - T3 - mu * loss), said).toBeLessThan(1e-9);
    expect(result.points.maximum?.permanentLoss_Pa, said).toBe(loss);
    largest = Math.max(largest, Math.abs(T1 - T3));
  }
  expect(largest).toBeGreaterThan(5); // K: it was put to the test
});
