/** Problems of a liquid, of steam on the saturation line, and of figures that the user puts in. */
import type { ProblemWords } from './detail.ts';

export const liquidProblems: ProblemWords = {
  'fluid-name-unknown': (d) => ({
    cause: `'${d.text('written')}' is not among the fluids that are known by name.`,
    next: `Choose a name such as ${d.list('nearest')}, or state the figures of the fluid.`,
  }),
  'share-out-of-range': (d) => ({
    cause: `${d.place} '${d.text('written')}' is no share of a whole.`,
    next: 'Write a share from 0\u00a0% to 100\u00a0%.',
  }),
  'table-too-long': (d) => ({
    cause: `${d.place} has ${d.text('count')} rows, and a table has at most ${d.text('most')}.`,
    next: 'Leave rows out where the figures change little.',
  }),
  'table-too-short': (d) => ({
    cause: `${d.place} has ${d.text('count')} rows, and a line needs two.`,
    next: 'State at least two temperatures.',
  }),
  'table-order': (d) => ({
    cause:
      `${d.place} is ${d.figure('temperature', 'temperature')}, not above the ` +
      `${d.figure('before', 'temperature')} of the row before.`,
    next: 'Put the rows in order of rising temperature, each once.',
  }),
  'walther-too-thin': (d) => ({
    cause: `${d.place} is below 0.3\u00a0mm²/s, where the line of an oil ends.`,
    next: 'Use the other rule of viscosity, or check the unit.',
  }),
  'viscosity-rises': (d) => ({
    cause: `${d.place} is not below that of the row before, and no oil grows thicker when heated.`,
    next: 'Check temperatures and viscosities.',
  }),
  'liquid-twice': () => ({
    cause: 'The liquid is named and has a table of its own.',
    next: 'Leave one of the two out.',
  }),
  'concentration-unused': () => ({
    cause: 'A concentration is given for a liquid that is no mixture with water.',
    next: 'Leave the concentration out, or choose the mixture or solution.',
  }),
  'concentration-basis': () => ({
    cause: 'Only the inhibited glycols are known by their share of volume.',
    next: 'Write the concentration by mass.',
  }),
  'concentration-out-of-range': (d) => ({
    cause: `A concentration of ${d.figure('percent', 'percent')} is outside what is known of this mixture.`,
    next: `Write one from ${d.limit('min', 'percent')} to ${d.limit('max', 'percent')}.`,
  }),
  'petroleum-density-missing': () => ({
    cause: 'An oil is known by its density, and none is given.',
    next: 'State the density at 15\u00a0°C, the density at 60\u00a0°F or the API gravity.',
  }),
  'petroleum-density-twice': (d) => ({
    cause: `The density of this oil is given more than once; ${d.place} is one too many.`,
    next: 'Leave one of them.',
  }),
  'petroleum-density-out-of-range': (d) => ({
    cause: `${d.place} lies outside the tables of this kind of oil.`,
    next: `Check it: at 60\u00a0°F they hold from ${d.limit('min', 'density')} to ${d.limit('max', 'density')}.`,
  }),
  'liquid-boils': (d) => ({
    cause:
      `At ${d.figure('temperature', 'temperature')} this liquid boils at ${d.figure('vapourPressure', 'pressure')}, ` +
      `above the upstream pressure of ${d.figure('pressure', 'pressure')}.`,
    next: 'Check pressure and temperature, or choose a gas.',
  }),
  'liquid-density-out-of-range': (d) => ({
    cause: `The density of this liquid is not known at ${d.figure('temperature', 'temperature')}.`,
    next: `Check the temperature: it is known from ${d.limit('lowest', 'temperature')} to ${d.limit('highest', 'temperature')}.`,
  }),
  'liquid-viscosity-out-of-range': (d) => ({
    cause:
      `The viscosity of this liquid is not known at ${d.figure('temperature', 'temperature')}, only from ` +
      `${d.limit('lowest', 'temperature')} to ${d.limit('highest', 'temperature')}.`,
    next: 'State the viscosity, or check the temperature.',
  }),
  'liquid-viscosity-missing': () => ({
    cause: 'The viscosity of this liquid is not known, and none is given.',
    next: 'State the viscosity at the line temperature.',
  }),
  'liquid-pressure-too-high': (d) => ({
    cause: `The density of this liquid is not known at ${d.figure('pressure', 'pressure')}.`,
    next: `Check the pressure: its correction holds up to ${d.limit('highest', 'pressure')}.`,
  }),
  'quality-of-liquid': (d) => ({
    cause: `A quality of ${d.figure('percent', 'percent')} is none of wet steam, or the phase is held to liquid.`,
    next: 'Leave the quality out for water, or write one above 0\u00a0% for steam.',
  }),
  'no-saturation-pressure': (d) => ({
    cause: `Water and steam do not stand side by side at ${d.figure('pressure', 'pressure')}.`,
    next: `Check the pressure: they do from ${d.limit('lowest', 'pressure')} to ${d.limit('highest', 'pressure')}.`,
  }),
  'no-saturation-temperature': (d) => ({
    cause: `Water and steam do not stand side by side at ${d.figure('temperature', 'temperature')}.`,
    next: `Check the temperature: they do from ${d.limit('lowest', 'temperature')} to ${d.limit('highest', 'temperature')}.`,
  }),
  'wet-steam-off-line': (d) => ({
    cause:
      `Wet steam at ${d.figure('pressure', 'pressure')} has ${d.figure('saturationTemperature', 'temperature')}, not ` +
      `${d.figure('temperature', 'temperature')}.`,
    next: 'Leave the temperature out, or leave out the quality.',
  }),
  'override-unused': (d) => ({
    cause: `${d.place} has no use for a fluid that is ${d.text('phase')} here.`,
    next: 'Leave it out.',
  }),
};
