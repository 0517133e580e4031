/** What every rule answers with: where the points of a traverse lie in the section and how much each counts. */
import type { Source } from '../quantity/source.ts';

/** A point on its line. */
export interface Position {
  /** Distance from the wall at which the probe enters, as a share of the length of the line inside the duct. */
  readonly at: number;
  /** Share of the mean velocity that this point stands for; the shares of a traverse sum to 1. */
  readonly weight: number;
}

export interface Line {
  /** Angle of a diameter from that of the first line, rad; absent in a rectangular section. */
  readonly angle?: number;
  /** Place of the line across a rectangular section, as a share of the side that holds the ports. */
  readonly across?: number;
  readonly points: readonly Position[];
}

export interface Layout {
  readonly lines: readonly Line[];
  readonly source: Source;
}

export type Rule = 'log-linear' | 'log-tchebycheff' | 'equal-area' | 'single-point';

/** Every point of a layout, in the order of measuring. */
export const positionsOf = ({ lines }: Layout): readonly Position[] => lines.flatMap(({ points }) => points);

/** Points that all count alike, at the places given along each of the lines. */
export function evenly(lines: readonly Omit<Line, 'points'>[], places: readonly number[]): readonly Line[] {
  const weight = 1 / (lines.length * places.length);
  return lines.map((line) => ({ ...line, points: places.map((at) => ({ at, weight })) }));
}
