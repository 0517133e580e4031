/** Flow against differential from nothing to the span, evenly spaced in the root of the differential. */

import type { Limit, Part } from '../element/contract.ts';
import type { StatedUncertainty } from '../input/uncertainty.ts';
import { as } from '../quantity/brand.ts';
import { differentialFrom } from '../solve/differential.ts';
import type { Meter } from '../solve/equation.ts';
import { flowFrom } from '../solve/flow.ts';
import { flowUncertainty } from '../uncertainty/iso5167.ts';
import type { CurvePoint } from './record.ts';

const STEPS = 40;

/** The curve of a meter up to its span, with the point of no flow left out. */
export function curveOf(meter: Meter, span: number, stated: StatedUncertainty, extra: readonly Part[]): CurvePoint[] {
  const points: CurvePoint[] = [];
  const { min = 0, max = Number.POSITIVE_INFINITY } = reynoldsBounds(meter);
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

/** The Reynolds limits of a meter, none or more, and the differentials of the flows that have them. */
export function reynoldsLimits(meter: Meter) {
  const { min, max, source } = reynoldsBounds(meter);
  return {
    ...(min === undefined ? {} : { min, ...named('minDifferential_Pa', differentialAt(min, meter)) }),
    ...(max === undefined ? {} : { max, ...named('maxDifferential_Pa', differentialAt(max, meter)) }),
    ...(source === undefined ? {} : { source }),
  };
}

/** They depend on the geometry alone. */
const reynoldsBounds = ({ primary, geometry }: Meter): Partial<Limit> =>
  primary.limits(geometry, 0).find(({ id }) => id === 'reynolds-pipe') ?? {};

/** The differential at a pipe Reynolds number; none where no differential makes that flow. */
function differentialAt(reynolds: number, meter: Meter): number | undefined {
  const massFlow = as<'mass flow'>((reynolds * Math.PI * meter.state.viscosity * meter.geometry.pipe) / 4); // ISO 5167-1:2003, 3.3.2
  const operation = differentialFrom(massFlow, meter, 'duty.maximum');
  return operation.ok ? operation.value.differential : undefined;
}

const named = <Key extends string>(key: Key, value: number | undefined) =>
  (value === undefined ? {} : { [key]: value }) as { readonly [K in Key]?: number };
