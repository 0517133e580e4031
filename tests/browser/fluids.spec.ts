/** Fluids by hand: a composition from a spreadsheet, base states, overridden figures, steam on the line, own tables. */
import type { Page } from '@playwright/test';
import { answer, choose, field, fill, main, openProject, panel, press, savedMeter } from './hand.ts';
import { expect, test } from './watched.ts';

const UPSTREAM = 'Upstream pipe and fluid';

const plate = {
  pipe: { bore: '154.05 mm' },
  element: { kind: 'orifice-plate', tappings: 'flange' },
  differential: '250 mbar',
  find: 'bore',
};

const project = {
  format: 'headwright',
  version: 1,
  title: 'Tern Island works',
  meters: [
    {
      ...plate,
      tag: 'FE-2101',
      service: 'Fuel gas',
      fluid: { kind: 'gas', composition: { methane: '99 %' } },
      upstream: { pressure: '8 bar(g)', temperature: '15 degC' },
      duty: { maximum: '12000 base m3/h' },
    },
    {
      ...plate,
      tag: 'FE-2102',
      service: 'Steam to the evaporator',
      fluid: { kind: 'water' },
      upstream: { pressure: '8 bar(g)', temperature: '200 degC' },
      duty: { maximum: '9 t/h' },
    },
    {
      ...plate,
      tag: 'FE-2103',
      service: 'Brine',
      fluid: { kind: 'liquid', name: 'sodium-chloride-brine', concentration: '12 %' },
      upstream: { pressure: '3 bar(g)', temperature: '5 degC' },
      duty: { maximum: '100 m3/h' },
    },
  ],
};

const state = (page: Page) => panel(page, 'State and sizes');
const ANALYSIS = [
  'Component;mol %',
  'methane;93,1',
  'C2H6;3,0',
  'propane;1',
  'iC4;0,4',
  'n-Butane;0,4',
  'C6+;0,1',
  'N2;1,5',
  'CO2;0,5',
  'Total;100',
].join('\n');

/** As the clipboard of a spreadsheet brings it. */
const paste = (page: Page, label: string, text: string): Promise<void> =>
  main(page)
    .getByLabel(label, { exact: true })
    .evaluate((input, pasted) => {
      const clipboardData = new DataTransfer();
      clipboardData.setData('text/plain', pasted);
      input.dispatchEvent(new ClipboardEvent('paste', { clipboardData, bubbles: true, cancelable: true }));
    }, text);

test('a composition is pasted, looked over and taken in one step of undo', async ({ page }) => {
  await openProject(page, project);
  await expect(main(page).getByText('1 % missing')).toBeVisible();
  await paste(page, 'Share of Methane', ANALYSIS);
  await expect(main(page).getByText('1 line with a name that is not known.')).toBeVisible();
  await main(page).getByLabel('C6+ stands for').selectOption('n-hexane');
  await press(page, 'Take 8 lines');
  await expect(answer(page)).toContainText('mm bore reads 250 mbar at 12000 base m³/h');
  expect(await savedMeter(page)).toMatchObject({
    fluid: { basis: 'mole', composition: { methane: '93.1 %', isobutane: '0.4 %', 'n-hexane': '0.1 %' } },
  });
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(field(page, UPSTREAM, 'Share of Methane')).toHaveValue('99');
  await expect(main(page).getByLabel('Share of Nitrogen')).toHaveCount(0);
});

test('a sum that is off is brought to a whole when the user asks for it', async ({ page }) => {
  await openProject(page, project);
  await expect(answer(page)).toContainText('cannot be solved as it stands');
  await main(page).getByLabel('Bring the sum to 100 %').check();
  await expect(answer(page)).toContainText('mm bore reads');
  await expect(state(page)).toContainText('Relative density');
  await expect(state(page)).toContainText('Molar mass');
});

test('the base state is said beside the flow and chosen there', async ({ page }) => {
  await openProject(page, project);
  await main(page).getByLabel('Bring the sum to 100 %').check();
  await expect(main(page).getByText('base: 15 °C, 101.325 kPa(a)')).toBeVisible();
  const before = await answer(page).textContent();
  await field(page, 'Flow to be measured', 'Base state').selectOption('din-1343');
  await expect(main(page).getByText('base: 0 °C, 101.325 kPa(a)')).toBeVisible();
  await expect(answer(page)).not.toHaveText(before ?? '');
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(answer(page)).toHaveText(before ?? '');
});

test('a figure of the state is overridden, marked and given back to the model', async ({ page }) => {
  await openProject(page, project);
  await choose(page, 'FE-2103');
  await expect(answer(page)).toContainText('mm bore reads');
  const before = await answer(page).textContent();
  await state(page).getByRole('button', { name: 'Override: Density', exact: true }).click();
  await page.keyboard.type('1150 kg/m3');
  await expect(state(page)).toContainText('stated by you');
  await expect(answer(page)).not.toHaveText(before ?? '');
  await state(page).getByRole('button', { name: 'Back to the model: Density' }).click();
  await expect(state(page)).not.toContainText('stated by you');
  await expect(answer(page)).toHaveText(before ?? '');
});

test('an override that cannot be read is said beside its field', async ({ page }) => {
  await openProject(page, project);
  await choose(page, 'FE-2103');
  await state(page).getByRole('button', { name: 'Override: Density', exact: true }).click();
  await page.keyboard.type('heavy');
  await expect(state(page).getByLabel('Density, in place of the model’s')).toHaveAttribute('aria-invalid', 'true');
  await expect(answer(page)).toContainText('mm bore reads'); // the last good result
});

test('steam by its pressure alone, and wet steam with its caution', async ({ page }) => {
  await openProject(page, project);
  await choose(page, 'FE-2102');
  await fill(page, UPSTREAM, 'Temperature', '');
  await main(page).getByText('Saturated or wet steam').click();
  await field(page, UPSTREAM, 'Phase').selectOption('vapour');
  await expect(state(page)).toContainText('175.4 °C'); // saturation at 9.01325 bar, IAPWS R7-97(2012), Eq. 31
  await fill(page, UPSTREAM, 'Quality (vapour by mass)', '95');
  await expect(panel(page, 'Checks')).toContainText('Wet steam of quality 95');
  expect(await savedMeter(page, 1)).toMatchObject({ fluid: { phase: 'vapour', quality: '95 %' } });
});

test('a state out of range says so in a sentence', async ({ page }) => {
  await openProject(page, project);
  await choose(page, 'FE-2103');
  await fill(page, UPSTREAM, 'Temperature', '150');
  const sentence = panel(page, UPSTREAM).locator('[id="field-upstream.temperature-problem"]');
  await expect(sentence).toContainText('°C');
});

test('a table of the user is pasted, its units taken from the header', async ({ page }) => {
  await openProject(page, project);
  await choose(page, 'FE-2103');
  await field(page, UPSTREAM, 'Liquid').selectOption({ label: 'Own table' });
  await paste(page, 'Temperature, row 1', 'T / °F\tρ (kg/m3)\tν [cSt]\n32\t1095\t1,9\n68\t1088\t1,3');
  await press(page, 'Take 2 lines');
  await expect(answer(page)).toContainText('mm bore reads');
  expect(await savedMeter(page, 2)).toMatchObject({
    fluid: {
      table: [
        { temperature: '32 degF', density: '1095 kg/m3', viscosity: '1.9 cSt' },
        { temperature: '68 degF', density: '1088 kg/m3', viscosity: '1.3 cSt' },
      ],
    },
  });
});

test('a temperature measured downstream leads to the one upstream', async ({ page }) => {
  await openProject(page, project);
  await main(page).getByLabel('Bring the sum to 100 %').check();
  await expect(answer(page)).toContainText('mm bore reads');
  await field(page, UPSTREAM, 'Temperature measured').selectOption('downstream');
  await expect(state(page)).toContainText('from 15 °C measured downstream');
  await expect(panel(page, 'Working')).toContainText('Joule–Thomson coefficient');
  expect(await savedMeter(page)).toMatchObject({ upstream: { temperature: '15 degC', temperatureAt: 'downstream' } });
  await choose(page, 'FE-2103'); // a brine has no such figure: it is not asked
  await expect(field(page, UPSTREAM, 'Temperature')).toHaveValue('5');
  await expect(field(page, UPSTREAM, 'Temperature measured')).toHaveCount(0);
});

test('the equation of a gas is chosen, and its range is said', async ({ page }) => {
  await openProject(page, project);
  await main(page).getByLabel('Bring the sum to 100 %').check();
  await expect(state(page)).toContainText('holds for \u221223.2 to 176.9 °C, at most 350 bar(a)');
  await main(page).getByText('Equation of state and phase').click();
  await field(page, UPSTREAM, 'Equation of state').selectOption({ label: 'AGA8 DETAIL' });
  await expect(state(page)).toContainText('holds for \u221210.2 to 64.9 °C, at most 120 bar(a)');
});

test('the place of a site suggests its atmosphere', async ({ page }) => {
  await openProject(page, project);
  await page.getByRole('button', { name: 'Menu' }).click();
  await page.getByRole('button', { name: 'Title block, site, base state', exact: true }).click();
  const dialog = page.getByRole('dialog');
  await dialog.getByLabel('Altitude', { exact: true }).fill('350');
  await expect(dialog).toContainText('empty: 97.191 kPa(a), from 350 m');
  await dialog.getByLabel('Atmospheric pressure', { exact: true }).fill('98 kPa(a)');
  await expect(dialog).toContainText('suggested from 350 m: 97.191 kPa(a)');
  await dialog.getByRole('button', { name: 'Atmospheric pressure: take 97.191 kPa(a)' }).click();
  await expect(dialog.getByLabel('Atmospheric pressure', { exact: true })).toHaveValue('97.191');
});

test('a unit is never cut, however narrow its field', async ({ page }) => {
  await openProject(page, project);
  for (const width of [1600, 1440, 1280, 1024, 600, 390, 320]) {
    await page.setViewportSize({ width, height: 900 });
    const unit = main(page).getByLabel('Maximum flow, unit');
    const short = await unit.evaluate((select: HTMLSelectElement) => {
      const { fontWeight, fontSize, fontFamily, paddingLeft, paddingRight } = getComputedStyle(select);
      const ink = document.createElement('canvas').getContext('2d') as CanvasRenderingContext2D;
      ink.font = `${fontWeight} ${fontSize} ${fontFamily}`;
      const text = ink.measureText(select.selectedOptions[0]?.text ?? '').width;
      return text + Number.parseFloat(paddingLeft) + Number.parseFloat(paddingRight) - select.clientWidth;
    });
    expect(short, `${width} px`).toBeLessThan(1);
  }
});
