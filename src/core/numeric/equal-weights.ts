/**
 * Nodes of Chebyshev's quadrature with equal weights on (0, 1): the mean of n values there is the mean of any polynomial
 * of degree n. Knows no physics and no units.
 *
 * The power sums of the nodes are those of the interval; Newton's identities make the polynomial of which they are the
 * roots; it is even or odd about the middle, so that its roots are found in the square of the distance from it.
 */

/** A polynomial by its coefficients, the constant first. */
type Polynomial = readonly number[];

const MOST_HALVINGS = 200; // a double has no more than about 60 to give, unless the root is zero

/** The nodes in rising order; undefined where some of them are not real: n = 8 and every n above 9 (Bernstein, 1937). */
export function equalWeightNodes(n: number): readonly number[] | undefined {
  if (!Number.isInteger(n) || n < 1) throw new Error(`equalWeightNodes: expected a count of 1 or more, got ${n}`);
  if (n === 8 || n > 9) return undefined;
  const squares = rootsBetween(inSquares(elementary(n)), 0, 1);
  const half = squares.map(Math.sqrt);
  const offsets = [...half.map((offset) => -offset).reverse(), ...(n % 2 === 1 ? [0] : []), ...half];
  if (offsets.length !== n) throw new Error(`equalWeightNodes: expected ${n} nodes, got ${offsets.length}`);
  return offsets.map((offset) => (1 + offset) / 2);
}

/** Elementary symmetric sums e_0 to e_n of the nodes on (-1, 1), whose power sums are p_k = n / (k + 1), k even, else 0. */
function elementary(n: number): readonly number[] {
  const power = (k: number): number => (k % 2 === 0 ? n / (k + 1) : 0);
  const sums = [1];
  for (let k = 1; k <= n; k += 1) {
    let sum = 0;
    for (let i = 1; i <= k; i += 1) sum += (i % 2 === 1 ? 1 : -1) * (sums[k - i] ?? 0) * power(i); // Newton's identities
    sums.push(sum / k);
  }
  return sums;
}

/** The polynomial with these elementary sums, a factor x of odd degree left out, as a polynomial in x^2. */
function inSquares(sums: readonly number[]): Polynomial {
  return sums.filter((_, k) => k % 2 === 0).reverse(); // signs (-1)^k are + where k is even
}

const valueAt = (polynomial: Polynomial, x: number): number =>
  polynomial.reduceRight((sum, coefficient) => sum * x + coefficient, 0);

/** All roots inside an interval, each simple: between two turning points there is one or none. */
function rootsBetween(polynomial: Polynomial, from: number, to: number): readonly number[] {
  if (polynomial.length < 2) return [];
  const slope = polynomial.slice(1).map((coefficient, power) => coefficient * (power + 1));
  const ends = [from, ...rootsBetween(slope, from, to), to];
  return ends.slice(1).flatMap((right, at) => {
    const left = ends[at] ?? from;
    return valueAt(polynomial, left) * valueAt(polynomial, right) < 0 ? [halved(polynomial, left, right)] : [];
  });
}

/** The root between two points where the signs differ, by halving to the last bit. */
function halved(polynomial: Polynomial, left: number, right: number): number {
  let [low, high] = [left, right];
  const rising = valueAt(polynomial, high) > 0;
  for (let turn = 0; turn < MOST_HALVINGS; turn += 1) {
    const middle = low + (high - low) / 2;
    if (middle <= low || middle >= high) break;
    if (valueAt(polynomial, middle) > 0 === rising) high = middle;
    else low = middle;
  }
  return low + (high - low) / 2;
}
