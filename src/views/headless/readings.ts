/** The readings of a meter as the file contract writes them: one record for each row, then what they come to. */
import type { ReadingRecord, Readings } from '../../core/result/readings-record.ts';
import type { Print } from '../words/print.ts';
import { type Problem, problemSentence } from '../words/problems.ts';
import { type Asked, checkOf } from './checks.ts';

/** The keys that readings add to a solved meter. */
export function readingsOf({ instrument, problems, rows, summary }: Readings, print: Print, asked: Asked): object {
  return {
    ...(instrument === undefined ? {} : { instrument }),
    ...(problems.length === 0 ? {} : { readingProblems: problems.map((problem) => writtenProblem(problem, print)) }),
    readings: rows.map((row) => rowOf(row, print, asked)),
    readingSummary: summary,
  };
}

function rowOf(row: ReadingRecord, print: Print, { working: asked = false }: Asked): object {
  if (row.status === 'refused') {
    const { problem, problems, ...rest } = row;
    return {
      ...rest,
      problem: writtenProblem(problem, print),
      problems: problems.map((one) => writtenProblem(one, print)),
    };
  }
  const { working, checks, picture: _, ...figures } = row;
  return { ...figures, checks: checks.map((finding) => checkOf(finding, print)), ...(asked ? { working } : {}) };
}

export const writtenProblem = ({ code, field, detail }: Problem, print: Print): object => ({
  code,
  field,
  message: problemSentence({ code, field, detail }, print),
});
