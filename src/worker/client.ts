/**
 * The page's side of the worker of logs: one job at a time, the others wait. A job can be cancelled; a worker that dies
 * or falls silent is given up with its job, and the next job gets a new one. An idle worker stops.
 */
import { type Ending, type FromWorker, type Order, type Progress, type ToWorker, trouble } from './protocol.ts';

/** The part of a Worker that is used. */
export interface Port {
  postMessage(message: ToWorker): void;
  terminate(): void;
  onmessage: ((event: { readonly data: FromWorker }) => void) | null;
  onerror: ((event: { preventDefault(): void }) => void) | null;
  onmessageerror: (() => void) | null;
}

export interface Job {
  /** How it ended; never fails. */
  readonly ended: Promise<Ending>;
  cancel(): void;
}

export interface Client {
  run(order: Order, report?: (progress: Progress) => void): Job;
  /** Ends the worker and all jobs. */
  stop(): void;
}

interface Waiting {
  readonly number: number;
  readonly order: Order;
  readonly report: (progress: Progress) => void;
  readonly settle: (ending: Ending) => void;
}

const TICK = 450; // ms
/** Ticks without a word after which the worker is lost: within 2 s. Counted, so that a computer that slept is no cause. */
const SILENT_TICKS = 4;
/** The same while it is being loaded, before it has told any progress, and while it has said that it is busy. */
const BUSY_TICKS = 22;
const CANCEL = 80; // ms that the worker has to leave a job by itself
const IDLE = 30_000; // ms

const LOST: Ending = { kind: 'refused', troubles: [trouble('log-worker-lost')] };
const CANCELLED: Ending = { kind: 'cancelled' };

/** The jobs, the worker, and what watches over it. */
interface Desk {
  readonly spawn: () => Port;
  readonly queue: Waiting[]; // the first is the one that runs
  port: Port | undefined;
  silent: number; // ticks
  /** Ticks that the worker may be silent. */
  patience: number;
  watch: ReturnType<typeof setInterval> | undefined;
  idle: ReturnType<typeof setTimeout> | undefined;
}

export function createClient(spawn: () => Port): Client {
  const desk: Desk = {
    spawn,
    queue: [],
    port: undefined,
    silent: 0,
    patience: BUSY_TICKS,
    watch: undefined,
    idle: undefined,
  };
  let jobs = 0;
  return {
    run: (order, report = () => undefined) => {
      jobs += 1;
      const number = jobs;
      const ended = new Promise<Ending>((settle) => desk.queue.push({ number, order, report, settle }));
      if (desk.queue.length === 1) begin(desk);
      return { ended, cancel: () => cancel(desk, number) };
    },
    stop: () => {
      drop(desk);
      for (const job of desk.queue.splice(0)) job.settle(CANCELLED);
    },
  };
}

/** Gives the worker the first job. */
function begin(desk: Desk): void {
  const [next] = desk.queue;
  if (next === undefined) return;
  clearTimeout(desk.idle);
  desk.port ??= open(desk);
  desk.silent = 0;
  desk.patience = BUSY_TICKS;
  desk.watch = setInterval(() => {
    desk.silent += 1;
    if (desk.silent >= desk.patience) lose(desk, LOST);
  }, TICK);
  desk.port.postMessage({ kind: 'order', job: next.number, order: next.order });
}

function open(desk: Desk): Port {
  const opened = desk.spawn();
  opened.onmessage = ({ data }) => {
    if (desk.port === opened) hear(desk, data);
  };
  const fail = (): void => {
    if (desk.port === opened) lose(desk, LOST);
  };
  opened.onerror = (event) => {
    event.preventDefault(); // the user reads it on the page
    fail();
  };
  opened.onmessageerror = fail;
  return opened;
}

function hear(desk: Desk, message: FromWorker): void {
  const [running] = desk.queue;
  if (running?.number !== message.job) return; // of a job that was given up
  desk.silent = 0;
  if (message.kind === 'busy') desk.patience = BUSY_TICKS;
  if (message.kind === 'progress') {
    desk.patience = SILENT_TICKS;
    running.report(message.progress);
  }
  if (message.kind === 'ended') end(desk, message.ending);
}

function end(desk: Desk, ending: Ending): void {
  clearInterval(desk.watch);
  desk.queue.shift()?.settle(ending);
  if (desk.queue.length > 0) begin(desk);
  else desk.idle = setTimeout(() => drop(desk), IDLE);
}

/** Gives the worker up with its job. */
function lose(desk: Desk, ending: Ending): void {
  drop(desk);
  end(desk, ending);
}

function drop(desk: Desk): void {
  clearInterval(desk.watch);
  clearTimeout(desk.idle);
  desk.port?.terminate();
  desk.port = undefined;
}

/** A job that waits is taken out; one that runs is left by the worker, or the worker is given up. */
function cancel(desk: Desk, number: number): void {
  const at = desk.queue.findIndex((job) => job.number === number);
  if (at > 0) desk.queue.splice(at, 1)[0]?.settle(CANCELLED);
  if (at !== 0) return;
  desk.port?.postMessage({ kind: 'cancel', job: number });
  setTimeout(() => {
    if (desk.queue[0]?.number === number) lose(desk, CANCELLED);
  }, CANCEL);
}
