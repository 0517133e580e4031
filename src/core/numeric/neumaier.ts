/**
 * Compensated sums (Neumaier, 1974): the sum of any number of terms, right to a few bits whatever their order of size.
 * Knows no physics and no units. Several sums stand side by side in one array: the sum of slot k at 2k, what rounding
 * has lost of it at 2k + 1.
 */

/** So many sums, each zero. */
export const sums = (count: number): Float64Array => new Float64Array(2 * count);

/** Adds a finite term to the sum of a slot. */
export function add(all: Float64Array, slot: number, term: number): void {
  const before = all[2 * slot] as number;
  const after = before + term;
  const lost = Math.abs(before) >= Math.abs(term) ? before - after + term : term - after + before;
  all[2 * slot] = after;
  all[2 * slot + 1] = (all[2 * slot + 1] as number) + lost;
}

/** The sum of a slot. */
export const sumOf = (all: Float64Array, slot: number): number =>
  (all[2 * slot] as number) + (all[2 * slot + 1] as number);

/** Adds every sum of `other` to its slot. */
export function addAll(all: Float64Array, other: Float64Array): void {
  for (let slot = 0; slot < all.length / 2; slot += 1) {
    add(all, slot, other[2 * slot] as number);
    add(all, slot, other[2 * slot + 1] as number);
  }
}
