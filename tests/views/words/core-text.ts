/** The text of every file of the core, by its path below src/core. */
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

const core = join(import.meta.dirname, '../../../src/core');

export const coreText: ReadonlyMap<string, string> = new Map(
  readdirSync(core, { recursive: true, encoding: 'utf8' })
    .filter((file) => file.endsWith('.ts'))
    .map((file) => [file.replaceAll('\\', '/'), readFileSync(join(core, file), 'utf8')]),
);
