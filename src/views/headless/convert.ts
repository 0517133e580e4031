/**
 * A log through the meter of a project, as the command line converts it: texts and bytes in, bytes and the text of the
 * summary out. What opens files and puts the output in its place is not here.
 */
import { decode } from '../../core/document/codec.ts';
import type { MeterText, Project } from '../../core/document/project.ts';
import type { Beginning } from '../../core/log/columns.ts';
import { type Manner, openLog } from '../../core/log/log.ts';
import { planLog } from '../../core/log/look.ts';
import type { LogResult } from '../../core/result/log-record.ts';
import type { Refused } from '../../core/result/record.ts';
import { contextOf } from '../present/context.ts';
import { inputsHash } from '../present/hash.ts';
import { accountWordsOf } from '../words/log-accounts.ts';
import { problemSentence } from '../words/problems.ts';
import { refusedOf } from './results.ts';
import { serialise } from './serialise.ts';
import type { Answer } from './solve.ts';

/** What is asked of a conversion. */
export interface Order {
  readonly project: string;
  readonly tag: string;
  readonly exact: boolean;
  readonly manner: Manner;
}

/** A conversion that can begin: bytes in their order, then the summary. */
export interface Running {
  readonly rows: () => number;
  push(bytes: Uint8Array): void;
  /** The summary, after the last bytes have gone to the sink. */
  finish(): Answer;
}

/** Opens a conversion by the beginning of the log; an answer where there is none: the project, the tag or the columns. */
export function openConversion(
  order: Order,
  beginning: Beginning,
  sink: (bytes: Uint8Array) => void,
): Running | Answer {
  const read = decode(order.project);
  if (!read.ok) return { exit: 2, output: '', error: problemSentence(read.problems[0]) };
  const project = read.value;
  const index = project.meters.findIndex((meter) => tagOf(meter) === order.tag);
  if (index < 0) return { exit: 2, output: '', error: noMeter(project, order.tag) };
  const meter = withExact(project.meters[index] as MeterText, order.exact);
  const plan = planLog({ meter, index, project }, beginning);
  if (!plan.ok) {
    const refused: Refused = { tag: order.tag, status: 'refused', problem: plan.problems[0], problems: plan.problems };
    return { exit: 1, output: serialise(refusedOf(refused, contextOf(meter, project).print)), error: '' };
  }
  const log = openLog(plan.value, sink, order.manner);
  return {
    rows: () => log.rows,
    push: log.push,
    finish: () => ({ exit: 0, output: serialise(summaryOf(log.finish(), meter, project)), error: '' }),
  };
}

const tagOf = (meter: unknown): unknown =>
  typeof meter === 'object' && meter !== null && 'tag' in meter ? meter.tag : undefined;

function noMeter({ meters }: Project, tag: string): string {
  const tags = meters.map(tagOf).filter((one) => typeof one === 'string' && one !== '');
  const known = tags.length === 0 ? 'It names no meter.' : `Its meters are ${tags.join(', ')}.`;
  return `The project has no meter ${tag}. ${known}`;
}

/** The same meter, each row of its log through the whole calculation where that is asked for. */
const withExact = (meter: MeterText, exact: boolean): MeterText =>
  exact ? { ...meter, log: { ...(meter.log as object | undefined), exact } } : meter;

/** The summary in the order of the file contract; the points of the chart are left to views that draw it. */
function summaryOf({ chart: _, accounts, ...result }: LogResult, meter: MeterText, project: Project): object {
  const { tag, rows, converted, total_kg, meanMassFlow_kg_s, seconds, ...rest } = result;
  const flagged = accounts.filter(({ fate }) => fate !== 'converted');
  return {
    format: 'headwright-log',
    version: 1,
    tag,
    status: 'converted',
    rows,
    converted,
    flagged: Object.fromEntries(flagged.map(({ code, rows: count }) => [code, count])),
    total_kg,
    ...(meanMassFlow_kg_s === undefined ? {} : { meanMassFlow_kg_s }),
    seconds,
    ...rest,
    accounts: accounts.map(({ first, ...account }) => ({
      ...account,
      message: accountWordsOf(account.code).meaning,
      first,
    })),
    remarks: remarksOf(result),
    inputs: inputsHash(meter, project),
  };
}

/** What a reader of the figures must know beside them. */
function remarksOf({ endsOpen, converted, spanningRows, assumed }: Omit<LogResult, 'chart' | 'accounts'>): string[] {
  return [
    ...(endsOpen ? ['The log ends without a line end: its last row may have been cut.'] : []),
    ...(converted === 0 ? ['No row could be converted.'] : []),
    ...(spanningRows > 0 ? ['Some rows go over several lines.'] : []),
    ...(assumed.includes('zone') ? ['No zone is stated: stamps that name none were taken as UTC.'] : []),
  ];
}
