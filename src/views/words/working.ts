/** Titles of the working lines by the figure they explain. */
import { catalogue } from './catalogue.ts';

export const workingTitles: Readonly<Record<string, string>> = {
  density: 'Density',
  'density-reference': 'Density at the reference pressure',
  viscosity: 'Dynamic viscosity',
  isentropicExponent: 'Isentropic exponent',
  speedOfSound: 'Speed of sound',
  compressibility: 'Compressibility factor',
  'saturation-pressure': 'Saturation pressure of water',
  'enhancement-factor': 'Enhancement factor',
  'water-fraction': 'Mole fraction of water vapour',
  'vapour-partial-pressure': 'Partial pressure of the vapour',
  'molar-mass': 'Molar mass',
  vapourPressure: 'Vapour pressure',
  baseDensity: 'Density at the base state',
  relativeDensity: 'Relative density',
  'pipe-bore': 'Pipe bore at the line temperature',
  'element-bore': 'Bore at the line temperature',
  bore: 'Bore as measured',
  'diameter-ratio': 'Diameter ratio',
  'approach-factor': 'Velocity of approach factor',
  'reynolds-pipe': 'Pipe Reynolds number',
  C: 'Discharge coefficient',
  epsilon: 'Expansibility factor',
  'mass-flow': 'Mass flow',
  differential: 'Differential pressure',
  'volume-flow': 'Volume flow at the upstream state',
  'base-volume-flow': 'Volume flow at the base state',
  velocity: 'Mean velocity in the pipe',
  'traverse-velocity': 'Velocity at the strongest reading',
  'traverse-mean': 'Mean velocity in the section',
  loss: 'Permanent pressure loss',
  uncertainty: 'Uncertainty of the flow, 95\u00a0%',
};

export const workingTitle = catalogue('working', workingTitles);
