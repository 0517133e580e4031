/**
 * Runs a TypeScript file of the tests outside Vitest: `node tests/run.mjs tests/vectors/accuracy.ts`.
 * With `--built` it is first bundled, so that timings are those of plain code.
 */
import { fileURLToPath } from 'node:url';
import { runnerImport } from 'vite';
import { bundle } from '../src/app/bundle.mjs';

const root = fileURLToPath(new URL('..', import.meta.url));
const words = process.argv.slice(2);
const entry = words.find((word) => !word.startsWith('--'));
if (!entry) throw new Error('expected the path of a TypeScript file, got none');

if (words.includes('--built')) await import(await bundle(entry, { alone: false, watched: ['src', 'tests'] }));
else await runnerImport(root + entry, { root, configFile: false, logLevel: 'error' });
