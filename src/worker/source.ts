/** A log on the user's disk as a stream of bytes, unpacked where it is packed, through one buffer that is used again. */
import type { Beginning } from '../core/log/columns.ts';
import { type LogTrouble, trouble } from './protocol.ts';

export interface Source {
  readonly size: number; // of the file, bytes
  readonly packed: boolean;
  /** Bytes of the file that were read so far. */
  readonly bytes: number;
  /** The bytes of the log, piece by piece; a piece is overwritten once the next one is asked for. */
  pieces(): AsyncGenerator<Uint8Array, void>;
  /** Whether the file is still the one that was opened, and was read to its end. */
  complete(): Promise<boolean>;
}

const PIECE = 1 << 18;
const BEGINNING = 1 << 16;
const [PACKED_1, PACKED_2] = [0x1f, 0x8b]; // RFC 1952, 2.3.1

export async function openSource(file: Blob): Promise<Source> {
  const mark = new Uint8Array(await file.slice(0, 2).arrayBuffer());
  const packed = mark[0] === PACKED_1 && mark[1] === PACKED_2;
  const read = { bytes: 0 };
  return {
    size: file.size,
    packed,
    get bytes() {
      return read.bytes;
    },
    pieces: () => (packed ? unpackedPieces(file, read) : plainPieces(file, read)),
    complete: async () => {
      await file.slice(0, 1).arrayBuffer(); // throws when the file is another one by now
      return read.bytes === file.size;
    },
  };
}

interface Read {
  bytes: number;
}

async function* plainPieces(file: Blob, read: Read): AsyncGenerator<Uint8Array, void> {
  const stream = file.stream();
  const reader = withOwnBuffer(stream);
  if (reader === undefined) {
    for await (const piece of handedOver(stream.getReader())) {
      read.bytes += piece.length;
      yield piece;
    }
    return;
  }
  let buffer = new ArrayBuffer(PIECE);
  try {
    for (;;) {
      const { done, value } = await reader.read(new Uint8Array(buffer));
      if (done || value === undefined) return;
      read.bytes += value.length;
      yield value;
      buffer = value.buffer;
    }
  } finally {
    await reader.cancel().catch(() => undefined); // nothing is left to cancel after the end or a fault
  }
}

type Stream = ReadableStream<Uint8Array<ArrayBuffer>>;

/** A reader that fills our own buffer; undefined in a browser that has none for files. */
function withOwnBuffer(stream: Stream): ReadableStreamBYOBReader | undefined {
  try {
    return stream.getReader({ mode: 'byob' });
  } catch {
    return undefined; // the pieces that the browser hands over are read instead
  }
}

async function* handedOver(reader: ReadableStreamDefaultReader<Uint8Array<ArrayBuffer>>) {
  try {
    for (let next = await reader.read(); !next.done; next = await reader.read()) yield next.value;
  } finally {
    await reader.cancel().catch(() => undefined); // nothing is left to cancel after the end or a fault
  }
}

async function* unpackedPieces(file: Blob, read: Read): AsyncGenerator<Uint8Array, void> {
  const counted = new TransformStream<Uint8Array<ArrayBuffer>, Uint8Array<ArrayBuffer>>({
    transform: (chunk, to) => {
      read.bytes += chunk.length;
      to.enqueue(chunk);
    },
  });
  const reader = file.stream().pipeThrough(counted).pipeThrough(new DecompressionStream('gzip')).getReader();
  try {
    for (;;) {
      const { done, value } = await reader.read().catch(toldApart);
      if (done) return;
      yield value;
    }
  } finally {
    await reader.cancel().catch(() => undefined); // the same
  }
}

/** A packed file that is cut, damaged, or has something behind its end. */
class BrokenPack extends Error {}

/** Of the faults of unpacking only those of the file itself are DOMExceptions. */
function toldApart(fault: unknown): never {
  if (fault instanceof DOMException) throw fault;
  throw new BrokenPack('expected a whole packed file, got a broken one', { cause: fault });
}

/** The first bytes, and the last ones where they can be had without reading all. */
export async function beginningOf(file: Blob): Promise<Beginning> {
  const { packed } = await openSource(file);
  if (packed) return firstUnpacked(file);
  const first = new Uint8Array(await file.slice(0, BEGINNING).arrayBuffer());
  if (file.size <= BEGINNING) return { first, complete: true };
  const last = new Uint8Array(await file.slice(-BEGINNING).arrayBuffer());
  return { first, complete: false, last };
}

async function firstUnpacked(file: Blob): Promise<Beginning> {
  const first = new Uint8Array(BEGINNING);
  let size = 0;
  for await (const piece of unpackedPieces(file, { bytes: 0 })) {
    const taken = piece.subarray(0, BEGINNING - size);
    first.set(taken, size);
    size += taken.length;
    if (taken.length < piece.length) return { first, complete: false };
  }
  return { first: first.subarray(0, size), complete: true };
}

/** What a fault of reading means; one that is not of the file is a defect. */
export function troubleOfReading(fault: unknown, at: { readonly bytes: number; readonly row: number }): LogTrouble {
  if (fault instanceof BrokenPack) return trouble('log-pack-broken', at);
  if (fault instanceof DOMException) return trouble('log-file-changed', at);
  throw fault;
}
