/** A look at a log before it is converted: its first rows as they are written and as they will be read. */
import type { LogText, MeterText, Project } from '../document/project.ts';
import { readSite } from '../input/site.ts';
import { gather, type Outcome, type Problem } from '../quantity/outcome.ts';
import type { LogLook, LookedMapping, LookedRow } from '../result/log-look.ts';
import { standing } from '../run/standing.ts';
import { type Chunk, PRESSURE_MISSING, TEMPERATURE_MISSING, TROUBLES } from './chunk.ts';
import { type Beginning, mapLog } from './columns.ts';
import type { Mapping } from './mapping.ts';
import { type LogPlan, planOf } from './plan.ts';
import { type Preview, previewLog } from './preview.ts';
import { openRows } from './rows.ts';
import { readTime } from './time.ts';

/** A meter with the project that it stands in. */
export interface OfMeter {
  readonly meter: MeterText;
  /** Its place in the list. */
  readonly index: number;
  readonly project: Pick<Project, 'site' | 'base'>;
}

const MOST_READ = 20; // rows

/** The plan of a conversion. Problems: those of the meter, of mapLog and of planOf. */
export function planLog({ meter, index, project }: OfMeter, beginning: Beginning): Outcome<LogPlan> {
  const site = readSite(project);
  const stands = standing(meter, index, project);
  const log = logOf(meter);
  const mapping = site.ok ? mapLog(log, beginning, site.value) : site;
  if (!(stands.ok && mapping.ok)) return gather(stands, mapping);
  return planOf(stands.value, mapping.value, log.exact === true);
}

/** What the first rows show; undefined when there is no row. */
export function lookAt(of: OfMeter, beginning: Beginning): LogLook | undefined {
  const site = readSite(of.project);
  const mapping = site.ok ? mapLog(logOf(of.meter), beginning, site.value) : site;
  const delimiter = mapping.ok ? { delimiter: String.fromCharCode(mapping.value.layout.delimiter) } : {};
  const { first, complete, last } = beginning;
  const preview = previewLog(first, { complete, ...(last === undefined ? {} : { last }), ...delimiter });
  if (preview === undefined) return undefined;
  const plan = planLog(of, beginning);
  return {
    encoding: preview.spelling.encoding,
    delimiter: preview.delimiter,
    hasHeader: preview.hasHeader,
    skip: preview.skip,
    columns: preview.columns.map(({ name, kind, figures, time }) => ({
      name,
      kind,
      figures,
      ...(time === undefined ? {} : { time }),
    })),
    rows: preview.rows,
    ...(mapping.ok ? { mapping: lookedMapping(mapping.value, preview, first) } : {}),
    problems: plan.ok ? [] : unlike(plan.problems),
  };
}

const logOf = ({ log }: MeterText): LogText =>
  typeof log === 'object' && log !== null && !Array.isArray(log) ? (log as LogText) : {};

/** The same problem of two readers is said once. */
const unlike = (problems: readonly Problem[]): readonly Problem[] =>
  problems.filter(
    ({ code, field }, at) => problems.findIndex((other) => other.code === code && other.field === field) === at,
  );

function lookedMapping(mapping: Mapping, { columns }: Preview, first: Uint8Array): LookedMapping {
  const { time, signal, pressure, temperature, zone, assumed } = mapping;
  const stamp = columns[time.at]?.cells.find(({ text }) => text !== '')?.text ?? '';
  const read = readTime(stamp, time.format, time.figures);
  return {
    time: time.at,
    ...(time.clockAt === undefined ? {} : { clock: time.clockAt }),
    signal: signal.at,
    signalKind: signal.kind,
    ...(pressure === undefined ? {} : { pressure: pressure.at }),
    ...(temperature === undefined ? {} : { temperature: temperature.at }),
    timeFormat: time.format,
    zone: zone.name,
    zoned: typeof read === 'object' && read.zoned,
    assumed,
    read: readRows(mapping, first),
  };
}

/** The first rows through the reader itself. */
function readRows(mapping: Mapping, first: Uint8Array): readonly LookedRow[] {
  const read: LookedRow[] = [];
  const rows = openRows(
    mapping,
    (chunk) => {
      for (let at = 0; at < chunk.size && read.length < MOST_READ; at += 1) read.push(rowAt(chunk, at));
    },
    MOST_READ,
  );
  rows.push(first);
  rows.finish();
  return read;
}

function rowAt({ row, time, signal, pressure, temperature, trouble, missing }: Chunk, at: number): LookedRow {
  const number = row[at] as number;
  const code = TROUBLES[trouble[at] as number];
  if (trouble[at] !== 0) return { row: number, ...(code ? { trouble: code } : {}) };
  const bits = missing[at] as number;
  return {
    row: number,
    time_s: time[at] as number,
    signal: signal[at] as number,
    ...(pressure && (bits & PRESSURE_MISSING) === 0 ? { pressure_Pa: pressure[at] as number } : {}),
    ...(temperature && (bits & TEMPERATURE_MISSING) === 0 ? { temperature_K: temperature[at] as number } : {}),
  };
}
