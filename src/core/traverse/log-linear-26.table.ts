/**
 * The log-linear pattern of a rectangular section: 26 points, their places along and across as shares of the sides, and
 * weights that sum to 96. ISO 3966 and BS 1042-2.1, from memory: check your copy.
 */
export type Row = readonly [along: number, across: number, weight: number];

export const LOG_LINEAR_26_SUM = 96;

export const LOG_LINEAR_26: readonly Row[] = [
  [0.034, 0.092, 2],
  [0.034, 0.3675, 3],
  [0.034, 0.6325, 3],
  [0.034, 0.908, 2],
  [0.092, 0.092, 2],
  [0.092, 0.908, 2],
  [0.25, 0.092, 5],
  [0.25, 0.3675, 3],
  [0.25, 0.6325, 3],
  [0.25, 0.908, 5],
  [0.3675, 0.3675, 6],
  [0.3675, 0.6325, 6],
  [0.5, 0.092, 6],
  [0.5, 0.908, 6],
  [0.6325, 0.3675, 6],
  [0.6325, 0.6325, 6],
  [0.75, 0.092, 5],
  [0.75, 0.3675, 3],
  [0.75, 0.6325, 3],
  [0.75, 0.908, 5],
  [0.908, 0.092, 2],
  [0.908, 0.908, 2],
  [0.966, 0.092, 2],
  [0.966, 0.3675, 3],
  [0.966, 0.6325, 3],
  [0.966, 0.908, 2],
];
