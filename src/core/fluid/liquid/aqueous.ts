/** What the aqueous mixtures share: pressure, vapour pressure, concentration. */
import type { Temperature } from '../../quantity/kinds.ts';
import { fail, type Outcome, ok } from '../../quantity/outcome.ts';
import { bounds } from '../if97/place.ts';
import { criticalTemperature, saturationPressure } from '../if97/saturation.ts';
import type { Property } from './contract.ts';

/** Practice: the typical compressibility of water and what is dissolved in it, 5e-10 per Pa. */
export const aqueousModulus = 1 / 5e-10; // Pa

/** The vapour pressure of water: an upper bound over a solution whose solute does not boil off. IAPWS R7-97(2012), Eq. 30. */
export const waterBound: Property = {
  at: (T) => saturationPressure(T as Temperature),
  min: bounds.lowestTemperature,
  max: criticalTemperature,
  below: 0,
  above: 0,
  source: { clause: 'IAPWS R7-97(2012), Eq. 30, of water alone: the solute lowers it', seen: 'derived' },
  remark: 'liquid-vapour-of-water',
};

/** A mass fraction inside the range of its formulation. Problems: field-missing, concentration-out-of-range. */
export function concentrationWithin(
  share: number | undefined,
  { min, max }: { readonly min: number; readonly max: number },
  path: string,
): Outcome<number> {
  if (share === undefined) return fail('field-missing', path);
  if (share >= min && share <= max) return ok(share);
  return fail('concentration-out-of-range', path, { percent: 100 * share, min: 100 * min, max: 100 * max });
}
