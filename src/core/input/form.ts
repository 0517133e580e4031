/**
 * Reads the texts of one group of the document, field by field, and collects every problem on the way, so that a user
 * sees all of them at once. A field that cannot be read answers undefined; the caller asks `problems` in the end.
 */
import Decimal from 'decimal.js';
import { fail, type Outcome, type Problem } from '../quantity/outcome.ts';
import { quoted } from '../quantity/spelling.ts';
import { type Quantity, readQuantity } from '../quantity/text.ts';
import type { Measure } from '../quantity/units.ts';

/** A quantity of one of the measures asked for, or undefined where none could be read. */
type Read<Name extends Measure> = Quantity<Name> | undefined;

export interface Form {
  /** The group being read. */
  readonly group: object;
  readonly problems: Problem[];
  /** A quantity; undefined when the field is empty or cannot be read. */
  quantity<Name extends Measure>(field: string, measures: readonly Name[], required?: boolean): Read<Name>;
  /** A quantity that must be above zero. */
  positive<Name extends Measure>(field: string, measures: readonly Name[], required?: boolean): Read<Name>;
  /** One of a list of words. */
  choice<Choice extends string>(field: string, choices: readonly Choice[], required?: boolean): Choice | undefined;
  /** A word whose list only its reader knows. */
  word(field: string): string | undefined;
  /** A plain number, as text or as a JSON number. */
  number(field: string, required?: boolean): number | undefined;
  report(code: string, field: string, detail?: Problem['detail']): undefined;
}

/** No figure of a meter, in SI units, is smaller: products of several figures would leave the range of a double. */
export const LEAST_FIGURE = 1e-12;
/** No figure of a meter, in SI units, is larger, for the same reason. */
export const MOST_FIGURE = 1e12;

/** The outcome of a form that cannot be used: all its problems. One without a problem is a defect. */
export function failed({ problems: [first, ...rest] }: Form): Outcome<never> {
  if (first === undefined) throw new Error('input: expected a problem in a form that cannot be used, got none');
  return { ok: false, problems: [first, ...rest] };
}

/** What every reader of a form stands on. */
interface Desk {
  readonly report: Form['report'];
  /** What stands in a field; undefined when it is empty, which is a problem where it is required. */
  written(field: string, required: boolean, detail?: Problem['detail']): unknown;
  /** The value of an outcome; its problems are kept. */
  take<Value>(outcome: Outcome<Value>): Value | undefined;
}

/** Opens a form over a document group; fields are dotted paths below it. */
export function openForm(group: object): Form {
  const problems: Problem[] = [];
  const report: Form['report'] = (code, field, detail = {}) => void problems.push({ code, field, detail });
  const desk: Desk = {
    report,
    written(field, required, detail) {
      const value = at(group, field);
      const empty = value === undefined || (typeof value === 'string' && value.trim() === '');
      if (empty && required) report('field-missing', field, detail);
      return empty ? undefined : value;
    },
    take(outcome) {
      if (outcome.ok) return outcome.value;
      problems.push(...outcome.problems);
      return undefined;
    },
  };
  return { group, problems, report, ...quantityReaders(desk), ...wordReaders(desk) };
}

function quantityReaders({ report, written, take }: Desk): Pick<Form, 'quantity' | 'positive'> {
  const implausible = (field: string, text: string) =>
    report('figure-implausible', field, { written: text, least: LEAST_FIGURE, most: MOST_FIGURE });
  const quantity = <Name extends Measure>(field: string, measures: readonly Name[], required = false): Read<Name> => {
    const text = written(field, required);
    if (text === undefined) return undefined;
    if (typeof text !== 'string') return report('text-expected', field, { written: typeof text });
    const read = take(readQuantity(text, measures, field));
    return read === undefined || Math.abs(read.si) <= MOST_FIGURE ? read : implausible(field, text);
  };
  const positive = <Name extends Measure>(field: string, measures: readonly Name[], required = false): Read<Name> => {
    const read = quantity(field, measures, required);
    if (read === undefined || read.si >= LEAST_FIGURE) return read;
    const text = `${read.number} ${read.unit.symbol}`;
    return read.si <= 0 ? report('not-positive', field, { written: text }) : implausible(field, text);
  };
  return { quantity, positive };
}

function wordReaders({ report, written, take }: Desk): Pick<Form, 'choice' | 'word' | 'number'> {
  const word = (field: string, required = false, detail?: Problem['detail']): string | undefined => {
    const text = written(field, required, detail);
    if (text === undefined || typeof text === 'string') return text;
    return report('text-expected', field, { written: typeof text });
  };
  return {
    word: (field) => word(field),
    choice(field, choices, required = false) {
      const listed = choices.join(', ');
      const text = word(field, required, { choices: listed });
      if (text === undefined) return undefined;
      const choice = choices.find((candidate) => candidate === text);
      return choice ?? report('choice-unknown', field, { written: text, choices: listed });
    },
    number(field, required = false) {
      const value = written(field, required);
      return value === undefined ? undefined : take(readNumber(value, field));
    },
  };
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

/**
 * A plain number written as text with a point, or as a JSON number.
 * Problems: number-expected (neither of the two), number-unreadable, number-too-large.
 */
export function readNumber(value: unknown, field: string): Outcome<number> {
  if (typeof value === 'number' && Number.isFinite(value)) return { ok: true, value };
  if (typeof value !== 'string' && typeof value !== 'number')
    return fail('number-expected', field, { written: Array.isArray(value) ? 'a list' : typeof value });
  if (typeof value === 'number' || !NUMBER.test(value.trim()))
    return fail('number-unreadable', field, { written: quoted(String(value)) });
  const number = new Decimal(value.trim()).toNumber();
  return Number.isFinite(number) ? { ok: true, value: number } : fail('number-too-large', field, { written: value });
}
