/**
 * `npm run accuracy`: writes the table of README.md between its two marks, from the vectors as the core answers today.
 * With `--check` nothing is written; it fails when the table there is another.
 */
import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { accuracyTable, withTable } from './table.ts';

const path = join(process.cwd(), 'README.md'); // npm runs its scripts in the root
const readme = readFileSync(path, 'utf8');
const fresh = withTable(readme, accuracyTable());
if (process.argv.includes('--check')) {
  if (fresh !== readme) {
    process.stderr.write('The accuracy table of README.md is out of date: run `npm run accuracy`.\n');
    process.exitCode = 1;
  }
} else if (fresh !== readme) {
  writeFileSync(path, fresh);
  process.stdout.write('README.md: the accuracy table is new.\n');
} else process.stdout.write('README.md: the accuracy table is as it was.\n');
