/**
 * Where projects are kept. One interface, two forms: the browser's database and, where there is none, memory.
 * A fault of the storage itself rejects; what the caller must decide about is a value.
 */

/** What is written: the text of a project file and what a list needs of it. */
export interface Draft {
  readonly id: string; // random; a title is only a label
  readonly title: string;
  readonly text: string;
  readonly formatVersion: number;
}

export interface KeptRecord extends Draft {
  readonly revision: number; // counts the writes, from 1
  readonly hash: string; // of `text`, see hash.ts
  readonly savedAt: number; // ms since 1970
  /** Set aside as an earlier version when it is overwritten, however soon. */
  readonly explicit: boolean;
}

export interface Entry extends Omit<KeptRecord, 'text' | 'hash' | 'explicit'> {
  readonly sound: boolean;
}

export type Reading =
  | { readonly state: 'sound'; readonly record: KeptRecord }
  | { readonly state: 'damaged'; readonly text: string } // what is left of it, to be offered as a file
  | { readonly state: 'absent' };

export type Writing =
  | { readonly ok: true; readonly revision: number }
  /**
   * conflict: another writer was there first; newer: the record belongs to a later version of the program; gone: it
   * was there and is no more, as after the browser's data were cleared.
   */
  | { readonly ok: false; readonly cause: 'conflict' | 'newer' | 'gone' };

/** strict asks the system to put the data on the disk before it says that it is kept. */
export type Durability = 'relaxed' | 'strict';

export interface Port {
  /** Why nothing outlives the page (a code of words), for a form that does not last. */
  readonly transient?: string;
  /** All projects, the newest first, each checked against its hash. */
  list(): Promise<readonly Entry[]>;
  read(id: string): Promise<Reading>;
  /** Writes if the stored revision is `expected` (0: there is none yet), in one transaction that has completed. */
  write(draft: Draft, expected: number, durability: Durability): Promise<Writing>;
  /**
   * Lays `draft` beside the project in one step that waits for nothing, for a page that may be gone at once. `read`
   * takes it up if nobody has written since `expected`.
   */
  leave(draft: Draft, expected: number): void;
  /** Earlier versions, the newest first, at most ten; damaged ones are left out. */
  versions(id: string): Promise<readonly KeptRecord[]>;
  /** Removes the project with its versions, all or nothing. */
  remove(id: string): Promise<void>;
  close(): void;
}
