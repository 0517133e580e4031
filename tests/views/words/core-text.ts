/** The text of every file of the core, by its path below src/core. */
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

const source = join(import.meta.dirname, '../../../src');

const textOf = (room: string): ReadonlyMap<string, string> =>
  new Map(
    readdirSync(join(source, room), { recursive: true, encoding: 'utf8' })
      .filter((file) => file.endsWith('.ts'))
      .map((file) => [file.replaceAll('\\', '/'), readFileSync(join(source, room, file), 'utf8')]),
  );

export const coreText = textOf('core');

/** The same of the worker of logs, by its path below src/worker. */
export const workerText = textOf('worker');
