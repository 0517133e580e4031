/** A composition from a spreadsheet: names or formulae beside their shares, whatever stands around them. */
import { type Component, componentOf } from '../../words/components.ts';
import { type Rows, rowsOf } from './paste.ts';
import { readShare, type ShareUnit, shareText } from './share.ts';

export interface PastedShare {
  /** The name as it was written. */
  readonly written: string;
  /** Undefined where it is not known: the user says which it is, or leaves the line out. */
  readonly component: Component | undefined;
  readonly number: string;
  readonly unit: ShareUnit | undefined;
}

export interface PastedComposition {
  readonly shares: readonly PastedShare[];
  /** The unit of shares without one: what the header says, else per cent when they add up to more than a whole. */
  readonly unit: ShareUnit;
  readonly basis: 'mole' | 'mass' | undefined;
  /** Lines below the header that hold no share, as they were written. */
  readonly unread: readonly string[];
}

const TOTAL = /^(total|sum|summe|somme|suma|totaal|σ|∑)\b/i;
const MASS = /\b(mass|weight|wt|w\/w|kg\/kg)\b/i;
const MOLE = /\b(mole?|molar|vol|volume|v\/v)\b/i;

export function pastedComposition(text: string): PastedComposition {
  const rows = rowsOf(text);
  const read = rows.map(shareIn);
  const first = read.findIndex((share) => share !== undefined);
  const header = rows.slice(0, Math.max(0, first)).flat().join(' ');
  const shares = read.flatMap((share) => (share === undefined || TOTAL.test(share.written) ? [] : [share]));
  return {
    shares,
    unit: headUnit(header) ?? guessedUnit(shares),
    basis: MASS.test(header) ? 'mass' : MOLE.test(header) ? 'mole' : undefined,
    unread: rows.flatMap((row, at) => (at < first || read[at] !== undefined ? [] : [row.join(' ')])),
  };
}

/** The known name or else the first words; the share is the first figure behind them, or before where none is. */
function shareIn(row: Rows[number]): PastedShare | undefined {
  const isName = (cell: string): boolean => cell !== '' && cell !== '%' && readShare(cell) === undefined;
  const known = row.findIndex((cell) => isName(cell) && componentOf(cell) !== undefined);
  const at = known < 0 ? row.findIndex(isName) : known;
  const written = row[at];
  const figures = [...row.slice(at + 1), ...row.slice(0, Math.max(0, at))];
  const share = figures.map(readShare).find((read) => read !== undefined);
  if (written === undefined || share === undefined) return undefined;
  const besides = row.includes('%') ? '%' : undefined;
  return { written, component: componentOf(written), number: share.number, unit: share.unit ?? besides };
}

function headUnit(header: string): ShareUnit | undefined {
  if (header.includes('%') || /per ?cent/i.test(header)) return '%';
  if (/\bppm/i.test(header)) return 'ppm';
  return /fraction|mol\/mol|kg\/kg/i.test(header) ? '1' : undefined;
}

function guessedUnit(shares: readonly PastedShare[]): ShareUnit {
  const plain = shares.filter(({ unit }) => unit === undefined);
  return plain.reduce((sum, { number }) => sum + Number(number), 0) > 1.5 ? '%' : '1';
}

/** Which component each pasted line stands for, by its place: as recognised, or as the user says; '' leaves it out. */
export type Choices = Readonly<Record<number, string>>;

export const chosenName = ({ component }: PastedShare, at: number, choices: Choices): string =>
  choices[at] ?? component?.value ?? '';

/** Places of lines whose component stands in a line before. */
export function repeated(shares: readonly PastedShare[], choices: Choices): ReadonlySet<number> {
  const names = shares.map((share, at) => chosenName(share, at, choices));
  return new Set(names.flatMap((name, at) => (name !== '' && names.indexOf(name) < at ? [at] : [])));
}

/** The composition to be written; of a component that stands twice nothing is taken silently, see `repeated`. */
export function compositionFrom(
  { shares }: PastedComposition,
  unit: ShareUnit,
  choices: Choices,
): Readonly<Record<string, string>> {
  const twice = repeated(shares, choices);
  return Object.fromEntries(
    shares.flatMap((share, at) => {
      const name = chosenName(share, at, choices);
      return name === '' || twice.has(at) ? [] : [[name, shareText(share.number, share.unit ?? unit)]];
    }),
  );
}
