/** Names are text, whatever they say: on the screen, on the sheet, in the title of the window and on the clipboard. */
import { exampleText, field, meters, openExample, openProject, panel } from './hand.ts';
import { expect, test } from './watched.ts';

const payloads = [
  '<script>document.title="x"</script>',
  '<img src=x onerror=document.title="x">',
  '"><svg onload=document.title="x">',
  "javascript:document.title='x'",
  '</title></style></textarea><b>bold</b>',
  // biome-ignore lint/suspicious/noTemplateCurlyInString: a payload
  '{{7*7}}${7*7}&lt;i&gt;',
  '\u202etxet desrever',
  '<a href="https://example.invalid/">go</a>',
];

test('markup in names stands there literally', async ({ page }) => {
  const project = JSON.parse(await exampleText());
  const [meter] = project.meters;
  const [first = '', second = ''] = payloads;
  project.title = first;
  project.revision = second;
  project.meters = payloads.map((text) => ({
    ...meter,
    tag: text,
    service: text,
    pipe: { ...meter.pipe, size: text },
  }));
  project.meters.push({
    ...meter,
    tag: 'x',
    fluid: { kind: first },
    element: { kind: second, tappings: first },
    differential: second,
  });
  await openProject(page, project);
  await expect(page.getByRole('banner')).toContainText(first);
  for (const text of payloads) {
    await meters(page).getByRole('button').filter({ hasText: text }).first().click();
    await expect(page.getByLabel('Tag', { exact: true })).toHaveValue(text);
    await expect(page.getByLabel('Line size', { exact: true })).toHaveValue(text);
  }
  await meters(page).getByRole('button', { name: /^x/ }).click();
  await expect(page.getByRole('main')).toContainText(second);
  await page.getByRole('link', { name: 'Sheet' }).click();
  for (const text of payloads)
    await expect(
      page.getByRole('main').getByRole('heading', { level: 2 }).filter({ hasText: text }).first(),
    ).toBeVisible();
  expect(await page.title()).toContain('Headwright');
  expect(await page.locator('main script, main img, main a, main b b').count()).toBe(0);
  expect(await page.evaluate(() => document.querySelector('[onerror], [onload]'))).toBeNull();
});

test('an address with markup in it is no place and no code', async ({ page }) => {
  await page.goto('/#/<img src=x onerror=alert(1)>');
  await expect(page.getByRole('main')).toBeVisible();
  await page.goto('/?q=<script>alert(1)</script>#/sheet');
  await expect(page.getByRole('main')).toBeVisible();
});

test('words that a spreadsheet would take for a formula are guarded, numbers are not', async ({ page, context }) => {
  await context.grantPermissions(['clipboard-read', 'clipboard-write']);
  await openExample(page);
  await field(page, 'Upstream pipe and fluid', 'Temperature').fill('5');
  await panel(page, 'At each flow').getByRole('button', { name: 'Copy table' }).click();
  await expect(panel(page, 'At each flow').getByRole('button', { name: 'Copied' })).toBeVisible();
  const [tabs, html] = await page.evaluate(async () => {
    const [item] = await navigator.clipboard.read();
    const read = async (type: string): Promise<string> => (await (await item?.getType(type))?.text()) ?? '';
    return [await read('text/plain'), await read('text/html')] as const;
  });
  const rows = tabs
    .trimEnd()
    .split(/\r?\n/)
    .map((row) => row.split('\t'));
  expect(rows).toHaveLength(4);
  expect(new Set(rows.map((row) => row.length)).size).toBe(1);
  for (const row of rows.slice(1))
    for (const cell of row.slice(1)) expect(cell).toMatch(/^[-+]?\d+(\.\d+)?(e[-+]?\d+)?$/i);
  for (const cell of [...(rows[0] ?? []), ...rows.map(([head = '']) => head)]) expect(cell).not.toMatch(/^[=+\-@]/);
  const shown = await panel(page, 'At each flow').getByRole('row').nth(1).getByRole('cell').allInnerTexts();
  expect(shown.map((text) => Number.parseFloat(text)).slice(0, 2)).toEqual(rows[1]?.slice(1, 3).map(Number));
  expect(html.match(/<td>/g)).toHaveLength(rows.flat().length);
});
