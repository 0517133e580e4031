/** Whatever stands in a file: every meter is solved with finite numbers or refused with words, and nothing is thrown. */
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import fc from 'fast-check';
import { expect, test } from 'vitest';
import { decode } from '../../src/core/document/codec.ts';
import type { Project } from '../../src/core/document/project.ts';
import { run } from '../../src/core/run.ts';
import { problemSentence } from '../../src/views/words/problems.ts';

const EXAMPLE = readFileSync(join(import.meta.dirname, '../../public/examples/tern-island.headwright.json'), 'utf8');

type Path = readonly (string | number)[];

/** Every place of a JSON value, the value itself left out. */
function placesOf(value: unknown, path: Path = []): Path[] {
  if (typeof value !== 'object' || value === null) return [path];
  const below = Object.entries(value).flatMap(([key, one]) =>
    placesOf(one, [...path, Array.isArray(value) ? Number(key) : key]),
  );
  return path.length === 0 ? below : [path, ...below];
}

function put(target: unknown, [key, ...rest]: Path, value: unknown): void {
  const group = target as Record<string | number, unknown>;
  if (key === undefined) return;
  if (rest.length > 0) put(group[key], rest, value);
  else if (value === undefined) delete group[key];
  else group[key] = value;
}

const places = placesOf((JSON.parse(EXAMPLE) as Project).meters);
const units = fc.constantFrom(
  'mm',
  'm',
  'bar',
  'bar(g)',
  'bar(a)',
  'mbar',
  'degC',
  'K',
  't/h',
  'm3/h',
  'base m3/h',
  'kg/m3',
  '%',
  '% of span',
  'D',
  'cSt',
  '',
);
const quantity = fc
  .tuple(
    fc.oneof(fc.double(), fc.integer(), fc.constantFrom('1e999', '-0', '1e-320', '0x1', '1,5', 'NaN', '−5')),
    units,
  )
  .map(([number, unit]) => `${number} ${unit}`);
const poison = fc.oneof(
  fc.constant(undefined),
  quantity,
  fc.jsonValue({ maxDepth: 2 }),
  fc.string(),
  fc.constantFrom('__proto__', 'constructor', 'toString', 'bore', 'flow', 'differential', 'vapour', 'liquid', 'flange'),
  fc.double(),
);
const change = fc.tuple(fc.constantFrom(...places), poison);

/** No undefined, null, NaN or infinity anywhere in a result. */
function finite(value: unknown, path: string): void {
  if (typeof value === 'object' && value !== null) {
    for (const [key, one] of Object.entries(value)) finite(one, `${path}.${key}`);
  } else if (value === undefined || value === null || (typeof value === 'number' && !Number.isFinite(value))) {
    throw new Error(`${path}: expected a figure or nothing, got ${value}`);
  }
}

test('1,500 files with one to four places changed', () => {
  let solved = 0;
  let refused = 0;
  fc.assert(
    fc.property(fc.array(change, { minLength: 1, maxLength: 4 }), (changes) => {
      const project = JSON.parse(EXAMPLE) as Project;
      for (const [place, value] of changes) {
        try {
          put(project.meters, place, value);
        } catch {
          // an earlier change took away the group this one goes to
        }
      }
      const read = decode(JSON.stringify(project));
      if (!read.ok) throw new Error(JSON.stringify(read.problems));
      for (const result of run(read.value).results) {
        finite(result, result.tag);
        if (result.status === 'solved') solved += 1;
        else {
          refused += 1;
          for (const problem of result.problems) expect(problemSentence(problem)).toMatch(/\S+ \S+.*[.]$/s);
        }
      }
    }),
    { numRuns: 1500 },
  );
  expect(solved).toBeGreaterThan(500);
  expect(refused).toBeGreaterThan(500);
  expect(({} as { polluted?: unknown }).polluted).toBeUndefined();
});

test('any JSON at all is read or refused', () => {
  fc.assert(
    fc.property(fc.json(), (text) => {
      const read = decode(text);
      if (read.ok) run(read.value);
      else expect(problemSentence(read.problems[0])).toMatch(/\S/);
    }),
    { numRuns: 1000 },
  );
});

test('any text at all is read or refused', () => {
  fc.assert(
    fc.property(fc.string(), (text) => void decode(text)),
    { numRuns: 1000 },
  );
});

test('a meter list of any values at all', () => {
  fc.assert(
    fc.property(fc.array(fc.jsonValue(), { maxLength: 6 }), (meters) => {
      const read = decode(JSON.stringify({ format: 'headwright', version: 1, meters }));
      if (!read.ok) throw new Error(JSON.stringify(read.problems));
      const { results } = run(read.value);
      expect(results).toHaveLength(meters.length);
      for (const result of results) expect(result.status).toBe('refused');
    }),
    { numRuns: 1000 },
  );
});
