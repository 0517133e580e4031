/** Findings on a survey: the plane, the probe and the readings. */
import type { Detail, FindingWords } from './detail.ts';

const reduced = (bounds: string, detail: Detail): string =>
  `${bounds}; with more points ${detail.limit('least', 'bores')}`;

export const checksOfTraverse: Readonly<Record<string, FindingWords>> = {
  'traverse-straight-before': {
    role: 'bores',
    text: (figure) => `Straight duct before the plane ${figure}`,
    limit: reduced,
  },
  'traverse-straight-after': {
    role: 'bores',
    text: (figure) => `Straight duct after the plane ${figure}`,
    limit: reduced,
  },
  'traverse-swirl': {
    role: 'angle',
    text: (figure) => `Mean of the angles at which the probe reads nothing ${figure}`,
  },
  'traverse-point-count': { role: 'number', text: (_, detail) => `Points in the section: ${detail.text('points')}` },
  'traverse-usual-coefficient': {
    role: 'coefficient',
    text: (figure) => `No coefficient of this probe is stated; ${figure} is taken, as is usual for its kind`,
  },
  'traverse-head-size': { role: 'factor', text: (figure) => `Head of the probe over the size of the duct ${figure}` },
  'traverse-stem-blockage': {
    role: 'percent',
    text: (figure) => `At the deepest point the stem covers ${figure} of the section`,
    limit: (bounds, detail) => `${bounds}, never above ${detail.limit('most', 'percent')}`,
  },
  'traverse-wall-distance': {
    role: 'length',
    text: (figure, detail) => {
      const moved = Number(detail.text('moved'));
      return `Point nearest to a wall ${figure}${moved > 0 ? `; moved by the wall rule: ${moved}` : ''}`;
    },
  },
  'traverse-alignment': { role: 'angle', text: (figure) => `The probe stands ${figure} off the axis` },
  'traverse-hole-reynolds': {
    role: 'reynolds',
    text: (figure) => `Reynolds number of the hole at the slowest point ${figure}`,
  },
  'traverse-weak-readings': {
    role: 'percent',
    text: (figure, detail) =>
      `Readings above ${detail.limit('share', 'percent')} of the largest, ${detail.figure('largest', 'differential')}: ${figure}`,
  },
  'traverse-reversed': {
    role: 'number',
    text: (_, detail) =>
      `Readings below zero: ${detail.text('reversed')}, at zero: ${detail.text('still')}; both count as no velocity`,
  },
  'traverse-slow': {
    role: 'velocity',
    text: (figure) => `Mean velocity ${figure}, against what a gauge of 1\u00a0Pa can tell`,
  },
  'traverse-gauge': { role: 'factor', text: (figure) => `Sensitivity of the gauge, ratio T ${figure}` },
  'traverse-drift': { role: 'percent', text: (figure) => `The flow drifted by ${figure} at the reference probe` },
  'traverse-mach': { role: 'factor', text: (figure) => `Mach number at the strongest reading ${figure}` },
};
