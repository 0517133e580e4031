/** Problems of a gas: its composition, and states that its equation does not have. */
import type { ProblemWords } from './detail.ts';

export const gasProblems: ProblemWords = {
  'component-unknown': (d) => ({
    cause: `'${d.text('written')}' is no component of a gas mixture here.`,
    next: `Name one of ${d.text('known')}.`,
  }),
  'component-twice': (d) => ({
    cause: `'${d.text('written')}' stands in the composition already, as '${d.text('other')}'.`,
    next: 'Add the two shares and leave one line out.',
  }),
  'fraction-negative': (d) => ({
    cause: `The share of '${d.text('written')}' is negative.`,
    next: 'Write a share from 0 to 1, or from 0 % to 100 %.',
  }),
  'composition-sum': (d) => ({
    cause: `The shares of the composition add up to ${d.figure('sum', 'number')}, not to 1.`,
    next: 'Correct them, write % behind each if they are percentages, or let them be brought to 1.',
  }),
  'gas-out-of-range': (d) => ({
    cause: `No gas is computed at ${d.figure('pressure', 'pressure')} and ${d.figure('temperature', 'temperature')}.`,
    next:
      `Stay from ${d.limit('lowestTemperature', 'temperature')} to ${d.limit('highestTemperature', 'temperature')} ` +
      `and up to ${d.limit('highestPressure', 'pressure')}.`,
  }),
  'gas-density-none': (d) => ({
    cause:
      `This composition has no ${d.text('phase')} at ${d.figure('pressure', 'pressure')} and ` +
      `${d.figure('temperature', 'temperature')}.`,
    next:
      d.text('phase') === 'liquid'
        ? 'Check pressure and temperature, or let it be a gas.'
        : 'It is liquid or in two phases there: check pressure and temperature, or state that it is a liquid.',
  }),
  'gas-beyond-equation': (d) => ({
    cause:
      `The equation of state gives no real figures for this composition at ${d.figure('pressure', 'pressure')} and ` +
      `${d.figure('temperature', 'temperature')}.`,
    next: 'Check pressure, temperature and composition: the state lies far outside its range.',
  }),
};
