/** What a user does by hand, found by role and label as a user finds it. */
import { readFile } from 'node:fs/promises';
import type { Locator, Page } from '@playwright/test';
import { expect } from './watched.ts';

export type Station = 'Upstream pipe and fluid' | 'Flow to be measured' | 'Element' | 'Downstream';

export const examplePath = new URL('../../public/examples/tern-island.headwright.json', import.meta.url);
export const exampleText = (): Promise<string> => readFile(examplePath, 'utf8');

export const main = (page: Page): Locator => page.getByRole('main');
export const answer = (page: Page): Locator => main(page).getByRole('heading', { level: 1 });
export const panel = (page: Page, name: string): Locator => main(page).getByRole('region', { name, exact: true });
export const field = (page: Page, station: Station, label: string): Locator =>
  panel(page, station).getByLabel(label, { exact: true });
/** Opens the fold that a field lies in. */
export async function unfold(input: Locator): Promise<void> {
  const fold = input.locator('xpath=ancestor::details').first();
  if (!(await input.isVisible())) await fold.locator('summary').first().click();
}

/** Types into a field, wherever it lies. */
export async function fill(page: Page, station: Station, label: string, text: string): Promise<void> {
  const input = field(page, station, label);
  await unfold(input);
  await input.fill(text);
}

export const meters = (page: Page): Locator => page.getByRole('navigation', { name: 'Meters' });
export const keeping = (page: Page): Locator => page.locator('[data-keeping]');
export const press = (page: Page, name: string | RegExp): Promise<void> =>
  main(page).getByRole('button', { name, exact: true }).click();

/** The program without a project. */
export async function open(page: Page): Promise<void> {
  await page.goto('/');
  await expect(main(page).getByRole('button', { name: 'Size a meter' })).toBeVisible();
}

/** The example, its first meter at hand. */
export async function openExample(page: Page): Promise<void> {
  await open(page);
  await press(page, 'Open the example');
  await expect(answer(page)).toContainText('mm bore reads');
}

/** One of the meters in the list. */
export const choose = (page: Page, tag: string): Promise<void> =>
  meters(page).getByRole('button', { name: tag }).click();

/** Hands a file to the open dialog. */
export async function openFile(page: Page, name: string, content: string | Uint8Array): Promise<void> {
  const chooser = page.waitForEvent('filechooser');
  await page.keyboard.press('Control+o');
  await (await chooser).setFiles({ name, mimeType: 'application/json', buffer: Buffer.from(content) });
}

/** A project file from the program's first screen on, until its first meter stands there. */
export async function openProject(page: Page, content: string | object): Promise<void> {
  await open(page);
  const text = typeof content === 'string' ? content : JSON.stringify(content);
  await openFile(page, 'given.headwright.json', text);
  await expect(page.getByText('given.headwright.json is open.')).toBeVisible();
}

/** The bytes of the file that Save makes. */
export async function save(page: Page): Promise<Buffer> {
  const download = page.waitForEvent('download');
  await page.getByRole('button', { name: 'Save file' }).click();
  return readFile(await (await download).path());
}

/** The first meter of what Save makes. */
export async function savedMeter(page: Page, index = 0): Promise<Record<string, unknown>> {
  return JSON.parse(String(await save(page))).meters[index];
}
