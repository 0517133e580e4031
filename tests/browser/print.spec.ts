/** The sheets on paper, read back from the PDF: figures, pages, size of the paper. */
import type { Page, TestInfo } from '@playwright/test';
import type { MeterText, Project } from '../../src/core/document/project.ts';
import { answer, exampleText, field, openExample, openProject } from './hand.ts';
import { type Figures, solveHeadless } from './headless.ts';
import { flat, printed } from './paper.ts';
import { expect, test } from './watched.ts';

type Paper = 'A4' | 'Letter';
const sizes: Readonly<Record<Paper, string>> = { A4: '59[45].* x 84[12]', Letter: '612 x 792' }; // pt
/** A meter that was read has a sheet of its readings after the first. */
const sheetsOf = ({ readings }: MeterText): readonly string[] => [
  'Sizing sheet',
  ...(readings === undefined ? [] : ['Readings']),
  'Checks and sources',
  'Dimensions and pipework',
];
const surveySheets = ['Survey sheet', 'Readings, checks and sources'];

async function print(page: Page, paper: Paper, info: TestInfo) {
  await page.getByRole('link', { name: 'Sheet' }).click();
  await page.getByRole('radio', { name: paper }).check();
  await expect(page.getByRole('region', { name: /Sizing sheet/ }).first()).toBeVisible();
  return printed(page, info, paper);
}

/** The words of one line of the table of flows, its figures in the order of its columns. */
const lineOf = (text: string, name: string): string =>
  flat(text.split('\n').find((line) => new RegExp(`^\\s*${name}\\b`).test(line)) ?? '');

function expectFigures(sheet: string, { tag, bore, pipe, ratio, density, viscosity, duty }: Figures): void {
  const text = flat(sheet);
  expect(text).toContain(tag);
  for (const value of [bore, pipe, ratio, density, viscosity]) expect(text, tag).toContain(flat(value.text));
  for (const [name, row] of Object.entries(duty)) {
    const line = lineOf(sheet, name);
    let from = 0;
    for (const [column, { number }] of Object.entries(row)) {
      const place = line.indexOf(flat(number), from);
      expect(place, `${column} ${number} of ${tag} at ${name} flow in: ${line}`).toBeGreaterThan(0);
      from = place + number.length;
    }
  }
}

for (const paper of ['A4', 'Letter'] as const) {
  test(`the example on ${paper}: every figure is that of the command line, every page is numbered`, async ({
    page,
  }, info) => {
    await openExample(page);
    const { pages, about } = await print(page, paper, info);
    const project: Project = JSON.parse(await exampleText());
    const found = solveHeadless(await exampleText(), info);
    expect(found).toHaveLength(5);
    expect(about).toMatch(new RegExp(`Page size:\\s+${sizes[paper]}`));
    const own = project.meters.map(sheetsOf);
    const all = [...own, surveySheets].flatMap((types) =>
      types.map((type, at) => [type, `${at + 1} of ${types.length}`]),
    );
    expect(pages).toHaveLength(all.length);
    pages.forEach((text, at) => {
      expect(flat(text)).toContain(`Page ${at + 1} of ${pages.length}`);
      for (const words of all[at] ?? []) expect(flat(text)).toContain(words);
      expect(text).toContain('Tern Island works');
      expect(text).not.toContain('Undo'); // nothing of the screen
    });
    const firsts = own.map((_, at) => own.slice(0, at).flat().length);
    for (const [at, figures] of found.entries()) expectFigures(pages[firsts[at] ?? 0] ?? '', figures);
  });
}

test('the answer on paper is the sentence on the screen', async ({ page }, info) => {
  await openExample(page);
  const sentence = flat(await answer(page).innerText());
  const { pages } = await print(page, 'A4', info);
  expect(flat(pages[0] ?? '')).toContain(sentence);
});

test('a meter without a result prints why, with its inputs as written', async ({ page }, info) => {
  const project = JSON.parse(await exampleText());
  project.meters = [{ ...project.meters[0], differential: 'plenty' }];
  project.traverses = [];
  await openProject(page, project);
  const { pages } = await print(page, 'A4', info);
  expect(pages).toHaveLength(1);
  expect(flat(pages[0] ?? '')).toMatch(/Not solved.*plenty/);
  expect(flat(pages[0] ?? '')).toContain('60 t/h');
});

test('a figure made stale by later typing is not printed as if it held', async ({ page }, info) => {
  await openExample(page);
  await field(page, 'Flow to be measured', 'Differential').fill('wrong');
  const { pages } = await print(page, 'A4', info);
  expect(pages[0]).not.toContain('bore reads');
  expect(flat(pages[0] ?? '')).toContain('wrong');
});
