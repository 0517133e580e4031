/** The log as a file: its bytes in pieces, unpacked where it is packed, and whether it stayed as it was. */
import { createReadStream } from 'node:fs';
import { type FileHandle, open, stat } from 'node:fs/promises';
import { createGunzip } from 'node:zlib';
import type { Beginning } from '../../core/log/columns.ts';

export interface Source {
  /** The first bytes, and what else tells of the columns. */
  readonly beginning: Beginning;
  /** The bytes after the beginning. */
  readonly rest: AsyncIterable<Uint8Array>;
  /** What has changed since it was opened, as a sentence; undefined where nothing has. */
  readonly change: () => Promise<string | undefined>;
  readonly close: () => void;
}

const PIECE = 1 << 18; // bytes read at once
const BEGINNING = 1 << 16; // bytes that the columns are looked at in
const LAST = 1 << 14;
const [PACKED_0, PACKED_1] = [0x1f, 0x8b]; // RFC 1952

/** Opens a log; throws what the system says where it cannot be read. */
export async function openSource(path: string, interrupt: AbortSignal): Promise<Source> {
  const before = await stat(path, { bigint: true });
  if (!before.isFile()) throw new Error('it is no file');
  const { packed, last } = await look(path, Number(before.size));
  const file = createReadStream(path, { highWaterMark: PIECE, signal: interrupt });
  const stream = packed ? file.pipe(createGunzip({ chunkSize: PIECE })) : file;
  file.on('error', (cause) => stream.destroy(cause));
  const pieces = stream[Symbol.asyncIterator]() as AsyncIterator<Uint8Array>;
  const { first, complete } = await firstOf(pieces);
  return {
    beginning: { first, complete, ...(packed || complete ? {} : { last }) },
    rest: { [Symbol.asyncIterator]: () => pieces },
    change: async () => {
      const after = await stat(path, { bigint: true }).catch(() => undefined);
      if (after === undefined || after.ino !== before.ino) return 'is no longer there';
      if (after.size !== before.size) return `had ${before.size} bytes and has ${after.size} now`;
      return after.mtimeNs === before.mtimeNs ? undefined : 'was written to';
    },
    close: () => {
      file.destroy();
      stream.destroy();
    },
  };
}

/** Whether it is packed, and its last bytes. */
async function look(path: string, size: number): Promise<{ packed: boolean; last: Uint8Array }> {
  const file = await open(path);
  try {
    const head = await bytesAt(file, 0, 2);
    const from = Math.max(0, size - LAST);
    return { packed: head[0] === PACKED_0 && head[1] === PACKED_1, last: await bytesAt(file, from, size - from) };
  } finally {
    await file.close();
  }
}

async function bytesAt(file: FileHandle, from: number, length: number): Promise<Uint8Array> {
  const { bytesRead, buffer } = await file.read(new Uint8Array(length), 0, length, from);
  return buffer.subarray(0, bytesRead);
}

/** As many of the first pieces as tell the columns. */
async function firstOf(pieces: AsyncIterator<Uint8Array>): Promise<{ first: Uint8Array; complete: boolean }> {
  const taken: Uint8Array[] = [];
  let size = 0;
  let complete = false;
  while (size < BEGINNING && !complete) {
    const { value, done } = await pieces.next();
    complete = done === true;
    if (!complete) {
      taken.push(value);
      size += value.length;
    }
  }
  const first = new Uint8Array(size);
  let at = 0;
  for (const piece of taken) {
    first.set(piece, at);
    at += piece.length;
  }
  return { first, complete };
}
