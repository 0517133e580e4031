/** Project files go in and out byte for byte; what is none is refused with words. */
import type { JSHandle, Page } from '@playwright/test';
import { answer, exampleText, field, keeping, main, open, openExample, openFile, save, savedMeter } from './hand.ts';
import { expect, test } from './watched.ts';

const plain = { format: 'headwright', version: 1, meters: [{ tag: 'FE-9', find: 'bore' }] };

const files: Readonly<Record<string, () => Promise<string> | string>> = {
  'the example': exampleText,
  'odd spacing and no last line end': () =>
    '{"format":"headwright",\t"version":1,\n\n  "meters" : [ {"tag":"FE-9" } ]}',
  'lines ended as on another system': async () => (await exampleText()).replaceAll('\n', '\r\n'),
  'a byte order mark': () => `\ufeff${JSON.stringify(plain)}`,
  'keys nobody knows, at every level': () =>
    JSON.stringify(
      { later: [1, { a: null }], ...plain, meters: [{ ...plain.meters[0], note: { b: [true] } }] },
      null,
      4,
    ),
  'escapes and numbers as they were written': () =>
    '{"format":"headwright","version":1,"title":"\\u00e9\\ud83d\\ude00\\/","x":1.50e0,"meters":[]}\n',
  'keys in another order': () => '{"meters":[{"tag":"FE-9"}],"version":1,"format":"headwright"}',
};

test('opened and saved again is the same file, byte for byte, also after a reload', async ({ page }) => {
  await open(page);
  for (const [name, textOf] of Object.entries(files))
    await test.step(name, async () => {
      const text = await textOf();
      await openFile(page, `${name}.json`, text);
      await expect(page.getByText(`${name}.json is open.`)).toBeVisible();
      expect((await save(page)).equals(Buffer.from(text))).toBe(true);
      await page.reload();
      await expect(keeping(page)).toContainText('Kept in this browser');
      expect((await save(page)).equals(Buffer.from(text))).toBe(true);
    });
});

test('an edit leaves alone what it does not know, and undone it gives the file back', async ({ page }) => {
  const project = JSON.parse(await exampleText());
  project.meters[0].later = { deep: [1, 2] };
  project.surprise = 'kept';
  const text = JSON.stringify(project);
  await open(page);
  await openFile(page, 'given.headwright.json', text);
  await field(page, 'Flow to be measured', 'Differential').fill('300');
  expect(await savedMeter(page)).toEqual({ ...project.meters[0], differential: '300 mbar' });
  await page.getByRole('button', { name: 'Undo', exact: true }).click();
  expect(String(await save(page))).toBe(text);
});

/** A file as it hangs on the pointer; `times` makes a long one of a short text. */
const carry = (page: Page, content: string, times = 1): Promise<JSHandle<DataTransfer>> =>
  page.evaluateHandle(
    ([text, count]) => {
      const transfer = new DataTransfer();
      transfer.items.add(new File([text.repeat(count)], 'dropped.headwright.json', { type: 'application/json' }));
      return transfer;
    },
    [content, times] as const,
  );

test('a file that is dropped is opened', async ({ page }) => {
  await open(page);
  const text = await exampleText();
  const carried = await carry(page, text);
  await main(page).dispatchEvent('dragover', { dataTransfer: carried });
  await expect(page.getByText('Let go to open the project or the log')).toBeVisible();
  await main(page).dispatchEvent('drop', { dataTransfer: carried });
  await expect(answer(page)).toContainText('mm bore reads');
  expect(String(await save(page))).toBe(text);
});

const refused: readonly (readonly [name: string, content: string | Uint8Array, says: RegExp])[] = [
  [
    'a newer version',
    JSON.stringify({ ...plain, version: 2 }),
    /has version 2 of the format, and this program reads up to 1/,
  ],
  ['another format', '{"format":"other","version":1,"meters":[]}', /is no project/],
  ['no JSON', 'tag,bore\nFE-1,62.5\n', /is not JSON/],
  ['JSON cut short', '{"format":"headwright","version":1,"me', /is not JSON/],
  ['a list', '[]', /is no project/],
  ['no version', '{"format":"headwright","meters":[]}', /does not say which version/],
  ['no meters', '{"format":"headwright","version":1}', /no list of meters/],
  ['no text', new Uint8Array([0x89, 0x50, 0x4e, 0x47, 0xff, 0xfe, 0]), /is not text/],
];

test('what is no project is refused with words, and the work at hand stays', async ({ page }) => {
  await openExample(page);
  const good = await answer(page).innerText();
  for (const [name, content, says] of refused)
    await test.step(name, async () => {
      await openFile(page, `${name}.json`, content);
      await expect(page.getByText(says)).toBeVisible();
      await expect(answer(page)).toHaveText(good);
      await page.getByRole('button', { name: 'Dismiss' }).click();
    });
  expect(String(await save(page))).toBe(await exampleText());
});

test('a file far larger than any project is refused before it is read', async ({ page }) => {
  await openExample(page);
  const carried = await carry(page, 'x'.repeat(1024), 6 * 1024);
  await main(page).dispatchEvent('drop', { dataTransfer: carried });
  await expect(page.getByText(/too large for a project file/)).toBeVisible();
  await expect(answer(page)).toContainText('mm bore reads');
});

test('a file with a handle is saved to its own place', async ({ page, context }) => {
  // The browser's private file system stands in for the disk: its handles are the same kind of thing.
  await context.addInitScript(() => {
    const place = async (): Promise<FileSystemFileHandle> =>
      (await navigator.storage.getDirectory()).getFileHandle('disk.headwright.json', { create: true });
    Object.assign(window, { showOpenFilePicker: async () => [await place()], showSaveFilePicker: place });
  });
  await open(page);
  const onDisk = (): Promise<string> =>
    page.evaluate(async () => {
      const folder = await navigator.storage.getDirectory();
      return (await (await folder.getFileHandle('disk.headwright.json')).getFile()).text();
    });
  await page.evaluate(
    async (text) => {
      const folder = await navigator.storage.getDirectory();
      const stream = await (await folder.getFileHandle('disk.headwright.json', { create: true })).createWritable();
      await stream.write(text);
      await stream.close();
    },
    await exampleText(),
  );
  await page.keyboard.press('Control+o');
  await expect(answer(page)).toContainText('mm bore reads');
  await field(page, 'Flow to be measured', 'Differential').fill('300');
  await page.keyboard.press('Control+s');
  await expect(page.getByText('Saved as disk.headwright.json.')).toBeVisible();
  expect(JSON.parse(await onDisk()).meters[0].differential).toBe('300 mbar');
});
