/** The built app in a browser: from key to paint with and without the chart, the first load, the weight of its code. */
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';
import { type Browser, chromium, type Page } from '@playwright/test';
import { preview } from 'vite';
import { launchOptions } from '../browser/browser.mjs';
import { ratioOf, spread } from './pairs.ts';
import { type Line, ratioLine } from './report.ts';

const KEYS = 50;
const PAIRS = 15;
const KEYS_PER_SLICE = 10;
const LOADS = 15;
const THROTTLE = 4;
const BORES = ['102.26', '154.05', '77.93', '202.72', '128.19'];

/** Median time from the event to the frame after it, s, while bores are typed into the field. */
async function keysToPaint(page: Page, count: number): Promise<number> {
  await page.evaluate(() => {
    const watched = window as unknown as { paintTimes?: number[] };
    const known = watched.paintTimes !== undefined;
    watched.paintTimes = [];
    if (known) return; // the page is watched already
    const afterPaint = (event: Event) => {
      const { port1, port2 } = new MessageChannel();
      port1.onmessage = () => watched.paintTimes?.push(performance.now() - event.timeStamp);
      port2.postMessage(0);
    };
    window.addEventListener('input', (event) => requestAnimationFrame(() => afterPaint(event)), { capture: true });
  });
  const field = page.getByRole('textbox', { name: 'Pipe bore', exact: true }).first();
  let typed = 0;
  for (let turn = 0; typed < count; turn += 1) {
    await field.fill('');
    for (const key of `${BORES[turn % BORES.length]} mm`.slice(0, count - typed)) {
      await field.press(key === ' ' ? 'Space' : key);
      typed += 1;
    }
    await page.waitForTimeout(200); // the chart, which may lag, must not run into the next word
  }
  const times = await page.evaluate(() => (window as unknown as { paintTimes: number[] }).paintTimes);
  if (times.length < count) throw new Error(`expected ${count} painted keys, got ${times.length}`);
  return spread(times).median / 1000;
}

async function openExample(browser: Browser, address: string): Promise<Page> {
  const page = await browser.newPage({ viewport: { width: 1440, height: 900 }, serviceWorkers: 'block' });
  await page.goto(address);
  await page.getByRole('button', { name: 'Open the example' }).click();
  await page.getByRole('heading', { name: 'Flow against differential' }).waitFor();
  return page;
}

/** Takes the chart out of the page: without a width it is not drawn. */
const hideChart = (page: Page): Promise<void> =>
  page.getByRole('region', { name: 'Flow against differential' }).evaluate((panel: HTMLElement) => {
    panel.style.display = 'none';
  });

async function typing(browser: Browser, address: string): Promise<Line[]> {
  const [drawn, hidden] = [await openExample(browser, address), await openExample(browser, address)];
  await hideChart(hidden);
  for (const page of [drawn, hidden]) await keysToPaint(page, KEYS);
  const times: [number, number][] = [];
  for (let pair = 0; pair < PAIRS; pair += 1) {
    await drawn.bringToFront();
    const above = await keysToPaint(drawn, KEYS_PER_SLICE);
    await hidden.bringToFront();
    times.push([above, await keysToPaint(hidden, KEYS_PER_SLICE)]);
  }
  await Promise.all([drawn.close(), hidden.close()]);
  return [ratioLine('key to paint: with chart / without', ratioOf(times), '<= 1.5')];
}

async function longTasks(browser: Browser, address: string): Promise<Line[]> {
  const page = await openExample(browser, address);
  await keysToPaint(page, KEYS);
  const session = await page.context().newCDPSession(page);
  await session.send('Emulation.setCPUThrottlingRate', { rate: THROTTLE });
  await page.evaluate(() => {
    const found: number[] = [];
    Object.assign(window, { longTasks: found });
    new PerformanceObserver((list) => found.push(...list.getEntries().map((entry) => entry.duration))).observe({
      type: 'longtask',
    });
  });
  const median = await keysToPaint(page, KEYS);
  const tasks = await page.evaluate(() => (window as unknown as { longTasks: number[] }).longTasks);
  await page.close();
  return [
    { name: `key to paint at ${THROTTLE}x throttle`, value: median, unit: 's' },
    { name: `tasks above 50 ms in ${KEYS} keys at ${THROTTLE}x throttle`, value: tasks.length, target: '0' },
    { name: 'the longest of them', value: Math.max(0, ...tasks) / 1000, unit: 's' },
  ];
}

async function firstLoad(browser: Browser, address: string): Promise<Line> {
  const times: number[] = [];
  for (let load = 0; load < LOADS; load += 1) {
    const context = await browser.newContext({ serviceWorkers: 'block' }); // a new one has a cold cache
    const page = await context.newPage();
    const started = performance.now();
    await page.goto(address, { waitUntil: 'commit' });
    await page.getByRole('button', { name: 'Size a meter' }).waitFor();
    times.push((performance.now() - started) / 1000);
    await context.close();
  }
  return { name: 'first load to usable, cold cache', value: spread(times).median, unit: 's', target: '<= 1 s' };
}

/** What index.html asks for at once, packed. */
function weight(root: string): Line {
  const html = readFileSync(join(root, 'dist/index.html'), 'utf8');
  const links = [...html.matchAll(/(?:src|href)="\/(assets\/[^"]+)"/g)].map(([, path = '']) => `dist/${path}`);
  const bytes = ['dist/index.html', ...new Set(links)]
    .map((path) => gzipSync(readFileSync(join(root, path))).length)
    .reduce((sum, one) => sum + one, 0);
  return { name: 'code of the first screen, gzip', value: bytes / 1000, unit: 'kB', target: '<= 220 kB' };
}

export async function screen(root: string): Promise<Line[]> {
  const server = await preview({ root, logLevel: 'error', preview: { port: 0 } });
  const address = server.resolvedUrls?.local[0];
  if (address === undefined) throw new Error('expected the preview to have an address, got none');
  const browser = await chromium.launch(launchOptions());
  try {
    return [
      ...(await typing(browser, address)),
      ...(await longTasks(browser, address)),
      await firstLoad(browser, address),
      weight(root),
    ];
  } finally {
    await browser.close();
    await server.close();
  }
}
