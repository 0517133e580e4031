/** A duct is surveyed: planned, printed, read by keyboard, by paste and with one hand, put right again, printed filled. */
import { spawnSync } from 'node:child_process';
import { writeFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import type { Locator, Page, TestInfo } from '@playwright/test';
import type { Project } from '../../src/core/document/project.ts';
import { surveyContext } from '../../src/views/present/survey-list.ts';
import { answer, exampleText, keeping, main, openExample, openProject, panel, press, save } from './hand.ts';
import { flat, printed } from './paper.ts';
import { expect, test } from './watched.ts';

interface Found {
  readonly depths_m: readonly (readonly number[])[];
  readonly velocities_m_s?: readonly (readonly number[])[];
  readonly meanVelocity_m_s?: number;
  readonly volumeFlow_m3_s?: number;
}

const root = fileURLToPath(new URL('../..', import.meta.url));

/** What the command line finds for the first survey of a project. */
function headless(project: Project, info: TestInfo): Found {
  const file = info.outputPath('asked.headwright.json');
  writeFileSync(file, JSON.stringify(project));
  const run = spawnSync(process.execPath, ['src/app/headwright.mjs', 'solve', file], { cwd: root, encoding: 'utf8' });
  return JSON.parse(run.stdout).traverses[0];
}

const example = async (): Promise<Project> => JSON.parse(await exampleText());

/** The example with its survey alone, its readings as given. */
async function unread(readings?: readonly (readonly string[])[]): Promise<Project> {
  const project = await example();
  const [{ readings: _, ...traverse } = {}] = project.traverses ?? [];
  const own = readings === undefined ? traverse : { ...traverse, readings: readings.map((line) => [...line]) };
  return { ...project, meters: [], traverses: [own] };
}

const reading = (page: Page, number: number): Locator =>
  panel(page, 'Readings').getByLabel(`Reading at point ${number}`, { exact: true });
const survey = (page: Page): Promise<void> => page.getByRole('link', { name: 'Survey' }).click();
const drawnPoints = (page: Page): Locator =>
  main(page).getByRole('img', { name: 'Velocity along each line' }).locator('circle');
const texts = async (): Promise<readonly string[]> =>
  ((await example()).traverses?.[0]?.readings ?? []).flat().map((text) => text.replace(' Pa', ''));

async function openSurvey(page: Page, project: Project): Promise<void> {
  await openProject(page, project);
  await survey(page);
  await expect(answer(page)).toContainText('25 points');
}

/** Puts a text into the clipboard's place and pastes it into a box. */
const paste = (box: Locator, text: string): Promise<void> =>
  box.evaluate((node, data) => {
    const clipboardData = new DataTransfer();
    clipboardData.setData('text/plain', data);
    node.dispatchEvent(new ClipboardEvent('paste', { clipboardData, bubbles: true, cancelable: true }));
  }, text);

test('a survey is planned from nothing', async ({ page }) => {
  await page.goto('/#/survey');
  await press(page, 'Plan a survey');
  const box = (label: string): Locator => panel(page, 'Section and points').getByLabel(label, { exact: true });
  await box('Inside width').fill('900');
  await box('Inside height').fill('600');
  await box('Length of the port').fill('40');
  await expect(answer(page)).toHaveText('25 points wait to be read.');
  await expect(main(page).getByText('Velocities and flow wait for the fluid in the duct.')).toBeVisible();
  await expect(main(page).getByRole('img', { name: 'Section of the duct with its points' })).toBeVisible();
  await expect(panel(page, 'Readings').getByRole('row', { name: /^1 84\.1/ })).toBeVisible();
  const duct = panel(page, 'Fluid in the duct');
  await duct.getByLabel('Static pressure', { exact: true }).fill('240');
  await duct.getByLabel('Temperature', { exact: true }).fill('27.5');
  await expect(answer(page)).toHaveText('25 points wait to be read.');
  await expect(main(page).getByRole('img', { name: 'Section of the duct with its points' })).toBeVisible();
  await expect(panel(page, 'Readings').getByRole('row', { name: /^1 84\.1/ })).toBeVisible();
  await press(page, /^Take: Air balancing: log-Tchebycheff/);
  await expect(answer(page)).toHaveText('30 points wait to be read.');
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(answer(page)).toHaveText('25 points wait to be read.');
});

test('another shape of section brings a plan that it has, in one step of undo', async ({ page }) => {
  await openSurvey(page, await unread());
  await main(page).locator('summary').filter({ hasText: 'Plan' }).first().click();
  const section = panel(page, 'Section and points');
  await section.getByLabel('Shape', { exact: true }).selectOption('circular');
  await section.getByLabel('Inside diameter', { exact: true }).fill('600');
  await expect(answer(page)).toHaveText('12 points wait to be read.');
  await expect(section.getByLabel('Rule', { exact: true })).toHaveValue('log-linear');
  await page.getByRole('button', { name: 'Undo' }).click();
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(answer(page)).toHaveText('25 points wait to be read.');
  await expect(section.getByLabel('Rule', { exact: true })).toHaveValue('log-tchebycheff');
});

test('the form for the field has every depth of the command line', async ({ page }, info) => {
  const project = await unread();
  await openSurvey(page, project);
  await page.getByRole('link', { name: 'Sheet' }).click();
  await expect(page.getByRole('region', { name: /Form for the field/ })).toBeVisible();
  const [form = '', ...more] = (await printed(page, info)).pages.map(flat);
  expect(more).toEqual([]);
  const { value } = surveyContext(project.traverses?.[0], project);
  const [line = []] = headless(project, info).depths_m;
  for (const [at, depth] of line.entries()) {
    const row = [at, at + 5, at + 10].map((place) => `${place + 1} ${value(depth, 'depth').number}`).join(' ');
    expect(form).toContain(row); // three lines side by side
  }
  expect(form).toContain('from the outer end of the port, in mm');
  expect(form).toContain('static charge on the probe');
});

test('readings are typed by keyboard alone, and the picture follows each of them', async ({ page }, info) => {
  await openSurvey(page, await unread());
  const list = await texts();
  await reading(page, 1).focus();
  for (const [at, text] of list.entries()) {
    await page.keyboard.type(text);
    await expect(drawnPoints(page)).toHaveCount(at + 1);
    await page.keyboard.press('Enter');
    if (at === 3) await expect(answer(page)).toHaveText('4 of 25 points are read.');
  }
  const project = await example();
  const { volumeFlow_m3_s = 0, meanVelocity_m_s = 0 } = headless(project, info);
  const { value } = surveyContext(project.traverses?.[0], project);
  const flow = value(volumeFlow_m3_s, 'volumeFlow').text;
  await expect(answer(page)).toHaveText(
    `${flow} flows through the section at a mean of ${value(meanVelocity_m_s, 'velocity').text}.`,
  );
  await page.keyboard.press('Shift+Enter');
  await expect(reading(page, 24)).toBeFocused();
  expect(JSON.parse(String(await save(page))).traverses[0].readings).toEqual(project.traverses?.[0]?.readings);
});

test('a column and a block are pasted, each as one step of undo', async ({ page }) => {
  await openSurvey(page, await unread());
  const list = await texts();
  await paste(reading(page, 1), list.slice(0, 7).join('\n'));
  await expect(answer(page)).toHaveText('7 of 25 points are read.');
  await expect(reading(page, 7)).toHaveValue(list[6] ?? '');
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(answer(page)).toHaveText('25 points wait to be read.');
  const columns = Array.from({ length: 5 }, (_, point) => [0, 1, 2, 3, 4].map((line) => list[5 * line + point]));
  await paste(
    reading(page, 1),
    `Line 1\tLine 2\n${columns.map((row) => row.join('\t')).join('\n')}`.replace(/^.*\n/, ''),
  );
  await press(page, 'Each column is a line');
  await expect(answer(page)).toContainText('flows through the section');
  await expect(reading(page, 6)).toHaveValue(list[5] ?? '');
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(answer(page)).toHaveText('25 points wait to be read.');
});

test('one wrong reading says what is wrong, hides no other, and is undone', async ({ page }) => {
  await openExample(page);
  await survey(page);
  const before = await answer(page).innerText();
  await reading(page, 8).fill('49,3x');
  await expect(
    panel(page, 'Readings')
      .getByText(/Reading on line 2, point 3|reading on line 2, point 3/)
      .first(),
  ).toBeVisible();
  await expect(drawnPoints(page)).toHaveCount(24);
  await expect(answer(page)).toHaveText('24 of 25 points are read.');
  await reading(page, 9).focus();
  await expect(reading(page, 8)).toHaveValue('49,3x');
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(answer(page)).toHaveText(before);
});

test.describe('a phone at the duct', () => {
  test.use({ viewport: { width: 390, height: 844 }, hasTouch: true });

  test('one hand measures point by point, without a network', async ({ page, context }) => {
    await openSurvey(page, await unread());
    await page.waitForFunction(() => navigator.serviceWorker.controller?.state === 'activated');
    await expect(keeping(page)).toContainText('Kept in this browser');
    await context.setOffline(true);
    await page.reload();
    await press(page, 'Measure point by point');
    const dialog = page.getByRole('dialog', { name: 'Measure' });
    const list = await texts();
    await expect(dialog).toContainText('84.1 mm');
    for (const [at, text] of list.entries()) {
      await expect(dialog).toContainText(`Point ${at + 1} of 25`);
      const box = dialog.getByLabel(`Reading at point ${at + 1}`, { exact: true });
      await expect(box).toBeFocused();
      await expect(box).toHaveAttribute('inputmode', 'decimal');
      await page.keyboard.type(text);
      if (at % 2 === 0) await page.keyboard.press('Enter');
      else await dialog.getByRole('button', { name: at + 1 < list.length ? 'Next' : 'Done' }).tap();
    }
    await expect(dialog).toBeHidden();
    await expect(answer(page)).toContainText('flows through the section');
    const next = page.viewportSize();
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(next?.width ?? 0);
  });

  test('a point that cannot be read stays in sight and leads back to itself', async ({ page }) => {
    await openProject(page, { ...(await example()), meters: [] });
    await page.getByRole('link', { name: 'Survey' }).click();
    await press(page, 'Measure point by point');
    const dialog = page.getByRole('dialog', { name: 'Measure' });
    const back = dialog.getByRole('button', { name: 'Point 1 cannot be read: back to it' });
    await page.keyboard.type('5o');
    await page.keyboard.press('Enter');
    await expect(dialog).toContainText('Point 2 of 25');
    await back.tap();
    await expect(dialog).toContainText('Point 1 of 25');
    await expect(back).toHaveCount(0); // the point at hand says it itself
    await page.keyboard.type('24.4');
    await page.keyboard.press('Enter');
    await expect(dialog).toContainText('Point 2 of 25');
    await expect(back).toHaveCount(0);
  });
});

test('the filled sheet has every velocity of the command line, its checks and cautions', async ({ page }, info) => {
  const project = { ...(await example()), meters: [] };
  await openProject(page, project);
  await page.getByRole('link', { name: 'Sheet' }).click();
  await expect(page.getByRole('region', { name: /FP-5102, Survey sheet, 1 of 2/ })).toBeVisible();
  const pages = (await printed(page, info)).pages.map(flat);
  expect(pages).toHaveLength(2);
  const [first = '', points = ''] = pages;
  const { velocities_m_s = [], meanVelocity_m_s = 0, volumeFlow_m3_s = 0 } = headless(project, info);
  const { value } = surveyContext(project.traverses?.[0], project);
  expect(first).toContain(flat(value(volumeFlow_m3_s, 'volumeFlow').text));
  expect(first).toContain(flat(value(meanVelocity_m_s, 'velocity').text));
  expect(first).toContain('static charge on the probe');
  for (const velocity of velocities_m_s.flat()) expect(points).toContain(value(velocity, 'velocity').number);
  expect(points).toContain('Straight duct before the plane 9 D');
  for (const [at, text] of pages.entries()) expect(text).toContain(`Page ${at + 1} of 2`);
});
