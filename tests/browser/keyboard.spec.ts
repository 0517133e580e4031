/** Everything without a mouse: from the first screen to a sized meter and its sheet, the focus always in sight. */
import type { Page } from '@playwright/test';
import { answer, main, open, openExample } from './hand.ts';
import { expect, test } from './watched.ts';

interface Focus {
  readonly name: string;
  readonly tag: string;
  readonly marked: boolean;
  readonly seen: boolean;
}

/** Where the focus is, whether it carries a mark, and whether it can be seen. */
const focus = (page: Page): Promise<Focus> =>
  page.evaluate(() => {
    const at = document.activeElement ?? document.body;
    const labels = 'labels' in at ? [...((at as HTMLInputElement).labels ?? [])] : [];
    const name = at.getAttribute('aria-label') ?? labels[0]?.textContent ?? at.textContent ?? '';
    const ring = (node: Element | null): boolean => {
      if (node === null) return false;
      const { outlineStyle, outlineWidth, boxShadow } = getComputedStyle(node);
      return (outlineStyle !== 'none' && Number.parseFloat(outlineWidth) > 0) || boxShadow !== 'none';
    };
    const { left, top, right, bottom } = at.getBoundingClientRect();
    const [x, y] = [
      (Math.max(left, 0) + Math.min(right, innerWidth)) / 2,
      (Math.max(top, 0) + Math.min(bottom, innerHeight)) / 2,
    ];
    const hit = document.elementFromPoint(x, y);
    return {
      name: name.trim(),
      tag: at.tagName,
      marked: ring(at) || ring(at.parentElement),
      seen: hit !== null && (at.contains(hit) || hit.contains(at)),
    };
  });

/** Tabs on until the focus is where it is wanted, and looks at it on the way. */
async function tabTo(page: Page, name: string, tag: string, key = 'Tab'): Promise<void> {
  const way: string[] = [];
  for (let step = 0; step < 120; step += 1) {
    await page.keyboard.press(key);
    const at = await focus(page);
    way.push(at.name);
    expect(at, `a mark on the focus at '${at.name}' (${at.tag})`).toMatchObject({ marked: true, seen: true });
    if (at.name === name && at.tag === tag) return;
  }
  throw new Error(`expected to reach '${name}' by ${key}, got ${way.join(' > ')}`);
}

const filled: readonly (readonly [label: string, text: string])[] = [
  ['Pipe bore', '102.26 mm'],
  ['Pressure', '7 bar(g)'],
  ['Temperature', '85 degC'],
  ['Maximum', '60 t/h'],
  ['Differential', '250 mbar'],
];

test('from the first screen to a sized meter and to its sheet', async ({ page }) => {
  await open(page);
  await tabTo(page, 'Size a meter', 'BUTTON');
  await page.keyboard.press('Enter');
  for (const [label, text] of filled) {
    await tabTo(page, label, 'INPUT');
    await page.keyboard.type(text);
    await expect(page.locator('[data-field]:focus')).toHaveValue(text);
  }
  await expect(answer(page)).toContainText('mm bore reads 250 mbar at 60 t/h');
  await tabTo(page, 'Sheet', 'A', 'Shift+Tab');
  await page.keyboard.press('Enter');
  await expect(page.getByRole('region', { name: /Sizing sheet/ })).toBeVisible();
});

test('the tab key goes through the whole page and out of it, both ways', async ({ page }) => {
  await openExample(page);
  const walk = async (key: string, most: number): Promise<number> => {
    for (let steps = 0; steps < most; steps += 1) {
      await page.keyboard.press(key);
      const at = await focus(page);
      if (at.tag === 'BODY') return steps;
      expect(at, `a mark on the focus at '${at.name}' (${at.tag})`).toMatchObject({ marked: true, seen: true });
    }
    return most;
  };
  const steps = await walk('Tab', 400);
  expect(steps).toBeGreaterThan(60);
  expect(steps, 'the key leads out of the page').toBeLessThan(400);
  expect(await walk('Shift+Tab', 60), 'and back into it').toBe(60);
});

test('a question mark lists the keys, Escape gives the focus back', async ({ page }) => {
  await openExample(page);
  const before = page.getByRole('button', { name: 'Duplicate' });
  await before.focus();
  await page.keyboard.press('?');
  const list = page.getByRole('dialog', { name: 'Keys' });
  await expect(list).toContainText('Find a field by its name');
  for (let step = 0; step < 4; step += 1) {
    await page.keyboard.press('Tab');
    expect(
      await page.evaluate(
        () => document.activeElement?.closest('dialog') !== null || document.activeElement === document.body,
      ),
    ).toBe(true);
  }
  await page.keyboard.press('Escape');
  await expect(list).toHaveCount(0);
  await expect(before).toBeFocused();
});

test('a slash finds a field, also one that is folded away', async ({ page }) => {
  await openExample(page);
  for (const [words, path] of [
    ['differential', 'differential'],
    ['rough', 'pipe.roughness'],
  ] as const) {
    await main(page).focus();
    await page.keyboard.press('/');
    await expect(page.getByRole('searchbox', { name: 'Name of the field' })).toBeFocused();
    await page.keyboard.type(words);
    await page.keyboard.press('Enter');
    await expect(page.locator(`[data-field="${path}"]`)).toBeFocused();
  }
});

test('Enter goes on to the next field, brackets to the next meter', async ({ page }) => {
  await openExample(page);
  await page.getByLabel('Normal', { exact: true }).focus();
  await page.keyboard.press('Enter');
  await expect(page.getByLabel('Minimum', { exact: true })).toBeFocused();
  await main(page).focus();
  await page.keyboard.press(']');
  await expect(page.getByLabel('Tag', { exact: true })).toHaveValue('FE-2304');
  await page.keyboard.press('[');
  await expect(page.getByLabel('Tag', { exact: true })).toHaveValue('FE-1101');
});

test('a line size is picked by keys', async ({ page }) => {
  await openExample(page);
  await page.getByLabel('Line size', { exact: true }).focus();
  await page.keyboard.type(' DN 150 40');
  await page.keyboard.press('Home');
  await page.keyboard.press('Control+a');
  await page.keyboard.type('DN 150 40');
  await page.keyboard.press('ArrowDown');
  await page.keyboard.press('Enter');
  await expect(page.getByLabel('Pipe bore', { exact: true })).not.toHaveValue('102.26');
  await expect(page.getByRole('listbox')).toHaveCount(0);
});
