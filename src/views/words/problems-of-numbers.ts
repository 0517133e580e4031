/** Problems of a quantity's text: number, unit, reference. */
import type { ProblemWords } from './detail.ts';

export const numberProblems: ProblemWords = {
  'number-empty': (d) =>
    d.has('unit')
      ? { cause: `${d.place} has the unit ${d.text('unit')} but no number.`, next: 'Write the number before the unit.' }
      : { cause: `${d.place} is empty.`, next: 'Write a number with its unit.' },
  'number-unreadable': (d) => ({
    cause: `${d.place} reads '${d.text('written')}', which is no number.`,
    next: 'Write digits with one decimal mark, then the unit.',
  }),
  'number-grouping': (d) => ({
    cause: `The digits of ${d.place} in '${d.text('written')}' are grouped in a way that can be misread.`,
    next: 'Write the number without groups and with one decimal mark.',
  }),
  'number-too-large': (d) => ({
    cause: `${d.place} '${d.text('written')}' is larger than any number that can be kept.`,
    next: 'Check the power of ten.',
  }),
  'number-too-small': (d) => ({
    cause: `${d.place} '${d.text('written')}' is smaller than any number that can be kept.`,
    next: 'Check the power of ten.',
  }),
  'unit-missing': (d) => ({
    cause: `${d.place} '${d.text('written')}' has no unit.`,
    next: `Write a unit of ${d.list('expected')} behind the number.`,
  }),
  'unit-unknown': (d) => ({
    cause: `The unit '${d.text('unit')}' of ${d.place} is not known.`,
    next: `Use a unit of ${d.list('expected')}${d.has('nearest') ? `, for example ${d.list('nearest')}` : ''}.`,
  }),
  'unit-wrong-measure': (d) => ({
    cause: `The unit '${d.text('unit')}' of ${d.place} measures ${d.list('actual')}.`,
    next: `Use a unit of ${d.list('expected')}.`,
  }),
  'unit-not-convertible': (d) => ({
    cause: `${d.place} in ${d.text('from')} cannot be turned into ${d.text('to')} by a factor alone.`,
    next: 'Write the number together with the new unit.',
  }),
  'pressure-reference-missing': (d) => ({
    cause: `The unit '${d.text('unit')}' of ${d.place} does not say from where the pressure counts.`,
    next: `Write ${d.list('choices')}: (a) above vacuum, (g) above the atmosphere.`,
  }),
  'pressure-reference-unwanted': (d) => ({
    cause: `${d.place} is a difference of pressures; '${d.text('unit')}' is a pressure above a reference.`,
    next: `Write ${d.list('choices')}.`,
  }),
  'share-basis-missing': (d) => ({
    cause: `${d.place} '${d.text('written')}' does not say of what it is a share.`,
    next: "Write '% of span' or '% of reading', or a pressure difference.",
  }),
  negative: (d) => ({
    cause: `${d.place} '${d.text('written')}' is below zero.`,
    next: 'Write zero or more.',
  }),
  'not-positive': (d) => ({
    cause: `${d.place} '${d.text('written')}' is not above zero.`,
    next: 'Write a value above zero.',
  }),
  'not-above-vacuum': (d) => ({
    cause: `${d.place} '${d.text('written')}' is not above vacuum.`,
    next: 'Check the sign, the reference (a) or (g), and the atmospheric pressure of the site.',
  }),
};
