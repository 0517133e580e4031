/** Names of the instruments and of the choices in their fields; what the picture of each says. */
import type { Choice } from './elements.ts';

export const instrumentChoices: readonly Choice[] = [
  { value: 'differential', label: 'Pressure difference' },
  { value: 'u-tube', label: 'U-tube' },
  { value: 'inverted-u-tube', label: 'Inverted U-tube' },
  { value: 'well', label: 'Well and tube' },
  { value: 'inclined', label: 'Inclined tube' },
  { value: 'gauges', label: 'Two gauges' },
  { value: 'transmitter', label: 'Transmitter' },
];

export const instrumentLabel = (kind: string): string =>
  instrumentChoices.find(({ value }) => value === kind)?.label ?? 'Instrument';

export const gaugeChoices: readonly Choice[] = [
  { value: 'mercury', label: 'Mercury' },
  { value: 'water', label: 'Water' },
];
export const topChoices: readonly Choice[] = [
  { value: 'air', label: 'Air at line pressure' },
  { value: 'water', label: 'Water' },
];
export const fillChoices: readonly Choice[] = [
  { value: 'process', label: 'Process fluid' },
  { value: 'water', label: 'Water' },
];
export const limbChoices: readonly Choice[] = [
  { value: 'upstream', label: 'Upstream limb' },
  { value: 'downstream', label: 'Downstream limb' },
];
export const scaleChoices: readonly Choice[] = [
  { value: 'plain', label: 'Plain' },
  { value: 'corrected', label: 'Corrected for the well' },
];
export const metalChoices: readonly Choice[] = [
  { value: 'brass', label: 'Brass' },
  { value: 'steel', label: 'Steel' },
];
export const signalChoices: readonly Choice[] = [
  { value: '4-20 mA', label: '4–20\u00a0mA' },
  { value: '1-5 V', label: '1–5\u00a0V' },
  { value: 'percent', label: '0–100\u00a0%' },
];
export const outputChoices: readonly [Choice, ...Choice[]] = [
  { value: 'linear', label: 'Linear in the differential' },
  { value: 'square-root', label: 'Its square root' },
];
export const meantChoices: readonly [Choice, ...Choice[]] = [
  { value: 'expanded', label: 'Expanded, 95\u00a0%' },
  { value: 'rectangular', label: 'Limits, rectangular' },
];

/** The label of a choice in any field of an instrument; absent for what is no choice. */
export const choiceLabel = (value: string): string | undefined =>
  [
    ...gaugeChoices,
    ...topChoices,
    ...fillChoices,
    ...limbChoices,
    ...scaleChoices,
    ...metalChoices,
    ...signalChoices,
    ...outputChoices,
    ...meantChoices,
  ].find((choice) => choice.value === value)?.label;

export const instrumentWords = {
  own: 'By its density',
  ownDensity: 'Density of the gauge liquid',
  legs: 'Legs and heights',
  legsHint:
    'The process fluid counts with its density in the line. Legs colder than the line: water, or their density.',
  scale: 'Zero and scale',
  sure: 'How sure it is',
  limits: 'Limits of the signal',
  lowRange: 'Second cell of a low range',
  notStated: 'not stated',
  sameFilling: 'As the upstream leg',
  process: 'the process fluid',
} as const;

/** The liquid of a column in the middle of a sentence. */
export const liquidWord = (liquid: unknown): string =>
  liquid === 'mercury' || liquid === 'water' || liquid === 'air' ? liquid : 'gauge liquid';

/** Words in the pictures of the instruments. */
export const pictureWords = {
  upstream: 'upstream',
  downstream: 'downstream',
  upstreamLeg: 'upstream leg',
  downstreamLeg: 'downstream leg',
  higher: 'stands higher',
  lower: 'stands lower',
  level: 'stands level',
  lowRange: 'low range',
  high: 'high side',
  low: 'low side',
  rise: 'rise',
  inLegs: (fluid: string): readonly string[] => [fluid, 'in both legs'],
  filledUnlike: ['legs filled unlike'],
  alt: (instrument: string, reading: string, differential: string): string =>
    `${instrument}, reading ${reading === '' ? 'none' : reading}${differential === '' ? '' : `, which is ${differential}`}. Heights of levels to scale, the rest is not.`,
} as const;
