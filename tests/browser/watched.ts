/**
 * The test of every spec here. It fails on whatever the page says in its console, on an error nobody caught, on a
 * breach of the content security policy, and on a request to another origin; service worker and all tabs included.
 */
import { type BrowserContext, test as base, expect } from '@playwright/test';

/** Fills the list it returns as long as the context lives. */
export async function listen(context: BrowserContext, home: string): Promise<readonly string[]> {
  const heard: string[] = [];
  context.on('console', (message) => heard.push(`console ${message.type()}: ${message.text()}`));
  context.on('weberror', (trouble) => heard.push(`uncaught: ${trouble.error().message}`));
  context.on('request', (request) => {
    const { origin, protocol } = new URL(request.url());
    const own = origin === new URL(home).origin || protocol === 'blob:' || protocol === 'about:';
    if (!own) heard.push(`foreign request: ${request.url()}`);
  });
  await context.exposeFunction('tellBreach', (words: string) => heard.push(`policy: ${words}`));
  await context.addInitScript(() => {
    const { tellBreach } = window as unknown as { tellBreach: (words: string) => void };
    document.addEventListener('securitypolicyviolation', (event) =>
      tellBreach(`${event.effectiveDirective} ${event.blockedURI}`),
    );
  });
  return heard;
}

/** A file dialog of the system cannot be driven from here: files come and go by input and download instead. */
const withoutPickers = (context: BrowserContext): Promise<unknown> =>
  context.addInitScript(() => {
    Reflect.deleteProperty(window, 'showOpenFilePicker');
    Reflect.deleteProperty(window, 'showSaveFilePicker');
  });

/** While somebody listens, the browser hands every file dialog over; it would close it at once otherwise. */
const withDialogs = (context: BrowserContext): unknown =>
  context.on('page', (page) => page.on('filechooser', () => undefined));

export const test = base.extend<{ readonly watched: readonly string[] }>({
  watched: [
    async ({ context, baseURL }, use) => {
      await withoutPickers(context);
      withDialogs(context);
      const heard = await listen(context, baseURL ?? '');
      await use(heard);
      expect(heard, 'the page is silent and asks nobody').toEqual([]);
    },
    { auto: true },
  ],
});

export { expect };
