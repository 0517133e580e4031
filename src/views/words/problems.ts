/** Every problem as two sentences: what is wrong and where, then what to do next. */
import type { Refused } from '../../core/result/record.ts';
import { capital, detailOf, type ProblemWords, type Sentences } from './detail.ts';
import { fieldPlace } from './fields.ts';
import { type Print, printSI } from './print.ts';
import { airProblems } from './problems-of-air.ts';
import { fileProblems } from './problems-of-files.ts';
import { gasProblems } from './problems-of-gases.ts';
import { inputProblems } from './problems-of-input.ts';
import { liquidProblems } from './problems-of-liquids.ts';
import { logFileProblems } from './problems-of-log-files.ts';
import { logPlanProblems } from './problems-of-log-plan.ts';
import { logProblems } from './problems-of-logs.ts';
import { numberProblems } from './problems-of-numbers.ts';
import { readingProblems } from './problems-of-readings.ts';
import { solvingProblems } from './problems-of-solving.ts';
import { traverseProblems } from './problems-of-traverse.ts';

export type Problem = Refused['problem'];

export const problemWords: ProblemWords = {
  ...numberProblems,
  ...inputProblems,
  ...gasProblems,
  ...airProblems,
  ...liquidProblems,
  ...solvingProblems,
  ...traverseProblems,
  ...readingProblems,
  ...logProblems,
  ...logPlanProblems,
  ...logFileProblems,
  ...fileProblems,
};

/** Cause and next step of a problem; its figures are printed by `print`. A code without words is a defect. */
export function problemSentences({ code, field, detail }: Problem, print: Print): Sentences {
  const words = problemWords[code];
  if (words === undefined) throw new Error(`expected words for the problem ${code}, got none`);
  const { cause, next } = words(detailOf(code, fieldPlace(field), detail, print));
  return { cause: capital(cause), next: capital(next) };
}

/** Cause and next step in one line. */
export function problemSentence(problem: Problem, print: Print = printSI): string {
  const { cause, next } = problemSentences(problem, print);
  return `${cause} ${next}`;
}
