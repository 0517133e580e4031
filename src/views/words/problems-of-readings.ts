/** Problems of an instrument and of what was read on it. */
import type { ProblemWords } from './detail.ts';

export const readingProblems: ProblemWords = {
  'instrument-has-no-span': (d) => ({
    cause: `${d.place} is a share of the span, and this instrument has none.`,
    next: 'Write a share of the reading, as in 0.2\u00a0% of reading, or a pressure difference.',
  }),
  'well-not-wider': (d) => ({
    cause: `The well of ${d.figure('well', 'length')} is not wider than the tube of ${d.figure('tube', 'length')}.`,
    next: 'Check the two bores; they may be exchanged.',
  }),
  'gauge-air-unknown': (d) => ({
    cause:
      `The density of air at ${d.figure('pressure', 'pressure')} and ${d.figure('temperature', 'temperature')} is ` +
      'not known.',
    next: 'State the density of what lies on top, or check pressure and temperature.',
  }),
  'manometer-liquid-heavy': (d) => ({
    cause:
      `What lies on top, ${d.figure('liquid', 'density')}, is not lighter than the liquid below it, ` +
      `${d.figure('fluid', 'density')}.`,
    next: 'Check its density, or choose a U-tube.',
  }),
  'range-not-rising': (d) => ({
    cause:
      `The range ends at ${d.figure('upper', 'differential')}, not above its beginning at ` +
      `${d.figure('lower', 'differential')}.`,
    next: 'Check both ends of the range.',
  }),
  'root-from-zero': (d) => ({
    cause: `A square-root signal begins at no difference, and this range begins at ${d.figure('lower', 'differential')}.`,
    next: 'Write 0 for the beginning of the range, or choose a linear output.',
  }),
  'limits-order': () => ({
    cause: 'The limits of the signal do not rise from the failure at the low end to that at the high end.',
    next: 'Put them in order: failed low, valid from, valid to, failed high.',
  }),
  'low-range-not-lower': (d) => ({
    cause: `The low range ends at ${d.figure('upper', 'differential')}, not below the main range.`,
    next: 'Check the ranges of the two cells; they may be exchanged.',
  }),
  'change-order': () => ({
    cause: 'The change back to the low range does not lie below the change away from it.',
    next: 'Write two shares of the low range up to 100\u00a0%, the way back below the way up.',
  }),
};
