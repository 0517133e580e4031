/** The readings of a meter, ready to print: the sentence of each row, its figures, and what the rows come to. */
import type { MeterText, Project } from '../../core/document/project.ts';
import type { ReadingRecord, Readings, SolvedReading } from '../../core/result/readings-record.ts';
import type { Solved } from '../../core/result/record.ts';
import { cautions } from '../words/cautions.ts';
import { readingFlags } from '../words/findings-of-readings.ts';
import { instrumentLabel } from '../words/instruments.ts';
import { provenanceNotes } from '../words/provenance.ts';
import { instrumentCautions, readWords } from '../words/readings.ts';
import { notSolved, type Verdict, verdictWords } from '../words/verdicts.ts';
import { checkRow } from './checks.ts';
import { type Context, contextOf } from './context.ts';
import type { Value } from './model.ts';
import { presentProblem } from './problem.ts';
import { readingAnswer, readingUnder } from './readings-answer.ts';
import { readFlow } from './readings-flow.ts';
import type { Compensation, PresentedReadings, ReadingFigures, ReadingRow } from './readings-model.ts';
import { type Drawing, drawings } from './readings-picture.ts';
import { readingProblems } from './readings-problems.ts';
import { togetherOf } from './readings-summary.ts';
import { workingRow } from './working.ts';

const NONE: Readings = { problems: [], rows: [], summary: { rows: 0, refused: 0, counted: 0, flags: [] } };

/** A solved meter's readings; a meter without any is presented with an empty table. */
export function presentReadings(meter: MeterText, project: Project, result: Solved): PresentedReadings {
  const at = contextOf(meter, project);
  const readings = result.readings ?? NONE;
  const { rows, summary } = readings;
  const kind = kindOf(meter);
  const drawing = drawings(at, kind, result);
  return {
    kind,
    instrument: instrumentLabel(kind),
    problems: readingProblems(readings, at.print),
    rows: rows.map((row, index) => rowOf(at, row, index, kind, result, drawing)),
    blank: drawing(undefined, {}),
    units: {
      differential: at.units.differential.print,
      flow: at.units.flow.print,
      velocity: at.units.velocity.print,
      reynolds: '',
      coefficient: '',
      expansibility: '',
      uncertainty: '%',
    },
    together: togetherOf(at, summary),
    summary,
    notes: notesOf(rows),
    cautions: cautionsOf(at, kind, result),
  };
}

/** The instrument as written; a meter that names none is read as a pressure difference. */
export function kindOf({ instrument }: MeterText): string {
  const kind: unknown = instrument?.kind;
  return typeof kind === 'string' ? kind : 'differential';
}

function rowOf(
  at: Context,
  row: ReadingRecord,
  index: number,
  kind: string,
  result: Solved,
  drawing: Drawing,
): ReadingRow {
  const common = { index, time: row.time ?? '', written: writtenOf(at.meter, index) };
  if (row.status === 'refused') {
    const problems = row.problems.map((problem) => presentProblem(problem, at.print));
    const ofInstrument = problems[0]?.field.startsWith('instrument') === true;
    return {
      ...common,
      status: 'refused',
      figures: {},
      note: { verdict: 'refused', words: notSolved },
      answer: [{ text: ofInstrument ? readWords.unready : readWords.refused, role: 'words' }],
      under: problems[0]?.sentence ?? '',
      problems,
      checks: [],
      working: [],
    };
  }
  const compensation = compensationOf(at, row, common.written);
  return {
    ...common,
    status: 'solved',
    figures: figuresOf(at, row),
    note: noteOf(row),
    answer: readingAnswer(at, row, kind, common.written, result),
    under: readingUnder(at, row),
    problems: [],
    checks: row.checks.map((finding) => checkRow(at, finding)),
    get working() {
      return row.working.map(workingRow);
    },
    ...(compensation === undefined ? {} : { compensation }),
    drawn: drawing(row, common.written),
  };
}

/** The texts of a row; anything may stand in a file. */
function writtenOf(meter: MeterText, index: number): Readonly<Record<string, string>> {
  const row: unknown = meter.readings?.[index];
  if (typeof row !== 'object' || row === null) return {};
  return Object.fromEntries(
    Object.entries(row).filter((entry): entry is [string, string] => typeof entry[1] === 'string'),
  );
}

function figuresOf(at: Context, row: SolvedReading): ReadingFigures {
  const all: { readonly [Key in keyof ReadingFigures]: Value | undefined } = {
    differential: given(row.differential_Pa, (si) => at.value(si, 'differential')),
    flow: readFlow(at, row),
    velocity: given(row.velocityPipe_m_s, (si) => at.value(si, 'velocity')),
    reynolds: given(row.reynoldsPipe, (si) => at.value(si, 'reynolds')),
    coefficient: given(row.C, (si) => at.value(si, 'coefficient')),
    expansibility: given(row.epsilon, (si) => at.value(si, 'coefficient')),
    uncertainty: given(row.uncertainty?.expanded_percent, (si) => at.value(si, 'uncertainty')),
  };
  return Object.fromEntries(Object.entries(all).filter(([, value]) => value !== undefined)) as ReadingFigures;
}

const given = (si: number | undefined, print: (si: number) => Value): Value | undefined =>
  si === undefined ? undefined : print(si);

/** The worst verdict of a row and what it is about. */
function noteOf({ checks }: SolvedReading): ReadingRow['note'] {
  const worst: Verdict =
    (['outside', 'caution'] as const).find((one) => checks.some(({ verdict }) => verdict === one)) ?? 'inside';
  if (worst === 'inside') return { verdict: worst, words: verdictWords.inside };
  const ids = [...new Set(checks.filter(({ verdict }) => verdict === worst).map(({ id }) => id))];
  return {
    verdict: worst,
    words: ids
      .map((id) => readingFlags[id] ?? verdictWords[worst])
      .filter(once)
      .join(', '),
  };
}

const once = (one: string, at: number, all: readonly string[]): boolean => all.indexOf(one) === at;

/** The control system's figure beside the exact one, where the row has a state of its own. */
function compensationOf(
  at: Context,
  { compensation, ...row }: SolvedReading,
  written: Readonly<Record<string, string>>,
): Compensation | undefined {
  if (compensation === undefined) return undefined;
  if (written.pressure === undefined && written.temperature === undefined && written.upstream === undefined)
    return undefined;
  const [indicated, corrected, exact] = [compensation.indicated, compensation.corrected, row].map((flow) =>
    readFlow(at, flow),
  );
  if (indicated === undefined || corrected === undefined || exact === undefined) return undefined;
  return {
    indicated,
    corrected,
    exact,
    factor: at.value(compensation.densityFactor, 'factor'),
    residual: at.value(compensation.residual_percent, 'uncertainty'),
  };
}

function notesOf(rows: readonly ReadingRecord[]): readonly string[] {
  const solved = rows.find((row) => row.status === 'solved');
  if (solved?.status !== 'solved') return [];
  return provenanceNotes([...solved.working, ...solved.checks].map(({ source }) => source));
}

/** The usual cautions of the service, then those of the instrument. */
function cautionsOf({ meter }: Context, kind: string, { state }: Solved): readonly string[] {
  const fluid = typeof meter.fluid?.kind === 'string' ? meter.fluid.kind : '';
  const liquid = meter.instrument?.liquid;
  const column = kind === 'u-tube' || kind === 'well' || kind === 'inclined';
  const oxygen = hasOxygen(meter.fluid);
  const steam = fluid === 'water' && state.phase !== 'liquid';
  const wet = steam || (meter.instrument?.above ?? 'process') !== 'process';
  const service = { fluid, phase: state.phase, oxygen };
  const named = column && typeof liquid === 'string' ? { ...service, gaugeLiquid: liquid } : service;
  return [...cautions(named), ...instrumentCautions(kind, wet)];
}

/** More oxygen than air has, named or by composition. */
function hasOxygen(fluid: MeterText['fluid']): boolean {
  const composition = fluid?.composition;
  if (fluid?.name === 'oxygen') return true;
  if (typeof composition !== 'object' || composition === null) return false;
  const share: unknown = (composition as Record<string, unknown>).oxygen;
  const number = typeof share === 'string' ? Number.parseFloat(share) / (share.includes('%') ? 100 : 1) : Number(share);
  return number > 0.235; // enriched, above 23.5 %
}
