/**
 * Project files on the user's disk: opened by picker or drop, saved by picker or download. Cancelled, failed and
 * downloaded are three different answers. Text is carried byte for byte.
 */
import { fileOpen, fileSave } from 'browser-fs-access';

export type FileHandle = NonNullable<Awaited<ReturnType<typeof fileSave>>>;

export type Opened =
  | { readonly state: 'opened'; readonly name: string; readonly text: string; readonly handle?: FileHandle }
  | { readonly state: 'cancelled' }
  /** file-too-large, file-not-text, file-unreadable. */
  | { readonly state: 'failed'; readonly cause: string; readonly name: string };

export type Saved =
  | { readonly state: 'saved'; readonly name: string; readonly handle: FileHandle }
  | { readonly state: 'downloaded'; readonly name: string } // the browser decides where
  | { readonly state: 'cancelled' }
  /** file-refused (no permission), file-not-written (what stands there is not what was written). */
  | { readonly state: 'failed'; readonly cause: string; readonly name: string };

const ENDING = '.headwright.json';
const KIND = { description: 'Headwright project', extensions: ['.json'], mimeTypes: ['application/json'] };
export const MOST_BYTES = 5 * 1024 * 1024;

/** Asks for a file and reads it. */
export async function openFile(): Promise<Opened> {
  try {
    const file = await fileOpen({ ...KIND, mimeTypes: [...KIND.mimeTypes] });
    const opened = await readFile(file);
    return opened.state === 'opened' && file.handle !== undefined ? { ...opened, handle: file.handle } : opened;
  } catch (fault) {
    return isCancelled(fault) ? { state: 'cancelled' } : { state: 'failed', cause: 'file-unreadable', name: '' };
  }
}

/** Reads a file that was dropped or picked. */
export async function readFile(file: File): Promise<Opened> {
  const { name } = file;
  if (file.size > MOST_BYTES) return { state: 'failed', cause: 'file-too-large', name };
  let bytes: ArrayBuffer;
  try {
    bytes = await file.arrayBuffer();
  } catch {
    return { state: 'failed', cause: 'file-unreadable', name };
  }
  try {
    return { state: 'opened', name, text: new TextDecoder('utf-8', { fatal: true, ignoreBOM: true }).decode(bytes) };
  } catch {
    return { state: 'failed', cause: 'file-not-text', name };
  }
}

/** Saves to `handle`, or asks where; reads back what was written before it says so. */
export async function saveFile(text: string, name: string, handle?: FileHandle): Promise<Saved> {
  const blob = new Blob([text], { type: 'application/json' });
  try {
    const options = { ...KIND, mimeTypes: [...KIND.mimeTypes], fileName: name };
    const written = await fileSave(blob, options, handle ?? null);
    if (written === null) return { state: 'downloaded', name };
    const back = await readFile(await written.getFile());
    if (back.state !== 'opened' || back.text !== text) {
      return { state: 'failed', cause: 'file-not-written', name: written.name };
    }
    return { state: 'saved', name: written.name, handle: written };
  } catch (fault) {
    return isCancelled(fault) ? { state: 'cancelled' } : { state: 'failed', cause: 'file-refused', name };
  }
}

/** The name of a project's file: 'tern-island-works.headwright.json'. */
export function fileNameOf(title: string): string {
  const words = title
    .normalize('NFKC')
    .toLowerCase()
    .match(/[\p{L}\p{N}]+/gu) ?? ['project'];
  return `${words.join('-').slice(0, 80)}${ENDING}`;
}

const isCancelled = (fault: unknown): boolean => fault instanceof DOMException && fault.name === 'AbortError';
