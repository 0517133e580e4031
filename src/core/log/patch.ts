/**
 * One smooth piece of a property surface: a Chebyshev table from true states, cut into cells with a bicubic in each, so
 * that a row costs the same however wide the piece is. Knows no fluid: a sample is a list of figures at p and T.
 */
import { chebyshevPoints, chebyshevSum, chebyshevTable, type Table, turned } from '../numeric/chebyshev.ts';

/** Figures at a pressure, Pa, and a temperature, K; text where there are none, the reason's code. */
export type Sample = (p: number, T: number) => readonly number[] | string;

/** A side of a box; both ends alike where the quantity is constant. */
export type Side = readonly [lower: number, upper: number];

export interface Patch {
  readonly p0: number;
  readonly T0: number;
  readonly perP: number; // cells per Pa
  readonly perT: number; // cells per K
  readonly cellsP: number;
  readonly cellsT: number;
  readonly figures: number; // of a sample
  /** Of each cell, p before T, and of each figure: 16 coefficients by the powers of p in the cell, each by those of T. */
  readonly cells: Float64Array;
  /** What the last coefficients leave out, relative, by figure. */
  readonly tails: readonly number[];
}

/** Chebyshev points of a side, tried in turn. */
const SIZES = [6, 10, 16, 24, 36] as const;
/** The last coefficients, relative to the first, that end the search; and those beyond which a surface is not smooth. */
const SMALL = 1e-9;
const ROUGH = 1e-6;
/** Cells of a side, at most, and how well they follow the table, relative: the first figure, and those that move little. */
const MOST_CELLS = 64;
const CLOSE = [4e-9, 1e-7] as const;
/** Coefficients of a bicubic. */
export const TERMS = 16;

/** A patch over a box, or the code of why there is none: that of a sample, or `not-smooth`. */
export function patchOver(pressures: Side, temperatures: Side, sample: Sample): Patch | string {
  let [p, T] = [0, 0];
  for (;;) {
    const [rows, columns] = [sizeOf(pressures, p), sizeOf(temperatures, T)];
    const tables = tablesOf(chebyshevPoints(rows, ...pressures), chebyshevPoints(columns, ...temperatures), sample);
    if (typeof tables === 'string') return tables;
    const tailsP = tables.map((table) => tailOf(table));
    const tailsT = tables.map((table) => tailOf(turned(table)));
    const [enoughP, enoughT] = [tailsP, tailsT].map((tails) => Math.max(...tails) <= SMALL);
    const last = SIZES.length - 1;
    if ((enoughP || p === last || rows === 1) && (enoughT || T === last || columns === 1)) {
      const tails = tailsP.map((tail, at) => tail + (tailsT[at] as number));
      return Math.max(...tails) > ROUGH ? 'not-smooth' : cut(tables, pressures, temperatures, tails);
    }
    if (!enoughP && p < last) p += 1;
    if (!enoughT && T < last) T += 1;
  }
}

const sizeOf = ([lower, upper]: Side, at: number): number => (lower === upper ? 1 : (SIZES[at] as number));

/** Coefficients of each figure over a grid of true samples. */
function tablesOf(ps: readonly number[], Ts: readonly number[], sample: Sample): Table[] | string {
  const grid: (readonly number[])[][] = [];
  for (const p of ps) {
    const row: (readonly number[])[] = [];
    for (const T of Ts) {
      const figures = sample(p, T);
      if (typeof figures === 'string') return figures;
      row.push(figures);
    }
    grid.push(row);
  }
  const count = grid[0]?.[0]?.length ?? 0;
  return Array.from({ length: count }, (_, figure) =>
    chebyshevTable(grid.map((row) => row.map((figures) => figures[figure] as number))),
  );
}

/** The larger of the last two rows against the constant; nothing is left out where there is one row. */
function tailOf(table: Table): number {
  if (table.length < 2) return 0;
  const largest = (row: readonly number[] = []): number => Math.max(...row.map(Math.abs));
  return Math.max(largest(table.at(-1)), largest(table.at(-2))) / Math.abs(table[0]?.[0] as number);
}

/** Cuts into more and more cells, along the side that gains by it, until they follow the tables. */
function cut(tables: readonly Table[], pressures: Side, temperatures: Side, tails: readonly number[]): Patch {
  const made = (cellsP: number, cellsT: number): { patch: Patch; off: number } => {
    const patch = { ...placed(pressures, cellsP, temperatures, cellsT), ...cellsOf(tables, cellsP, cellsT), tails };
    return { patch, off: offOf(patch, tables) };
  };
  let best = made(1, 1);
  while (best.off > 1) {
    const { cellsP, cellsT } = best.patch;
    const finer = [
      ...(2 * cellsP <= MOST_CELLS && pressures[0] < pressures[1] ? [made(2 * cellsP, cellsT)] : []),
      ...(2 * cellsT <= MOST_CELLS && temperatures[0] < temperatures[1] ? [made(cellsP, 2 * cellsT)] : []),
    ].sort((one, other) => one.off - other.off);
    if (finer[0] === undefined) break;
    best = finer[0];
  }
  return best.patch;
}

const placed = ([p0, p1]: Side, cellsP: number, [T0, T1]: Side, cellsT: number) => ({
  ...{ p0, T0, cellsP, cellsT },
  perP: p1 > p0 ? cellsP / (p1 - p0) : 0,
  perT: T1 > T0 ? cellsT / (T1 - T0) : 0,
});

/** Places in a cell that its cubic runs through: both ends, so that neighbours meet. */
const NODES = [0, 0.25, 0.75, 1] as const;
/** Row i: the cubic, by powers, that is 1 at node i and 0 at the others (Lagrange). */
const BASIS = NODES.map((node, i) => {
  const others = NODES.filter((_, j) => j !== i);
  const [a, b, c] = others as [number, number, number];
  const scale = (node - a) * (node - b) * (node - c);
  return [-a * b * c, a * b + a * c + b * c, -(a + b + c), 1].map((power) => power / scale);
});

/** Powers of the cubic through four values. */
const cubic = (values: readonly number[]): number[] =>
  [0, 1, 2, 3].map((power) => values.reduce((sum, value, i) => sum + value * (BASIS[i]?.[power] as number), 0));

function cellsOf(tables: readonly Table[], cellsP: number, cellsT: number): Pick<Patch, 'cells' | 'figures'> {
  const figures = tables.length;
  const cells = new Float64Array(cellsP * cellsT * figures * TERMS);
  const places = (count: number) =>
    Array.from({ length: count }, (_, cell) => NODES.map((node) => (2 * (cell + node)) / count - 1));
  const [us, vs] = [places(cellsP), places(cellsT)];
  tables.forEach((table, figure) => {
    const columns = turned(table);
    us.forEach((nodes, atP) => {
      const lines = nodes.map((u) => columns.map((column) => chebyshevSum(column, u))); // by T_k(v)
      vs.forEach((along, atT) => {
        const byT = lines.map((line) => cubic(along.map((v) => chebyshevSum(line, v))));
        const terms = turned(turned(byT).map(cubic)); // power of p, then of T
        cells.set(terms.flat(), ((atP * cellsT + atT) * figures + figure) * TERMS);
      });
    });
  });
  return { cells, figures };
}

/** Places between the nodes of a cell at which cells and tables are compared. */
const BETWEEN = [0.11, 0.5, 0.89] as const;
/** Cells looked at along each side: the first, the last and some between. */
const LOOKED_AT = 6;

/** Largest distance of the cells from the tables, as a share of what is close, at places between the nodes. */
function offOf(patch: Patch, tables: readonly Table[]): number {
  const into = new Float64Array(patch.figures);
  const cellsAlong = (count: number) =>
    count <= LOOKED_AT
      ? Array.from({ length: count }, (_, at) => at)
      : Array.from({ length: LOOKED_AT }, (_, at) => Math.round((at * (count - 1)) / (LOOKED_AT - 1)));
  const places = (count: number) => cellsAlong(count).flatMap((cell) => BETWEEN.map((share) => cell + share));
  const columns = tables.map(turned);
  let most = 0;
  for (const x of places(patch.cellsP)) {
    const u = (2 * x) / patch.cellsP - 1;
    const lines = columns.map((table) => table.map((column) => chebyshevSum(column, u)));
    for (const y of places(patch.cellsT)) {
      inCell(patch, x, y, into);
      lines.forEach((line, figure) => {
        const known = chebyshevSum(line, (2 * y) / patch.cellsT - 1);
        most = Math.max(most, Math.abs((into[figure] as number) / known - 1) / CLOSE[figure === 0 ? 0 : 1]);
      });
    }
  }
  return most;
}

/** The figures at p, Pa, and T, K, inside the patch, into `into`. */
export const lookUp = (patch: Patch, p: number, T: number, into: Float64Array): void =>
  inCell(patch, (p - patch.p0) * patch.perP, (T - patch.T0) * patch.perT, into);

/** The figures at a place counted in cells; a hair beyond the last cell still belongs to it. */
function inCell({ cellsP, cellsT, cells, figures }: Patch, x: number, y: number, into: Float64Array): void {
  const atP = Math.max(0, Math.min(x | 0, cellsP - 1));
  const atT = Math.max(0, Math.min(y | 0, cellsT - 1));
  const u = x - atP;
  const v = y - atT;
  const at = (atP * cellsT + atT) * figures * TERMS;
  for (let figure = 0; figure < figures; figure += 1) into[figure] = bicubic(cells, at + figure * TERMS, u, v);
}

/** The bicubic whose coefficients start at `at`: powers of u from the constant up, each by those of v. */
export const bicubic = (c: Float64Array, at: number, u: number, v: number): number =>
  ((line(c, at + 12, v) * u + line(c, at + 8, v)) * u + line(c, at + 4, v)) * u + line(c, at, v);

const line = (c: Float64Array, at: number, v: number): number =>
  (((c[at + 3] as number) * v + (c[at + 2] as number)) * v + (c[at + 1] as number)) * v + (c[at] as number);
