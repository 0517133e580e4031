/** Nothing that an automated check of accessibility finds, in every state and in both themes. */
import AxeBuilder from '@axe-core/playwright';
import type { Page } from '@playwright/test';
import { answer, exampleText, field, open, openExample, openProject, panel, press } from './hand.ts';
import { expect, test } from './watched.ts';

const differential = (page: Page) => field(page, 'Flow to be measured', 'Differential');

/** Opens the folds of the form and a line of the working; all lines are alike. */
async function openFolds(page: Page): Promise<void> {
  for (const fold of await page.locator('form details').all())
    await fold.evaluate((node) => node.setAttribute('open', ''));
  await panel(page, 'Working').getByText('Discharge coefficient').first().click();
}

const menu = (page: Page): Promise<void> => page.getByRole('button', { name: 'Menu' }).click();

const states: Readonly<Record<string, (page: Page) => Promise<void>>> = {
  'the empty project': open,
  'a new meter': async (page) => {
    await open(page);
    await press(page, 'Size a meter');
  },
  'a solved meter, its folds open': async (page) => {
    await openExample(page);
    await openFolds(page);
    await expect(panel(page, 'Flow against differential').locator('svg').first()).toBeVisible();
  },
  'a stale result': async (page) => {
    await openExample(page);
    await differential(page).fill('250 mbra');
    await expect(page.getByText(/^Last good result\./)).toBeVisible();
  },
  'a refused meter': async (page) => {
    const project = JSON.parse(await exampleText());
    project.meters[0].differential = 'plenty';
    await openProject(page, project);
  },
  'a list of pipe sizes': async (page) => {
    await openExample(page);
    await page.getByLabel('Line size', { exact: true }).click();
    await expect(page.getByRole('listbox')).toBeVisible();
  },
  'the sheets': async (page) => {
    const project = JSON.parse(await exampleText());
    project.meters = project.meters.filter(({ tag }: { tag: string }) => tag === 'FE-4101'); // one of each kind of sheet
    await openProject(page, project);
    await page.getByRole('link', { name: 'Sheet' }).click();
    await expect(page.getByRole('region', { name: /FE-4101, Sizing sheet/ })).toBeVisible();
    await expect(page.getByRole('region', { name: /FP-5102/ }).first()).toBeVisible();
  },
  'a survey, its folds open': async (page) => {
    await openExample(page);
    await page.getByRole('link', { name: 'Survey' }).click();
    await expect(panel(page, 'Readings')).toBeVisible();
    for (const fold of await page.locator('details:has(form), form details').all())
      await fold.evaluate((node) => node.setAttribute('open', ''));
  },
  'a survey point by point': async (page) => {
    await openExample(page);
    await page.getByRole('link', { name: 'Survey' }).click();
    await press(page, 'Measure point by point');
    await expect(page.getByRole('dialog', { name: 'Measure' })).toBeVisible();
  },
  'a new survey': async (page) => {
    await page.goto('/#/survey');
    await press(page, 'Plan a survey');
  },
  'the menu': async (page) => {
    await openExample(page);
    await menu(page);
  },
  'the dialogs, a notice': async (page) => {
    await openExample(page);
    await press(page, 'Delete');
    for (const name of ['Keys', 'Projects in this browser', 'Title block, site, base state']) {
      await menu(page);
      await page.getByRole('button', { name, exact: true }).click();
      await expect(page.getByRole('dialog')).toBeVisible();
      await expectNothing(page);
      await page.keyboard.press('Escape');
    }
    await page.keyboard.press('/');
  },
};

/** What a change of theme can change. */
const ofColours = ['color-contrast', 'link-in-text-block'];

/** The browser's own parts of a page cannot be checked, everything else is. */
async function violations(page: Page, rules?: readonly string[]): Promise<readonly string[]> {
  const builder = new AxeBuilder({ page }).options({ resultTypes: ['violations'] });
  const found = await (rules === undefined ? builder : builder.withRules([...rules])).analyze();
  return found.violations.flatMap(({ id, nodes }) =>
    nodes.map(({ target, failureSummary }) => `${id} ${target.join(' ')}: ${failureSummary?.split('\n')[1]?.trim()}`),
  );
}

/** All rules in the light theme, those of colours in the dark one. */
async function expectNothing(page: Page): Promise<void> {
  await page.emulateMedia({ colorScheme: 'light' });
  expect(await violations(page)).toEqual([]);
  await page.emulateMedia({ colorScheme: 'dark' });
  expect(await violations(page, ofColours)).toEqual([]);
}

for (const [name, reach] of Object.entries(states)) {
  test(`nothing is found on ${name}`, async ({ page }) => {
    await reach(page);
    await expectNothing(page);
  });
}

test('the two themes are not one', async ({ page }) => {
  const paper = (): Promise<string> => page.evaluate(() => getComputedStyle(document.documentElement).backgroundColor);
  await page.emulateMedia({ colorScheme: 'light' });
  await openExample(page);
  const light = await paper();
  await page.emulateMedia({ colorScheme: 'dark' });
  expect(await paper()).not.toBe(light);
  await menu(page);
  await page.getByRole('radio', { name: 'Light' }).check();
  expect(await paper()).toBe(light);
  await page.reload();
  await expect(answer(page)).toBeVisible();
  expect(await paper()).toBe(light);
});
