/**
 * What the page and the worker of logs say to each other. Every message carries the number of its job; while a job runs
 * the worker is never silent for long.
 */
import type { OfMeter } from '../core/log/look.ts';
import type { LogLook } from '../core/result/log-look.ts';
import type { LogResult } from '../core/result/log-record.ts';

/** Why a log is not looked at or not converted: a code with words, the field or `log`, and what the sentence needs. */
export type LogTrouble = LogLook['problems'][number];

export type Order =
  | { readonly kind: 'look'; readonly of: OfMeter; readonly file: Blob }
  | {
      readonly kind: 'convert';
      readonly of: OfMeter;
      readonly file: Blob;
      /** Under this name the page holds what it has in the store of the browser. */
      readonly owner: string;
    }
  /** Makes the log of a day for a meter. */
  | { readonly kind: 'example'; readonly of: OfMeter }
  /** Lets go of everything that was converted for the page. */
  | { readonly kind: 'tidy'; readonly owner: string };

export type ToWorker =
  | { readonly kind: 'order'; readonly job: number; readonly order: Order }
  | { readonly kind: 'cancel'; readonly job: number };

/** How far a conversion has come. */
export interface Progress {
  readonly bytes: number; // of the file, packed or not
  readonly ofBytes: number;
  readonly rows: number;
  readonly rowsPerSecond: number;
  /** Absent while too little was read to tell. */
  readonly secondsLeft?: number;
}

/** The converted log, kept in the store of the browser or in memory. */
export interface Converted {
  readonly record: LogResult;
  readonly output: Blob;
  readonly seconds: number; // that it took
}

export type Ending =
  | { readonly kind: 'looked'; readonly look: LogLook }
  | { readonly kind: 'converted'; readonly converted: Converted }
  | { readonly kind: 'written'; readonly file: Blob }
  | { readonly kind: 'tidied' }
  | { readonly kind: 'refused'; readonly troubles: readonly LogTrouble[] }
  | { readonly kind: 'cancelled' };

export type FromWorker =
  | { readonly kind: 'alive'; readonly job: number }
  /** Something that takes a while comes next: nothing will be heard until it is done. */
  | { readonly kind: 'busy'; readonly job: number }
  | { readonly kind: 'progress'; readonly job: number; readonly progress: Progress }
  | { readonly kind: 'ended'; readonly job: number; readonly ending: Ending };

/** One trouble of a log as a whole. */
export const trouble = (code: string, detail: LogTrouble['detail'] = {}): LogTrouble => ({
  code,
  field: 'log',
  detail,
});
