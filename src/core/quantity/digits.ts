/** The one rounding rule: how every view spells a number. */
import type { Decimal } from 'decimal.js';
import { Exact } from './exact.ts';

export interface Spelling {
  /** Significant digits, trailing zeros kept; the notation follows `plainFrom` and `plainTo`. */
  readonly significant?: number;
  /** Digits after the decimal mark, always without a power of ten. Not together with `significant`. */
  readonly decimals?: number;
  /** Groups of three by U+202F on a side of five or more digits; only when typographic, and then unless refused. */
  readonly grouping?: boolean;
  /** U+2212, `× 10ⁿ` and groups for screen and paper; otherwise ASCII that any program reads: `-6.25e5`. */
  readonly typographic: boolean;
  /** Decimal mark of screen and paper; ASCII always has the point. */
  readonly mark?: '.' | ',';
  /** Smallest magnitude, not zero, that is spelled without a power of ten: 0.001 unless given. */
  readonly plainFrom?: number;
  /** Largest magnitude that is spelled without a power of ten: 1e6 unless given. */
  readonly plainTo?: number;
}

const NARROW_SPACE = '\u202f';
const SUPERSCRIPTS: Readonly<Record<string, string>> = Object.fromEntries(
  [...'0123456789-'].map((character, at) => [character, [...'⁰¹²³⁴⁵⁶⁷⁸⁹⁻'][at] ?? '']),
);

/**
 * Spells a number, rounded half away from zero on its shortest decimal: 2.675 to two decimals is 2.68. Neither
 * `significant` nor `decimals` gives every digit of the shortest decimal. Zero has no significant digits and is `0`.
 * @throws defect when the value is not finite: a view must not be given one
 */
export function spell(value: number, spelling: Spelling): string {
  if (!Number.isFinite(value)) throw new Error(`expected a finite number to spell, got ${value}`);
  const { significant, decimals, plainFrom = 1e-3, plainTo = 1e6 } = spelling;
  if (significant !== undefined && decimals !== undefined) {
    throw new Error('expected significant digits or decimals, got both');
  }
  const shortest = new Exact(value);
  if (decimals !== undefined) return dressed(shortest.toFixed(decimals), 0, spelling);
  const rounded = significant === undefined ? shortest : shortest.toSignificantDigits(significant);
  const size = rounded.abs();
  if (size.isZero() || (size.gte(plainFrom) && size.lte(plainTo)))
    return dressed(plain(rounded, significant), 0, spelling);
  const mantissa = rounded.times(new Exact(10).pow(-rounded.e));
  return dressed(plain(mantissa, significant), rounded.e, spelling);
}

/** Plain digits with the zeros that the significant digits ask for; none for zero itself. */
function plain(rounded: Decimal, significant: number | undefined): string {
  if (significant === undefined || rounded.isZero()) return rounded.toFixed();
  return rounded.toFixed(Math.max(0, significant - 1 - rounded.e));
}

function dressed(digits: string, power: number, { typographic, grouping = true, mark = '.' }: Spelling): string {
  const negative = digits.startsWith('-') && /[1-9]/.test(digits);
  const [whole = '', fraction = ''] = digits.replace('-', '').split('.');
  if (!typographic) return (negative ? '-' : '') + joined(whole, fraction, '.') + (power === 0 ? '' : `e${power}`);
  const sign = negative ? '\u2212' : '';
  const body = grouping
    ? joined(grouped(whole, 'right'), grouped(fraction, 'left'), mark)
    : joined(whole, fraction, mark);
  return sign + body + (power === 0 ? '' : `${NARROW_SPACE}×${NARROW_SPACE}10${superscript(power)}`);
}

const joined = (whole: string, fraction: string, mark: string): string =>
  fraction === '' ? whole : whole + mark + fraction;

/** Threes counted from the decimal mark, which stands right of the whole digits and left of the fraction. */
function grouped(digits: string, mark: 'left' | 'right'): string {
  if (digits.length < 5) return digits;
  const boundary = mark === 'right' ? /(?<=\d)(?=(\d{3})+$)/g : /(?<=^(\d{3})+)(?=\d)/g;
  return digits.replace(boundary, NARROW_SPACE);
}

const superscript = (power: number): string =>
  [...String(power)].map((character) => SUPERSCRIPTS[character] ?? '').join('');
