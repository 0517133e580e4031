/**
 * From what a column of a log shows to a differential: a pressure difference as it is, or the signal of a transmitter,
 * with its limits. Beyond the outer limits the transmitter reports a fault; between the outer and the inner ones the
 * figure is uncertain, and above the upper inner one it is saturated: at least so much flows.
 */

export interface SignalRule {
  /** Signal at the lower and at the upper end of the range, and the differentials there in Pa. */
  readonly from: number;
  readonly to: number;
  readonly lower: number;
  readonly upper: number;
  /** Whether the transmitter takes the root: its signal is then a share of the flow. */
  readonly root: boolean;
  /** Limits in the unit of the signal. */
  readonly faultBelow: number;
  readonly uncertainBelow: number;
  readonly saturatedAbove: number;
  readonly faultAbove: number;
}

/** A pressure difference as it is. */
export const PLAIN_SIGNAL: SignalRule = {
  from: 0,
  to: 1,
  lower: 0,
  upper: 1,
  root: false,
  faultBelow: Number.NEGATIVE_INFINITY,
  uncertainBelow: Number.NEGATIVE_INFINITY,
  saturatedAbove: Number.POSITIVE_INFINITY,
  faultAbove: Number.POSITIVE_INFINITY,
};

/** Differential in Pa of a signal. With a root, sign(s) s2 of the share s of the range: a root of a sign keeps it. */
export function differentialOf({ from, to, lower, upper, root }: SignalRule, signal: number): number {
  const share = (signal - from) / (to - from);
  return lower + (root ? share * Math.abs(share) : share) * (upper - lower);
}
