/** Labels of the rows of state, pipe and element. */
import type { DutyName } from '../../core/document/project.ts';

export const stateLabels = {
  pressure: 'Pressure upstream',
  temperature: 'Temperature',
  density: 'Density',
  viscosity: 'Dynamic viscosity',
  isentropicExponent: 'Isentropic exponent',
  compressibility: 'Compressibility factor',
  vapourPressure: 'Vapour pressure',
  saturationTemperature: 'Saturation temperature',
  baseDensity: 'Density at the base state',
  molarMass: 'Molar mass',
  relativeDensity: 'Relative density',
  quality: 'Quality, vapour by mass',
} as const;

/** The range of a formulation: temperatures, then pressures. */
export const holdsFor = (bounds: readonly string[]): string => `holds for ${bounds.join(', ')}`;

/** The temperature upstream, found from the one behind the element. */
export const fromDownstream = (measured: string): string =>
  `from ${measured} measured downstream, with the loss at maximum flow`;
export const asDownstream = 'as measured downstream';

export const withMaterial = (label: string, material: string | undefined): string =>
  material === undefined ? label : `${label}, ${material.charAt(0).toLowerCase()}${material.slice(1)}`;

export const measuredAt = (temperature: string): string => `measured at ${temperature}`;
export const noGrowth = 'no material given: no thermal growth';

export const metalLabels = {
  pipe: 'Pipe bore',
  pipeAtLine: 'Pipe bore at the line temperature',
  roughness: 'Pipe roughness',
  before: 'Straight pipe before',
  after: 'Straight pipe after',
  atLine: (opening: string): string => `${opening === 'throat' ? 'Throat' : 'Bore'} at the line temperature`,
  opening: (opening: string): string => (opening === 'throat' ? 'Throat' : 'Bore'),
  ratio: 'Diameter ratio',
  plate: 'Plate thickness',
  edge: 'Edge thickness',
  width: 'Width of the bar',
  expansion: 'Expansion number',
} as const;

export const workingGroupTitles: Readonly<Record<'meter' | DutyName, string>> = {
  meter: 'State and metal',
  maximum: 'At maximum flow',
  normal: 'At normal flow',
  minimum: 'At minimum flow',
};

/** What the file keeps and this version does not evaluate. */
export const unreadNote = (keys: string): string => `Kept in the file, not evaluated by this version: ${keys}.`;

/** 'Pipe bore, DN 100 schedule 40'; a size that is not of the table stands as it is written. */
export function withSize(label: string, size: string | undefined): string {
  if (size === undefined || size.trim() === '') return label;
  return `${label}, ${size.replace(/^(DN \d+), /, '$1 schedule ')}`;
}
