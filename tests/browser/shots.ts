/**
 * Pictures of the built app for the eye, into .shots/: every width and theme, a refused meter, a caution, the empty
 * project, the sheets on screen and on paper. The first one is also the picture of the README. Words behind the command
 * take only the shots whose names begin with one of them: `npm run shots -- size-390 sheet`.
 */
import { spawnSync } from 'node:child_process';
import { copyFile, mkdir, readFile, rm } from 'node:fs/promises';
import { fileURLToPath } from 'node:url';
import { type Browser, chromium, type Page } from '@playwright/test';
import { preview } from 'vite';
import { launchOptions } from './browser.mjs';

const root = fileURLToPath(new URL('../..', import.meta.url));
const folder = `${root}.shots/`;
const example = await readFile(`${root}public/examples/tern-island.headwright.json`, 'utf8');

type Theme = 'light' | 'dark';

interface Shot {
  readonly name: string;
  readonly width?: number;
  readonly height?: number;
  readonly theme?: Theme;
  /** The window alone, as it first appears; otherwise the whole length of the page. */
  readonly window?: boolean;
  /** Index of the meter at hand. */
  readonly meter?: number;
  readonly project?: string;
  readonly act?: (page: Page) => Promise<unknown>;
}

/** The example with its first meter changed. */
const changed = (change: object): string => {
  const project = JSON.parse(example);
  return JSON.stringify({ ...project, meters: [{ ...project.meters[0], ...change }, ...project.meters.slice(1)] });
};

const differential = (page: Page) => page.locator('[data-field="differential"]');
const sheet = async (page: Page): Promise<void> => {
  await page.getByRole('link', { name: 'Sheet' }).click();
  await page
    .getByRole('region', { name: /Sizing sheet/ })
    .first()
    .waitFor();
};

const themes: readonly Theme[] = ['light', 'dark'];

const shots: readonly Shot[] = [
  { name: 'readme', window: true },
  ...themes.flatMap((theme) =>
    [1440, 1024, 390].map((width) => ({
      name: `size-${width}-${theme}`,
      width,
      theme,
      ...(width === 390 ? { height: 844 } : {}),
    })),
  ),
  { name: 'size-1920-light', width: 1920 },
  { name: 'size-320-light', width: 320, height: 640 },
  { name: 'size-390-window', width: 390, height: 844, window: true },
  { name: 'steam-light', meter: 1 },
  { name: 'sea-water-light', meter: 2 },
  { name: 'stale-light', act: (page) => differential(page).fill('250 mbra') },
  { name: 'stale-dark', theme: 'dark', act: (page) => differential(page).fill('250 mbra') },
  { name: 'refused-light', project: changed({ differential: 'plenty' }) },
  {
    name: 'outside-light',
    project: changed({ fluid: { kind: 'stated', density: '900 kg/m3', viscosity: '20 mPa.s' } }),
  },
  { name: 'empty-light', window: true, project: '' },
  { name: 'empty-dark', window: true, theme: 'dark', project: '' },
  { name: 'empty-390', window: true, width: 390, height: 844, project: '' },
  { name: 'new-meter-light', project: '', act: (page) => page.getByRole('button', { name: 'Size a meter' }).click() },
  {
    name: 'working-light',
    act: (page) => page.locator('#working summary', { hasText: 'Discharge coefficient' }).first().click(),
  },
  { name: 'menu-light', window: true, act: (page) => page.getByRole('button', { name: 'Menu' }).click() },
  { name: 'keys-light', window: true, act: (page) => page.keyboard.press('?') },
  { name: 'us-units-light', project: JSON.stringify({ ...JSON.parse(example), display: 'US' }) },
  { name: 'sheet-light', act: sheet },
  { name: 'sheet-dark', window: true, theme: 'dark', act: sheet },
  { name: 'sheet-390', window: true, width: 390, height: 844, act: sheet },
];

/** The project of a shot, dropped on the window as a user would. */
async function put(page: Page, text: string): Promise<void> {
  const carried = await page.evaluateHandle((content) => {
    const transfer = new DataTransfer();
    transfer.items.add(new File([content], 'shot.headwright.json'));
    return transfer;
  }, text);
  await page.getByRole('main').dispatchEvent('drop', { dataTransfer: carried });
  await page.getByText('shot.headwright.json is open.').waitFor();
  await page.getByRole('button', { name: 'Dismiss' }).click();
}

async function open(browser: Browser, address: string, shot: Shot): Promise<Page> {
  const { width = 1440, height = 1100, theme = 'light', project = example, meter = 0 } = shot;
  const page = await browser.newPage({ viewport: { width, height }, colorScheme: theme, locale: 'en-GB' });
  await page.goto(address);
  await page.getByRole('main').waitFor();
  if (project !== '') await put(page, project);
  for (let step = 0; step < meter; step += 1) await page.keyboard.press(']');
  await shot.act?.(page);
  await page.waitForTimeout(400); // the curve may come a moment after the figures
  return page;
}

async function take(browser: Browser, address: string, shot: Shot): Promise<void> {
  const page = await open(browser, address, shot);
  await page.screenshot({ path: `${folder}${shot.name}.png`, fullPage: shot.window !== true });
  await page.close();
}

/** The pages of the PDF, 110 dots to the inch. */
async function print(browser: Browser, address: string, paper: 'A4' | 'Letter'): Promise<void> {
  const page = await open(browser, address, { name: paper, act: sheet });
  await page.getByRole('radio', { name: paper }).check();
  const path = `${folder}sheet-${paper}.pdf`;
  await page.pdf({ path, preferCSSPageSize: true, printBackground: true });
  const drawn = spawnSync('pdftoppm', ['-png', '-r', '110', path, path.replace('.pdf', '')]);
  if (drawn.status !== 0) throw new Error(`expected pictures of ${path}, got exit ${drawn.status}`);
  await page.close();
}

const asked = process.argv.slice(process.argv.findIndex((word) => word.endsWith('shots.ts')) + 1);
const wanted = (name: string): boolean => asked.length === 0 || asked.some((word) => name.startsWith(word));
const papers = (['A4', 'Letter'] as const).filter((paper) => wanted(`sheet-${paper}`));

if (asked.length === 0) await rm(folder, { recursive: true, force: true });
await mkdir(folder, { recursive: true });
const server = await preview({ root, logLevel: 'error', preview: { port: 0, host: '127.0.0.1' } });
const browser = await chromium.launch(launchOptions());
try {
  const address = server.resolvedUrls?.local[0];
  if (address === undefined) throw new Error('expected the address of the server, got none');
  for (const shot of shots.filter(({ name }) => wanted(name))) await take(browser, address, shot);
  for (const paper of papers) await print(browser, address, paper);
  if (wanted('readme')) await copyFile(`${folder}readme.png`, `${root}tests/browser/readme.png`);
} finally {
  await browser.close();
  await server.close();
}
process.stdout.write('The pictures are in .shots/\n');
