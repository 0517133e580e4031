/** Today's document. The only place that says which version that is. */
export type {
  CalibrationRow,
  Display,
  DutyName,
  ElementText,
  FluidText,
  InstallationText,
  MeterText,
  PipeText,
  ProjectV1 as Project,
  TraverseText,
  UncertaintyText,
  Unknown,
} from './v/1.ts';
