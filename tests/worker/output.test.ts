import { afterEach, beforeEach, describe, expect, test, vi } from 'vitest';
import { inFile, inMemory, OutputFull, openOutput, type SyncFile, tidyStore } from '../../src/worker/output.ts';

const bytesOf = (length: number, value = 1): Uint8Array => new Uint8Array(length).fill(value);
const MEBI = 1 << 20;

/** A file that remembers what is written, with room for so many bytes. */
function file(room = Number.POSITIVE_INFINITY) {
  const writes: { at: number; length: number }[] = [];
  const state = { closed: false, flushed: false, bytes: new Uint8Array(0) };
  const sync: SyncFile = {
    write: (bytes, { at }) => {
      if (at + bytes.length > room) throw new DOMException('no room', 'QuotaExceededError');
      writes.push({ at, length: bytes.length });
      const all = new Uint8Array(Math.max(state.bytes.length, at + bytes.length));
      all.set(state.bytes);
      all.set(bytes, at);
      state.bytes = all;
      return bytes.length;
    },
    flush: () => {
      state.flushed = true;
    },
    close: () => {
      state.closed = true;
    },
  };
  return { sync, writes, state };
}

describe('in a file', () => {
  test('writes 8 MiB at a time, in order, and all of it', async () => {
    const { sync, writes, state } = file();
    const remove = vi.fn(async () => undefined);
    const output = inFile(sync, async () => new Blob([state.bytes]), remove);
    const given = Array.from({ length: 50 }, (_, at) => bytesOf(MEBI / 2 + at, at));
    for (const bytes of given) output.write(bytes);
    const whole = await output.finish();
    expect(Buffer.from(await whole.arrayBuffer()).equals(Buffer.concat(given))).toBe(true);
    for (const { length } of writes.slice(0, -1)) expect(length).toBeGreaterThan(7 * MEBI);
    expect([state.flushed, state.closed, remove.mock.calls.length]).toEqual([true, true, 0]);
  });

  test('a buffer that is used again does not change what was written', async () => {
    const { sync, state } = file();
    const output = inFile(
      sync,
      async () => new Blob([state.bytes]),
      async () => undefined,
    );
    const bytes = bytesOf(3, 1);
    output.write(bytes);
    bytes.fill(9);
    expect([...new Uint8Array(await (await output.finish()).arrayBuffer())]).toEqual([1, 1, 1]);
  });

  test('a store that is full', () => {
    const { sync } = file(10 * MEBI);
    const output = inFile(
      sync,
      async () => new Blob(),
      async () => undefined,
    );
    const fill = (): void => {
      for (let at = 0; at < 30; at += 1) output.write(bytesOf(MEBI));
    };
    expect(fill).toThrow(OutputFull);
  });

  test('discarded: closed and removed', async () => {
    const { sync, state } = file();
    const remove = vi.fn(async () => undefined);
    await inFile(sync, async () => new Blob(), remove).discard();
    expect([state.closed, remove.mock.calls.length]).toEqual([true, 1]);
  });
});

describe('in memory', () => {
  test('keeps copies, up to its limit', async () => {
    const output = inMemory(10);
    const bytes = bytesOf(6, 1);
    output.write(bytes);
    bytes.fill(9);
    expect(() => output.write(bytes)).toThrow(OutputFull);
    expect([...new Uint8Array(await (await output.finish()).arrayBuffer())]).toEqual([1, 1, 1, 1, 1, 1]);
  });
});

describe('the store of the browser', () => {
  let names: Set<string>;
  const { sync } = file();
  const folder = {
    keys: () => names.values(),
    removeEntry: async (name: string) => void names.delete(name),
    getFileHandle: async (name: string) => {
      names.add(name);
      return { createSyncAccessHandle: async () => sync, getFile: async () => new Blob(['kept']) };
    },
  };
  const storage = {
    getDirectory: async () => ({ getDirectoryHandle: async () => folder }),
  } as unknown as StorageManager;

  beforeEach(() => {
    names = new Set(['this.csv', 'other.csv', 'gone.csv']);
    vi.stubGlobal('navigator', { locks: { query: async () => ({ held: [{ name: 'this' }, { name: 'other' }] }) } });
  });
  afterEach(() => vi.unstubAllGlobals());

  test('a new output takes the place of the last one, and of those of pages that are gone', async () => {
    const output = await openOutput('this', storage, 100);
    expect([...names].sort()).toEqual(['other.csv', 'this.csv']);
    await output.discard();
    expect([...names]).toEqual(['other.csv']);
  });

  test('a store without room for it is no place for it', async () => {
    const short = Object.assign(Object.create(storage), {
      getDirectory: storage.getDirectory,
      estimate: async () => ({ quota: 1000, usage: 950 }),
    });
    const fault = await openOutput('this', short, 100).catch((cause: unknown) => cause);
    expect(fault instanceof OutputFull && fault.trouble).toEqual({
      code: 'log-store-short',
      field: 'log',
      detail: { free: 50, least: 100 },
    });
    expect(await openOutput('this', short, 50)).toBeDefined();
  });

  test('tidied: what other pages hold stays', async () => {
    await tidyStore('this', storage);
    expect([...names]).toEqual(['other.csv']);
  });

  test.each([
    ['no store', undefined],
    ['a store that is closed to this window', { getDirectory: () => Promise.reject(new DOMException('no')) }],
  ])('%s: memory', async (_, none) => {
    const output = await openOutput('this', none as StorageManager | undefined, 100);
    output.write(bytesOf(2));
    expect((await output.finish()).size).toBe(2);
    expect(names.size).toBe(3);
  });
});
