/** Flow against differential from nothing to the span, evenly spaced in the root of the differential. */

import type { Part } from '../element/contract.ts';
import type { StatedUncertainty } from '../input/uncertainty.ts';
import { as } from '../quantity/brand.ts';
import type { Meter } from '../solve/equation.ts';
import { flowFrom } from '../solve/flow.ts';
import { flowUncertainty } from '../uncertainty/iso5167.ts';
import type { CurvePoint } from './record.ts';

const STEPS = 40;

/** The curve of a meter up to its span, with the point of no flow left out. */
export function curveOf(meter: Meter, span: number, stated: StatedUncertainty, extra: readonly Part[]): CurvePoint[] {
  const points: CurvePoint[] = [];
  const { min = 0, max = Number.POSITIVE_INFINITY } = reynoldsLimits(meter);
  for (let step = 1; step <= STEPS; step += 1) {
    const differential = as<'pressure difference'>(span * (step / STEPS) ** 2);
    const flow = flowFrom(differential, meter);
    if (!flow.ok) continue; // only a differential as large as the pressure itself, which the span never is
    const { massFlow, reynolds } = flow.value;
    points.push({
      differential_Pa: differential,
      massFlow_kg_s: massFlow,
      reynoldsPipe: reynolds,
      expanded_percent: flowUncertainty(meter, flow.value, stated, span, extra).expandedPercent,
      inside: reynolds >= min && reynolds <= max,
    });
  }
  return points;
}

/** The standard's Reynolds limits of a meter; they depend on its geometry alone. */
export function reynoldsLimits({ primary, geometry }: Meter) {
  const limit = primary.limits(geometry, 0).find(({ id }) => id === 'reynolds-pipe');
  if (limit === undefined) throw new Error(`result: expected a Reynolds limit of ${primary.name}, got none`);
  const { min, max, source } = limit;
  return { ...(min === undefined ? {} : { min }), ...(max === undefined ? {} : { max }), source };
}
