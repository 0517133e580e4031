/** The built page as a house: its policy bites, nothing foreign is asked for, and it stands without a network. */
import { expect, type Page, test } from '@playwright/test';

const open = async (page: Page): Promise<string[]> => {
  const said: string[] = [];
  page.on('console', (message) => said.push(`${message.type()}: ${message.text()}`));
  page.on('pageerror', (error) => said.push(`error: ${error.message}`));
  page.on('request', (request) => {
    const { protocol, hostname } = new URL(request.url());
    if (protocol.startsWith('http') && hostname !== '127.0.0.1') said.push(`foreign request: ${request.url()}`);
  });
  await page.goto('/');
  await expect(page.locator('#root > *').first()).toBeVisible();
  return said;
};

const kept = (page: Page): Promise<unknown> =>
  page.waitForFunction(() => navigator.serviceWorker.controller?.state === 'activated');

test('the policy stands first in the head and the page keeps to it', async ({ page }) => {
  const said = await open(page);
  const first = page.locator('head > *').first();
  await expect(first).toHaveAttribute('http-equiv', 'Content-Security-Policy');
  await expect(first).toHaveAttribute(
    'content',
    "default-src 'self'; connect-src 'self'; object-src 'none'; base-uri 'self'; form-action 'none'",
  );
  await kept(page);
  expect(said).toEqual([]);
});

test('after the first visit every file is there without a network', async ({ page, context }) => {
  const said = await open(page);
  await kept(page);
  await context.setOffline(true);
  await page.reload();
  await expect(page.locator('#root > *').first()).toBeVisible();
  // Not only the first screen: every file of the build answers from what was kept.
  const kinds = await page.evaluate(async () => {
    const caches = await window.caches.keys();
    const requests = await Promise.all(caches.map(async (name) => (await window.caches.open(name)).keys()));
    const urls = requests.flat().map((request) => new URL(request.url));
    const answers = await Promise.all(urls.map(async (url) => (await fetch(url.pathname)).ok));
    return {
      count: urls.length,
      all: answers.every(Boolean),
      endings: urls.map((url) => url.pathname.split('.').pop()),
    };
  });
  expect(kinds.all).toBe(true);
  expect(kinds.count).toBeGreaterThan(5);
  for (const ending of ['html', 'js', 'svg', 'png', 'webmanifest']) expect(kinds.endings).toContain(ending);
  expect(said).toEqual([]);
});

test('the page can be installed: the manifest names icons that are there', async ({ page, request }) => {
  await open(page);
  const address = await page.locator('link[rel=manifest]').getAttribute('href');
  const manifest = await (await request.get(address ?? '')).json();
  expect(manifest.name).toBe('Headwright');
  for (const { src } of manifest.icons)
    expect((await request.get(`/${src}`)).headers()['content-type']).toMatch(/^image\//);
});
