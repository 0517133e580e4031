/**
 * Terms of a residual Helmholtz function, gathered: terms that share their powers of density and temperature and their
 * exponential are one slot, so that a mixture is a short list of slots with a factor each. Knows no equation.
 * Symbols: δ reduced density, τ inverse reduced temperature.
 */

/** The exponential factor of a term: exp(-δ^order), or exp(-eta (δ-epsilon)^2 - beta (δ-gamma)); 1 where all are 0. */
export interface Shape {
  readonly order: number;
  readonly eta: number;
  readonly epsilon: number;
  readonly beta: number;
  readonly gamma: number;
}

/** A term without its factor: δ^d τ^t times the exponential of its shape; d is at least 1. */
export interface Term {
  readonly d: number;
  readonly t: number;
  readonly shape: Shape;
}

/** All the slots of an equation, in the order of their power of τ, and their shapes. */
export interface SlotSet {
  readonly count: number;
  /** Power of τ of each slot. */
  readonly power: Float64Array;
  /** Shape of each slot. */
  readonly shape: Int32Array;
  /** Place of each slot in a table of coefficients: one row per shape, one column per power of δ, from δ^1. */
  readonly place: Int32Array;
  readonly columns: number;
  /** The figures of every shape: order, eta, epsilon, beta, gamma. */
  readonly figures: Float64Array;
  /** Highest power of δ of every shape. */
  readonly top: Int32Array;
  /** The slot of a term of the set. */
  readonly numberOf: (term: Term) => number;
}

/** Figures of one shape in SlotSet.figures. */
export const figuresPerShape = 5;

/** The shape without an exponential. */
export const plain: Shape = { order: 0, eta: 0, epsilon: 0, beta: 0, gamma: 0 };

const shapeKey = ({ order, eta, epsilon, beta, gamma }: Shape): string => [order, eta, epsilon, beta, gamma].join(' ');
const termKey = ({ d, t, shape }: Term): string => [d, t, shapeKey(shape)].join(' ');

/** Gathers the terms of an equation. */
export function slotSet(terms: readonly Term[]): SlotSet {
  const shapes = [...new Map(terms.map(({ shape }) => [shapeKey(shape), shape])).values()];
  const shapeKeys = shapes.map(shapeKey);
  const slots = [...new Map(terms.map((term) => [termKey(term), term])).values()].sort((one, other) => one.t - other.t);
  const numbers = new Map(slots.map((slot, number) => [termKey(slot), number]));
  const columns = Math.max(...slots.map(({ d }) => d));
  const shape = Int32Array.from(slots, (slot) => shapeKeys.indexOf(shapeKey(slot.shape)));
  return {
    count: slots.length,
    power: Float64Array.from(slots, ({ t }) => t),
    shape,
    place: Int32Array.from(slots, ({ d }, number) => (shape[number] ?? 0) * columns + d - 1),
    columns,
    figures: Float64Array.from(
      shapes.flatMap(({ order, eta, epsilon, beta, gamma }) => [order, eta, epsilon, beta, gamma]),
    ),
    top: Int32Array.from(shapes, (_, own) =>
      Math.max(...slots.map(({ d }, number) => (shape[number] === own ? d : 0))),
    ),
    numberOf(term) {
      const number = numbers.get(termKey(term));
      if (number === undefined) throw new Error(`expected a term of the set, got ${termKey(term)}`);
      return number;
    },
  };
}

/** What a mixture uses of a set: its slots in rising order, the factor of each, and the shapes among them. */
export interface Gathered {
  readonly set: SlotSet;
  readonly slots: Int32Array;
  readonly factors: Float64Array;
  readonly shapes: Int32Array;
}

/** The slots that are in use, from one factor for each slot of the set. */
export function gathered(set: SlotSet, sums: Float64Array): Gathered {
  const slots = new Int32Array(set.count);
  const factors = new Float64Array(set.count);
  const shapes = new Int32Array(set.top.length);
  let used = 0;
  let present = 0; // a bit for each shape
  for (let slot = 0; slot < set.count; slot++) {
    const factor = sums[slot] as number;
    if (factor === 0) continue;
    slots[used] = slot;
    factors[used++] = factor;
    present |= 1 << (set.shape[slot] as number);
  }
  let usedShapes = 0;
  for (let shape = 0; shape < shapes.length; shape++) if (present & (1 << shape)) shapes[usedShapes++] = shape;
  return {
    set,
    slots: slots.subarray(0, used),
    factors: factors.subarray(0, used),
    shapes: shapes.subarray(0, usedShapes),
  };
}
