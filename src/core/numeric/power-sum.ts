/**
 * A sum of terms n x^I y^J with whole exponents I and J, and its first and second derivatives.
 *
 * Each power is formed once for a point, by multiplication, in a table that all terms read; `Math.pow` for each term
 * would cost more than all the rest.
 */

/** One term: exponent of x, exponent of y, coefficient. */
export type Term = readonly [powerOfX: number, powerOfY: number, coefficient: number];

/** The sum at one point and its derivatives: `x` by x, `xy` by x and y, and so on. */
export interface Expansion {
  readonly value: number;
  readonly x: number;
  readonly xx: number;
  readonly y: number;
  readonly yy: number;
  readonly xy: number;
}

export interface PowerSum {
  /** The sum with all derivatives. x and y are not 0. */
  readonly expand: (x: number, y: number) => Expansion;
  /** The derivative by x alone. x and y are not 0. */
  readonly slope: (x: number, y: number) => number;
}

/**
 * The powers of one variable that a set of exponents asks for, closed under halving: a power is the product of its two
 * halves, so that few are formed and rounding does not pile up. `at[slot]` holds them; slot 0 is 1, slot 1 the base.
 */
interface PowerTable {
  readonly at: Float64Array;
  readonly slotOf: (exponent: number) => number;
  /** For each slot from the fourth: the two slots whose product it is. */
  readonly products: readonly { readonly slot: number; readonly left: number; readonly right: number }[];
}

const ready = [0, 1, -1]; // the exponents of the first three slots

function powerTable(exponents: readonly number[]): PowerTable {
  const slots = new Map(ready.map((k, slot) => [k, slot]));
  const products: { slot: number; left: number; right: number }[] = [];
  const slotOf = (k: number): number => {
    const known = slots.get(k);
    if (known !== undefined) return known;
    const half = Math.trunc(k / 2);
    const [left, right] = [slotOf(half), slotOf(k - half)];
    const slot = slots.size;
    slots.set(k, slot);
    products.push({ slot, left, right });
    return slot;
  };
  exponents.forEach(slotOf);
  return { at: new Float64Array(slots.size), slotOf, products };
}

/** One entry of a table; a slot is an index inside it, never beyond. */
const entry = (table: Float64Array, slot: number): number => table[slot] as number;

/** Fills a table for one base, which is not 0. */
function fill({ at, products }: PowerTable, base: number): void {
  at[0] = 1;
  at[1] = base;
  at[2] = 1 / base;
  for (const { slot, left, right } of products) at[slot] = entry(at, left) * entry(at, right);
}

/** A term with the slots of its powers. */
interface Row {
  readonly i: number;
  readonly j: number;
  readonly n: number;
  readonly slotX: number;
  readonly slotY: number;
}

/** Prepares a sum for repeated evaluation. */
export function powerSum(terms: readonly Term[]): PowerSum {
  const tableX = powerTable(terms.map(([i]) => i));
  const tableY = powerTable(terms.map(([, j]) => j));
  const rows = terms.map(([i, j, n]): Row => ({ i, j, n, slotX: tableX.slotOf(i), slotY: tableY.slotOf(j) }));
  const fillBoth = (x: number, y: number): void => {
    fill(tableX, x);
    fill(tableY, y);
  };
  return {
    expand: (x, y) => {
      fillBoth(x, y);
      return expand(rows, tableX.at, tableY.at);
    },
    slope: (x, y) => {
      fillBoth(x, y);
      return slope(rows, tableX.at, tableY.at);
    },
  };
}

function expand(rows: readonly Row[], X: Float64Array, Y: Float64Array): Expansion {
  let value = 0;
  let sI = 0;
  let sII = 0;
  let sJ = 0;
  let sJJ = 0;
  let sIJ = 0;
  for (const { i, j, n, slotX, slotY } of rows) {
    const term = n * entry(X, slotX) * entry(Y, slotY);
    value += term;
    sI += i * term;
    sII += i * (i - 1) * term;
    sJ += j * term;
    sJJ += j * (j - 1) * term;
    sIJ += i * j * term;
  }
  const perX = entry(X, 2);
  const perY = entry(Y, 2);
  return { value, x: sI * perX, xx: sII * perX * perX, y: sJ * perY, yy: sJJ * perY * perY, xy: sIJ * perX * perY };
}

function slope(rows: readonly Row[], X: Float64Array, Y: Float64Array): number {
  let sI = 0;
  for (const { i, n, slotX, slotY } of rows) sI += i * n * entry(X, slotX) * entry(Y, slotY);
  return sI * entry(X, 2);
}

/**
 * The sum as a polynomial in x once y is settled: its coefficients from the highest power of x down to the power 0, as
 * Horner's rule takes them. No negative powers of x.
 */
export function collapse(terms: readonly Term[]): (y: number) => Float64Array {
  const table = powerTable(terms.map(([, j]) => j));
  const highest = Math.max(...terms.map(([i]) => i));
  const rows = terms.map(([i, j, n]) => ({ place: highest - i, n, slot: table.slotOf(j) }));
  return (y) => {
    const coefficients = new Float64Array(highest + 1);
    fill(table, y);
    for (const { place, n, slot } of rows) coefficients[place] = entry(coefficients, place) + n * entry(table.at, slot);
    return coefficients;
  };
}
