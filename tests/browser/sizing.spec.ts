/** A meter from nothing to its answer, and the question turned round. */
import type { Page } from '@playwright/test';
import {
  answer,
  exampleText,
  field,
  fill,
  open,
  openExample,
  openProject,
  panel,
  press,
  type Station,
  save,
} from './hand.ts';
import { type Figures, solveHeadless } from './headless.ts';
import { expect, test } from './watched.ts';

/** The first meter of the example, field by field as it stands on the screen. */
const typed: readonly (readonly [Station, label: string, text: string])[] = [
  ['Upstream pipe and fluid', 'Pressure', '7'],
  ['Upstream pipe and fluid', 'Temperature', '85'],
  ['Upstream pipe and fluid', 'Bore measured at', '20'],
  ['Flow to be measured', 'Maximum', '60'],
  ['Flow to be measured', 'Normal', '40'],
  ['Flow to be measured', 'Minimum', '12'],
  ['Flow to be measured', 'Differential', '250'],
  ['Element', 'Plate, E', '4'],
  ['Element', 'Edge, e', '1.5'],
  ['Element', 'Bore measured at', '20'],
  ['Downstream', 'Straight before', '45'],
  ['Downstream', 'Straight after', '8'],
  ['Downstream', 'Bore, ±', '0.07'],
  ['Downstream', 'Pipe bore, ±', '0.4'],
  ['Downstream', 'Differential, ±', '0.1'],
  ['Downstream', 'Density, ±', '0.2'],
];

async function fillIn(page: Page): Promise<void> {
  await page.getByLabel('Tag', { exact: true }).fill('FE-1101');
  await page.getByLabel('Service', { exact: true }).fill('Feed water to boiler 1');
  await field(page, 'Upstream pipe and fluid', 'Line size').fill('DN 100 40');
  await page.getByRole('option', { name: /DN 100 .* 40 102\.26 mm/ }).click();
  for (const [station, label, text] of typed) await fill(page, station, label, text);
  await field(page, 'Upstream pipe and fluid', 'Material').selectOption('carbon-steel');
  await field(page, 'Element', 'Material').selectOption('stainless-316');
  await field(page, 'Downstream', 'Fitting before').selectOption('single-bend');
}

/** Every figure of the table at each flow is the one the command line finds, in the same digits. */
async function expectDuty(page: Page, figures: Figures): Promise<void> {
  const table = panel(page, 'At each flow').getByRole('table');
  for (const [name, row] of Object.entries(figures.duty)) {
    const cells = await table
      .getByRole('row', { name: new RegExp(`^${name}`) })
      .getByRole('cell')
      .allInnerTexts();
    const values = Object.values(row);
    expect(cells).toHaveLength(values.length);
    for (const [at, { number, text }] of values.entries()) expect([number, text, `±${text}`]).toContain(cells[at]);
  }
}

test('a meter is sized from nothing, and its figures are those of the command line', async ({ page }, info) => {
  await open(page);
  await press(page, 'Size a meter');
  await expect(answer(page)).toContainText('waits for its figures');
  await fillIn(page);
  await expect(answer(page)).toContainText('reads 250 mbar at 60 t/h');
  const text = String(await save(page));
  const [expected] = JSON.parse(await exampleText()).meters;
  const [written] = JSON.parse(text).meters;
  const { bore: _, ...element } = expected.element; // the unknown
  expect(written).toEqual({ ...expected, element });
  const [figures] = solveHeadless(text, info);
  if (figures === undefined) throw new Error('expected a solved meter, got none');
  await expect(answer(page)).toContainText(`${figures.bore.text} bore`);
  await expectDuty(page, figures);
});

test('every meter of the example shows the figures of the command line', async ({ page }, info) => {
  await openExample(page);
  for (const figures of solveHeadless(await exampleText(), info)) {
    await page.getByRole('navigation', { name: 'Meters' }).getByRole('button', { name: figures.tag }).click();
    await expect(page.getByLabel('Tag', { exact: true })).toHaveValue(figures.tag);
    await expectDuty(page, figures);
  }
});

test('the unknown turns round with one click, and what was found goes along', async ({ page }) => {
  await openExample(page);
  const [bore, differential, flow] = [
    field(page, 'Element', 'Bore'),
    field(page, 'Flow to be measured', 'Differential'),
    field(page, 'Flow to be measured', 'Maximum'),
  ];
  const found = (await bore.innerText()).replace(/\s*mm$/, '');
  await press(page, 'Find the differential');
  await expect(page.getByRole('button', { name: 'Find the differential' })).toHaveAttribute('aria-pressed', 'true');
  expect(Number(await bore.inputValue()).toFixed(2)).toBe(found);
  await expect(differential).toHaveText(/^250\.0\s*mbar$/);
  await press(page, 'Find the maximum flow');
  expect(Number(await differential.inputValue())).toBeCloseTo(250, 4);
  await expect(flow).toHaveText(/^60\.00\s*t\/h$/);
  await expect(answer(page)).toContainText('passes 60.00 t/h');
  await press(page, 'Find the bore');
  expect(Number(await flow.inputValue())).toBeCloseTo(60, 4);
  await expect(bore).toHaveText(new RegExp(`^${found}\\s*mm$`));
});

test('an averaging pitot asks for its K in place of a bore, and is drawn and printed without one', async ({ page }) => {
  await openExample(page);
  await field(page, 'Element', 'Kind').selectOption('averaging-pitot');
  await expect(page.getByRole('button', { name: 'Find the differential' })).toHaveAttribute('aria-pressed', 'true');
  await expect(field(page, 'Element', 'Bore')).toHaveCount(0);
  await fill(page, 'Element', 'Coefficient K', '0.65');
  await expect(answer(page)).toHaveText(/^An averaging pitot of K\s0\.65 reads [\d.]+\smbar at 60\st\/h\.$/);
  await press(page, 'Find the maximum flow');
  await expect(answer(page)).toHaveText(/ passes 60\.0+\st\/h\.$/);
  await expect(page.getByRole('slider')).toHaveCount(0);
  const drawing = page.getByRole('img', { name: /^Averaging pitot, K on the pipe area, in its pipe$/ });
  await expect(drawing).toBeVisible();
  await expect(panel(page, 'At each flow').getByRole('columnheader', { name: 'Permanent loss' })).toHaveCount(0);
  await fill(page, 'Element', 'Loss of Δp', '7');
  await expect(page.getByRole('img', { name: /with the head lines above it$/ })).toBeVisible();
  await expect(panel(page, 'At each flow').getByRole('columnheader', { name: 'Permanent loss' })).toBeVisible();
  await page.getByRole('link', { name: 'Sheet' }).click();
  const sheet = page.getByRole('region', { name: /^FE-1101, Sizing sheet/ });
  await expect(sheet).toContainText('Averaging pitot, K on the pipe area, maker’s sheet');
  await expect(sheet).toContainText('bar not to scale; scale of the pipe');
  await expect(sheet).not.toContainText('Diameter ratio');
});

test('a bore that is asked of an averaging pitot is refused, and the problem leads to what can be asked', async ({
  page,
}) => {
  const { meters } = JSON.parse(await exampleText());
  const element = { kind: 'averaging-pitot', coefficient: 0.65 };
  await openProject(page, { format: 'headwright', version: 1, meters: [{ ...meters[0], element, find: 'bore' }] });
  await expect(page.getByText('This element has no bore that could be found.').first()).toBeVisible();
  await page.getByRole('button', { name: 'Quantity to find' }).first().click();
  await expect(page.getByRole('button', { name: 'Find the maximum flow' })).toBeFocused();
  await page.keyboard.press('Enter');
  await expect(answer(page)).toContainText('An averaging pitot of K');
});
