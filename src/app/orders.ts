/** Carries out the commands of the screen and reports through the store. No order runs twice at a time. */
import { causeOf } from '../persist/autosave.ts';
import { type FileHandle, fileNameOf, type Opened, openFile, readFile, saveFile } from '../persist/files.ts';
import { isLogName } from '../persist/log-files.ts';
import type { Commands } from '../state/commands.ts';
import { textOf } from '../state/text.ts';
import type { Notice } from '../state/workbench.ts';
import { type Desk, isSafe, listedTitle } from './desk.ts';
import type { LogOrders } from './logs.ts';
import { titleOf } from './project-text.ts';
import { takeOver, workOnCopy } from './sharing.ts';
import { openEarlier, openEmpty, openKept, openText, rawText, remove } from './shelf.ts';

const EXAMPLE = 'examples/tern-island.headwright.json';

export interface OrdersOptions {
  readonly desk: Desk;
  readonly logs: LogOrders;
  /** Starts the new version of the program; undefined while there is none. */
  readonly newVersion: () => (() => void) | undefined;
}

/** The file the project at hand came from or was last saved to. */
interface Place {
  id: string;
  handle: FileHandle | undefined;
}

export function createOrders({ desk, logs, newVersion }: OrdersOptions): Commands {
  const place: Place = { id: '', handle: undefined };
  const once = createOnce((notice) => desk.options.store.getState().setNotice(notice));
  return {
    newProject: () => once('new', () => openEmpty(desk)),
    openFile: () => once('open', async () => take(desk, place, await openFile())),
    openDropped: (file) =>
      once('open', async () =>
        isLogName(file.name) ? logs.openDroppedLog(file) : take(desk, place, await readFile(file)),
      ),
    saveFile: () => once('save', () => save(desk, place)),
    openExample: () => once('example', () => openExample(desk)),
    openKept: (id) => once('kept', () => openKept(desk, id)),
    openEarlier: (id) => once('earlier', () => openEarlier(desk, id)),
    removeKept: (id) => once('remove', () => remove(desk, id)),
    downloadRaw: (id) => once('raw', () => saveRaw(desk, id)),
    takeOver: () => once('take', () => takeOver(desk)),
    workOnCopy: () => once('copy', () => workOnCopy(desk)),
    applyUpdate: () =>
      once('update', async () => {
        if (await isSafe(desk)) newVersion()?.();
      }),
    openLog: () => once('log', logs.openLog),
    openExampleLog: () => once('log', logs.openExampleLog),
    convertLog: () => once('convert', logs.convertLog),
    cancelLog: logs.cancelLog,
    closeLog: logs.closeLog,
    saveConverted: logs.saveConverted,
    print: () => window.print(),
  };
}

type Once = (name: string, order: () => Promise<unknown>) => Promise<void>;

/** A second call while the first one runs joins it; a fault of the storage becomes a notice. */
function createOnce(report: (notice: Notice) => void): Once {
  const running = new Map<string, Promise<void>>();
  return (name, order) => {
    const at = running.get(name);
    if (at !== undefined) return at;
    const run = order()
      .then(() => undefined)
      .catch((fault: unknown) => report({ code: `storage-${causeOf(fault)}`, detail: {}, kind: 'problem' }))
      .finally(() => running.delete(name));
    running.set(name, run);
    return run;
  };
}

const say = (desk: Desk, kind: Notice['kind'], code: string, detail: Notice['detail'] = {}): void =>
  desk.options.store.getState().setNotice({ code, detail, kind });

async function take(desk: Desk, place: Place, opened: Opened): Promise<void> {
  if (opened.state === 'cancelled') return say(desk, 'info', 'open-cancelled');
  const { name } = opened;
  if (opened.state === 'failed') return say(desk, 'problem', opened.cause, { name });
  if (!(await openText(desk, opened.text, name))) return;
  place.id = desk.id;
  place.handle = opened.handle;
  desk.filed = opened.text;
  say(desk, 'info', 'file-opened', { name });
}

async function save(desk: Desk, place: Place): Promise<void> {
  const { store } = desk.options;
  store.getState().settle();
  const text = textOf(store.getState());
  const name = fileNameOf(titleOf(store.getState().project));
  const { id } = desk;
  const saved = await saveFile(text, name, place.id === id ? place.handle : undefined);
  if (saved.state === 'cancelled') return say(desk, 'info', 'save-cancelled');
  if (saved.state === 'failed') return say(desk, 'problem', saved.cause, { name: saved.name });
  if (desk.id === id) desk.filed = text;
  if (saved.state === 'downloaded') return say(desk, 'info', 'file-downloaded', { name });
  place.id = id;
  place.handle = saved.handle;
  say(desk, 'info', 'file-saved', { name: saved.name });
}

async function openExample(desk: Desk): Promise<void> {
  const text = await fetch(new URL(EXAMPLE, document.baseURI)).then(
    (answer) => (answer.ok ? answer.text() : undefined),
    () => undefined,
  );
  if (text === undefined) return say(desk, 'problem', 'example-missing');
  if (await openText(desk, text, EXAMPLE)) say(desk, 'info', 'example-opened');
}

async function saveRaw(desk: Desk, id: string): Promise<void> {
  const text = await rawText(desk, id);
  const title = listedTitle(desk, id);
  if (text === undefined) return say(desk, 'problem', 'stored-gone', { title });
  const saved = await saveFile(text, fileNameOf(`${title} as stored`));
  if (saved.state === 'failed') say(desk, 'problem', saved.cause, { name: saved.name });
}
