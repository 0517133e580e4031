/** Problems of a meter's fields: type, choice, what is missing. */
import type { ProblemWords } from './detail.ts';

export const inputProblems: ProblemWords = {
  'field-missing': (d) => ({
    cause: `${d.place} is not given.`,
    next: d.has('choices') ? 'Choose one.' : 'Fill it in.',
  }),
  'text-expected': (d) => ({
    cause: `${d.place} should be text, and the file has ${d.text('written')}.`,
    next: 'Write the number with its unit between quotation marks.',
  }),
  'number-expected': (d) => ({
    cause: `${d.place} should be a number, and the file has ${d.text('written')}.`,
    next: 'Write a plain number.',
  }),
  'group-expected': (d) => ({
    cause: `${d.place} should be a group of named fields, and the file has ${d.text('written')}.`,
    next: 'Write it between braces, each field with its name.',
  }),
  'list-expected': (d) => ({
    cause: `${d.place} should be a list, and the file has ${d.text('written')}.`,
    next: 'Write it between square brackets.',
  }),
  'choice-unknown': (d) => ({
    cause: `'${d.text('written')}' is no choice for ${d.place}.`,
    next: `Choose ${d.list('choices')}.`,
  }),
  'figure-implausible': (d) => ({
    cause: `No meter has ${d.text('written')} for ${d.place}.`,
    next: 'Check the power of ten and the unit.',
  }),
  'calibration-order': (d) => ({
    cause: `${d.place} '${d.text('written')}' does not lie above the row before.`,
    next: 'Put the rows in order of rising Reynolds number, each once.',
  }),
  'element-unknown': (d) => ({
    cause: `'${d.text('written')}' is no kind of element.`,
    next: `Choose ${d.list('known')}.`,
  }),
  'element-not-offered': (d) => ({
    cause: `This version keeps '${d.text('written')}' in the file and does not compute it.`,
    next: `Choose ${d.list('known')}.`,
  }),
  'fluid-unknown': (d) => ({
    cause: `'${d.text('written')}' is no kind of fluid.`,
    next: `Choose ${d.list('offered')}.`,
  }),
  'isentropic-exponent-implausible': (d) => ({
    cause: `No gas has an isentropic exponent of ${d.figure('value', 'number')}.`,
    next: `Write one from ${d.limit('min', 'number')} to ${d.limit('max', 'number')}, or none for a liquid.`,
  }),
  'compressibility-implausible': (d) => ({
    cause: `No gas has a compressibility factor of ${d.figure('value', 'number')}.`,
    next: `Write one from ${d.limit('min', 'number')} to ${d.limit('max', 'number')}, or leave it out.`,
  }),
};
