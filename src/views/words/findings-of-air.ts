/** Findings on moist air, on viscosity out of range, and on gases by the cubic equation. */
import type { FindingWords } from './detail.ts';

export const checksOfAir: Readonly<Record<string, FindingWords>> = {
  'viscosity-range-temperature': {
    role: 'temperature',
    text: (figure) => `Temperature ${figure}, against the range of the viscosity`,
  },
  'enhancement-temperature': {
    role: 'temperature',
    text: (figure) => `Saturation at ${figure}, against the range in which the moisture of air is known`,
  },
  'enhancement-pressure': {
    role: 'pressure',
    text: (figure) => `Pressure ${figure}, against the range in which the moisture of air is known`,
  },
  'psychrometer-pressure': {
    role: 'pressure',
    text: (figure) => `Pressure ${figure}, against the range in which wet bulbs are read`,
  },
  'fluid-range-density': {
    role: 'factor',
    text: (figure) => `Density over the critical density ${figure}, dense for a cubic equation`,
  },
};
