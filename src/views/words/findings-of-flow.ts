/** Findings on fluid and flow. `{where}` stands for the flow at which it was found. */
import { catalogue } from './catalogue.ts';
import type { Detail, FindingWords } from './detail.ts';

const held = (detail: Detail): string =>
  detail.has('heldAt') ? `; the coefficient was held at that of ${detail.figure('heldAt', 'reynolds')}` : '';

const whyUncorrected: Readonly<Record<string, string>> = {
  'no-coefficient': 'no Joule–Thomson coefficient is known of this fluid',
  'no-loss': 'the permanent loss is not known',
  'on-saturation-line': 'on the saturation line it is tied to the pressure',
};
const uncorrected = (detail: Detail): string => catalogue('reason', whyUncorrected)(detail.text('why'));

const saturation = (word: string, side: string): FindingWords => ({
  role: 'temperatureDifference',
  text: (figure, detail) => {
    const forced = detail.text('forced') === 'yes' ? '; the phase was settled by hand' : '';
    return `${word} ${figure}, ${side} ${detail.figure('saturation', 'temperature')}${forced}`;
  },
});

const vapour: Pick<FindingWords, 'limit'> = { limit: (bounds) => `${bounds}, the vapour pressure` };

export const checksOfFlow: Readonly<Record<string, FindingWords>> = {
  fluctuation: {
    role: 'percent',
    text: (figure, detail) =>
      `The differential fluctuates by ${figure} of its mean; its root reads ${detail.figure('high', 'uncertainty')} high`,
  },
  'reynolds-pipe': {
    role: 'reynolds',
    text: (figure, detail) => `Pipe Reynolds number ${figure}{where}${held(detail)}`,
  },
  'calibration-range': {
    role: 'reynolds',
    text: (figure) => `Pipe Reynolds number ${figure}{where}, against the calibration`,
  },
  'pressure-ratio': { role: 'factor', text: (figure) => `Pressure ratio p₂/p₁ ${figure}{where}` },
  'expansion-number': {
    role: 'percent',
    text: (figure) =>
      `No expansion number is given: ε is taken as 1 at a differential of ${figure} of the pressure{where}`,
  },
  'bar-cavitation': { role: 'pressure', text: (figure) => `Pressure behind the bar ${figure}{where}`, ...vapour },
  'pipe-velocity': { role: 'velocity', text: (figure) => `Pipe velocity ${figure}{where}, against the maker’s sheet` },
  flashing: { role: 'pressure', text: (figure) => `Pressure downstream of the element ${figure}{where}`, ...vapour },
  cavitation: { role: 'pressure', text: (figure) => `Pressure in the jet ${figure}{where}`, ...vapour },
  'cavitation-margin': {
    role: 'number',
    text: (figure) => `Margin of the jet over boiling, in differentials, ${figure}{where}`,
  },
  subcooling: saturation('Subcooling', 'below boiling at'),
  superheat: saturation('Superheat', 'above condensing at'),
  'fluid-range-temperature': {
    role: 'temperature',
    text: (figure) => `Temperature ${figure} against the range of the equation of state`,
  },
  'fluid-range-pressure': {
    role: 'pressure',
    text: (figure) => `Pressure ${figure} against the range of the equation of state`,
  },
  'temperature-downstream': {
    role: 'temperature',
    text: (figure, detail) =>
      `Temperature ${figure} was measured downstream and taken as that upstream: ${uncorrected(detail)}`,
  },
  'detail-composition': {
    role: 'percent',
    text: (figure, detail) => `Share of ${detail.text('components')} ${figure}, against gas of pipeline quality`,
  },
  'fluid-two-phase': {
    role: 'number',
    text: (figure) => `A second phase may form: the sum of its trial phase is ${figure}`,
  },
  'fluid-liquid': {
    role: 'pressure',
    text: (figure) => `At ${figure} and its temperature this mixture is a liquid, not a gas`,
  },
  'water-dew-point': {
    role: 'pressure',
    text: (figure) => `Water may condense: its partial pressure is ${figure}`,
    limit: (bounds) => `${bounds}, its saturation pressure`,
  },
  velocity: { role: 'velocity', text: (figure) => `Pipe velocity ${figure}{where}` },
  span: { role: 'differential', text: (figure) => `Differential of the span ${figure}` },
  turndown: {
    role: 'percent',
    text: (figure, detail) => {
      const alone = detail.has('alone')
        ? `; the differential alone gives ±${detail.figure('alone', 'uncertainty')}`
        : '';
      return `The differential uses ${figure} of the span{where}${alone}`;
    },
  },
};
