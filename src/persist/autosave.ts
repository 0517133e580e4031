/**
 * Keeps the project while it is worked on: one write after a moment's rest, one at a time, none before the project has
 * been read. After a failure it waits and tries again by itself, and says so once.
 */
import type { Durability, Port, Writing } from './port.ts';

/** How the keeping stands; a cause is a code of words. */
export type Standing =
  | { readonly state: 'pending' }
  | { readonly state: 'kept'; readonly at: number } // ms since 1970
  | { readonly state: 'memory'; readonly cause: string }
  | { readonly state: 'failed'; readonly cause: string }
  | { readonly state: 'elsewhere' };

export interface AutosaveOptions {
  readonly port: Port;
  /** The project as it stands at the moment of writing. */
  readonly draft: () => { readonly title: string; readonly text: string; readonly formatVersion: number };
  readonly report: (standing: Standing) => void;
  /** Called after each write that is kept. */
  readonly onKept?: () => void;
  /** Called when the stored project was found gone; it is then written anew. */
  readonly onGone?: () => void;
}

export interface Autosave {
  /** From here on changes of this project are kept; `revision` is that of the record read, 0 if there is none. */
  begin(id: string, revision: number): void;
  /** Keeps nothing any more. */
  stop(): void;
  changed(): void;
  /** Writes what is not yet kept, at once; whether all is kept then. */
  flush(durability?: Durability): Promise<boolean>;
  /** Lays what is not yet kept beside the project, within the call: the page may be gone at once. */
  leave(): void;
  /** What is being kept, and as which revision. */
  at(): { readonly id: string; readonly revision: number } | undefined;
}

const REST = 700; // ms without a change before a write
const FIRST_RETRY = 4_000; // ms, doubled after each further failure
const LAST_RETRY = 60_000; // ms

/** The keeping of one project after another. */
interface Course {
  readonly options: AutosaveOptions;
  target: { readonly id: string; revision: number } | undefined;
  changes: number; // made since begin
  kept: number; // of these
  failures: number; // in a row
  running: Promise<boolean> | undefined;
  timer: ReturnType<typeof setTimeout> | undefined;
}

export function createAutosave(options: AutosaveOptions): Autosave {
  const course: Course = {
    options,
    target: undefined,
    changes: 0,
    kept: 0,
    failures: 0,
    running: undefined,
    timer: undefined,
  };
  return {
    begin: (id, revision) => {
      stop(course);
      course.target = { id, revision };
    },
    stop: () => stop(course),
    changed: () => {
      if (course.target === undefined) return;
      course.changes += 1;
      if (course.failures === 0) rest(course);
    },
    flush: (durability = 'relaxed') => flush(course, durability),
    leave: () => {
      const { target, changes, kept } = course;
      if (target !== undefined && changes !== kept)
        options.port.leave({ id: target.id, ...options.draft() }, target.revision);
    },
    at: () => (course.target === undefined ? undefined : { ...course.target }),
  };
}

function stop(course: Course): void {
  clearTimeout(course.timer);
  course.target = undefined;
  course.changes = 0;
  course.kept = 0;
  course.failures = 0;
}

function arm(course: Course, delay: number): void {
  clearTimeout(course.timer);
  course.timer = setTimeout(() => void flush(course, 'relaxed'), delay);
}

function rest(course: Course): void {
  course.options.report({ state: 'pending' });
  arm(course, REST);
}

async function flush(course: Course, durability: Durability): Promise<boolean> {
  clearTimeout(course.timer);
  while (course.running !== undefined) await course.running;
  if (course.target === undefined) return false;
  if (course.changes === course.kept) return true;
  course.running = attempt(course, durability).finally(() => {
    course.running = undefined;
  });
  return course.running;
}

async function attempt(course: Course, durability: Durability): Promise<boolean> {
  const { options, target, changes } = course;
  if (target === undefined) return false;
  const outcome = await tried(() =>
    options.port.write({ id: target.id, ...options.draft() }, target.revision, durability),
  );
  if (course.target !== target) return 'ok' in outcome && outcome.ok; // stopped or on another project meanwhile
  if ('fault' in outcome) return failed(course, outcome.fault);
  if (outcome.ok) return accept(course, target, outcome.revision, changes);
  if (outcome.cause !== 'gone') return refuse(course, outcome.cause);
  target.revision = 0; // nothing stands there that could be overwritten
  options.onGone?.();
  return attempt(course, durability);
}

function accept(course: Course, target: { revision: number }, revision: number, upTo: number): boolean {
  target.revision = revision;
  course.kept = upTo;
  course.failures = 0;
  if (course.changes > upTo) rest(course);
  else course.options.report(keptStanding(course.options.port));
  course.options.onKept?.();
  return course.changes === upTo;
}

/** Whoever else wrote is right: this tab keeps nothing more. */
function refuse(course: Course, cause: 'conflict' | 'newer'): false {
  stop(course);
  course.options.report(cause === 'conflict' ? { state: 'elsewhere' } : { state: 'failed', cause: 'newer' });
  return false;
}

function failed(course: Course, fault: unknown): false {
  course.failures += 1;
  if (course.failures === 1) course.options.report({ state: 'failed', cause: causeOf(fault) });
  arm(course, Math.min(FIRST_RETRY * 2 ** (course.failures - 1), LAST_RETRY));
  return false;
}

/**
 * Leaves and flushes when the page is hidden, the last moment a browser promises; gives back how to end that. The flush
 * asks and waits for answers, which a page that is closed does not get.
 */
export function flushWhenHidden(page: Document, autosave: Pick<Autosave, 'flush' | 'leave'>): () => void {
  const hidden = (): void => {
    if (page.visibilityState !== 'hidden') return;
    autosave.leave();
    void autosave.flush();
  };
  page.addEventListener('visibilitychange', hidden);
  return () => page.removeEventListener('visibilitychange', hidden);
}

async function tried(write: () => Promise<Writing>): Promise<Writing | { readonly fault: unknown }> {
  try {
    return await write();
  } catch (fault) {
    return { fault };
  }
}

const keptStanding = ({ transient }: Port): Standing =>
  transient === undefined ? { state: 'kept', at: Date.now() } : { state: 'memory', cause: transient };

/** Code of why the storage failed: no-space, closed (by another tab or the browser), newer, or storage. */
export function causeOf(fault: unknown): string {
  const name = fault instanceof Error || fault instanceof DOMException ? fault.name : '';
  if (name === 'QuotaExceededError') return 'no-space';
  if (name === 'InvalidStateError') return 'closed';
  return name === 'VersionError' ? 'newer' : 'storage';
}
