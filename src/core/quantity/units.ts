/** The units: looked up by spelling, listed for a menu, and applied in exact decimal arithmetic. */
import { Exact, fractionOf, nearestDouble } from './exact.ts';
import { FACTORS } from './factors.table.ts';
import type { Measure, Unit } from './measure.ts';
import type { Source } from './source.ts';
import { type Row, UNIT_ROWS } from './units.table.ts';

export type { Measure, Unit } from './measure.ts';

const MEASURES = Object.keys(UNIT_ROWS) as Measure[];

/** The sources of the figures in a factor; of several the derivation is ours. */
function sourceOf(factor: string): Pick<Unit, 'source' | 'exact'> {
  const figures = factor.split(' ').flatMap((name) => FACTORS.get(name) ?? []);
  const clauses = [...new Set(figures.map((figure) => figure.source.clause))];
  const first = figures[0]?.source;
  const source: Source =
    first && clauses.length === 1 ? first : { clause: `${factor}; ${clauses.join('; ')}`, seen: 'derived' };
  return { source, exact: figures.every((figure) => figure.exact) };
}

const unitFrom = (row: Row, measure: Measure): Unit => ({
  symbol: row.symbol,
  print: row.print,
  words: row.words,
  measure,
  factor: row.factor,
  ...(row.offset === undefined ? {} : { offset: row.offset }),
  aliases: row.aliases ?? [],
  ...sourceOf(row.factor),
});

/** One form for all spellings of a unit: `m³/h`, `m^3/h` and `m3/h`; `°C` and `degC`; `Pa·s`, `Pa*s` and `Pa.s`. */
export const plainSpelling = (spelling: string): string =>
  spelling
    .normalize('NFKC') // superscripts, subscripts, no-break spaces, the two signs for micro
    .trim()
    .replace(/\s+/g, ' ')
    .replace(/\s(?=\()/g, '')
    .replace(/\s?\/\s?/g, '/')
    .replace(/\s(?=[ag]$)/, '') // 'bar a'
    .replace(/\u03bc/g, 'u')
    .replace(/\s?°/g, 'deg')
    .replace(/[\u00b7\u22c5*]/g, '.')
    .replace(/\^/g, '');

const menus = new Map(MEASURES.map((measure) => [measure, UNIT_ROWS[measure].map((row) => unitFrom(row, measure))]));

const spellings = new Map(
  [...menus].map(([measure, units]) => [
    measure,
    new Map(
      units.flatMap((unit) => [unit.symbol, unit.print, ...unit.aliases].map((text) => [plainSpelling(text), unit])),
    ),
  ]),
);

/** The units of a measure in menu order: SI first, then inch and pound. */
export const unitsFor = (measure: Measure): readonly Unit[] => menus.get(measure) ?? [];

/** The unit that a text spells among the measures asked for; the first measure that knows it. Undefined if none does. */
export function unitOf(spelling: string, measures: readonly Measure[]): Unit | undefined {
  const plain = plainSpelling(spelling);
  for (const measure of measures) {
    const unit = spellings.get(measure)?.get(plain);
    if (unit) return unit;
  }
  return undefined;
}

/** Every measure that knows a spelling: `K` is a temperature and a temperature difference. */
export const measuresOf = (spelling: string): readonly Measure[] =>
  MEASURES.filter((measure) => spellings.get(measure)?.has(plainSpelling(spelling)));

/**
 * SI value of a number in a unit: the double nearest to (number + offset) times factor, taken exactly.
 * @param number decimal text with a point, as checked by text.ts; infinity when beyond the range of a double
 */
export function toSI(number: string, unit: Unit): number {
  const { numerator, denominator } = fractionOf(unit.factor);
  return nearestDouble(
    new Exact(number)
      .plus(unit.offset ?? 0)
      .times(numerator)
      .div(denominator),
  );
}

/** Number in a unit of an SI value, read as its shortest decimal: 0.10226 m gives 102.26 mm and no more digits. */
export function fromSI(si: number, unit: Unit): number {
  const { numerator, denominator } = fractionOf(unit.factor);
  return nearestDouble(
    new Exact(si)
      .times(denominator)
      .div(numerator)
      .minus(unit.offset ?? 0),
  );
}

/**
 * Number in another unit of the same measure as decimal text of at most 12 significant digits; exact where the
 * exact number has no more.
 */
export function convert(number: string, from: Unit, to: Unit): string {
  if (from.measure !== to.measure)
    throw new Error(`expected units of one measure, got ${from.symbol} and ${to.symbol}`);
  if (from.symbol === to.symbol) return number;
  const [a, b] = [fractionOf(from.factor), fractionOf(to.factor)];
  return new Exact(number)
    .plus(from.offset ?? 0)
    .times(a.numerator)
    .times(b.denominator)
    .div(b.numerator.times(a.denominator))
    .minus(to.offset ?? 0)
    .toSignificantDigits(12)
    .toString();
}
