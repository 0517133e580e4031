/** Everything that a conversion has to know: the meter that stands, the columns, and the rules for faults and time. */
import type { Standing } from '../run/standing.ts';
import type { FaultRule } from './faults.ts';
import type { CutOff } from './flows.ts';
import type { Mapping } from './mapping.ts';

export interface LogPlan {
  readonly stands: Standing;
  readonly mapping: Mapping;
  readonly faults: FaultRule;
  readonly cutOff: CutOff;
  /** Values hold until the next; else they are samples. */
  readonly held: boolean;
  /** Longest interval that is bridged, s; absent where the log itself tells it. */
  readonly maxGap?: number;
  /** s after midnight at which a day begins. */
  readonly dayStart: number;
  /** Every row in full, without a surface. */
  readonly exact: boolean;
}
