/** A phone, and a page enlarged four times: one column, nothing cut off, the answer in sight. */
import type { Page } from '@playwright/test';
import { answer, field, open, openExample, press, type Station } from './hand.ts';
import { expect, test } from './watched.ts';

const typed: readonly (readonly [Station, label: string, text: string])[] = [
  ['Upstream pipe and fluid', 'Pipe bore', '102.26'],
  ['Upstream pipe and fluid', 'Pressure', '7'],
  ['Upstream pipe and fluid', 'Temperature', '85'],
  ['Flow to be measured', 'Maximum', '60'],
  ['Flow to be measured', 'Differential', '250'],
];

/** What reaches beyond the right edge and cannot be scrolled into view within a part of the page. */
const overflow = (page: Page): Promise<readonly string[]> =>
  page.evaluate(() => {
    const scrolls = (node: Element | null): boolean =>
      node !== null &&
      (/auto|scroll|hidden|clip/.test(getComputedStyle(node).overflowX) || scrolls(node.parentElement));
    const wide = [...document.querySelectorAll('body *')].filter(
      (node) => node.getBoundingClientRect().right > window.innerWidth + 1 && node.checkVisibility() && !scrolls(node),
    );
    const over = document.documentElement.scrollWidth - window.innerWidth;
    return [...(over > 0 ? [`page ${over} px too wide`] : []), ...wide.map((node) => node.outerHTML.slice(0, 90))];
  });

for (const width of [390, 320]) {
  test.describe(`${width} px`, () => {
    test.use({ viewport: { width, height: width === 390 ? 844 : 256 } });

    test('nothing reaches beyond the edge, on the form, with a problem, on the sheet', async ({ page }) => {
      await open(page);
      expect(await overflow(page)).toEqual([]);
      await press(page, 'Open the example');
      await expect(answer(page)).toContainText('reads');
      for (const fold of await page.locator('details').all())
        await fold.evaluate((node) => node.setAttribute('open', ''));
      expect(await overflow(page)).toEqual([]);
      await field(page, 'Flow to be measured', 'Differential').fill('250 mbra');
      expect(await overflow(page)).toEqual([]);
      await page.getByRole('button', { name: 'Menu' }).click();
      await page.getByRole('button', { name: 'Keys' }).click();
      expect(await overflow(page)).toEqual([]);
      await page.keyboard.press('Escape');
      await page.goto('/#/sheet');
      await expect(page.getByRole('region', { name: /FE-2304, Sizing sheet/ })).toBeVisible();
      expect(await overflow(page)).toEqual([]);
    });

    test('a meter is sized', async ({ page }) => {
      await open(page);
      await press(page, 'Size a meter');
      for (const [station, label, text] of typed) await field(page, station, label).fill(text);
      await expect(answer(page)).toContainText('mm bore reads 250 mbar at 60 t/h');
    });
  });
}

test.describe('a phone', () => {
  test.use({ viewport: { width: 390, height: 844 } });

  test('the answer stays in sight while any field of the form is typed in', async ({ page }) => {
    await openExample(page);
    for (const [station, label] of typed) {
      const input = field(page, station, label);
      await input.scrollIntoViewIfNeeded();
      await input.click();
      await page.keyboard.press('End');
      await page.keyboard.type('0');
      await expect(answer(page)).toBeInViewport({ ratio: 0.9 });
      await expect(input).toBeInViewport({ ratio: 0.9 });
      await page.keyboard.press('Backspace');
    }
  });

  test('the list of meters is one choice', async ({ page }) => {
    await openExample(page);
    await page.getByLabel('Meter', { exact: true }).selectOption({ index: 1 });
    await expect(answer(page)).toContainText('throat');
  });
});
