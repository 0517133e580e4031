/**
 * A log converted against the same log read: what flows, totals and chart cost beside the parse, and what the output
 * costs beside them. Then the memory of the conversion of a million rows and of ten.
 */
import { spawnSync } from 'node:child_process';
import { join } from 'node:path';
import { openLog } from '../../src/core/log/log.ts';
import type { LogPlan } from '../../src/core/log/plan.ts';
import { openRows } from '../../src/core/log/rows.ts';
import { exampleBytes, midnight, planOf } from '../core/log/example.ts';
import { compare, type Ratio, type Work } from './pairs.ts';
import type { Line } from './report.ts';

const DAY = 86_400;
const PIECE = 1 << 18;
const PAIRS = 15;

/** One day of the example after another, in the same bytes: a log without an end. */
function endless(): () => Uint8Array {
  const bytes = exampleBytes();
  const starts: number[] = [];
  for (let at = bytes.indexOf(10) + 1; at > 0 && at < bytes.length; at = bytes.indexOf(10, at) + 1) starts.push(at);
  let day = 0;
  return () => {
    const date = new TextEncoder().encode(new Date((midnight + day * DAY) * 1000).toISOString().slice(0, 10));
    for (const at of starts) bytes.set(date, at);
    day += 1;
    return day === 1 ? bytes : bytes.subarray(starts[0]);
  };
}

/** Takes a day at a time. */
function byDays(push: (piece: Uint8Array) => void, told: () => number): Work {
  const next = endless();
  return (count) => {
    for (let done = 0; done < count; done += 1) {
      const bytes = next();
      for (let at = 0; at < bytes.length; at += PIECE) push(bytes.subarray(at, at + PIECE));
    }
    return told();
  };
}

/** Reads and parses, and looks at every figure. */
function reading({ mapping }: LogPlan): Work {
  let sum = 0;
  const rows = openRows(mapping, ({ size, time, signal, pressure, temperature }) => {
    for (let at = 0; at < size; at += 1)
      sum += (time[at] as number) + (signal[at] as number) + (pressure?.[at] ?? 0) + (temperature?.[at] ?? 0);
  });
  return byDays(rows.push, () => sum);
}

function converting(plan: LogPlan, written: boolean): Work {
  let size = 0;
  const count = (part: Uint8Array): void => {
    size += part.length;
  };
  const log = written ? openLog(plan, count) : openLog(plan);
  return byDays(log.push, () => log.rows + size);
}

/** The surfaces that a day asks for, built anew for every log: time of the first day less that of the second. */
function surfaces(plan: LogPlan): number {
  const log = openLog(plan);
  const next = endless();
  const times = [0, 1].map(() => {
    const bytes = next();
    const started = performance.now();
    log.push(bytes);
    return (performance.now() - started) / 1000;
  });
  return (times[0] ?? 0) - (times[1] ?? 0);
}

/** Share of the throughput of reading alone that is left. */
const shareLine = (name: string, { median, lower, upper, ...rest }: Ratio, target: string): Line => ({
  name,
  value: 100 / median,
  unit: '%',
  ratio: { median: 100 / median, lower: 100 / upper, upper: 100 / lower, ...rest },
  target,
});

/** Largest memory of a process that converts so many rows, MB. */
function peak(root: string, rows: number): number {
  const { stdout, stderr, status } = spawnSync(
    process.execPath,
    [join(root, 'tests/run.mjs'), '--built', 'tests/bench/conversion-peak.ts', String(rows)],
    { cwd: root, encoding: 'utf8' },
  );
  const found = /^(\d+) rows, (\d+) kB$/m.exec(stdout);
  if (status !== 0 || Number(found?.[1]) !== rows) throw new Error(`expected ${rows} rows, got ${stdout}${stderr}`);
  return Number(found?.[2]) / 1000;
}

export function conversion(root: string): Line[] {
  const plan = planOf(exampleBytes({ seconds: 2000 }));
  const read = reading(plan);
  const [counted, written] = [converting(plan, false), converting(plan, true)];
  const [million, tenMillion] = [peak(root, 1e6), peak(root, 1e7)];
  return [
    shareLine('a log: throughput of converting, of that of reading', compare(counted, read, PAIRS), '>= 60 %'),
    shareLine('the same with the output written', compare(written, read, PAIRS), '>= 40 %'),
    { name: 'surfaces of a log, once', value: surfaces(plan), unit: 's' },
    { name: 'most memory, a million rows', value: million, unit: 'MB' },
    { name: 'most memory, ten million rows', value: tenMillion, unit: 'MB' },
    { name: 'growth between them', value: tenMillion - million, unit: 'MB', target: '<= 16 MB' },
  ];
}
