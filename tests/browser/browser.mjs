/**
 * Finds what the browser tests need outside npm: a Chromium and pdftotext. Run as a program it also installs what is
 * missing; imported, it only looks. Order: the variable HEADWRIGHT_BROWSER, the path, Playwright's own cache, then (as
 * root on Debian) apt, then Playwright's download.
 */
import { spawnSync } from 'node:child_process';
import { accessSync, constants, existsSync, realpathSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { chromium } from '@playwright/test';

const browsers = ['chromium', 'chromium-browser', 'google-chrome', 'google-chrome-stable', 'microsoft-edge'];
const isRoot = process.getuid?.() === 0;

const runs = (/** @type {string} */ path) => {
  try {
    accessSync(path, constants.X_OK);
    return true;
  } catch {
    return false; // not there, or not ours to run: the next place is tried
  }
};

const onPath = (/** @type {string[]} */ names) =>
  names
    .flatMap((name) => (process.env.PATH ?? '').split(delimiter).map((folder) => join(folder, name)))
    .find((path) => runs(path));

/** The path of a browser, or undefined. */
export const findBrowser = () => {
  const named = process.env.HEADWRIGHT_BROWSER;
  if (named) {
    if (!runs(named)) throw new Error(`expected HEADWRIGHT_BROWSER to be a program, got ${named}`);
    return named;
  }
  return onPath(browsers) ?? [chromium.executablePath()].find((path) => runs(path));
};

/** The path of pdftotext, or undefined. */
export const findPdfReader = () => onPath(['pdftotext']);

/** How every test and script starts the browser: quiet, and without talking to anyone. */
export const launchOptions = () => {
  const executablePath = findBrowser();
  if (!executablePath)
    throw new Error('expected a browser, got none: run `node tests/browser/browser.mjs` to install one');
  return {
    executablePath,
    chromiumSandbox: !isRoot,
    args: [
      '--disable-gpu',
      '--disable-quic',
      '--disable-sync',
      '--no-first-run',
      '--disable-background-networking',
      '--disable-component-update',
    ],
  };
};

const run = (/** @type {string} */ command, /** @type {string[]} */ ...args) => {
  process.stderr.write(`${[command, ...args].join(' ')}\n`);
  return spawnSync(command, args, {
    stdio: ['ignore', 2, 2],
    env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' },
    shell: process.platform === 'win32',
  }).status;
};

const install = () => {
  const packages = [...(findBrowser() ? [] : ['chromium']), ...(findPdfReader() ? [] : ['poppler-utils'])];
  if (packages.length > 0 && isRoot && existsSync('/etc/debian_version')) {
    run('apt-get', 'update', '-q');
    run('apt-get', 'install', '-y', '-q', '--no-install-recommends', ...packages);
  }
  if (!findBrowser()) run('npx', 'playwright', 'install', 'chromium');
  if (!findBrowser())
    throw new Error(
      'expected a Chromium for the browser tests, got none: install one, or name it in HEADWRIGHT_BROWSER',
    );
  if (!findPdfReader()) throw new Error('expected pdftotext for the print tests, got none: install poppler-utils');
};

if (process.argv[1] && realpathSync(process.argv[1]) === fileURLToPath(import.meta.url)) {
  install();
  process.stdout.write(`Browser: ${findBrowser()}\nPDF reader: ${findPdfReader()}\n`);
}
