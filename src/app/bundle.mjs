/**
 * Turns a TypeScript entry into one file that plain Node runs, and keeps it in .build until a source is newer.
 * With `alone` the file carries its packages with it; without, it finds them in node_modules.
 */
import { mkdirSync, readdirSync, renameSync, statSync, utimesSync, writeFileSync } from 'node:fs';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { ready } from './ready.mjs';

const root = fileURLToPath(new URL('../..', import.meta.url));
const folder = `${root}.build`;

/** Time of the newest change below a path; folders count, so that a deleted file is noticed. */
const newest = (/** @type {string} */ path) => {
  let time = statSync(path).mtimeMs;
  for (const entry of readdirSync(path, { withFileTypes: true })) {
    const child = `${path}/${entry.name}`;
    time = Math.max(time, entry.isDirectory() ? newest(child) : statSync(child).mtimeMs);
  }
  return time;
};

const build = async (/** @type {string} */ entry, /** @type {boolean} */ alone) => {
  ready();
  const vite = await import('vite');
  const result = await vite.build({
    root,
    configFile: false,
    logLevel: 'silent',
    publicDir: false,
    ssr: alone ? { noExternal: true, target: 'node' } : { target: 'node' },
    build: {
      ssr: entry,
      target: 'node20',
      write: false,
      minify: false,
      rolldownOptions: { output: { codeSplitting: false } },
    },
  });
  const output = [result].flat().flatMap((part) => ('output' in part ? part.output : []));
  const [chunk, ...others] = output.filter((file) => file.type === 'chunk');
  if (!chunk || others.length > 0) throw new Error(`expected one file from ${entry}, got ${output.length}`);
  return chunk.code;
};

/** The path of the bundle of `entry` (from the root, with slashes), built anew when it is out of date. */
export const bundle = async (/** @type {string} */ entry, { alone = true, watched = ['src'] } = {}) => {
  const target = `${folder}/${alone ? 'headwright' : entry.replaceAll('/', '-').replace(/\.ts$/, '')}.js`;
  const built = statSync(target, { throwIfNoEntry: false })?.mtimeMs ?? 0;
  if (watched.some((path) => newest(root + path) > built)) {
    const started = new Date();
    const code = await build(entry, alone);
    mkdirSync(folder, { recursive: true });
    const draft = `${target}.${process.pid}`; // two builds at once must not see half of each other
    writeFileSync(draft, code);
    utimesSync(draft, started, started); // a source saved during the build is newer
    renameSync(draft, target);
  }
  return pathToFileURL(target).href;
};
