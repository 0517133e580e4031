/** Words of the place where a meter is read: the answer, the table, what the rows come to, cautions. */

/** The answer in pieces: words, and figures by name. */
export type ReadPiece = string | { readonly figure: 'reading' | 'throat' | 'differential' | 'flow' };
const reading = { figure: 'reading' } as const;
const throat = { figure: 'throat' } as const;
const differential = { figure: 'differential' } as const;
const flow = { figure: 'flow' } as const;

/** What the instrument shows, up to the differential; `liquid` and `over` as they stand in a sentence. */
export function readPieces(kind: string, liquid: string, over: string): readonly ReadPiece[] {
  if (kind === 'gauges') return [reading, ' upstream and ', throat, ' at the throat leave '];
  if (kind === 'inverted-u-tube') return [reading, ` of ${over} under ${liquid} is `];
  if (kind === 'inclined') return [reading, ` along a tube of ${liquid} under ${over} is `];
  if (kind === 'u-tube' || kind === 'well') return [reading, ` of ${liquid} under ${over} is `];
  if (kind === 'transmitter') return [reading, ' is '];
  return [];
}

/** A signal of the second of two cells. */
export const ofLowRange = (signal: string): string => `${signal} of the low range`;

/** How the sentence ends. */
export const endPieces: Readonly<
  Record<'flows' | 'at-least' | 'cut-off' | 'still' | 'reversed', readonly ReadPiece[]>
> = {
  flows: [differential, ': ', flow, ' flows.'],
  'at-least': [differential, ': at least ', flow, ' flows.'],
  'cut-off': [differential, ', below the cut-off: nothing flows.'],
  still: [differential, ': nothing flows.'],
  reversed: [differential, ': the legs are crossed or the flow runs backwards.'],
};
export const failedPieces: readonly ReadPiece[] = [reading, ': the instrument reports a failure.'];

export const readWords = {
  wait: (tag: string): string => `${tag === '' ? 'The meter' : tag} waits for a reading.`,
  empty: 'What flows, by what the instrument shows?',
  emptyText:
    'Readings and logs are put to a meter. Describe it first: pipe, fluid and element; then come back to read it.',
  begin: 'Describe a meter',
  refused: 'This reading cannot be used.',
  unready: 'The reading waits for its instrument.',
  unsolved: 'The meter itself cannot be solved as it stands; its readings wait for it.',
  toSize: 'Go to its form',
  table: 'Readings',
  instrument: 'Instrument',
  row: 'Row',
  time: 'When',
  value: 'Reading',
  lowRange: 'Low range',
  upstream: 'Upstream gauge',
  throat: 'Throat gauge',
  pressure: 'Line pressure',
  temperature: 'Temperature',
  differential: 'Differential',
  flow: 'Flow',
  velocity: 'Velocity',
  reynolds: 'Re (pipe)',
  coefficient: 'C',
  expansibility: 'ε',
  uncertainty: '±',
  note: 'Note',
  fill: 'Fill down',
  fillOf: (column: string): string => `${column}: fill down to the rows below that have none`,
  cell: (column: string, row: number): string => `${column}, row ${row + 1}`,
  unitOf: (column: string): string => `${column}, unit`,
  remove: (row: number): string => `Remove row ${row + 1}`,
  hint: 'Enter goes to the next row. A block from a spreadsheet can be pasted into any box.',
  pasted: (rows: number): string => (rows === 1 ? '1 row taken over.' : `${rows} rows taken over.`),
  csv: 'Save as CSV',
  clear: 'Remove all',
  working: 'Working of the row',
  checks: 'Checks of the row',
  compensate: 'A root signal scaled for the design',
  compensateLead:
    'A control system that roots the signal at the design density is right at the design state alone. Corrected by the ' +
    'root of the densities, it differs from the exact flow by what is left in C, ε and the metal.',
  indicated: 'Indicated',
  corrected: 'Corrected',
  exact: 'Exact',
  residual: 'Residual',
  factor: '√(ρ/ρ design)',
  mean: 'Mean',
  minimum: 'Least',
  maximum: 'Most',
} as const;

/** Mean of the rows and what rooting the mean would make of it. */
export function meanSentence(counted: number, mean: string, least: string, most: string): string {
  const rows = counted === 1 ? 'one flow' : `${counted} flows`;
  return counted === 1 ? `Mean of ${rows}: ${mean}.` : `Mean of ${rows} ${mean}, from ${least} to ${most}.`;
}
export const rootedSentence = (flow: string, percent: string, high: boolean): string =>
  `Rooting the mean differential would give ${flow}, ${percent} too ${high ? 'high' : 'low'}.`;
export const flagSentence = (flags: readonly string[]): string => `Flags: ${flags.join('; ')}.`;
export const leftOut = (count: number): string =>
  count === 1 ? 'One row is left out of the mean.' : `${count} rows are left out of the mean.`;
export const oneFlag = (count: number, words: string): string => `${count} × ${words}`;

/** The line below the answer. */
export const underReading = {
  sure: (flow: string): string => `± ${flow} at 95\u00a0%`,
  ofReading: (share: string): string => `of which the reading is ${share}`,
  atLeast: (flow: string): string => `± ${flow} at 95\u00a0% at least`,
  reynolds: (figure: string): string => `Re ${figure}`,
} as const;

/** What to mind where an instrument is opened or read, short. */
const manifold =
  'Three-valve manifold. Out of service: open the equaliser, then close the low and the high block. Into service: ' +
  'equaliser open, blocks open, then close the equaliser; never one block shut with the equaliser shut.';
const wetLegs =
  'Wet legs and steam: never all three valves open, the legs drain and hot steam reaches the cell. Close a block first, ' +
  'then open the equaliser.';
const loop =
  'Opening a loop may trip the plant: tell the control room and force the signal. Meters need the certificate of their zone.';
const meniscus =
  'Read water at the bottom of the meniscus and mercury at its top, both limbs the same way, the zero with both sides at one pressure.';

/** Cautions of an instrument, by its kind and whether its legs are wet. */
export function instrumentCautions(kind: string, wet: boolean): readonly string[] {
  const column = kind === 'u-tube' || kind === 'inverted-u-tube' || kind === 'well' || kind === 'inclined';
  return [
    ...(kind === 'gauges' ? [] : [manifold]),
    ...(wet ? [wetLegs] : []),
    ...(column ? [meniscus] : []),
    ...(kind === 'transmitter' ? [loop] : []),
  ];
}
