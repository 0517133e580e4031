import { afterEach, beforeEach, describe, expect, test, vi } from 'vitest';
import { type Autosave, createAutosave, flushWhenHidden, type Standing } from '../../src/persist/autosave.ts';
import { createMemory } from '../../src/persist/memory.ts';
import type { Port } from '../../src/persist/port.ts';

let port: Port;
let text: string;
let standings: Standing[];
let writes: string[];
let fault: Error | undefined;
let hold: Promise<void> | undefined;
let autosave: Autosave;

beforeEach(() => {
  vi.useFakeTimers();
  vi.setSystemTime(new Date(2026, 2, 14, 14, 2));
  const { transient: _transient, ...memory } = createMemory('');
  [text, standings, writes, fault, hold] = ['', [], [], undefined, undefined];
  port = {
    ...memory,
    write: async (draft, expected, durability) => {
      writes.push(draft.text);
      await hold;
      if (fault !== undefined) throw fault;
      return memory.write(draft, expected, durability);
    },
  };
  autosave = createAutosave({
    port,
    draft: () => ({ title: 'T', text, formatVersion: 1 }),
    report: (standing) => standings.push(standing),
  });
});
afterEach(() => vi.useRealTimers());

const type = (typed: string): void => {
  text = typed;
  autosave.changed();
};
const wait = (time: number): Promise<unknown> => vi.advanceTimersByTimeAsync(time);
/** Hashing runs outside the clock that the test holds. */
const becomes = (state: Standing['state']): Promise<void> =>
  vi.waitFor(() => expect(standings.at(-1)?.state).toBe(state));

const stored = async (): Promise<unknown> => {
  const reading = await port.read('a');
  return reading.state === 'sound' ? [reading.record.text, reading.record.revision] : reading.state;
};

describe('autosave', () => {
  test('writes nothing before the project has been read, and nothing when nothing changed', async () => {
    type('early');
    await wait(60_000);
    expect([writes, standings, await autosave.flush()]).toEqual([[], [], false]);
    autosave.begin('a', 0);
    await wait(60_000);
    expect([writes, await autosave.flush()]).toEqual([[], true]);
  });

  test('writes once, at most a second after the last change, and says when it is kept', async () => {
    autosave.begin('a', 0);
    for (const typed of ['1', '12', '120']) {
      type(typed);
      await wait(300);
    }
    expect(writes).toEqual([]);
    expect(standings.at(-1)).toEqual({ state: 'pending' });
    const last = Date.now();
    await wait(700);
    await becomes('kept');
    expect(writes).toEqual(['120']);
    const told = standings.at(-1);
    expect(told?.state === 'kept' ? told.at - last : undefined).toBeLessThan(1000);
    expect(await stored()).toEqual(['120', 1]);
    expect(autosave.at()).toEqual({ id: 'a', revision: 1 });
  });

  test('says kept only for what is kept: a change during a write is written after it', async () => {
    autosave.begin('a', 0);
    let letGo = (): void => undefined;
    hold = new Promise((resolve) => {
      letGo = resolve;
    });
    type('first');
    const flushed = autosave.flush();
    type('second');
    letGo();
    expect(await flushed).toBe(false);
    expect(standings.at(-1)).toEqual({ state: 'pending' });
    expect(await autosave.flush()).toBe(true);
    expect(writes).toEqual(['first', 'second']);
    expect(await stored()).toEqual(['second', 2]);
  });

  test('two calls at once write once', async () => {
    autosave.begin('a', 0);
    type('x');
    expect(await Promise.all([autosave.flush('strict'), autosave.flush(), autosave.flush()])).toEqual([
      true,
      true,
      true,
    ]);
    expect(writes).toEqual(['x']);
  });

  test('after a failure it says so once, waits longer each time, and recovers by itself', async () => {
    autosave.begin('a', 0);
    fault = new DOMException('full', 'QuotaExceededError') as unknown as Error;
    type('a');
    await wait(700);
    for (let second = 0; second < 60; second += 1) {
      type(`a ${second}`);
      await wait(1000);
    }
    expect(writes.length).toBe(5); // at once, then after 4, 8, 16 and 32 s
    expect(standings.filter(({ state }) => state === 'failed')).toEqual([{ state: 'failed', cause: 'no-space' }]);
    fault = undefined;
    await wait(60_000);
    await becomes('kept');
    expect(await stored()).toEqual(['a 59', 1]);
    type('b');
    await wait(700);
    await becomes('kept');
    expect(await stored()).toEqual(['b', 2]);
  });

  test('a flush tries at once, also after failures', async () => {
    autosave.begin('a', 0);
    fault = new Error('broken');
    type('a');
    expect(await autosave.flush()).toBe(false);
    expect(standings.at(-1)).toEqual({ state: 'failed', cause: 'storage' });
    fault = undefined;
    expect(await autosave.flush()).toBe(true);
    expect(standings.at(-1)?.state).toBe('kept');
  });

  test.each([
    ['conflict', 1, { state: 'elsewhere' }],
    ['newer', 2, { state: 'failed', cause: 'newer' }],
  ] as const)('%s: stops and leaves the other record alone', async (_name, formatVersion, standing) => {
    await port.write({ id: 'a', title: '', text: 'theirs', formatVersion }, 0, 'strict');
    autosave.begin('a', formatVersion === 1 ? 0 : 1);
    type('mine');
    expect(await autosave.flush()).toBe(false);
    expect(standings.at(-1)).toEqual(standing);
    type('mine again');
    await wait(120_000);
    expect(await stored()).toEqual(['theirs', 1]);
    expect(writes).toEqual(['theirs', 'mine']);
  });

  test('a project that is gone is written anew, and told', async () => {
    let gone = 0;
    const { at, begin, changed, flush } = createAutosave({
      port,
      draft: () => ({ title: '', text: 'all of it', formatVersion: 1 }),
      report: () => undefined,
      onGone: () => {
        gone += 1;
      },
    });
    begin('a', 7);
    changed();
    expect([await flush(), gone, at()?.revision]).toEqual([true, 1, 1]);
    expect(await stored()).toEqual(['all of it', 1]);
  });

  test('what was written for one project is not told of the next', async () => {
    autosave.begin('a', 0);
    type('of a');
    const flushed = autosave.flush();
    autosave.begin('b', 4);
    expect(await flushed).toBe(true);
    expect(autosave.at()).toEqual({ id: 'b', revision: 4 });
    expect(await stored()).toEqual(['of a', 1]);
  });

  test('in memory it says that nothing lasts', async () => {
    const told: Standing[] = [];
    const inMemory = createAutosave({
      port: createMemory('no-database'),
      draft: () => ({ title: '', text: 'x', formatVersion: 1 }),
      report: (standing) => told.push(standing),
    });
    inMemory.begin('a', 0);
    inMemory.changed();
    expect(await inMemory.flush()).toBe(true);
    expect(told.at(-1)).toEqual({ state: 'memory', cause: 'no-database' });
  });

  test('leaves what is not yet kept within the call, and nothing when all is kept', async () => {
    const left: unknown[] = [];
    port = { ...port, leave: ({ id, text: last }, expected) => left.push([id, last, expected]) };
    autosave = createAutosave({ port, draft: () => ({ title: 'T', text, formatVersion: 1 }), report: () => undefined });
    autosave.leave();
    autosave.begin('a', 0);
    type('kept');
    expect(await autosave.flush()).toBe(true);
    autosave.leave();
    expect(left).toEqual([]);
    type('last');
    autosave.leave();
    expect(left).toEqual([['a', 'last', 1]]);
  });

  test('a page that is hidden leaves and keeps what it has at once', () => {
    const page = Object.assign(new EventTarget(), { visibilityState: 'visible' });
    const flush = vi.fn(async () => true);
    const leave = vi.fn();
    const end = flushWhenHidden(page as unknown as Document, { flush, leave });
    page.dispatchEvent(new Event('visibilitychange'));
    expect(flush).toHaveBeenCalledTimes(0);
    page.visibilityState = 'hidden';
    page.dispatchEvent(new Event('visibilitychange'));
    expect(flush).toHaveBeenCalledTimes(1);
    expect(leave).toHaveBeenCalledTimes(1);
    end();
    page.dispatchEvent(new Event('visibilitychange'));
    expect(flush).toHaveBeenCalledTimes(1);
  });
});
