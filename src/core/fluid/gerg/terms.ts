/**
 * Every term of the residual Helmholtz function of GERG-2008: what a component and what a departure function adds.
 * Standard: ISO 20765-2:2015 (GERG-2008). Symbols: δ reduced density, τ inverse reduced temperature.
 */

import { plain, slotSet, type Term } from '../helmholtz/slots.ts';
import { functions, pairs } from './departure.table.ts';
import { pureTerms } from './pure.table.ts';

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

interface Row extends Term {
  readonly n: number;
}

const pureRows = pureTerms.map((rows) =>
  rows.map(([n, d, t, c]): Row => ({ n, d, t, shape: c === 0 ? plain : { ...plain, order: c } })),
);
const departureRows = Object.entries(functions).map(([name, { powers, bells }]) => ({
  name,
  rows: [
    ...powers.map(([n, d, t]): Row => ({ n, d, t, shape: plain })),
    ...bells.map(([n, d, t, eta, epsilon, beta, gamma]): Row => {
      return { n, d, t, shape: { order: 0, eta, epsilon, beta, gamma } };
    }),
  ],
}));

/** Every term of the equation, each slot once. */
export const gergSlots = slotSet([...pureRows.flat(), ...departureRows.flatMap(({ rows }) => rows)]);

const shareOf = (rows: readonly Row[]): Share => ({
  slots: Int32Array.from(rows, (row) => gergSlots.numberOf(row)),
  factors: Float64Array.from(rows, ({ n }) => n),
});

/** What one mole of each component adds, in the order of components.table.ts. */
export const pureShares: readonly Share[] = pureRows.map(shareOf);

/** The pairs that have a departure function, in the order of departure.table.ts. */
export const departures: readonly Departure[] = pairs.map(([i, j, F, name]) => {
  const found = departureRows.find((candidate) => candidate.name === name);
  if (found === undefined) throw new Error(`expected a departure function ${name}, got none`);
  return { i: i - 1, j: j - 1, F, share: shareOf(found.rows) };
});
