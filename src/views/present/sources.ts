/** Sources numbered in the order in which a sheet names them, so that a figure carries a short key. */
import { withMarks } from './cited.ts';
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
  const sources: { readonly clause: string; readonly marks: Set<string> }[] = [];
  const number = (place: number): string => `[${place + 1}]`;
  return {
    keyOf: (cited) => {
      if (cited === undefined) return '';
      const known = sources.findIndex(({ clause }) => clause === cited.clause);
      const place = known < 0 ? sources.push({ clause: cited.clause, marks: new Set() }) - 1 : known;
      sources[place]?.marks.add(cited.mark);
      return `${number(place)}${cited.mark}`;
    },
    list: () =>
      sources.map(({ clause, marks }, place) => ({ key: number(place), clause: withMarks(clause, [...marks]) })),
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
