import { afterEach, beforeEach, describe, expect, test, vi } from 'vitest';
import { type Client, createClient, type Port } from '../../src/worker/client.ts';
import type { Ending, FromWorker, Order, ToWorker } from '../../src/worker/protocol.ts';

/** A worker that does what the test says. */
class FakeWorker implements Port {
  onmessage: Port['onmessage'] = null;
  onerror: Port['onerror'] = null;
  onmessageerror: Port['onmessageerror'] = null;
  readonly heard: ToWorker[] = [];
  alive = true;
  postMessage(message: ToWorker): void {
    this.heard.push(message);
  }
  terminate(): void {
    this.alive = false;
  }
  say(data: FromWorker): void {
    this.onmessage?.({ data });
  }
  jobs(): number[] {
    return this.heard.flatMap((message) => (message.kind === 'order' ? [message.job] : []));
  }
}

const order: Order = { kind: 'tidy', owner: 'page' };
const lost = { kind: 'refused', troubles: [{ code: 'log-worker-lost', field: 'log', detail: {} }] };
const progress = { bytes: 1, ofBytes: 2, rows: 3, rowsPerSecond: 4 };

let workers: FakeWorker[];
let client: Client;
const last = (): FakeWorker => {
  const found = workers.at(-1);
  if (found === undefined) throw new Error('expected a worker, got none');
  return found;
};
const end = (job: number, ending: Ending = { kind: 'tidied' }): void => last().say({ kind: 'ended', job, ending });

/** What a job ended with, once it has. */
function watched(ended: Promise<Ending>): { readonly at: () => Ending | undefined } {
  let seen: Ending | undefined;
  void ended.then((ending) => {
    seen = ending;
  });
  return { at: () => seen };
}

beforeEach(() => {
  vi.useFakeTimers();
  workers = [];
  client = createClient(() => {
    const worker = new FakeWorker();
    workers.push(worker);
    return worker;
  });
});
afterEach(() => vi.useRealTimers());

describe('the queue', () => {
  test('gives the worker one job at a time, in their order', async () => {
    const endings = [1, 2, 3].map(() => watched(client.run(order).ended));
    expect(last().jobs()).toEqual([1]);
    end(1);
    expect(last().jobs()).toEqual([1, 2]);
    end(2);
    end(3);
    await vi.advanceTimersByTimeAsync(0);
    expect(endings.map(({ at }) => at()?.kind)).toEqual(['tidied', 'tidied', 'tidied']);
    expect(workers).toHaveLength(1);
  });

  test('a job that waits is cancelled without the worker', async () => {
    client.run(order);
    const waiting = client.run(order);
    waiting.cancel();
    expect(await waiting.ended).toEqual({ kind: 'cancelled' });
    end(1);
    expect(last().heard.map(({ kind }) => kind)).toEqual(['order']);
  });

  test('progress goes to its own job', () => {
    const [first, second] = [vi.fn(), vi.fn()];
    client.run(order, first);
    client.run(order, second);
    last().say({ kind: 'progress', job: 1, progress });
    last().say({ kind: 'progress', job: 2, progress }); // of no job that runs
    expect([first.mock.calls, second.mock.calls]).toEqual([[[progress]], []]);
  });
});

describe('cancelling', () => {
  test('the worker leaves the job by itself', async () => {
    const job = client.run(order);
    job.cancel();
    expect(last().heard.at(-1)).toEqual({ kind: 'cancel', job: 1 });
    end(1, { kind: 'cancelled' });
    expect(await job.ended).toEqual({ kind: 'cancelled' });
    await vi.advanceTimersByTimeAsync(200);
    expect(last().alive).toBe(true);
  });

  test('a worker that does not hear is ended within 100 ms, and the next job gets a new one', async () => {
    const job = watched(client.run(order).ended);
    client.run(order).cancel();
    const running = client.run(order);
    expect(job.at()).toBeUndefined();
    end(1);
    running.cancel();
    await vi.advanceTimersByTimeAsync(100);
    expect(await running.ended).toEqual({ kind: 'cancelled' });
    expect(last().alive).toBe(false);
    client.run(order);
    expect([workers.length, last().alive]).toEqual([2, true]);
  });

  test('once it has ended, nothing', async () => {
    const job = client.run(order);
    end(1);
    job.cancel();
    await vi.advanceTimersByTimeAsync(200);
    expect([(await job.ended).kind, last().alive]).toEqual(['tidied', true]);
  });
});

describe('a worker that is lost', () => {
  test('one that falls silent is given up within 2 s, and the next job works', async () => {
    const job = watched(client.run(order).ended);
    const next = client.run(order);
    last().say({ kind: 'progress', job: 1, progress });
    await vi.advanceTimersByTimeAsync(1300);
    expect(job.at()).toBeUndefined();
    await vi.advanceTimersByTimeAsync(700);
    expect(job.at()).toEqual(lost);
    expect(workers.map(({ alive }) => alive)).toEqual([false, true]);
    end(2);
    expect((await next.ended).kind).toBe('tidied');
  });

  test.each([
    ['has told no progress yet', []],
    ['has said that it is busy', ['progress', 'busy']],
    ['has said so and that it is alive', ['progress', 'busy', 'alive']],
  ] as const)('one that %s has longer', async (_, said) => {
    const job = watched(client.run(order).ended);
    for (const kind of said) last().say(kind === 'progress' ? { kind, job: 1, progress } : { kind, job: 1 });
    await vi.advanceTimersByTimeAsync(9000);
    expect(job.at()).toBeUndefined();
    await vi.advanceTimersByTimeAsync(1000);
    expect(job.at()).toEqual(lost);
  });

  test('one that says it is alive is waited for', async () => {
    const job = watched(client.run(order).ended);
    for (let turn = 0; turn < 40; turn += 1) {
      await vi.advanceTimersByTimeAsync(500);
      last().say({ kind: 'alive', job: 1 });
    }
    expect(job.at()).toBeUndefined();
  });

  test.each(['error', 'messageerror'] as const)('one with %s is given up at once', async (kind) => {
    const job = client.run(order);
    const preventDefault = vi.fn();
    if (kind === 'error') last().onerror?.({ preventDefault });
    else last().onmessageerror?.();
    expect(await job.ended).toEqual(lost);
    expect(preventDefault).toHaveBeenCalledTimes(kind === 'error' ? 1 : 0);
    client.run(order);
    expect(workers).toHaveLength(2);
  });

  test('what it still says is not heard', async () => {
    const report = vi.fn();
    const job = watched(client.run(order, report).ended);
    const [dead] = workers;
    dead?.say({ kind: 'progress', job: 1, progress });
    report.mockClear();
    await vi.advanceTimersByTimeAsync(2000);
    const next = watched(client.run(order, report).ended);
    dead?.say({ kind: 'progress', job: 2, progress });
    dead?.say({ kind: 'ended', job: 2, ending: { kind: 'tidied' } });
    dead?.onerror?.({ preventDefault: () => undefined });
    await vi.advanceTimersByTimeAsync(0);
    expect([job.at(), next.at(), report.mock.calls]).toEqual([lost, undefined, []]);
  });
});

describe('an idle worker', () => {
  test('stops after a while, not while it has work', async () => {
    client.run(order);
    end(1);
    await vi.advanceTimersByTimeAsync(29_000);
    expect(last().alive).toBe(true);
    client.run(order);
    const beat = setInterval(() => last().say({ kind: 'alive', job: 2 }), 250);
    await vi.advanceTimersByTimeAsync(60_000);
    clearInterval(beat);
    expect(last().alive).toBe(true);
    end(2);
    await vi.advanceTimersByTimeAsync(31_000);
    expect(last().alive).toBe(false);
  });

  test('stop ends the worker and every job', async () => {
    const jobs = [client.run(order), client.run(order)];
    client.stop();
    expect(await Promise.all(jobs.map(({ ended }) => ended))).toEqual([{ kind: 'cancelled' }, { kind: 'cancelled' }]);
    expect(last().alive).toBe(false);
  });
});
