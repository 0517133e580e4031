/** Problems of a gas: its composition, and states that its equation does not have. */
import type { ProblemWords } from './detail.ts';
import { gasLabel } from './gases.ts';

export const gasProblems: ProblemWords = {
  'equation-unused': (d) => ({
    cause: `No equation of mixtures holds ${gasLabel(d.text('gas')).toLowerCase()}: it is computed by a cubic equation.`,
    next: 'Leave the equation of state empty.',
  }),
  'component-unknown': (d) => ({
    cause: `'${d.text('written')}' is no component of a gas mixture here.`,
    next: `Choose a component of the list, such as ${d.list('nearest')}.`,
  }),
  'component-twice': (d) => ({
    cause: `'${d.text('written')}' stands in the composition already, as '${d.text('other')}'.`,
    next: 'Leave one of the two lines out, and add its share to the other.',
  }),
  'fraction-negative': (d) => ({
    cause: `The share of '${d.text('written')}' is negative.`,
    next: 'Write a share from 0 to 1, or from 0\u00a0% to 100\u00a0%.',
  }),
  'composition-sum': (d) => ({
    cause: `The shares of the composition add up to ${d.figure('sum', 'number')}, not to 1.`,
    next: 'Check each, write % behind percentages, or let them be brought to 1.',
  }),
  'gas-out-of-range': (d) => ({
    cause: `No gas is computed at ${d.figure('pressure', 'pressure')} and ${d.figure('temperature', 'temperature')}.`,
    next:
      `Check the state: it holds from ${d.limit('lowestTemperature', 'temperature')} to ${d.limit('highestTemperature', 'temperature')} ` +
      `and up to ${d.limit('highestPressure', 'pressure')}.`,
  }),
  'gas-density-none': (d) => ({
    cause:
      `This composition has no ${d.text('phase')} at ${d.figure('pressure', 'pressure')} and ` +
      `${d.figure('temperature', 'temperature')}.`,
    next:
      d.text('phase') === 'liquid'
        ? 'Check pressure and temperature, or let it be a gas.'
        : 'Check pressure, temperature and composition: it is liquid or in two phases there.',
  }),
  'gas-beyond-equation': (d) => ({
    cause:
      `The equation of state gives no real figures for this composition at ${d.figure('pressure', 'pressure')} and ` +
      `${d.figure('temperature', 'temperature')}.`,
    next: 'Check pressure, temperature and composition: the state lies far outside its range.',
  }),
};
