/** From the spelling of a unit to the unit, or to the reason why not, with the nearest spellings to choose from. */
import type { Measure, Unit } from './measure.ts';
import { fail, type Outcome, ok } from './outcome.ts';
import { measuresOf, plainSpelling, unitOf, unitsFor } from './units.ts';

const LONGEST = 40; // characters of a spelling that are quoted and compared
/** A volume said to be normal or standard: at which state it does not say, so that only `base` can be meant. */
const REFERRED = /^(?:[ns]|std|norm)\s?(?=m3|ft3|l\/|cf)/i;
const LEFT_OUT = 0.3; // cost of a letter left out, see editDistance

/** What a problem quotes of a text: its beginning when it is long. */
export const quoted = (text: string): string => (text.length <= LONGEST ? text : `${text.slice(0, LONGEST)}…`);

/**
 * The unit spelled, among the measures a field asks for.
 * Problems: `pressure-reference-missing` (a bare pressure unit where the reference decides), `pressure-reference-unwanted`
 * (absolute or gauge where a difference is asked), `unit-wrong-measure`, `unit-unknown`.
 */
export function readUnit(spelling: string, measures: readonly Measure[], field: string): Outcome<Unit> {
  const unit = unitOf(spelling, measures);
  if (unit) return ok(unit);
  const written = quoted(spelling);
  const expected = measures.join(', ');
  const references = referencesOf(spelling, measures);
  if (references.length > 0)
    return fail('pressure-reference-missing', field, { unit: written, choices: references.join(', ') });
  const bare = measures.includes('pressure difference') ? withoutReference(spelling) : undefined;
  if (bare) return fail('pressure-reference-unwanted', field, { unit: written, choices: bare.symbol });
  const actual = measuresOf(spelling);
  if (actual.length > 0)
    return fail('unit-wrong-measure', field, { unit: written, actual: actual.join(', '), expected });
  return fail('unit-unknown', field, {
    unit: written,
    expected,
    nearest: nearestSpellings(spelling, measures).join(', '),
  });
}

/** The absolute and gauge units that a bare pressure unit could mean, as far as the field asks for them. */
function referencesOf(spelling: string, measures: readonly Measure[]): readonly string[] {
  const bare = unitOf(spelling, ['pressure difference']);
  if (!bare) return [];
  return measures
    .filter((measure) => measure === 'absolute pressure' || measure === 'gauge pressure')
    .flatMap((measure) => unitsFor(measure).filter((unit) => unit.factor === bare.factor))
    .map((unit) => unit.symbol);
}

/** The pressure difference on the scale of an absolute or gauge unit. */
function withoutReference(spelling: string): Unit | undefined {
  const referenced = unitOf(spelling, ['absolute pressure', 'gauge pressure']);
  return referenced && unitsFor('pressure difference').find((unit) => unit.factor === referenced.factor);
}

/** Up to three symbols of the measures asked for, the most similar spelling first; menu order among equals. */
export function nearestSpellings(spelling: string, measures: readonly Measure[]): readonly string[] {
  const wanted = plainSpelling(spelling).slice(0, LONGEST);
  const meant = [wanted, wanted.replace(REFERRED, 'base ')];
  const distance = (unit: Unit): number =>
    Math.min(
      ...[unit.symbol, unit.print, ...unit.aliases].flatMap((text) =>
        meant.map((one) => editDistance(one, plainSpelling(text))),
      ),
    );
  const ranked = measures.flatMap(unitsFor).map((unit) => ({ symbol: unit.symbol, distance: distance(unit) }));
  ranked.sort((a, b) => a.distance - b.distance);
  return [...new Set(ranked.map((candidate) => candidate.symbol))].slice(0, 3);
}

/**
 * Deletions and replacements from one spelling to another count one, a change of case a quarter; a letter left out
 * counts little, because units are abbreviated: `C` is nearer to `degC` than to `K`.
 */
function editDistance(from: string, to: string): number {
  let row = Array.from({ length: to.length + 1 }, (_, column) => column * LEFT_OUT);
  for (const [line, letter] of [...from].entries()) {
    const next = [line + 1];
    for (const [column, target] of [...to].entries()) {
      const replace = letter === target ? 0 : letter.toLowerCase() === target.toLowerCase() ? 0.25 : 1;
      const [left = 0, above = 0, diagonal = 0] = [next[column], row[column + 1], row[column]];
      next.push(Math.min(left + LEFT_OUT, above + 1, diagonal + replace));
    }
    row = next;
  }
  return row.at(-1) ?? 0;
}
