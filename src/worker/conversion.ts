/** One conversion: bytes from the file through the log to the output, with its progress, until it ends or is cancelled. */
import { type Log, openLog } from '../core/log/log.ts';
import { type OfMeter, planLog } from '../core/log/look.ts';
import { type Output, OutputFull } from './output.ts';
import { type Ending, type Progress, trouble } from './protocol.ts';
import { beginningOf, openSource, type Source, troubleOfReading } from './source.ts';

/** What a conversion needs from where it runs. */
export interface Surroundings {
  readonly now: () => number; // ms
  /** Lets messages come in. */
  readonly pause: () => Promise<void>;
  readonly isCancelled: () => boolean;
  readonly report: (progress: Progress) => void;
  /** Says that a surface is built, which takes a while. */
  readonly announce: () => void;
  readonly openOutput: () => Promise<Output>;
}

const REPORT = 100; // ms between two reports
const WORK = 20; // ms between two pauses
const LEAST_SLICE = 1 << 10;
const FIRST_SLICE = 1 << 14;
const MOST_SLICE = 1 << 18;
/** Rows that are worked on at once: few enough that a row through the whole calculation holds nobody up. */
const CHUNK_ROWS = 512;

/** Converts a log of a meter. */
export async function convert(of: OfMeter, file: Blob, around: Surroundings): Promise<Ending> {
  const begun = around.now();
  const place = { source: undefined as Source | undefined, log: undefined as Log | undefined };
  let output: Output | undefined;
  try {
    const plan = planLog(of, await beginningOf(file));
    if (!plan.ok) return { kind: 'refused', troubles: plan.problems };
    output = await around.openOutput();
    const { write } = output;
    place.source = await openSource(file);
    place.log = openLog(plan.value, write, { chunkRows: CHUNK_ROWS, announce: around.announce });
    if (!(await run(place.source, place.log, around, begun))) return await leave(output, { kind: 'cancelled' });
    if (!(await place.source.complete())) return await leave(output, changed(place.source, place.log));
    const record = place.log.finish();
    const seconds = (around.now() - begun) / 1000;
    return { kind: 'converted', converted: { record, output: await output.finish(), seconds } };
  } catch (fault) {
    const at = { bytes: place.source?.bytes ?? 0, row: place.log?.rows ?? 0 };
    const found = fault instanceof OutputFull ? fault.trouble : troubleOfReading(fault, at);
    return await leave(output, { kind: 'refused', troubles: [found] });
  }
}

const changed = ({ bytes }: Source, { rows }: Log): Ending => ({
  kind: 'refused',
  troubles: [trouble('log-file-changed', { bytes, row: rows })],
});

/** Leaves no part of an output that did not come to its end. */
async function leave(output: Output | undefined, ending: Ending): Promise<Ending> {
  await output?.discard();
  return ending;
}

/** Reads to the end; false when it was cancelled on the way. */
async function run(source: Source, log: Log, around: Surroundings, begun: number): Promise<boolean> {
  const { now, pause, isCancelled, report } = around;
  let slice = FIRST_SLICE;
  let [paused, reported] = [now(), Number.NEGATIVE_INFINITY];
  for await (const piece of source.pieces()) {
    for (let at = 0; at < piece.length; ) {
      const before = now();
      log.push(piece.subarray(at, at + slice));
      at += slice;
      const after = now();
      slice = nextSlice(slice, after - before);
      if (after - paused < WORK) continue;
      await pause();
      if (isCancelled()) return false;
      paused = now();
      if (paused - reported < REPORT) continue;
      reported = paused;
      report(progressOf(source, log, paused - begun));
    }
  }
  return !isCancelled();
}

/** Slices that take about half as long as the work between two pauses. */
function nextSlice(slice: number, took: number): number {
  if (took > WORK) return Math.max(LEAST_SLICE, slice / 2);
  return took < WORK / 4 ? Math.min(MOST_SLICE, slice * 2) : slice;
}

const SOON = 300; // ms before which a rate says nothing

function progressOf({ bytes, size }: Source, { rows }: Log, elapsed: number): Progress {
  const seconds = Math.max(elapsed, 1) / 1000;
  const left = elapsed > SOON && bytes > 0 ? { secondsLeft: (seconds * (size - bytes)) / bytes } : {};
  return { bytes, ofBytes: size, rows, rowsPerSecond: rows / seconds, ...left };
}
