/** Shares of 1 between the file and a text box: '94 %', '120 ppm', or a plain number. */
import { decimalText, TYPED_NUMBER } from '../../../core/quantity/decimal.ts';
import { fromSI, toSI, unitOf } from '../../../core/quantity/units.ts';

export type ShareUnit = '%' | '1' | 'ppm';

/** '1' is a plain fraction. */
export const SHARE_UNITS: readonly { readonly value: ShareUnit; readonly label: string }[] = [
  { value: '%', label: '%' },
  { value: '1', label: 'fraction' },
];

/** What may follow a share: per cent of whatever is counted, parts per million. */
const MARKS = /^(?:(?:mol|mole|vol|mass|wt|w)\.?[\s-]*)?(%|ppm)\.?(?:\s*\(?[a-z./]+\)?)?$/i;

interface Share {
  readonly number: string;
  /** Undefined where the text says none. */
  readonly unit: ShareUnit | undefined;
}

/** A number as typed, in the decimal text of a file, with its unit if it has one. Undefined where it is no share. */
export function readShare(typed: string): Share | undefined {
  const trimmed = typed.trim();
  const run = TYPED_NUMBER.exec(trimmed)?.[0];
  const read = run === undefined ? undefined : decimalText(run);
  if (run === undefined || read === undefined || 'code' in read) return undefined;
  const rest = trimmed.slice(run.length).trim();
  if (rest === '') return { number: read.number, unit: undefined };
  const mark = MARKS.exec(rest)?.[1]?.toLowerCase();
  return mark === undefined ? undefined : { number: read.number, unit: mark as ShareUnit };
}

export const shareText = (number: string, unit: ShareUnit): string => (unit === '1' ? number : `${number} ${unit}`);

/** Text for the file of what was typed into a box of this unit; as typed where it cannot be read. */
export function fileShare(typed: string, unit: ShareUnit): string {
  const read = readShare(typed);
  if (typed.trim() === '') return '';
  return read === undefined ? typed : shareText(read.number, read.unit ?? unit);
}

/** What a box of this unit shows: the number alone where the unit is its own. */
export function shownShare(text: string, unit: ShareUnit): string {
  const read = readShare(text);
  return read !== undefined && (read.unit ?? '1') === unit ? read.number : text;
}

/** The unit a text is written in; undefined where it says nothing. */
export const unitOfShare = (text: string): ShareUnit | undefined => {
  const read = readShare(text);
  return read === undefined ? undefined : (read.unit ?? '1');
};

/** The same share in another unit; a text that cannot be read stays. */
export function convertShare(text: string, to: ShareUnit): string {
  const read = readShare(text);
  const from = read?.unit ?? '1';
  if (read === undefined || from === to) return text;
  return shareText(String(fromFraction(toFraction(read.number, from), to)), to);
}

const unitNamed = (unit: ShareUnit) => (unit === '1' ? undefined : unitOf(unit, ['share']));

function toFraction(number: string, unit: ShareUnit): number {
  const from = unitNamed(unit);
  return from === undefined ? Number(number) : toSI(number, from);
}

function fromFraction(share: number, unit: ShareUnit): number {
  const to = unitNamed(unit);
  return to === undefined ? share : fromSI(share, to);
}
