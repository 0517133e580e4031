import fc from 'fast-check';
import { expect, it } from 'vitest';
import type { MeterText } from '../../../src/core/document/project.ts';
import { run } from '../../../src/core/run.ts';
import { solveText } from '../../../src/views/headless/solve.ts';
import { presentMeter } from '../../../src/views/present/meter.ts';
import { meters, projectOf } from '../present/meters.ts';

type Group = Record<string, unknown>;

/** Every path of a meter, groups included. */
const paths = (node: unknown, path: readonly string[] = []): (readonly string[])[] =>
  typeof node !== 'object' || node === null
    ? []
    : Object.entries(node).flatMap(([key, inner]) => [[...path, key], ...paths(inner, [...path, key])]);

function put(meter: unknown, path: readonly string[], value: unknown): unknown {
  const [key, ...rest] = path;
  if (key === undefined) return value;
  const group: Group = Array.isArray(meter) ? ([...meter] as unknown as Group) : { ...(meter as Group) };
  const inner = put(group[key], rest, value);
  if (inner === undefined) delete group[key];
  else group[key] = inner;
  return group;
}

const junk = fc.oneof(
  fc.constantFrom(undefined, null, 0, -1, 1e308, true, '', ' ', [], {}, [null], { kind: 'water' }),
  fc.constantFrom(
    '7 bar',
    '7 bar(g)',
    '0 mm',
    '-5 t/h',
    '1e400 mm',
    '1e-400 mm',
    '12,5 mm',
    '12',
    'mm',
    '5 kg',
    'ten mm',
    '20 degC',
  ),
  fc.constantFrom(
    '900 degC',
    '1 mbar',
    '99 bar',
    '1e9 t/h',
    '1 kg/h',
    '9 m',
    '1e-9 mm',
    '0 K',
    '0.1 %',
    '-1 % of span',
    '2000 bar(a)',
  ),
  fc.constantFrom(
    'liquid',
    'vapour',
    'gas',
    'cone',
    'wedge',
    'corner',
    'machined',
    'flow',
    'bore',
    'differential',
    'unobtainium',
  ),
  fc.string({ maxLength: 12 }),
);

/** One meter with up to three of its fields replaced. */
const broken = fc.constantFrom(...meters).chain((meter) =>
  fc.array(fc.tuple(fc.constantFrom(...paths(meter)), junk), { minLength: 1, maxLength: 3 }).map((changes) =>
    changes.reduce<unknown>((changed, [path, value]) => {
      try {
        return put(changed, path, value);
      } catch {
        return changed; // an earlier change took the group away
      }
    }, meter),
  ),
);

it('whatever stands in a meter, it is solved or refused in words, alone', () => {
  fc.assert(
    fc.property(broken, (meter) => {
      const { exit, output, error } = solveText(
        JSON.stringify(projectOf('SI', meter as MeterText, meters[0] as MeterText)),
      );
      expect(error).toBe('');
      const { results } = JSON.parse(output);
      expect(results).toHaveLength(2);
      expect(results[1].status).toBe('solved');
      expect(exit).toBe(results[0].status === 'solved' ? 0 : 1);
      for (const { code, field, message } of results[0].problems ?? []) {
        expect(code).toMatch(/^[a-z-]+$/);
        expect(field).toBeTypeOf('string');
        expect(message).toMatch(/^\S.+[.)] \S.+\.$/s);
        expect(message).not.toMatch(/undefined|NaN|Infinity|\[object/);
      }
    }),
    { numRuns: 500 },
  );
});

it('and it is presented in both systems', () => {
  fc.assert(
    fc.property(broken, fc.constantFrom('SI', 'US'), (meter, display) => {
      const project = projectOf(display as 'SI', JSON.parse(JSON.stringify(meter)) as MeterText);
      const [result] = run(project).results;
      if (result === undefined) throw new Error('expected a result, got none');
      const presented = presentMeter(project.meters[0] as MeterText, project, result);
      expect(presented.status).toBe(result.status);
      expect(JSON.stringify(presented)).not.toMatch(/Infinity|undefined/);
    }),
    { numRuns: 500 },
  );
});
