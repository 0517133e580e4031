/** Names of the elements and of their variants, and the choices that a form offers, in the order of the list. */

export interface Choice {
  readonly value: string; // as written in the file
  readonly label: string;
}

export interface ElementChoice {
  readonly kind: string;
  readonly label: string;
  readonly opening: Opening;
  readonly fields: readonly ChoiceOfField[];
}

/** What the smallest section is called: 'bore' of a plate, 'throat' of a nozzle or Venturi tube; a bar has none. */
export type Opening = 'bore' | 'throat' | 'none';

interface ChoiceOfField {
  readonly name: string;
  readonly label: string;
  readonly choices: readonly Choice[];
  /** Words for leaving it open, where it may be. */
  readonly open?: string;
}

const tappings: readonly Choice[] = [
  { value: 'corner', label: 'Corner' },
  { value: 'flange', label: 'Flange' },
  { value: 'D-D/2', label: 'D and D/2' },
];

const convergents: readonly Choice[] = [
  { value: 'as-cast', label: 'As cast' },
  { value: 'machined', label: 'Machined' },
  { value: 'fabricated', label: 'Fabricated' },
];

const areas: readonly Choice[] = [
  { value: 'pipe', label: 'Whole pipe' },
  { value: 'clear', label: 'Less the bar' },
];

export const elementChoices: readonly ElementChoice[] = [
  {
    kind: 'orifice-plate',
    label: 'Orifice plate',
    opening: 'bore',
    fields: [{ name: 'tappings', label: 'Tappings', choices: tappings }],
  },
  { kind: 'isa-1932-nozzle', label: 'ISA 1932 nozzle', opening: 'throat', fields: [] },
  { kind: 'long-radius-nozzle', label: 'Long-radius nozzle', opening: 'throat', fields: [] },
  { kind: 'venturi-nozzle', label: 'Venturi nozzle', opening: 'throat', fields: [] },
  {
    kind: 'venturi-tube',
    label: 'Venturi tube',
    opening: 'throat',
    fields: [{ name: 'convergent', label: 'Convergent', choices: convergents }],
  },
  {
    kind: 'averaging-pitot',
    label: 'Averaging pitot',
    opening: 'none',
    fields: [{ name: 'area', label: 'Area of K', choices: areas, open: 'not stated' }],
  },
];

const variants: Readonly<Record<string, string>> = {
  corner: 'corner tappings',
  flange: 'flange tappings',
  'D-D/2': 'D and D/2 tappings',
  'as-cast': 'as-cast convergent',
  machined: 'machined convergent',
  fabricated: 'fabricated convergent',
  pipe: 'K on the pipe area',
  clear: 'K on the clear area',
};

const choiceOf = (code: string): ElementChoice | undefined =>
  elementChoices.find((choice) => choice.kind === code.split('.')[0]);

/** Name of a kind, or of a kind with its variant: `orifice-plate.flange` is 'Orifice plate, flange tappings'. */
export function elementLabel(code: string): string {
  const [kind = '', variant] = code.split('.');
  const label = choiceOf(code)?.label ?? kind;
  const variantLabel = variantWords(code);
  return variant === undefined || variantLabel === undefined ? label : `${label}, ${variantLabel}`;
}

/** The variant alone, in the middle of a line: 'flange tappings'; absent where the kind has none. */
export function variantWords(code: string): string | undefined {
  return variants[code.split('.')[1] ?? ''];
}

/** The field that holds the variant of a kind: 'tappings'; absent where the kind has none. */
export const variantField = (kind: string): string | undefined => choiceOf(kind)?.fields[0]?.name;

/** What the smallest section of the element is called. */
export function openingWord(code: string): Opening {
  return choiceOf(code)?.opening ?? 'bore';
}

/** What holds the limits of the element: its standard, or the sheet of its maker. */
export type Rules = 'standard' | 'maker’s sheet';
export const rulesOf = (code: string): Rules => (openingWord(code) === 'none' ? 'maker’s sheet' : 'standard');

/** The coefficient in the equation of the flow: its symbol, its name, and its name at the head of a column. */
export interface CoefficientWords {
  readonly symbol: 'C' | 'K';
  readonly name: string;
  readonly head: string;
}

export const coefficientWords = (code: string): CoefficientWords =>
  openingWord(code) === 'none'
    ? { symbol: 'K', name: 'Flow coefficient', head: 'Coefficient' }
    : { symbol: 'C', name: 'Discharge coefficient', head: 'Discharge' };
