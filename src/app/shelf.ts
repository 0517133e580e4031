/** What is done between the desk and the projects kept in this browser. */
import { emptyProject, encode } from '../core/document/codec.ts';
import { causeOf } from '../persist/autosave.ts';
import { textOf } from '../state/text.ts';
import { type Desk, isSafe, listedTitle, refreshList, sheetOf, show, showAsOwn, textDetail } from './desk.ts';
import { readProject } from './project-text.ts';

/** At the start: the project this tab had, or the newest, or an empty one. What was typed meanwhile stays. */
export async function start(desk: Desk): Promise<void> {
  const { store, tab } = desk.options;
  const { setNotice } = store.getState();
  try {
    await refreshList(desk);
    warn(desk);
    const sound = store.getState().projects.filter(({ condition }) => condition === 'sound');
    const chosen = sound.find(({ id }) => id === tab.recall()) ?? sound[0];
    const typed = store.getState().project !== desk.base.project;
    if (!typed && chosen !== undefined && (await openKept(desk, chosen.id))) return;
  } catch (fault) {
    setNotice({ code: `storage-${causeOf(fault)}`, detail: {}, kind: 'problem' });
  }
  await startEmpty(desk);
}

/** Says which kept projects this version cannot open. */
function warn(desk: Desk): void {
  const { projects, setNotice } = desk.options.store.getState();
  for (const condition of ['newer', 'damaged'] as const) {
    const kept = projects.find((project) => project.condition === condition);
    if (kept) setNotice({ code: `stored-${condition}`, detail: { title: kept.title }, kind: 'problem' });
  }
}

/** The project as it stands becomes one of its own; empty, it is kept when something is typed. */
async function startEmpty(desk: Desk): Promise<void> {
  const { project, opened } = desk.options.store.getState();
  if (project !== opened.project) return showAsOwn(desk, project, textOf(desk.options.store.getState()));
  const id = desk.options.newId();
  show(desk, { id, revision: 0, project, source: opened.source }, await desk.locks.claim(id));
}

export async function openEmpty(desk: Desk): Promise<void> {
  if (!(await isSafe(desk))) return;
  const id = desk.options.newId();
  const project = emptyProject();
  show(desk, { id, revision: 0, project, source: encode(project) }, await desk.locks.claim(id));
}

/** Opens a project of the list; whether it is at hand then. */
export async function openKept(desk: Desk, id: string): Promise<boolean> {
  if (id === desk.id) return true;
  const hold = await desk.locks.claim(id);
  let shown = false;
  try {
    const sheet = await sheetOf(desk, id);
    if (sheet !== undefined && (await isSafe(desk))) {
      show(desk, sheet, hold);
      shown = true;
    }
  } finally {
    if (!shown) hold?.release();
  }
  return shown;
}

/** Opens the last sound earlier version as a project of its own. */
export async function openEarlier(desk: Desk, id: string): Promise<void> {
  const [version] = await desk.options.port.versions(id);
  const { setNotice } = desk.options.store.getState();
  if (version === undefined) {
    setNotice({ code: 'no-earlier-version', detail: { title: listedTitle(desk, id) }, kind: 'problem' });
    return;
  }
  await openText(desk, version.text, version.title);
}

/** Opens the text of a project file as a project of its own; whether it could be read and is at hand. */
export async function openText(desk: Desk, text: string, name: string): Promise<boolean> {
  const project = readProject(text);
  if (!project.ok) {
    const [{ code, detail }] = project.problems;
    desk.options.store.getState().setNotice({ code, detail: textDetail({ name, ...detail }), kind: 'problem' });
    return false;
  }
  if (!(await isSafe(desk))) return false;
  await showAsOwn(desk, project.value, text);
  return true;
}

/** Removes a project with its earlier versions, unless it is at hand in this tab or another. */
export async function remove(desk: Desk, id: string): Promise<void> {
  if (id === desk.id) return;
  const hold = await desk.locks.claim(id);
  if (hold === undefined) {
    const detail = { title: listedTitle(desk, id) };
    desk.options.store.getState().setNotice({ code: 'held-elsewhere', detail, kind: 'problem' });
    return;
  }
  await desk.options.port.remove(id).finally(() => hold.release());
  await refreshList(desk);
}

/** The stored text of a project, whole or not. */
export async function rawText(desk: Desk, id: string): Promise<string | undefined> {
  const reading = await desk.options.port.read(id);
  if (reading.state === 'absent') return undefined;
  return reading.state === 'sound' ? reading.record.text : reading.text;
}
