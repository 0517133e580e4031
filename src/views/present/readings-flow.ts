/** A flow that was read, on the basis and in the unit of its meter. */
import type { FlowRecord } from '../../core/result/readings-record.ts';
import type { Context } from './context.ts';
import type { Value } from './model.ts';
import { flowRole } from './units.ts';

/** A flow on the basis of this meter; absent where nothing can be said. */
export function readFlow(at: Context, flow: Partial<FlowRecord>): Value | undefined {
  const role = flowRole(at.units.flow);
  const si = {
    massFlow: flow.massFlow_kg_s,
    volumeFlow: flow.volumeFlow_m3_s,
    baseVolumeFlow: flow.baseVolumeFlow_m3_s,
  };
  const own = si[role];
  if (own !== undefined) return at.value(own, role);
  return flow.massFlow_kg_s === undefined ? undefined : at.value(flow.massFlow_kg_s, 'massFlow');
}
