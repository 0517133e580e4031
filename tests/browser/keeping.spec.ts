/** The work is kept in this browser: over a reload, between two tabs, and said plainly where it is not. */
import { answer, field, keeping, open, openExample, press, save } from './hand.ts';
import { expect, test } from './watched.ts';

const duty = 'Flow to be measured';

test('a reload finds the work, also what cannot be read', async ({ page }) => {
  await openExample(page);
  await field(page, duty, 'Differential').fill('300');
  await field(page, duty, 'Normal').fill('many');
  await expect(keeping(page)).toContainText(/Kept in this browser \d\d:\d\d/);
  const before = await save(page);
  await page.reload();
  await expect(field(page, duty, 'Differential')).toHaveValue('300');
  await expect(field(page, duty, 'Normal')).toHaveValue('many');
  expect((await save(page)).equals(before)).toBe(true);
});

test('what was typed just before the page is closed is not lost', async ({ page, context }) => {
  await openExample(page);
  await expect(keeping(page)).toContainText('Kept in this browser');
  await field(page, duty, 'Differential').fill('310');
  await page.close();
  const next = await context.newPage();
  await expect(async () => {
    await next.goto('/'); // the closed page may still be on its way out
    await expect(field(next, duty, 'Differential')).toHaveValue('310', { timeout: 3000 });
  }).toPass();
});

test('a second tab is told, and takes the project over or goes on with a copy', async ({ page, context }) => {
  await openExample(page);
  await expect(keeping(page)).toContainText('Kept in this browser');
  const second = await context.newPage();
  await second.goto('/');
  await expect(keeping(second)).toHaveText('Another tab holds this project');
  await second.getByRole('button', { name: 'Work here' }).click();
  await expect(keeping(second)).toContainText('Kept in this browser');
  await expect(keeping(page)).toHaveText('Another tab holds this project');
  await page.getByRole('button', { name: 'Work on a copy' }).click();
  await expect(keeping(page)).toContainText('Kept in this browser');
  await expect(keeping(second)).toContainText('Kept in this browser');
});

test('without storage everything works, and it says that nothing is kept', async ({ page, context }) => {
  await context.addInitScript(() => Object.defineProperty(window, 'indexedDB', { value: undefined }));
  await open(page);
  await expect(keeping(page)).toContainText('Not kept: this browser offers no storage here. Save to a file');
  await press(page, 'Open the example');
  await field(page, duty, 'Differential').fill('300');
  await expect(answer(page)).toContainText('reads 300 mbar');
  await expect(keeping(page)).toContainText('Not kept');
  expect(JSON.parse(String(await save(page))).meters[0].differential).toBe('300 mbar');
  await page.getByRole('link', { name: 'Sheet' }).click();
  await expect(page.getByRole('region', { name: /FE-1101, Sizing sheet/ })).toBeVisible();
});
