/** Installs the packages when they are missing or older than the lock. Says nothing on standard output. */
import { spawnSync } from 'node:child_process';
import { lstatSync, realpathSync, statSync } from 'node:fs';
import { fileURLToPath } from 'node:url';

const root = fileURLToPath(new URL('../..', import.meta.url));
const changed = (/** @type {string} */ path) => statSync(root + path, { throwIfNoEntry: false })?.mtimeMs ?? 0;

/** A link leads to the packages of another checkout, which are not ours to replace. */
const isLink = () => lstatSync(`${root}node_modules`, { throwIfNoEntry: false })?.isSymbolicLink() === true;

export const ready = () => {
  if (isLink() || changed('node_modules/.package-lock.json') >= changed('package-lock.json')) return;
  process.stderr.write('Installing the packages (once)...\n');
  const npm = spawnSync('npm', ['ci', '--silent'], {
    cwd: root,
    stdio: ['ignore', 2, 2],
    shell: process.platform === 'win32',
  });
  if (npm.status !== 0) throw new Error(`expected \`npm ci\` to succeed, got ${npm.status ?? npm.error?.message}`);
};

if (process.argv[1] && realpathSync(process.argv[1]) === fileURLToPath(import.meta.url)) ready();
