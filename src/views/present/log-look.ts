/** The first rows of a log, as the panel shows them: written and read side by side, decisions with what they stand on. */
import type { MeterText, Project } from '../../core/document/project.ts';
import type { LogLook, LookedColumn, LookedMapping, LookedRow } from '../../core/result/log-look.ts';
import { accountWordsOf } from '../words/log-accounts.ts';
import { ambiguous, decimalLabel, evidenceText, readAs, spellingText, timeFormatLabel } from '../words/logs.ts';
import { contextOf } from './context.ts';
import type { LogQuestion, PresentedLook } from './log-model.ts';
import { type Printer, spelled } from './numbers.ts';
import { presentProblem } from './problem.ts';
import { stampsIn } from './stamps.ts';

type Problem = LogLook['problems'][number];

const MOST_ROWS = 8;
const NO_BREAK = '\u00a0';

export function presentLook(look: LogLook, meter: MeterText, project: Project): PresentedLook {
  const at = contextOf(meter, project);
  const { columns, mapping, rows } = look;
  const roles = mapping === undefined ? {} : rolesOf(mapping);
  const questions = look.problems.flatMap((problem) => questionOf(problem, columns));
  const asked = look.problems.filter((problem) => questionOf(problem, columns).length > 0);
  return {
    spelling: spellingText(look.encoding, look.delimiter, look.skip, look.hasHeader),
    columns: columns.map(({ name }, place) => ({ name, at: place })),
    hasClock: columns.some(({ kind }) => kind === 'clock'),
    roles,
    rows: rows.slice(0, MOST_ROWS).map((cells, place) => rowOf(cells, place, roles, mapping, at)),
    decided: mapping === undefined ? {} : decisionsOf(mapping, columns),
    assumed: mapping?.assumed ?? [],
    zoned: mapping?.zoned ?? false,
    questions,
    problems: look.problems.filter((problem) => !asked.includes(problem)).map((one) => presentProblem(one, at.print)),
  };
}

/** The part of the meter that a column stands for, by its place. */
function rolesOf({ time, clock, signal, signalKind, pressure, temperature }: LookedMapping): Record<number, string> {
  const parts: readonly (readonly [number | undefined, string])[] = [
    [time, 'time'],
    [clock, 'clock'],
    [signal, signalKind === 'differential' ? 'differential' : 'signal'],
    [pressure, 'pressure'],
    [temperature, 'temperature'],
  ];
  return Object.fromEntries(parts.flatMap(([place, part]) => (place === undefined ? [] : [[place, part]])));
}

function rowOf(
  cells: readonly string[],
  place: number,
  roles: Readonly<Record<number, string>>,
  mapping: LookedMapping | undefined,
  at: Printer,
): PresentedLook['rows'][number] {
  const read = mapping?.read[place];
  const troubled = read?.trouble;
  return {
    row: place + 1,
    cells: cells.map((text, column) => {
      const role = roles[column];
      const figure = mapping && read && role !== undefined ? readText(role, read, mapping, at) : '';
      return { text, ...(figure === '' ? {} : { read: figure }) };
    }),
    ...(troubled === undefined ? {} : { trouble: accountWordsOf(troubled).label }),
  };
}

/** What a cell is read as; empty where nothing is. */
function readText(role: string, read: LookedRow, { zone, signalKind }: LookedMapping, { value }: Printer): string {
  const { time_s, signal, pressure_Pa, temperature_K } = read;
  if (role === 'time') return time_s === undefined ? '' : stampsIn(zone)(time_s);
  if (role === 'differential') return signal === undefined ? '' : value(signal, 'differential').text;
  if (role === 'signal')
    return signal === undefined ? '' : `${spelled(signal, PLAIN, true)}${SIGNAL_UNITS[signalKind]}`;
  if (role === 'pressure') return pressure_Pa === undefined ? '' : value(pressure_Pa, 'pressure').text;
  if (role === 'temperature') return temperature_K === undefined ? '' : value(temperature_K, 'temperature').text;
  return '';
}

const PLAIN = { significant: 6, trim: true } as const;
const SIGNAL_UNITS: Readonly<Record<LookedMapping['signalKind'], string>> = {
  differential: '',
  current: `${NO_BREAK}mA`,
  voltage: `${NO_BREAK}V`,
  percent: `${NO_BREAK}%`,
};

/** Format and decimal mark of each part, with the cell that each stands on. */
function decisionsOf(mapping: LookedMapping, columns: readonly LookedColumn[]): Record<string, string> {
  const time = columns[mapping.time]?.time;
  const stamp = evidenceText(timeFormatLabel(mapping.timeFormat), time?.kind === 'decided' ? time.evidence : undefined);
  const parts = Object.entries(rolesOf(mapping)).filter(([, part]) => part !== 'time' && part !== 'clock');
  const marks = parts.flatMap(([place, part]) => {
    const figures = columns[Number(place)]?.figures;
    if (figures?.kind !== 'decided') return [];
    return [[part, evidenceText(decimalLabel(figures.value.decimal), figures.evidence)]];
  });
  return { time: stamp, ...Object.fromEntries(marks) };
}

/** The question behind a problem, where the sample has two readings. */
function questionOf({ code, detail }: Problem, columns: readonly LookedColumn[]): readonly LogQuestion[] {
  const column = columns.find(({ name }) => name === detail.column);
  if (code === 'log-decimal-open' && column?.figures.kind === 'open') {
    const { sample, readings } = column.figures;
    const answers = readings.map(({ value: { decimal }, reads }) => ({
      label: readAs(`${spelled(reads, PLAIN, true)}, ${decimalLabel(decimal)}`),
      value: decimal,
    }));
    return [{ text: ambiguous(sample.text, column.name), path: 'log.decimal', answers }];
  }
  if ((code !== 'log-date-order-open' && code !== 'log-time-open') || column?.time?.kind !== 'open') return [];
  const { sample, readings } = column.time;
  const shown = stampsIn('UTC');
  const answers = readings.map(({ value, reads }) => ({
    label: readAs(`${shown(reads)}, ${timeFormatLabel(value)}`),
    value,
  }));
  const path = code === 'log-time-open' ? 'log.time.format' : 'log.dateOrder';
  return [{ text: ambiguous(sample.text, column.name), path, answers }];
}
