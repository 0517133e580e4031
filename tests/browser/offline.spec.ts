/** After one visit everything is there without a network: the form, the curve, the sheet, the example. */
import type { Page } from '@playwright/test';
import { answer, field, keeping, main, openExample, panel, press } from './hand.ts';
import { expect, test } from './watched.ts';

const installed = (page: Page): Promise<unknown> =>
  page.waitForFunction(() => navigator.serviceWorker.controller?.state === 'activated');

test('a reload without a network finds the work and sizes it anew', async ({ page, context }) => {
  await openExample(page);
  await installed(page);
  await expect(keeping(page)).toContainText('Kept in this browser');
  await context.setOffline(true);
  await page.reload();
  await field(page, 'Flow to be measured', 'Differential').fill('300');
  await expect(answer(page)).toContainText('reads 300 mbar');
  await expect(panel(page, 'Flow against differential').locator('svg').first()).toBeVisible();
  await page.getByRole('link', { name: 'Sheet' }).click();
  await expect(
    page
      .getByRole('region', { name: /FE-1101, Sizing sheet/ })
      .locator('svg')
      .first(),
  ).toBeVisible();
});

test('a place of the program opens by its address without a network', async ({ page, context }) => {
  await openExample(page);
  await installed(page);
  await expect(keeping(page)).toContainText('Kept in this browser');
  await context.setOffline(true);
  const fresh = await context.newPage();
  await fresh.goto('/#/sheet');
  await expect(fresh.getByRole('region', { name: /FE-1101, Sizing sheet/ })).toBeVisible();
});

test('the example is at hand without a network before it was ever opened', async ({ page, context }) => {
  await page.goto('/');
  await installed(page);
  await context.setOffline(true);
  await page.reload();
  await expect(main(page).getByRole('button', { name: 'Size a meter' })).toBeVisible();
  await press(page, 'Open the example');
  await expect(answer(page)).toContainText('mm bore reads');
});
