/**
 * Every term of the residual Helmholtz function of GERG-2008, gathered once: terms that share their powers of density and
 * temperature and their exponential are one slot, so that a mixture is a short list of slots with a factor each.
 * Standard: ISO 20765-2:2015 (GERG-2008). Symbols: δ reduced density, τ inverse reduced temperature.
 */
import { functions, pairs } from './departure.table.ts';
import { pureTerms } from './pure.table.ts';

/** The exponential factor of a term: exp(-δ^order), or exp(-eta (δ-epsilon)^2 - beta (δ-gamma)); 1 where all are 0. */
interface Shape {
  readonly order: number;
  readonly eta: number;
  readonly epsilon: number;
  readonly beta: number;
  readonly gamma: number;
}

/** A term without its factor: δ^d τ^t times the exponential of its shape. */
interface Slot {
  readonly shape: number;
  readonly d: number;
  readonly t: number;
}

/** Factors that a component or a departure function adds to the slots. */
export interface Share {
  readonly slots: Int32Array;
  readonly factors: Float64Array;
}

/** A pair of components, counted from 0, with a departure function: x_i x_j F_ij times the function's share. */
export interface Departure {
  readonly i: number;
  readonly j: number;
  readonly F: number;
  readonly share: Share;
}

/** The highest power of δ. */
export const highestPower = 7;

type Row = readonly [n: number, d: number, t: number, shape: Shape];
const plain: Shape = { order: 0, eta: 0, epsilon: 0, beta: 0, gamma: 0 };

const pureRows = pureTerms.map((rows) => rows.map(([n, d, t, c]): Row => [n, d, t, { ...plain, order: c }]));
const departureRows = Object.entries(functions).map(([name, { powers, bells }]) => ({
  name,
  rows: [
    ...powers.map(([n, d, t]): Row => [n, d, t, plain]),
    ...bells.map(([n, d, t, eta, epsilon, beta, gamma]): Row => [n, d, t, { order: 0, eta, epsilon, beta, gamma }]),
  ],
}));
const allRows = [...pureRows.flat(), ...departureRows.flatMap(({ rows }) => rows)];

const shapeKey = ({ order, eta, epsilon, beta, gamma }: Shape): string => [order, eta, epsilon, beta, gamma].join(' ');
const shapesByKey = new Map(allRows.map(([, , , shape]) => [shapeKey(shape), shape]));

const shapes: readonly Shape[] = [...shapesByKey.values()];
export const shapeCount = shapes.length;
/** The figures of every shape, one row each: order, eta, epsilon, beta, gamma. */
export const shapeFigures = Float64Array.from(
  shapes.flatMap(({ order, eta, epsilon, beta, gamma }) => [order, eta, epsilon, beta, gamma]),
);
export const figuresPerShape = 5;
const shapeNumbers = new Map([...shapesByKey.keys()].map((key, number) => [key, number]));

function slotOf([, d, t, shape]: Row): Slot {
  const number = shapeNumbers.get(shapeKey(shape));
  if (number === undefined) throw new Error(`expected a shape of the list, got ${shapeKey(shape)}`);
  return { shape: number, d, t };
}
const slotKey = ({ shape, d, t }: Slot): string => [shape, d, t].join(' ');
const slotsByKey = new Map(allRows.map((row) => [slotKey(slotOf(row)), slotOf(row)]));
/** All slots, in the order of their power of τ: each power is then formed once. */
const slots: readonly Slot[] = [...slotsByKey.values()].sort((one, other) => one.t - other.t);
const slotNumbers = new Map(slots.map((slot, number) => [slotKey(slot), number]));

function shareOf(rows: readonly Row[]): Share {
  return {
    slots: Int32Array.from(rows, (row) => slotNumbers.get(slotKey(slotOf(row))) ?? -1),
    factors: Float64Array.from(rows, ([n]) => n),
  };
}

/** Highest power of δ that each shape has. */
export const shapeTop = Int32Array.from(shapes, (_, number) =>
  slots.reduce((top, { shape, d }) => (shape === number ? Math.max(top, d) : top), 0),
);

export const slotCount = slots.length;
/** Power of τ of each slot. */
export const slotPower = Float64Array.from(slots, ({ t }) => t);
/** Shape of each slot. */
export const slotShape = Int32Array.from(slots, ({ shape }) => shape);
/** Place of each slot in a table of coefficients with one row per shape and one column per power of δ, from δ^1. */
export const slotPlace = Int32Array.from(slots, ({ shape, d }) => shape * highestPower + d - 1);

/** What one mole of each component adds, in the order of components.table.ts. */
export const pureShares: readonly Share[] = pureRows.map(shareOf);

export const departures: readonly Departure[] = pairs.map(([i, j, F, name]) => {
  const found = departureRows.find((candidate) => candidate.name === name);
  if (found === undefined) throw new Error(`expected a departure function ${name}, got none`);
  return { i: i - 1, j: j - 1, F, share: shareOf(found.rows) };
});
