/**
 * How a sentence gets its figures: it names the figure and its role, present/ prints it in display units. Words know
 * no units and round nothing.
 */
export type Role =
  | 'bore' // pipe, bore and throat diameters
  | 'length'
  | 'roughness'
  | 'pressure' // absolute
  | 'differential'
  | 'loss'
  | 'massFlow'
  | 'volumeFlow'
  | 'baseVolumeFlow'
  | 'mass' // what passed
  | 'volume'
  | 'temperature'
  | 'temperatureDifference'
  | 'density'
  | 'viscosity'
  | 'velocity'
  | 'head'
  | 'angle'
  | 'molarMass'
  | 'reynolds'
  | 'ratio' // diameter ratio
  | 'coefficient'
  | 'factor'
  | 'percent' // the figure is a percentage
  | 'uncertainty' // the same, of a flow
  | 'depth' // of a point, as a mark on a tube
  | 'area'
  | 'count' // whole
  | 'bores' // multiples of the pipe bore
  | 'number';

/** SI figures as text with their units. */
export interface Print {
  /** What was found or measured. */
  readonly figure: (si: number, role: Role) => string;
  /** What is set: a limit keeps no zeros that only say how it was rounded. */
  readonly limit: (si: number, role: Role) => string;
}

const siUnits: Readonly<Record<Role, string>> = {
  bore: 'm',
  length: 'm',
  roughness: 'm',
  pressure: 'Pa(a)',
  differential: 'Pa',
  loss: 'Pa',
  massFlow: 'kg/s',
  volumeFlow: 'm³/s',
  baseVolumeFlow: 'base m³/s',
  mass: 'kg',
  volume: 'm³',
  temperature: 'K',
  temperatureDifference: 'K',
  density: 'kg/m³',
  viscosity: 'Pa·s',
  velocity: 'm/s',
  head: 'm',
  angle: 'rad',
  molarMass: 'kg/mol',
  reynolds: '',
  ratio: '',
  coefficient: '',
  factor: '',
  percent: '%',
  uncertainty: '%',
  depth: 'm',
  area: 'm²',
  count: '',
  bores: 'D',
  number: '',
};

const asItIs = (si: number, role: Role): string => `${si} ${siUnits[role]}`.trimEnd();

/** The figures as they are, in SI: where no meter says which units to show. */
export const printSI: Print = { figure: asItIs, limit: asItIs };
