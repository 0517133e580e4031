import { IDBFactory } from 'fake-indexeddb';
import 'fake-indexeddb/auto';
import { beforeEach, describe, expect, test, vi } from 'vitest';
import { DATABASE, openDatabase } from '../../src/persist/indexeddb.ts';
import { createMemory } from '../../src/persist/memory.ts';
import type { Draft, Port } from '../../src/persist/port.ts';
import { MOST_VERSIONS } from '../../src/persist/record.ts';

let now = 0;
const clock = (): number => now;
const draft = (text: string, id = 'a', formatVersion = 1): Draft => ({
  id,
  title: `title of ${id}`,
  text,
  formatVersion,
});

beforeEach(() => {
  now = 1_700_000_000_000;
  vi.stubGlobal('indexedDB', new IDBFactory());
});

const forms: readonly [string, () => Promise<Port>][] = [
  ['the database', () => openDatabase({ now: clock })],
  ['memory', async () => createMemory('private', clock)],
];

describe.each(forms)('%s', (_name, open) => {
  test('gives back what was written, byte for byte', async () => {
    const port = await open();
    const text = '{ "title" : "Tern \u00e9\u2212\ud83d\udca7",\r\n"meters":[]}\n';
    expect(await port.read('a')).toEqual({ state: 'absent' });
    expect(await port.write(draft(text), 0, 'relaxed')).toEqual({ ok: true, revision: 1 });
    const reading = await port.read('a');
    if (reading.state !== 'sound') throw new Error(`expected a sound record, got ${reading.state}`);
    expect(reading.record).toMatchObject({ id: 'a', title: 'title of a', text, revision: 1, savedAt: now });
    expect(reading.record.hash).toMatch(/^fnv1a:[0-9a-f]{16}$/);
  });

  test('compares and sets: the second of two writers is refused and nothing of his is kept', async () => {
    const [one, two] = [await open(), await open()];
    const second = two.transient === undefined ? two : one; // memory is of one page only
    expect(await one.write(draft('first'), 0, 'relaxed')).toEqual({ ok: true, revision: 1 });
    expect(await second.write(draft('second'), 0, 'relaxed')).toEqual({ ok: false, cause: 'conflict' });
    expect(await second.write(draft('second'), 2, 'relaxed')).toEqual({ ok: false, cause: 'conflict' });
    expect(await second.read('a')).toMatchObject({ state: 'sound', record: { text: 'first', revision: 1 } });
  });

  test('of many writers at once on one revision exactly one is kept', async () => {
    const port = await open();
    const outcomes = await Promise.all(
      Array.from({ length: 20 }, (_, i) => port.write(draft(`text ${i}`), 0, 'relaxed')),
    );
    expect(outcomes.filter(({ ok }) => ok)).toHaveLength(1);
    expect(await port.read('a')).toMatchObject({ record: { text: `text ${outcomes.findIndex(({ ok }) => ok)}` } });
  });

  test('says that a project is gone', async () => {
    const port = await open();
    await port.write(draft('x'), 0, 'relaxed');
    await port.remove('a');
    expect(await port.write(draft('y'), 1, 'relaxed')).toEqual({ ok: false, cause: 'gone' });
    expect(await port.read('a')).toEqual({ state: 'absent' });
  });

  test('never overwrites a record of a newer format', async () => {
    const port = await open();
    await port.write(draft('of tomorrow', 'a', 2), 0, 'relaxed');
    expect(await port.write(draft('of today'), 1, 'strict')).toEqual({ ok: false, cause: 'newer' });
    expect(await port.read('a')).toMatchObject({ record: { text: 'of tomorrow' } });
  });

  test('sets aside explicit saves, at most ten, the newest first', async () => {
    const port = await open();
    for (let revision = 0; revision < 25; revision += 1)
      await port.write(draft(`text ${revision}`), revision, 'strict');
    const texts = (await port.versions('a')).map(({ text }) => text);
    expect(texts).toEqual(Array.from({ length: MOST_VERSIONS }, (_, i) => `text ${23 - i}`));
    expect(await port.versions('b')).toEqual([]);
  });

  test('sets aside typing every ten minutes only, also when the clock is put back', async () => {
    const port = await open();
    let revision = 0;
    const type = async (text: string): Promise<void> => {
      await port.write(draft(text), revision, 'relaxed');
      revision += 1;
    };
    for (let second = 0; second < 60; second += 1, now += 1000) await type(`second ${second}`);
    expect((await port.versions('a')).map(({ text }) => text)).toEqual(['second 0']);
    now += 10 * 60_000;
    await type('later');
    now -= 86_400_000;
    await type('yesterday');
    expect((await port.versions('a')).map(({ text }) => text)).toEqual(['later', 'second 59', 'second 0']);
  });

  test('lists the newest first and removes with all versions', async () => {
    const port = await open();
    await port.write(draft('1', 'old'), 0, 'strict');
    await port.write(draft('2', 'old'), 1, 'strict');
    now += 1;
    await port.write(draft('1', 'new'), 0, 'relaxed');
    expect((await port.list()).map(({ id, sound }) => [id, sound])).toEqual([
      ['new', true],
      ['old', true],
    ]);
    await port.remove('old');
    expect((await port.list()).map(({ id }) => id)).toEqual(['new']);
    expect(await port.versions('old')).toEqual([]);
  });
});

describe('what a page leaves that is closed', () => {
  const textOf = async (port: Port): Promise<unknown> => {
    const reading = await port.read('a');
    return reading.state === 'sound' ? [reading.record.text, reading.record.revision] : reading.state;
  };
  const kept = async (): Promise<Port> => {
    const port = await openDatabase({ now: clock });
    await port.write(draft('kept'), 0, 'relaxed');
    return port;
  };

  test('is asked for and committed before the call comes back', async () => {
    const port = await kept();
    const asked: string[] = [];
    const put = vi.spyOn(IDBObjectStore.prototype, 'put').mockImplementation(function (this: IDBObjectStore, value) {
      asked.push(`put ${value.text}`);
      return this.add(value);
    });
    const commit = vi.spyOn(IDBTransaction.prototype, 'commit').mockImplementation(() => void asked.push('commit'));
    port.leave(draft('last'), 1);
    expect(asked).toEqual(['put last', 'commit']);
    put.mockRestore();
    commit.mockRestore();
  });

  test('is taken up by the next reading, and the text before it is an earlier version', async () => {
    const port = await kept();
    port.leave(draft('last'), 1);
    expect(await textOf(await openDatabase({ now: clock }))).toEqual(['last', 2]);
    expect((await port.versions('a')).map(({ text }) => text)).toEqual(['kept']);
    expect(await port.write(draft('on'), 2, 'relaxed')).toEqual({ ok: true, revision: 3 });
    expect(await textOf(port)).toEqual(['on', 3]);
  });

  test('gives way to the write that follows where the page lives on', async () => {
    const port = await kept();
    port.leave(draft('last'), 1);
    expect(await port.write(draft('later'), 1, 'relaxed')).toEqual({ ok: true, revision: 2 });
    expect(await textOf(port)).toEqual(['later', 2]);
    expect((await port.versions('a')).map(({ text }) => text)).toEqual(['kept']);
  });

  test('never replaces what another tab wrote since', async () => {
    const port = await kept();
    await port.write(draft('of another tab'), 1, 'relaxed');
    port.leave(draft('late'), 1);
    expect(await textOf(port)).toEqual(['of another tab', 2]);
    await port.write(draft('of another tab again'), 2, 'relaxed');
    expect(await textOf(port)).toEqual(['of another tab again', 3]);
  });

  test('brings nothing back that was removed, and nothing into being', async () => {
    const port = await kept();
    port.leave(draft('last'), 1);
    await port.remove('a');
    port.leave(draft('new', 'b'), 0);
    expect([await textOf(port), await port.read('b')]).toEqual(['absent', { state: 'absent' }]);
  });
});

/** Changes a stored value behind the port's back. */
async function spoil(id: string, change: (stored: Record<string, unknown>) => unknown): Promise<void> {
  const database = await new Promise<IDBDatabase>((resolve, reject) => {
    const request = indexedDB.open(DATABASE);
    request.onsuccess = () => resolve(request.result);
    request.onerror = () => reject(request.error);
  });
  const transaction = database.transaction('projects', 'readwrite');
  const store = transaction.objectStore('projects');
  const got = store.get(id);
  got.onsuccess = () => store.put(change(got.result));
  await new Promise((resolve) => {
    transaction.oncomplete = resolve;
  });
  database.close();
}

describe('a damaged record', () => {
  const damages: readonly [string, (stored: Record<string, unknown>) => unknown, string][] = [
    ['cut off', (stored) => ({ ...stored, text: 'whole te' }), 'whole te'],
    ['one character changed', (stored) => ({ ...stored, text: 'whole tezt' }), 'whole tezt'],
    ['wrong hash', (stored) => ({ ...stored, hash: 'sha256:00' }), 'whole text'],
    ['no hash', ({ hash: _hash, ...stored }) => stored, 'whole text'],
    ['no text', ({ text: _text, ...stored }) => stored, '{"id":"a"'],
    ['revision is text', (stored) => ({ ...stored, revision: '1' }), 'whole text'],
  ];

  test.each(damages)('%s: is told, offered raw, and overwritten by nobody', async (_name, change, left) => {
    const port = await openDatabase({ now: clock });
    await port.write(draft('whole text'), 0, 'strict');
    await port.write(draft('other', 'b'), 0, 'strict');
    await spoil('a', change);
    const reading = await port.read('a');
    expect(reading.state).toBe('damaged');
    if (reading.state === 'damaged') expect(reading.text).toContain(left);
    expect((await port.list()).map(({ id, sound }) => [id, sound])).toContainEqual(['a', false]);
    expect(await port.read('b')).toMatchObject({ state: 'sound' });
    expect(await port.write(draft('new'), 0, 'relaxed')).toEqual({ ok: false, cause: 'conflict' });
  });
});

describe('a storage whose n-th call fails', () => {
  type Method = (...given: unknown[]) => unknown;

  /** From here on the n-th of these calls throws; tells how many there were. */
  function failAt(n: number): { count: number; restore: () => void } {
    const places: readonly [object, string][] = [
      [IDBDatabase.prototype, 'transaction'],
      [IDBObjectStore.prototype, 'get'],
      [IDBObjectStore.prototype, 'put'],
      [IDBObjectStore.prototype, 'delete'],
      [IDBObjectStore.prototype, 'openCursor'],
      [IDBObjectStore.prototype, 'getAllKeys'],
    ];
    const state = { count: 0, restore: () => vi.restoreAllMocks() };
    for (const [prototype, name] of places) {
      const original = (prototype as Record<string, Method>)[name] as Method;
      vi.spyOn(prototype as Record<string, Method>, name).mockImplementation(function (this: unknown, ...given) {
        state.count += 1;
        if (state.count === n) throw new DOMException('no room', 'QuotaExceededError');
        return original.apply(this, given);
      });
    }
    return state;
  }

  test('leaves the old state or the new one, whole, whatever n', async () => {
    const lost: unknown[] = [];
    const note = (cause: unknown): void => void lost.push(cause);
    process.on('unhandledRejection', note);
    let failures = 0;
    for (let n = 1; ; n += 1) {
      vi.stubGlobal('indexedDB', new IDBFactory());
      const port = await openDatabase({ now: clock });
      for (let revision = 0; revision < 12; revision += 1)
        await port.write(draft(`text ${revision}`), revision, 'strict');
      const before = [await port.read('a'), await port.versions('a')];
      const fault = failAt(n);
      const outcome = await port.write(draft('text 12'), 12, 'strict').catch((cause: unknown) => cause);
      fault.restore();
      const failed = outcome instanceof DOMException;
      if (failed) {
        failures += 1;
        expect(outcome.name).toBe('QuotaExceededError');
        expect([await port.read('a'), await port.versions('a')]).toEqual(before);
        expect(await port.write(draft('text 12'), 12, 'strict')).toEqual({ ok: true, revision: 13 });
      }
      expect(await port.read('a')).toMatchObject({ state: 'sound', record: { text: 'text 12', revision: 13 } });
      expect(await port.versions('a')).toHaveLength(MOST_VERSIONS);
      if (!failed) break;
    }
    expect(failures).toBe(8); // transaction, get, a last word, cursor, put aside, …
    process.off('unhandledRejection', note);
    expect(lost).toEqual([]);
  });

  test('a transaction that is undone at its end is a failure, not a save', async () => {
    const port = await openDatabase({ now: clock });
    await port.write(draft('kept'), 0, 'strict');
    const original = IDBObjectStore.prototype.put;
    vi.spyOn(IDBObjectStore.prototype, 'put').mockImplementation(function (this: IDBObjectStore, value: unknown) {
      const request = original.call(this, value);
      request.addEventListener('success', () => this.transaction.abort());
      return request;
    });
    await expect(port.write(draft('lost'), 1, 'strict')).rejects.toBeDefined();
    vi.restoreAllMocks();
    expect(await port.read('a')).toMatchObject({ record: { text: 'kept' } });
  });
});

test('a database that cannot be opened rejects', async () => {
  vi.stubGlobal('indexedDB', {
    open: () => {
      throw new DOMException('no store', 'UnknownError');
    },
  });
  await expect(openDatabase()).rejects.toThrow('no store');
});

test('a newer program that wants the database gets it after what is at hand is kept', async () => {
  const order: string[] = [];
  const port = await openDatabase({ now: clock, onWanted: async () => void order.push('kept') });
  await port.write(draft('mine'), 0, 'relaxed');
  await new Promise<void>((resolve, reject) => {
    const request = indexedDB.open(DATABASE, 2);
    request.onsuccess = () => {
      order.push('opened');
      request.result.close();
      resolve();
    };
    request.onerror = () => reject(request.error);
  });
  expect(order).toEqual(['kept', 'opened']);
  await expect(port.write(draft('more'), 1, 'relaxed')).rejects.toMatchObject({ name: 'VersionError' });
});
