/** An element with its own fields settled, and its coefficient replaced where the meter was calibrated. */
import type { Element, Primary } from './contract.ts';
import { type CalibrationPoint, calibrated } from './shared/calibration.ts';

/** The element as solve uses it; `own` are its fields as parsed, `calibration` the points of the meter, none or more. */
export function settled(
  element: Element,
  own: Readonly<Record<string, string | number>>,
  calibration: readonly CalibrationPoint[],
): Primary {
  const primary = element.primary(own);
  return calibration.length > 0 ? calibrated(primary, calibration) : primary;
}
