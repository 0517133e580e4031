/** Where the flow leaves the Reynolds numbers of the standard, the curve says so, and the checks do. */
import { answer, openExample, openProject, panel } from './hand.ts';
import { expect, test } from './watched.ts';

const oil = {
  format: 'headwright',
  version: 1,
  title: 'Tern Island works',
  meters: [
    {
      tag: 'FE-7',
      fluid: { kind: 'stated', density: '900 kg/m3', viscosity: '20 mPa.s' },
      upstream: { pressure: '7 bar(g)', temperature: '40 degC' },
      pipe: { bore: '102.26 mm' },
      element: { kind: 'orifice-plate', tappings: 'flange' },
      duty: { maximum: '60 t/h', normal: '40 t/h', minimum: '12 t/h' }, // Re 10 400, 6 900, 2 100
      differential: '250 mbar',
      find: 'bore',
    },
  ],
};

const words = 'below the Reynolds numbers of the standard';

test('the range below the limit is hatched and named on the curve, and the checks are outside', async ({ page }) => {
  await openProject(page, oil);
  await expect(answer(page)).toContainText('mm bore reads');
  const curve = panel(page, 'Flow against differential');
  const label = curve.locator('svg').getByText(words);
  await expect(label).toBeVisible();
  const [text, plot] = [await label.boundingBox(), await curve.locator('svg').first().boundingBox()];
  if (text === null || plot === null) throw new Error('expected a label in a plot, got none');
  expect(text.x, 'the label is not cut off at the left').toBeGreaterThanOrEqual(plot.x);
  expect(text.x + text.width, 'nor at the right').toBeLessThanOrEqual(plot.x + plot.width);
  await expect(curve.locator('svg [fill^="url(#"]').first()).toBeVisible();
  await expect(curve.locator('figcaption')).toContainText(new RegExp(`From\\s0\\sto\\s[\\d.]+\\smbar it is ${words}`));
  await expect(curve.getByRole('row', { name: /outside$/ }).first()).toBeAttached();
  const check = panel(page, 'Checks')
    .getByRole('listitem')
    .filter({ hasText: /Pipe Reynolds number.*at minimum flow/ });
  await expect(check).toContainText('outside');
  await expect(page.getByRole('navigation', { name: 'Meters' }).getByRole('button', { name: 'FE-7' })).toContainText(
    'outside',
  );
});

test('the hatched range ends where the Reynolds number reaches the limit', async ({ page }) => {
  await openProject(page, oil);
  const caption = await panel(page, 'Flow against differential').locator('figcaption').innerText();
  const [, end = ''] = /From\s0\sto\s([\d.]+)\smbar/.exec(caption) ?? [];
  const ratio = /[Dd]iameter ratio\D*([\d.]+)/.exec(await panel(page, 'State and sizes').innerText())?.[1] ?? '';
  // ISO 5167-2, 5.3.1: Re_D at least 5000 and 170 β² D (D in mm); the flow goes with the root of the differential.
  const limit = Math.max(5000, 170 * Number(ratio) ** 2 * 102.26);
  const reynolds = (4 * (60 / 3.6)) / (Math.PI * 0.10226 * 0.02);
  expect(Number(end) / (250 * (limit / reynolds) ** 2)).toBeCloseTo(1, 1); // C changes by a few percent on the way
});

test('a curve that stays inside is not named outside at its duty points', async ({ page }) => {
  await openExample(page);
  const reynolds = panel(page, 'Checks').getByRole('listitem').filter({ hasText: 'Pipe Reynolds number' });
  await expect(reynolds.first()).toContainText('inside');
  await expect(reynolds.filter({ hasText: 'outside' })).toHaveCount(0);
});
