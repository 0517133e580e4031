/** Findings on a liquid outside the range of its figures, and on wet steam. */
import type { FindingWords } from './detail.ts';

export const checksOfLiquids: Readonly<Record<string, FindingWords>> = {
  'liquid-density-range': {
    role: 'temperature',
    text: (figure) => `Temperature ${figure}, against the range of the density`,
  },
  'liquid-viscosity-range': {
    role: 'temperature',
    text: (figure) => `Temperature ${figure}, against the range of the viscosity`,
  },
  'liquid-pressure-range': {
    role: 'pressure',
    text: (figure) => `Pressure ${figure}, against the range of the correction for pressure`,
  },
  'viscosity-thin': {
    role: 'number',
    text: (figure) => `Viscosity ${figure} mm²/s, thin for the line of an oil`,
    limit: (bounds) => `${bounds} mm²/s`,
  },
  'caustic-strong': {
    role: 'percent',
    text: (figure) => `Caustic soda of ${figure}: the density may be 0.6\u00a0% low`,
  },
  'wet-steam': {
    role: 'percent',
    text: (figure) =>
      `Wet steam of quality ${figure}: the expansibility of a mixture is not defined, that of dry steam is taken`,
  },
};
