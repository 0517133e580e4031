/** The same quantity in odd spellings, in browsers of several countries, is the same text in the file. */
import { field, openExample, savedMeter } from './hand.ts';
import { expect, test } from './watched.ts';

const upstream = 'Upstream pipe and fluid';
const duty = 'Flow to be measured';

for (const locale of ['en-GB', 'de-DE', 'fr-FR', 'sv-SE']) {
  test.describe(locale, () => {
    test.use({ locale });

    test('odd spellings are read, said, and written in one way, a unit alone converts', async ({ page }) => {
      await openExample(page);
      const differential = field(page, duty, 'Differential');
      const stored = async (typed: string): Promise<unknown> => {
        await differential.fill(typed);
        return (await savedMeter(page)).differential;
      };
      expect(await stored('12,5 kPa')).toBe('12.5 kPa');
      await expect(differential).toHaveAccessibleDescription(/read as 12\.5\skPa/);
      expect(await stored('12 inH2O')).toMatch(/^12 inH2O/);
      expect(await stored('1\u202f234,5 Pa')).toBe('1234.5 Pa');
      expect(await stored('1.25e4 Pa')).toBe('1.25e4 Pa');
      await field(page, upstream, 'Pipe bore').fill('1 234,5 mm');
      await field(page, upstream, 'Temperature').fill('\u22123.2 °C');
      expect(await savedMeter(page)).toMatchObject({
        pipe: { bore: '1234.5 mm' },
        upstream: { temperature: '-3.2 degC' },
      });
      const bore = field(page, upstream, 'Pipe bore');
      await bore.fill('101.6 mm');
      await bore.fill('in');
      await bore.blur();
      expect(await savedMeter(page)).toMatchObject({ pipe: { bore: '4 in' } });
      await expect(bore).toHaveValue('4');
    });
  });
}

test('entering and leaving every field changes nothing', async ({ page }) => {
  await openExample(page);
  const before = await savedMeter(page);
  for (const input of await page.getByRole('main').locator('input[data-field]').all()) {
    await input.focus();
    await input.blur();
  }
  expect(await savedMeter(page)).toEqual(before);
  await expect(page.getByRole('button', { name: 'Undo', exact: true })).toBeDisabled();
});
