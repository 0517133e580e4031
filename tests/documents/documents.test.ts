/**
 * Saved documents of every version open for good, keep what was written and give the figures they gave. Beside each
 * `NAME.headwright.json` stands `NAME.results.json`: what `headwright solve` printed when it was added, of each meter the
 * figures and of a refused one the code and field of its problem.
 */
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { decode, encode } from '../../src/core/document/codec.ts';
import type { Project } from '../../src/core/document/project.ts';
import { solveText } from '../../src/views/headless/solve.ts';

const VERSIONS = ['1'];
/** Largest relative difference of a figure: rounding, in another order of operations. */
const ROUNDING = 1e-12;

const documents = VERSIONS.flatMap((version) =>
  readdirSync(join(import.meta.dirname, version))
    .filter((name) => name.endsWith('.headwright.json'))
    .map((name) => ({ name: `${version}/${name}`, path: join(import.meta.dirname, version, name) })),
);

const read = (text: string): Project => {
  const decoded = decode(text);
  if (!decoded.ok) throw new Error(`expected a project, got ${JSON.stringify(decoded.problems)}`);
  return decoded.value;
};

/** Every leaf with its path. */
function leaves(node: unknown, path = ''): [path: string, leaf: unknown][] {
  if (typeof node !== 'object' || node === null) return [[path, node]];
  return Object.entries(node).flatMap(([key, inner]) => leaves(inner, `${path}.${key}`));
}

const same = (one: unknown, other: unknown): boolean =>
  typeof one === 'number' && typeof other === 'number'
    ? Math.abs(one - other) <= ROUNDING * Math.abs(other)
    : one === other;

/** What of the kept results is no longer so. */
function differences(now: unknown, kept: unknown): string[] {
  const found = new Map(leaves(now));
  return leaves(kept)
    .filter(([path, leaf]) => !same(found.get(path), leaf))
    .map(([path, leaf]) => `${path}: was ${leaf}, is ${found.get(path)}`);
}

test('a difference is seen, rounding is not', () => {
  const kept = { a: [1, { b: 'x' }] };
  expect(differences({ a: [1 + 1e-13, { b: 'x', c: 2 }] }, kept)).toEqual([]);
  expect(differences({ a: [1 + 1e-11, { b: 'y' }] }, kept)).toHaveLength(2);
  expect(differences({ a: [] }, kept)).toHaveLength(2);
});

test('there are documents of every version', () =>
  expect(documents.map(({ name }) => name)).toEqual([
    '1/averaging-pitot.headwright.json',
    '1/fluids.headwright.json',
    '1/odd-order.headwright.json',
    '1/place.headwright.json',
    '1/readings.headwright.json',
    '1/surveys.headwright.json',
    '1/tern-island.headwright.json',
    '1/unknown-keys.headwright.json',
  ]));

describe.each(documents)('$name', ({ path }) => {
  const text = readFileSync(path, 'utf8');

  test('opens and keeps every key and value, in their order', () => {
    const project = read(text);
    expect(JSON.stringify(project)).toBe(JSON.stringify(JSON.parse(text)));
  });

  test('comes back from the file it is written to', () => {
    const written = encode(read(text));
    expect(JSON.stringify(read(written))).toBe(JSON.stringify(JSON.parse(text)));
    expect(encode(read(written))).toBe(written);
  });

  test('gives the figures it gave, from its own text and from the written one', () => {
    const kept = JSON.parse(readFileSync(path.replace('.headwright.json', '.results.json'), 'utf8'));
    expect(leaves(kept).filter(([, leaf]) => typeof leaf === 'number').length).toBeGreaterThan(10);
    for (const input of [text, encode(read(text))]) {
      const now = JSON.parse(solveText(input).output);
      expect(now.results).toHaveLength(kept.results.length);
      expect(now.traverses).toHaveLength((kept.traverses ?? []).length);
      expect(differences(now, kept)).toEqual([]);
    }
  });
});
