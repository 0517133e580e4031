/** Words of the printed sheet. */
import type { DutyName } from '../../core/document/project.ts';
import type { Opening } from './elements.ts';
import { noGrowth } from './rows.ts';

export const sheetWords = {
  documentType: 'Sizing sheet',
  checksSheet: 'Checks and sources',
  dimensionsSheet: 'Dimensions and pipework',
  workingSheet: 'Working',
  fluid: 'Fluid upstream',
  pipe: 'Pipe',
  element: 'Element',
  duty: 'At each flow',
  curve: 'Flow against differential',
  verdicts: 'Checks by assumption',
  checks: 'Checks',
  terms: 'Uncertainty of the flow by its terms, 95\u00a0%',
  dimensions: 'Dimensions and tolerances',
  straight: 'Straight pipe',
  sources: 'Sources',
  workingHead: (tag: string): string => `${tag}: figure and equation`,
  problems: 'Not solved',
  refused: 'This meter has no result. What stands in the way:',
  inputs: 'Inputs as written',
  nothing: 'Nothing is written yet.',
} as const;

export const titleBlock = {
  project: 'Project',
  title: 'Title',
  type: 'Document type',
  identification: 'Identification number',
  revision: 'Revision',
  sheet: 'Sheet',
  prepared: 'Prepared',
  checked: 'Checked',
  approved: 'Approved',
  date: 'Date',
  signature: 'Signature',
  issued: 'Date of issue',
  printed: 'Printed',
  status: 'Status',
} as const;

export const sheetOf = ({ sheet, of }: { readonly sheet: number; readonly of: number }): string => `${sheet} of ${of}`;

/** Heads of the columns at each flow, with the symbol that stands in a formula. */
export const dutyHeads = {
  flow: { label: 'Flow', symbol: 'q' },
  differential: { label: 'Differential', symbol: 'Δp' },
  reynolds: { label: 'Re (pipe)', symbol: 'Re_D' },
  coefficient: { label: 'Discharge', symbol: 'C' },
  expansibility: { label: 'Expansibility', symbol: 'ε' },
  loss: { label: 'Permanent loss', symbol: 'Δϖ' },
  velocity: { label: 'Velocity', symbol: 'V' },
  uncertainty: { label: 'Uncertainty', symbol: 'U' },
} as const;

/** A column at each flow opens with the working line that explains it. */
export const dutyWorking = {
  flow: 'mass-flow',
  differential: 'differential',
  reynolds: 'reynolds-pipe',
  coefficient: 'C',
  expansibility: 'epsilon',
  loss: 'loss',
  velocity: 'velocity',
  uncertainty: 'uncertainty',
} as const;

export const flowAt = (name: DutyName): string => `${name} flow`;
export const whole = 'Combined';
export const fluidRow = 'Fluid';
export const absolutePressure = 'the same, absolute';
export const atAtmosphere = (pressure: string): string => `over ${pressure}`;
export const atStandardAtmosphere = (pressure: string, altitude: string): string =>
  `over ${pressure}, standard atmosphere at ${altitude}`;
export const atBase = (pressure: string, temperature: string): string => `${pressure}, ${temperature}`;
export const spanOf = (differential: string): string => `span of the differential ${differential}`;

export const computedWith = (version: string, inputs: string): string =>
  `computed with Headwright ${version}, inputs ${inputs}`;
export const notCurrent = 'Not current: the inputs have changed since these figures were computed. Do not use.';
export const unitsNote =
  '(a) absolute, (g) above the stated atmosphere. [n] names a source, listed with the checks. Uncertainties: expanded, 95\u00a0%.';

const measured = (note: string): string => (note === noGrowth ? 'as given, no thermal growth' : note);

export const sectionWords = {
  title: (element: string): string => `Section of the ${element.charAt(0).toLowerCase()}${element.slice(1)}`,
  flow: 'flow',
  scale: 'scale',
  edge: 'edge',
  caption: (unit: string, measured: string): string => `dimensions in ${unit === 'in' ? 'inches' : unit}; ${measured}`,
  pipeAlone: (note: string): string => `pipe bore ${measured(note)}`,
  scaleOfPipe: 'bar not to scale; scale of the pipe',
  both: (note: string): string => `diameters ${measured(note)}`,
  apart: (pipe: string, element: string): string => `pipe bore ${measured(pipe)}, element ${measured(element)}`,
} as const;

export const checkHeads = {
  assumption: 'Assumption',
  check: 'Check',
  limit: 'Limit',
  verdict: 'Verdict',
  source: 'Source',
};
/** The full length, and the shorter one that adds half a percent to the uncertainty of the coefficient. */
export const straightHeads = { fitting: 'Nearest fitting', full: 'full', reduced: '+0.5\u00a0% on C' };

export const chartWords = {
  title: 'Flow against differential',
  low: 'lowest, 95\u00a0%',
  high: 'highest, 95\u00a0%',
  limits: 'Reynolds limits',
  inside: 'inside',
  outside: 'outside',
  band: 'Band: expanded uncertainty, 95\u00a0%.',
} as const;

/** State of all checks, at the head of a sheet. */
export const checksAre = (verdict: string): string => `Checks: ${verdict}`;
/** '3 checks, 1 open': open for want of an input. */
export function checkCount(count: number, open: number): string {
  const made = count === 1 ? '1 check' : `${count} checks`;
  return open === 0 ? made : `${count === 0 ? '' : `${made}, `}${open} open`;
}
/** A finding that is not inside, in one sentence. */
export const exceptionText = (text: string, limit: string): string =>
  limit === '' ? `${text}.` : `${text}; limit: ${limit}.`;
export const moreExceptions = (count: number): string => `${count} more, listed with the checks.`;

/** What is written by hand when the part is received and fitted. */
export const inspection = {
  title: 'Inspection, to be filled in',
  bore: (opening: Opening): string =>
    opening === 'none'
      ? 'Width of the bar, and its set across the pipe'
      : `${opening === 'throat' ? 'Throat' : 'Bore'}, four diameters and their mean`,
  pipe: 'Pipe bore, four diameters and their mean',
  others: (opening: Opening): readonly string[] => [
    'Temperature and instrument',
    ...(opening === 'none'
      ? ['Ports clear, front ports facing the flow', 'Reaches across the whole pipe, square to its axis']
      : ['Edge and faces examined', 'Flatness or profile', 'Centred after fitting, upstream side marked']),
    'By, date',
  ],
} as const;

export const stated = 'as stated';
export const atCoverage = ', 95\u00a0%';
export const dash = '–';
