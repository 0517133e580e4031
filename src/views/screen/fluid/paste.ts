/** Text from a spreadsheet as rows of cells: tabs, semicolons, commas or blanks between them, quotes as in CSV. */

export type Rows = readonly (readonly string[])[];

/** Whether a pasted text is a table: what has one cell belongs into the box at hand. */
export const isTable = (text: string): boolean => /[\t\n\r;]/.test(text.trim());

/** Blank lines are left out, blank cells are kept. */
export function rowsOf(text: string): Rows {
  const lines = text.split(/\r\n|\r|\n/).filter((line) => line.trim() !== '');
  const mark = ['\t', ';'].find((candidate) => lines.some((line) => line.includes(candidate)));
  return lines.map((line) => (mark === undefined ? loose(line) : split(line, mark)).map(cleaned));
}

const cleaned = (cell: string): string => cell.replace(/[\u00a0\u2009\u202f]/g, ' ').trim();

/** A mark inside quotes belongs to the cell; two quotes inside stand for one. */
function split(line: string, mark: string): readonly string[] {
  const cells = [''];
  let quoted = false;
  for (const character of line) {
    const last = cells.length - 1;
    if (character === '"') quoted = !quoted;
    else if (character === mark && !quoted) cells.push('');
    else cells[last] += character;
  }
  return cells;
}

const NAME_AND_DECIMAL_COMMA = /^([^,]*[A-Za-z][^,]*),([+-]?\d+,\d+)$/;
const AT_COMMA_OR_BEFORE_NUMBER = /,\s+|\s{2,}|\s+(?=[+\-\u2212]?[\d.,]+(?:\s|$|%|e))/;

/**
 * A line without tabs and semicolons. Where blanks stand between the figures a comma is their decimal mark; where only
 * commas do, they part the cells, but for a name with a single figure behind it.
 */
function loose(line: string): readonly string[] {
  const trimmed = line.trim();
  if (trimmed.includes('"')) return split(trimmed, ',');
  const cells = trimmed.split(AT_COMMA_OR_BEFORE_NUMBER);
  if (cells.length > 1) return cells;
  const named = NAME_AND_DECIMAL_COMMA.exec(trimmed);
  return named === null ? trimmed.split(',') : [named[1] ?? '', named[2] ?? ''];
}
