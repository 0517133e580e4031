/** Problems of the fluid's state and of the solution. */
import type { Detail, ProblemWords } from './detail.ts';

/** The fluid as the model found it, since an unexpected phase is the usual cause. */
const ofFluid = (d: Detail): string => `, with a fluid (${d.text('phase')}) of ${d.figure('density', 'density')}`;

export const solvingProblems: ProblemWords = {
  'water-out-of-range': (d) => ({
    cause:
      `${d.figure('pressure', 'pressure')} and ${d.figure('temperature', 'temperature')} lie outside the ` +
      'formulation of water and steam.',
    next:
      `It holds from ${d.limit('lowestTemperature', 'temperature')} to ` +
      `${d.limit('highestTemperature', 'temperature')}, and at this temperature up to ` +
      `${d.limit('highestPressure', 'pressure')}: check ${d.place}.`,
  }),
  'phase-impossible': (d) => ({
    cause:
      `Water is no ${d.text('phase')} at ${d.figure('pressure', 'pressure')} and ` +
      `${d.figure('temperature', 'temperature')}.`,
    next: 'Leave the phase to the state, or check pressure and temperature.',
  }),
  'phase-far-from-saturation': (d) => ({
    cause:
      `At ${d.figure('pressure', 'pressure')} water boils at ${d.figure('saturationTemperature', 'temperature')}; ` +
      `at ${d.figure('temperature', 'temperature')} it is too far from there to be held as ${d.text('phase')}.`,
    next: 'Leave the phase to the state, or check pressure and temperature.',
  }),
  'differential-exceeds-pressure': (d) => ({
    cause:
      `The differential of ${d.figure('differential', 'differential')} is not below the upstream pressure of ` +
      `${d.figure('pressure', 'pressure')}.`,
    next: 'Lower the differential or the flow, or check the upstream pressure.',
  }),
  'differential-beyond-critical': (d) => ({
    cause:
      `The differential of ${d.figure('differential', 'differential')} is more than ${d.limit('percent', 'percent')} of the ` +
      `upstream pressure of ${d.figure('pressure', 'pressure')}: the flow reaches the speed of sound and grows no further.`,
    next: 'Lower the differential or raise the upstream pressure.',
  }),
  'differential-too-large': (d) => ({
    cause:
      `This flow needs a differential of more than ${d.limit('percent', 'percent')} of the upstream pressure of ` +
      `${d.figure('pressure', 'pressure')}, beyond what the expansibility factor is known for.`,
    next: 'Choose a larger bore or a smaller flow.',
  }),
  'temperature-unsettled': (d) => ({
    cause:
      `The temperature upstream did not settle from that measured downstream: it was last sought from ` +
      `${d.figure('lower', 'temperature')} to ${d.figure('upper', 'temperature')}.`,
    next: 'Check pressure, temperature and flow: the state is near a border of its phase. Or measure upstream.',
  }),
  'flow-unsettled': (d) => ({
    cause:
      `The flow did not settle: the discharge coefficient was last sought from ` +
      `${d.figure('lower', 'coefficient')} to ${d.figure('upper', 'coefficient')}.`,
    next: 'Check bore, differential and fluid.',
  }),
  'bore-unsettled': (d) => ({
    cause:
      `The bore did not settle: the diameter ratio was last sought from ${d.figure('lower', 'ratio')} to ` +
      `${d.figure('upper', 'ratio')}.`,
    next: 'Check flow, differential and fluid.',
  }),
  'bore-too-large': (d) => ({
    cause: `Even a diameter ratio of ${d.limit('ratio', 'ratio')} makes more than this differential${ofFluid(d)}.`,
    next: 'Raise the differential, lower the flow or choose a larger pipe.',
  }),
  'bore-too-small': (d) => ({
    cause: `Even a diameter ratio of ${d.limit('ratio', 'ratio')} makes less than this differential${ofFluid(d)}.`,
    next: 'Lower the differential, raise the flow or choose a smaller pipe.',
  }),
  'bore-not-below-pipe': (d) => ({
    cause: `The bore of ${d.figure('bore', 'bore')} is not smaller than the pipe bore of ${d.figure('pipe', 'bore')}.`,
    next: 'Choose a smaller bore or a larger pipe.',
  }),
  'bore-none': () => ({
    cause: 'This element has no bore that could be found.',
    next: 'Choose the differential or the flow to be found.',
  }),
  'bar-too-wide': (d) => ({
    cause: `A bar ${d.figure('width', 'length')} wide leaves nothing of a pipe bore of ${d.figure('pipe', 'bore')}.`,
    next: 'Check the width of the bar and the pipe bore.',
  }),
  'reynolds-order': (d) => ({
    cause: `The greatest Reynolds number of K, ${d.figure('most', 'reynolds')}, is not above the least, ${d.figure('least', 'reynolds')}.`,
    next: 'Write the two as they stand in the maker’s sheet.',
  }),
  'base-density-missing': (d) => ({
    cause: `This fluid has no density at the base state, and ${d.place} is a volume flow there.`,
    next: 'State the density at the base state, or write a mass flow or a volume flow at the upstream state.',
  }),
};
