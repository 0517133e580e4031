/** A sea-water Venturi tube read on each instrument, for tests to vary. */
import type { InstrumentText, MeterText, Project, ReadingText } from '../../../src/core/document/project.ts';
import type { Readings, SolvedReading } from '../../../src/core/result/readings-record.ts';
import { solved } from '../sample.ts';

export const venturi: MeterText = {
  tag: 'FE-4101',
  fluid: { kind: 'stated', density: '1025 kg/m3', viscosity: '1.08 mPa.s', vapourPressure: '2.0 kPa(a)' },
  upstream: { pressure: '3.1 bar(g)', temperature: '17.5 degC' },
  pipe: { bore: '400 mm', roughness: '0.05 mm' },
  element: { kind: 'venturi-tube', convergent: 'as-cast', bore: '240 mm' },
  differential: '250 mbar',
  find: 'flow',
};

export const uTube: InstrumentText = { kind: 'u-tube', liquid: 'mercury', temperature: '24 degC' };
export const transmitter: InstrumentText = { kind: 'transmitter', upper: '250 mbar', signal: '4-20 mA' };

/** What a meter reads on an instrument. */
export function readings(
  instrument: unknown,
  rows: unknown,
  meter: MeterText = venturi,
  project: Pick<Project, 'site' | 'base'> = {},
): Readings {
  const found = solved({ ...meter, instrument, readings: rows }, project).readings;
  if (found === undefined) throw new Error('expected readings, got none');
  return found;
}

/** One row that could be read. */
export function reading(
  instrument: InstrumentText,
  row: ReadingText,
  meter: MeterText = venturi,
  project: Pick<Project, 'site' | 'base'> = {},
): SolvedReading {
  const [one] = readings(instrument, [row], meter, project).rows;
  if (one?.status !== 'solved') throw new Error(`expected a reading, got ${JSON.stringify(one)}`);
  return one;
}

/** Codes and fields of the first row's refusal. */
export function refusalOf(instrument: unknown, row: unknown, meter: MeterText = venturi): string[] {
  const [one] = readings(instrument, [row], meter).rows;
  return one?.status === 'refused' ? one.problems.map(({ code, field }) => `${code} at ${field}`) : [];
}

/** Ids of the findings of a row that are not inside. */
export const flags = ({ checks }: SolvedReading): string[] =>
  checks.filter(({ verdict }) => verdict !== 'inside').map(({ id }) => id);
