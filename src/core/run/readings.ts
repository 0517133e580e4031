/** The readings of a meter: instrument -> differential -> flow -> checks -> record, each row on its own. */
import { readReading } from '../input/reading.ts';
import { fail, type Outcome, ok, type Problem } from '../quantity/outcome.ts';
import type { Cell, Settled } from '../reading/contract.ts';
import { instrumentOf } from '../reading/registry.ts';
import type { ReadingRecord, Readings, RefusedReading, SolvedReading } from '../result/readings-record.ts';
import { type Extra, solveReading } from './reading.ts';
import { summaryOf } from './readings-summary.ts';
import type { Standing } from './standing.ts';

/** The readings of a meter, worked out on demand; nothing where its file has neither instrument nor readings. */
export function lateReadings(stands: Standing, extra: Extra): { readonly readings?: () => Readings } {
  const { instrument, readings } = stands.written;
  return instrument === undefined && readings === undefined ? {} : { readings: () => readingsOf(stands, extra) };
}

/** Every row of a meter that stands. A row's trouble refuses that row alone, the instrument's refuses all. */
export function readingsOf(stands: Standing, extra: Extra): Readings {
  const list = listOf(stands.written.readings);
  const instrument = instrumentOf(stands.written);
  const problems = [...(list.ok ? [] : list.problems), ...(instrument.ok ? [] : instrument.problems)];
  const count = list.ok ? list.value.length : 0;
  const rows: ReadingRecord[] = [];
  let inUse: Cell | undefined;
  for (let index = 0; index < count; index += 1) {
    const solved = instrument.ok ? readRow(stands, instrument.value, index, extra, inUse) : instrument;
    if (solved.ok) inUse = solved.value.inUse ?? inUse;
    rows.push(solved.ok ? solved.value.record : refusedRow(stands, index, solved.problems));
  }
  const known = instrument.ok ? { instrument: instrument.value.kind } : {};
  return { ...known, problems, rows, summary: summaryOf(stands, rows) };
}

/** Anything may stand in a file where the list should be. */
function listOf(written: unknown): Outcome<readonly unknown[]> {
  if (written === undefined) return ok([]);
  return Array.isArray(written) ? ok(written) : fail('list-expected', 'readings', { written: typeof written });
}

interface Row {
  readonly record: SolvedReading;
  readonly inUse?: Cell;
}

function readRow(
  stands: Standing,
  instrument: Settled,
  index: number,
  extra: Extra,
  inUse: Cell | undefined,
): Outcome<Row> {
  const reading = readReading(stands.written, index, instrument.asks, stands.site);
  if (!reading.ok) return reading;
  const context = { index, extra, ...(inUse === undefined ? {} : { inUse }) };
  return solveReading(stands, instrument, reading.value, context);
}

function refusedRow({ written }: Standing, index: number, problems: readonly [Problem, ...Problem[]]): RefusedReading {
  const row: unknown = written.readings?.[index];
  const time = typeof row === 'object' && row !== null && 'time' in row ? row.time : undefined;
  return {
    status: 'refused',
    ...(typeof time === 'string' ? { time } : {}),
    problem: problems[0],
    problems,
  };
}
