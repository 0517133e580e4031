/** Reads the fields of a fluid model from the document, and answers with all that is wrong in them at once. */
import { at, type Form, openForm, readNumber } from '../input/form.ts';
import type { AbsolutePressure } from '../quantity/kinds.ts';
import type { Measure } from '../quantity/measure.ts';
import { type Outcome, ok, type Problem } from '../quantity/outcome.ts';
import { readQuantity } from '../quantity/text.ts';
import { type Amount, type FluidField, type Fraction, type Parsed, plainName, type Row } from './model.ts';

/** A list longer than this is no table of a fluid. */
const MOST_ROWS = 500;

type Reader<Type extends FluidField['type'], Value> = (
  form: Form,
  field: Extract<FluidField, { readonly type: Type }>,
  atmosphere: AbsolutePressure,
) => Value | undefined;

const readAmount: Reader<'quantity', Amount> = (form, { name, measures, required }, atmosphere) =>
  amount(form, name, measures, required, atmosphere);

/** '30 %', or 0.3 as a plain number; 0 and 1 are shares. */
const readShare: Reader<'share', number> = (form, { name, required }) => {
  const written = at(form.group, name);
  if (typeof written === 'string' && /%\s*$|ppm\s*$/.test(written)) {
    const share = readQuantity(written, ['share'], name);
    if (!share.ok) form.problems.push(...share.problems);
    return share.ok ? shareOf(form, name, share.value.si, written) : undefined;
  }
  const number = form.number(name, required);
  return number === undefined ? undefined : shareOf(form, name, number, String(written));
};

const shareOf = (form: Form, name: string, share: number, written: string): number | undefined =>
  share >= 0 && share <= 1 ? share : form.report('share-out-of-range', name, { written });

const readName: Reader<'name', string> = (form, { name, names }) => {
  const text = form.word(name);
  if (text === undefined) return undefined;
  const key = names.get(plainName(text));
  if (key !== undefined) return key;
  const start = plainName(text).slice(0, 3);
  const near = [...new Set(names.values())].filter((candidate) => plainName(candidate).startsWith(start));
  const nearest = (near.length > 0 ? near : [...new Set(names.values())]).slice(0, 4).join(', ');
  return form.report('fluid-name-unknown', name, { written: text.slice(0, 40), nearest });
};

const readRows: Reader<'rows', readonly Row[]> = (form, { name, columns, required }, atmosphere) => {
  const written = at(form.group, name);
  if (written === undefined) return required ? form.report('field-missing', name) : undefined;
  if (!Array.isArray(written)) return form.report('list-expected', name, { written: typeof written });
  if (written.length > MOST_ROWS)
    return form.report('table-too-long', name, { count: written.length, most: MOST_ROWS });
  return written.flatMap((row, index) => {
    const place = `${name}.${index}`;
    if (typeof row !== 'object' || row === null || Array.isArray(row)) {
      form.report('group-expected', place, { written: Array.isArray(row) ? 'a list' : typeof row });
      return [];
    }
    const cells = columns.map((column) => {
      const path = `${place}.${column.name}`;
      return [column.name, amount(form, path, column.measures, true, atmosphere)] as const;
    });
    return cells.some(([, cell]) => cell === undefined) ? [] : [Object.fromEntries(cells) as Row];
  });
};

/** A group of names, each with a share; an empty share counts as not written. Any name is taken here. */
const readFractions: Reader<'fractions', readonly Fraction[]> = (form, { name, required }) => {
  const written = at(form.group, name);
  if (written === undefined) return required ? form.report('field-missing', name) : undefined;
  if (typeof written !== 'object' || written === null || Array.isArray(written))
    return form.report('group-expected', name, { written: Array.isArray(written) ? 'a list' : typeof written });
  const entries = Object.entries(written).filter(([, share]) => share !== '' && share !== undefined);
  if (entries.length === 0) return required ? form.report('field-missing', name) : undefined;
  if (entries.length > MOST_ROWS)
    return form.report('table-too-long', name, { count: entries.length, most: MOST_ROWS });
  return entries.flatMap(([own, share]) => {
    const read = fraction(share, `${name}.${own.slice(0, 40)}`);
    if (read.ok) return [{ name: own, value: read.value }];
    form.problems.push(...read.problems);
    return [];
  });
};

/** '94 %' or a plain number, of any size and sign. */
function fraction(written: unknown, path: string): Outcome<number> {
  if (typeof written !== 'string' || !/%\s*$|ppm\s*$/.test(written)) return readNumber(written, path);
  const share = readQuantity(written, ['share'], path);
  return share.ok ? ok(share.value.si) : share;
}

const readFlag: Reader<'flag', boolean> = (form, { name }) => {
  const written = at(form.group, name);
  if (typeof written === 'boolean') return written;
  const word = form.choice(name, ['true', 'false']);
  return word === undefined ? undefined : word === 'true';
};

/** Reads every field of a model. `path` is where the fluid stands in the document. */
export function parseFields(
  fluid: object,
  fields: readonly FluidField[],
  atmosphere: AbsolutePressure,
  path: string,
): Outcome<Parsed> {
  const form = openForm(fluid);
  const quantities: Record<string, Amount> = {};
  const numbers: Record<string, number> = {};
  const choices: Record<string, string> = {};
  const rows: Record<string, readonly Row[]> = {};
  const fractions: Record<string, readonly Fraction[]> = {};
  const flags: Record<string, boolean> = {};
  for (const field of fields) {
    if (field.type === 'quantity') put(quantities, field.name, readAmount(form, field, atmosphere));
    else if (field.type === 'number') put(numbers, field.name, form.number(field.name, field.required));
    else if (field.type === 'share') put(numbers, field.name, readShare(form, field, atmosphere));
    else if (field.type === 'name') put(choices, field.name, readName(form, field, atmosphere));
    else if (field.type === 'rows') put(rows, field.name, readRows(form, field, atmosphere));
    else if (field.type === 'fractions') put(fractions, field.name, readFractions(form, field, atmosphere));
    else if (field.type === 'flag') put(flags, field.name, readFlag(form, field, atmosphere));
    else put(choices, field.name, form.choice(field.name, field.choices, field.required));
  }
  const [first, ...rest] = form.problems.map((problem): Problem => ({ ...problem, field: `${path}.${problem.field}` }));
  const parsed = { quantities, numbers, choices, rows, fractions, flags };
  return first === undefined ? ok(parsed) : { ok: false, problems: [first, ...rest] };
}

function put<Value>(into: Record<string, Value>, name: string, value: Value | undefined): void {
  if (value !== undefined) into[name] = value;
}

/** A quantity above zero; a gauge pressure is read as the absolute pressure it stands for. */
function amount(
  form: Form,
  name: string,
  measures: readonly Measure[],
  required: boolean,
  atmosphere: AbsolutePressure,
): Amount | undefined {
  const absolute = !measures.includes('gauge pressure');
  const quantity = absolute ? form.positive(name, measures, required) : form.quantity(name, measures, required);
  if (quantity === undefined) return undefined;
  const gauge = quantity.measure === 'gauge pressure';
  const { measure, si } = gauge ? { measure: 'absolute pressure' as const, si: quantity.si + atmosphere } : quantity;
  if (si > 0) return { measure, si };
  return form.report('not-positive', name, { written: `${quantity.number} ${quantity.unit.symbol}` });
}
