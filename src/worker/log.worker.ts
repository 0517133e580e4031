/** The worker of logs: carries out one order after the other and tells how it ended. */
import { writeExampleOf } from '../core/log/example-of.ts';
import { lookAt, type OfMeter } from '../core/log/look.ts';
import { convert } from './conversion.ts';
import { openOutput, tidyStore } from './output.ts';
import { type Ending, type FromWorker, type Order, type ToWorker, trouble } from './protocol.ts';
import { beginningOf, troubleOfReading } from './source.ts';

const HEARTBEAT = 250; // ms

const cancelled = new Set<number>();
const post = (message: FromWorker): void => self.postMessage(message);

/** A turn of the event loop, quicker than a timer. */
const turn = new MessageChannel();
const pause = (): Promise<void> =>
  new Promise((resolve) => {
    turn.port1.onmessage = () => resolve();
    turn.port2.postMessage(0);
  });

self.addEventListener('message', ({ data }: MessageEvent<ToWorker>) => {
  if (data.kind === 'cancel') cancelled.add(data.job);
  else void serve(data.job, data.order);
});

async function serve(job: number, order: Order): Promise<void> {
  const beat = setInterval(() => post({ kind: 'alive', job }), HEARTBEAT);
  try {
    const ending = await carryOut(job, order);
    post({ kind: 'ended', job, ending });
  } catch (fault) {
    reportError(fault); // a defect: the page hears of it as an error of the worker
  } finally {
    clearInterval(beat);
    cancelled.delete(job);
  }
}

async function carryOut(job: number, order: Order): Promise<Ending> {
  if (order.kind === 'look') return look(order.of, order.file);
  if (order.kind === 'example') return example(order.of);
  const storage = navigator.storage as StorageManager | undefined;
  if (order.kind === 'tidy') {
    await tidyStore(order.owner, storage);
    return { kind: 'tidied' };
  }
  return convert(order.of, order.file, {
    now: () => performance.now(),
    pause,
    isCancelled: () => cancelled.has(job),
    announce: () => post({ kind: 'busy', job }),
    report: (progress) => post({ kind: 'progress', job, progress }),
    openOutput: () => openOutput(order.owner, storage, order.file.size),
  });
}

async function look(of: OfMeter, file: Blob): Promise<Ending> {
  try {
    const found = lookAt(of, await beginningOf(file));
    return found === undefined
      ? { kind: 'refused', troubles: [trouble('log-empty')] }
      : { kind: 'looked', look: found };
  } catch (fault) {
    return { kind: 'refused', troubles: [troubleOfReading(fault, { bytes: 0, row: 0 })] };
  }
}

function example(of: OfMeter): Ending {
  const parts: Uint8Array<ArrayBuffer>[] = [];
  const written = writeExampleOf(of, (bytes) => parts.push(bytes.slice()));
  return written.ok
    ? { kind: 'written', file: new Blob(parts, { type: 'text/csv' }) }
    : { kind: 'refused', troubles: written.problems };
}
