/**
 * Polynomials through the Chebyshev points of an interval, in one variable and in two. No physics and no units.
 *
 * With n points the polynomial of degree n - 1 is near the best one of that degree, and its last coefficients say how
 * near: of a smooth function they fall geometrically.
 */

/** The n points of the first kind, none of them an end, falling from `upper` to `lower`. n = 1 is the middle. */
export function chebyshevPoints(n: number, lower: number, upper: number): readonly number[] {
  const [middle, half] = [(lower + upper) / 2, (upper - lower) / 2];
  return Array.from({ length: n }, (_, at) => middle + half * Math.cos((Math.PI * (at + 0.5)) / n));
}

/** Coefficients of T_0, T_1, ... from the values at `chebyshevPoints`. */
export function chebyshevCoefficients(values: readonly number[]): number[] {
  const n = values.length;
  return values.map((_, k) => {
    let sum = 0;
    for (let at = 0; at < n; at += 1) sum += (values[at] as number) * Math.cos((Math.PI * k * (at + 0.5)) / n);
    return ((k === 0 ? 1 : 2) / n) * sum;
  });
}

/** The sum of c_k T_k(u), for u from -1 to 1, by Clenshaw's rule. */
export function chebyshevSum(coefficients: readonly number[], u: number): number {
  let [b1, b2] = [0, 0];
  for (let k = coefficients.length - 1; k > 0; k -= 1) [b1, b2] = [(coefficients[k] as number) + 2 * u * b1 - b2, b1];
  return (coefficients[0] ?? 0) + u * b1 - b2;
}

/** The same polynomial by the powers of u, the constant first. Loses a digit for every two or three degrees: for few. */
export function powersOf(coefficients: readonly number[]): number[] {
  const powers = coefficients.map(() => 0);
  let [before, now]: [number[], number[]] = [[0], [1]]; // T_-1 does not count, T_0
  coefficients.forEach((c, k) => {
    now.forEach((power, i) => {
      powers[i] = (powers[i] as number) + c * power;
    });
    const next = Array.from({ length: k + 2 }, (_, i) => (k === 0 ? 1 : 2) * (now[i - 1] ?? 0) - (before[i] ?? 0));
    [before, now] = [now, next];
  });
  return powers;
}

/** Rows of a table, one for each point of the first variable. */
export type Table = readonly (readonly number[])[];

/** The table with rows and columns exchanged. */
export const turned = (table: Table): number[][] =>
  (table[0] ?? []).map((_, column) => table.map((row) => row[column] as number));

/** Coefficients of T_j(u) T_k(v), row j, from values with a row for each point of u. */
export const chebyshevTable = (values: Table): number[][] =>
  turned(turned(values.map(chebyshevCoefficients)).map(chebyshevCoefficients));

/** The sum over a table of coefficients at (u, v). */
export const chebyshevTableSum = (coefficients: Table, u: number, v: number): number =>
  chebyshevSum(
    coefficients.map((row) => chebyshevSum(row, v)),
    u,
  );
