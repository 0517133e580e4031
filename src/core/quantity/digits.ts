/** The one rounding rule: how every view spells a number. */
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

/** A number as its shortest decimal: 0.digits times ten to `point`, without sign. */
interface Digits {
  readonly digits: string; // no zero in front or behind; empty for zero
  readonly point: number;
}

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
  const negative = value < 0;
  const shortest = shortestOf(value);
  if (decimals !== undefined) {
    const fixed = plain(rounded(shortest, shortest.point + decimals), decimals);
    return dressed(negative, fixed, 0, spelling);
  }
  const kept = significant === undefined ? shortest : rounded(shortest, significant);
  if (kept.digits === '') return dressed(negative, '0', 0, spelling);
  const size = Number(`0.${kept.digits}e${kept.point}`);
  const power = size >= plainFrom && size <= plainTo ? 0 : kept.point - 1;
  const shown = { digits: kept.digits, point: kept.point - power };
  const behind = (significant ?? kept.digits.length) - shown.point;
  return dressed(negative, plain(shown, Math.max(0, behind)), power, spelling);
}

/** The shortest decimal that reads back as the value. */
function shortestOf(value: number): Digits {
  if (value === 0) return { digits: '', point: 0 };
  const [mantissa = '', exponent = ''] = Math.abs(value).toExponential().split('e');
  return { digits: mantissa.replace('.', ''), point: Number(exponent) + 1 };
}

/** The first `count` digits, half away from zero; a carry moves the point. */
function rounded({ digits, point }: Digits, count: number): Digits {
  if (digits.length <= count) return { digits, point };
  const up = count >= 0 && (digits[count] ?? '') >= '5';
  const kept = [...digits.slice(0, Math.max(0, count))];
  if (!up) return trimmed(kept.join(''), point);
  while (kept.at(-1) === '9') kept.pop();
  const last = kept.pop();
  if (last === undefined) return { digits: '1', point: point + 1 };
  return { digits: kept.join('') + (Number(last) + 1), point };
}

function trimmed(digits: string, point: number): Digits {
  const kept = digits.replace(/0+$/, '');
  return { digits: kept, point: kept === '' ? 0 : point };
}

/** Plain digits with `decimals` places behind the mark. */
function plain({ digits, point }: Digits, decimals: number): string {
  const whole = point > 0 ? digits.slice(0, point).padEnd(point, '0') : '0';
  const fraction = point > 0 ? digits.slice(point) : digits === '' ? '' : '0'.repeat(-point) + digits;
  return decimals === 0 ? whole : `${whole}.${fraction.padEnd(decimals, '0')}`;
}

function dressed(below: boolean, digits: string, power: number, spelling: Spelling): string {
  const { typographic, grouping = true, mark = '.' } = spelling;
  const negative = below && /[1-9]/.test(digits);
  const [whole = '', fraction = ''] = digits.split('.');
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
