/** The table of readings for other programs: cells for the clipboard, and a CSV file. */
import type { PresentedReadings, ReadingColumn, ReadingRow } from '../../present/readings-model.ts';
import { readWords as words } from '../../words/readings.ts';
import { shownCell } from '../fluid/rows.ts';
import { type Cell, number, words as plain } from '../panel/clipboard.ts';
import type { ReadColumn, Units } from './columns.ts';

const FIGURES: readonly ReadingColumn[] = [
  'differential',
  'flow',
  'velocity',
  'reynolds',
  'coefficient',
  'expansibility',
  'uncertainty',
];

/** Head and rows: what was typed in the units of its columns, then what follows from it, plain digits throughout. */
export function readingCells(
  { rows, units: found }: Pick<PresentedReadings, 'rows' | 'units'>,
  columns: readonly ReadColumn[],
  units: Units,
): readonly (readonly Cell[])[] {
  const head = [
    ...columns.map(({ name, label }) => headOf(label, units[name]?.print ?? '')),
    ...FIGURES.map((id) => headOf(words[id], found[id])),
    words.note,
  ];
  return [
    head.map(plain),
    ...rows.map((row) => [...typed(row, columns, units), ...figures(row), plain(row.note.words)]),
  ];
}

const headOf = (label: string, unit: string): string => (unit === '' ? label : `${label} / ${unit}`);

const typed = ({ written }: ReadingRow, columns: readonly ReadColumn[], units: Units): readonly Cell[] =>
  columns.map((column) => {
    const text = written[column.name] ?? '';
    const unit = units[column.name];
    if (column.kind === undefined || unit === undefined) return plain(text);
    const shown = shownCell(text, column, unit);
    return /^[+-]?[\d.]+(e[+-]?\d+)?$/i.test(shown) ? number(shown) : plain(shown);
  });

const figures = ({ figures: found }: ReadingRow): readonly Cell[] =>
  FIGURES.map((id) => number((found[id]?.plain ?? '').split(' ')[0] ?? ''));

/** Text that a spreadsheet would take for a formula is quoted; figures are left as they are. RFC 4180. */
export const asCsv = (cells: readonly (readonly Cell[])[]): string =>
  cells.map((row) => `${row.map(csvCell).join(',')}\r\n`).join('');

function csvCell({ type, text }: Cell): string {
  const guarded = type === 'words' && /^[=+\-@\t\r\n]/.test(text) ? `'${text}` : text;
  return /[",\r\n\t]/.test(guarded) ? `"${guarded.replaceAll('"', '""')}"` : guarded;
}

/** Hands a text to the browser as a file to keep. */
export function saveText(text: string, name: string): void {
  const url = URL.createObjectURL(new Blob([`\ufeff${text}`], { type: 'text/csv' }));
  const link = document.createElement('a');
  link.href = url;
  link.download = name;
  link.click();
  setTimeout(() => URL.revokeObjectURL(url), 0);
}
