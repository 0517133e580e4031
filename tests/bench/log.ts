/**
 * The reader of logs against touching every byte, and the best plain way over strings against it. The yardsticks are
 * fixed: nobody makes them faster.
 */
import type { Chunk } from '../../src/core/log/chunk.ts';
import type { Mapping } from '../../src/core/log/mapping.ts';
import { openRows } from '../../src/core/log/rows.ts';
import { zoneOf } from '../../src/core/log/zone.ts';
import { generator } from '../laws/random.ts';
import { compare, inTurn, type Work } from './pairs.ts';
import { type Line, ratioLine } from './report.ts';

const ROWS = 60_000;
const PIECE = 1 << 18;

/** A log of one second a row: stamp, differential, pressure, temperature, about 41 bytes. */
export function logText(rows: number): string {
  const random = generator(5);
  const figure = (least: number, most: number, digits: number): string =>
    (least + (most - least) * random()).toFixed(digits);
  const lines = ['timestamp,dp,p,t'];
  for (let row = 0; row < rows; row += 1) {
    const stamp = new Date(Date.UTC(2026, 2, 1) + row * 1000).toISOString().slice(0, 19);
    lines.push(`${stamp}Z,${figure(20, 240, 3)},${figure(6, 8, 4)},${figure(80, 90, 2)}`);
  }
  return `${lines.join('\n')}\n`;
}

const figures = { decimal: '.', group: '' } as const;
const column = (at: number, factor: number, before = 0, after = 0) => ({ at, figures, before, factor, after });

export function logMapping(): Mapping {
  const zone = zoneOf('UTC');
  if (!zone) throw new Error('expected a zone, got none');
  return {
    layout: { spelling: { encoding: 'utf-8', mark: 0 }, delimiter: 44, fields: 4, skip: 1, header: new Uint8Array(0) },
    time: { at: 0, format: 'iso', figures },
    zone,
    signal: { ...column(1, 100), kind: 'differential' },
    pressure: column(2, 1e5, 0, 101325),
    temperature: column(3, 1, 273.15),
    interpretation: 'sampled',
    fallback: {},
    assumed: [],
  };
}

function own(bytes: Uint8Array): number {
  let sum = 0;
  const take = ({ size, time, signal, pressure, temperature, trouble }: Chunk): void => {
    for (let at = 0; at < size; at += 1)
      sum +=
        (time[at] as number) +
        (signal[at] as number) +
        (pressure?.[at] as number) +
        (temperature?.[at] as number) +
        (trouble[at] as number);
  };
  const rows = openRows(logMapping(), take);
  for (let at = 0; at < bytes.length; at += PIECE) rows.push(bytes.subarray(at, at + PIECE));
  rows.finish();
  return sum;
}

function touched(bytes: Uint8Array): number {
  let sum = 0;
  for (let at = 0; at < bytes.length; at += 1) sum += bytes[at] as number;
  return sum;
}

/** Lines and fields by split, Number and the platform's own reading of a stamp. */
function bySplitting(bytes: Uint8Array): number {
  const lines = new TextDecoder().decode(bytes).split('\n');
  let sum = 0;
  for (let row = 1; row < lines.length - 1; row += 1) {
    const [time = '', dp, p, t] = (lines[row] as string).split(',');
    sum += Date.parse(time) / 1000 + Number(dp) * 100 + Number(p) * 1e5 + 101325 + Number(t) + 273.15;
  }
  return sum;
}

/** The same by indexOf and slices, with no list of fields. */
function bySlicing(bytes: Uint8Array): number {
  const text = new TextDecoder().decode(bytes);
  let sum = 0;
  let at = text.indexOf('\n') + 1;
  while (at < text.length) {
    const first = text.indexOf(',', at);
    const second = text.indexOf(',', first + 1);
    const third = text.indexOf(',', second + 1);
    const end = text.indexOf('\n', third + 1);
    sum += Date.parse(text.slice(at, first)) / 1000 + Number(text.slice(first + 1, second)) * 100;
    sum += Number(text.slice(second + 1, third)) * 1e5 + 101325 + Number(text.slice(third + 1, end)) + 273.15;
    at = end + 1;
  }
  return sum;
}

export function log(): Line[] {
  const bytes = new TextEncoder().encode(logText(ROWS));
  const works = [own, touched, bySplitting, bySlicing].map((way) => inTurn([bytes], way));
  const [reader, touch, splitting, slicing] = works as [Work, Work, Work, Work];
  const byStrings = [compare(splitting, reader), compare(slicing, reader)];
  const best = byStrings.reduce((one, other) => (one.median < other.median ? one : other));
  return [
    ratioLine('a log: rows from bytes / touching every byte', compare(reader, touch), '<= 4.5'),
    ratioLine('a log: best way over strings / rows from bytes', best, '>= 3'),
  ];
}
