/** Numbers as people type and paste them, turned into the decimal text of a file. Digits are moved, never rounded. */

/** A number at the beginning of a text, right or wrong, up to its last digit or mark, with its power of ten. */
export const TYPED_NUMBER = /^[+\-\u2212]?[\d.,](?:[\d.,'’\s]*[\d.,])?(?:e[+\-\u2212]?\d+|\s?×\s?10[⁻⁺]?[⁰¹²³⁴-⁹]+)?/i;

const PARTS = /^([+\-\u2212]?)([\d.,](?:[\d., \u00a0\u2009\u202f]*[\d.,])?)(?:e(.+)|\s?×\s?10(.+))?$/i;
const SPACES = /[ \u00a0\u2009\u202f]/g;
const SUPERSCRIPTS = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/**
 * File text of a typed number, or the code of the problem: `number-grouping`, `number-unreadable`.
 * A single `.` or `,` is the decimal mark. Of two different marks the last is the decimal mark and the other groups; a
 * mark that repeats alone groups. Spaces group on both sides. A group is of exactly three digits from the mark.
 */
export function decimalText(typed: string): { readonly number: string } | { readonly code: string } {
  const [, sign = '', body, exponent, power] = PARTS.exec(typed) ?? [];
  if (body === undefined || !/\d/.test(body)) return { code: 'number-unreadable' };
  const [whole, fraction] = splitAtMark(body.replace(SPACES, ' '));
  const integer = withoutGroups(whole);
  if (integer === undefined || !/^(\d*|\d{3}( \d{3})* \d{1,3})$/.test(fraction)) return { code: 'number-grouping' };
  const digits = fraction.replaceAll(' ', '');
  const mantissa = integer.replace(/^0+(?=\d)/, '') + (digits === '' ? '' : `.${digits}`);
  const minus = sign === '' || sign === '+' || !/[1-9]/.test(mantissa) ? '' : '-';
  return { number: minus + mantissa + tenPower(exponent ?? power) };
}

/** The digits before and after the decimal mark: the last mark, unless it is one of several and the only sort. */
function splitAtMark(body: string): readonly [whole: string, fraction: string] {
  const marks = body.match(/[.,]/g) ?? [];
  const grouping = marks.length > 1 && new Set(marks).size === 1;
  const at = grouping ? -1 : Math.max(body.lastIndexOf('.'), body.lastIndexOf(','));
  return at < 0 ? [body, ''] : [body.slice(0, at), body.slice(at + 1)];
}

/** The whole digits without their group marks, all of one sort; undefined when a group is not of three. */
function withoutGroups(whole: string): string | undefined {
  if (/^\d*$/.test(whole)) return whole === '' ? '0' : whole;
  return /^[1-9]\d{0,2}([., ])\d{3}(\1\d{3})*$/.test(whole) ? whole.replace(/[., ]/g, '') : undefined;
}

function tenPower(exponent: string | undefined): string {
  if (exponent === undefined) return '';
  const plain = exponent
    .replace(/[⁰¹²³⁴-⁹]/g, (digit) => String(SUPERSCRIPTS.indexOf(digit)))
    .replace(/[\u2212⁻]/, '-')
    .replace(/[+⁺]/, '');
  return `e${plain}`;
}
