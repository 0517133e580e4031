/**
 * A log in the built app, in a browser with a profile on the disk: from the click to the saved rows against reading the
 * same file and doing nothing with it; then the memory of the page at three million rows and at thirty.
 */
import { appendFileSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { type BrowserContext, chromium, type Page } from '@playwright/test';
import { preview } from 'vite';
import { launchOptions } from '../browser/browser.mjs';
import { exampleBytes, midnight, projectOf, steamMeter } from '../core/log/example.ts';
import { spread } from './pairs.ts';
import type { Line } from './report.ts';

const DAY = 86_400;
const PAIRS = 15;
const PAIR_DAYS = 35; // three million rows, beside which a surface costs little
const MEMORY_DAYS = [35, 353] as const; // three million rows, thirty million
const LONG = 1_800_000; // ms

/** The example of one day after another as one file; tells how many rows it has. */
function writeLog(path: string, days: number): number {
  const bytes = exampleBytes();
  const starts: number[] = [];
  for (let at = bytes.indexOf(10) + 1; at > 0 && at < bytes.length; at = bytes.indexOf(10, at) + 1) starts.push(at);
  writeFileSync(path, bytes.subarray(0, starts[0]));
  for (let day = 0; day < days; day += 1) {
    const date = new TextEncoder().encode(new Date((midnight + day * DAY) * 1000).toISOString().slice(0, 10));
    for (const at of starts) bytes.set(date, at);
    appendFileSync(path, bytes.subarray(starts[0]));
  }
  return days * starts.length;
}

async function openMeter(page: Page, address: string, project: string): Promise<void> {
  await page.goto(address);
  await page.getByRole('button', { name: 'Size a meter' }).waitFor();
  const chooser = page.waitForEvent('filechooser');
  await page.keyboard.press('Control+o');
  await (await chooser).setFiles(project);
  await page.getByText('is open. It is kept').waitFor();
  await page.evaluate(() => {
    window.location.hash = '#/read';
  });
}

async function openLog(page: Page, path: string): Promise<void> {
  const chooser = page.waitForEvent('filechooser');
  await page.getByRole('button', { name: /^Open (a log|another)$/ }).click();
  await (await chooser).setFiles(path);
  await page.getByRole('button', { name: 'Convert the log' }).and(page.locator(':enabled')).waitFor();
}

/** s from the click to the last row. */
const convert = (page: Page): Promise<number> =>
  page.evaluate(async () => {
    const named = (name: RegExp) => [...document.querySelectorAll('button')].find((one) => name.test(one.textContent));
    const began = performance.now();
    named(/^Convert (the log|it again)$/)?.click();
    await new Promise((resolve) => setTimeout(resolve, 20));
    while (named(/^Cancel$/)) await new Promise((resolve) => setTimeout(resolve, 5));
    if (!named(/^Convert it again$/)) throw new Error(`expected a converted log, got ${document.body.textContent}`);
    return (performance.now() - began) / 1000;
  });

/** s to read the file through one buffer, in the page. */
const readOnly = (page: Page): Promise<number> =>
  page.evaluate(async () => {
    const file = document.querySelector<HTMLInputElement>('#yardstick')?.files?.[0];
    if (file === undefined) throw new Error('expected the file of the yardstick, got none');
    const began = performance.now();
    const reader = file.stream().getReader({ mode: 'byob' });
    let buffer = new ArrayBuffer(1 << 18);
    for (;;) {
      const { done, value } = await reader.read(new Uint8Array(buffer));
      if (done || value === undefined) return (performance.now() - began) / 1000;
      buffer = value.buffer;
    }
  });

async function pairs(page: Page, path: string): Promise<Line> {
  await page.evaluate(() => {
    const input = document.body.appendChild(document.createElement('input'));
    Object.assign(input, { type: 'file', id: 'yardstick' });
  });
  await page.locator('#yardstick').setInputFiles(path);
  await openLog(page, path);
  await convert(page);
  const times: [number, number][] = [];
  for (let pair = 0; pair < PAIRS; pair += 1) times.push([await convert(page), await readOnly(page)]);
  const [above, below] = [0, 1].map((side) => spread(times.map((both) => both[side as 0 | 1])).median);
  const ratio = {
    ...spread(times.map(([one, other]) => one / other)),
    pairs: PAIRS,
    above: above ?? 0,
    below: below ?? 0,
  };
  return { name: 'a log in the browser: converted and kept / read only', value: ratio.median, ratio, target: '<= 4.5' };
}

/** Resident memory of the page's process, MB; undefined where the system does not tell. */
async function residentOf(context: BrowserContext): Promise<(() => number) | undefined> {
  const session = await context.browser()?.newBrowserCDPSession();
  if (session === undefined || process.platform !== 'linux') return undefined;
  const { processInfo } = await session.send('SystemInfo.getProcessInfo');
  const pids = processInfo.filter(({ type }) => type === 'renderer').map(({ id }) => id);
  const rss = (pid: number): number => {
    const status = readFileSync(`/proc/${pid}/status`, 'utf8');
    return Number(/VmRSS:\s+(\d+)/.exec(status)?.[1] ?? 0) / 1000;
  };
  return () => Math.max(...pids.map(rss));
}

async function peakOf(page: Page, path: string, resident: () => number): Promise<number> {
  await openLog(page, path);
  const idle = resident();
  let peak = 0;
  const watch = setInterval(() => {
    peak = Math.max(peak, resident());
  }, 100);
  await convert(page);
  clearInterval(watch);
  return peak - idle;
}

async function memory(context: BrowserContext, page: Page, folder: string): Promise<Line[]> {
  const resident = await residentOf(context);
  if (resident === undefined) return [];
  const peaks: number[] = [];
  const lines: Line[] = [];
  for (const days of MEMORY_DAYS) {
    const path = join(folder, `${days}.csv`);
    const rows = writeLog(path, days);
    const peak = await peakOf(page, path, resident);
    rmSync(path);
    peaks.push(peak);
    lines.push({
      name: `page at ${Math.round(rows / 1e6)} M rows, peak less idle`,
      value: peak,
      unit: 'MB',
      target: '<= 96 MB',
    });
  }
  const growth = (peaks.at(-1) ?? 0) - (peaks[0] ?? 0);
  return [...lines, { name: 'its growth between them', value: growth, unit: 'MB', target: '<= 16 MB' }];
}

export async function browserLog(root: string): Promise<Line[]> {
  const folder = mkdtempSync(join(tmpdir(), 'headwright-log-'));
  const server = await preview({ root, logLevel: 'error', preview: { port: 0 } });
  const address = server.resolvedUrls?.local[0];
  if (address === undefined) throw new Error('expected the preview to have an address, got none');
  const context = await chromium.launchPersistentContext(join(folder, 'profile'), launchOptions());
  try {
    context.setDefaultTimeout(LONG);
    await context.addInitScript(() => Reflect.deleteProperty(window, 'showOpenFilePicker'));
    const page = await context.newPage();
    page.on('filechooser', () => undefined); // without a listener the browser closes a dialog at once
    const project = join(folder, 'project.json');
    writeFileSync(project, JSON.stringify(projectOf(steamMeter)));
    const path = join(folder, 'pairs.csv');
    writeLog(path, PAIR_DAYS);
    await openMeter(page, address, project);
    return [await pairs(page, path), ...(await memory(context, page, folder))];
  } finally {
    await context.close();
    await server.close();
    rmSync(folder, { recursive: true, force: true });
  }
}
