/** What the editors of a fluid say beside the labels of their fields. */
const lines = (count: number): string => (count === 1 ? '1 line' : `${count} lines`);

export const compositionWords = {
  title: 'Composition',
  component: 'Component',
  share: 'Share',
  unit: 'Unit of the shares',
  add: 'Add a component',
  remove: (name: string): string => `Remove ${name}`,
  rename: (name: string): string => `Component, now ${name}`,
  shareOf: (name: string): string => `Share of ${name}`,
  count: (count: number, sum: string): string => `${count === 1 ? '1 component' : `${count} components`}, ${sum}`,
  sum: 'Sum',
  missing: (amount: string): string => `${amount} missing`,
  above: (amount: string): string => `${amount} above a whole`,
  preset: 'Typical gas',
  presetChoice: 'Choose',
  presetNote: 'Typical figures; the analysis of your gas replaces them.',
} as const;

export const pasteWords = {
  open: 'Paste from a spreadsheet',
  compositionHint: 'Two columns: name or formula, and share. A header and a total are left out.',
  tableHint: (columns: string): string => `Columns: ${columns}. Units may stand in a header or in the cells.`,
  box: 'Pasted text',
  preview: 'What is read',
  standsFor: (written: string): string => `${written} stands for`,
  take: (count: number): string => `Take ${lines(count)}`,
  leave: 'Cancel',
  leaveOut: 'leave out',
  shareUnit: 'Shares without a unit are',
  unknown: (count: number): string =>
    `${lines(count)} with a name that is not known. Say which component it is, or leave it out.`,
  twice: (name: string): string => `${name} stands twice: say which component this is, or leave it out.`,
  unread: (texts: readonly string[]): string => `Not read: ${texts.join(' · ')}`,
  basis: (basis: 'mole' | 'mass'): string => `The header says ${basis} fractions; so they are taken.`,
  replaces: 'They take the place of all rows above, in one step of undo.',
} as const;

export const tableWords = {
  row: (label: string, at: number): string => `${label}, row ${at + 1}`,
  remove: (at: number): string => `Remove row ${at + 1}`,
  unit: (label: string): string => `${label}, unit`,
  viscosities: 'Viscosities of the oil',
} as const;

export const saturationWords = {
  fold: 'Saturated or wet steam',
  phase: 'Phase',
  side: 'Equation of state and phase',
  quality: 'Quality (vapour by mass)',
  onLine: 'on the saturation line',
  hint: 'With a phase or a quality, pressure alone or temperature alone is enough: leave the other empty.',
} as const;

export const choiceWords = {
  moisture: 'Moisture',
  dry: 'dry air',
  oilDensity: 'Density given',
  ownTable: 'Own table',
  ownFigures: 'Vapour pressure and other own figures',
  mixture: 'Mixture',
  gas: 'Gas',
  liquid: 'Liquid',
  chooseLiquid: 'Choose a liquid',
} as const;

export const overrideWords = {
  order: 'override',
  orderOf: (label: string): string => `Override: ${label}`,
  field: (label: string): string => `${label}, in place of the model’s`,
  clear: 'back to the model',
  clearOf: (label: string): string => `Back to the model: ${label}`,
  note: 'stated by you',
} as const;
