/** Bad input: the sentence stands beside the field, the text stays, the last good result stays and says that it is old. */
import type { Page } from '@playwright/test';
import {
  answer,
  exampleText,
  field,
  meters,
  openExample,
  openProject,
  panel,
  press,
  type Station,
  unfold,
} from './hand.ts';
import { expect, test } from './watched.ts';

interface Case {
  readonly name: string;
  readonly at: readonly [Station, label: string];
  readonly typed: string;
  readonly says: RegExp;
  readonly find?: string;
}

const upstream = 'Upstream pipe and fluid';
const duty = 'Flow to be measured';

const kinds: Readonly<Record<string, readonly Case[]>> = {
  units: [
    { name: 'an unknown unit', at: [duty, 'Differential'], typed: '250 mbra', says: /unit 'mbra'.*not known.*mbar/ },
    { name: 'a unit of another quantity', at: [upstream, 'Temperature'], typed: '85 kg/s', says: /'kg\/s'.*measures/ },
  ],
  references: [
    {
      name: 'a pressure without its reference',
      at: [upstream, 'Pressure'],
      typed: '7 bar',
      says: /does not say from where/,
    },
    { name: 'a differential with a reference', at: [duty, 'Differential'], typed: '1 bar(g)', says: /is a difference/ },
    {
      name: 'a share of nothing',
      at: ['Downstream', 'Differential, ±'],
      typed: '0.1 %',
      says: /of what it is a share/,
    },
  ],
  'what is no number': [
    { name: 'letters', at: [duty, 'Maximum'], typed: 'lots', says: /'lots'.*is no number/ },
    { name: 'two decimal marks', at: [upstream, 'Pipe bore'], typed: '1.2.3', says: /1\.2\.3/ },
    { name: 'groups that are no threes', at: [duty, 'Maximum'], typed: '1 23 4', says: /grouped|is no number/ },
  ],
  'numbers too small and too large': [
    { name: 'a negative bore', at: [upstream, 'Pipe bore'], typed: '-102.26', says: /not above zero|below zero/ },
    { name: 'a power of ten without end', at: [duty, 'Maximum'], typed: '1e999', says: /larger than any number/ },
    {
      name: 'a temperature that water does not have',
      at: [upstream, 'Temperature'],
      typed: '2500',
      says: /outside the formulation/,
    },
  ],
  'what cannot be': [
    {
      name: 'a differential above the pressure',
      at: [duty, 'Differential'],
      typed: '9 bar',
      says: /not below the upstream pressure/,
    },
    { name: 'an empty required field', at: [upstream, 'Temperature'], typed: '', says: /not given\. Fill it in/ },
    {
      name: 'a bore larger than the pipe',
      find: 'Find the differential',
      at: ['Element', 'Bore'],
      typed: '150',
      says: /not smaller than the pipe bore/,
    },
  ],
};

/** Types what is bad, looks at what is said and what stays, and mends it. */
async function expectRefusal(page: Page, { at, typed, says }: Case): Promise<void> {
  const input = field(page, ...at);
  await unfold(input);
  const unit = await input.locator('xpath=following-sibling::select').inputValue();
  const good = await answer(page).innerText();
  const written = (await input.inputValue()).replace(` ${unit}`, ''); // a field shows what was typed last, unit and all
  const rows = await panel(page, 'At each flow').getByRole('table').innerText();
  await input.fill(typed);
  await expect(input).toHaveAttribute('aria-invalid', 'true');
  await expect(input).toHaveAccessibleDescription(says);
  await expect(answer(page)).toHaveText(good);
  await expect(page.getByText(/^Last good result\./)).toBeVisible();
  await expect(panel(page, 'At each flow').getByText('last good result')).toBeVisible();
  await expect(panel(page, 'Checks').getByText('last good result')).toBeVisible();
  expect(await panel(page, 'At each flow').getByRole('table').innerText()).toBe(rows);
  await expect(meters(page).getByRole('button', { name: 'FE-1101' })).toContainText('not solved');
  await input.blur();
  await expect(input).toHaveValue(typed);
  await input.fill(`${written} ${unit}`);
  await input.blur();
  await expect(input).toHaveAttribute('aria-invalid', 'false');
  await expect(page.getByText(/^Last good result\./)).toHaveCount(0);
  await expect(answer(page)).toHaveText(good);
}

for (const [kind, cases] of Object.entries(kinds)) {
  test(`${kind}: said beside the field, nothing lost, mended again`, async ({ page }) => {
    await openExample(page);
    for (const one of cases)
      await test.step(one.name, async () => {
        if (one.find !== undefined) await press(page, one.find);
        await expectRefusal(page, one);
      });
  });
}

test('a file with a number without a unit: said, kept, and mended by typing', async ({ page }) => {
  const project = JSON.parse(await exampleText());
  project.meters[0].differential = '250';
  await openProject(page, project);
  const input = field(page, duty, 'Differential');
  await expect(input).toHaveValue('250');
  await expect(input).toHaveAccessibleDescription(/'250' has no unit/);
  await expect(input).toHaveAttribute('aria-invalid', 'true');
  await input.fill('250 mbar');
  await expect(answer(page)).toContainText('reads 250 mbar');
});

test('what is wrong in one meter leaves the others alone', async ({ page }) => {
  await openExample(page);
  await field(page, duty, 'Differential').fill('wrong');
  await page.getByRole('navigation', { name: 'Meters' }).getByRole('button', { name: 'FE-2304' }).click();
  await expect(answer(page)).toContainText('throat reads');
  await expect(page.getByText(/^Last good result\./)).toHaveCount(0);
});
