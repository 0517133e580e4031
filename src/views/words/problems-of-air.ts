/** Problems of air and its moisture, of a gas by its name, and of a site. */
import type { Detail, ProblemWords } from './detail.ts';

const names: Readonly<Record<string, string>> = {
  relativeHumidity: 'the relative humidity',
  dewPoint: 'the dew point',
  wetBulb: 'the wet bulb temperature',
};

const temperatureOf = (d: Detail, key: string): string => d.figure(key, 'temperature');
const fromTo = (d: Detail): string =>
  `from ${d.limit('lowest', 'temperature')} to ${d.limit('highest', 'temperature')}`;

export const airProblems: ProblemWords = {
  'moisture-twice': (d) => ({
    cause: `The moisture is given twice, by ${names[d.text('first')] ?? ''} and by ${names[d.text('second')] ?? ''}.`,
    next: 'Leave one of them empty: the one that was not measured.',
  }),
  'humidity-out-of-range': (d) => ({
    cause: `Air at ${temperatureOf(d, 'temperature')} has no relative humidity: it is known ${fromTo(d)}.`,
    next: 'State the dew point, or leave the air dry.',
  }),
  'vapour-exceeds-pressure': (d) => ({
    cause:
      `The vapour would stand at ${d.figure('vapourPressure', 'pressure')} in air of ` +
      `${d.figure('pressure', 'pressure')}, more than air can hold.`,
    next: `Check ${d.place} and the state, or choose steam: air holds a mole fraction of vapour up to ${d.limit('most', 'number')}.`,
  }),
  'dew-point-out-of-range': (d) => ({
    cause: `The dew point of ${temperatureOf(d, 'dewPoint')} lies outside the range ${fromTo(d)}.`,
    next: 'Check the dew point, or leave the air dry.',
  }),
  'dew-point-above-temperature': (d) => ({
    cause: `The dew point of ${temperatureOf(d, 'dewPoint')} lies above the air at ${temperatureOf(d, 'temperature')}.`,
    next: 'Check both: water would condense. The dew point is that at the pressure in the line.',
  }),
  'wet-bulb-out-of-range': (d) => ({
    cause: `The wet bulb of ${temperatureOf(d, 'wetBulb')} lies outside the range ${fromTo(d)}.`,
    next: 'State the dew point or the relative humidity.',
  }),
  'wet-bulb-above-temperature': (d) => ({
    cause: `The wet bulb of ${temperatureOf(d, 'wetBulb')} lies above the air at ${temperatureOf(d, 'temperature')}.`,
    next: 'Check both: a wet bulb is never warmer than the air.',
  }),
  'wet-bulb-too-low': (d) => ({
    cause:
      `The wet bulb of ${temperatureOf(d, 'wetBulb')} is too cold for air at ${temperatureOf(d, 'temperature')}: ` +
      'even dry air would not cool it so far.',
    next: 'Check both temperatures.',
  }),
  'gas-named-twice': (d) => ({
    cause: `The gas is given twice, by its name '${d.text('written')}' and by a composition.`,
    next: 'Leave one out: the composition for a pure gas, the name for a mixture.',
  }),
  'altitude-out-of-range': (d) => ({
    cause: `The standard atmosphere has no altitude of ${d.figure('altitude', 'head')}.`,
    next: `Write an altitude from ${d.limit('lowest', 'head')} to ${d.limit('highest', 'head')}.`,
  }),
  'latitude-out-of-range': (d) => ({
    cause: `No place has a latitude of ${d.text('written')}.`,
    next: 'Write a latitude from \u221290\u00b0 at the south pole to 90\u00b0 at the north pole.',
  }),
};
