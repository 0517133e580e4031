/** README.md tells how accurate the core is; the table there is the one the vectors give today. */
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { accuracyTable, withTable } from './vectors/table.ts';

const readme = readFileSync(join(import.meta.dirname, '../README.md'), 'utf8');

test('the accuracy table of README.md is up to date', () => {
  expect(readme, 'run `npm run accuracy`').toContain(`\n${accuracyTable()}\n`);
  expect(withTable(readme, accuracyTable())).toBe(readme);
});

test('an old table is noticed', () => {
  const old = readme.replace('| 179 |', '| 178 |');
  expect(old).not.toBe(readme);
  expect(withTable(old, accuracyTable())).not.toBe(old);
});
