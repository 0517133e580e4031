/**
 * Quantity text as a person types or pastes it on the screen, turned into the text of the file. What was read is
 * echoed at once; reading the file text again gives the same file text.
 */
import { decimalText, TYPED_NUMBER } from './decimal.ts';
import type { Measure, Unit } from './measure.ts';
import { fail, type Outcome, ok } from './outcome.ts';
import { quoted, readUnit } from './spelling.ts';
import { LONGEST_TEXT, type Quantity, readQuantity, withoutNumber } from './text.ts';
import { convert } from './units.ts';

/** What stood in the field before: its unit, or the unit that a number alone shall have; its number if it had one. */
export interface Previous {
  readonly number?: string;
  readonly unit: Unit;
}

export interface Typed {
  /** Text for the file: `number unit`, decimal point, no grouping, the symbol of the unit. */
  readonly file: string;
  /** How the file text is read: shown beside the field. */
  readonly echo: Quantity;
}

/**
 * Reads a typed quantity: decimal comma or point, groups of three, U+2212 as minus, powers as `e5` or `× 10⁵`. A number
 * alone takes the previous unit; a unit alone converts the previous number into it.
 * Problems: those of readQuantity, and `unit-not-convertible` when a unit alone needs more than a factor (gauge to
 * absolute, mass to volume).
 */
export function readTyped(
  text: string,
  measures: readonly Measure[],
  field: string,
  previous?: Previous,
): Outcome<Typed> {
  const trimmed = text.trim();
  if (trimmed === '') return fail('number-empty', field);
  if (trimmed.length > LONGEST_TEXT) return fail('number-unreadable', field, { written: quoted(trimmed) });
  const run = TYPED_NUMBER.exec(trimmed)?.[0];
  if (run === undefined) return unitAlone(trimmed, measures, field, previous);
  const read = decimalText(run);
  if ('code' in read) return fail(read.code, field, { written: quoted(trimmed) });
  const spelling = trimmed.slice(run.length).trim();
  const inherited = previous && measures.includes(previous.unit.measure) ? previous.unit.symbol : '';
  if (spelling !== '') {
    const unit = readUnit(spelling, measures, field);
    return unit.ok ? typed(read.number, unit.value.symbol, measures, field) : unit;
  }
  return typed(read.number, inherited, measures, field);
}

function unitAlone(
  trimmed: string,
  measures: readonly Measure[],
  field: string,
  previous: Previous | undefined,
): Outcome<Typed> {
  if (previous?.number === undefined) return withoutNumber(trimmed, field);
  const unit = readUnit(trimmed, measures, field);
  if (!unit.ok) return unit;
  const [from, to] = [previous.unit, unit.value];
  if (from.measure !== to.measure) return fail('unit-not-convertible', field, { from: from.symbol, to: to.symbol });
  return typed(convert(previous.number, from, to), to.symbol, measures, field);
}

function typed(number: string, symbol: string, measures: readonly Measure[], field: string): Outcome<Typed> {
  const file = `${number} ${symbol}`;
  const echo = readQuantity(file, measures, field);
  return echo.ok ? ok({ file, echo: echo.value }) : echo;
}
