import { beforeEach, describe, expect, test } from 'vitest';
import { createDesk, type Desk, isSafe } from '../../src/app/desk.ts';
import { takeOver, workOnCopy } from '../../src/app/sharing.ts';
import { openEarlier, openEmpty, openKept, openText, rawText, remove, start } from '../../src/app/shelf.ts';
import { encode } from '../../src/core/document/codec.ts';
import { createMemory } from '../../src/persist/memory.ts';
import type { Port } from '../../src/persist/port.ts';
import { createWorkbench } from '../../src/state/create.ts';
import type { Workbench } from '../../src/state/workbench.ts';
import { lockManager } from '../persist/lock-manager.ts';
import { countingCore, project, source } from '../state/sample.ts';

let port: Port;
let locks: ReturnType<typeof lockManager>;
let count: number;
let fault: Error | undefined;

beforeEach(() => {
  const { transient: _transient, ...memory } = createMemory('');
  port = {
    ...memory,
    write: (...given) => (fault === undefined ? memory.write(...given) : Promise.reject(fault)),
    list: () => (fault === undefined ? memory.list() : Promise.reject(fault)),
  };
  locks = lockManager();
  [count, fault] = [0, undefined];
});

interface Tab {
  readonly desk: Desk;
  readonly at: () => Workbench;
  readonly noted: string[];
}

/** A tab of the browser; `recalled` is what it had at hand before. */
function newTab(recalled?: string): Tab {
  const store = createWorkbench(countingCore());
  const noted: string[] = [];
  const desk = createDesk({
    store,
    port,
    locks,
    tab: { recall: () => recalled, note: (id) => noted.push(id) },
    newId: () => {
      count += 1;
      return `id-${count}`;
    },
  });
  return { desk, at: () => store.getState(), noted };
}

async function startedTab(recalled?: string): Promise<Tab> {
  const tab = newTab(recalled);
  await start(tab.desk);
  return tab;
}

const keptText = async (id: string): Promise<string | undefined> => {
  const reading = await port.read(id);
  return reading.state === 'sound' ? reading.record.text : undefined;
};

describe('the start', () => {
  test('the first visit keeps nothing until something is typed', async () => {
    const { desk, at } = await startedTab();
    expect([at().keeping, at().projects, await port.list()]).toEqual([{ state: 'new' }, [], []]);
    at().addMeter();
    expect(at().keeping).toEqual({ state: 'pending' });
    expect(await desk.autosave.flush()).toBe(true);
    expect(at().keeping).toEqual({ state: 'kept', at: expect.stringMatching(/^\d\d:\d\d$/) });
    expect(await keptText('id-1')).toBe(encode(at().project));
  });

  test('the work is found again, with the bytes it came with', async () => {
    const first = await startedTab();
    await openText(first.desk, source, 'p.json');
    first.desk.hold?.release();
    const again = await startedTab();
    expect(again.at().project).toEqual(project);
    expect(again.at().opened.source).toBe(source);
    expect(again.at().keeping.state).toBe('kept');
    expect(again.at().projects).toMatchObject([{ id: first.desk.id, title: 'Tern Island works', current: true }]);
  });

  test('a tab finds its own project before the newest', async () => {
    await port.write(
      { id: 'old', title: 'old', text: encode({ ...project, title: 'old' }), formatVersion: 1 },
      0,
      'strict',
    );
    await port.write(
      { id: 'new', title: 'new', text: encode({ ...project, title: 'new' }), formatVersion: 1 },
      0,
      'strict',
    );
    expect((await startedTab('old')).at().project.title).toBe('old');
  });

  test('a damaged and a newer one are told and left alone', async () => {
    await port.write(
      { id: 'newer', title: 'N', text: '{"format":"headwright","version":2}', formatVersion: 2 },
      0,
      'strict',
    );
    const { desk, at } = await startedTab('newer');
    expect(at().notice).toMatchObject({ code: 'stored-newer', detail: { title: 'N' } });
    expect(at().projects).toMatchObject([{ id: 'newer', condition: 'newer', current: false }]);
    expect(at().keeping).toEqual({ state: 'new' });
    expect(await openKept(desk, 'newer')).toBe(false);
    expect(at().notice).toMatchObject({ code: 'newer-version', detail: { version: '2', known: '1' } });
    expect(await rawText(desk, 'newer')).toBe('{"format":"headwright","version":2}');
    at().addMeter();
    await desk.autosave.flush();
    expect(await keptText('newer')).toBe('{"format":"headwright","version":2}');
  });

  test('what was typed before the reading was done stays', async () => {
    await port.write({ id: 'old', title: 'old', text: source, formatVersion: 1 }, 0, 'strict');
    const { desk, at } = newTab();
    at().addMeter();
    const typed = at().project;
    await start(desk);
    expect(at().project).toBe(typed);
    expect([await keptText('old'), await keptText(desk.id)]).toEqual([source, encode(typed)]);
  });

  test('a storage that fails leaves the program at work and says so', async () => {
    fault = new DOMException('full', 'QuotaExceededError') as unknown as Error;
    const { desk, at } = await startedTab();
    expect(at().notice?.code).toBe('storage-no-space');
    at().addMeter();
    expect(await desk.autosave.flush()).toBe(false);
    expect(at().keeping).toEqual({ state: 'failed', cause: 'no-space' });
    expect(at().project.meters).toHaveLength(1);
  });
});

describe('the project at hand', () => {
  test('is kept before another takes its place', async () => {
    const { desk, at } = await startedTab();
    at().addMeter();
    const mine = encode(at().project);
    await openText(desk, source, 'p.json');
    expect([await keptText('id-1'), await keptText('id-2')]).toEqual([mine, source]);
    expect(at().canUndo).toBe(false);
    await openEmpty(desk);
    expect(at().project.meters).toEqual([]);
    expect(await openKept(desk, 'id-1')).toBe(true);
    expect(encode(at().project)).toBe(mine);
    expect(at().projects.map(({ id, current }) => [id, current])).toEqual(
      expect.arrayContaining([
        ['id-1', true],
        ['id-2', false],
      ]),
    );
  });

  test('does not leave while it cannot be kept, unless it is in a file', async () => {
    const { desk, at } = await startedTab();
    at().addMeter();
    fault = new Error('broken');
    const { project: mine } = at();
    expect(await openText(desk, source, 'p.json')).toBe(false);
    expect([at().project, at().notice?.code]).toEqual([mine, 'not-kept']);
    desk.filed = encode(mine);
    expect(await isSafe(desk)).toBe(true);
  });

  test('a file that cannot be read changes nothing', async () => {
    const { desk, at } = await startedTab();
    const before = at().project;
    expect(await openText(desk, '{"format":"other"}', 'p.json')).toBe(false);
    expect([at().project, at().notice]).toEqual([
      before,
      { code: 'not-headwright', detail: { name: 'p.json' }, kind: 'problem' },
    ]);
    expect(await openText(desk, `\ufeff${source}`, 'p.json')).toBe(true);
    expect(at().opened.source).toBe(`\ufeff${source}`);
  });

  test('an earlier version opens as a project of its own', async () => {
    const { desk, at } = await startedTab();
    await openEarlier(desk, 'none');
    expect(at().notice?.code).toBe('no-earlier-version');
    await openText(desk, source, 'p.json');
    const { id } = desk;
    at().write('service', 'changed');
    await desk.autosave.flush();
    await openEarlier(desk, id);
    expect(desk.id).not.toBe(id);
    expect(at().opened.source).toBe(source);
    expect(await keptText(id)).toContain('changed');
  });

  test('is not removed; another is', async () => {
    const { desk, at } = await startedTab();
    await openText(desk, source, 'p.json');
    const { id } = desk;
    await remove(desk, id);
    expect(await keptText(id)).toBe(source);
    await openEmpty(desk);
    const other = await startedTab(id);
    await remove(desk, id);
    expect([at().notice?.code, await keptText(id)]).toEqual(['held-elsewhere', source]);
    await openEmpty(other.desk);
    await new Promise((resolve) => setTimeout(resolve));
    await remove(desk, id);
    expect([await keptText(id), at().projects]).toEqual([undefined, []]);
  });
});

describe('two tabs', () => {
  async function two(): Promise<[Tab, Tab]> {
    const one = await startedTab();
    await openText(one.desk, source, 'p.json');
    return [one, await startedTab(one.desk.id)];
  }

  test('the second says that the project is elsewhere and writes nothing', async () => {
    const [one, other] = await two();
    expect(other.at().keeping).toEqual({ state: 'elsewhere' });
    other.at().write('service', 'from the second');
    expect(await other.desk.autosave.flush()).toBe(false);
    expect(await keptText(one.desk.id)).toBe(source);
  });

  test('taking over brings what the first has kept, also what it kept when asked', async () => {
    const [one, other] = await two();
    one.at().write('service', 'from the first');
    await takeOver(other.desk);
    expect(other.at().project.meters[0]?.service).toBe('from the first');
    expect(other.at().keeping.state).toBe('kept');
    expect(one.at().keeping).toEqual({ state: 'elsewhere' });
    other.at().write('service', 'from the second');
    expect(await other.desk.autosave.flush()).toBe(true);
    one.at().write('service', 'from the first again');
    expect(await one.desk.autosave.flush()).toBe(false);
    expect(await keptText(one.desk.id)).toBe(encode(other.at().project));
  });

  test('taking over an unchanged project keeps what was changed here', async () => {
    const [one, other] = await two();
    other.at().write('service', 'from the second');
    await takeOver(other.desk);
    expect(other.at().keeping.state).toBe('kept');
    expect(await keptText(one.desk.id)).toBe(encode(other.at().project));
  });

  test('changed in both, both are kept', async () => {
    const [one, other] = await two();
    one.at().write('service', 'from the first');
    other.at().write('service', 'from the second');
    await takeOver(other.desk);
    expect(other.at().notice?.code).toBe('both-changed');
    expect(other.desk.id).not.toBe(one.desk.id);
    expect(await keptText(one.desk.id)).toContain('from the first');
    expect(await keptText(other.desk.id)).toContain('from the second');
  });

  test('a copy goes its own way', async () => {
    const [one, other] = await two();
    await workOnCopy(other.desk);
    expect(other.at().keeping.state).toBe('kept');
    expect(await keptText(other.desk.id)).toBe(source);
    expect(one.at().keeping.state).toBe('kept');
  });

  test('no kept edit is lost over 500 seeded operations in either tab', async () => {
    const [one, other] = await two();
    const tabs = [one, other] as const;
    let seed = 20260314;
    const random = (below: number): number => {
      seed = (Math.imul(seed, 1664525) + 1013904223) >>> 0;
      return Math.floor((seed / 2 ** 32) * below);
    };
    const acknowledged = new Map<string, string>(); // by project, the edits said to be kept, in their order
    const serviceOf = (text: string | undefined): string => JSON.parse(text ?? '{}').meters?.[0]?.service ?? '';
    for (let step = 0; step < 500; step += 1) {
      const tab = tabs[random(2)] as Tab;
      const service = tab.at().project.meters[0]?.service ?? '';
      const dice = random(20);
      if (dice < 12) tab.at().write('service', `${service} ${step}`);
      else if (dice < 18) {
        if (await tab.desk.autosave.flush()) acknowledged.set(tab.desk.id, service);
      } else if (dice === 18) await takeOver(tab.desk);
      else await openKept(tab.desk, one.desk.id);
      for (const [id, edits] of acknowledged) expect(serviceOf(await keptText(id)).startsWith(edits)).toBe(true);
      expect(tabs.filter(({ desk }) => desk.autosave.at()?.id === one.desk.id).length).toBeLessThan(2);
    }
    expect(acknowledged.size).toBeGreaterThan(3); // projects that went their own way
  });
});
