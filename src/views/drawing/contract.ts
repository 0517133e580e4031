/** What a drawn element gives to the picture of the pipe and to the dimensioned section. Lengths in m. */
import type { DimensionRow, Shape } from '../present/model.ts';
import type { Path, Point } from './path.ts';

/** A part of the axis, from the upstream face of the element (start of the convergent of a Venturi tube). */
export interface Reach {
  readonly from: number;
  readonly to: number;
}

/** A tapping hole through the upper wall: its axis, and its width. */
export interface Tapping {
  readonly x: number;
  readonly inner: number;
  readonly outer: number;
  readonly width: number;
}

export interface Section {
  /** Upper contour of the bore through the element, from the upstream face to the exit; open. */
  readonly profile: Path;
  readonly walls: readonly Path[];
  readonly metal: readonly Path[];
  readonly fluid: Path;
  readonly streamlines: readonly Path[];
  readonly tappings: readonly Tapping[];
  /** The edge that sets the bore. */
  readonly edge: Point;
  /** Largest radius of the metal; below the axis another where it differs. */
  readonly outside: number;
  readonly below?: number;
}

/** A dimension on the sheet. Radii and lengths in m of the section; `row` counts dimension lines outwards. */
export type Measure =
  | {
      readonly kind: 'length';
      readonly from: Point;
      readonly to: Point;
      readonly row: number; // 1, 2 ... above the metal; -1, -2 ... below it
      readonly text: string;
    }
  | {
      readonly kind: 'diameter';
      readonly x: number;
      readonly radius: number;
      readonly edge: number;
      readonly text: string;
    }
  | {
      readonly kind: 'angle';
      readonly apex: Point;
      readonly distance: number;
      readonly half: number;
      readonly text: string;
    }
  | { readonly kind: 'note'; readonly at: Point; readonly shift: Point; readonly text: string }; // shift: mm on paper

/** Printed diameters that the dimension rows do not hold. */
export interface Diameters {
  readonly pipe: string;
  readonly bore: string;
}

export interface Draft {
  /** The part of the axis worth drawing on the screen. */
  readonly reach: (shape: Shape, compact: boolean) => Reach;
  /** The part of the axis worth drawing on the sheet. */
  readonly sheetReach: (shape: Shape) => Reach;
  readonly section: (shape: Shape, dimensions: readonly DimensionRow[], reach: Reach) => Section;
  readonly measures: (
    shape: Shape,
    dimensions: readonly DimensionRow[],
    reach: Reach,
    diameters: Diameters,
  ) => readonly Measure[];
  /** True when the sheet shows the edge enlarged beside the section. */
  readonly edgeDetail: boolean;
}
