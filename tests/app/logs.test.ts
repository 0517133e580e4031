import { afterEach, beforeEach, describe, expect, test, vi } from 'vitest';

const files = vi.hoisted(() => ({ pickLog: vi.fn(), download: vi.fn() }));
vi.mock('../../src/persist/log-files.ts', async (original) => ({ ...(await original<object>()), ...files }));

import { createLogOrders, type LogOrders } from '../../src/app/logs.ts';
import type { LogLook } from '../../src/core/result/log-look.ts';
import type { LogResult } from '../../src/core/result/log-record.ts';
import { createWorkbench } from '../../src/state/create.ts';
import { isCurrent } from '../../src/state/logs.ts';
import type { WorkbenchStore } from '../../src/state/workbench.ts';
import type { Ending, Order, Progress } from '../../src/worker/protocol.ts';
import { countingCore } from '../state/sample.ts';

interface Given {
  readonly order: Order;
  readonly report: (progress: Progress) => void;
  readonly end: (ending: Ending) => Promise<void>;
  cancelled: boolean;
}

const look = { columns: [], rows: [], problems: [] } as unknown as LogLook;
const record = { tag: 'FE-1101' } as unknown as LogResult;
const progress = { bytes: 5, ofBytes: 10, rows: 3, rowsPerSecond: 7 };
const file = new File(['time,dp\n'], 'march.csv.gz');

let store: WorkbenchStore;
let orders: LogOrders;
let given: Given[];
const log = () => store.getState().log;
const last = (kind: Order['kind']): Given => {
  const found = given.findLast(({ order }) => order.kind === kind);
  if (found === undefined) throw new Error(`expected an order ${kind}, got ${given.map(({ order }) => order.kind)}`);
  return found;
};

beforeEach(() => {
  vi.stubGlobal('window', { location: { hash: '' } });
  vi.resetAllMocks();
  given = [];
  store = createWorkbench(countingCore());
  store.getState().addMeter({ tag: 'FE-1101', pipe: { bore: '100 mm' } });
  store.getState().addMeter({ tag: 'FE-1102', pipe: { bore: '200 mm' } });
  store.getState().select(0);
  orders = createLogOrders({
    store,
    owner: 'page',
    client: {
      run: (order, report = () => undefined) => {
        let settle: (ending: Ending) => void = () => undefined;
        const ended = new Promise<Ending>((resolve) => {
          settle = resolve;
        });
        const end = async (ending: Ending): Promise<void> => {
          settle(ending);
          await ended;
          await Promise.resolve();
        };
        const job: Given = { order, report, end, cancelled: false };
        given.push(job);
        return {
          ended,
          cancel: () => {
            job.cancelled = true;
          },
        };
      },
      stop: () => undefined,
    },
  });
});
afterEach(() => vi.unstubAllGlobals());

async function opened(): Promise<void> {
  orders.openDroppedLog(file);
  await last('look').end({ kind: 'looked', look });
}

async function converted(): Promise<void> {
  await opened();
  void orders.convertLog();
  await last('convert').end({
    kind: 'converted',
    converted: { record, seconds: 2, output: new Blob(['1234']) },
  });
}

describe('opening', () => {
  test('a dropped log is looked at by the selected meter and shown where it is read', async () => {
    await opened();
    expect(log()).toMatchObject({ key: store.getState().keys[0], name: 'march.csv.gz', look, troubles: [] });
    expect(last('look').order).toMatchObject({ of: { index: 0, meter: { tag: 'FE-1101' } }, file });
    expect(window.location.hash).toBe('#/read');
  });

  test('a dialog that is closed is no fault', async () => {
    files.pickLog.mockResolvedValueOnce(undefined);
    await orders.openLog();
    expect([log(), store.getState().notice]).toMatchObject([undefined, { code: 'open-cancelled', kind: 'info' }]);
  });

  test('without a meter, or while another is converted, it is refused in words', async () => {
    await opened();
    void orders.convertLog();
    orders.openDroppedLog(new File([], 'next.csv'));
    expect(store.getState().notice).toMatchObject({ code: 'log-on-its-way', detail: { name: 'next.csv' } });
    await last('convert').end({ kind: 'cancelled' });
    store.getState().deleteMeter(0);
    store.getState().deleteMeter(0);
    orders.openDroppedLog(file);
    expect([log(), store.getState().notice?.code]).toEqual([undefined, 'log-without-meter']);
  });

  test('one that cannot be looked at says why', async () => {
    orders.openDroppedLog(file);
    const troubles = [{ code: 'log-empty', field: 'log', detail: {} }];
    await last('look').end({ kind: 'refused', troubles });
    expect(log()).toMatchObject({ troubles });
    expect(log()?.look).toBeUndefined();
  });
});

describe('the look', () => {
  test('follows the columns of its meter, not what else is written', async () => {
    await opened();
    store.getState().write('log.time', 'time');
    expect(given.filter(({ order }) => order.kind === 'look')).toHaveLength(2);
    store.getState().writeProject('title', 'Other');
    store.getState().select(1);
    store.getState().write('service', 'Other');
    expect(given.filter(({ order }) => order.kind === 'look')).toHaveLength(2);
    store.getState().writeProject('site.atmosphere', '990 mbar(a)');
    expect(given.filter(({ order }) => order.kind === 'look')).toHaveLength(3);
  });

  test('one that is out of date is not heard', async () => {
    orders.openDroppedLog(file);
    const [first] = given;
    store.getState().write('log.time', 'time');
    expect(first?.cancelled).toBe(true);
    await first?.end({ kind: 'looked', look });
    expect(log()?.look).toBeUndefined();
  });
});

describe('converting', () => {
  test('reports its progress, then what it came to and by what', async () => {
    await opened();
    void orders.convertLog();
    last('convert').report(progress);
    expect(log()?.progress).toEqual(progress);
    await last('convert').end({ kind: 'converted', converted: { record, seconds: 2, output: new Blob(['1234']) } });
    expect(log()?.progress).toBeUndefined();
    const { project } = store.getState();
    expect(log()?.converted).toMatchObject({ record, seconds: 2, output: { name: 'march converted.csv', bytes: 4 } });
    const shown = log()?.converted;
    if (shown === undefined) throw new Error('expected a converted log, got none');
    expect(isCurrent(shown, project.meters[0], project)).toBe(true);
    store.getState().write('pipe.bore', '101 mm');
    expect(isCurrent(shown, store.getState().project.meters[0], store.getState().project)).toBe(false);
  });

  test('a second click starts nothing', async () => {
    await opened();
    void orders.convertLog();
    void orders.convertLog();
    expect(given.filter(({ order }) => order.kind === 'convert')).toHaveLength(1);
  });

  test('cancelled: said so, nothing of it is left', async () => {
    await converted();
    void orders.convertLog();
    orders.cancelLog();
    expect(last('convert').cancelled).toBe(true);
    await last('convert').end({ kind: 'cancelled' });
    expect(log()).toMatchObject({ cancelled: true, troubles: [] });
    expect([log()?.progress, log()?.converted, last('tidy').order]).toEqual([
      undefined,
      undefined,
      { kind: 'tidy', owner: 'page' },
    ]);
    orders.saveConverted();
    expect(files.download).not.toHaveBeenCalled();
  });

  test('saved: the rows under their own name', async () => {
    await converted();
    orders.saveConverted();
    expect(files.download.mock.calls[0]?.[1]).toBe('march converted.csv');
  });

  test('closed with its meter, and with the project', async () => {
    await converted();
    store.getState().deleteMeter(0);
    expect(log()).toBeUndefined();
    expect(last('tidy').order).toEqual({ kind: 'tidy', owner: 'page' });
  });
});

test('the example log brings its columns where the meter has none, as one step of undo', async () => {
  void orders.openExampleLog();
  await last('example').end({ kind: 'written', file: new Blob(['time\n']) });
  await vi.waitFor(() => expect(log()?.name).toBe('example day.csv'));
  expect(store.getState().project.meters[0]?.log).toMatchObject({ time: 'time', signal: { unit: 'mA' } });
  store.getState().undo();
  expect(store.getState().project.meters[0]?.log).toBeUndefined();
});
