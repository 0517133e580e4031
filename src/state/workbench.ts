/**
 * The workbench: the project being edited, its history, and the results derived from it by reference.
 * A zustand vanilla store; views/screen binds to it, app wires it to persist.
 */
import type { StoreApi } from 'zustand/vanilla';
import type { Display, MeterText, Project, TraverseText } from '../core/document/project.ts';
import type { Results, Solved, SolvedTraverse } from '../core/result/record.ts';
import type { ListName } from './lists.ts';
import type { OpenLog } from './logs.ts';
import type { ReadingCell } from './readings.ts';

/** Where the project stands: not yet read, being kept, kept, or why not. */
export type Keeping =
  | { readonly state: 'reading' }
  | { readonly state: 'new' } // empty so far: there is nothing to keep
  | { readonly state: 'pending' }
  | { readonly state: 'kept'; readonly at: string } // local time, '14:02'
  | { readonly state: 'memory'; readonly cause: string } // nothing is kept, and why (code of words)
  | { readonly state: 'failed'; readonly cause: string }
  | { readonly state: 'elsewhere' }; // another tab holds the project

/** Something the user should read once; `code` and `detail` become a sentence in views/words. */
export interface Notice {
  readonly code: string;
  readonly detail: Readonly<Record<string, string>>;
  readonly kind: 'info' | 'problem';
}

/** A project kept in this browser. */
export interface KeptProject {
  readonly id: string;
  readonly title: string;
  readonly savedAt: string; // local date and time, '2026-03-14 14:02'
  readonly condition: 'sound' | 'damaged' | 'newer'; // newer: written by a later version of this program
  readonly current: boolean;
}

export interface WorkbenchState {
  readonly project: Project;
  /** Stable identity of each meter while the project is open, parallel to project.meters. */
  readonly keys: readonly string[];
  readonly selected: number; // index into project.meters, -1 when empty
  /** The same of the traverses. */
  readonly traverseKeys: readonly string[];
  readonly traverseSelected: number;
  /** The list that was last worked on. */
  readonly hand: ListName;
  readonly results: Results; // of the project as it stands
  /** The last solved result of each meter by key, shown as stale while its input cannot be read. */
  readonly lastSolved: Readonly<Record<string, Solved>>;
  /** The same of each traverse. */
  readonly lastSurveyed: Readonly<Record<string, SolvedTraverse>>;
  /** The project as it was opened and its text, byte for byte. */
  readonly opened: { readonly project: Project; readonly source: string };
  readonly keeping: Keeping;
  readonly deleted: { readonly tag: string; readonly list: ListName } | undefined; // offers undo after a deletion
  readonly canUndo: boolean;
  readonly canRedo: boolean;
  readonly notice: Notice | undefined;
  readonly update: boolean; // a new version of the program is ready
  readonly projects: readonly KeptProject[]; // kept in this browser, newest first
  readonly log: OpenLog | undefined;
}

export interface WorkbenchActions {
  /**
   * Writes one value of the selected meter, or of the selected item of another list; `path` has dots
   * ('upstream.pressure'); undefined or '' removes the key. Edits of one field in a row are one step of undo.
   */
  write(path: string, value: unknown, list?: ListName): void;
  /** Writes several values of one item as one step of undo that stands by itself. */
  writeAll(values: readonly (readonly [path: string, value: unknown])[], list?: ListName): void;
  /** Writes readings of the selected traverse: those of one point in a row are one step of undo, several a step by themselves. */
  writeReadings(cells: readonly ReadingCell[]): void;
  /** Ends the current step of undo (on blur or Enter). */
  settle(): void;
  writeProject(path: string, value: unknown): void; // title, revision, site.atmosphere, ...
  setDisplay(display: Display): void;
  select(index: number): void;
  addMeter(meter?: MeterText): void; // a new meter with usual defaults, selected
  duplicateMeter(index: number): void;
  moveMeter(index: number, to: number): void;
  deleteMeter(index: number): void;
  takeToHand(list: ListName): void; // as the place that is open works on it
  selectTraverse(index: number): void;
  addTraverse(traverse?: TraverseText): void; // a new survey with usual choices, selected
  duplicateTraverse(index: number): void;
  moveTraverse(index: number, to: number): void;
  deleteTraverse(index: number): void;
  dismissDeleted(): void;
  open(project: Project, source: string): void; // replaces the project; `source` is its text, kept until edited
  undo(): void;
  redo(): void;
  setKeeping(keeping: Keeping): void;
  setNotice(notice: Notice): void;
  dismissNotice(): void;
  setUpdate(ready: boolean): void;
  setProjects(projects: readonly KeptProject[]): void;
  setLog(log: OpenLog | undefined): void;
}

export type Workbench = WorkbenchState & WorkbenchActions;
export type WorkbenchStore = StoreApi<Workbench>;
