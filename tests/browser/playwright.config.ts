import { fileURLToPath } from 'node:url';
import { defineConfig } from '@playwright/test';
import { launchOptions } from './browser.mjs';

const root = fileURLToPath(new URL('../..', import.meta.url));
const port = Number(process.env.HEADWRIGHT_PORT ?? 4174);
const address = `http://127.0.0.1:${port}`;
const inCI = Boolean(process.env.CI);

/** The whole app, as built: `npm run build` comes first. */
export default defineConfig({
  testDir: '.',
  testMatch: '**/*.spec.ts',
  outputDir: `${root}.build/browser`,
  forbidOnly: inCI,
  retries: 0,
  workers: 2,
  fullyParallel: true,
  timeout: 60_000, // twice what the longest takes on two busy cores
  expect: { timeout: 15_000 },
  reporter: [['list']],
  use: {
    baseURL: address,
    browserName: 'chromium',
    headless: true,
    launchOptions: launchOptions(),
    trace: { mode: 'retain-on-failure', snapshots: false, screenshots: false, sources: false },
    video: 'off',
    locale: 'en-GB',
    timezoneId: 'UTC',
    actionTimeout: 15_000,
  },
  webServer: {
    command: `npx vite preview --strictPort --port ${port}`,
    cwd: root,
    url: address,
    reuseExistingServer: !inCI,
    timeout: 60_000,
  },
});
