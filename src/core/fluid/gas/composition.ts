/**
 * The composition of a gas: what was written, name by name, as mole fractions of the components of GERG-2008.
 * Standard: none. Mole fractions that do not add up to 1 are refused beyond 1e-3 and brought to 1 below (practice).
 */
import { type Outcome, ok, type Problem } from '../../quantity/outcome.ts';
import type { Source } from '../../quantity/source.ts';
import type { Working } from '../../quantity/working.ts';
import { componentNames, molarMasses } from '../helmholtz/components.ts';
import type { Fraction } from '../model.ts';
import { spellings } from './composition.table.ts';

/** What the fractions count: molecules or mass. */
export type Basis = 'mole' | 'mass';

/** How far from 1 a sum may be without being brought there on request (practice). */
const SUM_TOLERANCE = 1e-3;

/** A name without case, blanks, hyphens and lowered digits. */
const plain = (name: string): string =>
  name
    .normalize('NFKC')
    .toLowerCase()
    .replaceAll(/[^a-z0-9]/g, '');

const places = new Map(
  componentNames.flatMap((name, place) =>
    [name, ...(spellings[name] ?? [])].map((form) => [plain(form), place] as const),
  ),
);

/** Place of a component in the order of componentNames; undefined for a name that is none. */
export const componentPlace = (name: string): number | undefined => places.get(plain(name));

/** Components of the same first letter, or the commonest. */
function nearest(name: string): string {
  const letter = plain(name).charAt(0);
  const alike = componentNames.filter((candidate) => plain(candidate).startsWith(letter));
  return (letter === '' || alike.length === 0 ? componentNames : alike).slice(0, 4).join(', ');
}

/**
 * Mole fractions in the order of componentNames, sum 1. The order in which they were written does not matter.
 * @param normalise brings any sum to 1, on the user's request
 * @param path path of the composition in the document
 * Problems: component-unknown, component-twice, fraction-negative, composition-sum.
 */
export function compositionOf(
  written: readonly Fraction[],
  basis: Basis,
  normalise: boolean,
  path: string,
): Outcome<readonly number[]> {
  const amounts = componentNames.map(() => 0);
  const problems: Problem[] = [];
  const seen = new Map<number, string>();
  for (const { name, value } of written) {
    const own = name.slice(0, 40);
    const report = (code: string, detail: Problem['detail']) =>
      problems.push({ code, field: `${path}.${own}`, detail });
    const place = componentPlace(name);
    const before = place === undefined ? undefined : seen.get(place);
    if (place === undefined) report('component-unknown', { written: own, nearest: nearest(own) });
    else if (before !== undefined) report('component-twice', { written: own, other: before });
    else if (!(value >= 0)) report('fraction-negative', { written: own, value });
    else amounts[place] = value;
    if (place !== undefined) seen.set(place, own);
  }
  const sum = amounts.reduce((total, value) => total + value, 0);
  const off = normalise ? !(sum > 0) : !(Math.abs(sum - 1) <= SUM_TOLERANCE);
  if (problems.length === 0 && off)
    problems.push({ code: 'composition-sum', field: path, detail: { sum, most: SUM_TOLERANCE } });
  const [first, ...rest] = problems;
  if (first !== undefined) return { ok: false, problems: [first, ...rest] };
  return ok(shares(basis === 'mass' ? amounts.map((value, i) => value / (molarMasses[i] as number)) : amounts));
}

/** Sums that differ from 1 by less are 1: it is the rounding of what was written. */
const ROUNDING = 1e-12;

/** The working of a sum that is not 1, which every share was divided by; none where it is. */
export function sumWorking(written: readonly Fraction[]): readonly Working[] {
  const sum = written.reduce((total, { value }) => total + value, 0);
  if (Math.abs(sum - 1) <= ROUNDING) return [];
  const source: Source = { clause: 'shares divided by their sum', seen: 'practice' };
  return [
    { id: 'composition-sum', symbol: 'S_x', given: [], value: sum, unit: '', source, remark: 'composition-normalised' },
  ];
}

/** Each amount as a share of all. */
function shares(amounts: readonly number[]): readonly number[] {
  const sum = amounts.reduce((total, value) => total + value, 0);
  return amounts.map((value) => value / sum);
}
