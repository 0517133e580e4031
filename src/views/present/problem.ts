/** A problem as its field and its sentence. */
import type { Print } from '../words/print.ts';
import { type Problem, problemSentence } from '../words/problems.ts';
import type { PresentedProblem } from './model.ts';

export const presentProblem = (problem: Problem, print?: Print): PresentedProblem => ({
  field: problem.field,
  sentence: problemSentence(problem, print),
});
