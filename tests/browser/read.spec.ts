/** A meter is read: each instrument entered and seen, rows typed, pasted, put right, copied, saved and printed. */
import { spawnSync } from 'node:child_process';
import { readFileSync, writeFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import AxeBuilder from '@axe-core/playwright';
import type { Locator, Page, TestInfo } from '@playwright/test';
import type { InstrumentText, MeterText, Project, ReadingText } from '../../src/core/document/project.ts';
import { answer, choose, exampleText, main, openExample, openProject, panel, save } from './hand.ts';
import { flat, printed } from './paper.ts';
import { expect, test } from './watched.ts';

const root = fileURLToPath(new URL('../..', import.meta.url));
const read = (page: Page): Promise<void> => page.getByRole('link', { name: 'Read', exact: true }).click();
const box = (page: Page, column: string, row: number): Locator =>
  panel(page, 'Readings').getByLabel(`${column}, row ${row}`, { exact: true });
const figure = (page: Page, row: number, id: string): Locator =>
  main(page).locator(`tr[data-row="${row - 1}"] [data-figure="${id}"]`);

/** The sea-water meter of the example alone, read as given. */
async function seaWater(instrument?: InstrumentText, readings?: readonly ReadingText[]): Promise<Project> {
  const project: Project = JSON.parse(await exampleText());
  const found = project.meters.find(({ tag }) => tag === 'FE-4101') ?? {};
  const { instrument: _, readings: __, ...meter } = found;
  const own: MeterText = {
    ...meter,
    ...(instrument === undefined ? {} : { instrument }),
    ...(readings === undefined ? {} : { readings: [...readings] }),
  };
  return { ...project, meters: [own], traverses: [] };
}

async function openReadings(page: Page, project: Project): Promise<void> {
  await openProject(page, project);
  await read(page);
}

const paste = (target: Locator, text: string): Promise<void> =>
  target.evaluate((node, data) => {
    const clipboardData = new DataTransfer();
    clipboardData.setData('text/plain', data);
    node.dispatchEvent(new ClipboardEvent('paste', { clipboardData, bubbles: true, cancelable: true }));
  }, text);

/** What the command line makes of a project's first meter. */
function headless(project: Project, info: TestInfo) {
  const file = info.outputPath('asked.headwright.json');
  writeFileSync(file, JSON.stringify(project));
  const run = spawnSync(process.execPath, ['src/app/headwright.mjs', 'solve', file], { cwd: root, encoding: 'utf8' });
  return JSON.parse(run.stdout).results[0];
}

const instruments: readonly (readonly [string, InstrumentText, ReadingText, string])[] = [
  ['Pressure difference', { kind: 'differential' }, { value: '186.5 mbar' }, '186.5 mbar: 1036 m³/h flows.'],
  [
    'U-tube',
    { kind: 'u-tube', liquid: 'mercury', temperature: '24 degC' },
    { value: '152 mm' },
    '152 mm of mercury under the process fluid is 186.5 mbar: 1036 m³/h flows.',
  ],
  [
    'Inverted U-tube',
    { kind: 'inverted-u-tube', liquid: { density: '700 kg/m3' } },
    { value: '800 mm' },
    '800 mm of the process fluid under gauge liquid is 25.50 mbar: 383.1 m³/h flows.',
  ],
  [
    'Well and tube',
    { kind: 'well', liquid: 'mercury', scale: 'plain', tube: '6 mm', well: '60 mm' },
    { value: '150 mm' },
    '150 mm of mercury under the process fluid is',
  ],
  [
    'Inclined tube',
    { kind: 'inclined', liquid: { density: '1800 kg/m3' }, angle: '30 deg' },
    { value: '500 mm' },
    '500 mm along a tube of gauge liquid under the process fluid is 19.00 mbar',
  ],
  [
    'Two gauges',
    { kind: 'gauges', rise: '0 m' },
    { upstream: '3.1 bar(g)', throat: '2.9 bar(g)' },
    '3.1 bar(g) upstream and 2.9 bar(g) at the throat leave 200.0 mbar',
  ],
  [
    'Transmitter',
    { kind: 'transmitter', signal: '4-20 mA', upper: '250 mbar' },
    { value: '12 mA' },
    '12 mA is 125.0 mbar',
  ],
];

for (const [name, instrument, reading, sentence] of instruments)
  test(`${name}: drawn and read as the command line reads it`, async ({ page }, info) => {
    const project = await seaWater(instrument, [reading]);
    await openReadings(page, project);
    await expect(answer(page)).toContainText(sentence);
    await expect(main(page).getByRole('img', { name: `${name}, FE-4101` })).toBeVisible();
    const [row] = headless(project, info).readings;
    expect(row.massFlow_kg_s).toBeGreaterThan(0);
    const shown = Number(flat(await figure(page, 1, 'flow').innerText()).replace(' ', ''));
    expect(Math.abs(shown / (row.volumeFlow_m3_s * 3600) - 1)).toBeLessThan(5e-4);
  });

test('an instrument is entered and rows are typed with Enter', async ({ page }) => {
  await openReadings(page, await seaWater());
  await expect(answer(page)).toHaveText('FE-4101 waits for a reading.');
  const form = main(page).locator('#instrument');
  await form.getByLabel('Instrument', { exact: true }).selectOption('u-tube');
  await form.getByLabel('Gauge liquid', { exact: true }).selectOption('mercury');
  await form.getByLabel('Temperature at the instrument', { exact: true }).fill('24');
  await box(page, 'Reading', 1).fill('152');
  await expect(answer(page)).toContainText('152 mm of mercury under the process fluid is 186.5 mbar');
  await page.keyboard.press('Enter');
  await expect(box(page, 'Reading', 2)).toBeFocused();
  await page.keyboard.type('14,9 cm');
  await page.keyboard.press('Shift+Enter');
  await expect(box(page, 'Reading', 1)).toBeFocused();
  await expect(figure(page, 2, 'flow')).toHaveText('1026');
  await expect(panel(page, 'Readings')).toContainText('Mean of 2 flows 1031 m³/h');
  const meter = JSON.parse(String(await save(page))).meters[0];
  expect(meter.readings).toEqual([{ value: '152 mm' }, { value: '14.9 cm' }]);
});

test('a block from a spreadsheet is pasted with its units, filled down, and taken back', async ({ page }) => {
  await openReadings(page, await seaWater({ kind: 'differential' }, []));
  const block =
    'when\tdp (kPa)\tp (bar(g))\tt\r\n09:10\t18.65\t3.1\t17.5\r\n09:25\t18,28\t\t\r\n09:40\t5.03\t3.2\t\r\n';
  await paste(box(page, 'When', 1), block);
  await expect(panel(page, 'Readings')).toContainText('3 rows taken over.');
  await expect(figure(page, 1, 'flow')).toHaveText('1036');
  await expect(figure(page, 2, 'differential')).toHaveText('182.8');
  await panel(page, 'Readings')
    .getByRole('button', { name: /^Line pressure: fill down/ })
    .click();
  await expect(box(page, 'Line pressure', 2)).toHaveValue('3.1');
  await expect(box(page, 'Line pressure', 3)).toHaveValue('3.2');
  await box(page, 'Temperature', 2).focus();
  await page.keyboard.press('Control+d');
  await expect(box(page, 'Temperature', 2)).toHaveValue('17.5');
  for (let step = 0; step < 3; step += 1) await page.getByRole('button', { name: 'Undo' }).click();
  await expect(figure(page, 1, 'flow')).toHaveText('');
});

test('what cannot be read stays with its sentence, the other rows stand', async ({ page }) => {
  await openReadings(
    page,
    await seaWater({ kind: 'u-tube', liquid: 'mercury' }, [{ value: '152 mm' }, { value: '149 mm' }]),
  );
  await box(page, 'Reading', 2).fill('149 kg');
  await expect(box(page, 'Reading', 2)).toHaveValue('149 kg');
  await expect(box(page, 'Reading', 2)).toHaveAttribute('aria-invalid', 'true');
  await expect(panel(page, 'Readings')).toContainText('kg');
  await expect(main(page).locator('tr[data-row="1"]')).toContainText('not solved');
  await expect(figure(page, 1, 'flow')).not.toHaveText('');
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(figure(page, 2, 'flow')).not.toHaveText('');
});

test('a reversed reading and a failed signal are said', async ({ page }) => {
  await openReadings(
    page,
    await seaWater({ kind: 'transmitter', signal: '4-20 mA', upper: '250 mbar' }, [{ value: '12 mA' }]),
  );
  await box(page, 'Reading', 1).fill('3.5');
  await expect(answer(page)).toHaveText('3.5 mA: the instrument reports a failure.');
  await box(page, 'Reading', 1).fill('3.9');
  await expect(answer(page)).toContainText('the legs are crossed or the flow runs backwards.');
  await box(page, 'Reading', 1).fill('20.8');
  await expect(answer(page)).toContainText('at least');
});

test('the root signal of a control system stands beside the exact flow', async ({ page }) => {
  await openExample(page);
  await choose(page, 'FE-3102');
  await read(page);
  const table = panel(page, 'A root signal scaled for the design');
  await expect(table.getByRole('row')).toHaveCount(5);
  await expect(table).toContainText('Residual');
});

test('copied and saved: plain digits, text guarded, numbers untouched', async ({ page, context }) => {
  await context.grantPermissions(['clipboard-read', 'clipboard-write']);
  const rows = [
    { time: '=1+1', value: '152 mm' },
    { time: '09:55', value: '-12 mm' },
  ];
  await openReadings(page, await seaWater({ kind: 'u-tube', liquid: 'mercury', temperature: '24 degC' }, rows));
  await panel(page, 'Readings').getByRole('button', { name: 'Copy table' }).click();
  const tabs = await page.evaluate(() => navigator.clipboard.readText());
  expect(tabs.split('\r\n')[0]).toMatch(/^When\tReading \/ mm\t/);
  expect(tabs).toContain("'=1+1\t152\t");
  expect(tabs).toContain('09:55\t-12\t');
  const download = page.waitForEvent('download');
  await panel(page, 'Readings').getByRole('button', { name: 'Save as CSV' }).click();
  const file = await download;
  expect(file.suggestedFilename()).toBe('FE-4101.csv');
  const csv = readFileSync(await file.path(), 'utf8');
  expect(csv).toContain("'=1+1,152,");
  expect(csv).toContain('09:55,-12,');
  expect(csv).toMatch(/,186\.\d+,10\d\d,/);
});

test('the sheet of readings is printed with the instrument and its cautions', async ({ page }, info) => {
  await openExample(page);
  await choose(page, 'FE-4101');
  await read(page);
  await expect(answer(page)).toContainText('mercury');
  await page.waitForTimeout(1500); // the sheets follow when the typing rests
  const pages = (await printed(page, info)).pages.map(flat);
  const sheet = pages.find((one) => one.includes('legs crossed or flow reversed')) ?? '';
  expect(sheet).toContain('152 mm of mercury under the process fluid is 186.5 mbar');
  expect(sheet).toContain('Mercury: poisonous vapour');
  expect(sheet).toContain('open the equaliser, then close the low');
});

test('usable at 390 px, and nothing for axe to find, light and dark', async ({ page }) => {
  await page.setViewportSize({ width: 390, height: 844 });
  await openExample(page);
  await main(page).page().goto('/#/read');
  for (const colorScheme of ['light', 'dark'] as const) {
    await page.emulateMedia({ colorScheme });
    await expect(panel(page, 'Readings')).toBeVisible();
    const { violations } = await new AxeBuilder({ page }).analyze();
    expect(violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ target }) => target).join('; ')}`)).toEqual([]);
  }
  const width = await page.evaluate(() => document.documentElement.scrollWidth);
  expect(width).toBeLessThanOrEqual(390);
});

test('flow and note of a row stand on a screen of 1024 px', async ({ page }) => {
  await page.setViewportSize({ width: 1024, height: 768 });
  await openReadings(page, await seaWater({ kind: 'u-tube', liquid: 'mercury' }, [{ value: '152 mm' }]));
  const table = panel(page, 'Readings').getByRole('table');
  const { right } = await figure(page, 1, 'flow').evaluate((node) => node.getBoundingClientRect());
  expect(right).toBeLessThan(
    await table.evaluate((node) => node.closest('section')?.getBoundingClientRect().right ?? 0),
  );
});

test('works without a network', async ({ page, context }) => {
  await openReadings(page, await seaWater({ kind: 'differential' }, [{ value: '100 mbar' }]));
  await page.evaluate(() => navigator.serviceWorker.ready);
  await page.reload();
  await expect(answer(page)).toContainText('100.0 mbar');
  await context.setOffline(true);
  await page.reload();
  await read(page);
  await box(page, 'Reading', 1).fill('120');
  await expect(answer(page)).toContainText('flows.');
});
