import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { decode, emptyProject, encode, MOST_CHARACTERS } from '../../../src/core/document/codec.ts';
import type { Project } from '../../../src/core/document/project.ts';

const EXAMPLE = readFileSync(join(import.meta.dirname, '../../../public/examples/tern-island.headwright.json'), 'utf8');

const read = (text: string): Project => {
  const decoded = decode(text);
  if (!decoded.ok) throw new Error(JSON.stringify(decoded.problems));
  return decoded.value;
};
const codeOf = (text: string) => {
  const decoded = decode(text);
  return decoded.ok ? 'read' : decoded.problems[0].code;
};

describe('round trip', () => {
  test('what was written is read byte for byte', () => {
    const text = encode(read(EXAMPLE));
    expect(encode(read(text))).toBe(text);
    expect(read(text)).toEqual(read(EXAMPLE));
  });

  test('unknown keys stay, at every level and in their order', () => {
    const text = encode({
      ...emptyProject(),
      later: { nested: [1, { deep: 'x' }] },
      meters: [{ tag: 'A', novel: true }],
    });
    expect(encode(read(text))).toBe(text);
    expect(text).toContain('"novel": true');
  });

  test('texts of quantities stay as they are, whatever they say', () => {
    fc.assert(
      fc.property(fc.string(), (written) => {
        const project: Project = { ...emptyProject(), meters: [{ tag: written, differential: written }] };
        expect(read(encode(project))).toEqual(project);
      }),
    );
  });
});

describe('refusals', () => {
  test.each([
    ['', 'not-json'],
    ['{', 'not-json'],
    ['[]', 'not-headwright'],
    ['null', 'not-headwright'],
    ['{"format":"other","version":1,"meters":[]}', 'not-headwright'],
    ['{"format":"headwright","meters":[]}', 'version-missing'],
    ['{"format":"headwright","version":"1","meters":[]}', 'version-missing'],
    ['{"format":"headwright","version":2,"meters":[]}', 'newer-version'],
    ['{"format":"headwright","version":1}', 'no-meters'],
    ['{"format":"headwright","version":1,"meters":{}}', 'no-meters'],
    ['{"format":"headwright","version":1,"meters":[]}', 'read'],
    ['{"format":"headwright","version":1,"meters":[null,5]}', 'read'],
    ['{"format":"headwright","version":1,"meters":[],"traverses":"x"}', 'list-expected'],
    ['{"format":"headwright","version":1,"meters":[],"traverses":null}', 'list-expected'],
    ['{"format":"headwright","version":1,"meters":[],"traverses":[null,5]}', 'read'],
  ])('%s: %s', (text, code) => expect(codeOf(text)).toBe(code));

  test('a file of another size', () => expect(codeOf(' '.repeat(MOST_CHARACTERS + 1))).toBe('too-long'));
});

test('keys of prototypes are dropped wherever they stand', () => {
  const project = read(
    '{"format":"headwright","version":1,"__proto__":{"polluted":1},"meters":[{"tag":"A","pipe":{"constructor":{"prototype":{"polluted":1}},"bore":"1 m"}}]}',
  );
  expect(Object.hasOwn(project, '__proto__')).toBe(false);
  expect(project.meters[0]).toEqual({ tag: 'A', pipe: { bore: '1 m' } });
  expect(({} as { polluted?: unknown }).polluted).toBeUndefined();
});
