/** Names of the elements and of their variants, and the choices that a form offers, in the order of the list. */

export interface Choice {
  readonly value: string; // as written in the file
  readonly label: string;
}

export interface ElementChoice {
  readonly kind: string;
  readonly label: string;
  /** What the smallest section is called: 'bore' of a plate, 'throat' of a nozzle or Venturi tube. */
  readonly opening: 'bore' | 'throat';
  readonly fields: readonly { readonly name: string; readonly label: string; readonly choices: readonly Choice[] }[];
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
];

const variants: Readonly<Record<string, string>> = {
  corner: 'corner tappings',
  flange: 'flange tappings',
  'D-D/2': 'D and D/2 tappings',
  'as-cast': 'as-cast convergent',
  machined: 'machined convergent',
  fabricated: 'fabricated convergent',
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

/** What the smallest section of the element is called. */
export function openingWord(code: string): 'bore' | 'throat' {
  return choiceOf(code)?.opening ?? 'bore';
}
