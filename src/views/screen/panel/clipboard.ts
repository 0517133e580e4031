/** A table for the clipboard in two forms, both built from the same cells, with plain digits. */
export interface Cell {
  readonly type: 'number' | 'words';
  readonly text: string;
}

export const number = (text: string): Cell => ({ type: 'number', text });
export const words = (text: string): Cell => ({ type: 'words', text });

type Cells = readonly (readonly Cell[])[];

const escapes: Readonly<Record<string, string>> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;' };
const escaped = (text: string): string => text.replace(/[&<>"]/g, (character) => escapes[character] ?? character);

/** No tab or line end may break a cell, and words must not start a formula in a spreadsheet; numbers are left alone. */
const safe = ({ type, text }: Cell): string => {
  const flat = text.replace(/[\t\r\n]+/g, ' ').replace(/[\u00a0\u202f]/g, ' ');
  return type === 'words' && /^[=+\-@]/.test(flat) ? `'${flat}` : flat;
};

export const asTabs = (cells: Cells): string => cells.map((row) => row.map(safe).join('\t')).join('\r\n');

export const asHtml = (cells: Cells): string => {
  const rows = cells.map((row) => `<tr>${row.map((cell) => `<td>${escaped(safe(cell))}</td>`).join('')}</tr>`);
  return `<table><tbody>${rows.join('')}</tbody></table>`;
};

/** Puts both forms on the clipboard; plain text alone where the browser takes no other. */
export async function copyCells(cells: Cells): Promise<void> {
  const tabs = asTabs(cells);
  if (typeof ClipboardItem === 'undefined') return navigator.clipboard.writeText(tabs);
  const item = new ClipboardItem({
    'text/plain': new Blob([tabs], { type: 'text/plain' }),
    'text/html': new Blob([asHtml(cells)], { type: 'text/html' }),
  });
  return navigator.clipboard.write([item]);
}
