/** Logs on the user's disk: picked, never read here; and what was converted, handed to the browser as a download. */
import { fileOpen } from 'browser-fs-access';

const ENDINGS = ['.csv', '.txt', '.tsv', '.dat', '.gz'];

/** Asks for a log; undefined when the user closes the dialog. */
export async function pickLog(): Promise<File | undefined> {
  try {
    return await fileOpen({ description: 'Log', extensions: ENDINGS });
  } catch (fault) {
    if (fault instanceof DOMException && fault.name === 'AbortError') return undefined;
    throw fault;
  }
}

/** Whether a file is a log by its name: a project file is none. */
export const isLogName = (name: string): boolean => ENDINGS.some((ending) => name.toLowerCase().endsWith(ending));

/** 'day.csv.gz' -> 'day converted.csv'. */
export const convertedName = (name: string): string =>
  `${name.replace(/\.gz$/i, '').replace(/\.\w{1,4}$/, '')} converted.csv`;

/** Offers bytes of any length as a download: the browser takes them from where they are kept. */
export function download(bytes: Blob, name: string): void {
  const address = URL.createObjectURL(bytes);
  const link = document.createElement('a');
  link.href = address;
  link.download = name;
  link.click();
  setTimeout(() => URL.revokeObjectURL(address), TAKEN);
}

/** ms after which the browser has the bytes of a download in hand. */
const TAKEN = 60_000;
