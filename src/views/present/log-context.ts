/** What every part of a presented log looks at: the record, how it was made, and how its figures are printed. */
import type { MeterText, Project } from '../../core/document/project.ts';
import type { LogResult } from '../../core/result/log-record.ts';
import type { MeterResult } from '../../core/result/record.ts';
import { contextOf } from './context.ts';
import type { Value } from './model.ts';
import { type Printer, printer, show } from './numbers.ts';
import { stampsIn } from './stamps.ts';
import { unit } from './units.ts';

/** A conversion with what it was made by. */
export interface Conversion {
  readonly record: LogResult;
  readonly meter: MeterText;
  readonly project: Project;
  readonly result: MeterResult;
  readonly name: string; // of the file
  readonly seconds: number; // that it took
  /** Whether the meter or the columns are others by now. */
  readonly stale: boolean;
}

/** What the parts of a presented log look at. */
export interface LogContext extends Printer {
  readonly record: LogResult;
  readonly stamp: (seconds: number) => string;
  readonly count: (whole: number) => Value;
}

const SMALL = 1e4; // kg: totals below are printed in kilograms

export function logContext({ record, meter, project }: Conversion): LogContext {
  const { units, display } = contextOf(meter, project);
  const small = display === 'SI' && record.total_kg < SMALL;
  const printed = printer({ ...units, ...(small ? { mass: unit('kg', 'mass') } : {}) });
  return {
    ...printed,
    record,
    stamp: stampsIn(record.zone),
    count: (whole) => show(whole, undefined, { decimals: 0 }),
  };
}
