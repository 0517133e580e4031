/** Problems of the columns of a log, and the questions that it leaves open. */
import type { Detail, ProblemWords } from './detail.ts';

/** What the other order of a date makes of the sample, where it is a date. */
const dates = (d: Detail): string => {
  if (d.has('dayFirst') && d.has('monthFirst'))
    return `${d.text('dayFirst')} with the day first and ${d.text('monthFirst')} with the month first`;
  return d.has('dayFirst')
    ? `${d.text('dayFirst')} with the day first, which other rows are not`
    : `${d.has('monthFirst') ? d.text('monthFirst') : 'a date'} with the month first, which other rows are not`;
};

export const logProblems: ProblemWords = {
  'log-empty': () => ({
    cause: 'The log holds no row of data.',
    next: 'Check that the right file was chosen, and that it was written to its end.',
  }),
  'log-column-missing': (d) => ({
    cause: `The log has no column '${d.text('written')}', which is named as ${d.place}.`,
    next: `Choose ${d.list('choices')}.`,
  }),
  'log-column-twice': (d) => ({
    cause: `The log has several columns named '${d.text('written')}'.`,
    next: 'Write the number of the column in place of its name, 1 for the first.',
  }),
  'log-column-shared': (d) => ({
    cause: `${d.place} is also that of another figure.`,
    next: 'Choose a column of its own for each figure.',
  }),
  'log-signal-missing': () => ({
    cause: 'No column is named for the differential or for the signal of a transmitter.',
    next: 'Choose the column of one of them, and state its unit.',
  }),
  'log-signal-twice': () => ({
    cause: 'A column is named for the differential and another one for the signal of a transmitter.',
    next: 'Leave one of them out: the flow follows from either.',
  }),
  'log-date-order-open': (d) => ({
    cause: `'${d.text('written')}' in the column ${d.text('column')} is ${dates(d)}.`,
    next: 'State the order of the date: day first or month first.',
  }),
  'log-date-order-contradicted': (d) => ({
    cause: `'${d.text('written')}' is no date in the order that is stated.`,
    next: 'Check the order of the date: it holds for every row.',
  }),
  'log-decimal-open': (d) => ({
    cause:
      d.has('one') && d.has('other')
        ? `'${d.text('written')}' in the column ${d.text('column')} is ${d.text('one')} with a decimal ` +
          `${markName(d.text('oneMark'))} and ${d.text('other')} with a decimal ${markName(d.text('otherMark'))}.`
        : `'${d.text('written')}' in the column ${d.text('column')} has another decimal mark than other rows.`,
    next: 'State the decimal mark: a point or a comma.',
  }),
  'log-decimal-unknown': (d) => ({
    cause: `'${d.text('written')}' is no decimal mark.`,
    next: 'Choose a point or a comma.',
  }),
  'log-delimiter-unknown': (d) => ({
    cause: `'${d.text('written')}' is no delimiter of a log.`,
    next: "Choose a comma, a semicolon, a vertical bar, or the word 'tab'.",
  }),
  'log-time-open': (d) => ({
    cause: `'${d.text('written')}' in the column ${d.text('column')} can count days of a spreadsheet or seconds of a clock.`,
    next: 'State the format of the time.',
  }),
  'log-time-unreadable': (d) => ({
    cause: `'${d.text('written')}' in the column ${d.text('column')} is no time in a format that is known.`,
    next: 'Choose another column, or write the time as in 2026-03-01T06:00:00.',
  }),
  'log-zone-unknown': (d) => ({
    cause: `The time zone '${d.text('written')}' is not known.`,
    next: "Write 'UTC', an offset such as '+01:00', or a place such as 'Europe/Oslo'.",
  }),
  'log-duration-unreadable': (d) => ({
    cause: `'${d.text('written')}' for ${d.place} is no length of time.`,
    next: 'Write a number above zero with s, min, h or d.',
  }),
};

const markName = (mark: string): string => (mark === ',' ? 'comma' : 'point');
