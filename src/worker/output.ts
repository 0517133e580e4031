/**
 * Where the converted rows go: a file of the browser's own store, written in large pieces and offered to the user when
 * it is whole; where there is no such store, memory up to a limit. What is not wanted any more is removed.
 */
import { type LogTrouble, trouble } from './protocol.ts';

export interface Output {
  /** Takes bytes that may be overwritten after the call. Throws an OutputFull. */
  write(bytes: Uint8Array): void;
  /** The whole output. Throws an OutputFull. */
  finish(): Promise<Blob>;
  /** Leaves nothing behind. */
  discard(): Promise<void>;
}

/** The output has no room; `trouble` says which. */
export class OutputFull extends Error {
  readonly trouble: LogTrouble;
  constructor(code: string, detail: LogTrouble['detail']) {
    super(`expected room for the converted rows, got ${code}`);
    this.trouble = trouble(code, detail);
  }
}

/** A file of the store as a worker opens it. */
export interface SyncFile {
  write(bytes: Uint8Array, at: { readonly at: number }): number;
  flush(): void;
  close(): void;
}

const FOLDER = 'converted';
const WRITE = 8 << 20; // bytes at once
export const MOST_IN_MEMORY = 256 << 20;

type Folder = FileSystemDirectoryHandle & { keys(): AsyncIterable<string> };
type WorkerFile = FileSystemFileHandle & { createSyncAccessHandle?(): Promise<SyncFile> };

/**
 * An output of at least so many bytes for a page; what the same page had before is removed. Throws an OutputFull where
 * the store has no room for it.
 */
export async function openOutput(owner: string, storage: StorageManager | undefined, least: number): Promise<Output> {
  const folder = await folderOf(storage);
  if (folder === undefined) return inMemory();
  await tidy(owner, folder);
  const { quota = Number.POSITIVE_INFINITY, usage = 0 } = (await storage?.estimate?.()) ?? {};
  if (quota - usage < least) throw new OutputFull('log-store-short', { free: Math.max(0, quota - usage), least });
  const name = `${owner}.csv`;
  const file: WorkerFile = await folder.getFileHandle(name, { create: true });
  const sync = await file.createSyncAccessHandle?.();
  if (sync === undefined) return inMemory();
  const remove = () => folder.removeEntry(name).catch(() => undefined); // another tab may have tidied up
  return inFile(sync, () => file.getFile(), remove);
}

/** The folder of the store; undefined where this browser has none, or lends none to this window. */
const folderOf = async (storage: StorageManager | undefined): Promise<Folder | undefined> =>
  storage?.getDirectory?.().then(
    (root) => root.getDirectoryHandle(FOLDER, { create: true }) as Promise<Folder>,
    () => undefined,
  );

/** Removes what a page had, and what pages left behind that are gone: each page that lives holds a lock of its name. */
export async function tidyStore(owner: string, storage: StorageManager | undefined): Promise<void> {
  const folder = await folderOf(storage);
  if (folder !== undefined) await tidy(owner, folder);
}

async function tidy(owner: string, folder: Folder): Promise<void> {
  const { held = [] } = (await (navigator.locks as LockManager | undefined)?.query()) ?? {};
  const living = new Set(held.flatMap(({ name }) => (name === undefined ? [] : [name])));
  const names: string[] = [];
  for await (const name of folder.keys()) names.push(name);
  const gone = names.filter((name) => name === `${owner}.csv` || !living.has(name.slice(0, -'.csv'.length)));
  for (const name of gone) await folder.removeEntry(name).catch(() => undefined); // still open in another tab: next time
}

/** Collects pieces and writes them at once. */
export function inFile(file: SyncFile, read: () => Promise<Blob>, remove: () => Promise<void>): Output {
  const buffer = new Uint8Array(WRITE);
  let [size, at] = [0, 0];
  const put = (): void => {
    try {
      const written = file.write(buffer.subarray(0, size), { at });
      if (written !== size) throw new OutputFull('log-store-full', { bytes: at + written });
    } catch (fault) {
      if (fault instanceof DOMException) throw new OutputFull('log-store-full', { bytes: at });
      throw fault;
    }
    at += size;
    size = 0;
  };
  return {
    write: (bytes) => {
      if (size + bytes.length > WRITE) put();
      buffer.set(bytes, size);
      size += bytes.length;
    },
    finish: async () => {
      put();
      file.flush();
      file.close();
      return read();
    },
    discard: async () => {
      file.close();
      await remove();
    },
  };
}

/** Parts in memory, for browsers without a store of files. */
export function inMemory(most = MOST_IN_MEMORY): Output {
  let parts: Uint8Array<ArrayBuffer>[] = [];
  let size = 0;
  return {
    write: (bytes) => {
      if (size + bytes.length > most) throw new OutputFull('log-memory-full', { most });
      parts.push(bytes.slice());
      size += bytes.length;
    },
    finish: async () => new Blob(parts, { type: 'text/csv' }),
    discard: async () => {
      parts = [];
    },
  };
}
