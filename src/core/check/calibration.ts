/** A calibrated meter is known where it was calibrated. */
import { calibrationRange } from '../element/shared/calibration.ts';
import type { Source } from '../quantity/source.ts';
import { type Case, flowsOf } from './case.ts';
import type { Finding } from './finding.ts';

const TABLE: Source = { clause: 'Calibration of this meter', seen: 'read' };

/** Flows beyond the first or last point of the table; one row is a constant and says nothing of a range. */
export function checkCalibration(subject: Case): readonly Finding[] {
  const rows = subject.input.element.calibration;
  if (rows.length < 2) return [];
  const { min, max } = calibrationRange(rows);
  const flows = flowsOf(subject);
  const outside = flows.filter(({ reynolds }) => reynolds < min || reynolds > max);
  const common = {
    id: 'calibration-range',
    assumption: 'frictionless',
    unit: '1',
    limit: { min, max },
    source: TABLE,
  } as const;
  if (outside.length > 0)
    return outside.map(({ reynolds, name }) => ({ ...common, verdict: 'caution', value: reynolds, at: name }));
  const lowest = Math.min(...flows.map(({ reynolds }) => reynolds));
  const highest = Math.max(...flows.map(({ reynolds }) => reynolds));
  return [{ ...common, verdict: 'inside', value: lowest, detail: { highest } }];
}
