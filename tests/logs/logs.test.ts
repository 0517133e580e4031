import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import type { LogText } from '../../src/core/document/v/1-log.ts';
import { readSite } from '../../src/core/input/site.ts';
import {
  type Chunk,
  PRESSURE_MISSING,
  TEMPERATURE_MISSING,
  TIME_REPEATED,
  TROUBLES,
} from '../../src/core/log/chunk.ts';
import { mapLog } from '../../src/core/log/columns.ts';
import type { Mapping } from '../../src/core/log/mapping.ts';
import { type LogEnd, openRows } from '../../src/core/log/rows.ts';
import type { Outcome, Problem } from '../../src/core/quantity/outcome.ts';

/** What every row of a log comes to; written by hand, or by another program than the one that is tested. */
interface Expected {
  readonly about: string;
  readonly log: LogText;
  readonly problems?: readonly Problem[];
  readonly rows?: readonly Row[];
  /** Relative distance from the exact figures that the step of a unit may make; none where it is not said. */
  readonly within?: number;
  readonly end?: Omit<LogEnd, 'rows' | 'samples'>;
}

interface Row {
  readonly row?: number;
  readonly time?: string | number;
  readonly signal?: number;
  readonly pressure?: number;
  readonly temperature?: number;
  readonly missing?: readonly string[];
  readonly trouble?: string;
}

const folder = import.meta.dirname;
const names = readdirSync(folder).flatMap((file) => (file.endsWith('.csv') ? [file.slice(0, -4)] : []));
const logs = names.map((name) => ({
  name,
  bytes: new Uint8Array(readFileSync(join(folder, `${name}.csv`))),
  expected: JSON.parse(readFileSync(join(folder, `${name}.json`), 'utf8')) as Expected,
}));

function mappingOf(log: LogText, bytes: Uint8Array): Outcome<Mapping> {
  const site = readSite({});
  if (!site.ok) throw new Error('expected a site, got none');
  return mapLog(log, { first: bytes, complete: true }, site.value);
}

const bits: readonly (readonly [number, string])[] = [
  [PRESSURE_MISSING, 'pressure'],
  [TEMPERATURE_MISSING, 'temperature'],
  [TIME_REPEATED, 'time-repeated'],
];

function rowsOf(chunk: Chunk): Row[] {
  return Array.from({ length: chunk.size }, (_, at): Row => {
    const trouble = chunk.trouble[at] as number;
    const row = chunk.row[at] as number;
    if (trouble > 0) return { row, trouble: TROUBLES[trouble] ?? '' };
    const missing = bits.flatMap(([bit, word]) => ((chunk.missing[at] as number) & bit ? [word] : []));
    return {
      row,
      time: chunk.time[at] as number,
      signal: chunk.signal[at] as number,
      ...(chunk.pressure ? { pressure: chunk.pressure[at] as number } : {}),
      ...(chunk.temperature ? { temperature: chunk.temperature[at] as number } : {}),
      ...(missing.length > 0 ? { missing } : {}),
    };
  });
}

function readAll(mapping: Mapping, bytes: Uint8Array, piece: number, chunkRows: number) {
  const found: Row[] = [];
  const rows = openRows(mapping, (chunk) => found.push(...rowsOf(chunk)), chunkRows);
  for (let at = 0; at < bytes.length; at += piece) rows.push(bytes.slice(at, at + piece));
  const { rows: count, samples, ...end } = rows.finish();
  return { found, count, samples, end };
}

/** Seconds of a stamp in UTC with up to nine digits of a fraction. */
function seconds(stamp: string): number {
  const [, whole = '', fraction = '0'] = /^(.*:\d\d)(?:\.(\d+))?Z$/.exec(stamp) ?? [];
  return Date.parse(`${whole}Z`) / 1000 + Number(`0.${fraction}`);
}

/** The row with the wanted figures in place of its own where they are near enough. */
function rounded(row: Row, wanted: Row | undefined, within: number): Row {
  const near = (['signal', 'pressure', 'temperature'] as const).flatMap((key) => {
    const [got = 0, want = 0] = [row[key], wanted?.[key]];
    return Math.abs(got - want) <= within * Math.abs(want) && got !== want ? [[key, want]] : [];
  });
  return { ...row, ...Object.fromEntries(near) };
}

describe('hostile logs', () => {
  it('are forty and more', () => expect(logs.length).toBeGreaterThanOrEqual(40));

  const questions = logs.filter(({ expected }) => expected.problems);
  it.each(questions)('$name: $expected.about', ({ bytes, expected }) => {
    const mapping = mappingOf(expected.log, bytes);
    expect(mapping.ok ? [] : mapping.problems).toEqual(expected.problems);
  });

  const readable = logs.filter(({ expected }) => expected.rows);
  describe.each([
    [1, 3],
    [7, 1],
    [1 << 16, 4096],
  ])('in pieces of %i bytes, chunks of %i rows', (piece, chunkRows) => {
    it.each(readable)('$name: $expected.about', ({ bytes, expected }) => {
      const mapping = mappingOf(expected.log, bytes);
      if (!mapping.ok) throw new Error(`expected a mapping, got ${JSON.stringify(mapping.problems)}`);
      const { found, count, end, samples } = readAll(mapping.value, bytes, piece, chunkRows);
      const wanted = (expected.rows ?? []).map((row, at) => ({
        row: at + 1,
        ...row,
        ...(typeof row.time === 'string' ? { time: seconds(row.time) } : {}),
      }));
      expect(found.map((row, at) => rounded(row, wanted[at], expected.within ?? 0))).toEqual(wanted);
      expect(count).toBe(wanted.length);
      expect(end).toEqual(expected.end);
      const troubled = wanted.filter(({ trouble }) => trouble !== undefined);
      expect(new Set(samples.map(({ trouble }) => trouble))).toEqual(new Set(troubled.map(({ trouble }) => trouble)));
    });
  });
});
