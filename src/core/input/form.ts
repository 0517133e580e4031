/**
 * Reads the texts of one group of the document, field by field, and collects every problem on the way, so that a user
 * sees all of them at once. A field that cannot be read answers undefined; the caller asks `problems` in the end.
 */
import Decimal from 'decimal.js';
import { fail, type Outcome, type Problem } from '../quantity/outcome.ts';
import { type Quantity, readQuantity } from '../quantity/text.ts';
import type { Measure } from '../quantity/units.ts';

export interface Form {
  /** The group being read. */
  readonly group: object;
  readonly problems: Problem[];
  /** A quantity; undefined when the field is empty or cannot be read. */
  quantity(field: string, measures: readonly Measure[], required?: boolean): Quantity | undefined;
  /** A quantity that must be above zero. */
  positive(field: string, measures: readonly Measure[], required?: boolean): Quantity | undefined;
  /** One of a list of words. */
  choice<Choice extends string>(field: string, choices: readonly Choice[], required?: boolean): Choice | undefined;
  /** A word whose list only its reader knows. */
  word(field: string): string | undefined;
  /** A plain number, as text or as a JSON number. */
  number(field: string, required?: boolean): number | undefined;
  report(code: string, field: string, detail?: Problem['detail']): undefined;
}

/**
 * No figure of a meter, in SI units, is smaller or larger than this. Beyond it products of several figures would leave
 * the range of a double.
 */
export const LEAST_FIGURE = 1e-12;
export const MOST_FIGURE = 1e12;

/** Opens a form over a document group; fields are dotted paths below it. */
export function openForm(group: object): Form {
  const problems: Problem[] = [];
  const report: Form['report'] = (code, field, detail = {}) => void problems.push({ code, field, detail });
  const written = (field: string, required: boolean): unknown => {
    const value = at(group, field);
    const empty = value === undefined || (typeof value === 'string' && value.trim() === '');
    if (empty && required) report('field-missing', field);
    return empty ? undefined : value;
  };
  const take = <Value>(outcome: Outcome<Value>): Value | undefined => {
    if (outcome.ok) return outcome.value;
    problems.push(...outcome.problems);
    return undefined;
  };
  const form: Form = {
    group,
    problems,
    report,
    quantity(field, measures, required = false) {
      const text = written(field, required);
      if (text === undefined) return undefined;
      if (typeof text !== 'string') return report('text-expected', field, { written: typeof text });
      const quantity = take(readQuantity(text, measures, field));
      if (quantity === undefined || Math.abs(quantity.si) <= MOST_FIGURE) return quantity;
      return report('figure-implausible', field, { written: text, least: LEAST_FIGURE, most: MOST_FIGURE });
    },
    positive(field, measures, required = false) {
      const quantity = form.quantity(field, measures, required);
      if (quantity === undefined || quantity.si >= LEAST_FIGURE) return quantity;
      const written = `${quantity.number} ${quantity.unit.symbol}`;
      if (quantity.si <= 0) return report('not-positive', field, { written });
      return report('figure-implausible', field, { written, least: LEAST_FIGURE, most: MOST_FIGURE });
    },
    choice(field, choices, required = false) {
      const word = written(field, required);
      if (word === undefined) return undefined;
      const choice = choices.find((candidate) => candidate === word);
      return choice ?? report('choice-unknown', field, { written: String(word), choices: choices.join(', ') });
    },
    word(field) {
      const word = written(field, false);
      return word === undefined || typeof word === 'string'
        ? word
        : report('text-expected', field, { written: typeof word });
    },
    number(field, required = false) {
      const value = written(field, required);
      return value === undefined ? undefined : take(readNumber(value, field));
    },
  };
  return form;
}

/** The value at a dotted path; only own keys are followed. */
export function at(group: object, path: string): unknown {
  let value: unknown = group;
  for (const key of path.split('.')) {
    if (typeof value !== 'object' || value === null || !Object.hasOwn(value, key)) return undefined;
    value = (value as Record<string, unknown>)[key];
  }
  return value;
}

const NUMBER = /^[+-]?(\d+\.?\d*|\.\d+)([eE][+-]?\d{1,4})?$/;

/** A plain number written as text with a point, or as a JSON number. Problems: number-unreadable, number-too-large. */
export function readNumber(value: unknown, field: string): Outcome<number> {
  if (typeof value === 'number' && Number.isFinite(value)) return { ok: true, value };
  if (typeof value !== 'string' || !NUMBER.test(value.trim()))
    return fail('number-unreadable', field, { written: String(value) });
  const number = new Decimal(value.trim()).toNumber();
  return Number.isFinite(number) ? { ok: true, value: number } : fail('number-too-large', field, { written: value });
}
