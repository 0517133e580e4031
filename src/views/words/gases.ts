/** Gases that can be named alone: those of the mixtures, and others by a cubic equation of state. */
import { components } from './components.ts';
import type { Choice } from './elements.ts';

const others = [
  'acetylene',
  'ammonia',
  'benzene',
  '1-butene',
  'chlorine',
  'cyclohexane',
  'dimethyl-ether',
  'ethanol',
  'ethylene',
  'hydrogen-chloride',
  'methanol',
  'neon',
  'nitrous-oxide',
  'propylene',
  'sulfur-dioxide',
  'toluene',
] as const;

const own: Readonly<Record<string, string>> = { '1-butene': '1-Butene' };

const labelOf = (value: string): string =>
  own[value] ?? value.charAt(0).toUpperCase() + value.slice(1).replaceAll('-', ' ');

export const gasGroups: readonly { readonly label: string; readonly choices: readonly Choice[] }[] = [
  {
    label: 'One gas, GERG-2008',
    choices: components.map(({ value, label, formula }) => ({ value, label: `${label}, ${formula}` })),
  },
  {
    label: 'One gas, cubic equation, less exact',
    choices: others.map((value) => ({ value, label: labelOf(value) })),
  },
];

/** Whether a gas is one of those that no equation of mixtures holds. */
export const isOther = (name: string): boolean => others.some((other) => other === name);

/** Name of a gas of the file; one that is not in the list stands as written. */
export const gasLabel = (name: string): string =>
  components.find(({ value }) => value === name)?.label ?? labelOf(name);
