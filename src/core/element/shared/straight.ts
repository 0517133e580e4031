/**
 * Straight pipe required before and after an element, from the table of its standard.
 * Between the rows of the table the lengths are linear in beta and rounded up to half a pipe bore; outside the rows the
 * nearest row holds. A shorter length (column B) exists only where both neighbouring rows give one.
 */
import type { Source } from '../../quantity/source.ts';
import type { StraightLength } from '../contract.ts';
import { bracket } from './bracket.ts';

/** Columns A and B of one fitting, in pipe bores. B is absent where the table gives none. */
export type Columns = readonly [full: number, reduced?: number];

export interface StraightTable {
  readonly source: Source;
  /** Codes of the fittings, in the order of the columns. */
  readonly fittings: readonly string[];
  readonly rows: readonly { readonly ratio: number; readonly columns: readonly Columns[] }[];
  /** Fittings whose length does not depend on beta. */
  readonly anyRatio: readonly { readonly fitting: string; readonly columns: Columns; readonly source: Source }[];
  /** Notes of the table: a column under a condition, with the code of its sentence. */
  readonly notes: readonly StraightNote[];
}

export interface StraightNote {
  readonly fitting: string;
  readonly code: string;
  readonly source: Source;
  /** The row's full length that the note replaces, and above which Re_D; absent for an advice without figures. */
  readonly replaces?: { readonly ratio: number; readonly full: number; readonly aboveReynolds: number };
}

/** The code of the column that stands for any fitting on the downstream side. */
export const downstreamFitting = 'downstream';

/** Required lengths of every fitting of the table at one diameter ratio and pipe Reynolds number. */
export const straightLengths = (table: StraightTable, ratio: number, reynolds: number): readonly StraightLength[] => {
  const spot = neighbours(table, ratio);
  const ofTable = table.fittings.map((fitting, column) => {
    const note = noteFor(table, fitting, spot, reynolds);
    const ends = [spot.low, spot.high].map((row) => replaced(row, column, note)) as [Columns, Columns];
    return lengthOf(fitting, between(ends, spot.share), note?.source ?? table.source, note?.code);
  });
  return [...ofTable, ...table.anyRatio.map((row) => lengthOf(row.fitting, row.columns, row.source, undefined))];
};

type Row = StraightTable['rows'][number];
type Spot = { readonly low: Row; readonly high: Row; readonly share: number };

const neighbours = ({ rows }: StraightTable, ratio: number): Spot => {
  const { low, high, share } = bracket(
    rows.map((row) => row.ratio),
    ratio,
  );
  return { low: rows[low] as Row, high: rows[high] as Row, share };
};

const noteFor = (table: StraightTable, fitting: string, spot: Spot, reynolds: number): StraightNote | undefined =>
  table.notes.find((note) => {
    if (note.fitting !== fitting) return false;
    if (note.replaces === undefined) return true;
    const { ratio, aboveReynolds } = note.replaces;
    return reynolds > aboveReynolds && (spot.low.ratio === ratio || spot.high.ratio === ratio);
  });

const replaced = (row: Row, column: number, note: StraightNote | undefined): Columns => {
  const columns = row.columns[column] as Columns;
  if (note?.replaces === undefined || note.replaces.ratio !== row.ratio) return columns;
  return columns[1] === undefined ? [note.replaces.full] : [note.replaces.full, columns[1]];
};

const between = ([low, high]: readonly [Columns, Columns], share: number): Columns => {
  const mix = (a: number, b: number) => halfUp(a + share * (b - a));
  const full = mix(low[0], high[0]);
  return low[1] === undefined || high[1] === undefined ? [full] : [full, mix(low[1], high[1])];
};

const lengthOf = (fitting: string, columns: Columns, source: Source, note: string | undefined): StraightLength => ({
  fitting,
  side: fitting === downstreamFitting ? 'downstream' : 'upstream',
  full: columns[0],
  ...(columns[1] === undefined ? {} : { reduced: columns[1] }),
  source,
  ...(note === undefined ? {} : { note }),
});

/** Up to the next half; a rounding error of the interpolation does not add a half. */
const halfUp = (bores: number): number => Math.ceil(bores * 2 - 1e-9) / 2;
