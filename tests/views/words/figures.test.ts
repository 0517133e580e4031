import { readdirSync, readFileSync } from 'node:fs';
import { expect, it } from 'vitest';

const folder = new URL('../../../src/views/words/', import.meta.url);
/** The texts of a base state are written into the file, which has plain spaces. */
const files = readdirSync(folder).filter((file) => !['base-states.ts', 'print.ts'].includes(file));

/** A figure and its unit with a plain space between them, where a line could end. */
const open = /'[^']*\d (?:%|°[CF]|mm|mbar|k?Pa|psi|D\b)[^']*'|`[^`]*\d (?:%|°[CF]|mm|mbar|k?Pa|psi|D\b)[^`]*`/;

it('no figure of a sentence can be parted from its unit at the end of a line', () => {
  expect(files.length).toBeGreaterThan(40);
  const found = files.flatMap((file) =>
    readFileSync(new URL(file, folder), 'utf8')
      .split('\n')
      .filter((line) => !/^\s*(?:\*|\/[/*])/.test(line) && open.test(line))
      .map((line) => `${file}: ${line.trim()}`),
  );
  expect(found).toEqual([]);
  expect(open.test("cause: 'below 95 % of it'")).toBe(true);
});
