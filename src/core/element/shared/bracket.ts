/** Reading a table between its edges: where a value lies among rising edges, held at the ends. */

/** Indices of the edges on both sides and the share of the way between them; one edge twice at an edge or outside. */
export interface Bracket {
  readonly low: number;
  readonly high: number;
  readonly share: number;
}

/** The place of `at` among `edges`, which rise and are at least one. */
export const bracket = (edges: readonly number[], at: number): Bracket => {
  const after = edges.findIndex((edge) => edge > at);
  const before = after < 0 ? edges.length - 1 : Math.max(0, after - 1);
  const from = edges[before] as number;
  if (after <= 0 || at === from) return { low: before, high: before, share: 0 };
  return { low: before, high: after, share: (at - from) / ((edges[after] as number) - from) };
};

/** The figure between two of a column, linear in the share. */
export const between = (column: readonly number[], { low, high, share }: Bracket): number => {
  const [a, b] = [column[low] as number, column[high] as number];
  return a + share * (b - a);
};

/** Linear between the points of a table, held outside. */
export const along = (edges: readonly number[], column: readonly number[], at: number): number =>
  between(column, bracket(edges, at));
