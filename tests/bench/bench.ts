/**
 * `npm run bench`: measures, prints a table and writes .build/bench.json. A report: nothing here passes or fails on
 * time. Names on the command line choose parts: `npm run bench -- solving screen`.
 */
import { mkdirSync, writeFileSync } from 'node:fs';
import { cpus } from 'node:os';
import { join } from 'node:path';
import { browserLog } from './browser-log.ts';
import { conversion } from './conversion.ts';
import { gas } from './gas.ts';
import { log } from './log.ts';
import { checksum } from './pairs.ts';
import { type Line, table } from './report.ts';
import { rows } from './rows.ts';
import { screen } from './screen.ts';
import { orificeCases, ownFlow, solving } from './solving.ts';
import { water } from './water.ts';
import { whole } from './whole.ts';

const root = process.cwd(); // npm runs its scripts there
const parts: Readonly<Record<string, () => Line[] | Promise<Line[]>>> = {
  solving: () => solving(orificeCases()),
  whole: () => whole(root, ownFlow(orificeCases())),
  water,
  gas,
  rows,
  log,
  conversion: () => conversion(root),
  screen: () => screen(root),
  'browser-log': () => browserLog(root),
};

const words = process.argv.slice(2).filter((word) => word in parts);
const asked = words.length > 0 ? words : Object.keys(parts);
const found: Record<string, Line[]> = {};
for (const name of asked) {
  process.stderr.write(`Measuring ${name}...\n`);
  const lines = await parts[name]?.();
  if (lines === undefined) continue;
  found[name] = lines;
  process.stdout.write(`\n${table(lines)}\n`);
}

const on = { node: process.version, processors: cpus().map(({ model }) => model), checksum: checksum() };
mkdirSync(join(root, '.build'), { recursive: true });
writeFileSync(join(root, '.build/bench.json'), `${JSON.stringify({ on, parts: found }, null, 2)}\n`);
process.stdout.write(`\nNode ${process.version}; all figures in .build/bench.json\n`);
