/** Quantity text of a file: a number with a decimal point and its unit, for example `7 bar(g)`. */
import type { Kinds } from './brand.ts';
import type { Measure, Unit } from './measure.ts';
import { fail, type Outcome, ok } from './outcome.ts';
import { quoted, readUnit } from './spelling.ts';
import { measuresOf, toSI } from './units.ts';

interface OfMeasure<Name extends Measure> {
  readonly measure: Name;
  readonly unit: Unit;
  /** The number as written, without its unit. */
  readonly number: string;
  /** SI value; a gauge pressure stays a gauge pressure in Pa, no atmosphere is added here. */
  readonly si: Kinds[Name];
}

/** A quantity of one of the measures asked for; which of them it is `measure` says, and with it the kind of `si`. */
export type Quantity<Name extends Measure = Measure> = { readonly [Each in Name]: OfMeasure<Each> }[Name];

/** Longest text that is read: what is longer is no quantity. Exact arithmetic relies on it, see exact.ts. */
export const LONGEST_TEXT = 100;

const FILE_NUMBER = /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i;
/** A run of characters that stands for a number, right or wrong, up to its last digit or mark; then the rest. */
const NUMBER_THEN_REST = /^([+\-\u2212]?[\d.,](?:[\d.,'’\s]*[\d.,])?(?:e[+-]?\d+)?)(.*)$/is;

/**
 * Reads a quantity as a file writes it: decimal point, no grouping, ASCII digits and signs, white space at will
 * between number and unit.
 * @param measures what the field asks for; the first that knows the unit is taken
 * Problems: `number-empty` (with `unit` when only a unit is written), `number-unreadable`, `number-grouping` (a comma or
 * a space inside the number), `number-too-large`, `number-too-small` (beyond a double), `unit-missing`, and those of
 * readUnit.
 */
export function readQuantity<Name extends Measure>(
  text: string,
  measures: readonly Name[],
  field: string,
): Outcome<Quantity<Name>> {
  const trimmed = text.trim();
  if (trimmed === '') return fail('number-empty', field);
  const [, number, rest = ''] = (trimmed.length <= LONGEST_TEXT && NUMBER_THEN_REST.exec(trimmed)) || [];
  if (number === undefined) return withoutNumber(trimmed, field);
  if (!FILE_NUMBER.test(number)) {
    const code = /[,\s]/.test(number) && /\d/.test(number) ? 'number-grouping' : 'number-unreadable';
    return fail(code, field, { written: quoted(trimmed) });
  }
  const spelling = rest.trim();
  if (spelling === '') return withoutUnit(number, measures, field);
  const unit = readUnit(spelling, measures, field);
  return unit.ok ? quantity<Name>(number, unit.value, field) : unit;
}

/** A number alone: one that nothing can hold says so first, a unit would not mend it. */
function withoutUnit(number: string, measures: readonly Measure[], field: string): Outcome<never> {
  if (!Number.isFinite(Number(number))) return fail('number-too-large', field, { written: quoted(number) });
  return fail('unit-missing', field, { written: number, expected: measures.join(', ') });
}

/** A text that does not begin with a number: a unit alone, or nothing that can be read. */
export function withoutNumber(trimmed: string, field: string): Outcome<never> {
  const unit = trimmed.length <= LONGEST_TEXT && measuresOf(trimmed).length > 0;
  return unit
    ? fail('number-empty', field, { unit: trimmed })
    : fail('number-unreadable', field, { written: quoted(trimmed) });
}

/** A number and a unit of one of the measures asked for. */
function quantity<Name extends Measure>(number: string, unit: Unit, field: string): Outcome<Quantity<Name>> {
  const si = toSI(number, unit);
  const detail = { written: quoted(`${number} ${unit.symbol}`) };
  if (!Number.isFinite(si)) return fail('number-too-large', field, detail);
  const vanished = si === 0 && unit.offset === undefined && /[1-9]/.test(number.replace(/e.*/i, ''));
  if (vanished) return fail('number-too-small', field, detail);
  return ok({ measure: unit.measure, unit, number, si } as Quantity<Name>);
}
