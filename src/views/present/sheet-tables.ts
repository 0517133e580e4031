/** The tables of a sheet: what makes the uncertainty, the checks, dimensions and straight pipe. */
import type { UncertaintyText } from '../../core/document/project.ts';
import * as words from '../words/sheet.ts';
import { standingWords } from '../words/verdicts.ts';
import type { Assumption, DutyRow, PresentedSizing, Verdict } from './model.ts';
import type { KeyOf } from './sources.ts';

export interface TermTable {
  readonly terms: readonly string[];
  readonly rows: readonly { readonly label: string; readonly cells: readonly string[] }[];
}

export interface CheckBlock {
  readonly assumption: Assumption;
  readonly title: string;
  readonly verdict: Verdict | 'unchecked';
  readonly standing: string; // its word
  readonly open: readonly string[];
  readonly rows: readonly {
    readonly key: string;
    readonly text: string;
    readonly limit: string;
    readonly source: string;
    readonly verdict: Verdict;
    readonly verdictWord: string;
  }[];
}

export interface FigureRow {
  readonly id: string;
  readonly label: string;
  readonly symbol?: string;
  readonly cells: readonly string[];
  readonly key: string; // number of the source
  readonly note?: string;
  readonly chosen: boolean;
}

/**
 * What the user stated of each term, then a row a flow: the terms in the order of the first flow, and the whole. What
 * was not stated, and a term that is nothing at a flow, has a dash.
 */
export function termTable({ duty }: PresentedSizing, written: UncertaintyText | undefined): TermTable {
  const terms = new Map(duty.flatMap((row) => row.terms.map(({ id, label }) => [id, label] as const)));
  const cell = (row: DutyRow, id: string): string => row.terms.find((term) => term.id === id)?.value.text ?? words.dash;
  const stated = (id: string): string => {
    const text = written?.[id];
    return typeof text === 'string' && text !== '' ? text.replace(/ (?=%)/, '\u00a0') : words.dash;
  };
  return {
    terms: [...terms.values(), words.whole],
    rows: [
      { label: words.stated, cells: [...[...terms.keys()].map(stated), words.dash] },
      ...duty.map((row) => ({
        label: words.flowAt(row.name),
        cells: [...[...terms.keys()].map((id) => cell(row, id)), row.cells.uncertainty?.text ?? words.dash],
      })),
    ],
  };
}

export const checkBlocks = ({ checks }: Pick<PresentedSizing, 'checks'>, keyOf: KeyOf): readonly CheckBlock[] =>
  checks.map(({ assumption, title, verdict, rows, open }) => ({
    assumption,
    title,
    verdict,
    standing: standingWords[verdict],
    open,
    rows: rows.map(({ key, text, limit, cited, verdict: own, verdictWord }) => ({
      key,
      text,
      limit,
      source: keyOf(cited),
      verdict: own,
      verdictWord,
    })),
  }));

export const dimensionFigures = ({ dimensions }: PresentedSizing, keyOf: KeyOf): readonly FigureRow[] =>
  dimensions.map(({ id, label, symbol, text, cited }) => ({
    id,
    label,
    ...(symbol === undefined ? {} : { symbol }),
    cells: [text],
    key: keyOf(cited),
    chosen: false,
  }));

export const straightFigures = ({ straight }: PresentedSizing, keyOf: KeyOf): readonly FigureRow[] =>
  straight.map(({ fitting, side, label, full, reduced, chosen, cited, note }) => ({
    id: `${side} ${fitting}`,
    label,
    cells: [full, reduced],
    key: keyOf(cited),
    ...(note === undefined ? {} : { note }),
    chosen,
  }));
