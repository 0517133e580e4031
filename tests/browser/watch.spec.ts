/** The watch that every other spec stands under bites: each planted fault is heard. */
import { expect, type Page, test } from '@playwright/test';
import { listen } from './watched.ts';

const planted: Readonly<Record<string, { readonly plant: (page: Page) => Promise<unknown>; readonly heard: RegExp }>> =
  {
    'an error in the console': {
      plant: (page) => page.evaluate(() => console.error('planted')),
      heard: /console error: planted/,
    },
    'a warning in the console': {
      plant: (page) => page.evaluate(() => console.warn('planted')),
      heard: /console warning: planted/,
    },
    'a word in the console': {
      plant: (page) => page.evaluate(() => console.log('planted')),
      heard: /console log: planted/,
    },
    'an error nobody catches': {
      plant: (page) =>
        page.evaluate(
          () =>
            void setTimeout(() => {
              throw new Error('planted');
            }),
        ),
      heard: /uncaught: planted/,
    },
    'a promise nobody catches': {
      plant: (page) => page.evaluate(() => void Promise.reject(new Error('planted'))),
      heard: /uncaught: planted/,
    },
    'a request to another origin': {
      plant: (page) => page.evaluate(() => fetch('http://localhost:9/', { mode: 'no-cors' }).catch(() => undefined)),
      heard: /policy: connect-src/,
    },
    'an inline script': {
      plant: (page) =>
        page.evaluate(() => {
          const script = document.createElement('script');
          script.textContent = 'document.title = "planted"';
          document.head.append(script);
          if (document.title === 'planted') throw new Error('expected the script to be blocked, got it run');
        }),
      heard: /policy: script-src-elem/,
    },
    'an inline style': {
      plant: (page) => page.evaluate(() => document.body.setAttribute('style', 'color: red')),
      heard: /policy: style-src-attr/,
    },
    'a page of another origin': {
      plant: (page) => page.goto('http://localhost:9/').catch(() => undefined),
      heard: /foreign request: http:\/\/localhost:9/,
    },
  };

test('each planted fault is heard', async ({ page, context, baseURL }) => {
  const list = await listen(context, baseURL ?? '');
  await page.goto('/');
  await expect(page.getByRole('main')).toBeVisible();
  expect(list).toEqual([]);
  for (const [name, { plant, heard }] of Object.entries(planted))
    await test.step(name, async () => {
      const before = list.length;
      await plant(page);
      await expect.poll(() => list.slice(before).join('\n')).toMatch(heard);
    });
});
