/** Troubles of the file of a log, of the room for what is converted, and of the worker that does it. */
import type { ProblemWords } from './detail.ts';

export const logFileProblems: ProblemWords = {
  'log-file-changed': (d) => ({
    cause:
      'The file of the log is gone or has changed while it was read, ' +
      `after ${d.figure('bytes', 'count')} bytes, at row ${d.figure('row', 'count')}.`,
    next: 'Open the file again, or a copy of it that nobody writes to. Nothing was converted.',
  }),
  'log-pack-broken': (d) => ({
    cause:
      'The packed log is cut off, damaged, or has more behind its end: it cannot be unpacked ' +
      `after ${d.figure('bytes', 'count')} bytes, at row ${d.figure('row', 'count')}.`,
    next: 'Open the log unpacked, or pack it again. Nothing was converted.',
  }),
  'log-store-short': (d) => ({
    cause:
      `The browser has room for ${d.figure('free', 'count')} bytes, ` +
      `and the converted rows are at least ${d.figure('least', 'count')}.`,
    next: 'Put the log through in parts, or free some space on the disk. Nothing was converted.',
  }),
  'log-store-full': (d) => ({
    cause: `The browser has no more room for the converted rows, after ${d.figure('bytes', 'count')} bytes.`,
    next: 'Put the log through in parts, or free some space on the disk. Nothing was converted.',
  }),
  'log-memory-full': (d) => ({
    cause:
      'This browser gives the page no file to write to: the converted rows are kept in memory, ' +
      `and they come to more than ${d.figure('most', 'count')} bytes.`,
    next: 'Use another browser or the command line, or put the log through in parts. Nothing was converted.',
  }),
  'log-worker-lost': () => ({
    cause: 'The conversion broke off: the part of the program that reads logs has stopped.',
    next: 'Open the log again and convert it; if it stops again, put it through in parts. Nothing was converted.',
  }),
};
