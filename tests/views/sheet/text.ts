/** A presented sheet as plain text: what a golden holds. */
import type { PresentedSheet, SheetHead } from '../../../src/views/present/sheet.ts';
import type { FigureRow } from '../../../src/views/present/sheet-tables.ts';
import type { SheetRow } from '../../../src/views/present/sources.ts';

const cells = (...list: readonly (string | undefined)[]): string =>
  `  ${list.map((cell) => cell ?? '').join(' | ')}`.trimEnd();

const rowText = ({ label, symbol, text, key, note }: SheetRow): string =>
  cells([label, symbol].filter(Boolean).join(' '), text, key, note);

const figureText = ({ label, symbol, cells: own, key, note, chosen }: FigureRow): string =>
  cells(`${chosen ? '*' : ''}${[label, symbol].filter(Boolean).join(' ')}`, ...own, key, note);

const headText = (head: SheetHead): readonly string[] =>
  Object.entries(head).map(([name, text]) =>
    `${name}: ${name === 'status' ? text.replace(/\d+\.\d+\.\d+/, 'VERSION') : text}`.trimEnd(),
  );

export function sheetText(sheet: PresentedSheet): string {
  if (sheet.status === 'refused') {
    const lines = [
      ...headText(sheet.head),
      'not solved',
      ...sheet.problems.map(({ field, sentence }) => cells(field, sentence)),
      'inputs',
      ...sheet.inputs.map(({ field, text }) => cells(field, text)),
      ...sheet.cautions,
    ];
    return `${lines.join('\n')}\n`;
  }
  const { section, duty, terms } = sheet;
  const lines = [
    ...headText(sheet.head),
    sheet.answer,
    `section: ${section.caption}; pipe ${section.pipe}, ${sheet.opening} ${section.bore}`,
    ...sheet.drawn.map(({ id, text }) => cells(id, text)),
    'fluid',
    ...sheet.fluid.map(rowText),
    'element',
    ...sheet.element.map(rowText),
    'pipe',
    ...sheet.pipe.map(rowText),
    `flows, ${sheet.span}`,
    cells('', ...duty.columns.map(({ label, symbol, measure, key }) => `${label} ${symbol} ${measure} ${key}`.trim())),
    ...duty.rows.map((row) => cells(row.label, ...row.cells)),
    'checks',
    ...sheet.checks.flatMap(({ title, verdict, rows }) => [
      `  ${title}: ${verdict}`,
      ...rows.map(({ text, limit, verdictWord, source }) => `  ${cells(text, limit, verdictWord, source)}`),
    ]),
    'terms',
    cells('', ...terms.terms),
    ...terms.rows.map((row) => cells(row.label, ...row.cells)),
    'dimensions',
    ...sheet.dimensions.map(figureText),
    'straight pipe',
    ...sheet.straight.map(figureText),
    'sources',
    ...sheet.sources.map(({ key, clause }) => cells(key, clause)),
    ...sheet.meter.notes,
    ...sheet.meter.cautions,
  ];
  return `${lines.join('\n')}\n`;
}
