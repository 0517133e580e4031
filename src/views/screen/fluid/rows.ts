/** Rows of quantities as a table of inputs: the unit of a column, and each cell in it. */
import { readTyped } from '../../../core/quantity/typed.ts';
import { convert, type Unit } from '../../../core/quantity/units.ts';
import type { QuantityKind } from '../field/quantities.ts';
import { split } from '../field/split.ts';
import { textAt } from '../text.ts';

export interface TableColumn {
  readonly name: string;
  readonly label: string;
  readonly kind: QuantityKind;
}

/** The list in the document, as far as it is one. */
export const rowsIn = (value: unknown): readonly unknown[] => (Array.isArray(value) ? value : []);

/** The unit of the first cell of a column that has one. */
export function columnUnit(rows: readonly unknown[], { name, kind }: TableColumn): Unit | undefined {
  for (const row of rows) {
    const { unit } = split(textAt(row, name), kind.measures);
    if (unit !== undefined) return unit;
  }
  return undefined;
}

/** The number alone where it is in the unit of its column, else the whole text. */
export function shownCell(text: string, { kind }: TableColumn, unit: Unit): string {
  const parts = split(text, kind.measures);
  return parts.unit?.symbol === unit.symbol ? parts.number : text;
}

/** Text for the file of what was typed; as typed where it cannot be read. */
export function fileCell(typed: string, { kind }: TableColumn, unit: Unit): string {
  if (typed.trim() === '') return '';
  const read = readTyped(typed, kind.measures, '', { unit });
  return read.ok ? read.value.file : typed;
}

/** A cell in another unit of its column; one that no factor leads to keeps its own. */
export function convertedCell(text: string, { kind }: TableColumn, to: Unit): string {
  const { number, unit } = split(text, kind.measures);
  if (unit === undefined || unit.measure !== to.measure) return text;
  return `${convert(number, unit, to)} ${to.symbol}`;
}
