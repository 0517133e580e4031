/** Sources numbered in the order in which a sheet names them, so that a figure carries a short key. */
import type { Cited, Row } from './model.ts';

/** A row of a sheet; `key` is '[3]°' or ''. */
export interface SheetRow {
  readonly id: string;
  readonly label: string;
  readonly symbol?: string;
  readonly text: string;
  readonly key: string;
  readonly note?: string;
}

export interface SourceLine {
  readonly key: string;
  readonly clause: string;
}

export type KeyOf = (cited: Cited | undefined) => string;

export interface Numbering {
  readonly keyOf: KeyOf;
  /** Every source asked for so far. */
  readonly list: () => readonly SourceLine[];
}

export function numbering(): Numbering {
  const clauses: string[] = [];
  const marks: string[] = [];
  const keyAt = (place: number): string => `[${place + 1}]${marks[place] ?? ''}`;
  return {
    keyOf: (cited) => {
      if (cited === undefined) return '';
      const known = clauses.indexOf(cited.clause);
      if (known >= 0) return keyAt(known);
      marks.push(cited.mark);
      return keyAt(clauses.push(cited.clause) - 1);
    },
    list: () => clauses.map((clause, place) => ({ key: keyAt(place), clause })),
  };
}

export const sheetRow = ({ id, label, symbol, value, cited, note }: Row, keyOf: KeyOf): SheetRow => ({
  id,
  label,
  ...(symbol === undefined ? {} : { symbol }),
  text: value.text,
  key: keyOf(cited),
  ...(note === undefined ? {} : { note }),
});
