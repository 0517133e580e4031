/** Dimensions of one clause for the drawing and the sheet, named shortly where an element lists its own. */
import type { Source } from '../../quantity/source.ts';
import type { Dimension } from '../contract.ts';

export interface Bounds {
  readonly min?: number;
  readonly nominal?: number;
  readonly max?: number;
}

/** Writers of dimensions that share a source: lengths in m, angles in degrees, ratios. */
export const dimensionsOf = (source: Source) => {
  const write =
    (unit: Dimension['unit']) =>
    (id: string, symbol: string, bounds: Bounds): Dimension => ({ id, symbol, ...bounds, unit, source });
  return { length: write('m'), angle: write('deg'), ratio: write('1') };
};

/** Bounds of a nominal value and its tolerance, the same in both directions. */
export const within = (nominal: number, tolerance: number): Bounds => ({
  min: nominal - tolerance,
  nominal,
  max: nominal + tolerance,
});
