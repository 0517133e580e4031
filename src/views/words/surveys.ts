/** Words of a survey: rules, practices, the answer, the table of readings and what the place says around them. */
import type { SolvedTraverse } from '../../core/result/record.ts';
import type { Choice } from './elements.ts';

/** A list of which the first stands where nothing is written. */
type UsualFirst = readonly [Choice, ...Choice[]];

export const shapeChoices: readonly Choice[] = [
  { value: 'circular', label: 'Circular' },
  { value: 'rectangular', label: 'Rectangular' },
];

export const portChoices: UsualFirst = [
  { value: 'width', label: 'Along the width' },
  { value: 'height', label: 'Along the height' },
];

export const ruleChoices: readonly Choice[] = [
  { value: 'log-linear', label: 'Log-linear' },
  { value: 'log-tchebycheff', label: 'Log-Tchebycheff' },
  { value: 'equal-area', label: 'Equal areas' },
  { value: 'single-point', label: 'Single point' },
];

export const wallChoices: UsualFirst = [
  { value: 'leave', label: 'Left where they are' },
  { value: 'move', label: 'Moved to the distance' },
  { value: 'merge', label: 'Moved, those that meet made one' },
];

export const profileChoices: readonly Choice[] = [
  { value: 'laminar', label: 'Laminar' },
  { value: 'power', label: 'Power law' },
  { value: 'stated', label: 'Stated ratio' },
];

export const placeChoices: readonly Choice[] = [
  { value: 'centre', label: 'At the centre' },
  { value: 'mean-velocity', label: 'Where the mean is' },
];

export const probeChoices: readonly Choice[] = [
  { value: 'pitot-static', label: 'Pitot-static tube' },
  { value: 's-type', label: 'S-type tube' },
];

export const gaugeLiquidChoices: readonly Choice[] = [
  { value: 'water', label: 'Water' },
  { value: 'mercury', label: 'Mercury' },
];

export const blockageChoices: UsualFirst = [
  { value: 'off', label: 'Off' },
  { value: 'stem', label: 'By the area of the stem' },
];

const labelIn = (choices: readonly Choice[], value: string): string =>
  choices.find((choice) => choice.value === value)?.label ?? value;

export const ruleLabel = (rule: string): string => labelIn(ruleChoices, rule);

const shapeWords: Readonly<Record<string, string>> = { circular: 'Circular duct', rectangular: 'Rectangular duct' };

/** 'Rectangular duct, log-Tchebycheff'; what is not known stands as written. */
export function surveyLabel(shape: string, rule: string): string {
  const name = ruleLabel(rule);
  const parts = [shapeWords[shape] ?? 'Duct', name.charAt(0).toLowerCase() + name.slice(1)];
  return parts.filter(Boolean).join(', ');
}

const practices: Readonly<Record<SolvedTraverse['suggestions'][number]['practice'], string>> = {
  'iso-3966': 'ISO 3966',
  'epa-method-1': 'Stack tests',
  'air-balancing': 'Air balancing',
};

export const practiceLabel = (practice: keyof typeof practices): string => practices[practice];

/** '5 lines of 5 points'. */
export const gridText = (lines: number, points: number): string =>
  `${lines} ${lines === 1 ? 'line' : 'lines'} of ${points} ${points === 1 ? 'point' : 'points'}`;

export const pointsRead = (measured: number, points: number): string =>
  measured === 0
    ? `${points} ${points === 1 ? 'point waits' : 'points wait'} to be read`
    : `${measured} of ${points} points are read`;

export const readShort = (measured: number, points: number): string => `${measured} of ${points} read`;

export const countText = (points: number): string => `${points} ${points === 1 ? 'point' : 'points'}`;

export const termNamesOfTraverse: Readonly<
  Record<NonNullable<SolvedTraverse['uncertainty']>['terms'][number]['name'], string>
> = {
  reading: 'Readings',
  coefficient: 'Coefficient of the probe',
  density: 'Density',
  area: 'Area of the section',
  points: 'Number and place of the points',
};

/** What stands behind a term that the user did not state. */
export const unstatedTerm: Readonly<Record<keyof typeof termNamesOfTraverse, string>> = {
  reading: 'not stated, left out',
  coefficient: 'not stated, left out',
  density: 'not stated, from the fluid',
  area: 'not stated, left out',
  points: 'estimated from the rule and the lines',
};

/** One sentence for the terms that are left out; none for nothing. */
export function uncertaintyOpen(names: readonly string[]): string {
  if (names.length === 0) return '';
  return `The uncertainty is at least what stands here: not stated are ${names.join(', ').toLowerCase()}.`;
}

export const surveyRows = {
  meanVelocity: 'Mean velocity',
  meanSoFar: 'Mean of what is read so far',
  volumeFlow: 'Volume flow in the duct',
  massFlow: 'Mass flow',
  baseVolumeFlow: 'Volume flow at the base state',
  reynolds: 'Reynolds number of the duct',
  area: 'Inside area',
  hydraulicDiameter: 'Hydraulic diameter',
  port: 'Length of the port',
  scatter: 'Scatter of the velocities',
  lines: 'Spread between the lines',
  strong: 'Readings above a tenth of the largest',
  reversed: 'Readings below zero',
  still: 'Readings at zero',
  drift: 'Drift at the reference probe',
  averaging: 'Averaging the differentials would add',
  ruleError: 'Error of the rule on a 1/7-power profile',
  least: 'Slowest point',
  most: 'Fastest point',
  uncertainty: 'Uncertainty of the flow, 95\u00a0%',
} as const;

export const surveyWords = {
  noTag: 'no tag',
  staticPressure: 'Static pressure in the duct',
  working: 'State, velocity and flow',
  line: (at: number): string => `Line ${at}`,
  at: (place: string): string => `${place} from the wall`,
  turned: (angle: string): string => `${angle} from the first`,
  fromPort: 'from the outer end of the port',
  fromWall: 'from the inside of the wall',
  mean: 'Mean',
  moved: 'moved',
  suggestion: (practice: string, rule: string, grid: string): string => `${practice}: ${rule.toLowerCase()}, ${grid}`,
} as const;

/** The answer in pieces: words, and the figures that are found. */
export type SurveyPiece = string | { readonly found: 'volumeFlow' | 'meanVelocity' | 'progress' };

export const completeAnswer: readonly SurveyPiece[] = [
  { found: 'volumeFlow' },
  ' flows through the section at a mean of ',
  { found: 'meanVelocity' },
  '.',
];

export const openAnswer: readonly SurveyPiece[] = [{ found: 'progress' }, '.'];

/** Why each assumption matters to a survey, where that is not as for an element in a pipe. */
export const surveyMeanings: Readonly<Record<string, string>> = {
  steady: 'The flow stays the same from the first point to the last. A second probe at one place shows a drift.',
  incompressible: 'The gas keeps its density as it stops at the probe. The equation of the points carries the rest.',
  frictionless: 'The probe shows the whole dynamic pressure. Its coefficient stands in, above a least Reynolds number.',
  'one-streamline':
    'The stream runs along the duct, and the points see all of it. Straight duct and enough points make it so.',
  'one-phase': 'Only gas, or only liquid. What condenses changes the density and wets the tubes.',
  'range-and-span': 'The velocity is in the range of gauge and probe, the fluid in that of its figures.',
};

/** The cautions of work at a duct, short. */
export const ductCautions: readonly string[] = [
  'A calculation aid. Regulated stack tests follow their method and accredited people; what is billed follows the contract.',
  'Ports of ducts and stacks: gas may escape when a port is opened. Mind height, heat and static charge on the probe.',
  'In a zone where gas or dust may burn, gauge and probe need the certificate for it.',
];

export const surveyPicture = {
  section: 'Section of the duct with its points',
  sectionText: (section: string, lines: number, points: number): string =>
    `${section}, ${lines} ${lines === 1 ? 'line' : 'lines'}, ${points} points, numbered in the order of measuring.`,
  profile: 'Velocity along each line',
  mean: (velocity: string): string => `mean ${velocity}`,
} as const;

export const surveyPlace = {
  title: 'Surveys',
  add: 'Add a survey',
  choose: 'Survey',
  measure: 'Measure point by point',
  readings: 'Readings',
  hint: 'Enter goes on to the next point, Shift + Enter back. A column, a row or a block can be pasted into any box.',
  unit: 'Unit of the readings',
  clear: 'Clear the readings',
  lineMean: 'Mean of the line',
  moved: 'moved by the wall rule',
  plan: 'Plan',
  planOf: 'section, points, probe, fluid, plane',
  point: 'Point',
  depth: 'Depth',
  reading: 'Reading',
  velocity: 'Velocity',
  readingOf: (number: number): string => `Reading at point ${number}`,
  pictures: 'Section and velocities',
  taken: (count: number, left: number): string =>
    `${count} ${count === 1 ? 'reading is' : 'readings are'} taken.` +
    (left > 0
      ? ` ${left} more ${left === 1 ? 'has' : 'have'} no point and ${left === 1 ? 'is' : 'are'} left out.`
      : ''),
  block: (rows: number, columns: number): string => `The pasted block has ${rows} rows of ${columns}.`,
  byRows: 'Each row is a line',
  byColumns: 'Each column is a line',
  noFit: 'does not fit the plan',
  leave: 'Cancel',
  result: 'Result',
  quality: 'How good the readings are',
  terms: 'What makes the uncertainty',
  suggestions: 'Numbers of points in use',
  suggestionNote: 'A choice to begin with. What a contract or a method asks for goes before it.',
  take: 'Take it',
  takeOf: (text: string): string => `Take: ${text}`,
  chosen: 'as planned',
  waiting: 'waits for its figures',
  wrong: 'cannot be solved as it stands',
  stale: 'Last good result. What is typed now cannot be solved.',
  besides: 'Shown without the readings that cannot be read.',
  blank: 'The section is drawn to scale once this is given: ',
  stations: ['Section and points', 'Probe and gauge', 'Fluid in the duct', 'Plane and uncertainty'],
  none: 'none',
  sure: 'Uncertainty, 95\u00a0%',
  ownLiquid: 'Own liquid',
  calibration: 'Calibration of the probe, replaces the coefficient',
  reference: 'Second probe at one point, in the order of time',
  referenceRow: (at: number): string => `Reference reading ${at + 1}`,
  empty: 'How much flows in the duct?',
  emptyText:
    'State the section. The points, their depths and a form for the field follow; with the readings come mean, flow and checks.',
  begin: 'Plan a survey',
} as const;

export const measureWords = {
  title: 'Measure',
  point: (number: number, of: number): string => `Point ${number} of ${of}`,
  back: 'Back',
  next: 'Next',
  done: 'Done',
  close: 'Close',
  sign: 'Change the sign',
  last: 'That was the last point.',
} as const;

export const sheetOfSurvey = {
  type: 'Survey sheet',
  points: 'Points and readings',
  form: 'Form for the field',
  refused: 'This survey has no plan yet. What stands in the way:',
  section: 'Inside of the section',
  fluid: 'Fluid in the duct',
  result: 'Result',
  plan: 'Section',
  quality: 'Quality of the readings',
  ofFlow: 'of the flow',
  pictures: 'Section and velocities',
  depthFrom: (from: string, unit: string): string => `depth ${from}, in ${unit}`,
  weight: 'Weight',
  byLine: 'Points by line',
  toRead: 'To be read, point by point',
  toNote: 'To be noted at the duct',
  incomplete: 'Not read to the end: no flow can be stated.',
  differential: 'Differential',
} as const;

export const formFacts = {
  section: 'Inside of the section',
  points: 'Points',
  port: 'Length of the port',
  probe: 'Probe',
  kind: (kind: string): string => labelIn(probeChoices, kind),
  coefficient: 'Coefficient',
  legend: 'Points in the order of measuring; ports outside, with the number of the line. A square marks a moved point.',
} as const;

/** What a technician writes down beside the readings. */
export const fieldNotes: readonly string[] = [
  'Unit of the readings',
  'Gauge, its zero before',
  'Zero after',
  'Static pressure in the duct',
  'Temperature in the duct',
  'Humidity or wet bulb',
  'Barometer',
  'Second probe, begin and end',
  'Time, begin and end',
  'Inside sizes as measured',
  'By, date',
  'Remarks',
];
