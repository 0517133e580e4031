/** A log in the browser: opened, looked at, converted in the worker, cancelled, lost and taken up again. */
import { spawnSync } from 'node:child_process';
import { readFileSync, writeFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { gzipSync } from 'node:zlib';
import AxeBuilder from '@axe-core/playwright';
import type { Locator, Page, TestInfo } from '@playwright/test';
import { exampleText, openProject, panel } from './hand.ts';
import { expect, test } from './watched.ts';

const root = fileURLToPath(new URL('../..', import.meta.url));
const ROWS = 300_000;
const TAG = 'FE-4101';

/** The example with one meter, which has a transmitter and no log yet. */
async function projectText(change: object = {}): Promise<string> {
  const project = JSON.parse(await exampleText());
  const meter = project.meters.find((one: { tag: string }) => one.tag === TAG);
  const instrument = { kind: 'transmitter', signal: '4-20 mA', lower: '0 mbar', upper: '250 mbar', output: 'linear' };
  project.meters = [{ ...meter, instrument, readings: undefined, log: undefined, ...change }];
  return JSON.stringify(project);
}

const columns = {
  time: 'time',
  signal: { column: 'signal_mA', unit: 'mA' },
  pressure: { column: 'p', unit: 'bar(g)' },
  temperature: { column: 't', unit: 'degC' },
};

/** A log of one row a second with faults that come round: faults of the transmitter, gaps, stamps again and backward. */
function logText(rows: number): string {
  const lines = ['time,signal_mA,p,t'];
  const start = Date.UTC(2026, 2, 1) / 1000;
  for (let row = 0; row < rows; row += 1) {
    const stamp = (second: number): string => new Date((start + second) * 1000).toISOString().slice(0, 19);
    const turn = row % 5000;
    const signal = turn === 100 ? '21.75' : turn < 20 ? '20.60' : (12 + 4 * Math.sin(row / 400)).toFixed(3);
    const pressure = turn === 300 ? '' : (3.1 + (row % 50) / 1000).toFixed(3);
    const second = turn === 700 ? row - 60 : turn === 900 ? row - 1 : row;
    if (turn >= 2000 && turn < 2030) continue;
    const text = turn === 1500 ? 'Bad Input' : signal;
    lines.push(`${stamp(second)}Z,${text},${pressure},${(17 + (row % 30) / 10).toFixed(1)}`);
  }
  return `${lines.join('\n')}\n`;
}

const log = (page: Page): Locator => panel(page, 'Log');
const button = (page: Page, name: string): Locator => log(page).getByRole('button', { name, exact: true });

async function read(page: Page, project: string): Promise<void> {
  await openProject(page, project);
  await page.getByRole('link', { name: 'Read' }).click();
  await expect(log(page)).toBeVisible();
}

async function openLog(page: Page, name: string, bytes: string | Uint8Array): Promise<void> {
  const chooser = page.waitForEvent('filechooser');
  await log(page)
    .getByRole('button', { name: /^Open (a log|another)$/ })
    .click();
  const path = test.info().outputPath(name);
  writeFileSync(path, bytes);
  await (await chooser).setFiles(path);
  await expect(log(page).getByText(name, { exact: true })).toBeVisible();
}

async function converted(page: Page): Promise<void> {
  await button(page, 'Convert the log').click();
  await expect(button(page, 'Convert it again')).toBeEnabled({ timeout: 45_000 });
}

/** Starts, cancels once the progress is seen, and tells how many ms the page took to answer. All in the page: it is quick. */
const cancelOnTheWay = (page: Page): Promise<number> =>
  log(page).evaluate(async (panel: HTMLElement) => {
    const press = (name: string): void =>
      [...panel.querySelectorAll('button')].find((one) => one.textContent === name)?.click();
    const until = async (words: string): Promise<number> => {
      const began = performance.now();
      while (!panel.innerText.includes(words)) {
        if (performance.now() - began > 30_000) throw new Error(`expected '${words}', got ${panel.innerText}`);
        await new Promise((resolve) => setTimeout(resolve, 10));
      }
      return performance.now() - began;
    };
    press('Convert the log');
    await until('rows a second');
    if (panel.querySelector('progress') === null) throw new Error('expected a bar of progress, got none');
    press('Cancel');
    return until('The conversion was cancelled. Nothing of it was kept.');
  });

/** What the command line makes of the same log. */
function byCommand(
  project: string,
  text: string,
  info: TestInfo,
): { readonly total_kg: number; readonly rows: number; readonly out: string } {
  const [file, input, output] = ['p.json', 'in.csv', 'out.csv'].map((name) => info.outputPath(name)) as [
    string,
    string,
    string,
  ];
  writeFileSync(file, project);
  writeFileSync(input, text);
  const run = spawnSync(
    process.execPath,
    ['src/app/headwright.mjs', 'convert', file, '--tag', TAG, '--log', input, '--out', output],
    { cwd: root, encoding: 'utf8' },
  );
  if (run.status !== 0) throw new Error(`expected a converted log, got exit ${run.status}: ${run.stderr}${run.stdout}`);
  return { ...JSON.parse(run.stdout), out: readFileSync(output, 'utf8') };
}

async function savedRows(page: Page): Promise<string> {
  const download = page.waitForEvent('download');
  await button(page, 'Save the converted rows').click();
  return readFileSync(await (await download).path(), 'utf8');
}

test('300,000 rows with faults: progress, cancelled, converted to what the command line makes of them', async ({
  page,
}, info) => {
  test.slow();
  const project = await projectText({ log: columns });
  const text = logText(ROWS);
  await read(page, await projectText({ log: { ...columns, exact: true } })); // slow enough to be cancelled at any load
  await openLog(page, 'march.csv', text);
  await expect(button(page, 'Convert the log')).toBeEnabled();
  expect(await cancelOnTheWay(page)).toBeLessThan(1000); // 100 ms, and a page on two busy cores
  await log(page).getByText('More rules').click();
  await log(page).getByLabel('Every row through the whole calculation').uncheck();
  await converted(page);
  const { total_kg, rows, out } = byCommand(project, text, info);
  expect(rows).toBeGreaterThan(298_000);
  const tonnes = Number(
    (
      await log(page)
        .getByRole('table', { name: 'Totals' })
        .getByRole('row', { name: /^Mass/ })
        .getByRole('cell')
        .innerText()
    ).replace(/[^\d.]/g, ''),
  );
  expect(Math.abs(tonnes * 1000 - total_kg)).toBeLessThanOrEqual(total_kg * 1e-5);
  for (const account of [
    'Signal saturated',
    'Fault of the transmitter',
    'Pressure missing',
    'Stamp repeated',
    'Stamp backward',
    'Signal unreadable',
  ])
    await expect(log(page).getByRole('rowheader', { name: new RegExp(`^${account}`) })).toBeVisible();
  expect(await savedRows(page)).toBe(out);
});

test('a packed log comes to the same rows', async ({ page }, info) => {
  const project = await projectText({ log: columns });
  const text = logText(20_000);
  await read(page, project);
  await openLog(page, 'day.csv.gz', gzipSync(text));
  await converted(page);
  expect(await savedRows(page)).toBe(byCommand(project, text, info).out);
});

test('a worker that dies costs its job, and the next one works', async ({ page }) => {
  test.slow();
  await page.addInitScript(() => {
    const workers: Worker[] = [];
    Object.assign(window, { workers });
    window.Worker = class extends Worker {
      constructor(url: string | URL, options?: WorkerOptions) {
        super(url, options);
        workers.push(this);
      }
    };
  });
  await read(page, await projectText({ log: { ...columns, exact: true } }));
  await openLog(page, 'march.csv', logText(ROWS));
  await button(page, 'Convert the log').click();
  await expect(
    log(page)
      .getByText(/rows a second/)
      .first(),
  ).toBeVisible();
  const waited = page.evaluate(async () => {
    (window as unknown as { workers: Worker[] }).workers.at(-1)?.terminate();
    const began = performance.now();
    while (!document.body.innerText.includes('The conversion broke off')) {
      await new Promise((resolve) => setTimeout(resolve, 50));
      if (performance.now() - began > 20_000) return Number.POSITIVE_INFINITY;
    }
    return performance.now() - began;
  });
  expect(await waited).toBeLessThan(3000); // 2 s, and a page on two busy cores
  await openLog(page, 'day.csv', logText(5000));
  await converted(page);
  await expect(log(page).getByText(/ passed between /)).toBeVisible();
});

test('what can be read in two ways is asked, and the answer is a step of undo', async ({ page }) => {
  const days = Array.from(
    { length: 40 },
    (_, at) => `0${1 + (at % 9)}/0${1 + (Math.floor(at / 9) % 9)}/2026 12:00;${at + 4},5`,
  );
  const project = await projectText({ log: { time: 'stamp', differential: { column: 'dp', unit: 'mbar' } } });
  await read(page, project);
  await openLog(page, 'dates.csv', `stamp;dp\n${days.join('\n')}\n`);
  await expect(log(page).getByText('To be answered before it can begin')).toBeVisible();
  await expect(button(page, 'Convert the log')).toBeDisabled();
  await log(page)
    .getByRole('button', { name: /Read it as .*month, day, year/ })
    .click();
  await expect(button(page, 'Convert the log')).toBeEnabled();
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(button(page, 'Convert the log')).toBeDisabled();
  await log(page)
    .getByRole('button', { name: /Read it as .*day, month, year/ })
    .click();
  await expect(button(page, 'Convert the log')).toBeEnabled();
});

test('columns chosen by hand carry the unit of their name into the file', async ({ page }) => {
  await read(page, await projectText({ instrument: undefined }));
  await openLog(
    page,
    'plain.csv',
    'when,dp_mbar,T [degC]\n2026-03-01T00:00:00Z,100,17.5\n2026-03-01T00:00:01Z,101,17.5\n',
  );
  await log(page).getByLabel('Time', { exact: true }).selectOption('when');
  await log(page).getByLabel('Differential', { exact: true }).selectOption('dp_mbar');
  await expect(log(page).getByLabel('Differential, unit')).toHaveValue('mbar');
  await log(page).getByLabel('Temperature', { exact: true }).selectOption('T [degC]');
  await expect(log(page).getByLabel('Temperature, unit')).toHaveValue('degC');
  await converted(page);
  await expect(log(page).getByText(/^2 rows in .*: 2 converted/)).toBeVisible();
});

test('the example log is made on the spot, also without a network, and has its summary on one page', async ({
  page,
  context,
}) => {
  test.slow();
  await read(page, await projectText());
  await page.waitForFunction(() => navigator.serviceWorker.controller?.state === 'activated');
  await context.setOffline(true);
  await button(page, 'Example log').click();
  await converted(page);
  await expect(log(page).getByText(/ passed between 2026-03-14/)).toBeVisible();
  await expect(log(page).locator('svg').first()).toBeVisible();
  const { violations } = await new AxeBuilder({ page }).include('#log').analyze();
  expect(violations.map(({ id, nodes }) => `${id}: ${nodes[0]?.html}`)).toEqual([]);
  await log(page).getByRole('link', { name: 'Print the summary' }).click();
  await expect(page.getByRole('region', { name: `${TAG}, Summary of a log, 1 of 1` })).toBeVisible();
  const pdf = (await page.pdf({ preferCSSPageSize: true })).toString('latin1');
  expect(pdf.match(/\/Type\s*\/Page\b/g)).toHaveLength(1);
});

test('a file that is no log is refused in words, and a changed meter makes the result old', async ({ page }) => {
  await read(page, await projectText({ log: columns }));
  await openLog(page, 'empty.csv', '\n\n');
  await expect(log(page).getByText(/The log holds no row of data/)).toBeVisible();
  await openLog(page, 'broken.csv.gz', gzipSync(logText(3000)).subarray(0, 9000));
  await expect(log(page).getByText(/The packed log is cut off/)).toBeVisible();
  await openLog(page, 'day.csv', logText(3000));
  await converted(page);
  await log(page).getByLabel('Longest interval bridged').fill('5 s');
  await expect(
    log(page).getByText('The meter or the columns have changed since: convert the log again.'),
  ).toBeVisible();
});

test('a log is dropped on the page', async ({ page }) => {
  await read(page, await projectText({ log: columns }));
  const transfer = await page.evaluateHandle((text) => {
    const data = new DataTransfer();
    data.items.add(new File([text], 'dropped.csv'));
    return data;
  }, logText(500));
  await page.getByRole('main').dispatchEvent('drop', { dataTransfer: transfer });
  await expect(log(page).getByText('dropped.csv', { exact: true })).toBeVisible();
});
