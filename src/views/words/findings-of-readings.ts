/** Findings on one reading: what the instrument says of itself, and how the differential stands in the span. */
import type { Detail, FindingWords } from './detail.ts';

/** A signal is printed in its own unit, which no display changes. */
const signal = (figure: string, detail: Detail): string => `${figure}\u00a0${detail.text('unit')}`;
const ofSignal = (text: (figure: string) => string): FindingWords => ({
  role: 'number',
  text: (figure, detail) => text(signal(figure, detail)),
  limit: (bounds, detail) => signal(bounds, detail),
});

export const checksOfReadings: Readonly<Record<string, FindingWords>> = {
  'reading-reversed': {
    role: 'differential',
    text: (figure, detail) => {
      const causes = 'the flow runs backwards, the legs are crossed, or a leg holds something else';
      if (!detail.has('near')) return `Differential ${figure}: ${causes}`;
      return `Differential ${figure}, close to zero: the zero has drifted, ${causes}`;
    },
  },
  'reading-above-span': {
    role: 'differential',
    text: (figure) => `Differential ${figure}, above the span of the meter`,
  },
  'gauge-liquid-range': {
    role: 'temperature',
    text: (figure) => `Gauge liquid at ${figure}, outside the formula of its density`,
  },
  'legs-at-line-temperature': {
    role: 'temperature',
    text: (figure) =>
      `Instrument at ${figure}, and the process fluid in the legs counts with its density in the line: ` +
      'if the legs stand at the temperature of the instrument, state their density as what fills them',
    limit: (bounds) => `${bounds}, about that of the line`,
  },
  'signal-failed': ofSignal((figure) => `Signal ${figure}: the instrument reports a failure, there is no reading`),
  'signal-saturated': ofSignal((figure) => `Signal ${figure}: saturated, the flow is at least what stands here`),
  'signal-uncertain': ofSignal((figure) => `Signal ${figure}: below its valid range`),
  'below-cut-off': {
    role: 'differential',
    text: (figure) => `Differential ${figure}, below the cut-off: taken as no flow`,
  },
  'capillary-level': {
    role: 'length',
    text: (figure) => `The tube is narrow: its walls move the level by ${figure}, which belongs in the zero reading`,
  },
  'cells-apart': {
    role: 'differential',
    text: (figure) => `The two cells differ by ${figure}, more than their uncertainties together`,
  },
};

/** What the findings of readings are called in one or two words, for a row of the table. */
export const readingFlags: Readonly<Record<string, string>> = {
  'reading-reversed': 'legs crossed or flow reversed',
  'reading-above-span': 'above the span',
  'gauge-liquid-range': 'gauge liquid out of range',
  'signal-failed': 'instrument failed',
  'signal-saturated': 'saturated: at least',
  'signal-uncertain': 'signal uncertain',
  'below-cut-off': 'below the cut-off',
  'legs-at-line-temperature': 'legs at another temperature',
  'cells-apart': 'cells differ',
  'capillary-level': 'narrow tube',
  'reynolds-pipe': 'Reynolds number outside',
  'pressure-ratio': 'p₂/p₁ outside',
  flashing: 'flashing',
  cavitation: 'boils in the jet',
  'cavitation-margin': 'near boiling in the jet',
  subcooling: 'near boiling',
  superheat: 'near condensing',
};
