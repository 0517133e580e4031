/** A presented sheet as plain text: what a golden holds. */
import type { ReadingTable } from '../../../src/views/present/readings-sheet.ts';
import type { PresentedSheet, RefusedSheet, SheetHead } from '../../../src/views/present/sheet.ts';
import type { CheckBlock, FigureRow, TermTable } from '../../../src/views/present/sheet-tables.ts';
import type { SheetRow } from '../../../src/views/present/sources.ts';
import type { PresentedSurveySheet } from '../../../src/views/present/survey-sheet.ts';

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

function refusedText({ head, problems, inputs, cautions }: RefusedSheet): string {
  const lines = [
    ...headText(head),
    'not solved',
    ...problems.map(({ field, sentence }) => cells(field, sentence)),
    'inputs',
    ...inputs.map(({ field, text }) => cells(field, text)),
    ...cautions,
  ];
  return `${lines.join('\n')}\n`;
}

const judgedText = (checks: readonly CheckBlock[], terms: TermTable): readonly string[] => [
  'checks',
  ...checks.flatMap(({ title, verdict, rows }) => [
    `  ${title}: ${verdict}`,
    ...rows.map(({ text, limit, verdictWord, source }) => `  ${cells(text, limit, verdictWord, source)}`),
  ]),
  'terms',
  cells('', ...terms.terms),
  ...terms.rows.map((row) => cells(row.label, ...row.cells)),
];

/** A survey, its points line by line. */
export function surveyText(sheet: PresentedSurveySheet): string {
  if (sheet.status === 'refused') return refusedText(sheet);
  const { survey } = sheet;
  const lines = [
    ...headText(sheet.head),
    sheet.answer,
    survey.under,
    ...sheet.facts.map(({ label, text }) => cells(label, text)),
    'result',
    ...sheet.results.map(rowText),
    'section',
    ...sheet.plan.map(rowText),
    'quality',
    ...sheet.quality.map(rowText),
    'fluid',
    ...sheet.fluid.map(rowText),
    `points: ${Object.values(survey.units).join(', ')}`,
    ...survey.lines.flatMap(({ title, place, points, mean }) => [
      `  ${title} ${place}`.trimEnd(),
      ...points.map(({ number, depth, weight, differential, velocity, moved }) =>
        cells(
          `  ${number}${moved ? ' moved' : ''}`,
          depth.number,
          weight.number,
          differential?.number,
          velocity?.number,
        ),
      ),
      ...(mean === undefined ? [] : [cells('  mean', mean.number)]),
    ]),
    survey.profile.summary,
    'suggestions',
    ...survey.suggestions.map(({ text, cited, chosen }) =>
      cells(`${chosen ? '*' : ''}${text}`, cited.clause, cited.mark),
    ),
    ...judgedText(sheet.checks, sheet.terms),
    'sources',
    ...sheet.sources.map(({ key, clause }) => cells(key, clause)),
    survey.certainty,
    ...survey.notes,
    ...survey.cautions,
  ];
  return `${lines.join('\n')}\n`;
}

function readingLines({ answer, instrument, heads, rows, together, problems, notes }: ReadingTable): readonly string[] {
  return [
    'readings',
    answer,
    ...instrument.map(({ label, text }) => cells(label, text)),
    cells(...heads.map(({ label, unit }) => [label, unit].filter(Boolean).join(' '))),
    ...rows.map((row) => cells(...row)),
    ...together,
    ...problems,
    ...notes,
  ];
}

export function sheetText(sheet: PresentedSheet): string {
  if (sheet.status === 'refused') return refusedText(sheet);
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
    ...judgedText(sheet.checks, terms),
    'dimensions',
    ...sheet.dimensions.map(figureText),
    'straight pipe',
    ...sheet.straight.map(figureText),
    'sources',
    ...sheet.sources.map(({ key, clause }) => cells(key, clause)),
    ...(sheet.readings === undefined ? [] : readingLines(sheet.readings)),
    ...sheet.meter.notes,
    ...sheet.meter.cautions,
  ];
  return `${lines.join('\n')}\n`;
}
