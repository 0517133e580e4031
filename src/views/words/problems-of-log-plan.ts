/** Problems between a log and the meter that it belongs to. */
import type { ProblemWords } from './detail.ts';

export const logPlanProblems: ProblemWords = {
  'log-transmitter-missing': () => ({
    cause: 'The log has a signal, and no transmitter says which differential it stands for.',
    next: 'State the transmitter of the meter with its range, or choose a column that holds the differential.',
  }),
  'log-signal-unlike': (d) => ({
    cause: `The signal of the log is a ${d.text('written')}, and that of the transmitter a ${d.text('expected')}.`,
    next: 'Check the unit of the column and the signal of the transmitter.',
  }),
  'log-legs': () => ({
    cause:
      'The legs of the transmitter hold something other than the pipe does: what they add to the differential changes ' +
      'with every row.',
    next: 'Choose a column that holds the differential between the tappings, or write such readings one by one.',
  }),
  'log-day-start': (d) => ({
    cause: `The day cannot begin at '${d.text('written')}'.`,
    next: "Write hours and minutes, as '06:00'.",
  }),
};
