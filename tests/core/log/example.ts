/** A meter with a transmitter and the log of its day, as tests of conversions share them. */
import { decode } from '../../../src/core/document/codec.ts';
import type { MeterText, Project } from '../../../src/core/document/project.ts';
import { type ExampleLog, writeExample } from '../../../src/core/log/example.ts';
import { type Manner, openLog } from '../../../src/core/log/log.ts';
import { planLog } from '../../../src/core/log/look.ts';
import type { LogPlan } from '../../../src/core/log/plan.ts';
import type { LogResult } from '../../../src/core/result/log-record.ts';

export const steamMeter: MeterText = {
  tag: 'FE-2304',
  fluid: { kind: 'water' },
  upstream: { pressure: '39 bar(g)', temperature: '400 degC' },
  pipe: { bore: '193.7 mm', material: 'carbon-steel' },
  element: { kind: 'isa-1932-nozzle', bore: '125 mm', material: 'stainless-316' },
  duty: { maximum: '72 t/h' },
  find: 'differential',
  instrument: { kind: 'transmitter', lower: '0 mbar', upper: '600 mbar', signal: '4-20 mA', cutOff: '3 %' },
  log: {
    time: 'time',
    signal: { column: 'signal_mA', unit: 'mA' },
    pressure: { column: 'pressure_bar', unit: 'bar(g)' },
    temperature: { column: 'temperature_degC', unit: 'degC' },
    fallback: { pressure: '39 bar(g)' },
    maxGap: '10 s',
  },
};

export const projectOf = (meter: MeterText): Project => {
  const project = decode(JSON.stringify({ format: 'headwright', version: 1, meters: [meter] }));
  if (!project.ok) throw new Error(`expected a project, got ${JSON.stringify(project.problems)}`);
  return project.value;
};

export const midnight = Date.parse('2026-03-14T00:00:00Z') / 1000;

/** The bytes of an example log. */
export function exampleBytes(log: Partial<ExampleLog> = {}): Uint8Array {
  const pieces: Uint8Array[] = [];
  const usual = { from: midnight, seconds: 86_400, seed: 1, pressure: 39, temperature: 400 };
  writeExample({ ...usual, ...log }, (bytes) => pieces.push(bytes.slice()));
  return Buffer.concat(pieces);
}

export function planOf(bytes: Uint8Array, meter: MeterText = steamMeter): LogPlan {
  const beginning = { first: bytes.subarray(0, 65_536), complete: bytes.length <= 65_536 };
  const plan = planLog({ meter, index: 0, project: projectOf(meter) }, beginning);
  if (!plan.ok) throw new Error(`expected a plan, got ${JSON.stringify(plan.problems)}`);
  return plan.value;
}

/** The record and the output of a log that is pushed in pieces of so many bytes. */
export function converted(bytes: Uint8Array, meter: MeterText = steamMeter, manner: Manner = {}, piece = 65_536) {
  const out: Uint8Array[] = [];
  const log = openLog(planOf(bytes, meter), (part) => out.push(part.slice()), manner);
  for (let at = 0; at < bytes.length; at += piece) log.push(bytes.subarray(at, at + piece));
  const result: LogResult = log.finish();
  return { result, text: new TextDecoder().decode(Buffer.concat(out)) };
}

/** A log of a few rows, as text. */
export const logOf = (rows: readonly string[], header = 'time,signal_mA,pressure_bar,temperature_degC'): Uint8Array =>
  new TextEncoder().encode(`${[header, ...rows].join('\n')}\n`);
