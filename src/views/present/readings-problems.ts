/** What is wrong with the instrument of a meter and with its rows, each sentence once. */
import type { Readings } from '../../core/result/readings-record.ts';
import type { Print } from '../words/print.ts';
import type { PresentedProblem } from './model.ts';
import { presentProblem } from './problem.ts';

export function readingProblems(
  { problems, rows }: Pick<Readings, 'problems' | 'rows'>,
  print: Print,
): readonly PresentedProblem[] {
  const ofRows = rows.flatMap((row) => (row.status === 'refused' ? row.problems : []));
  const all = [...problems, ...ofRows].map((problem) => presentProblem(problem, print));
  return [...new Map(all.map((problem) => [`${problem.field} ${problem.sentence}`, problem])).values()];
}
