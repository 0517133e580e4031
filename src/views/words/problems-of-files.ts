/** Problems of a whole file. */
import type { ProblemWords } from './detail.ts';

export const fileProblems: ProblemWords = {
  'not-json': (d) => ({
    cause: `The file is not JSON (${d.text('reason')}).`,
    next: 'Open the file that this program saved, or mend it there.',
  }),
  'not-headwright': () => ({
    cause: "The file is no project: its format is not 'headwright'.",
    next: 'Open a project file.',
  }),
  'version-missing': () => ({
    cause: 'The file does not say which version of the format it has.',
    next: "Write 'version': 1 beside the format.",
  }),
  'newer-version': (d) => ({
    cause: `The file has version ${d.text('version')} of the format, and this program reads up to ${d.text('known')}.`,
    next: 'Open it with a newer version of this program; the file is left as it is.',
  }),
  'no-meters': () => ({
    cause: 'The file has no list of meters.',
    next: "Write 'meters' with a list, which may be empty.",
  }),
  'too-long': (d) => ({
    cause: `The file has ${d.text('length')} characters, and a project has at most ${d.text('most')}.`,
    next: 'Open a project file; logs are converted, not opened.',
  }),
};
