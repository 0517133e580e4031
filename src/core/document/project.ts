/** Today's document. The only place that says which version that is. */
export type {
  Display,
  DutyName,
  ElementText,
  FluidText,
  MeterText,
  ProjectV1 as Project,
  TraverseText,
  UncertaintyText,
  Unknown,
} from './v/1.ts';
export type { InstrumentText, ReadingText } from './v/1-instrument.ts';
export type { LogText } from './v/1-log.ts';
