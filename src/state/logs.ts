/** The log at hand: a file opened at one meter, what its first rows show, how far it is converted, what it came to. */
import type { MeterText, Project } from '../core/document/project.ts';
import type { LogLook } from '../core/result/log-look.ts';
import type { LogResult } from '../core/result/log-record.ts';
import type { MeterResult } from '../core/result/record.ts';

/** Why a log is not converted; words by its code. */
export type LogTrouble = LogLook['problems'][number];

/** How far a conversion has come. */
export interface LogProgress {
  readonly bytes: number; // of the file, packed or not
  readonly ofBytes: number;
  readonly rows: number;
  readonly rowsPerSecond: number;
  readonly secondsLeft?: number; // absent while too little was read to tell
}

/** A converted log, with what it was converted by: it is shown with its own meter, whatever is typed later. */
export interface ConvertedLog {
  readonly record: LogResult;
  readonly meter: MeterText;
  readonly project: Project;
  readonly result: MeterResult;
  readonly seconds: number; // that it took
  /** The converted rows, to be saved. */
  readonly output: { readonly name: string; readonly bytes: number };
}

export interface OpenLog {
  /** Key of the meter that it is converted by. */
  readonly key: string;
  readonly name: string;
  readonly bytes: number;
  /** What the first rows show; absent before they are read. */
  readonly look?: LogLook;
  /** While it is converted. */
  readonly progress?: LogProgress;
  /** Of the last conversion that came to its end. */
  readonly converted?: ConvertedLog;
  /** Why the last look or conversion came to no end. */
  readonly troubles: readonly LogTrouble[];
  /** The last conversion was ended by the user. */
  readonly cancelled: boolean;
}

/** Whether a meter stands as it stood when its log was converted. */
export const isCurrent = ({ meter, project }: ConvertedLog, now: MeterText | undefined, at: Project): boolean =>
  meter === now && project.site === at.site && project.base === at.base;
