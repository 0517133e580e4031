/** Three hundred seeded actions at random, then back to the start: nothing breaks, and the file is what it was. */
import type { Page } from '@playwright/test';
import { exampleText, openExample, save } from './hand.ts';
import { expect, test } from './watched.ts';

/** mulberry32: the same actions for the same seed. */
function random(seed: number): (most: number) => number {
  let state = seed;
  return (most) => {
    state = (state + 0x6d2b79f5) | 0;
    let t = Math.imul(state ^ (state >>> 15), 1 | state);
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
    return Math.floor((((t ^ (t >>> 14)) >>> 0) / 4294967296) * most);
  };
}

const texts = [
  '1',
  '250 mbar',
  '-3',
  '',
  'abc',
  '12,5 kPa',
  '1e999',
  '60 t/h',
  '\u2212',
  '7 bar',
  'mm',
  '0.5',
  '1.2.3',
  '\ud83d\ude00',
];
const orders = [
  'Duplicate',
  'Move up',
  'Move down',
  'Delete',
  'Find the bore',
  'Find the differential',
  'Find the maximum flow',
  'Undo',
  'Redo',
  'Add a meter',
  'Take it back',
];
const keys = ['Control+z', 'Control+y', 'Alt+ArrowUp', 'Alt+ArrowDown', '[', ']', 'Escape', 'Tab', 'Enter'];

/** One action on the page as it stands; done within it, since three hundred of them go through. */
const act = (page: Page, kind: number, place: number, word: string): Promise<unknown> =>
  page.evaluate(
    ([what, at, text]) => {
      const pick = <Part extends Element>(selector: string): Part | undefined => {
        const all = [...document.querySelectorAll<Part>(selector)].filter((part) => part.checkVisibility());
        return all[at % Math.max(1, all.length)];
      };
      const set = (node: HTMLInputElement | HTMLSelectElement, value: string, event: string): void => {
        node.focus();
        Object.getOwnPropertyDescriptor(Object.getPrototypeOf(node), 'value')?.set?.call(node, value);
        node.dispatchEvent(new Event(event, { bubbles: true }));
      };
      if (what === 0) {
        const input = pick<HTMLInputElement>('main input[type=text]');
        if (input) set(input, text, 'input');
      } else if (what === 1) {
        const select = pick<HTMLSelectElement>('main select');
        if (select) set(select, select.options[at % select.options.length]?.value ?? '', 'change');
      } else {
        const named = [...document.querySelectorAll('button')].find(
          (button) => (button.ariaLabel ?? button.textContent?.trim()) === text && !button.disabled,
        );
        (named ?? pick<HTMLButtonElement>('nav[aria-label=Meters] li button'))?.click();
      }
    },
    [kind, place, word] as const,
  );

for (const seed of [1, 2, 3]) {
  test(`seed ${seed}`, async ({ page }) => {
    await openExample(page);
    const next = random(seed);
    const one = <Item>(list: readonly Item[]): Item => list[next(list.length)] as Item;
    const undo = page.getByRole('button', { name: 'Undo', exact: true });
    for (let step = 0; step < 100; step += 1) {
      const kind = next(8);
      if (kind < 4) await act(page, 0, next(1000), one(texts));
      else if (kind === 4) await act(page, 1, next(1000), '');
      else if (kind < 7) await act(page, 2, next(1000), one(orders));
      else await page.keyboard.press(one(keys));
    }
    await page.keyboard.press('Escape');
    await undo.evaluate(async (button: HTMLButtonElement) => {
      while (!button.disabled) {
        button.click();
        await new Promise(requestAnimationFrame);
      }
    });
    expect(String(await save(page))).toBe(await exampleText());
  });
}
