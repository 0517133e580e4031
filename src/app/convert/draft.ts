/** An output file that is written beside its place, and put there when it is whole. */
import { closeSync, fsyncSync, openSync, realpathSync, renameSync, rmSync, statSync, writeSync } from 'node:fs';
import { basename, dirname, join } from 'node:path';

export interface Draft {
  /** Takes bytes; after a fault they are let go. */
  readonly write: (bytes: Uint8Array) => void;
  /** Why bytes could not be written, as the system says it. */
  readonly fault: () => string | undefined;
  /** Gives the draft its name; answers why where that failed. */
  readonly place: () => string | undefined;
  /** Removes it where it is not placed. */
  readonly drop: () => void;
}

const because = (cause: unknown): string => (cause instanceof Error ? cause.message : String(cause));

/** Opens a draft of `out`, or says in a sentence why there can be none. `source` is what is being read. */
export function openDraft(out: string, source: string): Draft | string {
  const there = statSync(out, { throwIfNoEntry: false });
  if (there && !there.isFile()) return `The output ${out} is no file.`;
  if (there && realpathSync(out) === realpathSync(source)) return `The output ${out} is the log itself.`;
  const path = join(dirname(out), `.${basename(out)}.${process.pid}.part`);
  let file: number;
  try {
    file = openSync(path, 'wx');
  } catch (cause) {
    return `The output ${out} cannot be written: ${because(cause)}.`;
  }
  return draftAt(file, path, out);
}

function draftAt(file: number, path: string, out: string): Draft {
  let fault: string | undefined;
  let state: 'open' | 'closed' | 'placed' = 'open';
  const close = (): void => {
    if (state === 'open') closeSync(file);
    state = 'closed';
  };
  return {
    write(bytes) {
      try {
        for (let at = 0; fault === undefined && at < bytes.length; ) at += writeSync(file, bytes, at);
      } catch (cause) {
        fault = because(cause);
      }
    },
    fault: () => fault,
    place() {
      try {
        fsyncSync(file);
        close();
        renameSync(path, out);
        state = 'placed';
      } catch (cause) {
        return because(cause);
      }
      return undefined;
    },
    drop() {
      if (state === 'placed') return;
      close();
      rmSync(path, { force: true });
    },
  };
}
