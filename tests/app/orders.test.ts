import { afterEach, beforeEach, describe, expect, test, vi } from 'vitest';

const picker = vi.hoisted(() => ({ fileOpen: vi.fn(), fileSave: vi.fn() }));
vi.mock('browser-fs-access', () => picker);

import { createDesk, type Desk } from '../../src/app/desk.ts';
import { createLogOrders } from '../../src/app/logs.ts';
import { createOrders } from '../../src/app/orders.ts';
import { start } from '../../src/app/shelf.ts';
import { createMemory } from '../../src/persist/memory.ts';
import type { Commands } from '../../src/state/commands.ts';
import { createWorkbench } from '../../src/state/create.ts';
import type { Notice, Workbench } from '../../src/state/workbench.ts';
import type { Client } from '../../src/worker/client.ts';
import { countingCore, source } from '../state/sample.ts';

/** No order of this file reaches the worker of logs. */
const client: Client = {
  run: ({ kind }) => {
    throw new Error(`expected no order for the worker, got ${kind}`);
  },
  stop: () => undefined,
};

let desk: Desk;
let commands: Commands;
let fault: Error | undefined;
let started: number;
const at = (): Workbench => desk.options.store.getState();
const said = (): [Notice['kind'] | undefined, string | undefined] => [at().notice?.kind, at().notice?.code];

const file = (text: string, handle?: object): File => Object.assign(new File([text], 'p.json'), handle && { handle });
const handleTo = (text: () => string) => ({ name: 'kept.json', getFile: async () => new File([text()], 'kept.json') });
const cancelled = new DOMException('closed', 'AbortError');

beforeEach(async () => {
  vi.resetAllMocks();
  [fault, started] = [undefined, 0];
  const memory = createMemory('no-database');
  let count = 0;
  desk = createDesk({
    store: createWorkbench(countingCore()),
    port: {
      ...memory,
      write: (...given) => (fault ? Promise.reject(fault) : memory.write(...given)),
      read: (id) => (fault ? Promise.reject(fault) : memory.read(id)),
    },
    locks: undefined,
    tab: { recall: () => undefined, note: () => undefined },
    newId: () => {
      count += 1;
      return `id-${count}`;
    },
  });
  commands = createOrders({
    desk,
    logs: createLogOrders({ store: desk.options.store, client, owner: 'page' }),
    newVersion: () => () => {
      started += 1;
    },
  });
  await start(desk);
});
afterEach(() => vi.unstubAllGlobals());

describe('files', () => {
  test('opened, then saved back to the same place, byte for byte', async () => {
    const handle = handleTo(() => source);
    picker.fileOpen.mockResolvedValueOnce(file(source, handle));
    await commands.openFile();
    expect([at().opened.source, said()]).toEqual([source, ['info', 'file-opened']]);
    let written = '';
    picker.fileSave.mockImplementationOnce(async (blob: Blob, _options: unknown, given: unknown) => {
      expect(given).toBe(handle);
      written = await blob.text();
      return handle;
    });
    await commands.saveFile();
    expect([written, said()]).toEqual([source, ['info', 'file-saved']]);
  });

  test('another project is not saved over the file of the one before', async () => {
    picker.fileOpen.mockResolvedValueOnce(
      file(
        source,
        handleTo(() => source),
      ),
    );
    await commands.openFile();
    await commands.newProject();
    picker.fileSave.mockResolvedValueOnce(null);
    await commands.saveFile();
    expect(picker.fileSave.mock.calls[0]?.[2]).toBeNull();
    expect(said()).toEqual(['info', 'file-downloaded']);
  });

  test('cancelled, refused and unreadable are told apart and change nothing', async () => {
    const before = at().project;
    picker.fileOpen.mockRejectedValueOnce(cancelled);
    await commands.openFile();
    expect(said()).toEqual(['info', 'open-cancelled']);
    picker.fileSave.mockRejectedValueOnce(cancelled);
    await commands.saveFile();
    expect(said()).toEqual(['info', 'save-cancelled']);
    picker.fileSave.mockRejectedValueOnce(new DOMException('no', 'NotAllowedError'));
    await commands.saveFile();
    expect(said()).toEqual(['problem', 'file-refused']);
    await commands.openDropped(file('not a project'));
    expect(said()).toEqual(['problem', 'not-json']);
    expect(at().project).toBe(before);
  });

  test('a double click is one order', async () => {
    picker.fileSave.mockResolvedValue(null);
    await Promise.all([commands.saveFile(), commands.saveFile(), commands.saveFile()]);
    expect(picker.fileSave).toHaveBeenCalledTimes(1);
  });
});

describe('the example', () => {
  beforeEach(() => vi.stubGlobal('document', { baseURI: 'http://127.0.0.1/' }));

  test('opens as a copy; the work at hand is kept', async () => {
    vi.stubGlobal('fetch', async () => new Response(source));
    at().addMeter();
    const mine = desk.id;
    await commands.openExample();
    expect([at().opened.source, said()]).toEqual([source, ['info', 'example-opened']]);
    expect(desk.id).not.toBe(mine);
    await commands.openKept(mine);
    expect(at().project.meters).toHaveLength(1);
  });

  test.each([
    ['missing', async () => new Response('', { status: 404 })],
    ['out of reach', () => Promise.reject(new TypeError('offline'))],
  ])('%s: told, and nothing changes', async (_name, fetch) => {
    vi.stubGlobal('fetch', fetch);
    const before = at().project;
    await commands.openExample();
    expect([at().project, said()]).toEqual([before, ['problem', 'example-missing']]);
  });
});

describe('a new version', () => {
  test('starts once the work is kept', async () => {
    at().addMeter();
    await commands.applyUpdate();
    expect([started, at().keeping.state]).toEqual([1, 'memory']);
  });

  test('does not start while the work cannot be kept', async () => {
    at().addMeter();
    fault = new Error('broken');
    await commands.applyUpdate();
    expect([started, said()]).toEqual([0, ['problem', 'not-kept']]);
  });
});

test('a storage that fails under an order is told', async () => {
  fault = new DOMException('closed', 'InvalidStateError') as unknown as Error;
  await commands.openKept('other');
  expect(said()).toEqual(['problem', 'storage-closed']);
});

test('a project is saved as it is stored, damaged or not', async () => {
  at().addMeter();
  await desk.autosave.flush();
  let written = '';
  picker.fileSave.mockImplementationOnce(async (blob: Blob) => {
    written = await blob.text();
    return null;
  });
  await commands.downloadRaw(desk.id);
  expect(JSON.parse(written)).toEqual(at().project);
  await commands.downloadRaw('none');
  expect(said()).toEqual(['problem', 'stored-gone']);
});
