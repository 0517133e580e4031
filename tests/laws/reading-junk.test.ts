/** Whatever stands where an instrument and its readings should: rows are refused or solved, nothing throws, nothing is NaN. */
import { expect, test } from 'vitest';
import type { MeterText, Project } from '../../src/core/document/project.ts';
import { solveMeter } from '../../src/core/run.ts';
import { presentReadings } from '../../src/views/present/readings.ts';
import { readingTable } from '../../src/views/present/readings-sheet.ts';
import { venturi } from '../core/reading/sample.ts';
import { generator } from './random.ts';

const RUNS = 400;
const KINDS = ['differential', 'u-tube', 'inverted-u-tube', 'well', 'inclined', 'gauges', 'transmitter', 'abacus', ''];
/** Instruments that can be read as they are. */
const SOUND: readonly object[] = [
  { kind: 'differential' },
  { kind: 'u-tube', liquid: 'mercury' },
  { kind: 'inverted-u-tube' },
  { kind: 'well', liquid: 'mercury', scale: 'plain', tube: '6 mm', well: '60 mm' },
  { kind: 'inclined', liquid: 'mercury', angle: '30 deg' },
  { kind: 'gauges' },
  { kind: 'transmitter', signal: '4-20 mA', upper: '250 mbar' },
];
const KEYS = [
  'liquid',
  'temperature',
  'above',
  'aboveDownstream',
  'rise',
  'drop',
  'high',
  'zero',
  'division',
  'scale',
  'scaleMetal',
  'tube',
  'well',
  'angle',
  'heightUpstream',
  'lower',
  'upper',
  'signal',
  'output',
  'limits',
  'cutOff',
  'lowRange',
  'uncertainty',
];
const VALUES: readonly unknown[] = [
  'mercury',
  'water',
  'air',
  'process',
  'plain',
  'corrected',
  'upstream',
  'downstream',
  'brass',
  '4-20 mA',
  '1-5 V',
  'percent',
  'linear',
  'square-root',
  '152 mm',
  '-3 mm',
  '12 mA',
  '3 V',
  '50 %',
  '250 mbar',
  '-250 mbar',
  '24 degC',
  '1e300 mm',
  '1e-300 m',
  '30 deg',
  '90 deg',
  '0 deg',
  '5 %',
  '3.1 bar(g)',
  '2.9 bar(g)',
  '-5 bar(g)',
  '',
  'x',
  '1',
  0,
  -1,
  1e308,
  true,
  null,
  [],
  {},
  { density: '1200 kg/m3' },
  { density: '1 kg/m3' },
  { density: 7 },
  { upper: '25 mbar' },
  { low: '3 mA' },
  { accuracy: '1 % of span' },
];

const finite = (node: unknown): boolean => {
  if (typeof node === 'number') return Number.isFinite(node);
  if (typeof node !== 'object' || node === null) return node !== null;
  return Object.values(node).every(finite);
};

test('junk is refused row by row', () => {
  let solvedRows = 0;
  for (let run = 0; run < RUNS; run += 1) {
    const random = generator(77 + run);
    const any = <One>(list: readonly One[]): One => list[Math.floor(random() * list.length)] as One;
    const group = (keys: readonly string[], count: number) =>
      Object.fromEntries(Array.from({ length: count }, () => [any(keys), any(VALUES)]));
    const junk = { kind: any(KINDS), ...group(KEYS, 5) };
    const instrument = random() < 0.1 ? any(VALUES) : random() < 0.3 ? junk : { ...any(SOUND), ...group(KEYS, 1) };
    const row = () =>
      random() < 0.1
        ? any(VALUES)
        : group(['time', 'value', 'lowRange', 'upstream', 'throat', 'pressure', 'temperature'], 2);
    const readings =
      random() < 0.1
        ? any(VALUES)
        : [row(), row(), { value: '152 mm' }, { value: '12 mA' }, { upstream: '3.1 bar(g)', throat: '3 bar(g)' }];
    const meter = { ...venturi, instrument, readings } as unknown as MeterText;
    const project: Project = { format: 'headwright', version: 1, meters: [meter] };
    const result = solveMeter(meter, 0, project);
    if (result.status === 'refused') throw new Error(`seed ${77 + run}: ${JSON.stringify(result.problems)}`);
    const rows = result.readings?.rows ?? [];
    solvedRows += rows.filter(({ status }) => status === 'solved').length;
    expect(finite(result.readings), `seed ${77 + run}: ${JSON.stringify({ instrument, readings })}`).toBe(true);
    presentReadings(meter, project, result);
    readingTable(meter, project, result);
  }
  expect(solvedRows).toBeGreaterThan(RUNS / 4);
});
