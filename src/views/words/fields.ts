/** Labels of the document's fields by path, and how a sentence names each. */

import { componentLabel } from './components.ts';
import { instrumentLabels, instrumentPlaces, readingParts } from './fields-of-instrument.ts';
import { logLabels } from './fields-of-log.ts';
import { readingLabel, traverseLabels } from './fields-of-traverse.ts';

const labels: Readonly<Record<string, string>> = {
  tag: 'Tag',
  service: 'Service',
  find: 'Quantity to find',
  fluid: 'Fluid',
  'fluid.kind': 'Fluid',
  'fluid.phase': 'Phase',
  'fluid.density': 'Density',
  'fluid.viscosity': 'Dynamic viscosity',
  'fluid.isentropicExponent': 'Isentropic exponent',
  'fluid.molarMass': 'Molar mass',
  'fluid.compressibility': 'Compressibility factor',
  'fluid.vapourPressure': 'Vapour pressure',
  'fluid.baseDensity': 'Density at the base state',
  'fluid.quality': 'Quality of the steam',
  'fluid.composition': 'Composition',
  'fluid.equation': 'Equation of state',
  'fluid.basis': 'Fractions',
  'fluid.normalise': 'Bring the sum to 100\u00a0%',
  'fluid.name': 'Name of the fluid',
  'fluid.relativeHumidity': 'Relative humidity',
  'fluid.dewPoint': 'Dew point',
  'fluid.wetBulb': 'Wet-bulb temperature',
  'fluid.baseBasis': 'Base volume counts',
  'fluid.concentration': 'Concentration',
  'fluid.concentrationBasis': 'Concentration counts',
  'fluid.table': 'Table of the liquid',
  'fluid.viscosityRule': 'Viscosity between the rows',
  'fluid.densityAt15': 'Density at 15\u00a0°C',
  'fluid.densityAt60F': 'Density at 60\u00a0°F',
  'fluid.apiGravity': 'API gravity',
  'fluid.viscosities': 'Viscosities of the oil',
  'fluid.bulkModulus': 'Bulk modulus',
  'fluid.override': 'Figures in place of the model’s',
  'fluid.override.density': 'Density in place of the model’s',
  'fluid.override.viscosity': 'Viscosity in place of the model’s',
  'fluid.override.isentropicExponent': 'Isentropic exponent in place of the model’s',
  'fluid.override.vapourPressure': 'Vapour pressure in place of the model’s',
  upstream: 'Upstream state',
  'upstream.pressure': 'Upstream pressure',
  'upstream.temperature': 'Temperature',
  'upstream.temperatureAt': 'Temperature measured',
  pipe: 'Pipe',
  'pipe.size': 'Pipe size',
  'pipe.bore': 'Pipe bore',
  'pipe.material': 'Pipe material',
  'pipe.measuredAt': 'Pipe bore measured at',
  'pipe.roughness': 'Pipe roughness Ra',
  element: 'Element',
  'element.kind': 'Kind of element',
  'element.tappings': 'Tappings',
  'element.convergent': 'Convergent',
  'element.coefficient': 'Flow coefficient K',
  'element.area': 'Area of K',
  'element.width': 'Width of the bar',
  'element.coefficientUncertainty': 'Uncertainty of K',
  'element.expansion': 'Expansion number of K',
  'element.reynoldsMin': 'Least Reynolds number of K',
  'element.reynoldsMax': 'Greatest Reynolds number of K',
  'element.velocityMax': 'Greatest velocity of the maker’s sheet',
  'element.straightBefore': 'Straight pipe needed before',
  'element.straightAfter': 'Straight pipe needed after',
  'element.loss': 'Permanent loss as a share of the differential',
  'element.bore': 'Bore',
  'element.material': 'Element material',
  'element.measuredAt': 'Bore measured at',
  'element.plateThickness': 'Plate thickness',
  'element.edgeThickness': 'Edge thickness',
  'element.calibration': 'Calibration',
  duty: 'Flows',
  'duty.maximum': 'Maximum flow',
  'duty.normal': 'Normal flow',
  'duty.minimum': 'Minimum flow',
  differential: 'Differential pressure',
  uncertainty: 'Uncertainties',
  'uncertainty.bore': 'Uncertainty of the bore',
  'uncertainty.pipe': 'Uncertainty of the pipe bore',
  'uncertainty.differential': 'Uncertainty of the differential',
  'uncertainty.density': 'Uncertainty of the density',
  installation: 'Installation',
  'installation.fitting': 'Nearest fitting upstream',
  'installation.before': 'Straight pipe before',
  'installation.after': 'Straight pipe after',
  'installation.fluctuation': 'Fluctuation of the differential',
  title: 'Title',
  revision: 'Revision',
  preparedBy: 'Prepared by',
  checkedBy: 'Checked by',
  'site.atmosphere': 'Atmospheric pressure',
  'site.gravity': 'Gravity',
  'site.altitude': 'Altitude',
  'site.latitude': 'Latitude',
  'base.pressure': 'Base pressure',
  'base.temperature': 'Base temperature',
  display: 'Units',
  ...instrumentLabels,
  readings: 'Readings',
  meters: 'Meters',
  traverses: 'Surveys',
  ...traverseLabels,
  ...logLabels,
};

/** Fields inside a row of a list. */
const inRow: Readonly<Record<string, string>> = {
  reynolds: 'Reynolds number',
  coefficient: 'coefficient',
  temperature: 'temperature',
  density: 'density',
  viscosity: 'viscosity',
  velocity: 'velocity',
  ...readingParts,
};

/** A path without the meter it stands in and with its row numbers apart. */
const own = (path: string): string => path.replace(/^meters(\.\d+\.|\[\d+\]\.)/, '');

/** Label of a field; a row of a list is numbered from 1, a field this version does not know stands as written. */
export function fieldLabel(path: string): string {
  const plain = own(path);
  const known = labels[plain] ?? readingLabel(plain);
  if (known !== undefined) return known;
  const component = /^fluid\.composition\.(.+)$/.exec(plain)?.[1];
  if (component !== undefined) return `Share of ${componentLabel(component).replace(/^[A-Z](?=[a-z])/, lowered)}`;
  const row = /^(.+?)[.[](\d+)\]?(?:\.(.+))?$/.exec(plain);
  if (row === null) return plain === '' ? 'Meter' : plain;
  const [, list = '', place = '0', rest] = row;
  return `${labels[list] ?? list}, row ${Number(place) + 1}${rest === undefined ? '' : `, ${inRow[rest] ?? rest}`}`;
}

const lowered = (letter: string): string => letter.toLowerCase();

/** The field as it stands inside a sentence: 'the upstream pressure', 'the tappings'. */
export function fieldPlace(path: string): string {
  const place = instrumentPlaces[own(path)];
  if (place !== undefined) return place;
  const label = fieldLabel(path);
  const plain = /^[A-Z][a-z]/.test(label) ? label.charAt(0).toLowerCase() + label.slice(1) : label;
  return `the ${plain}`;
}
