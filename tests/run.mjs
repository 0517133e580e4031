/** Runs a TypeScript file of the tests outside Vitest: `node tests/run.mjs tests/bench/bench.ts`. */
import { bundle } from '../src/app/bundle.mjs';

const entry = process.argv[2];
if (!entry) throw new Error('expected the path of a TypeScript file, got none');
await import(await bundle(entry, { alone: false, watched: ['src', 'tests'] }));
