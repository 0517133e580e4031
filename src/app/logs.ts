/**
 * The log at hand: opened at one meter, looked at anew whenever the meter or its columns change, converted by the worker.
 * It reports through the store, and is let go of with its meter.
 */
import type { MeterText, Project } from '../core/document/project.ts';
import { convertedName, download, pickLog } from '../persist/log-files.ts';
import type { Commands } from '../state/commands.ts';
import type { ConvertedLog, OpenLog } from '../state/logs.ts';
import type { Workbench, WorkbenchStore } from '../state/workbench.ts';
import type { Client, Job } from '../worker/client.ts';
import type { Ending, LogTrouble, Order } from '../worker/protocol.ts';

export interface LogDeskOptions {
  readonly store: WorkbenchStore;
  readonly client: Client;
  /** Name under which this page holds converted rows in the store of the browser. */
  readonly owner: string;
}

export type LogOrders = Pick<
  Commands,
  'openLog' | 'openExampleLog' | 'convertLog' | 'cancelLog' | 'closeLog' | 'saveConverted'
> & { openDroppedLog(file: File): void };

interface LogDesk extends LogDeskOptions {
  file: File | undefined;
  output: Blob | undefined;
  /** The conversion that runs. */
  job: Job | undefined;
  /** The look that runs, and its turn: an earlier one is out of date. */
  looking: Job | undefined;
  turn: number;
}

const EXAMPLE = 'example day.csv';
/** The columns of the example log. */
const EXAMPLE_COLUMNS = {
  time: 'time',
  signal: { column: 'signal_mA', unit: 'mA' },
  pressure: { column: 'pressure_bar', unit: 'bar(g)' },
  temperature: { column: 'temperature_degC', unit: 'degC' },
} as const;

export function createLogOrders(options: LogDeskOptions): LogOrders {
  const desk: LogDesk = { ...options, file: undefined, output: undefined, job: undefined, looking: undefined, turn: 0 };
  options.store.subscribe((state, before) => follow(desk, state, before));
  return {
    openLog: async () => {
      const file = await pickLog();
      if (file === undefined) options.store.getState().setNotice({ code: 'open-cancelled', detail: {}, kind: 'info' });
      else open(desk, file);
    },
    openDroppedLog: (file) => {
      if (open(desk, file)) window.location.hash = '#/read';
    },
    openExampleLog: () => openExample(desk),
    convertLog: () => convert(desk),
    cancelLog: () => desk.job?.cancel(),
    closeLog: () => close(desk),
    saveConverted: () => {
      const { log } = options.store.getState();
      if (desk.output !== undefined && log?.converted !== undefined) download(desk.output, log.converted.output.name);
    },
  };
}

/** The meter of the log at hand, with its place; undefined when it is gone. */
function meterOf({ project, keys, log }: Workbench): { readonly meter: MeterText; readonly index: number } | undefined {
  const index = log === undefined ? -1 : keys.indexOf(log.key);
  const meter = project.meters[index];
  return meter === undefined ? undefined : { meter, index };
}

/** What the worker is told of the meter and of the project around it. */
const ofMeter = (
  { site, base }: Project,
  at: { meter: MeterText; index: number },
): Extract<Order, { kind: 'look' }>['of'] => ({
  ...at,
  project: { ...(site ? { site } : {}), ...(base ? { base } : {}) },
});

function report({ store }: LogDesk, change: Partial<OpenLog>, without: readonly (keyof OpenLog)[] = []): void {
  const { log, setLog } = store.getState();
  if (log === undefined) return;
  const next = { ...log, ...change };
  for (const key of without) Reflect.deleteProperty(next, key);
  setLog(next);
}

/** Puts a file at the selected meter in place of the log at hand; false where there is no meter, or a log is on its way. */
function open(desk: LogDesk, file: File): boolean {
  const { keys, selected, log, setLog, setNotice } = desk.store.getState();
  const key = keys[selected];
  if (key === undefined || log?.progress !== undefined) {
    const code = key === undefined ? 'log-without-meter' : 'log-on-its-way';
    setNotice({ code, detail: { name: file.name }, kind: 'problem' });
    return false;
  }
  letGo(desk);
  desk.file = file;
  setLog({ key, name: file.name, bytes: file.size, troubles: [], cancelled: false });
  void look(desk);
  return true;
}

/** Ends what runs and forgets what was converted. */
function letGo(desk: LogDesk): void {
  desk.job?.cancel();
  desk.looking?.cancel();
  desk.job = undefined;
  desk.file = undefined;
  if (desk.output !== undefined) desk.client.run({ kind: 'tidy', owner: desk.owner });
  desk.output = undefined;
}

function close(desk: LogDesk): void {
  letGo(desk);
  desk.store.getState().setLog(undefined);
}

/** Looks again when the meter of the log is another one by now; lets go of the log with its meter. */
function follow(desk: LogDesk, state: Workbench, before: Workbench): void {
  if (state.log === undefined || state.log !== before.log || state.project === before.project) return;
  const [now, then] = [meterOf(state), meterOf(before)];
  if (now === undefined) close(desk);
  else if (
    now.meter !== then?.meter ||
    state.project.site !== before.project.site ||
    state.project.base !== before.project.base
  )
    void look(desk);
}

async function look(desk: LogDesk): Promise<void> {
  const { file, store } = desk;
  const at = meterOf(store.getState());
  if (file === undefined || at === undefined) return;
  desk.turn += 1;
  const { turn } = desk;
  desk.looking?.cancel();
  desk.looking = desk.client.run({ kind: 'look', file, of: ofMeter(store.getState().project, at) });
  const ending = await desk.looking.ended;
  if (turn !== desk.turn || desk.file !== file) return;
  if (ending.kind === 'looked') report(desk, { look: ending.look });
  if (ending.kind === 'refused') report(desk, { troubles: ending.troubles }, ['look']);
}

async function convert(desk: LogDesk): Promise<void> {
  const { file, store, owner, client } = desk;
  const { project, results } = store.getState();
  const at = meterOf(store.getState());
  const result = results.results[at?.index ?? -1];
  if (file === undefined || at === undefined || result === undefined || desk.job !== undefined) return;
  const order: Order = { kind: 'convert', file, owner, of: ofMeter(project, at) };
  report(desk, { troubles: [], cancelled: false, progress: begun(file) }, ['converted']);
  desk.output = undefined;
  const job = client.run(order, (progress) => report(desk, { progress }));
  desk.job = job;
  const ending = await job.ended;
  if (desk.job !== job) return;
  desk.job = undefined;
  settle(desk, ending, { meter: at.meter, project, result });
}

const begun = ({ size }: File) => ({ bytes: 0, ofBytes: size, rows: 0, rowsPerSecond: 0 });

function settle(desk: LogDesk, ending: Ending, by: Pick<ConvertedLog, 'meter' | 'project' | 'result'>): void {
  const { log } = desk.store.getState();
  if (ending.kind === 'converted' && log !== undefined) {
    const { record, seconds, output } = ending.converted;
    desk.output = output;
    const saved = { name: convertedName(log.name), bytes: output.size };
    report(desk, { converted: { ...by, record, seconds, output: saved } }, ['progress']);
    return;
  }
  const troubles: readonly LogTrouble[] = ending.kind === 'refused' ? ending.troubles : [];
  report(desk, { troubles, cancelled: ending.kind === 'cancelled' }, ['progress']);
  desk.client.run({ kind: 'tidy', owner: desk.owner });
}

/** Makes the example log; where the meter has no columns of a log yet, those of the example are written. */
async function openExample(desk: LogDesk): Promise<void> {
  const { store, client } = desk;
  const { project, selected, keys, writeAll, setNotice } = store.getState();
  const meter = project.meters[selected];
  if (meter === undefined) return;
  const { ended } = client.run({ kind: 'example', of: ofMeter(project, { meter, index: selected }) });
  const ending = await ended;
  if (store.getState().keys[store.getState().selected] !== keys[selected]) return;
  if (ending.kind !== 'written') {
    setNotice({ code: 'example-log-missing', detail: {}, kind: 'problem' });
    return;
  }
  if (meter.log === undefined) writeAll(Object.entries(EXAMPLE_COLUMNS).map(([key, value]) => [`log.${key}`, value]));
  open(desk, new File([ending.file], EXAMPLE, { type: 'text/csv' }));
}
