/** Words of the printed sheet. */
import type { DutyName } from '../../core/document/project.ts';

export const sheetWords = {
  documentType: 'Sizing sheet',
  checksSheet: 'Checks, tolerances and sources',
  workingSheet: 'Working',
  drawing: 'Section',
  fluid: 'Fluid upstream',
  pipe: 'Pipe',
  element: 'Element',
  duty: 'At each flow',
  curve: 'Flow against differential',
  verdicts: 'Checks by assumption',
  checks: 'Checks',
  terms: 'Uncertainty of the flow by its terms, 95 %',
  dimensions: 'Dimensions and tolerances at the line temperature',
  straight: 'Straight pipe',
  sources: 'Sources',
  cautions: 'Cautions',
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
  name: 'Name',
  date: 'Date',
  signature: 'Signature',
  issued: 'Date of issue',
  printed: 'Printed',
  status: 'Status',
} as const;

export const sheetOf = (sheet: number, sheets: number): string => `${sheet} of ${sheets}`;

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
export const total = 'Flow';
export const fluidRow = 'Fluid';
export const absolutePressure = 'Pressure upstream, absolute';
export const atAtmosphere = (pressure: string): string => `atmosphere ${pressure}`;
export const atBase = (pressure: string, temperature: string): string => `${pressure}, ${temperature}`;
export const spanRow = 'Differential of the span';
export const standardRow = 'Standard';
export const kindRow = 'Kind';

export const computedWith = (version: string, inputs: string): string =>
  `computed with Headwright ${version}, inputs ${inputs}`;
export const notCurrent = 'Not current: the inputs have changed since these figures were computed. Do not use.';
export const unitsNote = (length: string): string =>
  `Bar(g) and psi(g) are above the stated atmosphere, (a) is absolute. Dimensions in ${length}. Figures in brackets name a source.`;

export const sectionWords = {
  title: (element: string): string => `Section of the ${element.charAt(0).toLowerCase()}${element.slice(1)}`,
  flow: 'flow',
  scale: 'scale',
  edge: 'edge',
  caption: (unit: string, temperature: string): string =>
    `dimensions in ${unit}; diameters as measured, ${temperature}`,
  asMeasured: 'no thermal growth',
  bothAt: (temperature: string): string => `at ${temperature}`,
  apartAt: (pipe: string, opening: string): string => `pipe at ${pipe}, element at ${opening}`,
} as const;

export const checkHeads = {
  assumption: 'Assumption',
  check: 'Check',
  limit: 'Limit',
  verdict: 'Verdict',
  clause: 'Source',
};
export const straightHeads = { fitting: 'Fitting', full: 'Needed', reduced: 'Adds 0.5 %', side: 'Side' };
export const sides = { upstream: 'before', downstream: 'after' } as const;

export const chartWords = {
  title: 'Flow against differential',
  low: 'lowest, 95 %',
  high: 'highest, 95 %',
  limits: 'Reynolds limits',
  inside: 'inside',
  outside: 'outside',
  band: 'Band: expanded uncertainty, 95 %.',
} as const;

/** '3 checks' */
export const checkCount = (count: number): string => (count === 1 ? '1 check' : `${count} checks`);
