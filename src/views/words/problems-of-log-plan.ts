/** Problems between a log and the meter that it belongs to. */
import type { ProblemWords } from './detail.ts';

export const logPlanProblems: ProblemWords = {
  'log-transmitter-missing': () => ({
    cause: 'The log has a signal, and no transmitter says which differential it stands for.',
    next: 'Describe the transmitter of the meter with its range, or name a column that holds the differential.',
  }),
  'log-signal-unlike': (d) => ({
    cause: `The signal of the log is a ${d.text('written')}, and that of the transmitter a ${d.text('expected')}.`,
    next: 'Correct the unit of the column, or the signal of the transmitter.',
  }),
  'log-legs': () => ({
    cause: 'The legs of the transmitter weigh against the fluid in the pipe, which changes with every row.',
    next: 'Enter such readings one by one, or correct the differential where it is logged and name it as the column.',
  }),
  'log-day-start': (d) => ({
    cause: `The day cannot begin at ${d.text('written')}.`,
    next: "Write hours and minutes, as '06:00'.",
  }),
};
