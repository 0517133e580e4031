/** Problems of a survey: its points, its probe and its readings. */
import type { ProblemWords } from './detail.ts';

export const traverseProblems: ProblemWords = {
  'points-not-of-rule': (d) => ({
    cause: `The rule of this survey has no set of points with ${d.text('written')} for ${d.place}.`,
    next: `Choose ${d.list('choices')}.`,
  }),
  'readings-too-many': (d) => ({
    cause: `${d.place} has ${d.text('written')} readings, and the plan has ${d.text('most')} points there.`,
    next: 'Check the number of lines and points, or leave out what was read twice.',
  }),
  'number-out-of-range': (d) => ({
    cause: `${d.place} cannot be ${d.text('written')}.`,
    next: `Write a number from ${d.limit('least', 'number')} to ${d.limit('most', 'number')}; a count is whole.`,
  }),
  'angle-out-of-range': (d) => ({
    cause: `${d.place} of ${d.text('written')} is no angle from level to upright.`,
    next: 'Write an angle above 0 and up to 90 deg.',
  }),
  'probe-calibration-order': (d) => ({
    cause: `${d.place}, ${d.figure('velocity', 'velocity')}, does not lie above the row before.`,
    next: 'Put the rows in order of rising velocity; the reading must rise from row to row too.',
  }),
  'manometer-missing': (d) => ({
    cause: `${d.place} is a length in ${d.text('written')}, and no manometer is described.`,
    next: 'State the liquid of the manometer, or write the reading as a pressure.',
  }),
  'manometer-liquid-light': (d) => ({
    cause:
      `The liquid of the manometer, ${d.figure('liquid', 'density')}, is not heavier than the fluid above it, ` +
      `${d.figure('fluid', 'density')}.`,
    next: 'Check the liquid and its density.',
  }),
  'above-sonic': (d) => ({
    cause:
      `A reading of ${d.figure('differential', 'differential')} at ${d.figure('pressure', 'pressure')} would be ` +
      'faster than sound.',
    next: `Check ${d.place}, its unit and the static pressure.`,
  }),
};
