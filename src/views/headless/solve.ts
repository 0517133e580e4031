/** The text of a project file in, the text of its results out: what the command line prints. */
import { decode } from '../../core/document/codec.ts';
import { run } from '../../core/run.ts';
import { problemSentence } from '../words/problems.ts';
import type { Asked } from './checks.ts';
import { resultsOf } from './results.ts';
import { serialise } from './serialise.ts';

export interface Answer {
  /** 0 every meter solved, 1 at least one meter refused, 2 the text is no project. Traverses do not count. */
  readonly exit: 0 | 1 | 2;
  readonly output: string;
  readonly error: string;
}

/** Solves every meter of a project. A text that is no project answers with one sentence and no output. */
export function solveText(text: string, asked: Asked = {}): Answer {
  const project = decode(text);
  if (!project.ok) return { exit: 2, output: '', error: problemSentence(project.problems[0]) };
  const results = run(project.value);
  const refused = results.results.some(({ status }) => status === 'refused');
  return { exit: refused ? 1 : 0, output: serialise(resultsOf(project.value, results, asked)), error: '' };
}
