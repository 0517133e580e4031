/**
 * A figure of a log as text, of any spelling that the column's format allows, turned into the nearest double. Nothing
 * is guessed in a row: which mark is the decimal one and which may group is settled for the whole column.
 */

export interface FigureFormat {
  readonly decimal: '.' | ',';
  /** The other mark, where it groups digits by three; spaces and apostrophes always may. */
  readonly group: '' | '.' | ',';
}

export type Figure = number | 'absent' | 'unreadable' | 'out-of-range';

/** What loggers write where there is no figure. */
const ABSENT = new Set(['', '-', '--', 'nan', 'null', 'none', 'na', 'n/a', '#n/a']);
/** Spaces of print: no-break, figure, thin, hair, narrow no-break. */
const SPACES = /[\u00a0\u2007\u2009\u200a\u202f]/g;
const MINUS = /^[\u2212\uff0d\u2013]/;
const POINT = /^([+-]?)(\d*)(?:\.(\d*))?(?:e([+-]?\d{1,9}))?$/i;
const COMMA = /^([+-]?)(\d*)(?:,(\d*))?(?:e([+-]?\d{1,9}))?$/i;

/** Reads a figure; the sign of a zero is kept. */
export function readFigure(text: string, { decimal, group }: FigureFormat): Figure {
  const trimmed = text.replace(SPACES, ' ').trim().replace(MINUS, '-');
  if (ABSENT.has(trimmed.toLowerCase())) return 'absent';
  const plain = withoutGroups(trimmed, decimal, group);
  const [, sign, whole = '', fraction = '', exponent = '0'] = (decimal === '.' ? POINT : COMMA).exec(plain) ?? [];
  if (sign === undefined || whole + fraction === '') return 'unreadable';
  const value = Number(`${sign}${whole || '0'}.${fraction || '0'}e${exponent}`);
  const vanished = value === 0 && /[1-9]/.test(whole + fraction);
  return Number.isFinite(value) && !vanished ? value : 'out-of-range';
}

/** The text with the groups of its whole part joined, when all of them are of three digits and of one mark. */
function withoutGroups(text: string, decimal: string, group: string): string {
  const end = text.search(decimal === '.' ? /\.|e/i : /,|e/i);
  const whole = end < 0 ? text : text.slice(0, end);
  const [, sign, digits, mark = ''] = /^([+-]?)([1-9]\d{0,2}(?:([ '’.,])\d{3})(?:\3\d{3})*)$/.exec(whole) ?? [];
  if (digits === undefined || ((mark === '.' || mark === ',') && mark !== group)) return text;
  return sign + digits.replaceAll(mark, '') + text.slice(whole.length);
}
