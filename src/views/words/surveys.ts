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

export const probeLabel = (kind: string): string => labelIn(probeChoices, kind);

export const ruleLabel = (rule: string): string => labelIn(ruleChoices, rule);

const lowered = (label: string): string => label.charAt(0).toLowerCase() + label.slice(1);

/** The rule in the middle of a line: 'log-Tchebycheff', a name within keeping its capital. */
export const ruleInLine = (rule: string): string => lowered(ruleLabel(rule));

const shapeWords: Readonly<Record<string, string>> = { circular: 'Circular duct', rectangular: 'Rectangular duct' };

/** 'Rectangular duct, log-Tchebycheff'; what is not known stands as written. */
export function surveyLabel(shape: string, rule: string): string {
  const parts = [shapeWords[shape] ?? 'Duct', ruleInLine(rule)];
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
  suggestion: (practice: string, rule: string, grid: string): string => `${practice}: ${rule}, ${grid}`,
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
