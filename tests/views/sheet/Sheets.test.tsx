import { readFileSync } from 'node:fs';
import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import type { MeterText, TraverseText } from '../../../src/core/document/project.ts';
import { run } from '../../../src/core/run.ts';
import { presentSheets } from '../../../src/views/present/sheet.ts';
import type { SheetKind } from '../../../src/views/sheet/paper.ts';
import { Sheets } from '../../../src/views/sheet/Sheets.tsx';
import { rectangular } from '../../core/traverse/sample.ts';
import { feedWater, meters, projectOf } from '../present/meters.ts';

interface Asked {
  readonly only?: { readonly list: 'meters' | 'traverses'; readonly index: number };
  readonly stale?: boolean;
  readonly paper?: 'A4' | 'Letter';
  readonly printedOn?: string;
  readonly include?: readonly SheetKind[];
  readonly paperOnly?: boolean;
}

function printed(list: readonly MeterText[], { paper = 'A4', ...asked }: Asked = {}): string {
  const project = { ...projectOf('SI', ...list), title: 'Tern Island works', revision: 'B', preparedBy: 'A. Lind' };
  return renderToStaticMarkup(<Sheets project={project} results={run(project)} paper={paper} {...asked} />);
}

/** Text of the page without tags, with plain spaces. */
const words = (markup: string): string =>
  markup
    .replace(/<[^>]+>/g, ' ')
    .replaceAll('&#x27;', "'")
    .replaceAll('&quot;', '"')
    .replaceAll('&gt;', '>')
    .replaceAll('&amp;', '&')
    .replace(/\s+/g, ' ');

const labels = (markup: string): readonly string[] =>
  [...markup.matchAll(/<section[^>]*aria-label="([^"]+)"/g)].map(([, label = '']) => label);

describe('the sheets of an averaging pitot', () => {
  const bars = meters.filter(({ element }) => element?.kind === 'averaging-pitot');
  it('show the bar in its pipe, and speak of no bore', () => {
    expect(bars).toHaveLength(2);
    for (const bar of bars) {
      const text = words(printed([bar], { include: ['sizing', 'dimensions'] }));
      expect(text).toContain('Averaging pitot, K on the');
      expect(text).toContain('bar not to scale; scale of the pipe 1 :');
      expect(text).toContain('Ports clear, front ports facing the flow');
      expect(text).not.toMatch(/Diameter ratio|Bore, four diameters|Edge and faces|NaN|undefined/);
    }
  });
  it('have no empty table of dimensions', () => {
    const [bare = feedWater, full = feedWater] = bars;
    expect(words(printed([bare], { include: ['dimensions'] }))).not.toContain('Dimensions and tolerances');
    expect(words(printed([full], { include: ['dimensions'] }))).toContain('Width of the bar w 25.4 mm');
  });
});

describe('pages', () => {
  it('numbers the sheets of each meter apart', () => {
    expect(labels(printed(meters.slice(0, 2)))).toEqual([
      'FE-1101, Sizing sheet, 1 of 3',
      'FE-1101, Checks and sources, 2 of 3',
      'FE-1101, Dimensions and pipework, 3 of 3',
      'FE-2304, Sizing sheet, 1 of 3',
      'FE-2304, Checks and sources, 2 of 3',
      'FE-2304, Dimensions and pipework, 3 of 3',
    ]);
  });
  it('prints one meter, and the sheets that are asked for, in their order', () => {
    expect(labels(printed(meters, { only: { list: 'meters', index: 1 }, include: ['working', 'sizing'] }))).toEqual([
      'FE-2304, Sizing sheet, 1 of 2',
      'FE-2304, Working, 2 of 2',
    ]);
  });
  it.each(['A4', 'Letter'] as const)('is laid out for %s', (paper) => {
    const markup = printed([feedWater], { paper });
    expect(markup).toContain(`data-sheets="${paper}"`);
    expect(markup.match(new RegExp(`<section class="[^"]*${paper}`, 'g'))).toHaveLength(3);
  });
  it('is in the page for the printer alone when asked', () => {
    expect(printed([feedWater], { paperOnly: true })).toMatch(/class="[^"]*paperOnly[^"]*" data-sheets/);
    expect(printed([feedWater])).not.toMatch(/paperOnly/);
  });
});

describe('what the sheets of a solved meter carry', () => {
  const project = projectOf('SI', feedWater);
  const [sheet] = presentSheets({ project, results: run(project) });
  if (sheet?.status !== 'solved') throw new Error(`expected a solved meter, got ${sheet?.status}`);
  const text = words(printed([feedWater], { printedOn: '2026-12-01' }));
  const plain = (figure: string): string => figure.replace(/\s+/g, ' ');
  it('every figure of every row and table', () => {
    const figures = [
      ...[...sheet.fluid, ...sheet.element, ...sheet.pipe].map((row) => row.text),
      ...sheet.duty.rows.flatMap((row) => row.cells),
      ...sheet.terms.rows.flatMap((row) => row.cells),
      ...sheet.checks.flatMap(({ rows }) => rows.flatMap((row) => [row.text, row.limit, row.verdictWord])),
      ...[...sheet.dimensions, ...sheet.straight].flatMap((row) => row.cells),
      ...sheet.sources.map(({ key, clause }) => `${key} ${clause}`),
      ...sheet.meter.notes,
      ...sheet.meter.cautions,
      sheet.answer,
    ];
    expect(figures.length).toBeGreaterThan(150);
    for (const figure of figures) expect(text).toContain(plain(figure));
  });
  it('a source for every key, and a key for every source', () => {
    const used = new Set(text.match(/\[\d+\]/g));
    expect([...used].sort()).toEqual(sheet.sources.map(({ key }) => key).sort());
  });
  it('the title block: names, boxes to sign, date of printing, version and fingerprint', () => {
    for (const field of ['Tern Island works', 'A. Lind', 'Approved', 'Signature', 'Date of issue', '2026-12-01'])
      expect(text).toContain(field);
    expect(text).toMatch(/Status computed with Headwright \d+\.\d+\.\d+, inputs [0-9a-f]{12}/);
  });
  it('the working, in symbols and with the numbers put in', () => {
    const markup = printed([feedWater], { include: ['working'] });
    expect(markup).toContain('<math');
    expect(words(markup)).toContain('0.5961');
    expect(markup).not.toMatch(/NaN|undefined|\[object/);
  });
});

describe('what cannot be signed', () => {
  it('a refused meter says why and from which inputs, never a blank page', () => {
    const markup = printed([{ ...feedWater, differential: '250', upstream: { pressure: '7 bar' } }]);
    expect(labels(markup)).toEqual(['FE-1101, Sizing sheet, 1 of 1']);
    const text = words(markup);
    expect(text).toContain('Not solved');
    expect(text).toMatch(/Differential pressure The differential pressure .+\. .+\./);
    expect(text).toContain('Upstream pressure 7 bar');
  });
  it.each([[null], [17], ['x'], [[]], [{}]])('%j in place of a meter still makes a sheet', (junk) => {
    const text = words(printed([junk as never]));
    expect(text).toContain('Not solved');
    expect(text).toMatch(/inputs [0-9a-f]{12}/);
  });
  it('figures of earlier inputs are called so on every sheet', () => {
    const warning = 'Not current: the inputs have changed';
    expect(words(printed([feedWater], { stale: true })).split(warning)).toHaveLength(4);
    expect(words(printed([feedWater]))).not.toContain(warning);
  });
});

describe('a survey whose fluid is not known yet', () => {
  const { state: _, readings, ...planned } = rectangular;
  const paper = (traverse: TraverseText, include?: readonly SheetKind[]): string => {
    const project = { ...projectOf('SI'), traverses: [traverse] };
    const asked = include === undefined ? {} : { include };
    return renderToStaticMarkup(<Sheets project={project} results={run(project)} paper="A4" {...asked} />);
  };
  it('prints the form for the field alone before anything is read', () => {
    const markup = paper(planned);
    expect(labels(markup)).toEqual(['SA-402, Form for the field, 1 of 1']);
    expect(words(markup)).toContain('1 84.1');
    expect(words(markup)).toContain('Static pressure in the duct');
  });
  it('says with readings why there is no result, and prints the form where it is asked for', () => {
    const read = { ...planned, ...(readings === undefined ? {} : { readings }) };
    expect(labels(paper(read, ['survey']))).toEqual(['SA-402, Survey sheet, 1 of 1']);
    expect(words(paper(read, ['survey']))).toContain('This survey has no result.');
    expect(labels(paper(read, ['form', 'survey']))).toHaveLength(2);
  });
  it('says what is wrong with the fluid also before anything is read', () => {
    const wrong = { ...planned, state: { pressure: '250', temperature: '22 degC' } };
    expect(words(paper(wrong, ['survey']))).toContain('This survey has no result.');
  });
});

describe('the style of the paper', () => {
  const css = (name: string): string =>
    readFileSync(new URL(`../../../src/views/sheet/${name}`, import.meta.url), 'utf8');
  const page = css('Page.module.css');
  it.each([
    ['a4', 'A4', 297, 210],
    ['letter', 'Letter', 279.4, 215.9],
  ] as const)('%s: 180 mm wide, and its height inside the margins', (name, paper, height, width) => {
    const [, top, side, foot] =
      /margin: ([\d.]+)mm ([\d.]+)mm ([\d.]+)mm/.exec(page.slice(page.indexOf(`@page ${name}`))) ?? [];
    expect(width - 2 * Number(side)).toBeGreaterThanOrEqual(180);
    const print = page.slice(page.indexOf('@media print'));
    const [, tall] = new RegExp(`\\.${paper} \\{\\s*min-height: ([\\d.]+)mm`).exec(print) ?? [];
    expect(Number(tall)).toBeLessThan(height - Number(top) - Number(foot));
    expect(Number(tall)).toBeGreaterThan(250);
  });
  it('has no type below 8 pt', () => {
    const files = ['Page', 'TitleBlock', 'Sheets', 'content', 'table', 'working'].map((name) =>
      css(`${name}.module.css`),
    );
    const sizes = files.flatMap((text) => [...text.matchAll(/(?:font(?:-size)?: )([\d.]+)(pt|px|mm)/g)]);
    expect(sizes.length).toBeGreaterThan(8);
    for (const [, size, unit] of sizes) {
      expect(unit).toBe('pt');
      expect(Number(size)).toBeGreaterThanOrEqual(8);
    }
  });
  it('counts the pages in the margin and leaves everything else off the paper', () => {
    expect(page.match(/counter\(page\) " of " counter\(pages\)/g)).toHaveLength(2);
    expect(css('Sheets.module.css')).toMatch(/@media print[\s\S]+data-sheets[\s\S]+display: none/);
  });
});
