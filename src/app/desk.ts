/**
 * The desk: one project at hand, those kept in this browser in reach. Nothing leaves it before it is kept, nothing on it
 * is written over what another tab or a newer version has kept.
 */
import type { Project } from '../core/document/project.ts';
import { type Autosave, createAutosave, type Standing } from '../persist/autosave.ts';
import { createLocks, type Hold, type LockOptions, type Locks } from '../persist/lock.ts';
import type { Entry, Port } from '../persist/port.ts';
import { textOf } from '../state/text.ts';
import type { Keeping, KeptProject, WorkbenchStore } from '../state/workbench.ts';
import { dateOf, timeOf } from './clock.ts';
import { readProject, titleOf } from './project-text.ts';

export interface DeskOptions {
  readonly store: WorkbenchStore;
  readonly port: Port;
  readonly locks: LockOptions['locks'];
  /** Which project this tab had at hand before it was loaded anew. */
  readonly tab: { recall(): string | undefined; note(id: string): void };
  readonly newId: () => string;
}

export interface Desk {
  readonly options: DeskOptions;
  readonly autosave: Autosave;
  readonly locks: Locks;
  id: string;
  hold: Hold | undefined; // undefined: another tab holds the project
  /** The project as last read or kept, and its revision. */
  base: { readonly project: Project; readonly revision: number };
  drafted: Project;
  filed: string | undefined; // the text last saved to a file
}

/** What may be put on the desk. */
export interface Sheet {
  readonly id: string;
  readonly revision: number;
  readonly project: Project;
  readonly source: string;
  readonly savedAt?: number;
}

const FORMAT_VERSION = 1;

export function createDesk(options: DeskOptions): Desk {
  const { store, port } = options;
  const { project } = store.getState();
  const autosave = createAutosave({
    port,
    draft: () => {
      const state = store.getState();
      desk.drafted = state.project;
      return { title: titleOf(state.project), text: textOf(state), formatVersion: state.project.version };
    },
    report: (standing) => store.getState().setKeeping(shown(standing)),
    onKept: () => onKept(desk),
    onGone: () => store.getState().setNotice({ code: 'stored-gone', detail: {}, kind: 'problem' }),
  });
  const locks = createLocks({
    locks: options.locks,
    onAsked: async (id) => {
      if (id === desk.id) await autosave.flush('strict');
    },
    onLost: (id) => {
      if (id !== desk.id) return;
      desk.hold = undefined;
      autosave.stop();
      store.getState().setKeeping({ state: 'elsewhere' });
    },
  });
  const base = { project, revision: 0 };
  const desk: Desk = { options, autosave, locks, id: '', hold: undefined, base, drafted: project, filed: undefined };
  store.subscribe((state, before) => {
    if (state.project !== before.project) autosave.changed();
  });
  return desk;
}

function onKept(desk: Desk): void {
  const at = desk.autosave.at();
  if (at === undefined) return;
  const listed = desk.options.store.getState().projects.find(({ id }) => id === at.id);
  desk.base = { project: desk.drafted, revision: at.revision };
  if (listed?.title !== titleOf(desk.drafted)) void refreshList(desk).catch(() => undefined); // the list is no save
}

/** Whether the project at hand may leave: it is as it was kept, can be kept now, or is in a file. */
export async function isSafe(desk: Desk): Promise<boolean> {
  const { store } = desk.options;
  if (store.getState().project === desk.base.project) return true;
  if (await desk.autosave.flush('strict')) return true;
  if (desk.filed === textOf(store.getState())) return true;
  store.getState().setNotice({ code: 'not-kept', detail: {}, kind: 'problem' });
  return false;
}

/** Puts a project on the desk in place of the one at hand, which must be safe. */
export function show(desk: Desk, sheet: Sheet, hold: Hold | undefined): void {
  const { store, port, tab } = desk.options;
  desk.autosave.stop();
  desk.hold?.release();
  desk.hold = hold;
  desk.id = sheet.id;
  desk.base = { project: sheet.project, revision: sheet.revision };
  desk.filed = undefined;
  store.getState().open(sheet.project, sheet.source);
  store.getState().setKeeping(keepingOf(sheet, port, hold));
  tab.note(sheet.id);
  if (hold !== undefined) desk.autosave.begin(sheet.id, sheet.revision);
  markCurrent(desk);
}

const shown = (standing: Standing): Keeping =>
  standing.state === 'kept' ? { state: 'kept', at: timeOf(new Date(standing.at)) } : standing;

function keepingOf(sheet: Sheet, port: Port, hold: Hold | undefined): Keeping {
  if (hold === undefined) return { state: 'elsewhere' };
  if (port.transient !== undefined) return { state: 'memory', cause: port.transient };
  return sheet.savedAt === undefined ? { state: 'new' } : { state: 'kept', at: timeOf(new Date(sheet.savedAt)) };
}

/** A project of its own under a new id, kept at once. */
export async function showAsOwn(desk: Desk, project: Project, source: string): Promise<void> {
  const id = desk.options.newId();
  show(desk, { id, revision: 0, project, source }, await desk.locks.claim(id));
  desk.autosave.changed();
  await desk.autosave.flush('strict');
}

/** The stored project, or why not: a notice, and no sheet. */
export async function sheetOf(desk: Desk, id: string): Promise<Sheet | undefined> {
  const reading = await desk.options.port.read(id);
  const { setNotice } = desk.options.store.getState();
  if (reading.state !== 'sound') {
    const code = reading.state === 'damaged' ? 'stored-damaged' : 'stored-gone';
    setNotice({ code, detail: { title: listedTitle(desk, id) }, kind: 'problem' });
    return undefined;
  }
  const { text: source, revision, savedAt } = reading.record;
  const project = readProject(source);
  if (project.ok) return { id, revision, project: project.value, source, savedAt };
  const [{ code, detail }] = project.problems;
  setNotice({ code, detail: textDetail({ name: reading.record.title, ...detail }), kind: 'problem' });
  return undefined;
}

export const textDetail = (detail: Readonly<Record<string, string | number>>): Record<string, string> =>
  Object.fromEntries(Object.entries(detail).map(([key, value]) => [key, String(value)]));

export const listedTitle = (desk: Desk, id: string): string =>
  desk.options.store.getState().projects.find((kept) => kept.id === id)?.title ?? '';

/** Reads the list of kept projects into the workbench. */
export async function refreshList(desk: Desk): Promise<readonly Entry[]> {
  const entries = await desk.options.port.list();
  desk.options.store.getState().setProjects(
    entries.map(
      ({ id, title, savedAt, sound, formatVersion }): KeptProject => ({
        id,
        title,
        savedAt: dateOf(new Date(savedAt)),
        condition: sound ? (formatVersion > FORMAT_VERSION ? 'newer' : 'sound') : 'damaged',
        current: id === desk.id,
      }),
    ),
  );
  return entries;
}

function markCurrent(desk: Desk): void {
  const { projects, setProjects } = desk.options.store.getState();
  setProjects(projects.map((kept) => ({ ...kept, current: kept.id === desk.id })));
}
