/** Undo and redo, and the list of meters. */
import type { Locator, Page } from '@playwright/test';
import { exampleText, field, main, meters, openExample, press, save } from './hand.ts';
import { expect, test } from './watched.ts';

const tags = ['FE-1101', 'FE-2304', 'FE-3102', 'FE-4101', 'FE-5101'] as const;
const [first, second, ...others] = tags;

/** Types again and again within the page, into two fields in turn, so that each time is a step of its own. */
const edits = (page: Page, count: number): Promise<void> =>
  page.evaluate((most) => {
    const fields = ['duty.normal', 'duty.minimum'].map((path) => document.querySelector(`[data-field="${path}"]`));
    const set = Object.getOwnPropertyDescriptor(HTMLInputElement.prototype, 'value')?.set;
    for (let step = 0; step < most; step += 1) {
      set?.call(fields[step % 2], String(20 + step / 10));
      fields[step % 2]?.dispatchEvent(new Event('input', { bubbles: true }));
    }
  }, count);

/** Clicks faster than the page is drawn: only the last picture counts. */
const clicks = (button: Locator, count: number): Promise<void> =>
  button.evaluate((node: HTMLButtonElement, most) => {
    for (let step = 0; step < most; step += 1) node.click();
  }, count);

test('two hundred steps back lead to the start, by button and by key, and forward again', async ({ page }) => {
  await openExample(page);
  await edits(page, 200);
  const last = await save(page);
  const undo = page.getByRole('button', { name: 'Undo', exact: true });
  const redo = page.getByRole('button', { name: 'Redo', exact: true });
  const press = async (key: string, count: number): Promise<void> => {
    await main(page).focus();
    for (let step = 0; step < count; step += 1) await page.keyboard.press(key);
  };
  await press('Control+z', 10);
  await clicks(undo, 189);
  await expect(undo).toBeEnabled();
  await undo.click();
  await expect(undo).toBeDisabled();
  expect(String(await save(page))).toBe(await exampleText());
  await press('Control+y', 10);
  await press('Control+Shift+z', 10);
  await clicks(redo, 179);
  await redo.click();
  await expect(redo).toBeDisabled();
  expect((await save(page)).equals(last)).toBe(true);
});

test('a deleted meter is offered back, and comes back as it was', async ({ page }) => {
  await openExample(page);
  await press(page, 'Delete');
  await expect(meters(page).getByRole('listitem')).toHaveCount(tags.length - 1);
  await page.getByRole('button', { name: 'Take it back' }).click();
  await expect(meters(page).getByRole('listitem')).toContainText(tags);
  expect(String(await save(page))).toBe(await exampleText());
  await press(page, 'Delete');
  await page.getByRole('main').focus();
  await page.keyboard.press('Control+z');
  await expect(meters(page).getByRole('listitem')).toContainText(tags);
});

test('meters are moved by button and by key, duplicated, renamed and added', async ({ page }) => {
  await openExample(page);
  const items = meters(page).getByRole('listitem');
  await press(page, 'Move down');
  await expect(items).toContainText([second, first, ...others]);
  await page.getByRole('main').focus();
  await page.keyboard.press('Alt+ArrowDown');
  await expect(items).toContainText([second, others[0], first, ...others.slice(1)]);
  await page.keyboard.press('Alt+ArrowUp');
  await page.keyboard.press('Alt+ArrowUp');
  await expect(items).toContainText(tags);
  expect(String(await save(page))).toBe(await exampleText());
  await press(page, 'Duplicate');
  await expect(items).toContainText([first, `${first} copy`, second, ...others]);
  await page.getByLabel('Tag', { exact: true }).fill('FE-1102');
  await expect(items.nth(1)).toContainText('FE-1102');
  await meters(page).getByRole('button', { name: 'Add a meter' }).click();
  await expect(items).toHaveCount(tags.length + 2);
  await expect(items.last()).toContainText('not solved');
});

test('undo inside a field is that of the field', async ({ page }) => {
  await openExample(page);
  const input = field(page, 'Flow to be measured', 'Differential');
  await input.click();
  await page.keyboard.press('End');
  await page.keyboard.type('9');
  await expect(input).toHaveValue('2509');
  await page.keyboard.press('Control+z');
  await expect(input).toHaveValue('250');
  expect(String(await save(page))).toBe(await exampleText());
});
